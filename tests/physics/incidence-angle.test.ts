import { describe, expect, it } from 'vitest';
import {
  diffuseModifierFromPair,
  diffuseModifierFromTable,
  modifierFromPair,
  modifierFromTable,
  type Ribs,
} from '@/lib/physics/incidence-angle';
import { incidenceCosine } from '@/lib/sun/irradiance-on-plane';
import { projectedIncidence } from '@/lib/sun/projected-incidence';
import { seededRandom } from '@/lib/weather/seeded-random';

/** Table of a public certificate annex, as in the reference row CT-03. */
const table = [1, 1, 0.99, 0.98, 0.97, 0.94, 0.9, 0.8, 0.5, 0];
const ones = Array<number>(10).fill(1);
const pair = (
  longitudinal: readonly number[],
  transversal: readonly number[],
  ribs: Ribs = 'along the slope',
) => ({ kind: 'pair', longitudinal, transversal, ribs }) as const;

describe('the two angles of the sun on a plane', () => {
  it('obey tan² θ = tan² θup + tan² θacross for any sun and plane', () => {
    const random = seededRandom(9806);
    for (let trial = 0; trial < 500; trial++) {
      const plane = { tiltDeg: 90 * random(), azimuthDeg: 360 * random() };
      const [zenithDeg, azimuthDeg] = [90 * random(), 360 * random()];
      const cosine = incidenceCosine(plane.tiltDeg, plane.azimuthDeg, zenithDeg, azimuthDeg);
      const { upSlopeDeg, acrossDeg } = projectedIncidence(plane, zenithDeg, azimuthDeg);
      if (cosine <= 0) {
        expect([upSlopeDeg, acrossDeg]).toEqual([90, 90]);
        continue;
      }
      const tangent2 = (degrees: number) => Math.tan((degrees * Math.PI) / 180) ** 2;
      const sum = tangent2(upSlopeDeg) + tangent2(acrossDeg);
      expect(sum / (1 / cosine ** 2 - 1)).toBeCloseTo(1, 6);
    }
  });

  it('are the zenith and 0 for a flat plane facing the sun’s side, and 0 twice for a sun on the normal', () => {
    const flat = projectedIncidence({ tiltDeg: 0, azimuthDeg: 180 }, 35, 180);
    expect(flat.upSlopeDeg).toBeCloseTo(35, 9);
    expect(flat.acrossDeg).toBeCloseTo(0, 9);
    const normal = projectedIncidence({ tiltDeg: 50, azimuthDeg: 200 }, 50, 200);
    expect(Math.max(normal.upSlopeDeg, normal.acrossDeg)).toBeLessThan(1e-5);
  });

  it('turn over as the sun goes round: across at 9 o’clock, up the slope at noon', () => {
    const wall = { tiltDeg: 90, azimuthDeg: 180 };
    const side = projectedIncidence(wall, 89.999, 120);
    expect(side.acrossDeg).toBeCloseTo(60, 2);
    expect(side.upSlopeDeg).toBeLessThan(0.01);
    expect(projectedIncidence(wall, 60, 180)).toMatchObject({ acrossDeg: expect.closeTo(0, 9) });
  });
});

describe('the modifier of a ribbed collector', () => {
  it('is the one table in its own plane, and the product of both between', () => {
    for (const angleDeg of [0, 15, 42, 68, 85]) {
      expect(modifierFromPair(pair(table, ones), angleDeg, 37)).toBe(modifierFromTable(table, angleDeg));
      expect(modifierFromPair(pair(table, table), angleDeg, 0)).toBe(modifierFromTable(table, angleDeg));
      expect(modifierFromPair(pair(table, table), 0, angleDeg)).toBe(modifierFromTable(table, angleDeg));
    }
    expect(modifierFromPair(pair(table, table), 50, 60)).toBeCloseTo(0.94 * 0.9, 12);
  });

  it('turns with the ribs: tables and angles change places together', () => {
    const web = [1, 1, 1.02, 1.04, 1.03, 0.98, 0.9, 0.7, 0.4, 0];
    for (const [up, across] of [
      [20, 55],
      [70, 5],
      [33, 33],
    ] as const)
      // prettier-ignore
      expect(modifierFromPair(pair(web, table, 'across the slope'), up, across)).toBe(
        modifierFromPair(pair(web, table), across, up),
      );
    for (const ribs of ['along the slope', 'across the slope'] as const)
      expect(modifierFromPair(pair(table, table, ribs), 35, 60)).toBe(
        modifierFromPair(pair(table, table), 60, 35),
      );
  });

  it('has the hemisphere’s diffuse modifier: 1 for ones, alike both ways round', () => {
    expect(diffuseModifierFromPair(ones, ones)).toBeCloseTo(1, 12);
    const one = diffuseModifierFromPair(table, ones);
    expect(diffuseModifierFromPair(ones, table)).toBeCloseTo(one, 12);
    expect(one).toBeGreaterThan(diffuseModifierFromTable(table));
    expect(diffuseModifierFromPair(table, table)).toBeLessThan(one);
  });
});
