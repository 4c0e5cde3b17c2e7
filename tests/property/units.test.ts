import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as constants from '@/lib/units/constants';
import { formatFixed, formatSignificant, formatTyped, NO_VALUE, readNumber } from '@/lib/units/display';

/* There and back again: own requirements, no source. */

const SEED = Number(process.env.PROPERTY_SEED ?? 20_261_201);
const settings = { numRuns: 2000, seed: SEED };
/** Zero, or a size that physics knows: below it doubles lose their digits. */
const finite = fc
  .double({ min: -1e9, max: 1e9, noNaN: true })
  .map((value) => (Math.abs(value) < 1e-30 ? 0 : value));
/** As people type numbers: a few digits before and after the point. */
const typed = fc
  .tuple(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 4 }))
  .map(([n, d]) => n / 10 ** d);

describe('numbers shown and read back', () => {
  it('a number as typed comes back as it was', () => {
    fc.assert(
      fc.property(typed, (value) => {
        expect(readNumber(formatTyped(value))! + 0).toBe(value + 0);
      }),
      settings,
    );
  });

  it('a fixed count of decimals is off by at most half of the last one', () => {
    fc.assert(
      fc.property(finite, fc.integer({ min: 0, max: 4 }), (value, decimals) => {
        const back = readNumber(formatFixed(value, decimals))!;
        expect(Math.abs(back - value)).toBeLessThanOrEqual(
          0.5 * 10 ** -decimals + 1e-15 * Math.abs(value) + 1e-12,
        );
      }),
      settings,
    );
  });

  it('significant figures are off by at most half of the last one', () => {
    fc.assert(
      fc.property(finite, fc.integer({ min: 1, max: 6 }), (value, figures) => {
        fc.pre(value === 0 || Math.abs(value) > 1e-9);
        const back = readNumber(formatSignificant(value, figures))!;
        expect(Math.abs(back - value)).toBeLessThanOrEqual(0.5001 * 10 ** (1 - figures) * Math.abs(value));
      }),
      settings,
    );
  });

  it('reads a decimal comma as a point', () => {
    fc.assert(
      fc.property(typed, (value) => {
        expect(readNumber(formatTyped(value).replace('.', ','))).toBe(readNumber(formatTyped(value)));
      }),
      settings,
    );
  });

  it('shows a dash for what is no number', () => {
    for (const value of [NaN, Infinity, -Infinity]) {
      expect([formatFixed(value), formatSignificant(value), formatTyped(value)]).toEqual(
        Array(3).fill(NO_VALUE),
      );
    }
  });
});

describe('factors between units', () => {
  const pairs: [number, number][] = [
    [constants.J_PER_KWH, constants.KWH_PER_J],
    [constants.J_PER_WH, constants.WH_PER_J],
    [constants.M_PER_FT, constants.FT_PER_M],
    [constants.M_PER_INCH, constants.INCH_PER_M],
    [constants.KG_PER_LB, constants.LB_PER_KG],
    [constants.DEGREES_PER_RADIAN, constants.RADIANS_PER_DEGREE],
  ];

  it.each(pairs)('%d and %d undo each other', (there, back) => {
    fc.assert(
      fc.property(finite, (value) => {
        expect(Math.abs(value * there * back - value)).toBeLessThanOrEqual(4e-16 * Math.abs(value));
      }),
      settings,
    );
  });

  it('temperatures and angles come back', () => {
    fc.assert(
      fc.property(fc.double({ min: -270, max: 2000, noNaN: true }), (value) => {
        expect(Math.abs(constants.toCelsius(constants.toKelvin(value)) - value)).toBeLessThan(1e-12);
        expect(Math.abs(constants.toDegrees(constants.toRadians(value)) - value)).toBeLessThan(1e-12);
      }),
      settings,
    );
  });

  it('months and hours add up to a year', () => {
    const days = constants.DAYS_IN_MONTH.reduce((sum, day) => sum + day, 0);
    expect(days).toBe(constants.DAYS_PER_YEAR);
    expect(days * constants.HOURS_PER_DAY).toBe(constants.HOURS_PER_YEAR);
    constants.DAYS_IN_MONTH.forEach((day, month) => {
      const hours = constants.MONTH_START_HOUR[month + 1]! - constants.MONTH_START_HOUR[month]!;
      expect(hours).toBe(day * constants.HOURS_PER_DAY);
    });
  });
});
