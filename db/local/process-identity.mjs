import { readFileSync } from 'node:fs';

/**
 * A process as "pid-start": its number with the tick of its birth, so that a number which the system
 * gave to another process later is not taken for the old one. Where /proc is missing the start is 0.
 * @param {number} pid
 * @returns {string | undefined} undefined when no such process lives
 */
export function identityOf(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    if (error.code !== 'EPERM') return undefined;
  }
  const stat = processStat(pid);
  if (stat === undefined) return `${pid}-0`;
  return stat.state === 'Z' ? undefined : `${pid}-${stat.start}`;
}

/** Whether the process with that identity still lives. @param {string} identity */
export function isAlive(identity) {
  return identityOf(Number.parseInt(identity, 10)) === identity;
}

/** @param {number} pid */
function processStat(pid) {
  try {
    const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = text.slice(text.lastIndexOf(')') + 2).split(' ');
    return { state: fields[0], start: fields[19] };
  } catch {
    return undefined;
  }
}
