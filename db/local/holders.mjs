import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { identityOf, isAlive } from './process-identity.mjs';

/*
 * Who uses the cluster: one empty file per process, named by its identity. The cluster stops with its
 * last holder, so that a test run does not lose its database when `npm start` ends beside it. Call these
 * under the cluster's lock.
 */

/** Enters this process. @param {string} folder */
export function enterHolder(folder) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, ownName()), '');
}

/** Takes this process out. @param {string} folder */
export function leaveHolder(folder) {
  rmSync(path.join(folder, ownName()), { force: true });
}

/** The living holders; files of dead ones are removed. @param {string} folder @returns {string[]} */
export function livingHolders(folder) {
  let names = [];
  try {
    names = readdirSync(folder);
  } catch {
    return [];
  }
  const dead = names.filter((name) => !isAlive(name));
  for (const name of dead) rmSync(path.join(folder, name), { force: true });
  return names.filter((name) => !dead.includes(name));
}

function ownName() {
  return identityOf(process.pid) ?? `${process.pid}-0`;
}
