import { HOURS_PER_DAY, MONTH_START_HOUR } from '@/lib/units/constants';
import type { HourColumns } from '@/lib/weather/hour-table';
import type { WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherNote, WeatherYear } from '@/lib/weather/weather-year';

/** Between the tropics the warm season follows the rains, not the sun [°]. */
const TROPIC_DEG = 23.5;
const MAX_ZONE_ERROR_H = 3;

type Place = Pick<WeatherYear, 'latitudeDeg' | 'longitudeDeg' | 'timeZoneH'>;

/**
 * Whether the place in the header can be the place of the values: range, hemisphere, time zone.
 * @param place latitude, longitude [°], time zone [h]
 * @param columns hours without gaps, in W/m² and °C
 * @param notes takes a caution when the time zone is far from the longitude
 * @returns null, or the refusal
 * @see common practice, no source
 */
export function checkSite(place: Place, columns: HourColumns, notes: WeatherNote[]): WeatherRefusal | null {
  const { latitudeDeg, longitudeDeg, timeZoneH } = place;
  if (Math.abs(latitudeDeg) > 90 || Math.abs(longitudeDeg) > 180 || timeZoneH < -12 || timeZoneH > 14) {
    return {
      ok: false,
      code: 'no-header',
      message: `Latitude ${latitudeDeg}, longitude ${longitudeDeg} and time zone ${timeZoneH} name no place on earth: correct row 1 (degrees north, degrees east, hours), then upload again.`,
      rows: [{ row: 1, problem: 'latitude, longitude or time zone out of range' }],
    };
  }
  if (Math.abs(latitudeDeg) >= TROPIC_DEG && summerDisagrees(latitudeDeg, columns)) {
    return {
      ok: false,
      code: 'hemisphere',
      message: `Latitude ${latitudeDeg} lies ${latitudeDeg < 0 ? 'south' : 'north'} of the equator, but the warm and sunny months are those of the other half of the earth. Correct the sign of the latitude in row 1, then upload again.`,
      rows: [{ row: 1, problem: `latitude ${latitudeDeg} disagrees with the warm season` }],
    };
  }
  // round the globe: +14 h and −10 h are the same clock
  const offset = timeZoneH - longitudeDeg / 15;
  const zoneError = Math.abs(offset - HOURS_PER_DAY * Math.round(offset / HOURS_PER_DAY));
  if (zoneError > MAX_ZONE_ERROR_H) {
    const message = `Time zone ${timeZoneH} h is ${zoneError.toFixed(1)} h away from the sun's time at longitude ${longitudeDeg}: check both, a lost sign turns morning into evening.`;
    notes.push({ kind: 'caution', message });
  }
  return null;
}

function summerDisagrees(latitudeDeg: number, columns: HourColumns): boolean {
  const sign = Math.sign(latitudeDeg);
  return [columns.globalWm2, columns.dryBulbC].every(
    (values) => sign * (monthsMean(values, [5, 6, 7]) - monthsMean(values, [11, 0, 1])) < 0,
  );
}

function monthsMean(values: Float64Array, months: readonly number[]): number {
  let sum = 0;
  let hours = 0;
  for (const month of months) {
    for (let h = MONTH_START_HOUR[month]!; h < MONTH_START_HOUR[month + 1]!; h++) sum += values[h]!;
    hours += MONTH_START_HOUR[month + 1]! - MONTH_START_HOUR[month]!;
  }
  return sum / hours;
}
