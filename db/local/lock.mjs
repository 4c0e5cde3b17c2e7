import { mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { identityOf, isAlive } from './process-identity.mjs';
import { Refusal } from './say.mjs';

const POLL_MS = 100;
const TAKEOVER_STALE_MS = 10_000;

/**
 * Does `work` while holding the lock file, which names its holder; a lock whose holder died is taken over.
 * @template T
 * @param {string} file
 * @param {() => Promise<T>} work
 * @param {{ timeoutMs?: number, onWait?: () => void, signal?: AbortSignal }} [options]
 * @returns {Promise<T>}
 */
export async function withLock(file, work, { timeoutMs = 900_000, onWait, signal } = {}) {
  await acquire(file, timeoutMs, onWait, signal);
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

async function acquire(file, timeoutMs, onWait, signal) {
  mkdirSync(path.dirname(file), { recursive: true });
  const deadline = Date.now() + timeoutMs;
  let waiting = false;
  while (!create(file)) {
    if (removeIfDead(file)) continue;
    if (!waiting) onWait?.();
    waiting = true;
    if (Date.now() > deadline) {
      throw new Refusal(
        `${file} is held by a process that does not finish (${holderOf(file)}). End it, then try again.`,
        1,
      );
    }
    await sleep(POLL_MS, undefined, { signal });
  }
}

function create(file) {
  try {
    writeFileSync(file, identityOf(process.pid) ?? '', { flag: 'wx' });
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
}

function holderOf(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}

/** Only one process at a time may judge a lock dead, or the second would remove the first one's new lock. */
function removeIfDead(file) {
  const takeover = `${file}.takeover`;
  if (!create(takeover)) {
    if (ageMs(takeover) > TAKEOVER_STALE_MS) rmSync(takeover, { force: true });
    return false;
  }
  try {
    const holder = holderOf(file);
    if (holder === undefined) return true;
    const beingWritten = holder === '' && ageMs(file) < TAKEOVER_STALE_MS;
    if (beingWritten || (holder !== '' && isAlive(holder))) return false;
    rmSync(file, { force: true });
    return true;
  } finally {
    rmSync(takeover, { force: true });
  }
}

function ageMs(file) {
  try {
    return Date.now() - statSync(file).mtimeMs;
  } catch {
    return 0;
  }
}
