import {
  skyLongwaveWm2 as longwaveOf,
  skyTemperatureC,
  swinbankSkyTemperatureC,
} from '@/lib/sun/sky-temperature';
import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';
import { standardPressurePa } from '@/lib/weather/air-pressure';
import { checkRows } from '@/lib/weather/check-rows';
import { checkSite } from '@/lib/weather/check-site';
import { checkUnits } from '@/lib/weather/check-units';
import { columnRange } from '@/lib/weather/column-range';
import { dewPointC, dewPointFromDailyMinimum } from '@/lib/weather/dew-point';
import { fillGaps } from '@/lib/weather/fill-gaps';
import type { HourColumns, HourTable } from '@/lib/weather/hour-table';
import { withThousands } from '@/lib/weather/with-thousands';
import type { ReadOptions, WeatherResult } from '@/lib/weather/weather-result';
import type { WeatherNote, WeatherYear } from '@/lib/weather/weather-year';

/** What the header of a file tells. */
export type YearHead = Pick<
  WeatherYear,
  | 'name'
  | 'source'
  | 'latitudeDeg'
  | 'longitudeDeg'
  | 'timeZoneH'
  | 'elevationM'
  | 'sunShiftH'
  | 'pointValues'
>;

/** Reflectance of snow-free ground; common practice since Liu & Jordan 1963. */
export const DEFAULT_ALBEDO = 0.2;
/** Outside these a value is a filler of the file's maker: no sky [W/m²], air pressure [Pa] or ground [-] is so. */
const MIN_SKY_LONGWAVE_WM2 = 50;
const MIN_PRESSURE_PA = 30_000;
const MAX_PRESSURE_PA = 110_000;
const MIN_ALBEDO = 0.01;

/**
 * A year from the rows of a file: checks rows, gaps, units and site, then derives the columns that the file lacks.
 * @param head what the header tells
 * @param table the rows in their places
 * @param options `repair: true` does what a refusal offered
 * @returns the year with notes of all repairs and assumptions, or a refusal
 * @see lib/weather/check-rows.ts, fill-gaps.ts, check-units.ts, check-site.ts
 */
export function completeYear(head: YearHead, table: HourTable, options: ReadOptions): WeatherResult {
  const notes: WeatherNote[] = [];
  const { columns } = table;
  const refusal =
    checkRows(table, notes, options) ??
    fillGaps(table, notes, options) ??
    checkUnits(columns, notes, options) ??
    checkSite(head, columns, notes);
  if (refusal) return refusal;
  dropNegatives(columns, table, notes);
  fillHumidityAndSky(columns, notes);
  fillPressure(columns, head.elevationM, notes);
  fillAlbedo(columns, notes);
  const { relativeHumidity: _, ...kept } = columns;
  return { ok: true, year: { ...head, synthetic: false, ...kept, notes } };
}

function dropNegatives(columns: HourColumns, table: HourTable, notes: WeatherNote[]): void {
  const rows: number[] = [];
  for (const values of [columns.globalWm2, columns.beamNormalWm2, columns.diffuseWm2, columns.windMPerS]) {
    if (columnRange(values).min >= 0) continue;
    for (let h = 0; h < HOURS_PER_YEAR; h++) {
      if (values[h]! >= 0) continue;
      values[h] = 0;
      rows.push(table.lineOfHour[h]!);
    }
  }
  if (rows.length > 0) {
    notes.push({ kind: 'repair', message: 'Negative irradiance or wind set to 0.', rows });
  }
}

function fillHumidityAndSky(columns: HourColumns, notes: WeatherNote[]): void {
  const { dryBulbC, dewPointC: dew, relativeHumidity, skyLongwaveWm2 } = columns;
  let noHumidity = 0;
  let derivedSky = 0;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const air = dryBulbC[h]!;
    if (Number.isNaN(dew[h]!)) dew[h] = dewPointC(air, relativeHumidity[h]!);
    const humid = !Number.isNaN(dew[h]!);
    if (!humid) {
      noHumidity++;
      dew[h] = dewPointFromDailyMinimum(dryBulbC, h);
    }
    if (skyLongwaveWm2[h]! >= MIN_SKY_LONGWAVE_WM2) continue;
    derivedSky++;
    const hour = (h % HOURS_PER_DAY) + 0.5;
    const skyC = humid ? skyTemperatureC(air, dew[h]!, hour) : swinbankSkyTemperatureC(air);
    skyLongwaveWm2[h] = longwaveOf(skyC);
  }
  if (noHumidity > 0) {
    const message = `${hourCount(noHumidity)} without humidity: dew point taken as the lowest temperature of the day.`;
    notes.push({ kind: 'assumption', message });
  }
  if (derivedSky > 0) {
    const message = `${hourCount(derivedSky)} without long-wave irradiance: taken from a clear sky (Berdahl & Martin; Swinbank where humidity is missing too).`;
    notes.push({ kind: 'assumption', message });
  }
}

function fillPressure(columns: HourColumns, elevationM: number, notes: WeatherNote[]): void {
  const standard = standardPressurePa(elevationM);
  const filled = fillOutside(columns.pressurePa, MIN_PRESSURE_PA, MAX_PRESSURE_PA, standard);
  if (filled > 0) {
    const message = `${hourCount(filled)} without air pressure: ${(standard / 1000).toFixed(1)} kPa by altitude.`;
    notes.push({ kind: 'assumption', message });
  }
}

function fillAlbedo(columns: HourColumns, notes: WeatherNote[]): void {
  const filled = fillOutside(columns.albedo, MIN_ALBEDO, 1, DEFAULT_ALBEDO);
  if (filled > 0) {
    const message = `${hourCount(filled)} without ground reflectance: ${DEFAULT_ALBEDO} taken.`;
    notes.push({ kind: 'assumption', message });
  }
}

/** Puts the filler where a value is unknown or outside its range. */
function fillOutside(values: Float64Array, low: number, high: number, filler: number): number {
  let filled = 0;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    if (values[h]! >= low && values[h]! <= high) continue;
    values[h] = filler;
    filled++;
  }
  return filled;
}

function hourCount(hours: number): string {
  return hours === HOURS_PER_YEAR ? 'All hours' : `${withThousands(hours)} hours`;
}
