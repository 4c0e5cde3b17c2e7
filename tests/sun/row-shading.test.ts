import { describe, expect, it } from 'vitest';
import { climateYear } from '@/data/climates/climates';
import { incidenceCosine } from '@/lib/sun/irradiance-on-plane';
import { planeYear } from '@/lib/sun/plane-year';
import {
  amongRows,
  maskingAngleDeg,
  rowGroundView,
  rowShadow,
  rowSkyView,
  shortestNoonShadow,
} from '@/lib/sun/row-shading';
import { sunYear } from '@/lib/sun/sun-year';
import { seededRandom } from '@/lib/weather/seeded-random';

const weather = climateYear('upland-u46')!;
const sun = sunYear(weather, weather.sunShiftH);
const radians = (degrees: number) => (degrees * Math.PI) / 180;
const points = Array.from({ length: 4000 }, (_, i) => (i + 0.5) / 4000);
const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;

/** Whether the ray from a point of a row towards the sun meets the row before it, in the section across the rows. */
function rayMeetsRow(layout: Layout, tiltDeg: number, upSlope: number, profile: [number, number]): boolean {
  const { rowSpacingM: s, rowHeightM: l } = layout;
  const [cos, sin] = [Math.cos(radians(tiltDeg)), Math.sin(radians(tiltDeg))];
  const [dx, dz] = profile;
  // start + t d = (−s, 0) + k (cos, sin); by Cramer's rule
  const [bx, bz] = [-s - upSlope * l * cos, -upSlope * l * sin];
  const det = -dx * sin + cos * dz;
  const t = (-bx * sin + cos * bz) / det;
  const k = (dx * bz - dz * bx) / det;
  return t > 0 && k >= 0 && k <= l;
}

type Layout = { rowSpacingM: number; rowHeightM: number };

const layouts: [Layout, number][] = [
  [{ rowSpacingM: 4, rowHeightM: 2 }, 65],
  [{ rowSpacingM: 2.2, rowHeightM: 2 }, 30],
  [{ rowSpacingM: 1.5, rowHeightM: 1.2 }, 90],
  [{ rowSpacingM: 9, rowHeightM: 3 }, 45],
];

describe('the shadow of a row on the next', () => {
  it('is what rays traced in the section across the rows find', () => {
    const random = seededRandom(19);
    let shaded = 0;
    for (let trial = 0; trial < 60; trial++) {
      const [layout, tiltDeg] = layouts[trial % layouts.length]!;
      const zenithDeg = 40 + 49 * random();
      const turnDeg = 85 * (2 * random() - 1);
      const cosIncidence = incidenceCosine(tiltDeg, 180, zenithDeg, 180 + turnDeg);
      const profile: [number, number] = [
        -Math.sin(radians(zenithDeg)) * Math.cos(radians(turnDeg)),
        Math.cos(radians(zenithDeg)),
      ];
      const hit = points.filter((y) => rayMeetsRow(layout, tiltDeg, y, profile)).length / points.length;
      const expected = cosIncidence > 0 ? hit : 0;
      expect(rowShadow(layout, Math.cos(radians(zenithDeg)), cosIncidence)).toBeCloseTo(expected, 3);
      if (expected > 0.01 && expected < 0.99) shaded++;
    }
    expect(shaded).toBeGreaterThan(10);
  });

  it('follows the profile angle: tan αp = tan α / cos Δ (Duffie & Beckman sec. 1.9, from memory)', () => {
    const layout = { rowSpacingM: 3, rowHeightM: 2 };
    const [altitudeDeg, turnDeg, tiltDeg] = [15, 50, 60];
    const profile = Math.atan(Math.tan(radians(altitudeDeg)) / Math.cos(radians(turnDeg)));
    // sine rule in the triangle of slant, spacing and ray
    const lit = (3 * Math.sin(profile)) / Math.sin(profile + radians(tiltDeg));
    const cosIncidence = incidenceCosine(tiltDeg, 180, 90 - altitudeDeg, 180 + turnDeg);
    const shadow = rowShadow(layout, Math.sin(radians(altitudeDeg)), cosIncidence);
    expect(shadow).toBeCloseTo(1 - lit / 2, 12);
    expect(shadow).toBeGreaterThan(0.1);
  });

  it('is none behind the rows, whole with the sun on the level horizon', () => {
    const layout = { rowSpacingM: 3, rowHeightM: 2 };
    expect(rowShadow(layout, 0.5, -0.1)).toBe(0);
    expect(rowShadow(layout, 0, 0.6)).toBe(1);
  });
});

