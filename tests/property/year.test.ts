import { describe, expect, it, vi } from 'vitest';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import { CARRIERS, type HourColumns, type YearResult } from '@/lib/simulation/results';
import { HOURS_PER_YEAR } from '@/lib/units/constants';
import { anyDesign, forDesigns, inputOf, PATIENCE_MS, RUNS, yearOf, type AnyDesign } from './any-design';

/* What must be true of the year of any design (model.md section 11): own requirements, no source. */

vi.setConfig({ testTimeout: PATIENCE_MS });

const SLAB = 'straight to the slab';
/** 32-bit columns at 100 °C hold 8 µK; reading them twice doubles it. */
const FLOAT_K = 2e-5;

type Column = Float32Array | Float64Array;
const least = (values: Column) => (values as Float64Array).reduce((a, b) => Math.min(a, b), Infinity);
const most = (values: Column) => (values as Float64Array).reduce((a, b) => Math.max(a, b), -Infinity);
const builder = new PlanBuilder();

/**
 * Coldest and hottest water that can enter a store: mains, its room, the rooms of the house, the vessel, the pipe in
 * outdoor air, and the array. The array is one body at its mean temperature, which stays between the roots of its own
 * balance; its outlet lies as far above that mean as its inlet lies below.
 */
function enteringRange(drawn: AnyDesign, { columns }: YearResult): { low: number; high: number } {
  const plan = builder.plan(inputOf(drawn));
  const { outdoorC, absorbedWm2, a1, mainsC, roomSetC } = plan.columns;
  let low = Math.min(plan.storeRoomC, plan.array.vesselRoomC, least(mainsC), least(outdoorC), least(columns.roomC), least(columns.floorSurfaceC), least(roomSetC)); // prettier-ignore
  let high = Math.max(plan.storeRoomC, plan.array.vesselRoomC, most(mainsC), most(outdoorC), plan.roomSetC);
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    // a2 only brings the root nearer to the air
    const root = outdoorC[h]! + absorbedWm2[h]! / a1[h]!;
    if (root < low) low = root;
    if (root > high) high = root;
  }
  return { low, high: high + (high - low) };
}

function expectLayersInRange(columns: HourColumns, layers: number, low: number, high: number): void {
  const { storeLayersC, storeTopC, storeBottomC } = columns;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    let above = high + FLOAT_K;
    for (let i = 0; i < layers; i++) {
      const layerC = storeLayersC[h * layers + i]!;
      if (layerC > above) expect(layerC, `layer ${i} of hour ${h} and what may lie above it`).toBe(above);
      above = layerC;
    }
    if (above < low - FLOAT_K) expect(above, `bottom of hour ${h} and the coldest that entered`).toBe(low);
    if (storeTopC[h]! < storeBottomC[h]!) expect(storeTopC[h]).toBe(storeBottomC[h]);
  }
}

describe('the year of any design', () => {
  it('closes its balance, keeps fractions and layers within bounds, gives no heat uphill and none from an empty collector', () => {
    let worked = 0;
    forDesigns(RUNS, anyDesign, (drawn) => {
      const result = yearOf(drawn);
      if (!result) return;
      worked++;
      const { year, months, balance, columns, layers } = result;
      // 1e-11 for ordinary designs (tests/simulation); a very heavy house that uses little rounds ten times as much
      expect(balance.residualShare).toBeLessThanOrEqual(1e-10);

      // two ways to cool before any sun comes: the slab warms the water of a cold vessel, and a coil has no bypass
      const slab = drawn.design.loop.layout === SLAB;
      const coil = drawn.house.hotWater.exchanger === 'coil';
      expect(year.fractions.solar).toBeGreaterThanOrEqual(slab || coil ? -0.05 : 0);
      expect(year.fractions.solar).toBeLessThanOrEqual(1);
      expect(year.fractions.savedExtended).toBeLessThanOrEqual(year.fractions.savedThermal);
      expect(year.fractions.savedThermal).toBeLessThanOrEqual(1);
      expect(year.carrierHours).toHaveLength(CARRIERS.length);
      expect(year.carrierHours.reduce((sum, hours) => sum + hours, 0)).toBe(HOURS_PER_YEAR);

      const { low, high } = enteringRange(drawn, result);
      expectLayersInRange(columns, layers, low, high);

      // a draw may end a hair below the return, and somewhat below the mains, within its last sub-step
      if (!slab) expect(least(columns.solarHeatingW)).toBeGreaterThan(-1);
      if (!coil) expect(least(columns.solarTapW)).toBeGreaterThan(-20);
      expect(least(columns.backupHeatingW)).toBeGreaterThanOrEqual(0);
      expect(least(columns.backupTapW)).toBeGreaterThanOrEqual(0);
      expect(least(columns.unmetW)).toBeGreaterThanOrEqual(0);
      for (const month of months) expect(month.pumpHours).toBeLessThanOrEqual(744);

      const silent = columns.pumpShare.findIndex((share, h) => share === 0 && columns.arrayW[h] !== 0);
      expect(silent, 'an hour in which the empty collector gave heat').toBe(-1);
    });
    expect(worked, 'designs that were worked').toBeGreaterThan(RUNS / 2);
  });

  it('without a minimum run the array brings in each month at least what its pipes lose', () => {
    forDesigns(RUNS / 4, anyDesign, (drawn) => {
      const { design } = drawn;
      const loop = { ...design.loop, layout: 'through the store' as const };
      // a cold wall of the pipe takes heat from the air before it takes any from the store
      const array = { ...design.array, pipeCapacityJPerMK: 0 };
      const controller = { ...design.controller, minimumRunS: 0 };
      const result = yearOf({ ...drawn, design: { ...design, array, second: null, loop, controller } });
      for (const month of result?.months ?? []) {
        expect(month.collectedKwh + month.pipeLossKwh).toBeGreaterThanOrEqual(-1e-9);
      }
    });
  });
});
