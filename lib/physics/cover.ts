import { toDegrees, toRadians } from '@/lib/units/constants';

/** Solar optics of one cover at one angle, parts of the incident sun [-]. */
export interface CoverOptics {
  transmittance: number;
  reflectance: number;
  absorptance: number;
}

/** Angle of diffuse sun on the reflecting cover in (τα), in place of an integral over the hemisphere [°]. */
const DIFFUSE_REFLECTION_DEG = 60;

/**
 * Angle inside the cover by Snell's law: sin θ2 = sin θ / n.
 * @param incidenceDeg angle outside [°] 0–90
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @returns angle inside [°]
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 5.1.4
 */
export function refractionDeg(incidenceDeg: number, refractiveIndex: number): number {
  return toDegrees(Math.asin(Math.sin(toRadians(incidenceDeg)) / refractiveIndex));
}

/**
 * Fresnel reflectance of one surface for both directions of polarisation:
 * r⊥ = sin²(θ2 − θ)/sin²(θ2 + θ), r∥ = tan²(θ2 − θ)/tan²(θ2 + θ); ((n − 1)/(n + 1))² at normal incidence.
 * @param incidenceDeg angle outside [°] 0–90
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @returns { perpendicular, parallel, mean } reflectances [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.1.1–5.1.3
 */
export function surfaceReflectance(
  incidenceDeg: number,
  refractiveIndex: number,
): { perpendicular: number; parallel: number; mean: number } {
  const outside = toRadians(incidenceDeg);
  const inside = toRadians(refractionDeg(incidenceDeg, refractiveIndex));
  const normal = ((refractiveIndex - 1) / (refractiveIndex + 1)) ** 2;
  const nearlyNormal = incidenceDeg < 1e-4;
  const perpendicular = nearlyNormal
    ? normal
    : (Math.sin(inside - outside) / Math.sin(inside + outside)) ** 2;
  const parallel = nearlyNormal ? normal : (Math.tan(inside - outside) / Math.tan(inside + outside)) ** 2;
  return { perpendicular, parallel, mean: (perpendicular + parallel) / 2 };
}

/**
 * Transmittance of a stack of equal covers that only reflect: τ = mean over polarisations of (1 − r)/(1 + (2N − 1) r).
 * @param incidenceDeg angle of incidence [°] 0–90
 * @param refractiveIndex of the covers [-] 1.3–1.7
 * @param covers number of covers [-] from 1
 * @returns transmittance without absorption [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.1.9
 */
export function reflectionTransmittance(
  incidenceDeg: number,
  refractiveIndex: number,
  covers: number,
): number {
  const { perpendicular, parallel } = surfaceReflectance(incidenceDeg, refractiveIndex);
  const through = (r: number) => (1 - r) / (1 + (2 * covers - 1) * r);
  return (through(perpendicular) + through(parallel)) / 2;
}

/**
 * Share of the sun left after the path through the cover: τa = exp(−K L / cos θ2).
 * @param incidenceDeg angle of incidence [°] 0–90
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @param extinction K · L, extinction times thickness [-] 0–1
 * @returns transmittance of the path [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.2.2
 */
export function pathTransmittance(incidenceDeg: number, refractiveIndex: number, extinction: number): number {
  return Math.exp(-extinction / Math.cos(toRadians(refractionDeg(incidenceDeg, refractiveIndex))));
}

/**
 * Optics of one absorbing cover with all inner reflections, mean of both polarisations:
 * τ = τa (1 − r)²/(1 − (r τa)²), ρ = r (1 + τa τ), α = 1 − ρ − τ.
 * @param incidenceDeg angle of incidence [°] 0–90
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @param extinction K · L [-] 0–1
 * @returns transmittance, reflectance, absorptance [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.3.1–5.3.3
 */
export function coverOptics(incidenceDeg: number, refractiveIndex: number, extinction: number): CoverOptics {
  const path = pathTransmittance(incidenceDeg, refractiveIndex, extinction);
  const { perpendicular, parallel } = surfaceReflectance(incidenceDeg, refractiveIndex);
  const through = (r: number) => (path * (1 - r) ** 2) / (1 - (r * path) ** 2);
  const back = (r: number) => r * (1 + path * through(r));
  const transmittance = (through(perpendicular) + through(parallel)) / 2;
  const reflectance = (back(perpendicular) + back(parallel)) / 2;
  return { transmittance, reflectance, absorptance: 1 - transmittance - reflectance };
}

