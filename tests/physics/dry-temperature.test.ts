import { describe, expect, it } from 'vitest';
import {
  backFaceC,
  backLossWithFaceLayer,
  dryYear,
  dryYearFromDeclared,
  stagnationFactor,
  type DryBuild,
} from '@/lib/physics/dry-temperature';
import { topLoss } from '@/lib/physics/top-loss';
import { windConvection } from '@/lib/physics/longwave-exchange';
import { STEFAN_BOLTZMANN, toKelvin } from '@/lib/units/constants';

const glass: DryBuild = {
  absorberEmittance: 0.95,
  coverEmittance: 0.88,
  coverLongwaveTransmittance: 0,
  coverResistanceM2KPerW: 0,
  gapM: 0.025,
  backLossWPerM2K: 0.8,
  tiltDeg: 45,
};
const film: DryBuild = { ...glass, coverEmittance: 0.15, coverLongwaveTransmittance: 0.8 };
/** 10 mm sheet, U 3.18 W/m²K: 1/U − 0.17 */
const twinWall: DryBuild = { ...glass, coverResistanceM2KPerW: 0.144 };
const selective: DryBuild = { ...glass, absorberEmittance: 0.05 };

interface Instant {
  absorbedWm2: number;
  airC: number;
  windMPerS: number;
  skyC: number;
}
const summer: Instant = { absorbedWm2: 780, airC: 22, windMPerS: 1.5, skyC: 6 };

function dry(build: DryBuild, at: Instant): { plateC: number; coverC: number } {
  const one = (value: number) => Float64Array.of(value);
  const out = { plateC: one(0), coverC: one(0) };
  dryYear(
    build,
    {
      planeWm2: one(950),
      absorbedWm2: one(at.absorbedWm2),
      dryBulbC: one(at.airC),
      windMPerS: one(at.windMPerS),
      windFactor: 1,
      skyLongwaveWm2: one(STEFAN_BOLTZMANN * toKelvin(at.skyC) ** 4),
    },
    out,
  );
  return { plateC: out.plateC[0]!, coverC: out.coverC[0]! };
}
const plate = (build: DryBuild, change: Partial<Instant> = {}) => dry(build, { ...summer, ...change }).plateC;

