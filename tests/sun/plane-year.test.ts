import { describe, expect, it } from 'vitest';
import { climateYear } from '@/data/climates/climates';
import { type PlaneYear, planeYear } from '@/lib/sun/plane-year';
import { sunYear } from '@/lib/sun/sun-year';

const weather = climateYear('upland-u46')!;
const sun = sunYear(weather, weather.sunShiftH);
const models = ['isotropic', 'hay-davies', 'hdkr', 'perez'] as const;
const south = { tiltDeg: 65, azimuthDeg: 180 };
const sum = (values: Float64Array): number => values.reduce((a, b) => a + b, 0);

/** The same weather with one hour changed. */
function withHour(
  hour: number,
  change: Partial<Record<'globalWm2' | 'beamNormalWm2' | 'diffuseWm2', number>>,
): typeof weather {
  const changed = { ...weather };
  for (const [name, value] of Object.entries(change)) {
    const column = name as 'globalWm2' | 'beamNormalWm2' | 'diffuseWm2';
    changed[column] = weather[column].with(hour, value);
  }
  return changed;
}

describe.each(models)('a year on a plane, %s', (model) => {
  it('is the year on the horizontal when the plane lies flat', () => {
    // G = D + B cos θz closes in this year; Perez keeps b = cos 85° near the horizon and may give less there
    const flat = planeYear(weather, sun, { tiltDeg: 0, azimuthDeg: 180 }, model);
    for (let h = 0; h < 8760; h++) {
      const low = sun.zenithDeg[h]! > (model === 'perez' ? 85 : 89);
      if (!low) expect(flat.totalWm2[h]).toBeCloseTo(weather.globalWm2[h]!, 8);
    }
  });

  it('adds up, is never negative, and dark hours are dark', () => {
    const year = planeYear(weather, sun, south, model);
    for (let h = 0; h < 8760; h++) {
      const parts = year.beamWm2[h]! + year.diffuseWm2[h]! + year.groundWm2[h]!;
      expect(year.totalWm2[h]).toBeCloseTo(parts, 9);
      expect(Math.min(year.beamWm2[h]!, year.diffuseWm2[h]!, year.groundWm2[h]!)).toBeGreaterThanOrEqual(0);
      expect(year.incidenceDeg[h]!).toBeLessThanOrEqual(90);
      if (weather.globalWm2[h] === 0) expect(year.totalWm2[h]).toBe(0);
    }
  });

  it('takes irradiance of an hour without sun as isotropic diffuse', () => {
    const night = 24 * 10 + 1;
    const dusk = withHour(night, { globalWm2: 12, beamNormalWm2: 40, diffuseWm2: 9 });
    const year = planeYear(dusk, sun, south, model);
    const view = (1 + Math.cos((65 * Math.PI) / 180)) / 2;
    expect(year.beamWm2[night]).toBe(0);
    expect(year.diffuseWm2[night]).toBeCloseTo(9 * view, 12);
    expect(year.groundWm2[night]).toBeCloseTo(12 * 0.2 * (1 - view), 12);
    expect(year.incidenceDeg[night]).toBe(90);
  });

  it('has no beam on an east wall in the afternoon', () => {
    const east = planeYear(weather, sun, { tiltDeg: 90, azimuthDeg: 90 }, model);
    for (let h = 0; h < 8760; h++) {
      if (h % 24 >= 14) expect(east.incidenceDeg[h]).toBe(90);
    }
  });
});

describe('between the models', () => {
  const years = Object.fromEntries(models.map((m) => [m, planeYear(weather, sun, south, m)])) as Record<
    (typeof models)[number],
    PlaneYear
  >;

  it('isotropic is lowest and HDKR lies between Hay-Davies and Perez', () => {
    const total = (m: (typeof models)[number]): number => sum(years[m].totalWm2);
    expect(total('isotropic')).toBeLessThan(total('hay-davies'));
    expect(total('hay-davies')).toBeLessThan(total('hdkr'));
    expect(total('hdkr')).toBeLessThan(total('perez'));
  });

  it('isotropic has no circumsolar part: its beam is DNI cos θ', () => {
    for (let h = 0; h < 8760; h += 7) {
      const cosine = Math.cos((years.isotropic.incidenceDeg[h]! * Math.PI) / 180);
      const beam = sun.sunlitFraction[h]! > 0 ? weather.beamNormalWm2[h]! * Math.max(0, cosine) : 0;
      expect(years.isotropic.beamWm2[h]).toBeCloseTo(beam, 6);
    }
  });

  it('the ground gives G ρ (1 − cos β)/2, by the year’s albedo or the one asked for', () => {
    const bright = planeYear(weather, sun, south, 'hdkr', 0.6);
    expect(sum(bright.groundWm2)).toBeCloseTo(3 * sum(years.hdkr.groundWm2), 4);
    expect(bright.beamWm2).toEqual(years.hdkr.beamWm2);
  });
});
