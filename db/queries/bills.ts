import type { Kysely } from 'kysely';
import { billsSchema, type BillsRecord } from '@/lib/schemas/bills';
import type { Database } from '../schema';
import { upToDate } from './up-to-date';

/** The bills of a project; undefined while nobody has saved any. */
export async function findBills(db: Kysely<Database>, projectId: string) {
  const row = await db
    .selectFrom('bills')
    .select(['data', 'version'])
    .where('project_id', '=', projectId)
    .executeTakeFirst();
  return row && { ...row, data: upToDate(billsSchema, row.data) };
}

/** The first bills of a project; undefined when somebody has saved some already. */
export function insertBills(db: Kysely<Database>, projectId: string, bills: BillsRecord) {
  return db
    .insertInto('bills')
    .values({ project_id: projectId, data: JSON.stringify(bills) })
    .onConflict((conflict) => conflict.column('project_id').doNothing())
    .returning('version')
    .executeTakeFirst();
}

/** Writes the bills when nobody has since the given version; undefined otherwise. */
export function updateBills(db: Kysely<Database>, projectId: string, bills: BillsRecord, version: number) {
  return db
    .updateTable('bills')
    .set({ data: JSON.stringify(bills), version: version + 1 })
    .where('project_id', '=', projectId)
    .where('version', '=', version)
    .returning('version')
    .executeTakeFirst();
}
