import { readdirSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { Refusal } from '@/lib/schemas/answer';
import * as bills from '@/lib/server/bills';
import * as designs from '@/lib/server/designs';
import * as projects from '@/lib/server/projects';
import * as runs from '@/lib/server/runs';
import * as weatherYears from '@/lib/server/weather-years';
import { hasPostgres } from './fresh-database';
import { EPW_BYTES, openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

interface Things {
  projectId: string;
  designId: string;
  weatherYearId: string;
}

type Call = (things: Things) => Promise<{ ok: boolean } | Refusal>;

const design = demonstration.designs[0]!;

/** Every function that takes a thing of somebody's. */
const OF_A_THING: Record<string, Call> = {
  readProject: ({ projectId }) => projects.readProject(projectId),
  renameProject: ({ projectId }) => projects.renameProject(projectId, 'Taken over'),
  saveHouse: ({ projectId }) => projects.saveHouse(projectId, demonstration.house, 1),
  savePrices: ({ projectId }) => projects.savePrices(projectId, demonstration.prices, 1),
  readBills: ({ projectId }) => bills.readBills(projectId),
  saveBills: ({ projectId }) => bills.saveBills(projectId, larkspurBills(), 1),
  readModelHeat: ({ projectId }) => bills.readModelHeat(projectId),
  takeLossFromBills: ({ projectId }) => bills.takeLossFromBills(projectId, 2),
  releaseLoss: ({ projectId }) => bills.releaseLoss(projectId, 3),
  createDesign: ({ projectId }) => designs.createDesign(projectId, design),
  saveDesign: ({ designId }) => designs.saveDesign(designId, design, 1),
  readRun: ({ designId }) => runs.readRun(designId),
  repeatRun: ({ designId }) => runs.repeatRun(designId),
  listWeatherYears: ({ projectId }) => weatherYears.listWeatherYears(projectId),
  storeWeatherYear: ({ projectId }) =>
    weatherYears.storeWeatherYear(projectId, 'hill.epw', EPW_BYTES, { repair: false }),
  chooseWeatherYear: ({ projectId, weatherYearId }) =>
    weatherYears.chooseWeatherYear(projectId, weatherYearId),
  readWeatherYear: ({ weatherYearId }) => weatherYears.readWeatherYear(weatherYearId),
  deleteWeatherYear: ({ projectId, weatherYearId }) =>
    weatherYears.deleteWeatherYear(projectId, weatherYearId),
  deleteDesign: ({ designId }) => designs.deleteDesign(designId),
  deleteProject: ({ projectId }) => projects.deleteProject(projectId),
};

/** Functions that need an account but no thing. */
const OF_AN_ACCOUNT: Record<string, Call> = {
  listProjects: () => projects.listProjects(),
  createProjectFromDemonstration: () => projects.createProjectFromDemonstration('My house'),
};

const ALL = { ...OF_AN_ACCOUNT, ...OF_A_THING };

/** Files of lib/server that pages and route handlers do not call for data. */
const INNER = [
  'authorise',
  'conflict',
  'current-account',
  'database',
  'database-failure',
  'design-run',
  'env',
  'inputs-hash',
  'once-per-process',
  'parse-input',
  'refusal-response',
  'run-pool',
  'sessions',
  'upload',
];
const OUTER = { bills, designs, projects, runs, 'weather-years': weatherYears };

describe('the table of functions', () => {
  it('names every file of lib/server', () => {
    const files = readdirSync(path.join(import.meta.dirname, '../../lib/server'));
    const known = [...INNER, ...Object.keys(OUTER)].map((name) => `${name}.ts`);
    expect(files.sort()).toEqual(known.sort());
  });

  it('names every function that a page may call', () => {
    const exported = Object.values(OUTER).flatMap((module) => Object.keys(module));
    expect(exported.sort()).toEqual(Object.keys(ALL).sort());
  });
});

describe.skipIf(!hasPostgres)('who may call', { timeout: 30_000 }, () => {
  let world: ServerWorld;
  let owner: string;
  let stranger: string;
  let things: Things;

  beforeAll(async () => {
    world = await openWorld();
    owner = await world.signUp('owner@tepidarium.example');
    stranger = await world.signUp('stranger@tepidarium.example');
    visitor.sessionId = owner;
    const project = await projects.createProjectFromDemonstration('Larkspur House');
    if (!project.ok) throw new Error(project.message);
    const { projectId } = project;
    const year = await weatherYears.storeWeatherYear(projectId, 'hill.epw', EPW_BYTES, { repair: false });
    if (!year.ok) throw new Error(year.message);
    const detail = await projects.readProject(projectId);
    if (!detail.ok) throw new Error(detail.message);
    things = { projectId, designId: detail.designs[0]!.id, weatherYearId: year.weatherYear.id };
  });
  afterAll(() => world.drop());

  it.each(Object.entries(ALL))('%s: nobody without a session', async (_name, call) => {
    visitor.sessionId = undefined;
    expect(await call(things)).toMatchObject({ ok: false, code: 'signed out' });
  });

  it.each(Object.entries(ALL))(
    '%s: nobody with a session that is not in the database',
    async (_name, call) => {
      visitor.sessionId = '00000000-0000-4000-8000-000000000000';
      expect(await call(things)).toMatchObject({ ok: false, code: 'signed out' });
    },
  );

  describe('what is somebody else’s', () => {
    beforeEach(() => {
      visitor.sessionId = stranger;
    });

    it.each(Object.entries(OF_A_THING))('%s: answers as if it were not there', async (_name, call) => {
      expect(await call(things)).toMatchObject({ ok: false, code: 'not found' });
    });

    it.each(Object.entries(OF_A_THING))('%s: the same for what is no id at all', async (_name, call) => {
      const nothing = { projectId: 'x', designId: "' or 1=1", weatherYearId: '../..' };
      expect(await call(nothing)).toMatchObject({ ok: false, code: 'not found' });
    });

    it('listProjects: shows none of it', async () => {
      expect(await projects.listProjects()).toEqual({ ok: true, projects: [] });
    });
  });

  it('leaves everything as it was, and the owner may do it all', async () => {
    visitor.sessionId = owner;
    const before = await projects.readProject(things.projectId);
    expect(before).toMatchObject({ project: { name: 'Larkspur House' }, houseVersion: 1, pricesVersion: 1 });
    for (const [name, call] of Object.entries(ALL)) {
      expect(await call(things), name).toMatchObject({ ok: true });
    }
  });
});
