import { HOURS_PER_DAY } from '@/lib/units/constants';

/**
 * Dew point from air temperature and relative humidity by the Magnus formula.
 * Equation: g = ln(φ/100) + 17.62 θ/(243.12 + θ), θdp = 243.12 g/(17.62 − g).
 * @param dryBulbC θ [°C] −45…60
 * @param relativeHumidity φ [%] 1…100; below 1 taken as 1
 * @returns θdp [°C]
 * @see WMO-No. 8, Guide to Instruments and Methods of Observation, annex 4.B (constants from memory)
 */
export function dewPointC(dryBulbC: number, relativeHumidity: number): number {
  const saturation = (17.62 * dryBulbC) / (243.12 + dryBulbC);
  const g = Math.log(Math.min(100, Math.max(1, relativeHumidity)) / 100) + saturation;
  return (243.12 * g) / (17.62 - g);
}

/**
 * Dew point when no humidity is known: the lowest air temperature of the hour's day, since air cools in the night
 * until dew falls.
 * @param dryBulbC air temperature of the year [°C], 8,760 hours
 * @param hour hour of the year 0…8759
 * @returns θdp [°C], never above the air temperature
 * @see R. G. Allen et al., FAO Irrigation and Drainage Paper 56, 1998, eq. 6-6 (from memory)
 */
export function dewPointFromDailyMinimum(dryBulbC: Float64Array, hour: number): number {
  const dayStart = hour - (hour % HOURS_PER_DAY);
  let lowest = Infinity;
  for (let h = dayStart; h < dayStart + HOURS_PER_DAY; h++) lowest = Math.min(lowest, dryBulbC[h]!);
  return lowest;
}
