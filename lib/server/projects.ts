import 'server-only';
import { z } from 'zod';
import { listDesigns } from '@/db/queries/designs';
import { findHouse, updateHouse } from '@/db/queries/houses';
import {
  deleteProjectRow,
  insertProject,
  listProjectsOfOwner,
  renameProjectRow,
  touchProject,
  updatePrices,
} from '@/db/queries/projects';
import { listLastRuns } from '@/db/queries/runs';
import { findClimateId, findWeatherHeader } from '@/db/queries/weather-years';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { Answer, Conflict, Refusal } from '@/lib/schemas/answer';
import type { DesignRecord } from '@/lib/schemas/design';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { pricesSchema, type Prices } from '@/lib/schemas/prices';
import { shortName } from '@/lib/schemas/quantity';
import type { RunSummary } from '@/lib/schemas/run-summary';
import type { WeatherHeader } from '@/lib/weather/weather-header';
import { asAccount, withProject } from './authorise';
import { conflict } from './conflict';
import { database } from './database';
import { hashOfDesign, summaryOfRun } from './design-run';
import { parseInput, parseVersioned } from './parse-input';

const projectName = z.object({ name: shortName('Project', 'My house') });

export interface ProjectSummary {
  id: string;
  name: string;
  /** name of the weather year */
  place: string | null;
  designs: number;
  updatedAt: string;
}

export interface ProjectDetail {
  project: { id: string; name: string };
  house: HouseRecord;
  houseVersion: number;
  prices: Prices;
  pricesVersion: number;
  designs: { id: string; name: string; data: DesignRecord; version: number; lastRun: RunSummary | null }[];
  weatherYear: WeatherHeader | null;
}

/** The projects of the signed-in account, last changed first. */
export function listProjects(): Promise<Answer<{ projects: ProjectSummary[] }>> {
  return asAccount(async (account) => {
    const rows = await listProjectsOfOwner(database(), account.id);
    const projects = rows.map((row) => ({
      id: row.id,
      name: row.name,
      place: row.place,
      designs: Number(row.designs),
      updatedAt: row.updated_at.toISOString(),
    }));
    return { ok: true, projects };
  });
}

/** A new project: the demonstration house, its prices and its designs, to be changed at will. */
export function createProjectFromDemonstration(name?: string): Promise<Answer<{ projectId: string }>> {
  return asAccount(async (account) => {
    const input = parseInput(projectName, { name: name ?? demonstration.house.name });
    if (!input.ok) return input;
    const weatherYearId = (await findClimateId(database(), demonstration.climateId)) ?? null;
    const { house, prices, designs } = demonstration;
    const bills = larkspurBills();
    const project = {
      ownerId: account.id,
      name: input.data.name,
      house,
      bills,
      prices,
      designs,
      weatherYearId,
    };
    const projectId = await database()
      .transaction()
      .execute((trx) => insertProject(trx, project));
    return { ok: true, projectId };
  });
}

/** Everything that the pages of a project show, without hours. */
export function readProject(projectId: string): Promise<Answer<ProjectDetail>> {
  return withProject(projectId, async (project) => {
    const db = database();
    const [house, designs, lastRuns, weatherYear] = await Promise.all([
      findHouse(db, project.id),
      listDesigns(db, project.id),
      listLastRuns(db, project.id),
      project.weather_year_id ? findWeatherHeader(db, project.weather_year_id) : undefined,
    ]);
    const runs = new Map(lastRuns.map((run) => [run.design_id, run]));
    const withRun = (design: (typeof designs)[number]) => {
      const run = runs.get(design.id);
      if (!run) return { ...design, lastRun: null };
      const hash = weatherYear?.sha256 && hashOfDesign(house.data, design.data, weatherYear.sha256);
      return { ...design, lastRun: summaryOfRun(run, hash) };
    };
    return {
      ok: true,
      project: { id: project.id, name: project.name },
      house: house.data,
      houseVersion: house.version,
      prices: project.prices,
      pricesVersion: project.prices_version,
      designs: designs.map(withRun),
      weatherYear: weatherYear ?? null,
    };
  });
}

/** Gives the project another name. */
export function renameProject(projectId: string, name: string): Promise<{ ok: true } | Refusal> {
  return withProject(projectId, async (project) => {
    const input = parseInput(projectName, { name });
    if (!input.ok) return input;
    await renameProjectRow(database(), project.id, input.data.name);
    return { ok: true as const };
  });
}

/** Removes the project with its house, designs, runs and uploaded weather. */
export function deleteProject(projectId: string): Promise<{ ok: true } | Refusal> {
  return withProject(projectId, async (project) => {
    await deleteProjectRow(database(), project.id);
    return { ok: true as const };
  });
}

/** Stores the house, unless somebody has stored it since `version` was read. */
export function saveHouse(
  projectId: string,
  data: unknown,
  version: number,
): Promise<Answer<{ version: number }> | Conflict<HouseRecord>> {
  return withProject(projectId, async (project) => {
    const input = parseVersioned(houseSchema, data, version);
    if (!input.ok) return input;
    const saved = await database()
      .transaction()
      .execute(async (trx) => {
        await touchProject(trx, project.id);
        return updateHouse(trx, project.id, input.data, version);
      });
    if (saved) return { ok: true as const, version: saved.version };
    return conflict('house', await findHouse(database(), project.id));
  });
}

/** Stores the prices, unless somebody has stored them since `version` was read. */
export function savePrices(
  projectId: string,
  data: unknown,
  version: number,
): Promise<Answer<{ version: number }> | Conflict<Prices>> {
  return withProject(projectId, async (project) => {
    const input = parseVersioned(pricesSchema, data, version);
    if (!input.ok) return input;
    const saved = await updatePrices(database(), project.id, input.data, version);
    if (saved) return { ok: true as const, version: saved.version };
    return conflict('prices', { data: project.prices, version: project.prices_version });
  });
}
