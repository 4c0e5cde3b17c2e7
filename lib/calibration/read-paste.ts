import type { BillRow } from './bill-row';
import { readDate, type DateOrder, type ReadDate } from './read-date';

/** What was answered when a paste could be read in two ways. */
export interface PasteAnswers {
  order?: DateOrder;
  decimal?: 'point' | 'comma';
}

/** A question that a paste leaves open: never guessed. */
export type PasteQuestion =
  | { kind: 'order'; row: number; text: string; dayFirst: string; monthFirst: string }
  | { kind: 'decimal'; row: number; text: string; point: number; comma: number };

/** A row of the paste that cannot be taken, numbered as people count. */
export interface PasteProblem {
  row: number;
  text: string;
}

export type ReadPaste =
  | { kind: 'rows'; rows: BillRow[]; problems: PasteProblem[] }
  | { kind: 'question'; question: PasteQuestion }
  | { kind: 'nothing'; message: string };

const TRUE_WORDS = /^(e|est\.?|estimated?|estimate|yes|y|true|x|1)$/i;
const FALSE_WORDS = /^(|a|actual|read|real|no|n|false|0|-)$/i;
const NUMBER = /^[+\u2212-]?\d[\d\s.,'\u00a0\u2009\u202f]*$/;

function separatorOf(lines: readonly string[]): string | undefined {
  if (lines.some((line) => line.includes('\t'))) return '\t';
  if (lines.some((line) => line.includes(';'))) return ';';
  return lines.some((line) => line.includes(',')) ? ',' : undefined;
}

/** Cells of a line; quotes keep a separator inside a cell. */
function cellsOf(line: string, separator: string): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const sign of line) {
    if (sign === '"') quoted = !quoted;
    else if (sign === separator && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += sign;
  }
  cells.push(cell.trim());
  return cells;
}

interface PastedLine {
  /** as people count */
  row: number;
  cells: string[];
}

const isDate = (text: string) => readDate(text).kind !== 'none';

/** Lines with cells; a head without any date is passed over. */
function linesOf(text: string): PastedLine[] {
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\r|\n/);
  const separator = separatorOf(lines);
  if (!separator) return [];
  const all = lines
    .map((line, i) => ({ row: i + 1, cells: cellsOf(line, separator) }))
    .filter(({ cells }) => cells.some((cell) => cell !== ''));
  return all[0] && !all[0].cells.some(isDate) ? all.slice(1) : all;
}

/** The order that the dates themselves show, where one of them can be read in one way only. */
function shownOrders(lines: readonly PastedLine[]): Set<DateOrder> {
  const orders = lines.flatMap(({ cells }) =>
    cells.flatMap((cell) => {
      const date = readDate(cell);
      return date.kind === 'day' && date.order ? [date.order] : [];
    }),
  );
  return new Set(orders);
}

function plainNumber(text: string, decimal: 'point' | 'comma'): number | undefined {
  const thousands = decimal === 'point' ? /[\s,'\u00a0\u2009\u202f]/g : /[\s.'\u00a0\u2009\u202f]/g;
  const plain = text.replace(thousands, '').replace('\u2212', '-').replace(',', '.');
  return /^[+-]?\d+(\.\d+)?$/.test(plain) ? Number(plain) : undefined;
}

/** The decimal sign that a number shows: the last of two, or one that is not followed by three digits. */
function shownDecimal(text: string): 'point' | 'comma' | 'none' | 'either' {
  const point = text.lastIndexOf('.');
  const comma = text.lastIndexOf(',');
  if (point < 0 && comma < 0) return 'none';
  if (point >= 0 && comma >= 0) return point > comma ? 'point' : 'comma';
  const sign = point >= 0 ? '.' : ',';
  const other = sign === '.' ? 'comma' : 'point';
  if (text.indexOf(sign) !== text.lastIndexOf(sign)) return other;
  if (/^[+\u2212-]?[1-9]\d{0,2}[.,]\d{3}$/.test(text)) return 'either';
  return sign === '.' ? 'point' : 'comma';
}

