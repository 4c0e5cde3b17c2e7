import { HOURS_PER_YEAR } from '@/lib/units/constants';

export interface HourRun {
  /** first hour of the run; a run may go on over the end of the year */
  start: number;
  length: number;
}

/** Longest gap that is closed by interpolation [h]; common practice for hourly years. */
export const MAX_GAP_H = 3;

/**
 * Runs of hours for which `isGap` holds; the year is a ring, so 31 December joins 1 January.
 * @param isGap whether an hour of the year (0…8759) belongs to a run
 * @returns first hour and length of each run [h]
 * @see own definition
 */
export function hourRuns(isGap: (hour: number) => boolean): HourRun[] {
  let solid = 0;
  while (solid < HOURS_PER_YEAR && isGap(solid)) solid++;
  if (solid === HOURS_PER_YEAR) return [{ start: 0, length: HOURS_PER_YEAR }];
  const runs: HourRun[] = [];
  let length = 0;
  for (let i = 1; i <= HOURS_PER_YEAR; i++) {
    const hour = (solid + i) % HOURS_PER_YEAR;
    if (isGap(hour)) {
      length++;
    } else if (length > 0) {
      runs.push({ start: (hour - length + HOURS_PER_YEAR) % HOURS_PER_YEAR, length });
      length = 0;
    }
  }
  return runs;
}
