import { MONTH_START_HOUR } from '@/lib/units/constants';

/** Temperatures that a material stands, judged at their low ends because sources differ by 10–20 K. */
export interface MaterialLimit {
  id: string;
  name: string;
  /** lasting use [°C] */
  longTermLowC: number;
  longTermHighC: number;
  /** hours at a time [°C] */
  shortTermLowC: number;
  shortTermHighC: number;
  source: string;
  provenance: 'read' | 'from memory' | 'common practice';
}

/** Hours and degree-hours above the limits of one part. */
export interface LimitHours {
  /** hottest hour's value, NaN without any hour [°C] */
  hottestC: number;
  /** index of the hottest hour, −1 without any */
  hottestHour: number;
  hoursAboveLong: number;
  hoursAboveShort: number;
  /** sum of the excess over the long-term limit [K h] */
  degreeHoursAboveLong: number;
  /** sum of the excess over the short-term limit [K h] */
  degreeHoursAboveShort: number;
  monthHoursAboveLong: number[];
  monthHoursAboveShort: number[];
  monthDegreeHoursAboveLong: number[];
}

/**
 * Counts the hours of a year above a part's limits, and how far above: Σ max(0, T − limit) · 1 h.
 * @param temperaturesC temperature of the part in 8,760 hours [°C]; NaN where it is not mounted
 * @param longTermC limit for lasting use [°C]
 * @param shortTermC limit for single hours [°C]
 * @returns hours [h] and degree-hours [K h] of the year and of each month
 * @see own definition: counting rule; limits and their sources in `data/materials/limits.ts`
 */
export function countLimitHours(
  temperaturesC: ArrayLike<number>,
  longTermC: number,
  shortTermC: number,
): LimitHours {
  const twelve = () => new Array<number>(12).fill(0);
  const result: LimitHours = {
    hottestC: NaN,
    hottestHour: -1,
    hoursAboveLong: 0,
    hoursAboveShort: 0,
    degreeHoursAboveLong: 0,
    degreeHoursAboveShort: 0,
    monthHoursAboveLong: twelve(),
    monthHoursAboveShort: twelve(),
    monthDegreeHoursAboveLong: twelve(),
  };
  for (let month = 0; month < 12; month++) {
    for (let h = MONTH_START_HOUR[month]!; h < MONTH_START_HOUR[month + 1]!; h++) {
      const temperature = temperaturesC[h]!;
      if (Number.isNaN(temperature)) continue;
      if (!(temperature <= result.hottestC)) {
        result.hottestC = temperature;
        result.hottestHour = h;
      }
      if (temperature > longTermC) {
        result.monthHoursAboveLong[month]! += 1;
        result.monthDegreeHoursAboveLong[month]! += temperature - longTermC;
      }
      if (temperature > shortTermC) {
        result.monthHoursAboveShort[month]! += 1;
        result.degreeHoursAboveShort += temperature - shortTermC;
      }
    }
  }
  const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);
  result.hoursAboveLong = sum(result.monthHoursAboveLong);
  result.hoursAboveShort = sum(result.monthHoursAboveShort);
  result.degreeHoursAboveLong = sum(result.monthDegreeHoursAboveLong);
  return result;
}
