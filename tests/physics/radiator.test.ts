import { describe, expect, it } from 'vitest';
import { loopReturnC, radiatorFactor, radiatorHeat, ratedOutput } from '@/lib/physics/radiator';

describe('radiator on a loop (EN 442-2)', () => {
  it('gives its rating at 75/65/20', () => {
    const capacityFlow = 1000 / 10;
    expect(radiatorHeat(1000, 1.3, 75, capacityFlow, 20)).toBeCloseTo(1000, 6);
    expect(loopReturnC(75, 1000, capacityFlow)).toBe(65);
  });

  it('solves law and water balance together at wide and narrow spreads', () => {
    for (const exponent of [1, 1.1, 1.3, 1.4]) {
      for (const supplyC of [20.01, 25, 35, 55, 80]) {
        for (const capacityFlow of [2, 20, 200, 5000]) {
          const heat = radiatorHeat(6000, exponent, supplyC, capacityFlow, 20);
          const most = capacityFlow * (supplyC - 20);
          expect(heat).toBeLessThanOrEqual(most);
          if (heat === most) continue;
          const mean = (supplyC + loopReturnC(supplyC, heat, capacityFlow)) / 2;
          expect(Math.abs(heat - 6000 * radiatorFactor(mean - 20, exponent))).toBeLessThan(1e-6 * (1 + heat));
        }
      }
    }
  });

  it('cools its water no further than to the room, however small the flow', () => {
    const heat = radiatorHeat(38_000, 1.3, 45, 20, 20);
    expect(loopReturnC(45, heat, 20)).toBe(20);
  });

  it('rises with supply and flow, and never cools a room', () => {
    expect(radiatorHeat(6000, 1.3, 45, 200, 20)).toBeGreaterThan(radiatorHeat(6000, 1.3, 40, 200, 20));
    expect(radiatorHeat(6000, 1.3, 45, 400, 20)).toBeGreaterThan(radiatorHeat(6000, 1.3, 45, 200, 20));
    expect(radiatorHeat(6000, 1.3, 20, 200, 20)).toBe(0);
    expect(radiatorHeat(6000, 1.3, 15, 200, 20)).toBe(0);
    expect(radiatorHeat(6000, 1.3, 45, 0, 20)).toBe(0);
  });

  it('turns an output stated at 55/45 into the rating', () => {
    expect(ratedOutput(515, 55, 45, 20, 1.3)).toBeCloseTo(1000, -1);
  });
});
