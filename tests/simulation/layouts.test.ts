import { describe, expect, it } from 'vitest';
import { createSimulator } from '@/lib/simulation/simulate';
import { example, yearOf } from './example-runs';

const simulator = createSimulator();
const store = yearOf(example(), simulator).year;

describe('layouts of array, store and floor', () => {
  it('closes its balance in every layout and with a coil', () => {
    for (const change of [
      { loop: { layout: 'vessel with exchanger' } },
      { loop: { layout: 'straight to the slab' } },
      { hotWater: { exchanger: 'coil' } },
      {
        loop: { layout: 'vessel with exchanger' },
        hotWater: { exchanger: 'coil' },
        store: { insideHouse: true },
      },
    ] as const) {
      expect(yearOf(example(change), simulator).balance.residualShare).toBeLessThan(1e-11);
    }
  });

  it('gives less through an exchanger than without, and nearly the same through a nearly perfect one', () => {
    const through = (exchangerEffectiveness: number) =>
      yearOf(
        example({
          loop: {
            layout: 'vessel with exchanger',
            exchangerEffectiveness,
            vesselLossWPerK: 0,
            vesselReserveL: 2,
          },
        }),
        simulator,
      ).year;
    const poor = through(0.4);
    const good = through(0.98);
    expect(poor.collectedKwh).toBeLessThan(good.collectedKwh);
    expect(good.solarHeatingKwh + good.solarTapKwh).toBeLessThan(
      1.04 * (store.solarHeatingKwh + store.solarTapKwh),
    );
    expect(good.solarHeatingKwh + good.solarTapKwh).toBeGreaterThan(
      0.94 * (store.solarHeatingKwh + store.solarTapKwh),
    );
  });

  it('heats the slab by day, leaves the taps to the backup and keeps the rooms below their limit', () => {
    const slab = yearOf(example({ loop: { layout: 'straight to the slab', slabRoomLimitC: 23 } }), simulator);
    expect(slab.year.solarTapKwh).toBe(0);
    expect(slab.year.storeLossKwh).toBe(0);
    expect(slab.year.solarHeatingKwh).toBeGreaterThan(1000);
    expect(slab.year.solarHeatingKwh).toBeCloseTo(slab.year.collectedKwh, 6);
    expect(slab.year.backupHeatingKwh).toBeLessThan(store.backupHeatingKwh + store.solarHeatingKwh);
  });

  it('answers a slab layout without a heated floor in words', () => {
    const input = example({ loop: { layout: 'straight to the slab' } });
    const { floor } = input.house.emitters;
    const outcome = simulator.run({
      ...input,
      house: { ...input.house, emitters: { ...input.house.emitters, floor: { ...floor, areaM2: 0 } } },
    });
    expect(outcome).toMatchObject({ ok: false, code: 'layout' });
  });
});

describe('hot water through a coil', () => {
  it('never leaves warmer than the top of the store and gives less with less surface', () => {
    const small = yearOf(example({ hotWater: { exchanger: 'coil', coilWPerK: 100 } }), simulator).year;
    const large = yearOf(example({ hotWater: { exchanger: 'coil', coilWPerK: 3000 } }), simulator).year;
    expect(small.solarTapKwh).toBeLessThan(large.solarTapKwh);
    expect(large.solarTapKwh).toBeLessThan(large.tapKwh);
  });
});

describe('pump by its curve', () => {
  it('runs where curve and loop meet, more with a siphon, and not at all when it cannot lift the water', () => {
    const pump = { kind: 'curve', shutOffHeadM: 6, greatestFlowLPerS: 0.8, returnPipe: 'vented' } as const;
    const vented = yearOf(example({ loop: { pump } }), simulator).year;
    const siphon = yearOf(example({ loop: { pump: { ...pump, returnPipe: 'siphon' } } }), simulator).year;
    const weak = yearOf(example({ loop: { pump: { ...pump, shutOffHeadM: 2 } } }), simulator).year;
    expect(vented.collectedKwh).toBeGreaterThan(1000);
    expect(siphon.pumpKwh).not.toBe(vented.pumpKwh);
    expect(weak.collectedKwh).toBe(0);
    expect(weak.starts).toBe(0);
  });
});
