import { describe, expect, it } from 'vitest';
import { checkRow } from '@/lib/reference/check-row';
import type { ReferenceRow } from '@/lib/reference/reference-row';
import { isRegression, referenceRows as rows } from '@/lib/reference/reference-rows';

const published = rows.filter((row) => !isRegression(row));
const regression = rows.filter(isRegression);

const words = (row: ReferenceRow) => `${row.id}: ${row.title} [${row.source}; ${row.provenance}]`;

function check(row: ReferenceRow): void {
  for (const { name, computed, expected, tolerance, within } of checkRow(row)) {
    expect(
      within,
      `${row.id} ${name}: ${computed} instead of ${expected} ± ${tolerance} (${row.source})`,
    ).toBe(true);
  }
}

describe('published values', () => {
  for (const row of published) it(words(row), () => check(row));
});

describe('regression: computed from the cited equation', () => {
  for (const row of regression) it(words(row), () => check(row));
});

describe('the table of checks', () => {
  it('holds at least 75 published rows', () => {
    expect(published.length).toBeGreaterThanOrEqual(75);
    const known = published.filter(({ provenance }) => provenance === 'read' || provenance === 'from memory');
    expect(known.length).toBe(published.length);
  });

  it('names each check once and says a source', () => {
    expect(new Set(rows.map((row) => row.id)).size).toBe(rows.length);
    expect(rows.filter((row) => row.source.trim() === '' || Object.keys(row.expected).length === 0)).toEqual(
      [],
    );
  });
});
