import { promises as fs } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { FileMigrationProvider, Migrator } from 'kysely';
import { openDatabase } from './client';

/**
 * Brings a database to the newest form. Two at once are safe: Kysely takes an advisory lock, and the second finds nothing to do.
 * @param url connection string
 * @returns names of the migrations that ran
 */
export async function migrate(url: string): Promise<string[]> {
  const db = openDatabase(url);
  try {
    const migrationFolder = path.join(import.meta.dirname, '..', 'migrations');
    const provider = new FileMigrationProvider({ fs, path, migrationFolder });
    const { error, results = [] } = await new Migrator({ db, provider }).migrateToLatest();
    if (error) throw error instanceof Error ? error : new Error('The migration failed.', { cause: error });
    return results.map((result) => result.migrationName);
  } finally {
    await db.destroy();
  }
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const url = process.env.DATABASE_URL;
  if (!url)
    throw new Error('DATABASE_URL is not set: npm start sets it, or point it at a database of your own.');
  const ran = await migrate(url);
  if (ran.length > 0) process.stdout.write(`Database brought to ${ran.at(-1)}.\n`);
}
