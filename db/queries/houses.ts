import type { Kysely } from 'kysely';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import type { Database } from '../schema';
import { upToDate } from './up-to-date';

export async function findHouse(db: Kysely<Database>, projectId: string) {
  const row = await db
    .selectFrom('house')
    .select(['data', 'version'])
    .where('project_id', '=', projectId)
    .executeTakeFirstOrThrow();
  return { ...row, data: upToDate(houseSchema, row.data) };
}

/** Writes the house when nobody has since the given version; undefined otherwise. */
export function updateHouse(db: Kysely<Database>, projectId: string, house: HouseRecord, version: number) {
  return db
    .updateTable('house')
    .set({ data: JSON.stringify(house), version: version + 1 })
    .where('project_id', '=', projectId)
    .where('version', '=', version)
    .returning('version')
    .executeTakeFirst();
}
