import { DAYS_PER_YEAR, HOURS_PER_DAY, HOURS_PER_YEAR, MONTH_START_HOUR } from '@/lib/units/constants';
import { monthlyClearness, type MonthlyClimate } from '@/lib/weather/monthly-climate';
import { autoregressive, type Random } from '@/lib/weather/seeded-random';

/**
 * Correlation of the drawn temperatures of neighbouring days. The straight course between the middles of days raises it
 * by about 0.15 in the daily means, to the 0.65 found in station files (.42-.75).
 */
const DAY_LAG_ONE = 0.5;
/** Even a month without sun has some swing between day and night [K]. */
const MIN_SWING_K = 1;

/**
 * Swing of the air temperature over a mean day about its mean, per kelvin of amplitude.
 * Equation: 0.4632 cos(t* − 3.805) + 0.0984 cos(2t* − 0.360) + 0.0168 cos(3t* − 0.822) + 0.0138 cos(4t* − 3.513),
 * t* = 2π(t − 1)/24.
 * @param hour t, solar time [h] 0…24
 * @returns swing [-], highest at 15 h, lowest at 6 h, range 0.976
 * @see D. G. Erbs, S. A. Klein & W. A. Beckman, Estimation of degree-days and ambient temperature bin data, ASHRAE J. (June 1983) 60 (from memory)
 */
export function diurnalSwing(hour: number): number {
  const t = (2 * Math.PI * (hour - 1)) / 24;
  return (
    0.4632 * Math.cos(t - 3.805) +
    0.0984 * Math.cos(2 * t - 0.36) +
    0.0168 * Math.cos(3 * t - 0.822) +
    0.0138 * Math.cos(4 * t - 3.513)
  );
}

/**
 * Air temperature of each hour with the monthly means of the climate: the course of the year through the monthly
 * means, the mean day with amplitude A = 25.8 K̄ − 5.21, and days warmer or colder in an autoregressive sequence of
 * standard deviation 1.5 K + 0.1 (warmest − coldest month).
 * @param climate the monthly means
 * @param random seeded numbers
 * @returns mean of each hour [°C]
 * @see Erbs, Klein & Beckman 1983 (mean day); day-to-day spread: fit to station files, no source
 */
export function syntheticTemperature(climate: MonthlyClimate, random: Random): Float64Array {
  const seasons = smoothSeasons(climate.dryBulbC);
  const range = Math.max(...climate.dryBulbC) - Math.min(...climate.dryBulbC);
  const spreadK = 1.5 + 0.1 * range;
  const days = autoregressive(random, DAYS_PER_YEAR, DAY_LAG_ONE);
  const solarLagH = climate.longitudeDeg / 15 - climate.timeZoneH;
  const air = new Float64Array(HOURS_PER_YEAR);
  for (let month = 0; month < 12; month++) {
    const swingK = Math.max(MIN_SWING_K, 25.8 * monthlyClearness(climate, month) - 5.21);
    for (let h = MONTH_START_HOUR[month]!; h < MONTH_START_HOUR[month + 1]!; h++) {
      const middle = h + 0.5;
      const weather = spreadK * betweenDays(days, middle / HOURS_PER_DAY);
      air[h] = seasons[h]! + swingK * diurnalSwing((middle % HOURS_PER_DAY) + solarLagH) + weather;
    }
    shiftToMean(air, month, climate.dryBulbC[month]!);
  }
  return air;
}

/** Straight between the middles of days, so that the temperature does not jump at midnight; the year is a ring. */
function betweenDays(days: Float64Array, day: number): number {
  const at = Math.floor(day - 0.5);
  const part = day - 0.5 - at;
  const before = days[(at + DAYS_PER_YEAR) % DAYS_PER_YEAR]!;
  const after = days[(at + 1) % DAYS_PER_YEAR]!;
  return before + part * (after - before);
}

/** A course of straight lines between the middles of months, its corners moved until its monthly means are the given ones. */
function smoothSeasons(means: readonly number[]): Float64Array {
  const corners = Float64Array.from(means);
  const course = new Float64Array(HOURS_PER_YEAR);
  for (let pass = 0; pass < 8; pass++) {
    drawCourse(course, corners);
    for (let month = 0; month < 12; month++) corners[month]! += means[month]! - monthMean(course, month);
  }
  drawCourse(course, corners);
  return course;
}

function drawCourse(course: Float64Array, corners: Float64Array): void {
  for (let month = 0; month < 12; month++) {
    const next = (month + 1) % 12;
    const from = (MONTH_START_HOUR[month]! + MONTH_START_HOUR[month + 1]!) / 2;
    const wrap = next === 0 ? HOURS_PER_YEAR : 0;
    const to = (MONTH_START_HOUR[next]! + MONTH_START_HOUR[next + 1]!) / 2 + wrap;
    for (let h = from; h < to; h++) {
      const part = (h + 0.5 - from) / (to - from);
      course[h % HOURS_PER_YEAR] = corners[month]! + part * (corners[next]! - corners[month]!);
    }
  }
}

function monthMean(values: Float64Array, month: number): number {
  const start = MONTH_START_HOUR[month]!;
  const end = MONTH_START_HOUR[month + 1]!;
  let sum = 0;
  for (let h = start; h < end; h++) sum += values[h]!;
  return sum / (end - start);
}

function shiftToMean(values: Float64Array, month: number, mean: number): void {
  const shift = mean - monthMean(values, month);
  for (let h = MONTH_START_HOUR[month]!; h < MONTH_START_HOUR[month + 1]!; h++) values[h]! += shift;
}
