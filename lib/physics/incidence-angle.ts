import { toRadians } from '@/lib/units/constants';

const TABLE_STEP_DEG = 10;
const HEMISPHERE_STEPS = 1800;

/**
 * Incidence-angle modifier of beam irradiance: K = 1 − b0 (1/cos θ − 1), not below 0.
 * @param b0 coefficient of the collector [-] −0.2–0.5, 0.05–0.2 for flat covers
 * @param cosIncidence cosine of the incidence angle [-] −1–1
 * @returns modifier [-] from 0; 0 when the sun stands behind the plane
 * @remarks above about 60° the form falls faster than real flat covers do, which costs little energy
 * @see Souka & Safwat, Solar Energy 10 (1966) 170; ISO 9806:2017, 24.2 (from memory)
 */
export function beamModifier(b0: number, cosIncidence: number): number {
  return cosIncidence > 0 ? Math.max(0, 1 - b0 * (1 / cosIncidence - 1)) : 0;
}

/**
 * Diffuse modifier that belongs to the b0 form: Kd = ∫K sin θ cos θ dθ / ∫ sin θ cos θ dθ = 1/(1 + b0).
 * @param b0 coefficient of the collector [-] 0–0.5
 * @returns diffuse modifier Kd [-]
 * @see isotropic hemisphere of the clamped b0 form; ISO 9806:2017 Annex B (from memory)
 */
export function diffuseModifierFromB0(b0: number): number {
  return 1 / (1 + b0);
}

/**
 * Modifier from a certificate's table at 0, 10, … 90°, straight lines between, clamped to the table's ends.
 * @param table ten modifiers from 0° to 90° in steps of 10° [-] 0–1.5
 * @param incidenceDeg incidence angle [°] 0–90
 * @returns modifier [-] from 0
 * @see ISO 9806:2017, 24.4, table of incidence-angle modifiers (from memory)
 */
export function modifierFromTable(table: readonly number[], incidenceDeg: number): number {
  const last = table.length - 1;
  const position = Math.min(last, Math.max(0, incidenceDeg / TABLE_STEP_DEG));
  const lower = Math.min(last - 1, Math.floor(position));
  const share = position - lower;
  return Math.max(0, table[lower]! * (1 - share) + table[lower + 1]! * share);
}

/**
 * Diffuse modifier of an isotropic hemisphere from a table of beam modifiers:
 * Kd = ∫K sin θ cos θ dθ / ∫ sin θ cos θ dθ.
 * @param table ten modifiers from 0° to 90° in steps of 10° [-] 0–1.5
 * @returns diffuse modifier Kd [-]
 * @see ISO 9806:2017 Annex B (from memory)
 */
export function diffuseModifierFromTable(table: readonly number[]): number {
  let weighted = 0;
  let weights = 0;
  for (let i = 0; i < HEMISPHERE_STEPS; i++) {
    const incidenceDeg = ((i + 0.5) * 90) / HEMISPHERE_STEPS;
    const weight = Math.sin(2 * toRadians(incidenceDeg));
    weighted += weight * modifierFromTable(table, incidenceDeg);
    weights += weight;
  }
  return weighted / weights;
}
