import { describe, expect, it, vi } from 'vitest';
import { climates } from '@/data/climates/climates';
import { compareWeek, FLOW_TOLERANCE, systemCases } from './cases';
import { fixedInletRow, limitRows } from './limits';

vi.setConfig({ testTimeout: 60_000 });

/*
 * The quick part of `npm run check:system`. Outside truth: the equations of ISO 9806:2017, ISO 13790:2008, EN 1264-2,
 * EN 442-2 and Duffie & Beckman 2013, written a second time and integrated by the library odex at 1e-9.
 */
const cases = systemCases();
const quick = [cases[1]!, cases[3]!];

describe('a week of plan and year loop against the separately written equations', () => {
  for (const subject of quick) {
    it(`gives every heat flow within 0.1 % in steps of 5 s: ${subject.name}`, () => {
      for (const { flow, fine } of compareWeek(subject).flows)
        expect(fine, flow).toBeLessThanOrEqual(FLOW_TOLERANCE);
    });
  }
});

describe('limits of the system', () => {
  for (const { name, value, expected, within } of limitRows()) {
    it(name, () => expect(within, `${value} instead of ${expected}`).toBe(true));
  }

  it('gives at a fixed inlet what the hourly sum of the curve by hand gives, to 1e-6 of a year', () => {
    const { value, expected, within } = fixedInletRow(climates[0]!.weatherYear());
    expect(within, `${value} instead of ${expected}`).toBe(true);
  });
});
