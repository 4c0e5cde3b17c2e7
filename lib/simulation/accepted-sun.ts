import { beamModifier, modifierFromPair, modifierFromTable } from '@/lib/physics/incidence-angle';
import type { Plane, PlaneYear } from '@/lib/sun/plane-year';
import { projectedIncidence } from '@/lib/sun/projected-incidence';
import type { SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR, toRadians } from '@/lib/units/constants';
import type { CollectorCurve } from './design';

/**
 * Sun accepted by the optics of a collector in each hour: Kb Gb + Kd (Gd + Gr).
 * @param curve modifier of the beam and Kd [-]
 * @param year irradiance on the plane [W/m²]; what comes from around the sun is in its beam
 * @param plane tilt and azimuth [°]
 * @param sun the sun of the same site [°]
 * @returns accepted irradiance of 8,760 hours [W/m²]
 * @see lib/physics/incidence-angle.ts; ISO 9806:2017, 23 (from memory)
 */
export function acceptedSun(
  curve: Pick<CollectorCurve, 'b0' | 'modifier' | 'diffuseModifier'>,
  year: PlaneYear,
  plane: Plane,
  sun: Pick<SunYear, 'zenithDeg' | 'azimuthDeg'>,
): Float64Array {
  const { modifier } = curve;
  const ofHour = (h: number): number => {
    const incidenceDeg = year.incidenceDeg[h]!;
    if (modifier.kind === 'b0') return beamModifier(curve.b0, Math.cos(toRadians(incidenceDeg)));
    if (modifier.kind === 'table') return modifierFromTable(modifier.values, incidenceDeg);
    const { upSlopeDeg, acrossDeg } = projectedIncidence(plane, sun.zenithDeg[h]!, sun.azimuthDeg[h]!);
    return modifierFromPair(modifier, upSlopeDeg, acrossDeg);
  };
  const accepted = new Float64Array(HOURS_PER_YEAR);
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const beam = year.beamWm2[h]!;
    const rest = curve.diffuseModifier * (year.diffuseWm2[h]! + year.groundWm2[h]!);
    accepted[h] = beam > 0 ? rest + beam * ofHour(h) : rest;
  }
  return accepted;
}
