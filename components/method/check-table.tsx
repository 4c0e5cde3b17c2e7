import type { CheckedRow, CheckedValue } from '@/lib/reference/check-row';
import type { Provenance } from '@/lib/reference/reference-row';
import { formatFixed } from '@/lib/units/display';
import { Prose } from './method-text';
import { Scientific } from './scientific';

export const PROVENANCE_WORDS: Record<Provenance, string> = {
  read: 'published, read',
  'from memory': 'published, from memory',
  derived: 'derived from the cited equation',
  'common practice': 'common practice, no source',
};

const MOST_DECIMALS = 9;

/** As many decimals as the tolerance gives a meaning to, and one more. */
function decimalsFor(tolerance: number): number {
  if (!(tolerance > 0)) return MOST_DECIMALS;
  return Math.min(MOST_DECIMALS, Math.max(0, Math.ceil(-Math.log10(tolerance)) + 1));
}

interface CheckTableProps {
  /** what the table holds, spoken */
  label: string;
  rows: readonly CheckedRow[];
}

/** Checks with what is expected, what the product computes, and how far apart the two may lie. */
export function CheckTable({ label, rows }: CheckTableProps) {
  return (
    <div className="overflow-x-auto" role="region" aria-label={label} tabIndex={0}>
      <table className="w-full min-w-[36rem]">
        <thead>
          <tr>
            <th scope="col">Check</th>
            {['expected', 'computed', 'tolerance', 'residual'].map((name) => (
              <th key={name} scope="col" data-number>
                {name}
              </th>
            ))}
            <th scope="col" className="w-24 pl-4">
              outcome
            </th>
          </tr>
        </thead>
        {rows.map((row) => (
          <CheckRows key={row.id} row={row} />
        ))}
      </table>
    </div>
  );
}

function CheckRows({ row }: { row: CheckedRow }) {
  return (
    <tbody id={`check-${row.id}`}>
      <tr>
        <th scope="rowgroup" colSpan={6} className="pt-3 font-normal">
          <strong>
            <Prose text={row.title} />
          </strong>
          <span className="block text-note text-muted">
            {row.id} · {row.source} · {PROVENANCE_WORDS[row.provenance]}
            {row.tier === 'C' && ' · regression'}
          </span>
        </th>
      </tr>
      {row.values.map((value) => (
        <ValueRow key={value.name} value={value} />
      ))}
    </tbody>
  );
}

function ValueRow({ value }: { value: CheckedValue }) {
  const { name, expected, computed, tolerance, residual, within } = value;
  const decimals = decimalsFor(tolerance);
  return (
    <tr>
      <th scope="row" className="pl-4 font-normal text-muted">
        {name}
      </th>
      <td data-number>{formatFixed(expected, decimals)}</td>
      <td data-number>{formatFixed(computed, decimals)}</td>
      <td data-number>
        ± <Scientific value={tolerance} />
      </td>
      <td data-number>
        <Scientific value={residual} />
      </td>
      <td className={within ? 'pl-4 text-savings-text' : 'pl-4 font-strong text-hot-text'}>
        {within ? 'within' : 'outside'}
      </td>
    </tr>
  );
}