describe('dry temperature from the balance', () => {
  it('meets the iterated top loss: the sun equals top and back loss at its own plate temperature', () => {
    const at: Instant = { absorbedWm2: 700, airC: 10, windMPerS: 2.4, skyC: 10 };
    for (const build of [glass, film, selective]) {
      const { plateC, coverC } = dry(build, at);
      const top = topLoss({
        plateC,
        airC: 10,
        skyC: 10,
        gapM: build.gapM,
        tiltDeg: build.tiltDeg,
        plateEmittance: build.absorberEmittance,
        coverEmittance: build.coverEmittance,
        coverLongwaveTransmittance: build.coverLongwaveTransmittance,
        windWPerM2K: windConvection(2.4),
      });
      expect((top.lossWPerM2K + build.backLossWPerM2K) * (plateC - 10)).toBeCloseTo(700, 1);
      expect(coverC).toBeCloseTo(top.coverC, 2);
    }
  });

  it('orders the covers and lies where the trade expects them (summer, 45°: film 105, glass 118, twin-wall 172, selective 200 °C)', () => {
    // common practice: the trade's table of fitted curves, calm clear sky; a balance may differ by 20 K
    const values = {
      film: plate(film),
      glass: plate(glass),
      twinWall: plate(twinWall, { absorbedWm2: 640 }),
      selective: plate(selective),
    };
    expect(values.film).toBeLessThan(values.glass);
    expect(values.glass).toBeLessThan(values.twinWall);
    expect(values.twinWall).toBeLessThan(values.selective);
    expect(Math.abs(values.film - 105)).toBeLessThan(20);
    expect(Math.abs(values.glass - 118)).toBeLessThan(20);
    expect(Math.abs(values.twinWall - 172)).toBeLessThan(20);
    expect(Math.abs(values.selective - 200)).toBeLessThan(20);
  });

  it('cools a film that lets long-wave radiation through to about 91 to 98 °C (derived balance of the project)', () => {
    for (const coverLongwaveTransmittance of [0.6, 0.8]) {
      const build = {
        ...film,
        coverLongwaveTransmittance,
        coverEmittance: 0.95 - coverLongwaveTransmittance,
      };
      expect(plate(build)).toBeGreaterThan(88);
      expect(plate(build)).toBeLessThan(102);
    }
  });

  it('rises with sun and air, falls with wind, sky cold, back loss and long-wave transmittance', () => {
    for (const build of [film, glass, twinWall, selective]) {
      expect(plate(build, { absorbedWm2: 800 })).toBeGreaterThan(plate(build));
      expect(plate(build, { airC: 30 })).toBeGreaterThan(plate(build));
      expect(plate(build, { windMPerS: 4 })).toBeLessThan(plate(build));
      expect(plate(build, { skyC: -10 })).toBeLessThan(plate(build));
      expect(plate({ ...build, backLossWPerM2K: 2 })).toBeLessThan(plate(build));
    }
    expect(plate({ ...glass, coverLongwaveTransmittance: 0.2 })).toBeLessThan(plate(glass));
  });

  it('gives the same hour whatever stood before it', () => {
    const sun = [60, 1000, 60, 500, 1000];
    const constant = (value: number) => new Float64Array(sun.length).fill(value);
    const out = { plateC: constant(0), coverC: constant(0) };
    dryYear(
      twinWall,
      {
        planeWm2: Float64Array.from(sun),
        absorbedWm2: Float64Array.from(sun, (g) => 0.7 * g),
        dryBulbC: constant(5),
        windMPerS: constant(1),
        windFactor: 1,
        skyLongwaveWm2: constant(280),
      },
      out,
    );
    expect(out.plateC[1]).toBeCloseTo(out.plateC[4]!, 2);
    expect(out.plateC[0]).toBeCloseTo(out.plateC[2]!, 2);
  });

  it('leaves the empty collector at air temperature below 50 W/m²', () => {
    const one = (value: number) => Float64Array.of(value);
    const out = { plateC: one(0), coverC: one(0) };
    dryYear(
      glass,
      {
        planeWm2: one(49),
        absorbedWm2: one(40),
        dryBulbC: one(7),
        windMPerS: one(1),
        windFactor: 1,
        skyLongwaveWm2: one(280),
      },
      out,
    );
    expect(out).toEqual({ plateC: one(7), coverC: one(7) });
  });
});

describe('dry temperature from a certificate', () => {
  // published certificate annex of a selective flat plate (2022): declared 189.4 °C, curve root 158 °C
  const curve = { eta0Hemispherical: 0.729, a1: 3.51, a2: 0.017, stagnationC: 189.4 };

  function declared(gains: readonly number[]): Float64Array {
    const plateC = new Float64Array(gains.length);
    dryYearFromDeclared(
      curve,
      {
        planeWm2: Float64Array.from(gains),
        opticalGainWm2: Float64Array.from(gains, (g) => 0.729 * g),
        dryBulbC: new Float64Array(gains.length).fill(30),
      },
      plateC,
    );
    return plateC;
  }

  it('returns the declared temperature at 1000 W/m² and 30 °C', () => {
    expect(stagnationFactor(0.729, 3.51, 0.017, 189.4)).toBeLessThan(1);
    expect(declared([1000])[0]).toBeCloseTo(189.4, 9);
  });

  it('stands 9 to 17 K above a rise scaled linearly with the sun at 800 and 500 W/m²', () => {
    const [at800, at500] = declared([800, 500]);
    const linear = (g: number) => 30 + (189.4 - 30) * (g / 1000);
    expect(at800! - linear(800)).toBeGreaterThan(8);
    expect(at800! - linear(800)).toBeLessThan(18);
    expect(at500! - linear(500)).toBeGreaterThan(8);
    expect(at500! - linear(500)).toBeLessThan(18);
  });
});

describe('face of the back insulation', () => {
  it('is the plate without a layer and falls with it', () => {
    expect(backFaceC(100, 20, 0.9, 0)).toBe(100);
    expect(backFaceC(100, 20, 0.9, 0.75)).toBeCloseTo(20 + 80 / 1.675, 9);
  });

  it('carries the same heat through the layer and the foam', () => {
    const face = backFaceC(100, 20, 0.9, 0.75);
    expect((100 - face) / 0.75).toBeCloseTo(backLossWithFaceLayer(0.9, 0.75) * 80, 9);
    expect(0.9 * (face - 20)).toBeCloseTo(backLossWithFaceLayer(0.9, 0.75) * 80, 9);
  });
});
