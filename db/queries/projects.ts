import { sql } from 'kysely';
import type { Kysely, Transaction } from 'kysely';
import type { BillsRecord } from '@/lib/schemas/bills';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { Database } from '../schema';
import { insertBills } from './bills';

const now = sql<Date>`now()`;

export interface NewProject {
  ownerId: string;
  name: string;
  house: HouseRecord;
  bills?: BillsRecord;
  prices: Prices;
  designs: readonly DesignRecord[];
  weatherYearId: string | null;
}

/** A project with its house and its designs, all or nothing. */
export async function insertProject(trx: Transaction<Database>, project: NewProject): Promise<string> {
  const { id } = await trx
    .insertInto('project')
    .values({
      owner_id: project.ownerId,
      name: project.name,
      prices: JSON.stringify(project.prices),
      weather_year_id: project.weatherYearId,
    })
    .returning('id')
    .executeTakeFirstOrThrow();
  await trx
    .insertInto('house')
    .values({ project_id: id, data: JSON.stringify(project.house) })
    .execute();
  if (project.bills) await insertBills(trx, id, project.bills);
  const designs = project.designs.map((design, position) => ({
    project_id: id,
    data: JSON.stringify(design),
    position,
  }));
  if (designs.length > 0) await trx.insertInto('design').values(designs).execute();
  return id;
}

export function listProjectsOfOwner(db: Kysely<Database>, ownerId: string) {
  return db
    .selectFrom('project')
    .leftJoin('weather_year', 'weather_year.id', 'project.weather_year_id')
    .select((eb) => [
      'project.id',
      'project.name',
      'project.updated_at',
      'weather_year.name as place',
      eb
        .selectFrom('design')
        .whereRef('design.project_id', '=', 'project.id')
        .select((count) => count.fn.countAll<string>().as('count'))
        .as('designs'),
    ])
    .where('project.owner_id', '=', ownerId)
    .orderBy('project.updated_at', 'desc')
    .execute();
}

/** The project, if it is the owner's. */
export function findProject(db: Kysely<Database>, projectId: string, ownerId: string) {
  return db
    .selectFrom('project')
    .selectAll()
    .where('id', '=', projectId)
    .where('owner_id', '=', ownerId)
    .executeTakeFirst();
}

export async function renameProjectRow(db: Kysely<Database>, projectId: string, name: string): Promise<void> {
  await db.updateTable('project').set({ name, updated_at: now }).where('id', '=', projectId).execute();
}

export async function deleteProjectRow(db: Kysely<Database>, projectId: string): Promise<void> {
  await db.deleteFrom('project').where('id', '=', projectId).execute();
}

export async function touchProject(db: Kysely<Database>, projectId: string): Promise<void> {
  await db.updateTable('project').set({ updated_at: now }).where('id', '=', projectId).execute();
}

export async function setWeatherYear(
  db: Kysely<Database>,
  projectId: string,
  weatherYearId: string,
): Promise<void> {
  await db
    .updateTable('project')
    .set({ weather_year_id: weatherYearId, updated_at: now })
    .where('id', '=', projectId)
    .execute();
}

/** Writes the prices when nobody has since the given version; undefined otherwise. */
export function updatePrices(db: Kysely<Database>, projectId: string, prices: Prices, version: number) {
  return db
    .updateTable('project')
    .set({ prices: JSON.stringify(prices), prices_version: version + 1, updated_at: now })
    .where('id', '=', projectId)
    .where('prices_version', '=', version)
    .returning('prices_version as version')
    .executeTakeFirst();
}
