import { parentPort } from 'node:worker_threads';

/* Stands in for the engine's thread: does what the name of the house asks. */

const port = parentPort!;

port.on('message', ({ house: { name } }: { house: { name: string } }) => {
  port.postMessage('begun');
  if (name === 'crash') throw new Error('planned by the test');
  const end = performance.now() + (name === 'forever' ? Infinity : Number(name));
  while (performance.now() < end);
  port.postMessage({ ok: true, result: { weatherName: name } });
});
