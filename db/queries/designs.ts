import { sql } from 'kysely';
import type { Kysely } from 'kysely';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import type { Database } from '../schema';
import { upToDate } from './up-to-date';

/** Appends a design to the project's. */
export function insertDesign(db: Kysely<Database>, projectId: string, design: DesignRecord) {
  return db
    .insertInto('design')
    .values((eb) => ({
      project_id: projectId,
      data: JSON.stringify(design),
      position: eb
        .selectFrom('design')
        .where('project_id', '=', projectId)
        .select((last) => sql<number>`coalesce(${last.fn.max('position')} + 1, 0)`.as('position')),
    }))
    .returning(['id', 'version'])
    .executeTakeFirstOrThrow();
}

export async function listDesigns(db: Kysely<Database>, projectId: string) {
  const rows = await db
    .selectFrom('design')
    .select(['id', 'name', 'data', 'version'])
    .where('project_id', '=', projectId)
    .orderBy('position')
    .orderBy('created_at')
    .execute();
  return rows.map((row) => ({ ...row, data: upToDate(designSchema, row.data) }));
}

/** The design, if its project is the owner's. */
export async function findDesign(db: Kysely<Database>, designId: string, ownerId: string) {
  const row = await db
    .selectFrom('design')
    .innerJoin('project', 'project.id', 'design.project_id')
    .selectAll('design')
    .where('design.id', '=', designId)
    .where('project.owner_id', '=', ownerId)
    .executeTakeFirst();
  return row && { ...row, data: upToDate(designSchema, row.data) };
}

/** Writes the design when nobody has since the given version; undefined otherwise. */
export function updateDesign(db: Kysely<Database>, designId: string, design: DesignRecord, version: number) {
  return db
    .updateTable('design')
    .set({ data: JSON.stringify(design), version: version + 1, updated_at: sql<Date>`now()` })
    .where('id', '=', designId)
    .where('version', '=', version)
    .returning('version')
    .executeTakeFirst();
}

export async function deleteDesignRow(db: Kysely<Database>, designId: string): Promise<void> {
  await db.deleteFrom('design').where('id', '=', designId).execute();
}
