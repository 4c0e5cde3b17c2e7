import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { runQuietly } from './child.mjs';
import { localPath, ROOT } from './paths.mjs';
import { say } from './say.mjs';

/** Everything that can change what `next build` makes. */
const SOURCES = [
  'app',
  'components',
  'data',
  'db',
  'instrumentation.ts',
  'lib',
  'next.config.ts',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'public',
  'tailwind.config.ts',
  'tsconfig.json',
  'workers',
];

const STAMP = path.join(ROOT, '.next/tepidarium-sources');

export const NEXT = path.join(ROOT, 'node_modules/next/dist/bin/next');

/** Builds the application unless the build at hand was made from exactly these sources. @param {AbortSignal} [signal] */
export async function ensureBuild(signal) {
  const hash = hashOfSources(ROOT, SOURCES);
  if (stampedHash() === hash) return;
  say('Building the application (about a minute) …');
  rmSync(STAMP, { force: true });
  await runQuietly('Building the application', localPath('build.log'), process.execPath, [NEXT, 'build'], {
    cwd: ROOT,
    signal,
    env: buildEnvironment(),
  });
  writeFileSync(STAMP, hash);
}

/** A page that asked the database while it is built would freeze its answer: without an address it fails instead. */
function buildEnvironment() {
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' };
  delete env.DATABASE_URL;
  return env;
}

function stampedHash() {
  try {
    return readFileSync(STAMP, 'utf8');
  } catch {
    return undefined;
  }
}

/**
 * SHA-256 over names and contents of all files under the given places, so that a date alone changes nothing.
 * @param {string} root @param {string[]} places
 */
export function hashOfSources(root, places) {
  const hash = createHash('sha256');
  for (const file of places.flatMap((place) => filesUnder(path.join(root, place))).sort()) {
    hash
      .update(`${path.relative(root, file)}\0`)
      .update(readFileSync(file))
      .update('\0');
  }
  return hash.digest('hex');
}

/** @param {string} place @returns {string[]} */
function filesUnder(place) {
  const stat = statSync(place, { throwIfNoEntry: false });
  if (stat === undefined) return [];
  if (stat.isFile()) return [place];
  if (!stat.isDirectory()) return [];
  return readdirSync(place).flatMap((name) => filesUnder(path.join(place, name)));
}
