import 'server-only';
import { findBills, insertBills, updateBills } from '@/db/queries/bills';
import { listDesigns } from '@/db/queries/designs';
import { findHouse, updateHouse } from '@/db/queries/houses';
import { touchProject } from '@/db/queries/projects';
import { findWeatherYear } from '@/db/queries/weather-years';
import type { ProjectRow } from '@/db/schema';
import { dailyMeans } from '@/lib/calibration/degree-days';
import type { Answer, Conflict, Refusal } from '@/lib/schemas/answer';
import { billsSchema, type BillsRecord } from '@/lib/schemas/bills';
import { calibrationSchema, type HouseRecord } from '@/lib/schemas/house';
import { houseByBills } from '@/lib/study/house-by-bills';
import { dayHeatKwh } from '@/lib/study/day-heat';
import { houseHeat } from '@/lib/simulation/house-heat';
import { withProject } from './authorise';
import { conflict } from './conflict';
import { database } from './database';
import { yearOfDesign } from './design-run';
import { parseInput, parseVersioned } from './parse-input';

/** The version of bills that nobody has saved yet. */
const NEVER_SAVED = 0;

export interface BillsDetail {
  bills: BillsRecord;
  version: number;
  /** daily means of the project's weather year [°C]; null where none is chosen */
  typicalDayC: number[] | null;
}

async function storedBills(projectId: string): Promise<{ data: BillsRecord; version: number }> {
  return (await findBills(database(), projectId)) ?? { data: billsSchema.parse({}), version: NEVER_SAVED };
}

async function typicalDays(project: ProjectRow): Promise<number[] | null> {
  const id = project.weather_year_id;
  const year = id && (await findWeatherYear(database(), id, project.owner_id));
  return year ? [...dailyMeans(year.dryBulbC)] : null;
}

/** The bills of a project and the outdoor days to hold them against. */
export function readBills(projectId: string): Promise<Answer<BillsDetail>> {
  return withProject(projectId, async (project) => {
    const [stored, typicalDayC] = await Promise.all([storedBills(project.id), typicalDays(project)]);
    return { ok: true as const, bills: stored.data, version: stored.version, typicalDayC };
  });
}

/** Stores the bills, unless somebody has stored them since `version` was read. */
export function saveBills(
  projectId: string,
  data: unknown,
  version: number,
): Promise<Answer<{ version: number }> | Conflict<BillsRecord>> {
  return withProject(projectId, async (project) => {
    const input = parseVersioned(billsSchema, data, version);
    if (!input.ok) return input;
    const saved = await database()
      .transaction()
      .execute(async (trx) => {
        await touchProject(trx, project.id);
        return version === NEVER_SAVED
          ? insertBills(trx, project.id, input.data)
          : updateBills(trx, project.id, input.data, version);
      });
    if (saved) return { ok: true as const, version: saved.version };
    return conflict('list of bills', await storedBills(project.id));
  });
}

async function modelHeat(project: ProjectRow): Promise<Answer<{ dayKwh: number[] }>> {
  const [design] = await listDesigns(database(), project.id);
  if (!design) return { ok: false, code: 'invalid', message: 'Add a design first: its house is simulated.' };
  const run = await yearOfDesign(project, design);
  return run.ok ? { ok: true, dayKwh: dayHeatKwh(run.result.columns) } : run;
}

/** Heat of the simulated house on each day of the typical year [kWh]. */
export function readModelHeat(projectId: string): Promise<Answer<{ dayKwh: number[] }>> {
  return withProject(projectId, modelHeat);
}

async function storeCalibration(
  projectId: string,
  version: number,
  calibration: HouseRecord['calibration'],
): Promise<Answer<{ version: number; factor: number }> | Conflict<HouseRecord>> {
  const { data } = await findHouse(database(), projectId);
  const saved = await database()
    .transaction()
    .execute(async (trx) => {
      await touchProject(trx, projectId);
      return updateHouse(trx, projectId, { ...data, calibration }, version);
    });
  if (saved) return { ok: true, version: saved.version, factor: calibration.factor };
  return conflict('house', await findHouse(database(), projectId));
}

/** Scales the loss of the house to its stored bills, worked out here and not taken from a client. */
export function takeLossFromBills(
  projectId: string,
  houseVersion: number,
): Promise<Answer<{ version: number; factor: number }> | Conflict<HouseRecord>> {
  return withProject(projectId, async (project) => {
    const [stored, typicalDayC, house, model] = await Promise.all([
      storedBills(project.id),
      typicalDays(project),
      findHouse(database(), project.id),
      modelHeat(project),
    ]);
    if (!model.ok) return model;
    const found = houseByBills(stored.data, house.data, typicalDayC, model.dayKwh);
    if (!found.model) {
      const message = found.byBills.refusals[0] ?? 'The bills have no slope to take.';
      return { ok: false as const, code: 'invalid' as const, message };
    }
    const entered = houseHeat({ ...house.data, calibration: { factor: 1 } }).totalWPerK;
    const factor = found.model.lossWPerK.value / entered;
    const input = parseInput(calibrationSchema, { factor, basis: 'bills' });
    if (!input.ok)
      return {
        ok: false as const,
        code: 'invalid' as const,
        message: `The bills say ${factor.toFixed(2)} times the loss of the shell as entered; 0.4 to 2 can be taken. Look at the shell, the calorific value and the efficiency first.`,
      };
    return storeCalibration(project.id, houseVersion, input.data);
  });
}

/** Goes back to the loss of the shell and the air change as entered. */
export function releaseLoss(
  projectId: string,
  houseVersion: number,
): Promise<Answer<{ version: number; factor: number }> | Conflict<HouseRecord> | Refusal> {
  return withProject(projectId, (project) =>
    storeCalibration(project.id, houseVersion, calibrationSchema.parse({})),
  );
}
