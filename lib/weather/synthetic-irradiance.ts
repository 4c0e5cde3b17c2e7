import { dailyExtraterrestrialWhPerM2, sunsetHourAngleDeg } from '@/lib/sun/extraterrestrial';
import { hourlyShare } from '@/lib/sun/hourly-share';
import { hourAngleDeg } from '@/lib/sun/sun-position';
import type { SunYear } from '@/lib/sun/sun-year';
import {
  DAYS_IN_MONTH,
  DAYS_PER_YEAR,
  HOURS_PER_DAY,
  HOURS_PER_YEAR,
  MONTH_START_HOUR,
  WH_PER_KWH,
} from '@/lib/units/constants';
import { clearnessQuantile, clearnessShape } from '@/lib/weather/daily-clearness';
import { monthlyClearness, type MonthlyClimate } from '@/lib/weather/monthly-climate';
import { autoregressive, type Random } from '@/lib/weather/seeded-random';

/** Correlation of the clearness of neighbouring days; V. A. Graham, K. G. T. Hollands & A. P. Brunger 1988 (from memory). */
const DAY_LAG_ONE = 0.29;
/** Correlation of the clearness of neighbouring hours; V. A. Graham & K. G. T. Hollands, Solar Energy 44 (1990) 333. */
const HOUR_LAG_ONE = 0.54;
/** No hour falls below this part of the mean profile. */
const MIN_HOUR_SHARE = 0.05;

/**
 * Daily clearness of a year: an autoregressive sequence whose ranks within each month are mapped to the month's
 * distribution, so that every month has it exactly.
 * @param climate the monthly means
 * @param random seeded numbers
 * @returns K of each day [-]
 * @see Bendt, Collares-Pereira & Rabl 1981 (distribution); Graham, Hollands & Brunger, Solar Energy 40 (1988) 83 (sequence)
 */
export function dailyClearness(climate: MonthlyClimate, random: Random): Float64Array {
  const z = autoregressive(random, DAYS_PER_YEAR, DAY_LAG_ONE);
  const clearness = new Float64Array(DAYS_PER_YEAR);
  let first = 0;
  DAYS_IN_MONTH.forEach((days, month) => {
    const mean = monthlyClearness(climate, month);
    if (mean > 0) {
      const gamma = clearnessShape(mean);
      const order = Array.from({ length: days }, (_, i) => first + i).sort((a, b) => z[a]! - z[b]!);
      order.forEach((day, rank) => {
        clearness[day] = clearnessQuantile((rank + 0.5) / days, mean, gamma);
      });
    }
    first += days;
  });
  return clearness;
}

/**
 * Global irradiance of each hour with the monthly means of the climate, to the last digits.
 * Days follow the mean daily profile; each hour's clearness then strays from it: kt = k̄t + σ y, y autoregressive,
 * σ = A e^{B(1 − cos θz)}, A = 0.14 e^{−20(K − 0.35)²}, B = 3(K − 0.45)² + 16 K⁵, at most 0.88 cos(π ω/450°).
 * @param climate the monthly means
 * @param sun the sun of the site
 * @param random seeded numbers
 * @returns G [W/m²]
 * @see Collares-Pereira & Rabl 1979 (profile); R. Aguiar & M. Collares-Pereira, TAG: a time-dependent, autoregressive,
 *   Gaussian model for generating synthetic hourly radiation, Solar Energy 49 (1992) 167 (σ and limit)
 */
export function syntheticGlobal(climate: MonthlyClimate, sun: SunYear, random: Random): Float64Array {
  const clearness = dailyClearness(climate, random);
  const stray = autoregressive(random, HOURS_PER_YEAR, HOUR_LAG_ONE);
  const global = new Float64Array(HOURS_PER_YEAR);
  for (let day = 0; day < DAYS_PER_YEAR; day++) {
    fillDay(global, day, clearness[day]!, climate.latitudeDeg, sun, stray);
  }
  for (let month = 0; month < 12; month++) {
    const sumWh = climate.globalKwhPerM2Day[month]! * DAYS_IN_MONTH[month]! * WH_PER_KWH;
    scaleTo(global, MONTH_START_HOUR[month]!, MONTH_START_HOUR[month + 1]!, sumWh);
  }
  return global;
}

function fillDay(
  global: Float64Array,
  day: number,
  clearness: number,
  latitudeDeg: number,
  sun: SunYear,
  stray: Float64Array,
): void {
  const start = day * HOURS_PER_DAY;
  const sunsetDeg = sunsetHourAngleDeg(latitudeDeg, day + 1);
  const most = new Float64Array(HOURS_PER_DAY);
  const spread = new Float64Array(HOURS_PER_DAY);
  const a = 0.14 * Math.exp(-20 * (clearness - 0.35) ** 2);
  const b = 3 * (clearness - 0.45) ** 2 + 16 * clearness ** 5;
  for (let i = 0; i < HOURS_PER_DAY; i++) {
    const h = start + i;
    const cosZenith = sun.cosZenith[h]!;
    const lit = sun.sunlitFraction[h]!;
    if (lit === 0 || cosZenith <= 0) continue;
    const omega = hourAngleDeg(latitudeDeg, sun.zenithDeg[h]!, sun.azimuthDeg[h]!);
    const outside = sun.extraterrestrialNormalWm2[h]! * cosZenith * lit;
    most[i] = 0.88 * Math.cos((Math.PI * omega) / 450) * outside;
    spread[i] = a * Math.exp(b * (1 - cosZenith)) * outside * stray[h]!;
    global[h] = hourlyShare(omega, sunsetDeg) * lit;
  }
  const sumWh = clearness * dailyExtraterrestrialWhPerM2(latitudeDeg, day + 1);
  const end = start + HOURS_PER_DAY;
  scaleTo(global, start, end, sumWh);
  for (let i = 0; i < HOURS_PER_DAY; i++) {
    const mean = global[start + i]!;
    global[start + i] = Math.max(MIN_HOUR_SHARE * mean, mean + spread[i]!);
  }
  // what the limit takes from one hour the others of the day must carry
  for (let pass = 0; pass < 8; pass++) {
    scaleTo(global, start, end, sumWh);
    for (let i = 0; i < HOURS_PER_DAY; i++) global[start + i] = Math.min(most[i]!, global[start + i]!);
  }
}

/** Multiplies the hours from `start` up to `end` so that they add up to the sum. */
function scaleTo(values: Float64Array, start: number, end: number, sum: number): void {
  let found = 0;
  for (let h = start; h < end; h++) found += values[h]!;
  if (found <= 0) return;
  const factor = sum / found;
  for (let h = start; h < end; h++) values[h]! *= factor;
}