/**
 * Optics of a stack of N equal covers: τ ≈ τa^N τr(N), ρ ≈ τa^N − τ, α ≈ 1 − τa^N.
 * @param incidenceDeg angle of incidence [°] 0–90
 * @param refractiveIndex of the covers [-] 1.3–1.7
 * @param extinction K · L of one cover [-] 0–0.2
 * @param covers number of covers [-] from 1
 * @returns transmittance, reflectance, absorptance [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.3.4–5.3.6
 */
export function coverStackOptics(
  incidenceDeg: number,
  refractiveIndex: number,
  extinction: number,
  covers: number,
): CoverOptics {
  const path = pathTransmittance(incidenceDeg, refractiveIndex, extinction * covers);
  const transmittance = path * reflectionTransmittance(incidenceDeg, refractiveIndex, covers);
  return { transmittance, reflectance: path - transmittance, absorptance: 1 - path };
}

/**
 * Reflectance of the cover for diffuse sun coming back from the absorber: ρd = τa(60°) − τ(60°).
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @param extinction K · L [-] 0–1
 * @returns diffuse reflectance from below [-]
 * @see Duffie & Beckman, 4th ed. 2013, sec. 5.5
 */
export function coverDiffuseReflectance(refractiveIndex: number, extinction: number): number {
  return (
    pathTransmittance(DIFFUSE_REFLECTION_DEG, refractiveIndex, extinction) -
    coverOptics(DIFFUSE_REFLECTION_DEG, refractiveIndex, extinction).transmittance
  );
}

/**
 * Transmittance-absorptance product: (τα) = τ α / (1 − (1 − α) ρd).
 * @param transmittance of the cover [-] 0–1
 * @param absorptance of the absorber [-] 0–1
 * @param diffuseReflectance of the cover from below [-] 0–1
 * @returns (τα) [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.5.1
 */
export function transmittanceAbsorptance(
  transmittance: number,
  absorptance: number,
  diffuseReflectance: number,
): number {
  return (transmittance * absorptance) / (1 - (1 - absorptance) * diffuseReflectance);
}

/**
 * The product where only τ and α are known: (τα) ≈ 1.01 τ α.
 * @param transmittance of the cover [-] 0–1
 * @param absorptance of the absorber [-] 0.85–1
 * @returns (τα) [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 5.5.2
 */
export function approximateTransmittanceAbsorptance(transmittance: number, absorptance: number): number {
  return 1.01 * transmittance * absorptance;
}

/**
 * Incidence-angle modifier of a cover sheet by one surface and the path through it:
 * K = τ(θ)/τ(0), τ = exp(−K L/cos θ2) (1 − r).
 * @param incidenceDeg angle of incidence [°] 0–90
 * @param refractiveIndex of the cover [-] 1.3–1.7
 * @param extinction K · L [-] 0–1
 * @returns modifier [-]
 * @see De Soto, Klein & Beckman, Solar Energy 80 (2006) 78
 */
export function sheetModifier(incidenceDeg: number, refractiveIndex: number, extinction: number): number {
  const through = (angle: number) =>
    pathTransmittance(angle, refractiveIndex, extinction) *
    (1 - surfaceReflectance(angle, refractiveIndex).mean);
  return through(incidenceDeg) / through(0);
}

/**
 * Angle at which beam would pass the cover as the diffuse sky does: θ = 59.7 − 0.1388 β + 0.001497 β².
 * @param tiltDeg tilt of the collector [°] 0–90
 * @returns effective angle of sky diffuse [°]
 * @see Brandemuehl & Beckman, Solar Energy 24 (1980) 511; Duffie & Beckman, 4th ed. 2013, eq. 5.4.2
 */
export function skyEffectiveAngleDeg(tiltDeg: number): number {
  return 59.7 - 0.1388 * tiltDeg + 0.001497 * tiltDeg ** 2;
}

/**
 * Angle at which beam would pass the cover as ground reflection does: θ = 90 − 0.5788 β + 0.002693 β².
 * @param tiltDeg tilt of the collector [°] 0–90
 * @returns effective angle of ground-reflected sun [°]
 * @see Brandemuehl & Beckman, Solar Energy 24 (1980) 511; Duffie & Beckman, 4th ed. 2013, eq. 5.4.1
 */
export function groundEffectiveAngleDeg(tiltDeg: number): number {
  return 90 - 0.5788 * tiltDeg + 0.002693 * tiltDeg ** 2;
}
