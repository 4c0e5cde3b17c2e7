import { parentPort } from 'node:worker_threads';
import { createSimulator } from '@/lib/simulation/simulate';

/* The engine on a thread of the server; `lib/server/run-pool.ts` starts and ends it. */

if (!parentPort) throw new Error('run.worker.ts is a thread of the server, not a program.');
const port = parentPort;
const simulator = createSimulator();

port.on('message', (input: Parameters<typeof simulator.run>[0]) => {
  port.postMessage('begun');
  const outcome = simulator.run(input);
  const columns: (Float32Array | Uint8Array)[] = outcome.ok ? Object.values(outcome.result.columns) : [];
  port.postMessage(outcome, [...new Set(columns.map((column) => column.buffer as ArrayBuffer))]);
});
