import { quantityHint, type QuantityMeta } from '@/lib/schemas/quantity';
import { FAHRENHEIT_OFFSET, FAHRENHEIT_PER_KELVIN } from '@/lib/units/constants';
import { formatTyped, readNumber } from '@/lib/units/display';

/** A value that somebody may have meant, and the word for it. */
export interface Correction {
  value: number;
  word: string;
}

const SLIPS = [10, 0.1, 100, 0.01, 1000, 0.001];

/**
 * The obvious slip behind a number out of range: degrees Fahrenheit, a lost sign or a misplaced decimal point.
 * @param text what was typed
 * @param meta the field
 * @returns what was probably meant; undefined when nothing is obvious
 */
export function offeredCorrection(text: string, meta: QuantityMeta): Correction | undefined {
  const value = readNumber(text);
  if (value === undefined || (value >= meta.min && value <= meta.max)) return undefined;
  const fits = (candidate: number) => candidate >= meta.min && candidate <= meta.max;
  if (meta.unit === '°C' && value > meta.max) {
    const celsius = Math.round((value - FAHRENHEIT_OFFSET) / FAHRENHEIT_PER_KELVIN);
    if (fits(celsius)) return { value: celsius, word: `${formatTyped(celsius)} (${formatTyped(value)} °F)` };
  }
  if (value < 0 && fits(-value)) return { value: -value, word: formatTyped(-value) };
  const distance = (candidate: number) => Math.abs(Math.log(candidate / meta.default));
  const [nearest] = SLIPS.map((slip) => Number((value * slip).toPrecision(9)))
    .filter((candidate) => candidate > 0 && meta.default > 0 && fits(candidate))
    .sort((a, b) => distance(a) - distance(b));
  return nearest === undefined ? undefined : { value: nearest, word: formatTyped(nearest) };
}

/** What stands below a field in error: the schema's own words, and why where the text is no number at all. */
export function errorWords(text: string, meta: QuantityMeta, message = quantityHint(meta)): string {
  if (text.trim() === '') return `${message} The field is empty.`;
  return readNumber(text) === undefined ? `${message} “${text.trim()}” is no number.` : message;
}
