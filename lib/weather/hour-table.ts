import { DAYS_IN_MONTH, HOURS_PER_DAY, HOURS_PER_YEAR, MONTH_START_HOUR } from '@/lib/units/constants';
import { MONTH_NAMES } from '@/lib/weather/month-names';
import type { RowProblem } from '@/lib/weather/weather-result';

/** What a reader fills; NaN stands for a value that the file does not give. */
export interface HourColumns {
  dryBulbC: Float64Array;
  dewPointC: Float64Array;
  relativeHumidity: Float64Array;
  pressurePa: Float64Array;
  skyLongwaveWm2: Float64Array;
  globalWm2: Float64Array;
  beamNormalWm2: Float64Array;
  diffuseWm2: Float64Array;
  windMPerS: Float64Array;
  albedo: Float64Array;
}

export type HourColumn = keyof HourColumns;

/**
 * Hours of a file put in their places by month, day and hour of the stamp, never by its year: typical years are
 * put together from months of different years.
 */
export class HourTable {
  readonly columns: HourColumns = {
    dryBulbC: unknownColumn(),
    dewPointC: unknownColumn(),
    relativeHumidity: unknownColumn(),
    pressurePa: unknownColumn(),
    skyLongwaveWm2: unknownColumn(),
    globalWm2: unknownColumn(),
    beamNormalWm2: unknownColumn(),
    diffuseWm2: unknownColumn(),
    windMPerS: unknownColumn(),
    albedo: unknownColumn(),
  };
  /** line of the file that filled the hour, 0 = none yet */
  readonly lineOfHour = new Int32Array(HOURS_PER_YEAR);
  readonly badStamps: RowProblem[] = [];
  /** rows whose hour was filled before: the later one is left out */
  readonly twice: { line: number; hour: number }[] = [];
  readonly leapLines: number[] = [];
  rows = 0;
  /** hours are numbered 0–23 instead of 1–24 */
  zeroBased = false;
  private lastHour = -1;

  /**
   * The place of a row, −1 when the row has none (29 February, an hour filled before, no valid stamp).
   * Hours run 1–24 and name their end; a midnight written 00:00 ends the day before, or its own day when it follows
   * that day's hour 23. A file whose first row has hour 0 counts 0–23 and names the start.
   */
  place(month: number, day: number, hour: number, line: number): number {
    const first = this.rows === 0;
    this.rows++;
    const leapDay = month === 2 && day === 29;
    const daysInMonth = DAYS_IN_MONTH[month - 1] ?? 0;
    if (!(day >= 1 && hour >= 0 && hour <= 24 && (day <= daysInMonth || leapDay))) {
      this.badStamps.push({ row: line, problem: `no valid month, day and hour (${month}, ${day}, ${hour})` });
      return -1;
    }
    if (first) this.zeroBased = hour === 0;
    if (leapDay) {
      this.leapLines.push(line);
      return -1;
    }
    const place = this.placeOf(MONTH_START_HOUR[month - 1]! + (day - 1) * HOURS_PER_DAY, hour);
    if (this.lineOfHour[place] !== 0) {
      this.twice.push({ line, hour: place });
      return -1;
    }
    this.lineOfHour[place] = line;
    this.lastHour = place;
    return place;
  }

  private placeOf(dayStart: number, hour: number): number {
    if (this.zeroBased) return (dayStart + hour) % HOURS_PER_YEAR;
    if (hour > 0) return dayStart + hour - 1;
    const endsOwnDay = this.lastHour === dayStart + HOURS_PER_DAY - 2;
    return endsOwnDay ? this.lastHour + 1 : (dayStart + HOURS_PER_YEAR - 1) % HOURS_PER_YEAR;
  }
}

function unknownColumn(): Float64Array {
  return new Float64Array(HOURS_PER_YEAR).fill(NaN);
}

/**
 * An hour of the year in words: "6 May, hour 14".
 * @param hour hour of the year [h] 0…8759
 * @returns words
 * @see own definition
 */
export function hourWords(hour: number): string {
  let month = 0;
  while (MONTH_START_HOUR[month + 1]! <= hour) month++;
  const inMonth = hour - MONTH_START_HOUR[month]!;
  const day = Math.floor(inMonth / HOURS_PER_DAY) + 1;
  return `${day} ${MONTH_NAMES[month]}, hour ${(inMonth % HOURS_PER_DAY) + 1}`;
}
