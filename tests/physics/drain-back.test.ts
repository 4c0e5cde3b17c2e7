import { describe, expect, it } from 'vitest';
import { airSpaceL } from '@/lib/physics/drain-back';
import { frictionFactor } from '@/lib/physics/pipe-flow';
import { pipeContentLPerM, pipeOutletC } from '@/lib/physics/pipe';
import { runningHeadM } from '@/lib/physics/pump';
import { boilingTemperatureC, waterSaturationPressure } from '@/lib/physics/water';

describe('drain-back loop', () => {
  it('needs air for the water of array and pipes, its expansion and a margin', () => {
    expect(airSpaceL(168, 10, 0, 10, 80, 0)).toBe(178);
    const withExpansion = airSpaceL(168, 10, 2000, 10, 80, 0);
    expect(withExpansion - 178).toBeCloseTo(2000 * (999.702 / 971.803 - 1), 0);
    expect(airSpaceL(168, 10, 2000, 10, 80)).toBeCloseTo(withExpansion * 1.15, 9);
  });

  it('pays the lift with a vented top and only friction with a siphon', () => {
    expect(runningHeadM(3, 0.5, false)).toBe(3.5);
    expect(runningHeadM(3, 0.5, true)).toBe(0.5);
  });

  it('holds 0.314 L/m in a bore of 20 mm', () => {
    expect(pipeContentLPerM(20)).toBeCloseTo(0.314159, 6);
  });

  it('cools water along a pipe towards the room and no further', () => {
    expect(pipeOutletC(60, 10, 0, 100)).toBe(60);
    expect(pipeOutletC(60, 10, 1e9, 100)).toBe(10);
    expect(pipeOutletC(60, 10, 5, 100)).toBeCloseTo(10 + 50 * Math.exp(-0.05), 12);
  });

  it('has a friction factor without a jump between laminar and turbulent', () => {
    for (const reynolds of [2300, 4000]) {
      expect(frictionFactor(reynolds - 1e-6, 0)).toBeCloseTo(frictionFactor(reynolds + 1e-6, 0), 8);
    }
  });
});

describe('boiling', () => {
  it('is the saturation pressure turned round', () => {
    for (const temperatureC of [10, 40, 70, 95]) {
      expect(boilingTemperatureC(waterSaturationPressure(temperatureC))).toBeCloseTo(temperatureC, 8);
    }
  });
});
