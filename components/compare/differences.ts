import { discountedPaybackYears } from '@/lib/economics/cash-flow';
import { currencySign, formatFixed, formatTyped, withUnit } from '@/lib/units/display';
import type { ComparedDesign } from './compared-design';

/** Money and time by which two designs are weighed. */
export interface Terms {
  /** three letters of ISO 4217 */
  currency: string;
  /** real interest per year [%] */
  realRate: number;
  /** horizon [years] */
  years: number;
}

/** One design against another, in words. */
export interface Difference {
  title: string;
  sentence: string;
}

/** Within this share two figures are called the same. */
const SAME = 0.02;

const same = (a: number, b: number) => Math.abs(a - b) <= SAME * Math.max(Math.abs(a), Math.abs(b));

const money = (amount: number, currency: string) =>
  withUnit(formatFixed(Math.round(amount / 10) * 10), currencySign(currency));

const kwh = (energy: number) => withUnit(formatFixed(Math.round(energy / 10) * 10), 'kWh');

function buildWords(one: ComparedDesign, other: ComparedDesign, { currency }: Terms): string {
  const more = one.toBuild - other.toBuild;
  if (same(one.toBuild, other.toBuild)) return 'Costs the same to build';
  return `Costs ${money(Math.abs(more), currency)} ${more > 0 ? 'more' : 'less'} to build`;
}

function heatWords(one: ComparedDesign, other: ComparedDesign): string {
  if (same(one.solarKwh, other.solarKwh)) {
    const areas = same(one.areaM2, other.areaM2)
      ? ''
      : ` from ${withUnit(formatTyped(one.areaM2), 'm²')} instead of ${formatTyped(other.areaM2)}`;
    return ` and gives the same heat${areas}.`;
  }
  const less = other.boughtKwh - one.boughtKwh;
  const points = Math.round(Math.abs(one.solarShare - other.solarShare) * 100);
  const share = points
    ? `; the sun carries ${points} ${points === 1 ? 'point' : 'points'} ${less > 0 ? 'more' : 'less'}`
    : '';
  return ` and buys ${kwh(Math.abs(less))} ${less > 0 ? 'less' : 'more'} energy every year${share}.`;
}

function yearsWords(extra: number, yearly: number, { realRate, years }: Terms): number | undefined {
  const paid = discountedPaybackYears(extra, yearly, 0, realRate / 100, years);
  return Number.isFinite(paid) ? paid : undefined;
}

function moneyWords(one: ComparedDesign, other: ComparedDesign, terms: Terms): string {
  const extra = one.toBuild - other.toBuild;
  const saves = other.runningPerYear - one.runningPerYear;
  if (same(one.toBuild, other.toBuild))
    return saves >= 0 ? '' : ` It costs ${money(-saves, terms.currency)} more to run each year.`;
  if (extra < 0 && saves >= 0) return ' Cheaper to build and to run.';
  if (extra < 0) {
    const eaten = yearsWords(-extra, -saves, terms);
    return eaten === undefined
      ? ` What it saves in building lasts beyond ${terms.years} years.`
      : ` What it saves in building is used up in year ${eaten}.`;
  }
  if (saves <= 0) return ' Never pays the difference back.';
  const paid = yearsWords(extra, saves, terms);
  return paid === undefined
    ? ` Does not pay the difference back within ${terms.years} years.`
    : ` The difference is paid back in year ${paid}.`;
}

function lifeWords(one: ComparedDesign, other: ComparedDesign, { years }: Terms): string {
  return !one.replaces && other.replaces ? ` Its collectors have nothing to replace for ${years} years.` : '';
}

/** What stands dry too hot, in words; the words defer to the maker's data. */
export function dryWords(design: ComparedDesign): string {
  const { hotPart } = design;
  if (!hotPart) return '';
  const hours = `${formatFixed(hotPart.hours)} ${hotPart.hours === 1 ? 'hour' : 'hours'}`;
  return `dry, its ${hotPart.material} passes ${withUnit(formatTyped(hotPart.limitC), '°C')} in ${hours} of this year`;
}

function safetyWords(one: ComparedDesign, other: ComparedDesign): string {
  if (one.hotPart && !other.hotPart) return ` But ${dryWords(one)}; ${other.name} bears all its dry hours.`;
  if (!one.hotPart && other.hotPart)
    return ` And it bears all its dry hours, while ${other.name} does not: ${dryWords(other)}.`;
  return one.hotPart && other.hotPart
    ? ` Neither bears all its dry hours: ${one.name}, ${dryWords(one)}.`
    : '';
}

/** One design against another: to build, heat, money over the years, what is replaced, and how it stands dry. */
export function differenceInWords(one: ComparedDesign, other: ComparedDesign, terms: Terms): Difference {
  return {
    title: `${one.name} against ${other.name}`,
    sentence:
      buildWords(one, other, terms) +
      heatWords(one, other) +
      moneyWords(one, other, terms) +
      lifeWords(one, other, terms) +
      safetyWords(one, other),
  };
}

/** Every design against the first; of three, also the second against the third. */
export function differences(designs: readonly ComparedDesign[], terms: Terms): Difference[] {
  const [first, ...others] = designs;
  if (!first) return [];
  const found = others.map((design) => differenceInWords(design, first, terms));
  const [second, third] = others;
  if (second && third && others.length === 2) found.push(differenceInWords(second, third, terms));
  return found;
}

/** Why designs cannot be set against each other as they stand; undefined when like stands with like. */
export function notLikeForLike(designs: readonly ComparedDesign[]): string | undefined {
  const weathers = new Set(designs.map(({ weatherName }) => weatherName));
  const rooms = new Set(designs.map(({ roomSetC }) => roomSetC));
  const cold = designs.filter(({ unmetKwh }) => unmetKwh > 50);
  const words: string[] = [];
  if (weathers.size > 1) words.push(`different weather years (${[...weathers].join(', ')})`);
  if (rooms.size > 1)
    words.push(
      `different room temperatures (${[...rooms].map((c) => withUnit(formatTyped(c), '°C')).join(', ')})`,
    );
  if (cold.length > 0 && cold.length < designs.length)
    words.push(`a house that stays too cold with ${cold.map(({ name }) => name).join(', ')}`);
  return words.length
    ? `Not like for like: these designs were worked with ${words.join(' and ')}.`
    : undefined;
}
