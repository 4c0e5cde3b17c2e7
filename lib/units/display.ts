/**
 * Numbers as people read them: two or three significant figures, a narrow space between thousands, a true minus,
 * and a space before the unit at which no line breaks.
 */

/** Between thousands: narrow, and no line breaks at it. */
export const THOUSANDS_SPACE = '\u202f';
/** Between a number and its unit. */
export const UNIT_SPACE = '\u00a0';
const MINUS = '\u2212';
/** What stands where no number is known. */
export const NO_VALUE = '–';

function grouped(fixed: string): string {
  const [whole = '', decimals] = fixed.split('.');
  const digits = whole.replace('-', '');
  const spaced = digits.replace(/\B(?=(\d{3})+$)/g, THOUSANDS_SPACE);
  const nothing = /^[0.]*$/.test(fixed.replace('-', ''));
  const sign = whole.startsWith('-') && !nothing ? MINUS : '';
  return `${sign}${spaced}${decimals ? `.${decimals}` : ''}`;
}

/**
 * A number with a fixed count of decimals.
 * @param value number; not finite gives a dash
 * @param decimals digits after the point
 * @returns for example "−1.20", "2 670"
 */
export function formatFixed(value: number, decimals = 0): string {
  return Number.isFinite(value) ? grouped(value.toFixed(decimals)) : NO_VALUE;
}

/**
 * A number with a count of significant figures; zeros at the end are kept because they are known.
 * @param value number; not finite gives a dash
 * @param figures significant figures, 1 to 6
 * @returns for example "0.10", "10.8", "2 670"
 */
export function formatSignificant(value: number, figures = 3): string {
  if (!Number.isFinite(value)) return NO_VALUE;
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(figures));
  const leading = Math.floor(Math.log10(Math.abs(rounded)));
  return grouped(rounded.toFixed(Math.max(0, figures - 1 - leading)));
}

/**
 * A number as somebody typed it: no more digits than it has.
 * @param value number; not finite gives a dash
 * @returns for example "24", "35.5", "2 000"
 */
export function formatTyped(value: number): string {
  if (!Number.isFinite(value)) return NO_VALUE;
  return grouped(String(Number(value.toFixed(6))));
}

/**
 * A share as percent: whole numbers from 10 %, one decimal below.
 * @param share 0 to 1 [-]
 * @returns for example "23 %", "4.2 %"
 */
export function formatShare(share: number): string {
  const percent = share * 100;
  const small = Math.abs(percent) > 0 && Math.abs(percent) < 9.95;
  return withUnit(formatFixed(percent, small ? 1 : 0), '%');
}

/** A number and its unit, which stay together on one line; the degree of an angle stands close. */
export function withUnit(text: string, unit: string): string {
  if (!unit) return text;
  return unit === '°' ? `${text}${unit}` : `${text}${UNIT_SPACE}${unit}`;
}

/**
 * The sign of a currency.
 * @param code three letters of ISO 4217
 * @returns for example "€"; the code itself where there is no sign
 */
export function currencySign(code: string): string {
  try {
    const format = new Intl.NumberFormat('en-GB', {
      style: 'currency',
      currency: code,
      currencyDisplay: 'narrowSymbol',
    });
    return format.formatToParts(0).find((part) => part.type === 'currency')?.value ?? code;
  } catch {
    return code;
  }
}

/** A unit of the schemas in words of the project: "money/kWh" becomes "€/kWh". */
export function unitInCurrency(unit: string, currency: string): string {
  return unit.startsWith('money') ? unit.replace('money', currencySign(currency)) : unit;
}

/**
 * Reads a number as people type it: decimal point or comma, any minus, spaces between thousands.
 * @param text what was typed
 * @returns the number; undefined when it is none
 */
export function readNumber(text: string): number | undefined {
  const plain = text
    .trim()
    .replace(/[\s\u00a0\u2009\u202f]/g, '')
    .replace(/[\u2212\u2013]/g, '-')
    .replace(',', '.');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return undefined;
  const value = Number(plain);
  return Number.isFinite(value) ? value : undefined;
}
