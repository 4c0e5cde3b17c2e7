import { sql } from 'kysely';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { toBytes } from '@/db/pack-floats';
import { insertRun } from '@/db/queries/runs';
import type { HourColumns } from '@/lib/simulation/results';
import { createSimulator } from '@/lib/simulation/simulate';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import { saveDesign } from '@/lib/server/designs';
import { createProjectFromDemonstration, readProject, saveHouse } from '@/lib/server/projects';
import { runPool } from '@/lib/server/run-pool';
import { readRun, repeatRun } from '@/lib/server/runs';
import { storeWeatherYear } from '@/lib/server/weather-years';
import { readWeather } from '@/lib/weather/read-weather';
import { hasPostgres } from './fresh-database';
import { EPW_BYTES, openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

describe.skipIf(!hasPostgres)('runs', { timeout: 30_000 }, () => {
  let world: ServerWorld;
  let projectId: string;

  const read = async () => {
    const answer = await readProject(projectId);
    if (!answer.ok) throw new Error(answer.message);
    return answer;
  };

  beforeAll(async () => {
    world = await openWorld();
    visitor.sessionId = await world.signUp('owner@tepidarium.example');
    const project = await createProjectFromDemonstration();
    if (!project.ok) throw new Error(project.message);
    projectId = project.projectId;
    await storeWeatherYear(projectId, 'hill.epw', EPW_BYTES, { repair: false });
  });
  afterAll(async () => {
    await runPool().close();
    await world.drop();
  });

  it('stores the server’s own year with the engine’s version and the hash of the inputs', async () => {
    const { id, data, version } = (await read()).designs[0]!;
    const saved = await saveDesign(id, data, version);
    expect(saved).toMatchObject({ ok: true, run: { engineVersion: ENGINE_VERSION, current: true } });
    const stored = await world.db.selectFrom('run').select(['engine_version', 'inputs_hash']).execute();
    expect(stored).toEqual([
      { engine_version: ENGINE_VERSION, inputs_hash: saved.ok && saved.run?.inputsHash },
    ]);
  });

  it('reads the hours back as the engine returns them, float32 for float32', async () => {
    const { house, designs } = await read();
    const weather = readWeather(EPW_BYTES);
    const stored = await readRun(designs[0]!.id);
    if (!weather.ok || !stored.ok) throw new Error('not read');
    const numerics = { theta: 0.5, skyModel: 'hdkr' as const };
    const outcome = createSimulator().run({
      weather: weather.year,
      house,
      design: designs[0]!.data,
      numerics,
    });
    if (!outcome.ok) throw new Error(outcome.message);
    const { columns, ...figures } = stored.result;
    const { columns: expected, ...expectedFigures } = outcome.result;
    expect(figures).toEqual(expectedFigures);
    expect(Object.keys(columns)).toEqual(Object.keys(expected));
    for (const name of Object.keys(columns) as (keyof HourColumns)[]) {
      expect(columns[name].constructor, name).toBe(expected[name].constructor);
      expect(toBytes(columns[name]).equals(toBytes(expected[name])), name).toBe(true);
    }
  });

  it('keeps one run for the same inputs, and marks it as old when an input changes', async () => {
    const before = await read();
    const { id } = before.designs[0]!;
    await readRun(id);
    const count = async () => (await world.db.selectFrom('run').select('id').execute()).length;
    expect(await count()).toBe(1);
    await saveHouse(projectId, { ...before.house, roomSetC: before.house.roomSetC + 1 }, before.houseVersion);
    expect((await read()).designs[0]!.lastRun).toMatchObject({ current: false });
    expect(await readRun(id)).toMatchObject({ ok: true, summary: { current: true } });
    expect(await count()).toBe(2);
  });

  it('keeps a year of an older engine readable, and works it again beside it', async () => {
    const { id } = (await read()).designs[0]!;
    await readRun(id);
    await world.db.updateTable('run').set({ engine_version: '0.0.9' }).where('design_id', '=', id).execute();
    // an older engine did not store every field
    await world.db
      .updateTable('run')
      .set({ summary: sql`summary #- '{year,roomMinC}'` })
      .execute();
    expect((await read()).designs[0]!.lastRun).toMatchObject({
      engineVersion: '0.0.9',
      currentEngine: false,
      current: false,
    });
    const repeated = await repeatRun(id);
    if (!repeated.ok) throw new Error(repeated.message);
    expect(repeated).toMatchObject({
      before: { engineVersion: '0.0.9' },
      after: { engineVersion: ENGINE_VERSION, current: true },
      sameInputs: true,
    });
    const figure = (label: string) => repeated.differences.find((line) => line.label === label);
    expect(figure('coldest room')).toMatchObject({ before: null });
    const bought = figure('bought energy')!;
    expect(bought.before).toBe(bought.after);
    expect((await read()).designs[0]!.lastRun).toMatchObject({ currentEngine: true });
  });

  it('keeps no more than five runs of a design, the newest', async () => {
    const { id } = (await read()).designs[0]!;
    const stored = await readRun(id);
    if (!stored.ok) throw new Error(stored.message);
    const hashes = Array.from({ length: 6 }, (_, i) => String(i).repeat(64));
    for (const hash of hashes) {
      await world.db.transaction().execute((trx) => insertRun(trx, id, hash, stored.result));
    }
    const kept = await world.db.selectFrom('run').select('inputs_hash').orderBy('created_at').execute();
    expect(kept.map((run) => run.inputs_hash)).toEqual(hashes.slice(1));
  });
});
