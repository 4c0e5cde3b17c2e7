import { HOURS_PER_DAY, HOURS_PER_YEAR, MONTH_START_HOUR } from '@/lib/units/constants';
import type { MonthlyClimate } from '@/lib/weather/monthly-climate';
import { autoregressive, type Random } from '@/lib/weather/seeded-random';

const HOUR_LAG_ONE = 0.9;
const LOG_SPREAD = 0.5;
/** Wind rises by this part of its mean until early afternoon and falls by it in the night. */
const DAY_SWING = 0.25;
const WINDIEST_HOUR = 14;

/**
 * Wind speed of each hour with the monthly means of the climate: a log-normal autoregressive sequence with a
 * maximum in the early afternoon.
 * @param climate the monthly means
 * @param random seeded numbers
 * @returns wind at 10 m [m/s]
 * @see common practice, no source
 */
export function syntheticWind(climate: MonthlyClimate, random: Random): Float64Array {
  const z = autoregressive(random, HOURS_PER_YEAR, HOUR_LAG_ONE);
  const wind = z.map((value, h) => {
    const hour = (h % HOURS_PER_DAY) + 0.5;
    const swing = 1 + DAY_SWING * Math.cos((2 * Math.PI * (hour - WINDIEST_HOUR)) / HOURS_PER_DAY);
    return swing * Math.exp(LOG_SPREAD * value);
  });
  for (let month = 0; month < 12; month++) {
    const part = wind.subarray(MONTH_START_HOUR[month]!, MONTH_START_HOUR[month + 1]!);
    const mean = part.reduce((a, b) => a + b, 0) / part.length;
    part.set(part.map((value) => (value / mean) * climate.windMPerS[month]!));
  }
  return wind;
}
