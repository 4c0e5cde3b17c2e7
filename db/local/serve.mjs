import { spawn } from 'node:child_process';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { NEXT } from './build.mjs';
import { answers } from './ports.mjs';
import { ROOT } from './paths.mjs';
import { Refusal } from './say.mjs';

const READY_PATIENCE_MS = 60_000;
const KILL_AFTER_MS = 8_000;

/**
 * Starts the application on loopback, as built or (development) as it stands, and waits until it answers.
 * @param {{ port: number, env: NodeJS.ProcessEnv, development?: boolean, stderr?: 'inherit' | number, signal?: AbortSignal }} options
 * @returns {Promise<{ ended: Promise<number>, stop: () => Promise<number> }>} `ended`: its exit code
 */
export async function serve({ port, env, development = false, stderr = 'inherit', signal }) {
  const watch = path.join(import.meta.dirname, 'end-with-parent.mjs');
  const command = [NEXT, development ? 'dev' : 'start', '-H', '127.0.0.1', '-p', String(port)];
  const mode = development ? 'development' : 'production';
  const child = spawn(process.execPath, ['--import', watch, ...command], {
    cwd: ROOT,
    env: { ...process.env, ...env, NODE_ENV: mode, NEXT_TELEMETRY_DISABLED: '1' },
    stdio: ['ignore', development ? 'inherit' : 'ignore', stderr],
  });
  const ended = new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code) => resolve(code ?? 128));
  });
  const stop = async () => {
    child.kill('SIGTERM');
    const killer = setTimeout(() => child.kill('SIGKILL'), KILL_AFTER_MS);
    const code = await ended;
    clearTimeout(killer);
    return code;
  };
  try {
    await untilReady(child, port, signal);
  } catch (error) {
    await stop();
    throw error;
  }
  return { ended, stop };
}

/** Answers from another server that took the port a moment earlier do not count: ours has ended then. */
async function untilReady(child, port, signal) {
  const deadline = Date.now() + READY_PATIENCE_MS;
  while (Date.now() < deadline) {
    const answered = await answers(port);
    await sleep(150, undefined, { signal });
    if (child.exitCode !== null || child.signalCode !== null) throw new PortLost(port);
    if (answered) return;
  }
  throw new Refusal(`The server does not answer on port ${port} after ${READY_PATIENCE_MS / 1000} s.`, 1);
}

/** The server ended before it answered, as it does when somebody else took its port meanwhile. */
export class PortLost extends Refusal {
  constructor(port) {
    super(`The server could not start on port ${port}.`, 1);
  }
}
