import { verify } from '@node-rs/argon2';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { seed } from '@/db/seed';
import { clonedDatabase, hasPostgres, type FreshDatabase } from './fresh-database';

describe.skipIf(!hasPostgres)('seed', { timeout: 30_000 }, () => {
  let fresh: FreshDatabase;
  let db: ReturnType<typeof openDatabase>;
  beforeAll(async () => {
    delete process.env.TEPIDARIUM_OWNER_PASSWORD;
    fresh = await clonedDatabase();
    db = openDatabase(fresh.url);
  });
  afterAll(async () => {
    await db.destroy();
    await fresh.drop();
  });

  it('tells the password once, although two seeds begin at the same time', async () => {
    const told = (await Promise.all([seed(fresh.url), seed(fresh.url)])).flatMap(
      (seeded) => seeded.newOwner ?? [],
    );
    expect(told).toHaveLength(1);
    const { password_hash: hash } = await db
      .selectFrom('account')
      .select('password_hash')
      .executeTakeFirstOrThrow();
    expect(hash).toMatch(/^\$argon2id\$/);
    expect(await verify(hash, told[0]!.password)).toBe(true);
    expect(await seed(fresh.url)).toEqual({});
  });

  it('lays out the climates and one copy of the demonstration', async () => {
    const climates = await db.selectFrom('weather_year').select(['id', 'synthetic', 'climate_id']).execute();
    expect(climates.length).toBeGreaterThanOrEqual(2);
    expect(climates.every((climate) => climate.synthetic)).toBe(true);
    const projects = await db.selectFrom('project').select('weather_year_id').execute();
    expect(projects).toHaveLength(1);
    expect(climates.map((climate) => climate.id)).toContain(projects[0]!.weather_year_id);
    const designs = await db.selectFrom('design').select('name').orderBy('position').execute();
    expect(designs.length).toBeGreaterThanOrEqual(3);
  });
});
