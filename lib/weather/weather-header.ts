import type { WeatherYear } from './weather-year';

/** Names of the hourly columns, in the order in which they are packed and stored. */
export const WEATHER_COLUMNS = [
  'dryBulbC',
  'globalWm2',
  'beamNormalWm2',
  'diffuseWm2',
  'windMPerS',
  'dewPointC',
  'skyLongwaveWm2',
  'pressurePa',
  'albedo',
] as const satisfies readonly (keyof WeatherYear)[];
export type WeatherColumn = (typeof WEATHER_COLUMNS)[number];

/** A weather year without its hours. */
export type WeatherFacts = Omit<WeatherYear, WeatherColumn>;

/** A weather year as lists show it. */
export interface WeatherHeader extends WeatherFacts {
  id: string;
  /** one of the reference climates that ship with the application */
  builtIn: boolean;
  /** name of the uploaded file */
  fileName: string | null;
}

/** Takes the hours off a weather year. */
export function weatherFacts(year: WeatherYear): WeatherFacts {
  const columns = new Set<string>(WEATHER_COLUMNS);
  return Object.fromEntries(
    Object.entries(year).filter(([name]) => !columns.has(name)),
  ) as unknown as WeatherFacts;
}
