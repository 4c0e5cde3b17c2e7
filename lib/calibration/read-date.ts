import { dayNumber } from './day-number';

/** Which of two small numbers of a date is the day. */
export type DateOrder = 'day first' | 'month first';

/** What a text says as a date: one day, one of two days, or none. */
export type ReadDate =
  | { kind: 'day'; iso: string; order?: DateOrder }
  | { kind: 'either'; dayFirst: string; monthFirst: string }
  | { kind: 'none' };

const MONTH_WORDS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];
const NONE: ReadDate = { kind: 'none' };

function iso(year: string, month: number, day: number): string | undefined {
  const fullYear = year.length === 2 ? `20${year}` : year;
  const text = `${fullYear}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
  return dayNumber(text) === undefined ? undefined : text;
}

function only(text: string | undefined, order?: DateOrder): ReadDate {
  return text ? { kind: 'day', iso: text, ...(order ? { order } : {}) } : NONE;
}

function inFigures(first: number, second: number, year: string, order: DateOrder | undefined): ReadDate {
  const dayFirst = iso(year, second, first);
  const monthFirst = iso(year, first, second);
  if (dayFirst === monthFirst) return only(dayFirst);
  if (dayFirst && monthFirst && !order) return { kind: 'either', dayFirst, monthFirst };
  if (dayFirst && monthFirst) return only(order === 'day first' ? dayFirst : monthFirst);
  return dayFirst ? only(dayFirst, 'day first') : only(monthFirst, 'month first');
}

function inWords(text: string): ReadDate {
  const dayThenMonth = /^(\d{1,2})\.?[\s-]+([a-z]{3,9})\.?,?[\s-]+(\d{4}|\d{2})$/i.exec(text);
  const monthThenDay = /^([a-z]{3,9})\.?\s+(\d{1,2}),?\s+(\d{4})$/i.exec(text);
  const day = dayThenMonth?.[1] ?? monthThenDay?.[2];
  const word = dayThenMonth?.[2] ?? monthThenDay?.[1];
  const year = dayThenMonth?.[3] ?? monthThenDay?.[3];
  if (!day || !word || !year) return NONE;
  const month = MONTH_WORDS.indexOf(word.slice(0, 3).toLowerCase()) + 1;
  return month > 0 ? only(iso(year, month, Number(day))) : NONE;
}

/**
 * Reads a date as people write it: 2024-03-01, 1.3.2024, 13/3/24, 1 March 2024. Dots put the day first; with strokes
 * the order shows only where one of the numbers is above 12, so that 3/4/2024 is two days until somebody says which.
 * @param text what was typed or pasted
 * @param order the answer of whoever was asked, or what other rows of the same paste show
 */
export function readDate(text: string, order?: DateOrder): ReadDate {
  const plain = text.trim().replace(/\s+00:00(:00)?$/, '');
  const yearFirst = /^(\d{4})([-/.])(\d{1,2})\2(\d{1,2})$/.exec(plain);
  if (yearFirst) return only(iso(yearFirst[1]!, Number(yearFirst[3]), Number(yearFirst[4])));
  const dots = /^(\d{1,2})\.\s?(\d{1,2})\.\s?(\d{4}|\d{2})$/.exec(plain);
  if (dots) return only(iso(dots[3]!, Number(dots[2]), Number(dots[1])));
  const strokes = /^(\d{1,2})([/-])(\d{1,2})\2(\d{4}|\d{2})$/.exec(plain);
  if (strokes) return inFigures(Number(strokes[1]), Number(strokes[3]), strokes[4]!, order);
  return inWords(plain);
}
