import { describe, expect, it } from 'vitest';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { quadraticLoss, steadyPower } from '@/lib/physics/collector';
import { collectorCurveSchema, incidenceModifierSchema } from '@/lib/schemas/collector';
import { arraySchema } from '@/lib/schemas/design';
import { houseSchema } from '@/lib/schemas/house';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import type { CollectorCurve, House } from '@/lib/simulation/design';
import { example, type Change } from './example-runs';

const builder = new PlanBuilder();
const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);
const open: Partial<House> = { horizon: [] };
const hill = (altitudeDeg: number): Partial<House> => ({
  horizon: [
    { azimuthDeg: 90, altitudeDeg: 0 },
    { azimuthDeg: 160, altitudeDeg },
    { azimuthDeg: 230, altitudeDeg: 0 },
  ],
});
const planOf = (change: Change) => builder.plan(example(change)).columns;

function withCurve(change: Partial<CollectorCurve>) {
  const input = example({ house: open, cover: 'glass' });
  const collector = { ...input.design.collector, curve: { ...input.design.collector.curve, ...change } };
  return { ...input, design: { ...input.design, collector } };
}
const absorbed = (change: Partial<CollectorCurve>) => builder.plan(withCurve(change)).columns.absorbedWm2;

describe('the horizon in a design', () => {
  it('takes sun from array and windows, more the higher it stands', () => {
    const heights = [open, hill(5), hill(12), hill(30)].map((house) => planOf({ house }));
    for (let i = 1; i < heights.length; i++) {
      expect(sum(heights[i]!.planeWm2)).toBeLessThan(sum(heights[i - 1]!.planeWm2));
      expect(sum(heights[i]!.absorbedWm2)).toBeLessThan(sum(heights[i - 1]!.absorbedWm2));
      expect(sum(heights[i]!.windowSunW)).toBeLessThan(sum(heights[i - 1]!.windowSunW));
    }
  });

  it('is remembered with the plane: a hill does not linger in an open plan', () => {
    const before = sum(planOf({ house: open }).planeWm2);
    planOf({ house: hill(20) });
    expect(sum(planOf({ house: open }).planeWm2)).toBe(before);
    expect(builder.dry(example({ house: hill(40) })).plateC).not.toEqual(
      builder.dry(example({ house: open })).plateC,
    );
  });

  it('stands in the demonstration: the hill to the south-east costs mornings, and afternoons only their share of sky', () => {
    const [seen, free] = [{}, open].map((house) => planOf({ house }).absorbedWm2) as [
      Float64Array,
      Float64Array,
    ];
    const half = (values: Float64Array, morning: boolean) => values.filter((_, h) => h % 24 < 12 === morning);
    expect(demonstration.house.horizon).toHaveLength(4);
    expect(sum(half(seen, true))).toBeLessThan(0.985 * sum(half(free, true)));
    expect(sum(half(seen, false))).toBeGreaterThan(0.98 * sum(half(free, false)));
    expect(sum(half(seen, false))).toBeLessThan(sum(half(free, false)));
  });
});

describe('rows in a design', () => {
  const rows = { rows: 4, rowSpacingM: 3, rowHeightM: 2 };

  it('shade the array and nothing else', () => {
    const one = planOf({});
    const four = planOf({ array: rows });
    expect(sum(four.planeWm2)).toBeLessThan(sum(one.planeWm2));
    expect(sum(four.windowSunW)).toBe(sum(one.windowSunW));
    expect(planOf({ array: { ...rows, rows: 1 } }).planeWm2).toBe(one.planeWm2);
  });

  it('leave the first row as hot as ever when it stands dry', () => {
    expect(builder.dry(example({ array: rows })).plateC).toEqual(builder.dry(example({})).plateC);
  });
});

