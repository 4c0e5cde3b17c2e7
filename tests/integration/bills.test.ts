import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { billsSchema } from '@/lib/schemas/bills';
import { readBills, readModelHeat, releaseLoss, saveBills, takeLossFromBills } from '@/lib/server/bills';
import { createProjectFromDemonstration, readProject } from '@/lib/server/projects';
import { hasPostgres } from './fresh-database';
import { openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

describe.skipIf(!hasPostgres)('bills', { timeout: 60_000 }, () => {
  let world: ServerWorld;
  let projectId: string;

  const read = async () => {
    const answer = await readBills(projectId);
    if (!answer.ok) throw new Error(answer.message);
    return answer;
  };
  const calibration = async () => {
    const answer = await readProject(projectId);
    if (!answer.ok) throw new Error(answer.message);
    return answer.house.calibration;
  };

  beforeAll(async () => {
    world = await openWorld();
    visitor.sessionId = await world.signUp('owner@tepidarium.example');
    const answer = await createProjectFromDemonstration('Bill Cottage');
    if (!answer.ok) throw new Error(answer.message);
    projectId = answer.projectId;
  });
  afterAll(() => world.drop());

  it('begin with the 26 readings of the demonstration', async () => {
    const { bills, version, typicalDayC } = await read();
    expect(bills).toEqual(larkspurBills());
    expect(bills.rows).toHaveLength(26);
    expect(version).toBe(1);
    // Template databases hold no climates: the demonstration's weather is chosen by the seed.
    expect(typicalDayC).toBeNull();
  });

  it('are read back as they were saved, and not over somebody else’s', async () => {
    const mended = { ...larkspurBills(), otherKwhPerYear: 600 };
    expect(await saveBills(projectId, mended, 1)).toEqual({ ok: true, version: 2 });
    expect((await read()).bills.otherKwhPerYear).toBe(600);
    expect(await saveBills(projectId, larkspurBills(), 1)).toMatchObject({
      ok: false,
      code: 'conflict',
      current: { version: 2, data: { otherKwhPerYear: 600 } },
    });
  });

  it('that do not fit are refused with the field', async () => {
    const rows = [{ from: '1.2.2024', to: '2024-03-01', quantity: 1, estimated: false }];
    expect(await saveBills(projectId, { ...larkspurBills(), rows }, 2)).toMatchObject({
      code: 'invalid',
      field: 'rows.0.from',
    });
  });

  it('need a weather year before the house is scaled to them', async () => {
    expect(await takeLossFromBills(projectId, 1)).toMatchObject({ ok: false, code: 'invalid' });
    expect(await calibration()).toEqual({ factor: 1, basis: 'as entered' });
  });

  it('of a project without any are empty, and two first saves do not overwrite each other', async () => {
    await world.db.deleteFrom('bills').where('project_id', '=', projectId).execute();
    expect(await read()).toMatchObject({ version: 0, bills: billsSchema.parse({}) });
    expect(await saveBills(projectId, larkspurBills(), 0)).toEqual({ ok: true, version: 1 });
    expect(await saveBills(projectId, billsSchema.parse({}), 0)).toMatchObject({
      code: 'conflict',
      current: { version: 1 },
    });
  });

  it('scale the house, and let it go again', async () => {
    const { upsertClimate, findClimateId } = await import('@/db/queries/weather-years');
    const { climateYear } = await import('@/data/climates/climates');
    await upsertClimate(world.db, 'upland-u46', climateYear('upland-u46')!, 'a'.repeat(64));
    const weatherYearId = (await findClimateId(world.db, 'upland-u46'))!;
    await world.db
      .updateTable('project')
      .set({ weather_year_id: weatherYearId })
      .where('id', '=', projectId)
      .execute();
    const before = await readModelHeat(projectId);
    if (!before.ok) throw new Error(before.message);
    expect(before.dayKwh).toHaveLength(365);

    const taken = await takeLossFromBills(projectId, 1);
    if (!taken.ok) throw new Error(taken.message);
    expect(taken.factor).toBeGreaterThan(0.9);
    expect(taken.factor).toBeLessThan(0.99);
    expect(await calibration()).toEqual({ factor: taken.factor, basis: 'bills' });
    const after = await readModelHeat(projectId);
    if (!after.ok) throw new Error(after.message);
    const sum = (days: number[]) => days.reduce((total, day) => total + day, 0);
    expect(sum(after.dayKwh)).toBeLessThan(sum(before.dayKwh) - 500);

    expect(await takeLossFromBills(projectId, 1)).toMatchObject({ ok: false, code: 'conflict' });
    expect(await releaseLoss(projectId, taken.version)).toMatchObject({ ok: true, factor: 1 });
    expect(await calibration()).toEqual({ factor: 1, basis: 'as entered' });
  });
});
