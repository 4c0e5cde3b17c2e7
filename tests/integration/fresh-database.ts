import { randomBytes } from 'node:crypto';
import { cloneDatabase, dropDatabase, ensureDatabase, withDatabase } from '@/db/local/databases.mjs';

const adminUrl = process.env.TEPIDARIUM_ADMIN_URL;
const template = process.env.TEPIDARIUM_TEMPLATE_DATABASE;

/** Integration tests need the PostgreSQL server that `npm test` provides; alone they say so and are skipped. */
export const hasPostgres = Boolean(adminUrl && template);
if (!hasPostgres) process.stderr.write('Skipped: these tests need the PostgreSQL server of `npm test`.\n');

export interface FreshDatabase {
  url: string;
  drop: () => Promise<void>;
}

async function fresh(make: (name: string) => Promise<void>): Promise<FreshDatabase> {
  const name = `t_file_${randomBytes(6).toString('hex')}`;
  await make(name);
  return { url: withDatabase(adminUrl!, name), drop: () => dropDatabase(adminUrl!, name) };
}

/** A migrated database for one test file. */
export function clonedDatabase(): Promise<FreshDatabase> {
  return fresh((name) => cloneDatabase(adminUrl!, template!, name));
}

/** A database with nothing in it. */
export function emptyDatabase(): Promise<FreshDatabase> {
  return fresh((name) => ensureDatabase(adminUrl!, name));
}
