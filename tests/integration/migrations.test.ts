import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { emptyDatabase, hasPostgres, type FreshDatabase } from './fresh-database';

/** As `npm start` runs it: in a process of its own, with the loader for TypeScript. */
async function migrate(url: string): Promise<string> {
  const { stdout } = await promisify(execFile)(process.execPath, ['--import', 'tsx', 'db/migrate.ts'], {
    env: { ...process.env, DATABASE_URL: url },
  });
  return stdout;
}

describe.skipIf(!hasPostgres)('migrations', () => {
  let fresh: FreshDatabase;
  beforeAll(async () => {
    fresh = await emptyDatabase();
  });
  afterAll(() => fresh.drop());

  it('go up from nothing once, although two begin at the same time', { timeout: 30_000 }, async () => {
    const said = await Promise.all([migrate(fresh.url), migrate(fresh.url)]);
    expect(said.filter((words) => words.startsWith('Database brought to'))).toHaveLength(1);
    expect(await migrate(fresh.url)).toBe('');
  });

  it('leave every table that the queries name', async () => {
    const db = openDatabase(fresh.url);
    const tables = (await db.introspection.getTables()).map((table) => table.name);
    await db.destroy();
    const needed = [
      'account',
      'session',
      'project',
      'house',
      'bills',
      'weather_year',
      'collector',
      'design',
      'run',
    ];
    expect(tables).toEqual(expect.arrayContaining(needed));
  });
});
