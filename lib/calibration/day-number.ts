import { DAYS_IN_MONTH, HOURS_PER_DAY, MS_PER_HOUR } from '@/lib/units/constants';

const MS_PER_DAY = HOURS_PER_DAY * MS_PER_HOUR;

const MONTHS = [
  'January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December',
] as const; // prettier-ignore

/** First day of each month in a year of 365 days. */
const MONTH_START_DAY = DAYS_IN_MONTH.map((_, month) =>
  DAYS_IN_MONTH.slice(0, month).reduce((sum, days) => sum + days, 0),
);

/**
 * The number of a calendar day, so that days can be counted by subtraction.
 * @param iso a day as 2024-03-01
 * @returns days since 1 January 1970 [d]; undefined when there is no such day
 * @see ISO 8601-1:2019, calendar date
 */
export function dayNumber(iso: string): number | undefined {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(iso);
  if (!parts) return undefined;
  const day = Math.round(Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3])) / MS_PER_DAY);
  return isoDay(day) === iso ? day : undefined;
}

/**
 * The calendar day of a number.
 * @param day days since 1 January 1970 [d]
 * @returns the day as 2024-03-01
 * @see ISO 8601-1:2019, calendar date
 */
export function isoDay(day: number): string {
  return new Date(day * MS_PER_DAY).toISOString().slice(0, 10);
}

/**
 * The month that a day lies in.
 * @param day days since 1 January 1970 [d]
 * @returns the month as 2024-03
 * @see ISO 8601-1:2019, calendar date
 */
export function isoMonth(day: number): string {
  return isoDay(day).slice(0, 7);
}

/**
 * The place of a day in a typical year of 365 days; 29 February is taken for the 28th.
 * @param day days since 1 January 1970 [d]
 * @returns 0 to 364 [d]
 * @see own definition: a weather year leaves out 29 February
 */
export function dayOfTypicalYear(day: number): number {
  const iso = isoDay(day);
  const month = Number(iso.slice(5, 7)) - 1;
  return MONTH_START_DAY[month]! + Math.min(Number(iso.slice(8)), DAYS_IN_MONTH[month]!) - 1;
}

/**
 * A day in words.
 * @param day days since 1 January 1970 [d]
 * @returns for example "1 March 2024"
 * @see own definition
 */
export function dayWords(day: number): string {
  const iso = isoDay(day);
  return `${Number(iso.slice(8))} ${MONTHS[Number(iso.slice(5, 7)) - 1]!} ${iso.slice(0, 4)}`;
}
