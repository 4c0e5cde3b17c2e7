import * as Plot from '@observablehq/plot';
import { parseHTML } from 'linkedom';
import { describe, expect, it } from 'vitest';
import { monthsPlot } from '@/components/charts/months-plot';
import { monthOrder } from '@/components/mosaic/calendar';
import { FIRST_OF_JULY } from '@/components/mosaic/stones';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { inventedAnswer } from '../fakes/invented-answer';

const { result } = inventedAnswer(demonstration.designs[0], {
  solarKwh: 1,
  backupKwh: 1,
  referenceKwh: 2,
  perKwh: 1,
});

function draw(firstDay: number) {
  const { document } = parseHTML('<!doctype html><html><body></body></html>');
  const options = monthsPlot(result.months, monthOrder(firstDay), 640);
  return Plot.plot({ ...options, document: document as unknown as Document });
}

describe('the monthly chart', () => {
  it('draws sun and backup of twelve months, in the order of the picture', () => {
    const svg = draw(FIRST_OF_JULY);
    expect(svg.querySelectorAll('g[aria-label="bar"] rect')).toHaveLength(24);
    expect(svg.querySelectorAll('g[aria-label="tick"] line')).toHaveLength(12);
    const names = [...svg.querySelectorAll('g[aria-label="x-axis tick label"] text')].map(
      (text) => text.textContent,
    );
    expect(names).toEqual([
      'Jul',
      'Aug',
      'Sep',
      'Oct',
      'Nov',
      'Dec',
      'Jan',
      'Feb',
      'Mar',
      'Apr',
      'May',
      'Jun',
    ]);
  });

  it('gives backup a hatch beside its colour', () => {
    const svg = draw(0);
    expect(svg.querySelector('pattern')?.getAttribute('id')).toBe('months-backup-hatch');
    const fills = [...svg.querySelectorAll('g[aria-label="bar"] rect')].map((bar) =>
      bar.getAttribute('fill'),
    );
    expect(new Set(fills)).toEqual(new Set(['var(--color-sun)', 'url(#months-backup-hatch)']));
  });

  it('stands on the sun and ends at the need', () => {
    const bars = [...draw(0).querySelectorAll('g[aria-label="bar"] rect')];
    const height = (bar: Element) => Number(bar.getAttribute('height'));
    const [january, february] = bars.filter((bar) => bar.getAttribute('fill') === 'var(--color-sun)');
    expect(height(february!) / height(january!)).toBeCloseTo(110 / 100, 2);
  });
});
