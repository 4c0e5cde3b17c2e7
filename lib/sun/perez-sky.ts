import { toRadians } from '@/lib/units/constants';

/** cos 85°: below 5° of sun altitude the circumsolar disc is not concentrated further. */
export const PEREZ_MIN_COS_ZENITH = Math.cos(toRadians(85));

/** Upper limits of the first seven bins of the sky clearness ε. */
const CLEARNESS_LIMITS = [1.065, 1.23, 1.5, 1.95, 2.8, 4.5, 6.2] as const;

/** F11 F12 F13 F21 F22 F23 of the eight bins. */
const COEFFICIENTS = Float64Array.of(
  ...[-0.008, 0.588, -0.062, -0.06, 0.072, -0.022],
  ...[0.13, 0.683, -0.151, -0.019, 0.066, -0.029],
  ...[0.33, 0.487, -0.221, 0.055, -0.064, -0.026],
  ...[0.568, 0.187, -0.295, 0.109, -0.152, -0.014],
  ...[0.873, -0.392, -0.362, 0.226, -0.462, 0.001],
  ...[1.132, -1.237, -0.412, 0.288, -0.823, 0.056],
  ...[1.06, -1.6, -0.359, 0.264, -1.127, 0.131],
  ...[0.678, -0.327, -0.25, 0.156, -1.377, 0.251],
);

/**
 * Sky clearness: ε = [(D + N)/D + κ θz³] / (1 + κ θz³), κ = 1.041, θz in radians.
 * @param diffuseWm2 D on the horizontal [W/m²] above 0
 * @param beamNormalWm2 N [W/m²] from 0
 * @param zenithDeg θz [°] 0…90
 * @returns ε [-] 1 (overcast) … about 12 (clear)
 * @see R. Perez et al., Modeling daylight availability and irradiance components, Solar Energy 44 (1990) 271, eq. 1
 */
export function skyClearness(diffuseWm2: number, beamNormalWm2: number, zenithDeg: number): number {
  const z = toRadians(zenithDeg);
  const term = 1.041 * z * z * z;
  return ((diffuseWm2 + beamNormalWm2) / diffuseWm2 + term) / (1 + term);
}

/**
 * Sky brightness: Δ = D m / Gon.
 * @param diffuseWm2 D on the horizontal [W/m²]
 * @param airMass m [-] 1…38
 * @param extraterrestrialNormalWm2 Gon [W/m²]
 * @returns Δ [-]
 * @see R. Perez et al., Solar Energy 44 (1990) 271, eq. 2
 */
export function skyBrightness(
  diffuseWm2: number,
  airMass: number,
  extraterrestrialNormalWm2: number,
): number {
  return (diffuseWm2 * airMass) / extraterrestrialNormalWm2;
}

/**
 * Shares of the diffuse that come from around the sun (F1) and from the horizon band (F2).
 * Equation: F1 = max(0, F11 + F12 Δ + F13 θz), F2 = F21 + F22 Δ + F23 θz, coefficients by the bin of ε.
 * @param clearness ε [-] from 1
 * @param brightness Δ [-]
 * @param zenithDeg θz [°] 0…90
 * @returns F1, F2 [-]
 * @see R. Perez et al., Solar Energy 44 (1990) 271, table 6
 */
export function perezShares(
  clearness: number,
  brightness: number,
  zenithDeg: number,
): { circumsolar: number; horizon: number } {
  let bin = 0;
  while (bin < CLEARNESS_LIMITS.length && clearness >= CLEARNESS_LIMITS[bin]!) bin++;
  const at = 6 * bin;
  const z = toRadians(zenithDeg);
  const f1 = COEFFICIENTS[at]! + COEFFICIENTS[at + 1]! * brightness + COEFFICIENTS[at + 2]! * z;
  const f2 = COEFFICIENTS[at + 3]! + COEFFICIENTS[at + 4]! * brightness + COEFFICIENTS[at + 5]! * z;
  return { circumsolar: Math.max(0, f1), horizon: f2 };
}
