/**
 * `npm run check:references`: every check of the product against an outside value, as a table. Published values come
 * first; rows that repeat the cited equation by other means follow apart, as regression. Exits non-zero when a number
 * is out of tolerance or fewer than 75 checks are published.
 */
import { checkedRow, type CheckedRow } from '@/lib/reference/check-row';
import { isRegression, referenceRows } from '@/lib/reference/reference-rows';

const LEAST_PUBLISHED = 75;
const WIDTHS = [22, 14, 14, 10, 10, 4];

const digits = (value: number) =>
  value !== 0 && (Math.abs(value) < 1e-3 || Math.abs(value) >= 1e6)
    ? value.toExponential(3)
    : String(Number(value.toPrecision(7)));
const small = (value: number) => value.toExponential(1);

/** One line for the check, and one for each number that it compares. */
function print({ id, title, source, provenance, tier, values }: CheckedRow): void {
  console.info(`\n${id}  ${title}`);
  console.info(`    ${tier}, ${provenance}: ${source}`);
  for (const { name, expected, computed, tolerance, residual, within } of values) {
    const cells = [
      name,
      digits(expected),
      digits(computed),
      small(tolerance),
      small(residual),
      within ? 'ok' : 'OUT',
    ];
    console.info(`    ${cells.map((cell, i) => cell.padEnd(WIDTHS[i]!)).join(' ')}`);
  }
}

function printAll(heading: string, rows: readonly CheckedRow[]): number {
  console.info(`\n=== ${heading} ===`);
  console.info(
    `    ${['number', 'expected', 'computed', 'tolerance', 'residual', ''].map((cell, i) => cell.padEnd(WIDTHS[i]!)).join(' ')}`,
  );
  rows.forEach(print);
  return rows.filter(({ within }) => !within).length;
}

const rows = referenceRows.map(checkedRow);
const published = rows.filter((row) => !isRegression(row));
const regression = rows.filter(isRegression);
const outPublished = printAll('published values, read or from memory', published);
const outRegression = printAll('regression: computed from the cited equation by other means', regression);
const read = published.filter(({ provenance }) => provenance === 'read').length;

console.info(
  `\n${published.length} published checks (${read} read, ${published.length - read} from memory), at least ${LEAST_PUBLISHED} wanted: ${outPublished} out of tolerance`,
);
console.info(`${regression.length} regression checks: ${outRegression} out of tolerance`);
process.exitCode = outPublished + outRegression > 0 || published.length < LEAST_PUBLISHED ? 1 : 0;
