import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { StoreLayers } from '@/lib/simulation/store-layers';

/* The store of the year loop alone, under any flows: own requirements (model.md section 11), no source. */

const SEED = Number(process.env.PROPERTY_SEED ?? 20_261_201);
const temperature = fc.double({ min: 2, max: 95, noNaN: true });
const flow = fc.oneof(fc.constant(0), fc.double({ min: 0.005, max: 2, noNaN: true }));

const step = fc.record({
  charges: fc.array(fc.record({ kgPerS: flow, waterC: temperature }), { minLength: 2, maxLength: 2 }),
  heatingKgPerS: flow,
  returnC: temperature,
  tapKgPerS: flow,
  mainsC: fc.double({ min: 2, max: 25, noNaN: true }),
  effectiveness: fc.double({ min: 0, max: 0.98, noNaN: true }),
});

const anyStore = fc.record({
  layersC: fc.array(temperature, { minLength: 1, maxLength: 12 }),
  massKg: fc.double({ min: 200, max: 10_000, noNaN: true }),
  lossWPerK: fc.double({ min: 0, max: 2, noNaN: true }),
  conductionWPerK: fc.double({ min: 0, max: 10, noNaN: true }),
  roomC: fc.double({ min: 2, max: 30, noNaN: true }),
  outdoorKg: fc.double({ min: 0, max: 400, noNaN: true }),
  steps: fc.array(step, { minLength: 1, maxLength: 40 }),
});

describe('the layered store under any flows', () => {
  it('keeps its layers in order and between the coldest and the hottest that entered, and books every joule', () => {
    const property = fc.property(anyStore, (drawn) => {
      const { layersC, massKg, lossWPerK, conductionWPerK, roomC, steps } = drawn;
      const count = layersC.length;
      const store = new StoreLayers(
        count,
        massKg,
        new Float64Array(count).fill(lossWPerK),
        conductionWPerK,
        roomC,
        2,
      );
      store.takeFromBottom(-drawn.outdoorKg);
      store.t.set([...layersC].sort((a, b) => b - a));
      let low = Math.min(roomC, ...layersC);
      let high = Math.max(roomC, ...layersC);
      for (const entering of steps) {
        const { flows } = store;
        const { charges, ...draws } = entering;
        Object.assign(flows, draws);
        charges.forEach(({ kgPerS, waterC }, field) => {
          const level = store.levelFor(waterC);
          Object.assign(flows.charges[field]!, { kgPerS, waterC, firstC: waterC, level });
        });
        if (store.topC <= entering.returnC) flows.heatingKgPerS = 0;
        if (store.topC <= entering.mainsC) flows.tapKgPerS = 0;
        flows.returnLevel = store.levelFor(flows.returnC);
        store.dtS = Math.min(900, store.stepLimitS(0.5));
        const before = store.heatJ();
        store.predict();
        store.correct();
        const charged = charges.reduce(
          (sum, { kgPerS, waterC }) => sum + kgPerS * CP * (waterC - store.bottomMeanC) * store.dtS,
          0,
        );
        const drawnJ = flows.heatingKgPerS * CP * (store.topMeanC - flows.returnC) * store.dtS;
        const tapped = store.tapW * store.dtS;
        const residual = store.heatJ() - before - charged + drawnJ + tapped + store.lossJ;
        expect(Math.abs(residual)).toBeLessThan(1e-11 * massKg * CP * 100);
        // a single layer takes cold charging water into the layer that the draw leaves
        if (count > 1) expect(drawnJ).toBeGreaterThanOrEqual(-1e-9 * massKg * CP);

        const entered = charges.filter(({ kgPerS }) => kgPerS > 0).map(({ waterC }) => waterC);
        if (flows.heatingKgPerS > 0) entered.push(flows.returnC);
        low = Math.min(low, ...entered);
        high = Math.max(high, ...entered);
        if (flows.tapKgPerS > 0) low = Math.min(low, flows.mainsC);
        for (let i = 0; i < count; i++) {
          expect(store.t[i]!).toBeGreaterThanOrEqual(low - 1e-9);
          expect(store.t[i]!).toBeLessThanOrEqual(high + 1e-9);
          if (i > 0) expect(store.t[i]!).toBeLessThanOrEqual(store.t[i - 1]!);
        }
      }
    });
    fc.assert(property, { numRuns: 500, seed: SEED });
  });
});
