import { accessSync, constants, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { installDebianPackages } from './debian.mjs';
import { Refusal } from './say.mjs';

const DEBIAN = '/usr/lib/postgresql';
const NEEDED = ['initdb', 'pg_ctl', 'postgres'];
const OTHERWISE = '\nOr set DATABASE_URL to the address of a PostgreSQL server that you already run.';

/**
 * The folder with PostgreSQL's programs, which are installed when missing and allowed.
 * @param {string | undefined} major the version that made the data at hand; any version when there is none yet
 * @param {{ install: boolean, signal?: AbortSignal }} options
 * @returns {Promise<string>}
 */
export async function postgresBinaries(major, { install, signal }) {
  const found = findBinaries(major);
  if (found !== undefined) return found;
  const name = major === undefined ? 'postgresql' : `postgresql-${major}`;
  if (install && process.getuid?.() === 0) forbidMainCluster();
  await installDebianPackages('PostgreSQL', [name], { allowed: install, otherwise: OTHERWISE, signal });
  const installed = findBinaries(major);
  if (installed === undefined)
    throw new Refusal(`${name} is installed, but its programs are not in ${DEBIAN}.`);
  return installed;
}

/** @param {string | undefined} major */
function findBinaries(major) {
  const folders = [process.env.PG_BIN, ...debianFolders(major)];
  // Another version on the PATH could not read the data at hand.
  if (major === undefined) folders.push(...(process.env.PATH ?? '').split(path.delimiter));
  return folders.find((folder) => folder && NEEDED.every((name) => isProgram(path.join(folder, name))));
}

function debianFolders(major) {
  if (major !== undefined) return [path.join(DEBIAN, major, 'bin')];
  try {
    return readdirSync(DEBIAN)
      .sort((a, b) => Number(b) - Number(a))
      .map((version) => path.join(DEBIAN, version, 'bin'));
  } catch {
    return [];
  }
}

function isProgram(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Debian's package would otherwise make and start a cluster of the system's own on port 5432. */
function forbidMainCluster() {
  const folder = '/etc/postgresql-common/createcluster.d';
  mkdirSync(folder, { recursive: true });
  writeFileSync(path.join(folder, 'tepidarium.conf'), 'create_main_cluster = false\n');
}
