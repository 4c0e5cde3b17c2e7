/** Mean over all angles against normal incidence, F_w [-]. */
export const WINDOW_ANGLE_FACTOR = 0.9;

/**
 * Sun through a window per irradiance: A_sol = A_w (1 − F_F) F_w g⊥ F_sh.
 * @param areaM2 opening A_w [m²] from 0
 * @param frameFraction F_F [-] 0–1; 0.2–0.3
 * @param gValue g⊥ at normal incidence [-] 0–1: single 0.85, double 0.75, low-e 0.67, triple 0.50
 * @param shade share left by shading F_sh [-] 0–1
 * @returns solar aperture [m²]
 * @see ISO 13790:2008, 11.3.3–11.4.2
 */
export function solarApertureM2(
  areaM2: number,
  frameFraction: number,
  gValue: number,
  shade: number,
): number {
  return areaM2 * (1 - frameFraction) * WINDOW_ANGLE_FACTOR * gValue * shade;
}

/**
 * Solar gain of a window: Φ = A_sol I.
 * @param apertureM2 A_sol [m²]
 * @param irradianceWm2 on the plane of the window I [W/m²]
 * @returns gain [W]
 * @see ISO 13790:2008, 11.3.2
 */
export function windowGainW(apertureM2: number, irradianceWm2: number): number {
  return apertureM2 * irradianceWm2;
}
