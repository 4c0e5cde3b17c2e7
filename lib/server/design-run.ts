import 'server-only';
import { findHouse } from '@/db/queries/houses';
import { findRun, insertRun, resultOfRun } from '@/db/queries/runs';
import { findWeatherHeader, findWeatherYear } from '@/db/queries/weather-years';
import type { DesignRow, ProjectRow, RunRow } from '@/db/schema';
import type { Answer } from '@/lib/schemas/answer';
import { numericsSchema } from '@/lib/schemas/design-file';
import type { HouseRecord } from '@/lib/schemas/house';
import type { RunSummary } from '@/lib/schemas/run-summary';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import type { YearResult } from '@/lib/simulation/results';
import { database } from './database';
import { inputsHash } from './inputs-hash';
import { runPool } from './run-pool';

/** The numerics of every year that the server works. */
const numerics = numericsSchema.parse({});

/** What a run of this design would be known by just now. */
export function hashOfDesign(house: HouseRecord, design: DesignRow['data'], weatherSha256: string): string {
  return inputsHash({ house, design, numerics, weatherSha256 });
}

type SummaryRow = Pick<RunRow, 'engine_version' | 'inputs_hash' | 'summary' | 'created_at'>;

/** A stored run in figures, for inputs that have this hash now. */
export function summaryOfRun(run: SummaryRow, currentHash: string | undefined): RunSummary {
  return {
    engineVersion: run.engine_version,
    inputsHash: run.inputs_hash,
    createdAt: run.created_at.toISOString(),
    current: run.inputs_hash === currentHash && run.engine_version === ENGINE_VERSION,
    currentEngine: run.engine_version === ENGINE_VERSION,
    year: run.summary.year,
    dryParts: run.summary.dryParts,
  };
}

/** The server's own year for the stored inputs: read when it stands there, otherwise worked out and stored. */
export async function yearOfDesign(
  project: ProjectRow,
  design: Pick<DesignRow, 'id' | 'data'>,
): Promise<Answer<{ summary: RunSummary; result: YearResult }>> {
  const db = database();
  const house = await findHouse(db, project.id);
  const header = project.weather_year_id && (await findWeatherHeader(db, project.weather_year_id));
  if (!header) {
    return {
      ok: false,
      code: 'invalid',
      message: 'Choose a weather year for this project first.',
      field: 'weather',
    };
  }
  const hash = hashOfDesign(house.data, design.data, header.sha256 ?? '');
  let run = await findRun(db, design.id, hash, ENGINE_VERSION).executeTakeFirst();
  if (!run) {
    const weather = await findWeatherYear(db, header.id, project.owner_id);
    if (!weather)
      return { ok: false, code: 'not found', message: 'The weather year of this project is gone.' };
    const outcome = await runPool().run({ weather, house: house.data, design: design.data, numerics });
    if (!outcome.ok) return outcome;
    run = await db.transaction().execute((trx) => insertRun(trx, design.id, hash, outcome.result));
  }
  return { ok: true, summary: summaryOfRun(run, hash), result: resultOfRun(run) };
}
