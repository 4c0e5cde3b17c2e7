import { accessSync, constants, existsSync } from 'node:fs';
import path from 'node:path';
import { ROOT } from './paths.mjs';
import { Refusal } from './say.mjs';

const WRITTEN = ['.', 'node_modules', '.next', '.local', '.local/auth-secret'];

/** Refuses early, in words, a checkout in which root or another user left what this one must write. */
export function assertWritable() {
  const locked = WRITTEN.filter(
    (name) => existsSync(path.join(ROOT, name)) && !isWritable(path.join(ROOT, name)),
  );
  if (locked.length === 0) return;
  throw new Refusal(
    `These belong to another user and cannot be written: ${locked.join(', ')}\n` +
      'Clone the project into a folder of your own, or give this one back to yourself: ' +
      `sudo chown -R "$(id -u):$(id -g)" ${locked.join(' ')}`,
  );
}

function isWritable(file) {
  try {
    accessSync(file, constants.R_OK | constants.W_OK);
    return true;
  } catch {
    return false;
  }
}
