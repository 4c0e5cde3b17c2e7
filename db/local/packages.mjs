import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { runQuietly } from './child.mjs';
import { localPath, ROOT } from './paths.mjs';
import { say } from './say.mjs';

const LOCK = path.join(ROOT, 'package-lock.json');
const INSTALLED = path.join(ROOT, 'node_modules/.package-lock.json');
const STAMP = path.join(ROOT, 'node_modules/.tepidarium-node-abi');

/** Installs the packages of package-lock.json unless exactly these are there already. @param {AbortSignal} [signal] */
export async function ensurePackages(signal) {
  if (packagesAreCurrent()) return;
  say('Installing packages (npm ci, about a minute) …');
  // Without --include=dev a NODE_ENV=production in the surroundings would leave out what builds the application.
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund'];
  await runQuietly('npm ci', localPath('npm-ci.log'), 'npm', args, { cwd: ROOT, signal });
  writeFileSync(STAMP, process.versions.modules);
}

function packagesAreCurrent() {
  const installed = read(INSTALLED);
  const builtFor = read(STAMP) ?? process.versions.modules;
  if (installed === undefined || builtFor !== process.versions.modules) return false;
  return sameVersions(JSON.parse(readFileSync(LOCK, 'utf8')), JSON.parse(installed));
}

/**
 * Whether every package that a lock file asks for is installed in that version; packages for other
 * machines (optional ones) may be absent.
 * @param {{ packages: Record<string, { version?: string, optional?: boolean }> }} lock
 * @param {{ packages: Record<string, { version?: string }> }} installed npm's own record in node_modules
 */
export function sameVersions(lock, installed) {
  return Object.entries(lock.packages).every(([place, wanted]) => {
    if (place === '') return true;
    const found = installed.packages[place];
    return found === undefined ? wanted.optional === true : found.version === wanted.version;
  });
}

function read(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}
