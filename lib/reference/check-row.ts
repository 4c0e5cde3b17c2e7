import type { ReferenceRow } from './reference-row';

/** One number of a check: what is expected, what the product computes, and how far they may lie apart. */
export interface CheckedValue {
  name: string;
  expected: number;
  computed: number;
  /** absolute, in the unit of the value */
  tolerance: number;
  /** computed − expected */
  residual: number;
  within: boolean;
}

/**
 * Runs a check: calls the product and compares each expected number.
 * @param row check with its expected values and tolerance
 * @returns the numbers in the order of the row
 * @throws when the row states no tolerance for a number
 */
export function checkRow(row: ReferenceRow): CheckedValue[] {
  const actual = row.compute();
  return Object.entries(row.expected).map(([name, expected]) => {
    const stated = typeof row.tolerance === 'number' ? row.tolerance : row.tolerance[name];
    if (stated === undefined) throw new Error(`${row.id}: no tolerance for ${name}`);
    const tolerance = row.relative ? stated * Math.abs(expected) : stated;
    const computed = actual[name] ?? NaN;
    const residual = computed - expected;
    return { name, expected, computed, tolerance, residual, within: Math.abs(residual) <= tolerance };
  });
}

/** A check with its outcome: plain data, for tables and workers. */
export interface CheckedRow extends Pick<ReferenceRow, 'id' | 'title' | 'source' | 'provenance' | 'tier'> {
  values: CheckedValue[];
  within: boolean;
}

/** Runs a check and keeps what a table prints of it. */
export function checkedRow(row: ReferenceRow): CheckedRow {
  const { id, title, source, provenance, tier } = row;
  const values = checkRow(row);
  return { id, title, source, provenance, tier, values, within: values.every(({ within }) => within) };
}
