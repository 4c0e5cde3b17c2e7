import { sql } from 'kysely';
import type { Kysely } from 'kysely';

/* Frozen once landed: a later change is a later file. Nothing here may import from the application. */

const WEATHER_COLUMNS = [
  'dry_bulb_c',
  'global_wm2',
  'beam_normal_wm2',
  'diffuse_wm2',
  'wind_m_per_s',
  'dew_point_c',
  'sky_longwave_wm2',
  'pressure_pa',
  'albedo',
];

const id = sql`gen_random_uuid()`;
const now = sql`now()`;

export async function up(db: Kysely<unknown>): Promise<void> {
  await createPeople(db);
  await createProjects(db);
  await createWeatherYears(db);
  await createDesignsAndRuns(db);
}

export async function down(db: Kysely<unknown>): Promise<void> {
  await db.schema.alterTable('project').dropConstraint('project_weather_year_id_fkey').execute();
  for (const table of [
    'run',
    'design',
    'collector',
    'house',
    'weather_year',
    'project',
    'session',
    'account',
  ]) {
    await db.schema.dropTable(table).execute();
  }
}

async function createPeople(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('account')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('email', 'text', (c) => c.notNull().unique())
    .addColumn('password_hash', 'text', (c) => c.notNull())
    .addColumn('name', 'text', (c) => c.notNull())
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addCheckConstraint('account_email_is_lower_case', sql`email = lower(email)`)
    .execute();

  await db.schema
    .createTable('session')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('account_id', 'uuid', (c) => c.notNull().references('account.id').onDelete('cascade'))
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addColumn('expires_at', 'timestamptz', (c) => c.notNull())
    .addColumn('last_seen_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .execute();
  await db.schema.createIndex('session_account_id').on('session').column('account_id').execute();
  await db.schema.createIndex('session_expires_at').on('session').column('expires_at').execute();
}

async function createProjects(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('project')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('owner_id', 'uuid', (c) => c.notNull().references('account.id').onDelete('cascade'))
    .addColumn('name', 'text', (c) => c.notNull().check(sql`name <> ''`))
    .addColumn('prices', 'jsonb', (c) => c.notNull())
    .addColumn('prices_version', 'integer', (c) => c.notNull().defaultTo(1))
    .addColumn('weather_year_id', 'uuid')
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addColumn('updated_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .execute();
  await db.schema.createIndex('project_owner_id').on('project').column('owner_id').execute();
  await db.schema.createIndex('project_weather_year_id').on('project').column('weather_year_id').execute();

  await db.schema
    .createTable('house')
    .addColumn('project_id', 'uuid', (c) => c.primaryKey().references('project.id').onDelete('cascade'))
    .addColumn('data', 'jsonb', (c) => c.notNull())
    .addColumn('version', 'integer', (c) => c.notNull().defaultTo(1))
    .execute();
}

async function createWeatherYears(db: Kysely<unknown>): Promise<void> {
  let table = db.schema
    .createTable('weather_year')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('project_id', 'uuid', (c) => c.references('project.id').onDelete('cascade'))
    .addColumn('climate_id', 'text', (c) => c.unique())
    .addColumn('name', 'text', (c) => c.notNull())
    .addColumn('source', 'text', (c) => c.notNull())
    .addColumn('synthetic', 'boolean', (c) => c.notNull())
    .addColumn('latitude_deg', 'double precision', (c) => c.notNull())
    .addColumn('longitude_deg', 'double precision', (c) => c.notNull())
    .addColumn('time_zone_h', 'double precision', (c) => c.notNull())
    .addColumn('elevation_m', 'double precision', (c) => c.notNull())
    .addColumn('header', 'jsonb', (c) => c.notNull())
    .addColumn('notes', 'jsonb', (c) => c.notNull())
    .addColumn('sha256', 'text', (c) => c.notNull().check(sql`sha256 ~ '^[0-9a-f]{64}$'`))
    .addColumn('file_name', 'text')
    .addColumn('original', 'bytea')
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addCheckConstraint('weather_year_has_one_home', sql`(project_id is null) <> (climate_id is null)`);
  for (const column of WEATHER_COLUMNS) {
    const check = sql`octet_length(${sql.ref(column)}) = 70080`;
    table = table.addColumn(column, 'bytea', (c) => c.notNull().check(check));
  }
  await table.execute();
  await storeUncompressed(db, 'weather_year', WEATHER_COLUMNS);
  await db.schema.createIndex('weather_year_project_id').on('weather_year').column('project_id').execute();
  await db.schema
    .alterTable('project')
    .addForeignKeyConstraint('project_weather_year_id_fkey', ['weather_year_id'], 'weather_year', ['id'])
    .onDelete('set null')
    .execute();
}

async function createDesignsAndRuns(db: Kysely<unknown>): Promise<void> {
  await db.schema
    .createTable('collector')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('owner_id', 'uuid', (c) => c.notNull().references('account.id').onDelete('cascade'))
    .addColumn('data', 'jsonb', (c) => c.notNull())
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addColumn('updated_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .execute();
  await db.schema.createIndex('collector_owner_id').on('collector').column('owner_id').execute();

  await db.schema
    .createTable('design')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('project_id', 'uuid', (c) => c.notNull().references('project.id').onDelete('cascade'))
    .addColumn('name', 'text', (c) =>
      c
        .notNull()
        .generatedAlwaysAs(sql`data ->> 'name'`)
        .stored(),
    )
    .addColumn('data', 'jsonb', (c) => c.notNull())
    .addColumn('version', 'integer', (c) => c.notNull().defaultTo(1))
    .addColumn('position', 'integer', (c) => c.notNull())
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addColumn('updated_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .execute();
  await db.schema
    .createIndex('design_project_id_position')
    .on('design')
    .columns(['project_id', 'position'])
    .execute();

  await db.schema
    .createTable('run')
    .addColumn('id', 'uuid', (c) => c.primaryKey().defaultTo(id))
    .addColumn('design_id', 'uuid', (c) => c.notNull().references('design.id').onDelete('cascade'))
    .addColumn('inputs_hash', 'text', (c) => c.notNull().check(sql`inputs_hash ~ '^[0-9a-f]{64}$'`))
    .addColumn('engine_version', 'text', (c) => c.notNull())
    .addColumn('summary', 'jsonb', (c) => c.notNull())
    .addColumn('months', 'jsonb', (c) => c.notNull())
    .addColumn('balance', 'jsonb', (c) => c.notNull())
    .addColumn('columns_layout', 'jsonb', (c) => c.notNull())
    .addColumn('columns', 'bytea', (c) => c.notNull())
    .addColumn('created_at', 'timestamptz', (c) => c.notNull().defaultTo(now))
    .addUniqueConstraint('run_of_inputs', ['design_id', 'inputs_hash', 'engine_version'])
    .execute();
  await storeUncompressed(db, 'run', ['columns']);
}

/** Hourly numbers hardly compress: trying costs more time than it saves room. */
async function storeUncompressed(db: Kysely<unknown>, table: string, columns: string[]): Promise<void> {
  for (const column of columns) {
    await sql`alter table ${sql.table(table)} alter column ${sql.ref(column)} set storage external`.execute(
      db,
    );
  }
}
