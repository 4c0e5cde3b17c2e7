/** One reading as somebody wrote it down. */
export interface BillRow {
  /** first day as 2024-03-01; not used by a meter that is read */
  from: string;
  /** last day, or the day of the reading */
  to: string;
  /** what was used between the days, or what the meter shows, in the unit of the bills */
  quantity: number;
  estimated: boolean;
}

/** What is said to one row: left out, joined with others, or taken with a remark. */
export interface RowAnswer {
  /** index of the row, from 0 */
  row: number;
  kind: 'left out' | 'joined' | 'remark';
  text: string;
}

/** A time between two real readings and what was used in it. */
export interface BillInterval {
  /** first day, and the day of the reading that ends it: days since 1970 [d] */
  from: number;
  to: number;
  /** in the unit of the bills */
  quantity: number;
  /** indices of the rows it is made of */
  rows: number[];
}

/** What the rows make together. */
export interface BillIntervals {
  intervals: BillInterval[];
  answers: RowAnswer[];
}

/**
 * Row numbers as people count, for a sentence.
 * @param rows indices from 0 [-]
 * @returns "row 3", "rows 3 and 4"
 * @see own definition
 */
export function rowWords(rows: readonly number[]): string {
  const numbers = rows.map((row) => String(row + 1));
  const last = numbers.pop();
  return numbers.length > 0 ? `rows ${numbers.join(', ')} and ${last}` : `row ${last}`;
}
