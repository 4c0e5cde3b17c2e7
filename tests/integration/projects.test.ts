import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { createDesign, deleteDesign, saveDesign } from '@/lib/server/designs';
import {
  createProjectFromDemonstration,
  deleteProject,
  listProjects,
  readProject,
  renameProject,
  saveHouse,
  savePrices,
} from '@/lib/server/projects';
import { hasPostgres } from './fresh-database';
import { openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

const { house, prices, designs } = demonstration;

describe.skipIf(!hasPostgres)('projects', { timeout: 30_000 }, () => {
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
    const answer = await createProjectFromDemonstration('  Mill Cottage ');
    if (!answer.ok) throw new Error(answer.message);
    projectId = answer.projectId;
  });
  afterAll(() => world.drop());

  it('begins with the demonstration, to the last digit', async () => {
    const project = await read();
    expect(project.project.name).toBe('Mill Cottage');
    expect(project.house).toEqual(house);
    expect(project.prices).toEqual(prices);
    expect(project.designs.map((design) => design.data)).toEqual(designs);
    expect(await listProjects()).toMatchObject({
      projects: [{ id: projectId, name: 'Mill Cottage', designs: designs.length }],
    });
  });

  it('reads back what was saved', async () => {
    expect(await saveHouse(projectId, { ...house, roomSetC: 21.5 }, 1)).toEqual({ ok: true, version: 2 });
    expect(await savePrices(projectId, { ...prices, fuelPerKwh: 0.123 }, 1)).toEqual({
      ok: true,
      version: 2,
    });
    const project = await read();
    expect(project.house.roomSetC).toBe(21.5);
    expect(project.prices.fuelPerKwh).toBe(0.123);
  });

  it('refuses a save over somebody else’s and shows what stands', async () => {
    const answer = await saveHouse(projectId, { ...house, roomSetC: 18 }, 1);
    expect(answer).toMatchObject({
      ok: false,
      code: 'conflict',
      current: { version: 2, data: { roomSetC: 21.5 } },
    });
    expect(await savePrices(projectId, prices, 1)).toMatchObject({
      code: 'conflict',
      current: { version: 2 },
    });
    expect((await read()).house.roomSetC).toBe(21.5);
  });

  it('lets one of two saves at the same time win', async () => {
    const { id, version, data } = (await read()).designs[0]!;
    const withArea = (areaM2: number) => ({ ...data, array: { ...data.array, areaM2 } });
    const answers = await Promise.all([
      saveDesign(id, withArea(30), version),
      saveDesign(id, withArea(31), version),
    ]);
    expect(answers.map((answer) => answer.ok).sort()).toEqual([false, true]);
    const winner = answers[0].ok ? 30 : 31;
    const stored = (await read()).designs[0]!;
    expect([stored.data.array.areaM2, stored.version]).toEqual([winner, version + 1]);
  });

  it('stores nothing of an input that does not fit, and says what to type', async () => {
    const before = await read();
    const { id, version, data } = before.designs[0]!;
    const answer = await saveDesign(id, { ...data, array: { ...data.array, tiltDeg: 12 } }, version);
    expect(answer).toEqual({
      ok: false,
      code: 'invalid',
      message: 'Tilt: type 25 to 90 °.',
      field: 'array.tiltDeg',
    });
    expect(await saveHouse(projectId, house, 'latest' as unknown as number)).toMatchObject({
      code: 'invalid',
    });
    expect(await saveHouse(projectId, { nonsense: true }, before.houseVersion)).toMatchObject({
      code: 'invalid',
    });
    expect(await read()).toEqual(before);
  });

  it('adds a design at the end and removes it with its runs', async () => {
    const added = await createDesign(projectId, { ...designs[0]!, name: 'Fourth' });
    if (!added.ok) throw new Error(added.message);
    expect((await read()).designs.at(-1)).toMatchObject({ id: added.designId, name: 'Fourth', version: 1 });
    expect(await deleteDesign(added.designId)).toEqual({ ok: true });
    expect((await read()).designs).toHaveLength(designs.length);
  });

  it('renames, refuses an empty name, and deletes everything that hangs on a project', async () => {
    expect(await renameProject(projectId, ' ')).toMatchObject({ code: 'invalid', field: 'name' });
    expect(await renameProject(projectId, 'Mill')).toEqual({ ok: true });
    expect((await read()).project.name).toBe('Mill');
    expect(await deleteProject(projectId)).toEqual({ ok: true });
    for (const table of ['project', 'house', 'design', 'run'] as const) {
      expect(await world.db.selectFrom(table).selectAll().execute(), table).toEqual([]);
    }
  });
});