describe('what a row sees', () => {
  it.each(layouts)('of the sky: the mean over the masking angle, %o at %s°', (layout, tiltDeg) => {
    const views = points.map(
      (y) => (1 + Math.cos(radians(tiltDeg + maskingAngleDeg(layout, tiltDeg, y)))) / 2,
    );
    expect(rowSkyView(layout, tiltDeg)).toBeCloseTo(mean(views), 6);
  });

  it.each(layouts)('of the ground: the mean over its points, %o at %s°', (layout, tiltDeg) => {
    const [cos, sin] = [Math.cos(radians(tiltDeg)), Math.sin(radians(tiltDeg))];
    const views = points.map((share) => {
      const y = share * layout.rowHeightM;
      const [vx, vz] = [-layout.rowSpacingM - y * cos, -y * sin];
      return (1 + (vx * cos + vz * sin) / Math.hypot(vx, vz)) / 2;
    });
    expect(rowGroundView(layout, tiltDeg)).toBeCloseTo(mean(views), 6);
  });

  it('is that of a free plane when the rows stand far apart', () => {
    const far = { rowSpacingM: 1e6, rowHeightM: 2 };
    expect(rowSkyView(far, 65)).toBeCloseTo((1 + Math.cos(radians(65))) / 2, 5);
    expect(rowGroundView(far, 65)).toBeCloseTo((1 - Math.cos(radians(65))) / 2, 5);
  });
});

describe('a year among rows', () => {
  const plane = { tiltDeg: 60, azimuthDeg: 190 };
  const free = planeYear(weather, sun, plane, 'hdkr');
  const year = (rows: number, rowSpacingM: number) =>
    amongRows(free, sun, plane, { rows, rowSpacingM, rowHeightM: 2 });

  it('is the free year for one row, to the object', () => {
    expect(year(1, 3)).toBe(free);
  });

  it('adds up', () => {
    const { beamWm2, diffuseWm2, groundWm2, totalWm2 } = year(3, 3);
    for (let h = 0; h < 8760; h++)
      expect(totalWm2[h]).toBeCloseTo(beamWm2[h]! + diffuseWm2[h]! + groundWm2[h]!, 9);
  });

  it('has no hour with more than a free row, closer rows and more rows have less', () => {
    const steps = [year(2, 6), year(2, 4), year(4, 4), year(4, 2.5), year(10, 2.5)];
    let before = free;
    for (const next of steps) {
      let wrong = 0;
      for (let h = 0; h < 8760; h++) if (next.totalWm2[h]! > before.totalWm2[h]! * (1 + 1e-14)) wrong++;
      expect(wrong).toBe(0);
      before = next;
    }
  });

  it('loses the share of the rows behind', () => {
    const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);
    const lost = (rows: number) => sum(free.beamWm2) - sum(year(rows, 3).beamWm2);
    expect(lost(2) / (1 / 2)).toBeCloseTo(lost(5) / (4 / 5), 4);
    expect(lost(2)).toBeGreaterThan(0);
  });
});

describe('solar noon of the shortest day', () => {
  it('names the spacing that clears the shadow', () => {
    for (const latitudeDeg of [46, -34, 5]) {
      const plane = { tiltDeg: 70, azimuthDeg: latitudeDeg < 0 ? 8 : 192 };
      const { shaded, clearSpacingM } = shortestNoonShadow(
        { rowSpacingM: 2, rowHeightM: 2 },
        plane,
        latitudeDeg,
      );
      const at = (rowSpacingM: number) =>
        shortestNoonShadow({ rowSpacingM, rowHeightM: 2 }, plane, latitudeDeg).shaded;
      expect(shaded).toBeCloseTo(Math.max(0, 1 - 2 / clearSpacingM), 12);
      expect(at(clearSpacingM * 1.000_001)).toBe(0);
      expect(at(clearSpacingM * 0.99)).toBeCloseTo(0.01, 9);
    }
  });

  it('has no shadow in the polar night', () => {
    expect(
      shortestNoonShadow({ rowSpacingM: 2, rowHeightM: 2 }, { tiltDeg: 70, azimuthDeg: 180 }, 68),
    ).toEqual({ shaded: 0, clearSpacingM: 0 });
  });
});
