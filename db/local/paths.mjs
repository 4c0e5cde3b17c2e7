import { mkdirSync } from 'node:fs';
import path from 'node:path';

/** The checkout. */
export const ROOT = path.resolve(import.meta.dirname, '../..');

/** What belongs to this machine alone: secrets, locks, logs, reports of test runs. */
export const LOCAL = path.join(ROOT, '.local');

/** A path inside `.local`, whose folder exists afterwards. @param {...string} parts */
export function localPath(...parts) {
  const target = path.join(LOCAL, ...parts);
  mkdirSync(path.dirname(target), { recursive: true });
  return target;
}
