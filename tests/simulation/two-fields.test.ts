import { describe, expect, it } from 'vitest';
import { collectorByCover } from '@/data/collectors/generic';
import { createSimulator } from '@/lib/simulation/simulate';
import { example, yearOf } from './example-runs';

const simulator = createSimulator();
const one = example();
const { collector, array } = one.design;
const solar = ({ year }: ReturnType<typeof yearOf>) => year.solarHeatingKwh + year.solarTapKwh;

describe('two collector fields on one store', () => {
  it('closes its balance with fields of different kind, orientation and months', () => {
    const result = yearOf(
      example({
        second: {
          collector: collectorByCover['selective glass'],
          array: {
            ...array,
            areaM2: 6,
            tiltDeg: 45,
            azimuthDeg: 240,
            mountedMonths: Array<boolean>(12).fill(true),
          },
        },
      }),
      simulator,
    );
    expect(result.balance.residualShare).toBeLessThan(1e-11);
    expect(result.dryParts.some(({ name }) => name.endsWith('second field'))).toBe(true);
    expect(solar(result)).toBeGreaterThan(solar(yearOf(one, simulator)));
  });

  it('gives nearly the heat of one field when a field is cut in two equal halves', () => {
    const whole = yearOf(example({ array: { pipeLengthM: 0 } }), simulator);
    const half = {
      ...array,
      areaM2: array.areaM2 / 2,
      pipeLengthM: 0,
      mountedMonths: Array<boolean>(12).fill(true),
    };
    const halves = yearOf(example({ array: half, second: { collector, array: half } }), simulator);
    expect(Math.abs(solar(halves) / solar(whole) - 1)).toBeLessThan(5e-3);
    expect(halves.year.planeKwh).toBeCloseTo(whole.year.planeKwh, 6);
    // each half has pipes of its own, in which half the flow meets less friction
    expect(halves.year.pumpKwh).toBeLessThan(whole.year.pumpKwh);
  });

  it('is the same as one field when the second has no area or no months', () => {
    const empty = yearOf(example({ second: { collector, array: { ...array, areaM2: 0 } } }), simulator);
    expect(solar(empty)).toBe(solar(yearOf(one, simulator)));
  });
});
