import type { WeatherYear } from '@/lib/weather/weather-year';

export type WeatherRefusalCode =
  | 'empty'
  | 'unknown-format'
  | 'no-header'
  | 'not-hourly'
  | 'bad-stamp'
  | 'rows-missing'
  | 'rows-twice'
  | 'values-missing'
  | 'irradiance-units'
  | 'temperature-units'
  | 'hemisphere'
  | 'monthly-means';

export interface RowProblem {
  /** row number in the file as an editor shows it, first line = 1 */
  row: number;
  problem: string;
}

/** Why a file was not taken, in words the user can act on. */
export interface WeatherRefusal {
  ok: false;
  code: WeatherRefusalCode;
  message: string;
  /** the rows in question, at most 100 of them */
  rows?: RowProblem[];
  /** what reading with `repair: true` would do; absent when no repair is offered */
  repair?: string;
}

export type WeatherResult = { ok: true; year: WeatherYear } | WeatherRefusal;

export interface ReadOptions {
  /** do the repairs that a refusal offered; each is noted in the year */
  repair?: boolean;
}