function questionOf(
  lines: readonly PastedLine[],
  answers: PasteAnswers,
  orders: ReadonlySet<DateOrder>,
  decimals: ReadonlySet<string>,
): PasteQuestion | undefined {
  for (const { row, cells } of lines)
    for (const cell of cells) {
      const date: ReadDate = readDate(cell);
      if (date.kind === 'either' && !answers.order && orders.size !== 1)
        return { kind: 'order', row, text: cell, dayFirst: date.dayFirst, monthFirst: date.monthFirst };
      const undecided = date.kind === 'none' && NUMBER.test(cell) && shownDecimal(cell) === 'either';
      if (undecided && !answers.decimal && decimals.size !== 1)
        return {
          kind: 'decimal',
          row,
          text: cell,
          point: plainNumber(cell, 'point')!,
          comma: plainNumber(cell, 'comma')!,
        };
    }
  return undefined;
}

function rowOf(
  { row, cells }: PastedLine,
  meter: boolean,
  order: DateOrder | undefined,
  decimal: 'point' | 'comma' | undefined,
): BillRow | PasteProblem {
  const dates = cells.flatMap((cell) => {
    const date = readDate(cell, order);
    return date.kind === 'day' ? [date.iso] : [];
  });
  const rest = cells.filter((cell) => !isDate(cell));
  const figures = rest.filter((cell) => NUMBER.test(cell));
  const first = figures[0];
  if (dates.length === 0) return { row, text: 'no date is found in it.' };
  if (!meter && dates.length === 1)
    return {
      row,
      text: 'it has one date. Bills need a first and a last day; readings of a meter need one: choose which above.',
    };
  if (first === undefined) return { row, text: 'no quantity is found in it.' };
  const shown = shownDecimal(first);
  const sign = shown === 'point' || shown === 'comma' ? shown : (decimal ?? 'point');
  const quantity = plainNumber(first, sign);
  if (quantity === undefined) return { row, text: `“${first}” is no number.` };
  const words = rest
    .slice(rest.indexOf(first) + 1)
    .filter((cell) => TRUE_WORDS.test(cell) || FALSE_WORDS.test(cell));
  const estimated = words.some((cell) => TRUE_WORDS.test(cell));
  return meter
    ? { from: '', to: dates.at(-1)!, quantity, estimated }
    : { from: dates[0]!, to: dates[1]!, quantity, estimated };
}

/**
 * Reads rows pasted from a spreadsheet: tabs, semicolons or commas between cells, with or without a head; dates, then
 * the quantity, then a word or mark for an estimate. What can be read in two ways is asked.
 * @param text the pasted text
 * @param meter one date in a row, and the standing of a meter, instead of two dates and a use
 * @param answers what was answered so far
 */
export function readPaste(text: string, meter: boolean, answers: PasteAnswers = {}): ReadPaste {
  const lines = linesOf(text);
  if (lines.length === 0)
    return {
      kind: 'nothing',
      message:
        'No rows are found. Copy the cells of a spreadsheet, or text with tabs, semicolons or commas between them.',
    };
  const orders = shownOrders(lines);
  const cells = lines.flatMap((line) => line.cells).filter((cell) => !isDate(cell) && NUMBER.test(cell));
  const decimals = new Set(cells.map(shownDecimal).filter((sign) => sign === 'point' || sign === 'comma'));
  const question = questionOf(lines, answers, orders, decimals);
  if (question) return { kind: 'question', question };
  const order = answers.order ?? [...orders][0];
  const decimal = answers.decimal ?? [...decimals][0];
  const rows: BillRow[] = [];
  const problems: PasteProblem[] = [];
  for (const line of lines) {
    const found = rowOf(line, meter, order, decimal);
    if ('quantity' in found) rows.push(found);
    else problems.push(found);
  }
  return { kind: 'rows', rows, problems };
}
