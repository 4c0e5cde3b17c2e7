import { FAHRENHEIT_OFFSET, FAHRENHEIT_PER_KELVIN, HOURS_PER_YEAR, J_PER_WH } from '@/lib/units/constants';
import { columnRange } from '@/lib/weather/column-range';
import type { HourColumns } from '@/lib/weather/hour-table';
import type { ReadOptions, WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherNote } from '@/lib/weather/weather-year';

/** The strongest hour of any year lies between these [W/m²]. */
const MIN_PEAK_WM2 = 300;
const MAX_PEAK_WM2 = 1500;
const KJ_PER_WH = J_PER_WH / 1000;

/**
 * Whether irradiance is in W/m² and temperature in °C, by the size of the values.
 * @param columns hours without gaps; converted in place on request
 * @param notes takes the conversion
 * @param options `repair: true` converts kJ/(m² h) and °F
 * @returns null when the units are right or were made so, else the refusal
 * @see common practice, no source (limits of peak, mean and span)
 */
export function checkUnits(
  columns: HourColumns,
  notes: WeatherNote[],
  options: ReadOptions,
): WeatherRefusal | null {
  return checkIrradiance(columns, notes, options) ?? checkTemperature(columns, notes, options);
}

function checkIrradiance(
  columns: HourColumns,
  notes: WeatherNote[],
  options: ReadOptions,
): WeatherRefusal | null {
  const peak = columnRange(columns.globalWm2).max;
  if (peak >= MIN_PEAK_WM2 && peak <= MAX_PEAK_WM2) return null;
  const found = `The strongest global irradiance is ${peak.toFixed(peak < 10 ? 2 : 0)}; in W/m² it lies between ${MIN_PEAK_WM2} and 1,500.`;
  const refusal = { ok: false, code: 'irradiance-units' } as const;
  const asKilojoules = peak / KJ_PER_WH;
  if (asKilojoules < MIN_PEAK_WM2 || asKilojoules > MAX_PEAK_WM2) {
    return { ...refusal, message: `${found} Export the file in W/m² or Wh/m², then upload again.` };
  }
  if (!options.repair) {
    return {
      ...refusal,
      message: `${found} The values look like kJ/m² per hour.`,
      repair: 'Convert the irradiance from kJ/m² per hour to W/m² (divide by 3.6).',
    };
  }
  for (const values of [columns.globalWm2, columns.beamNormalWm2, columns.diffuseWm2]) {
    for (let h = 0; h < HOURS_PER_YEAR; h++) values[h]! /= KJ_PER_WH;
  }
  notes.push({ kind: 'repair', message: 'Irradiance converted from kJ/m² per hour to W/m².' });
  return null;
}

function checkTemperature(
  columns: HourColumns,
  notes: WeatherNote[],
  options: ReadOptions,
): WeatherRefusal | null {
  const { min, max, mean } = columnRange(columns.dryBulbC);
  if (mean <= 30 && max <= 57 && max - min <= 85 && min >= -75) return null;
  const found = `Air temperature runs from ${min.toFixed(1)} to ${max.toFixed(1)} with a mean of ${mean.toFixed(1)}`;
  const refusal = { ok: false, code: 'temperature-units' } as const;
  const fahrenheit = mean > -20 && mean < 100 && max < 140 && min > -100;
  if (!fahrenheit) {
    return {
      ...refusal,
      message: `${found}: that is neither °C nor °F. Export it in °C, then upload again.`,
    };
  }
  if (!options.repair) {
    return {
      ...refusal,
      message: `${found}: no place is so in °C, the values look like °F.`,
      repair: 'Convert air temperature and dew point from °F to °C.',
    };
  }
  for (const column of [columns.dryBulbC, columns.dewPointC]) {
    for (let h = 0; h < HOURS_PER_YEAR; h++) {
      column[h] = (column[h]! - FAHRENHEIT_OFFSET) / FAHRENHEIT_PER_KELVIN;
    }
  }
  notes.push({ kind: 'repair', message: 'Air temperature and dew point converted from °F to °C.' });
  return null;
}
