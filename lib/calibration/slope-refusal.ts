import { DAYS_PER_YEAR } from '@/lib/units/constants';

/** What decides whether a slope may be read from bills. */
export interface SlopeEvidence {
  /** intervals between real readings [-] */
  intervals: number;
  /** days that they cover [d] */
  days: number;
  /** rows that are estimated, of all rows that count [-] */
  estimatedShare: number;
  /** mean outdoor temperature of the coldest and the warmest interval [°C] */
  coldestC: number;
  warmestC: number;
}

export const FEWEST_INTERVALS = 6;
const FEWEST_MONTHS = 9;
const MONTHS_PER_YEAR = 12;
const MOST_ESTIMATED = 0.3;
/** An interval this warm shows the base load, one this cold the heating [°C]. */
const SUMMER_FROM_C = 13;
const WINTER_TO_C = 10;

/**
 * Reasons for which no slope is read from bills, each as a sentence that says what is missing.
 * @param evidence counts [-], days [d] and temperatures [°C] of the intervals
 * @returns sentences; none when the slope may be read
 * @see fewer than 9 months or more than 30 % estimated: common practice, no source; at least 6 intervals for three
 * fitted numbers, an interval above 13 °C and one below 10 °C: own choice
 */
export function slopeRefusals(evidence: SlopeEvidence): string[] {
  const { intervals, days, estimatedShare, coldestC, warmestC } = evidence;
  const months = (days / DAYS_PER_YEAR) * MONTHS_PER_YEAR;
  const reasons: string[] = [];
  if (intervals < FEWEST_INTERVALS)
    reasons.push(
      `There ${intervals === 1 ? 'is one interval' : `are ${intervals || 'no'} intervals`} between real readings; a slope needs ${FEWEST_INTERVALS}. Add readings, monthly if you can.`,
    );
  if (intervals > 0 && months < FEWEST_MONTHS)
    reasons.push(
      `The readings cover ${months < 1.5 ? 'one month' : `${Math.floor(months)} months`}; a slope needs ${FEWEST_MONTHS}, so that summer and winter are both seen.`,
    );
  if (estimatedShare > MOST_ESTIMATED)
    reasons.push(
      `${Math.round(estimatedShare * 100)} % of the readings are estimated; with more than ${MOST_ESTIMATED * 100} % the slope is the supplier’s guess. Read the meter yourself.`,
    );
  if (intervals > 1 && warmestC < SUMMER_FROM_C)
    reasons.push(
      `All readings are of the cold season: without one above ${SUMMER_FROM_C} °C outdoors, hot water cannot be told from heating.`,
    );
  if (intervals > 1 && coldestC > WINTER_TO_C)
    reasons.push(
      `No reading is of the cold season: without one below ${WINTER_TO_C} °C outdoors there is no slope.`,
    );
  return reasons;
}
