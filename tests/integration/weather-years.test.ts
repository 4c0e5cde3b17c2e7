import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { toBytes } from '@/db/pack-floats';
import { createProjectFromDemonstration, readProject } from '@/lib/server/projects';
import {
  chooseWeatherYear,
  deleteWeatherYear,
  listWeatherYears,
  readWeatherYear,
  storeWeatherYear,
} from '@/lib/server/weather-years';
import { readWeather } from '@/lib/weather/read-weather';
import { WEATHER_COLUMNS, weatherFacts } from '@/lib/weather/weather-header';
import { hasPostgres } from './fresh-database';
import { EPW_BYTES, openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

describe.skipIf(!hasPostgres)('weather years', { timeout: 30_000 }, () => {
  let world: ServerWorld;
  let projectId: string;
  let weatherYearId: string;

  beforeAll(async () => {
    world = await openWorld();
    visitor.sessionId = await world.signUp('owner@tepidarium.example');
    const project = await createProjectFromDemonstration();
    if (!project.ok) throw new Error(project.message);
    projectId = project.projectId;
  });
  afterAll(() => world.drop());

  it('keeps the file byte for byte and chooses its year', async () => {
    const answer = await storeWeatherYear(projectId, 'hill.epw', EPW_BYTES, { repair: false });
    if (!answer.ok) throw new Error(answer.message);
    weatherYearId = answer.weatherYear.id;
    const row = await world.db
      .selectFrom('weather_year')
      .select(['original', 'sha256'])
      .where('id', '=', weatherYearId)
      .executeTakeFirstOrThrow();
    expect(Buffer.compare(row.original!, EPW_BYTES)).toBe(0);
    expect(row.sha256).toBe(createHash('sha256').update(EPW_BYTES).digest('hex'));
    expect(await readProject(projectId)).toMatchObject({
      weatherYear: { id: weatherYearId, name: 'Invented Hill', builtIn: false, fileName: 'hill.epw' },
    });
  });

  it('returns the columns to the last bit', async () => {
    const read = readWeather(EPW_BYTES);
    const answer = await readWeatherYear(weatherYearId);
    if (!read.ok || !answer.ok) throw new Error('not read');
    for (const column of WEATHER_COLUMNS) {
      expect(toBytes(answer.weatherYear[column]).equals(toBytes(read.year[column])), column).toBe(true);
    }
    const { sha256, ...facts } = weatherFacts(answer.weatherYear);
    expect(facts).toEqual(weatherFacts(read.year));
    expect(sha256).toHaveLength(64);
  });

  it('refuses a file with a row too few, with its row, and stores nothing', async () => {
    const lines = new TextDecoder().decode(EPW_BYTES).split('\n');
    const cut = new TextEncoder().encode([...lines.slice(0, 1000), ...lines.slice(1001)].join('\n'));
    const answer = await storeWeatherYear(projectId, 'cut.epw', cut, { repair: false });
    expect(answer).toMatchObject({ ok: false, code: 'invalid' });
    expect('rows' in answer && answer.rows?.length).toBeGreaterThan(0);
    expect('repair' in answer && answer.repair).toBeTruthy();
    const list = await listWeatherYears(projectId);
    expect(list.ok && list.weatherYears.map((year) => year.fileName)).toEqual(['hill.epw']);

    const repaired = await storeWeatherYear(projectId, 'cut.epw', cut, { repair: true });
    if (!repaired.ok) throw new Error(repaired.message);
    expect(repaired.weatherYear.notes.some((note) => note.kind === 'repair')).toBe(true);
    const { original } = await world.db
      .selectFrom('weather_year')
      .select('original')
      .where('id', '=', repaired.weatherYear.id)
      .executeTakeFirstOrThrow();
    expect(Buffer.compare(original!, cut)).toBe(0);
  });

  it('goes back to an earlier year and removes the other', async () => {
    const list = await listWeatherYears(projectId);
    if (!list.ok) throw new Error(list.message);
    const other = list.weatherYears.find((year) => year.fileName === 'cut.epw')!;
    expect(await chooseWeatherYear(projectId, weatherYearId)).toEqual({ ok: true });
    expect(await deleteWeatherYear(projectId, other.id)).toEqual({ ok: true });
    expect(await listWeatherYears(projectId)).toMatchObject({ chosenId: weatherYearId });
  });
});
