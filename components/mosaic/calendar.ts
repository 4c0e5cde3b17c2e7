import { DAYS_IN_MONTH, HOURS_PER_DAY } from '@/lib/units/constants';
import { DAYS_SHOWN, FIRST_OF_JULY, columnOfDay, dayOfColumn } from './stones';

export const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/** First day of each month, counted from 1 January = 0. */
export const MONTH_FIRST_DAY: readonly number[] = DAYS_IN_MONTH.map((_, month) =>
  DAYS_IN_MONTH.slice(0, month).reduce((sum, days) => sum + days, 0),
);

/** Month (0 to 11) and day of the month (from 1) of a day of the year. */
export function dateOfDay(day: number): { month: number; date: number } {
  let month = 11;
  while (MONTH_FIRST_DAY[month]! > day) month--;
  return { month, date: day - MONTH_FIRST_DAY[month]! + 1 };
}

/** "26 February". */
export function dayName(day: number): string {
  const { month, date } = dateOfDay(day);
  return `${date} ${MONTHS[month]}`;
}

/** "13:00". */
export function clock(hour: number): string {
  return `${String(hour).padStart(2, '0')}:00`;
}

/** Months in the order of the picture, January first or July first. */
export function monthOrder(firstDay: number): number[] {
  const first = firstDay === FIRST_OF_JULY ? 6 : 0;
  return MONTHS.map((_, place) => (place + first) % 12);
}

const HOURS_SHOWN = DAYS_SHOWN * HOURS_PER_DAY;

/**
 * Where a key leads the cursor: arrows by hour and day, page keys by month, Home and End to the ends of the picture.
 * @param hour hour of the year 0 to 8759
 * @returns the new hour; undefined for other keys
 */
export function moveCursor(hour: number, key: string, firstDay: number): number | undefined {
  const day = Math.floor(hour / HOURS_PER_DAY);
  const clockHour = hour % HOURS_PER_DAY;
  const shown = columnOfDay(day, firstDay) * HOURS_PER_DAY + clockHour;
  const step = { ArrowUp: -1, ArrowDown: 1, ArrowLeft: -HOURS_PER_DAY, ArrowRight: HOURS_PER_DAY }[key];
  if (step !== undefined) return hourAtShown(Math.min(HOURS_SHOWN - 1, Math.max(0, shown + step)), firstDay);
  if (key === 'Home') return hourAtShown(clockHour, firstDay);
  if (key === 'End') return hourAtShown(HOURS_SHOWN - HOURS_PER_DAY + clockHour, firstDay);
  if (key === 'PageUp' || key === 'PageDown')
    return byMonth(day, key === 'PageUp' ? -1 : 1) * HOURS_PER_DAY + clockHour;
  return undefined;
}

function hourAtShown(shown: number, firstDay: number): number {
  return dayOfColumn(Math.floor(shown / HOURS_PER_DAY), firstDay) * HOURS_PER_DAY + (shown % HOURS_PER_DAY);
}

function byMonth(day: number, step: number): number {
  const { month, date } = dateOfDay(day);
  const next = (month + step + 12) % 12;
  return MONTH_FIRST_DAY[next]! + Math.min(date, DAYS_IN_MONTH[next]!) - 1;
}
