import type { Kysely } from 'kysely';

/* Frozen once landed: a later change is a later file. Nothing here may import from the application. */

export async function up(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('bills')
    .addColumn('project_id', 'uuid', (c) => c.primaryKey().references('project.id').onDelete('cascade'))
    .addColumn('data', 'jsonb', (c) => c.notNull())
    .addColumn('version', 'integer', (c) => c.notNull().defaultTo(1))
    .execute();
}

export async function down(db: Kysely<unknown>): Promise<void> {
  await db.schema.dropTable('bills').execute();
}
