import { describe, expect, it } from 'vitest';
import { collectorByCover, genericCollectors } from '@/data/collectors/generic';

/** Class ranges of η0 (gross) and a1: common figures of the trade, from memory. */
const ranges = {
  none: { eta0: [0.8, 0.95], a1: [13, 25] },
  film: { eta0: [0.68, 0.8], a1: [6, 9.5] },
  glass: { eta0: [0.68, 0.8], a1: [5, 7.5] },
  'twin-wall': { eta0: [0.6, 0.74], a1: [3.5, 6] },
  'selective glass': { eta0: [0.7, 0.78], a1: [2, 4.5] },
} as const;

describe('generic collector classes', () => {
  it.each(genericCollectors.map((c) => [c.name, c] as const))('%s lies within its class range', (_, c) => {
    const range = ranges[c.cover];
    expect(c.curve.eta0Beam).toBeGreaterThanOrEqual(range.eta0[0]);
    expect(c.curve.eta0Beam).toBeLessThanOrEqual(range.eta0[1]);
    expect(c.curve.a1).toBeGreaterThanOrEqual(range.a1[0]);
    expect(c.curve.a1).toBeLessThanOrEqual(range.a1[1]);
  });

  it('has one class for each cover', () => {
    for (const [cover, collector] of Object.entries(collectorByCover)) expect(collector.cover).toBe(cover);
    expect(new Set(Object.values(collectorByCover)).size).toBe(genericCollectors.length);
  });

  it('reproduces the published output of the selective class at right angles to the sun', () => {
    // ISO 9806:2017 certificate annex (2022), name withheld: 1000 W/m², 85 % beam, W per m² gross, printed to 1 W.
    const { eta0Beam, diffuseModifier, a1, a2 } = collectorByCover['selective glass'].curve;
    const outputs = { 0: 729, 10: 692, 30: 608, 50: 511, 70: 400, 83: 321 };
    for (const [riseK, watts] of Object.entries(outputs)) {
      const d = Number(riseK);
      const q = eta0Beam * (850 + diffuseModifier * 150) - a1 * d - a2 * d * d;
      expect(Math.abs(q - watts)).toBeLessThanOrEqual(0.5);
    }
  });

  it('never lets a part bear less for hours than for years', () => {
    for (const { parts } of genericCollectors)
      for (const part of parts) expect(part.shortTermLimitC).toBeGreaterThan(part.longTermLimitC);
  });
});
