import type { ColumnType, Generated, Insertable, Selectable } from 'kysely';
import type { BillsRecord } from '@/lib/schemas/bills';
import type { CollectorRecord } from '@/lib/schemas/collector';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { EnergyBalance, EnergyRow, YearResult } from '@/lib/simulation/results';
import type { WeatherFacts } from '@/lib/weather/weather-header';
import type { WeatherNote } from '@/lib/weather/weather-year';

/** jsonb: read parsed, written as text, since the driver would make a PostgreSQL array of a list. */
type Json<T> = ColumnType<T, string, string>;
type CreatedAt = ColumnType<Date, never, never>;
type TouchedAt = ColumnType<Date, Date | undefined, Date>;

export interface AccountTable {
  id: Generated<string>;
  email: string;
  password_hash: string;
  name: string;
  created_at: CreatedAt;
}

export interface SessionTable {
  id: Generated<string>;
  account_id: string;
  created_at: CreatedAt;
  expires_at: Date;
  last_seen_at: TouchedAt;
}

export interface ProjectTable {
  id: Generated<string>;
  owner_id: string;
  name: string;
  prices: Json<Prices>;
  prices_version: Generated<number>;
  weather_year_id: string | null;
  created_at: CreatedAt;
  updated_at: TouchedAt;
}

export interface HouseTable {
  project_id: string;
  data: Json<HouseRecord>;
  version: Generated<number>;
}

export interface BillsTable {
  project_id: string;
  data: Json<BillsRecord>;
  version: Generated<number>;
}

export interface WeatherYearTable {
  id: Generated<string>;
  /** the project that uploaded it; null for the climates that ship with the application */
  project_id: string | null;
  /** id of the shipped climate; null for uploads */
  climate_id: string | null;
  name: string;
  source: string;
  synthetic: boolean;
  latitude_deg: number;
  longitude_deg: number;
  time_zone_h: number;
  elevation_m: number;
  /** everything about the year but its hours, its notes and its file */
  header: Json<Omit<WeatherFacts, 'notes' | 'sha256'>>;
  notes: Json<WeatherNote[]>;
  /** of the uploaded file, or of the packed columns of a shipped climate */
  sha256: string;
  file_name: string | null;
  /** the uploaded file, byte for byte */
  original: Buffer | null;
  created_at: CreatedAt;
  dry_bulb_c: Buffer;
  global_wm2: Buffer;
  beam_normal_wm2: Buffer;
  diffuse_wm2: Buffer;
  wind_m_per_s: Buffer;
  dew_point_c: Buffer;
  sky_longwave_wm2: Buffer;
  pressure_pa: Buffer;
  albedo: Buffer;
}

export interface CollectorTable {
  id: Generated<string>;
  owner_id: string;
  data: Json<CollectorRecord>;
  created_at: CreatedAt;
  updated_at: TouchedAt;
}

export interface DesignTable {
  id: Generated<string>;
  project_id: string;
  /** generated from data */
  name: ColumnType<string, never, never>;
  data: Json<DesignRecord>;
  version: Generated<number>;
  position: number;
  created_at: CreatedAt;
  updated_at: TouchedAt;
}

/** Where one column stands in the packed hours of a run. */
export interface PackedColumn {
  name: string;
  type: 'float32' | 'uint8';
  byteOffset: number;
  length: number;
}

/** A stored result without its hours, months and balance. */
export type StoredSummary = Omit<YearResult, 'columns' | 'months' | 'balance' | 'engineVersion'>;

export interface RunTable {
  id: Generated<string>;
  design_id: string;
  inputs_hash: string;
  engine_version: string;
  summary: Json<StoredSummary>;
  months: Json<EnergyRow[]>;
  balance: Json<EnergyBalance>;
  columns_layout: Json<PackedColumn[]>;
  columns: Buffer;
  created_at: CreatedAt;
}

export interface Database {
  account: AccountTable;
  session: SessionTable;
  project: ProjectTable;
  house: HouseTable;
  bills: BillsTable;
  weather_year: WeatherYearTable;
  collector: CollectorTable;
  design: DesignTable;
  run: RunTable;
}

export type ProjectRow = Selectable<ProjectTable>;
export type DesignRow = Selectable<DesignTable>;
export type RunRow = Selectable<RunTable>;
export type NewWeatherYear = Insertable<WeatherYearTable>;
export type NewRun = Insertable<RunTable>;
