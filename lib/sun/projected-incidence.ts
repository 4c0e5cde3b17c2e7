import type { Plane } from '@/lib/sun/plane-year';
import { toDegrees, toRadians } from '@/lib/units/constants';

/** The incidence angle in the two planes that hold the normal of a collector. */
export interface ProjectedIncidence {
  /** in the plane that holds the normal and the line up the slope [°] 0…90 */
  upSlopeDeg: number;
  /** in the plane that holds the normal and the level line across the slope [°] 0…90 */
  acrossDeg: number;
}

/**
 * Angles between the normal of a plane and the projections of the sun's ray on its two upright planes.
 * Equations: tan θup = |sin β cos θz − cos β sin θz cos Δ| / cos θ, tan θacross = |sin θz sin Δ| / cos θ, Δ = γs − γ.
 * They obey tan² θ = tan² θup + tan² θacross.
 * @param plane tilt β and azimuth γ [°]
 * @param zenithDeg θz [°] 0…180
 * @param sunAzimuthDeg γs, clockwise from north [°]
 * @returns both angles [°]; 90 when the sun stands behind the plane
 * @see ISO 9806:2017, longitudinal and transversal incidence angles (from memory); sun's vector in the plane's own axes
 */
export function projectedIncidence(
  plane: Plane,
  zenithDeg: number,
  sunAzimuthDeg: number,
): ProjectedIncidence {
  const beta = toRadians(plane.tiltDeg);
  const z = toRadians(zenithDeg);
  const turn = toRadians(sunAzimuthDeg - plane.azimuthDeg);
  const level = Math.sin(z) * Math.cos(turn);
  const normal = Math.cos(beta) * Math.cos(z) + Math.sin(beta) * level;
  if (normal <= 0) return { upSlopeDeg: 90, acrossDeg: 90 };
  const upSlope = Math.sin(beta) * Math.cos(z) - Math.cos(beta) * level;
  const across = Math.sin(z) * Math.sin(turn);
  return {
    upSlopeDeg: toDegrees(Math.atan2(Math.abs(upSlope), normal)),
    acrossDeg: toDegrees(Math.atan2(Math.abs(across), normal)),
  };
}
