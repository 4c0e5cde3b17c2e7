import { describe, expect, it } from 'vitest';
import { annuityFactor } from '@/lib/economics/annuity';
import { discountedPaybackYears, simplePaybackYears } from '@/lib/economics/cash-flow';
import { costOfHeat, replacementValue, type HeatCostInput } from '@/lib/economics/cost-of-heat';

const film: HeatCostInput = {
  investment: [
    { label: 'collector', amount: 816 },
    { label: 'store', amount: 1400 },
    { label: 'pump and control', amount: 450 },
    { label: 'own hours', amount: 0 },
  ],
  grant: 200,
  upkeepPerYear: 60,
  pumpKwhPerYear: 70,
  electricityPerKwh: 0.28,
  replacements: [
    { label: 'new film', amount: 96, everyYears: 3 },
    { label: 'new mat', amount: 216, everyYears: 8 },
  ],
  realRate: 0.03,
  years: 20,
  solarKwhPerYear: 3670,
  savedKwhPerYear: 3670 / 0.84,
};

describe('cost of solar heat', () => {
  it('has a receipt that adds up to the cost', () => {
    const cost = costOfHeat(film);
    const sum = cost.receipt.reduce((total, line) => total + line.perKwh, 0);
    expect(sum).toBeCloseTo(cost.perKwh, 12);
    expect(cost.receipt.reduce((total, line) => total + line.presentValue, 0)).toBeCloseTo(
      cost.presentCost,
      9,
    );
    expect(cost.perKwh).toBeCloseTo(cost.presentCost / cost.presentHeatKwh, 12);
  });

  it('shows own hours as a line also when they cost nothing', () => {
    expect(costOfHeat(film).receipt.find((line) => line.label === 'own hours')?.presentValue).toBe(0);
  });

  it('is cheaper per saved bought kilowatt hour than per useful one', () => {
    const cost = costOfHeat(film);
    expect(cost.perSavedKwh).toBeCloseTo(cost.perKwh * 0.84, 12);
  });

  it('is the annuity of the plant when nothing else is paid', () => {
    const bare = { ...film, grant: 0, upkeepPerYear: 0, pumpKwhPerYear: 0, replacements: [] };
    expect(costOfHeat(bare).perKwh).toBeCloseTo((2666 * annuityFactor(0.03, 20)) / 3670, 12);
  });

  it('gives NaN, not a price, without heat', () => {
    expect(costOfHeat({ ...film, solarKwhPerYear: 0 }).perKwh).toBeNaN();
  });
});

describe('replacements', () => {
  it('are bought at each end of life before the horizon', () => {
    const { presentValue, lifeLeft } = replacementValue({ label: 'film', amount: 100, everyYears: 3 }, 0, 20);
    expect(presentValue).toBe(600);
    expect(lifeLeft).toBeCloseTo(1 / 3, 12);
  });

  it('are not bought at the very end, and leave nothing', () => {
    const { presentValue, lifeLeft } = replacementValue({ label: 'mat', amount: 100, everyYears: 10 }, 0, 20);
    expect(presentValue).toBe(100);
    expect(lifeLeft).toBeCloseTo(0, 12);
  });

  it('leave value when the part outlives the horizon', () => {
    const { presentValue, lifeLeft } = replacementValue(
      { label: 'glass', amount: 100, everyYears: 40 },
      0.03,
      20,
    );
    expect(presentValue).toBe(0);
    expect(lifeLeft).toBe(0.5);
  });
});

describe('payback', () => {
  it('is longer with interest', () => {
    expect(simplePaybackYears(6000, 500)).toBe(12);
    expect(discountedPaybackYears(6000, 500, 0, 0)).toBe(12);
    expect(discountedPaybackYears(6000, 500, 0, 0.04)).toBe(17);
    expect(simplePaybackYears(6000, 0)).toBe(Infinity);
    expect(discountedPaybackYears(6000, 100, 0, 0.04)).toBe(Infinity);
  });
});
