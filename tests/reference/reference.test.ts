import { describe, expect, it } from 'vitest';
import { buildingRows } from './building-rows';
import { collectorRows } from './collector-rows';
import { emitterRows } from './emitter-rows';
import { houseRows } from './house-rows';
import { hydraulicsRows } from './hydraulics-rows';
import { moneyRows } from './money-rows';
import type { ReferenceRow } from './reference-row';
import { storeAndWaterRows } from './store-and-water-rows';
import { sunRows } from './sun-rows';
import { systemRows } from './system-rows';

const rows: ReferenceRow[] = [
  ...collectorRows,
  ...emitterRows,
  ...storeAndWaterRows,
  ...hydraulicsRows,
  ...buildingRows,
  ...houseRows,
  ...moneyRows,
  ...sunRows,
  ...systemRows,
];
const published = rows.filter((row) => row.tier !== 'C');
const regression = rows.filter((row) => row.tier === 'C');

const words = (row: ReferenceRow) => `${row.id}: ${row.title} [${row.source}; ${row.provenance}]`;

function check(row: ReferenceRow): void {
  const actual = row.compute();
  for (const [key, expected] of Object.entries(row.expected)) {
    const stated = typeof row.tolerance === 'number' ? row.tolerance : row.tolerance[key];
    if (stated === undefined) throw new Error(`${row.id}: no tolerance for ${key}`);
    const tolerance = row.relative ? stated * Math.abs(expected) : stated;
    const message = `${row.id} ${key}: ${actual[key]} instead of ${expected} ± ${tolerance} (${row.source})`;
    expect(Math.abs(actual[key]! - expected), message).toBeLessThanOrEqual(tolerance);
  }
}

describe('published values', () => {
  for (const row of published) it(words(row), () => check(row));
});

describe('regression: computed from the cited equation', () => {
  for (const row of regression) it(words(row), () => check(row));
});

describe('the table of checks', () => {
  it('holds at least 40 rows, at least 20 of them published', () => {
    expect(rows.length).toBeGreaterThanOrEqual(40);
    const outside = rows.filter(
      (row) => row.tier !== 'C' || row.provenance === 'read' || row.provenance === 'from memory',
    );
    expect(outside.length).toBeGreaterThanOrEqual(20);
  });

  it('names each check once and says a source', () => {
    expect(new Set(rows.map((row) => row.id)).size).toBe(rows.length);
    expect(rows.filter((row) => row.source.trim() === '' || Object.keys(row.expected).length === 0)).toEqual(
      [],
    );
  });
});
