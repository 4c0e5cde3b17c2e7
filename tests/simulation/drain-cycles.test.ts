import { describe, expect, it } from 'vitest';
import { ArrayLoop } from '@/lib/simulation/array-loop';
import { StoreLayers } from '@/lib/simulation/store-layers';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';

/** A soft array whose water is more than a store layer, and one whose water is a small part of it. */
const cases = [
  { name: 'soft absorber, water of more than one layer', waterKg: 180, storeKg: 1000 },
  { name: 'metal absorber', waterKg: 15, storeKg: 1000 },
];

/** Own requirement: filling and draining move water and heat, they neither make nor lose any. */
describe('100 forced fills and drains without sun or loss', () => {
  for (const { name, waterKg, storeKg } of cases) {
    it(`keeps the sum of heat in store, array and pipes to 1e-12: ${name}`, () => {
      const store = new StoreLayers(8, storeKg, new Float64Array(8), 0, 20);
      store.takeFromBottom(-waterKg);
      store.t.set([62, 58, 55, 50, 44, 40, 33, 27]);
      const loop = new ArrayLoop({
        areaM2: 24,
        a2: 0,
        dryCapacityJPerK: 144_000,
        waterKg,
        pipeCapacityJPerK: 8800,
        pipeLossWPerK: 0,
        flowKgPerS: 0.26,
        handover: 1,
        ownVessel: false,
        vesselLossWPerK: 0,
        vesselRoomC: 20,
        startK: 7,
        stopK: 2,
        inhibitC: 95,
        minimumRunS: 60,
      });
      loop.arrayC = 71;
      loop.pipeC = -4;
      const total = () => store.heatJ() + loop.heatJ();
      const mass = () => store.bottomKg + 7 * store.layerKg + (loop.full ? waterKg : 0);
      const heatBefore = total();
      const massBefore = mass();
      for (let cycle = 0; cycle < 100; cycle++) {
        loop.fill(store);
        loop.drain(store);
      }
      expect(Math.abs(total() / heatBefore - 1)).toBeLessThan(1e-12);
      expect(Math.abs(mass() / massBefore - 1)).toBeLessThan(1e-12);
      for (let i = 1; i < 8; i++) expect(store.t[i]!).toBeLessThanOrEqual(store.t[i - 1]! + 1e-12);
      expect(heatBefore).toBeGreaterThan(40 * storeKg * CP);
    });
  }

  it('cools the bottom layer by the heat that a cold pipe wall takes', () => {
    const store = new StoreLayers(1, 100, new Float64Array(1), 0, 20);
    store.t[0] = 40;
    const loop = new ArrayLoop({
      areaM2: 1, a2: 0, dryCapacityJPerK: 1, waterKg: 0, pipeCapacityJPerK: 10_000, pipeLossWPerK: 1,
      flowKgPerS: 0.01, handover: 1,
    ownVessel: false,
    vesselLossWPerK: 0,
    vesselRoomC: 20,
    startK: 7, stopK: 2, inhibitC: 95, minimumRunS: 60,
    }); // prettier-ignore
    loop.pipeC = 0;
    loop.arrayC = 50;
    loop.fill(store);
    expect(store.t[0]).toBeCloseTo(40 - (10_000 * 40) / (100 * CP), 10);
    expect(loop.pipeC).toBe(40);
  });
});
