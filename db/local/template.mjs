import { hashOfSources } from './build.mjs';
import {
  cloneDatabase,
  databaseExists,
  databasesNamed,
  dropDatabase,
  ensureDatabase,
  renameDatabase,
  withDatabase,
} from './databases.mjs';
import { withLock } from './lock.mjs';
import { ROOT } from './paths.mjs';
import { identityOf, isAlive } from './process-identity.mjs';
import { migrate } from './schema.mjs';

const PREFIX = 'tepidarium_template_';

/**
 * The name of an empty, migrated database to clone from; made once for each state of the migrations.
 * @param {string} adminUrl @param {string} lock file @param {AbortSignal} [signal]
 */
export async function ensureTemplate(adminUrl, lock, signal) {
  const name = `${PREFIX}${hashOfSources(ROOT, ['migrations', 'db/migrate.ts']).slice(0, 16)}`;
  await withLock(lock, () => makeTemplate(adminUrl, name, signal), { signal });
  return name;
}

/** Renamed at the end, so that an interrupted migration is never taken for a template. */
async function makeTemplate(adminUrl, name, signal) {
  if (await databaseExists(adminUrl, name)) return;
  for (const old of await databasesNamed(adminUrl, PREFIX)) await dropDatabase(adminUrl, old);
  const making = `${name}_making`;
  await ensureDatabase(adminUrl, making);
  await migrate(withDatabase(adminUrl, making), signal);
  await renameDatabase(adminUrl, making, name);
}

/** A database of this process alone. @param {string} adminUrl @param {string} template @returns {Promise<string>} its name */
export async function cloneForThisRun(adminUrl, template) {
  for (const name of await databasesNamed(adminUrl, 't_run_')) {
    const owner = name.slice('t_run_'.length).replace('_', '-');
    if (!isAlive(owner)) await dropDatabase(adminUrl, name);
  }
  const name = `t_run_${identityOf(process.pid)?.replace('-', '_')}`;
  await cloneDatabase(adminUrl, template, name);
  return name;
}
