import { dayOfTypicalYear, isoMonth } from './day-number';
import { DAYS_PER_YEAR, DAYS_IN_MONTH } from '@/lib/units/constants';

/** What is known of the outdoor air: days of a typical year, means of real months, or both. */
export interface Outdoor {
  /** 365 daily means [°C]; absent where no weather year is chosen */
  typicalDayC?: ArrayLike<number> | undefined;
  /** mean of each real month that is known, by its name 2024-03 [°C] */
  monthMeanC: Readonly<Record<string, number>>;
}

/** Some days of one outdoor temperature. */
export interface OutdoorDays {
  days: number;
  meanC: number;
  /** the days lie scattered about the mean, of which alone is known */
  scattered: boolean;
}

/** Scatter of the days of a month about its mean [1/K]. */
const SCATTER_PER_K = 0.71;

/**
 * Degree days of days whose mean alone is known: N (θb − θm) / (1 − e^(−k (θb − θm))), k = 0.71 1/K.
 * @param days N [d] from 0
 * @param baseC θb [°C]
 * @param meanC θm [°C]
 * @returns degree days [K d]
 * @remarks for a month; the scatter of the days differs from place to place
 * @see CIBSE TM41:2006, Degree-days: theory and application, the formula of Hitchin (from memory)
 */
export function degreeDaysOfMean(days: number, baseC: number, meanC: number): number {
  const excess = baseC - meanC;
  if (Math.abs(excess) < 1e-9) return days / SCATTER_PER_K;
  return (days * excess) / -Math.expm1(-SCATTER_PER_K * excess);
}

/**
 * Degree days of an interval: Σ max(0, θb − θ) over its days.
 * @param pieces days of the interval and their temperatures [d], [°C]
 * @param baseC θb [°C]
 * @returns degree days [K d]
 * @see CIBSE TM41:2006, Degree-days: theory and application (from memory)
 */
export function degreeDays(pieces: readonly OutdoorDays[], baseC: number): number {
  let sum = 0;
  for (const { days, meanC, scattered } of pieces)
    sum += scattered ? degreeDaysOfMean(days, baseC, meanC) : days * Math.max(0, baseC - meanC);
  return sum;
}

/**
 * Mean outdoor temperature of an interval.
 * @param pieces days of the interval and their temperatures [d], [°C]
 * @returns mean by days [°C]
 * @see own definition
 */
export function meanOutdoorC(pieces: readonly OutdoorDays[]): number {
  const days = pieces.reduce((sum, piece) => sum + piece.days, 0);
  return pieces.reduce((sum, piece) => sum + piece.days * piece.meanC, 0) / days;
}

/**
 * Daily means of a year of hours.
 * @param hoursC 8,760 hourly values [°C]
 * @returns 365 means [°C]
 * @see own definition
 */
export function dailyMeans(hoursC: ArrayLike<number>): Float64Array {
  const perDay = hoursC.length / DAYS_PER_YEAR;
  const means = new Float64Array(DAYS_PER_YEAR);
  for (let hour = 0; hour < hoursC.length; hour++)
    means[Math.floor(hour / perDay)]! += hoursC[hour]! / perDay;
  return means;
}

function typicalMonthMeanC(typicalDayC: ArrayLike<number>, month: number): number {
  const first = DAYS_IN_MONTH.slice(0, month).reduce((sum, days) => sum + days, 0);
  const days = DAYS_IN_MONTH[month]!;
  let sum = 0;
  for (let day = 0; day < days; day++) sum += typicalDayC[first + day]!;
  return sum / days;
}

/**
 * The outdoor temperature of each day of an interval. Where the mean of a real month is known, the days of the typical
 * year are moved by one amount until their mean is that of the month.
 * @param from first day, days since 1970 [d]
 * @param to day after the last [d]
 * @param outdoor what is known of the outdoor air [°C]
 * @returns the days; undefined where nothing is known of one of them
 * @see own definition
 */
export function outdoorDays(from: number, to: number, outdoor: Outdoor): OutdoorDays[] | undefined {
  const pieces: OutdoorDays[] = [];
  const { typicalDayC, monthMeanC } = outdoor;
  for (let day = from; day < to; day++) {
    const month = isoMonth(day);
    const known = monthMeanC[month];
    if (typicalDayC) {
      const typicalC = typicalDayC[dayOfTypicalYear(day)]!;
      const shiftK =
        known === undefined ? 0 : known - typicalMonthMeanC(typicalDayC, Number(month.slice(5)) - 1);
      pieces.push({ days: 1, meanC: typicalC + shiftK, scattered: false });
    } else if (known !== undefined) {
      pieces.push({ days: 1, meanC: known, scattered: true });
    } else return undefined;
  }
  return pieces;
}
