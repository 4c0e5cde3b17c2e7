import { describe, expect, it } from 'vitest';
import { climateYear } from '@/data/climates/climates';
import { behindHorizon, horizonAltitudeDeg, skylineOf, visibleSkyShare } from '@/lib/sun/horizon';
import type { HorizonPoint } from '@/lib/sun/horizon';
import { type PlaneYear, planeYear } from '@/lib/sun/plane-year';
import { sunYear } from '@/lib/sun/sun-year';
import { seededRandom } from '@/lib/weather/seeded-random';

const weather = climateYear('upland-u46')!;
const sun = sunYear(weather, weather.sunShiftH);
const south = { tiltDeg: 65, azimuthDeg: 180 };
const allRound = (altitudeDeg: number): HorizonPoint[] => [{ azimuthDeg: 40, altitudeDeg }];
const radians = (degrees: number) => (degrees * Math.PI) / 180;

describe('the skyline', () => {
  it('is level without points and level all round with one', () => {
    expect(horizonAltitudeDeg(skylineOf([]), 200)).toBe(0);
    for (const azimuthDeg of [0, 40, 359.9]) {
      expect(horizonAltitudeDeg(skylineOf(allRound(7)), azimuthDeg)).toBe(7);
    }
  });

  it('runs straight between its points, in any order and over north', () => {
    const skyline = skylineOf([
      { azimuthDeg: 350, altitudeDeg: 10 },
      { azimuthDeg: 10, altitudeDeg: 20 },
      { azimuthDeg: 110, altitudeDeg: 0 },
    ]);
    expect(horizonAltitudeDeg(skyline, 0)).toBeCloseTo(15, 12);
    expect(horizonAltitudeDeg(skyline, 355)).toBeCloseTo(12.5, 12);
    expect(horizonAltitudeDeg(skyline, 60)).toBeCloseTo(10, 12);
    expect(horizonAltitudeDeg(skyline, 230)).toBeCloseTo(5, 12);
  });

  it('takes two points of one azimuth as a step, and 0° and 360° as one place', () => {
    const wall = skylineOf([
      { azimuthDeg: 90, altitudeDeg: 0 },
      { azimuthDeg: 90, altitudeDeg: 30 },
      { azimuthDeg: 180, altitudeDeg: 30 },
      { azimuthDeg: 180, altitudeDeg: 0 },
    ]);
    expect(horizonAltitudeDeg(wall, 89.9)).toBe(0);
    expect(horizonAltitudeDeg(wall, 90)).toBe(30);
    expect(horizonAltitudeDeg(wall, 200)).toBe(0);
    const closed = skylineOf([0, 360].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 4 })));
    for (const azimuthDeg of [0, 180, 359.99]) expect(horizonAltitudeDeg(closed, azimuthDeg)).toBe(4);
  });
});

describe('the sky above it', () => {
  // closed forms of ∫ cos θ dΩ over an isotropic dome above altitude h; derived
  it.each([1, 9, 30, 60])('leaves cos²h on the horizontal with %s° all round', (altitudeDeg) => {
    const share = visibleSkyShare(skylineOf(allRound(altitudeDeg)), { tiltDeg: 0, azimuthDeg: 123 });
    expect(share).toBeCloseTo(Math.cos(radians(altitudeDeg)) ** 2, 12);
  });

  it.each([1, 9, 30, 60])('leaves 1 − (2h + sin 2h)/π on a wall with %s° all round', (altitudeDeg) => {
    const h = radians(altitudeDeg);
    const share = visibleSkyShare(skylineOf(allRound(altitudeDeg)), { tiltDeg: 90, azimuthDeg: 123 });
    expect(share).toBeCloseTo(1 - (2 * h + Math.sin(2 * h)) / Math.PI, 12);
  });

  it('is whole above a level skyline, whatever the tilt', () => {
    for (const tiltDeg of [0, 25, 65, 90])
      expect(visibleSkyShare(skylineOf(allRound(0)), { tiltDeg, azimuthDeg: 200 })).toBe(1);
  });

  it('loses nothing to a hill behind a wall and most to one before it', () => {
    const hill = (azimuthDeg: number) =>
      skylineOf([-40, 0, 40].map((d) => ({ azimuthDeg: azimuthDeg + d, altitudeDeg: d === 0 ? 40 : 0 })));
    const wall = { tiltDeg: 90, azimuthDeg: 180 };
    expect(visibleSkyShare(hill(45), wall)).toBe(1);
    expect(visibleSkyShare(hill(180), wall)).toBeLessThan(visibleSkyShare(hill(120), wall));
  });
});

describe('a year behind it', () => {
  const open = planeYear(weather, sun, south, 'hdkr');

  it('is the open year above a level skyline', () => {
    const year = behindHorizon(open, sun, south, allRound(0));
    expect(year).toEqual(open);
  });

  it('has beam exactly while the sun stands above the skyline, and all of the ground', () => {
    const year = behindHorizon(open, sun, south, allRound(12));
    const share = visibleSkyShare(skylineOf(allRound(12)), south);
    for (let h = 0; h < 8760; h++) {
      const hidden = 90 - sun.zenithDeg[h]! < 12;
      expect(year.beamWm2[h]).toBe(hidden ? 0 : open.beamWm2[h]);
      expect(year.diffuseWm2[h]).toBe(open.diffuseWm2[h]! * share);
      expect(year.totalWm2[h]).toBeCloseTo(year.beamWm2[h]! + year.diffuseWm2[h]! + year.groundWm2[h]!, 12);
      if (hidden && open.beamWm2[h]! > 0) expect(year.incidenceDeg[h]).toBe(90);
    }
    expect(year.groundWm2).toEqual(open.groundWm2);
  });

  it('takes the morning from a south plane behind a hill in the south-east', () => {
    const hill = [
      { azimuthDeg: 95, altitudeDeg: 0 },
      { azimuthDeg: 120, altitudeDeg: 25 },
      { azimuthDeg: 175, altitudeDeg: 0 },
    ];
    const year = behindHorizon(open, sun, south, hill);
    const beam = (of: PlaneYear, morning: boolean) =>
      of.beamWm2.reduce((sum, value, h) => (h % 24 < 12 === morning ? sum + value : sum), 0);
    expect(beam(year, true)).toBeLessThan(0.95 * beam(open, true));
    expect(beam(year, false)).toBe(beam(open, false));
  });

  it('a higher skyline never lets more irradiation in, in any hour', () => {
    const random = seededRandom(20_25);
    const planes = [south, { tiltDeg: 90, azimuthDeg: 102 }, { tiltDeg: 25, azimuthDeg: 300 }];
    for (const plane of planes) {
      for (const model of ['hdkr', 'perez'] as const) {
        const free = planeYear(weather, sun, plane, model);
        const low = Array.from({ length: 12 }, () => ({
          azimuthDeg: Math.round(360 * random()),
          altitudeDeg: 40 * random(),
        }));
        const high = low.map((point) => ({ ...point, altitudeDeg: point.altitudeDeg + 20 * random() }));
        const lower = behindHorizon(free, sun, plane, low);
        const higher = behindHorizon(free, sun, plane, high);
        let wrong = 0;
        for (let h = 0; h < 8760; h++) {
          if (higher.totalWm2[h]! > lower.totalWm2[h]! || lower.totalWm2[h]! > free.totalWm2[h]!) wrong++;
        }
        expect(wrong).toBe(0);
      }
    }
  });
});