describe('the modifier in a design', () => {
  const b0 = 0.11;
  /** the b0 form at 0, 10 … 80°, and 0 at 90° */
  const values = Array.from({ length: 10 }, (_, i) =>
    i === 9 ? 0 : Math.max(0, 1 - b0 * (1 / Math.cos((i * Math.PI) / 18) - 1)),
  );
  const ones = Array<number>(10).fill(1);

  it('by a table of the b0 form is near the b0 form', () => {
    const form = sum(absorbed({ b0 }));
    expect(sum(absorbed({ modifier: { kind: 'table', values } })) / form).toBeCloseTo(1, 2);
  });

  it('by a table of ones takes all beam, and a pair of ones does too', () => {
    const all = absorbed({ b0: 0 });
    const table = absorbed({ modifier: { kind: 'table', values: ones } });
    const pair = absorbed({
      modifier: { kind: 'pair', longitudinal: ones, transversal: ones, ribs: 'along the slope' },
    });
    expect(table).toEqual(pair);
    for (let h = 0; h < 8760; h++) expect(table[h]).toBeCloseTo(all[h]!, 9);
  });

  it('by a pair depends on how the ribs run', () => {
    const of = (ribs: 'along the slope' | 'across the slope') =>
      sum(absorbed({ modifier: { kind: 'pair', longitudinal: ones, transversal: values, ribs } }));
    const table = sum(absorbed({ modifier: { kind: 'table', values } }));
    expect(of('along the slope')).not.toBeCloseTo(of('across the slope'), 0);
    expect(of('along the slope')).toBeGreaterThan(table);
    expect(of('across the slope')).toBeGreaterThan(table);
  });
});

describe('the terms a7 and a8', () => {
  const at = { beamWm2: 0, beamModifier: 1, diffuseWm2: 0, airC: 0, windMPerS: 3, longwaveWm2: 0 };
  const bare = { eta0Beam: 0.8, diffuseModifier: 1, a1: 0, a2: 0, a3: 0, a4: 0, a6: 0 };

  it('a8 folded into a2 loses the same at 40 K and errs by a8 Δ²(Δr² − Δ²) elsewhere', () => {
    for (const deltaK of [10, 28.3, 40, 80]) {
      const whole = steadyPower({ ...bare, a8: 1e-8 }, deltaK, at);
      const folded = steadyPower({ ...bare, a2: quadraticLoss(0, 1e-8) }, deltaK, at);
      expect(whole - folded).toBeCloseTo(1e-8 * deltaK ** 2 * (1600 - deltaK ** 2), 12);
      expect(Math.abs(whole - folded)).toBeLessThan(deltaK > 40 ? 0.31 : 0.0065);
    }
    expect(builder.plan(withCurve({ a8: 1e-7 })).array.a2).toBeCloseTo(
      collectorByCover.glass.curve.a2 + 1.6e-4,
      12,
    );
  });

  it('a7 takes from the sky’s term what the wind adds: like a4 smaller by a7 (u − 3)', () => {
    const input = withCurve({ a4: 0.5, a7: 0.05 });
    const windy = builder.plan(input).columns.absorbedWm2;
    const calm = absorbed({ a4: 0.5 });
    const none = absorbed({});
    const { weather, design } = input;
    for (let h = 1; h < 8760; h += 7) {
      const wind = 0.5 * (weather.windMPerS[h - 1]! + weather.windMPerS[h]!);
      const used = weather.pointValues === 'stamp' ? wind : weather.windMPerS[h]!;
      const share = (0.05 * (used * design.array.windFactor - 3)) / 0.5;
      expect(calm[h]! - windy[h]!).toBeCloseTo(share * (calm[h]! - none[h]!), 9);
    }
  });
});

describe('records from before these fields', () => {
  it('are read with the defaults that change nothing', () => {
    const { horizon, ...house } = demonstration.house;
    expect(horizon).toHaveLength(4);
    expect(houseSchema.parse(house).horizon).toEqual([]);
    const { rows, rowSpacingM, rowHeightM, ...array } = demonstration.designs[0].array;
    expect([rows, rowSpacingM, rowHeightM]).toEqual([1, 6, 2]);
    expect(arraySchema.parse(array).rows).toBe(1);
    const { modifier, a7, a8, ...curve } = demonstration.designs[0].collector.curve;
    expect([modifier, a7, a8]).toEqual([{ kind: 'b0' }, 0, 0]);
    expect(collectorCurveSchema.parse(curve)).toEqual(demonstration.designs[0].collector.curve);
  });

  it('a table has ten values, within their limits', () => {
    const parse = (values: number[]) => incidenceModifierSchema.safeParse({ kind: 'table', values }).success;
    expect(parse(Array<number>(10).fill(0.9))).toBe(true);
    expect(parse(Array<number>(9).fill(0.9))).toBe(false);
    expect(parse([...Array<number>(9).fill(0.9), 1.6])).toBe(false);
    expect(incidenceModifierSchema.parse({ kind: 'table' })).toMatchObject({ values: { length: 10 } });
  });
});
