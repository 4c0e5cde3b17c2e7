import type { Kysely } from 'kysely';
import { weatherFacts, type WeatherColumn, type WeatherHeader } from '@/lib/weather/weather-header';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { toBytes, toFloat64 } from '../pack-floats';
import type { Database, NewWeatherYear } from '../schema';

const SQL_NAMES = {
  dryBulbC: 'dry_bulb_c',
  globalWm2: 'global_wm2',
  beamNormalWm2: 'beam_normal_wm2',
  diffuseWm2: 'diffuse_wm2',
  windMPerS: 'wind_m_per_s',
  dewPointC: 'dew_point_c',
  skyLongwaveWm2: 'sky_longwave_wm2',
  pressurePa: 'pressure_pa',
  albedo: 'albedo',
} as const satisfies Record<WeatherColumn, keyof NewWeatherYear>;

const FACTS = ['id', 'climate_id', 'file_name', 'header', 'notes', 'sha256'] as const;

interface FactsRow {
  id: string;
  climate_id: string | null;
  file_name: string | null;
  header: Omit<WeatherHeader, 'notes' | 'sha256' | 'id' | 'builtIn' | 'fileName'>;
  notes: WeatherHeader['notes'];
  sha256: string;
}

function headerOf(row: FactsRow): WeatherHeader {
  const { id, climate_id, file_name, header, notes, sha256 } = row;
  return { ...header, notes, sha256, id, builtIn: climate_id !== null, fileName: file_name };
}

function rowOf(year: WeatherYear, sha256: string) {
  const { notes, ...header } = weatherFacts({ ...year, sha256 });
  const columns = Object.entries(SQL_NAMES).map(
    ([name, column]) => [column, toBytes(year[name as WeatherColumn])] as const,
  );
  return {
    name: year.name,
    source: year.source,
    synthetic: year.synthetic,
    latitude_deg: year.latitudeDeg,
    longitude_deg: year.longitudeDeg,
    time_zone_h: year.timeZoneH,
    elevation_m: year.elevationM,
    header: JSON.stringify({ ...header, sha256: undefined }),
    notes: JSON.stringify(notes),
    sha256,
    ...(Object.fromEntries(columns) as Record<(typeof SQL_NAMES)[WeatherColumn], Buffer>),
  };
}

/** Stores an uploaded year beside its file, byte for byte. */
export async function insertWeatherYear(
  db: Kysely<Database>,
  projectId: string,
  year: WeatherYear,
  file: { name: string; bytes: Uint8Array; sha256: string },
): Promise<WeatherHeader> {
  const row = await db
    .insertInto('weather_year')
    .values({
      ...rowOf(year, file.sha256),
      project_id: projectId,
      file_name: file.name,
      original: toBytes(file.bytes),
    })
    .returning(FACTS)
    .executeTakeFirstOrThrow();
  return headerOf(row);
}

/** Stores a climate that ships with the application, or renews it when its numbers have changed. */
export async function upsertClimate(
  db: Kysely<Database>,
  climateId: string,
  year: WeatherYear,
  sha256: string,
): Promise<void> {
  const row = rowOf(year, sha256);
  await db
    .insertInto('weather_year')
    .values({ ...row, climate_id: climateId })
    .onConflict((conflict) =>
      conflict.column('climate_id').doUpdateSet(row).where('weather_year.sha256', '<>', sha256),
    )
    .execute();
}

export async function findClimateId(db: Kysely<Database>, climateId: string): Promise<string | undefined> {
  const row = await db
    .selectFrom('weather_year')
    .select('id')
    .where('climate_id', '=', climateId)
    .executeTakeFirst();
  return row?.id;
}

/** The shipped climates and the project's own uploads, without hours. */
export async function listWeatherHeaders(db: Kysely<Database>, projectId: string): Promise<WeatherHeader[]> {
  const rows = await db
    .selectFrom('weather_year')
    .select(FACTS)
    .where((eb) => eb.or([eb('project_id', '=', projectId), eb('project_id', 'is', null)]))
    .orderBy('climate_id', (order) => order.asc().nullsFirst())
    .orderBy('created_at', 'desc')
    .execute();
  return rows.map(headerOf);
}

export async function findWeatherHeader(
  db: Kysely<Database>,
  weatherYearId: string,
): Promise<WeatherHeader | undefined> {
  const row = await db
    .selectFrom('weather_year')
    .select(FACTS)
    .where('id', '=', weatherYearId)
    .executeTakeFirst();
  return row && headerOf(row);
}

/** A whole year, if it ships with the application or belongs to a project of the owner. */
export async function findWeatherYear(
  db: Kysely<Database>,
  weatherYearId: string,
  ownerId: string,
): Promise<WeatherYear | undefined> {
  const row = await db
    .selectFrom('weather_year')
    .leftJoin('project', 'project.id', 'weather_year.project_id')
    .select([
      'weather_year.header',
      'weather_year.notes',
      'weather_year.sha256',
      ...Object.values(SQL_NAMES).map((column) => `weather_year.${column}` as const),
    ])
    .where('weather_year.id', '=', weatherYearId)
    .where((eb) => eb.or([eb('weather_year.project_id', 'is', null), eb('project.owner_id', '=', ownerId)]))
    .executeTakeFirst();
  if (!row) return undefined;
  const columns = Object.entries(SQL_NAMES).map(([name, column]) => [name, toFloat64(row[column])] as const);
  return {
    ...row.header,
    notes: row.notes,
    sha256: row.sha256,
    ...(Object.fromEntries(columns) as Record<WeatherColumn, Float64Array>),
  };
}

/** Removes an upload of the project; the shipped climates stay. */
export async function deleteUploadedYear(
  db: Kysely<Database>,
  projectId: string,
  weatherYearId: string,
): Promise<boolean> {
  const { numDeletedRows } = await db
    .deleteFrom('weather_year')
    .where('id', '=', weatherYearId)
    .where('project_id', '=', projectId)
    .executeTakeFirst();
  return numDeletedRows > 0n;
}
