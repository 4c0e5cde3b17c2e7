import type { Kysely, Transaction } from 'kysely';
import type { YearResult } from '@/lib/simulation/results';
import { packHours, unpackHours } from '../pack-hours';
import type { Database, RunRow } from '../schema';

/** Runs kept per design; older ones go when a new one is stored. */
const KEPT_RUNS = 5;

/** Stores a run and returns it; storing the same inputs again changes nothing. */
export async function insertRun(
  trx: Transaction<Database>,
  designId: string,
  inputsHash: string,
  result: YearResult,
): Promise<RunRow> {
  const { columns, months, balance, engineVersion, ...summary } = result;
  const { layout, bytes } = packHours(columns);
  await trx
    .insertInto('run')
    .values({
      design_id: designId,
      inputs_hash: inputsHash,
      engine_version: engineVersion,
      summary: JSON.stringify(summary),
      months: JSON.stringify(months),
      balance: JSON.stringify(balance),
      columns_layout: JSON.stringify(layout),
      columns: bytes,
    })
    .onConflict((conflict) => conflict.constraint('run_of_inputs').doNothing())
    .execute();
  await deleteOldRuns(trx, designId);
  return findRun(trx, designId, inputsHash, engineVersion).executeTakeFirstOrThrow();
}

async function deleteOldRuns(db: Kysely<Database>, designId: string): Promise<void> {
  const old = db
    .selectFrom('run')
    .select('id')
    .where('design_id', '=', designId)
    .orderBy('created_at', 'desc')
    .offset(KEPT_RUNS);
  await db.deleteFrom('run').where('id', 'in', old).execute();
}

/** Query for the run of exactly these inputs and this engine. */
export function findRun(db: Kysely<Database>, designId: string, inputsHash: string, engineVersion: string) {
  return db
    .selectFrom('run')
    .selectAll()
    .where('design_id', '=', designId)
    .where('inputs_hash', '=', inputsHash)
    .where('engine_version', '=', engineVersion);
}

/** The newest run of a design, in figures only; undefined before the first. */
export function findLastRun(db: Kysely<Database>, designId: string) {
  return db
    .selectFrom('run')
    .select(['inputs_hash', 'engine_version', 'summary', 'created_at'])
    .where('design_id', '=', designId)
    .orderBy('created_at', 'desc')
    .limit(1)
    .executeTakeFirst();
}

/** The newest run of each design of a project, in figures only. */
export function listLastRuns(db: Kysely<Database>, projectId: string) {
  return db
    .selectFrom('run')
    .innerJoin('design', 'design.id', 'run.design_id')
    .distinctOn('run.design_id')
    .select(['run.design_id', 'run.inputs_hash', 'run.engine_version', 'run.summary', 'run.created_at'])
    .where('design.project_id', '=', projectId)
    .orderBy('run.design_id')
    .orderBy('run.created_at', 'desc')
    .execute();
}

/** The result as the engine returned it. */
export function resultOfRun(run: RunRow): YearResult {
  return {
    ...run.summary,
    engineVersion: run.engine_version,
    months: run.months,
    balance: run.balance,
    columns: unpackHours(run.columns_layout, run.columns),
  };
}
