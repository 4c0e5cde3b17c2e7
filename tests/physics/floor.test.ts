import { describe, expect, it } from 'vitest';
import {
  FLOOR_FILM_W_PER_M2K,
  FLOOR_LIMITS,
  floorConductance,
  floorSurfaceCoefficient,
  floorSurfaceExcess,
  floorSurfaceHeat,
  logarithmicExcess,
  supplyToSlabConductance,
  waterToSlabConductance,
} from '@/lib/physics/floor';

const AREA = 110;
const ROOM_C = 20;
const SUPPLY_C = 35;
const cases = [75, 150, 300].flatMap((spacing) => [0, 0.1].map((covering) => ({ spacing, covering })));

describe('heated floor in steady state, film fixed at 10.8 W/(m²K)', () => {
  it.each(cases)(
    'spacing $spacing mm, covering $covering: q = K_H ΔθH at any spread (EN 1264-2)',
    (floor) => {
      const kH = floorConductance(floor.spacing, 45, 1.2, floor.covering);
      for (const capacityFlow of [150, 600, 2500]) {
        const film = FLOOR_FILM_W_PER_M2K * AREA;
        const toSlab = supplyToSlabConductance(AREA, kH, capacityFlow);
        const heat = (SUPPLY_C - ROOM_C) / (1 / toSlab + 1 / film);
        const returnC = SUPPLY_C - heat / capacityFlow;
        const expected = kH * AREA * logarithmicExcess(SUPPLY_C, returnC, ROOM_C);
        expect(Math.abs(heat / expected - 1)).toBeLessThan(1e-6);
      }
    },
  );

  it('with 30 % going down the return is colder, and q = K_H ΔθH still holds for the heat that goes up (EN 1264-3)', () => {
    const kH = floorConductance(150, 45, 1.2, 0.05);
    const up = 1 - 0.3;
    for (const capacityFlow of [150, 600, 2500]) {
      const toSlab = supplyToSlabConductance(AREA, kH, up * capacityFlow);
      const heat = (SUPPLY_C - ROOM_C) / (1 / toSlab + 1 / (FLOOR_FILM_W_PER_M2K * AREA));
      const returnC = SUPPLY_C - heat / up / capacityFlow;
      expect(returnC).toBeGreaterThan(ROOM_C);
      const expected = kH * AREA * logarithmicExcess(SUPPLY_C, returnC, ROOM_C);
      expect(Math.abs(heat / expected - 1)).toBeLessThan(1e-6);
    }
  });

  it.each(cases)(
    'spacing $spacing mm, covering $covering: water, slab and film in series are K_H',
    (floor) => {
      const kH = floorConductance(floor.spacing, 45, 1.2, floor.covering);
      const series = 1 / (1 / waterToSlabConductance(kH) + 1 / FLOOR_FILM_W_PER_M2K);
      expect(Math.abs(series / kH - 1)).toBeLessThan(1e-12);
    },
  );

  it('with the film by its law stays within −7…+2 % between 20 and 100 W/m²', () => {
    const kH = floorConductance(150, 45, 1.2, 0);
    const water = waterToSlabConductance(kH);
    for (const heat of [20, 40, 60, 80, 100]) {
      const excess = floorSurfaceExcess(heat);
      const byLaw = 1 / (1 / water + 1 / floorSurfaceCoefficient(excess));
      expect(byLaw / kH - 1).toBeGreaterThan(-0.07);
      expect(byLaw / kH - 1).toBeLessThan(0.02);
    }
  });
});

describe('floor surface', () => {
  it('gives 100 W/m² at the limit of the occupied zone and 175 in the edge strip (EN 1264-2)', () => {
    expect(floorSurfaceHeat(FLOOR_LIMITS.occupiedC - ROOM_C)).toBeCloseTo(FLOOR_LIMITS.occupiedWm2, 0);
    expect(floorSurfaceHeat(FLOOR_LIMITS.edgeC - ROOM_C)).toBeCloseTo(FLOOR_LIMITS.edgeWm2, 0);
  });

  it('inverts its own law and never cools a room', () => {
    expect(floorSurfaceExcess(floorSurfaceHeat(6.5))).toBeCloseTo(6.5, 12);
    expect(floorSurfaceHeat(-3)).toBe(0);
  });

  it('loses output with spacing and covering', () => {
    expect(floorConductance(300, 45, 1.2, 0)).toBeLessThan(floorConductance(150, 45, 1.2, 0));
    expect(floorConductance(150, 45, 1.2, 0.15)).toBeLessThan(floorConductance(150, 45, 1.2, 0.05));
    expect(floorConductance(150, 65, 1.2, 0)).toBeLessThan(floorConductance(150, 45, 1.2, 0));
  });
});
