import { toDegrees, toRadians } from '@/lib/units/constants';

const TABLE_STEP_DEG = 10;
const HEMISPHERE_STEPS = 1800;
const PAIR_STEPS = 90;

/** How ribs, webs or tubes of a collector lie when it is mounted. */
export type Ribs = 'along the slope' | 'across the slope';

/** How the acceptance of beam irradiance falls with its angle. */
export type IncidenceModifier =
  /** by the curve's own b0 */
  | { kind: 'b0' }
  /** ten values at 0, 10 … 90° [-] */
  | { kind: 'table'; values: readonly number[] }
  /** ten values each, along and across ribs, webs or tubes [-] */
  | {
      kind: 'pair';
      longitudinal: readonly number[];
      transversal: readonly number[];
      ribs: Ribs;
    };

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

/**
 * Modifier of a ribbed collector from its two tables: K = K_L(θL) K_T(θT).
 * @param pair tables from 0° to 90° in steps of 10° [-] 0–1.5, and how the ribs lie
 * @param upSlopeDeg incidence angle in the plane up the slope [°] 0–90
 * @param acrossDeg incidence angle in the plane across the slope [°] 0–90
 * @returns modifier [-] from 0
 * @remarks the longitudinal plane holds the ribs; the product is exact only in the two planes themselves
 * @see ISO 9806:2017, incidence-angle modifier of collectors with two axes (from memory)
 */
export function modifierFromPair(
  pair: Extract<IncidenceModifier, { kind: 'pair' }>,
  upSlopeDeg: number,
  acrossDeg: number,
): number {
  const upright = pair.ribs === 'along the slope';
  const longitudinalDeg = upright ? upSlopeDeg : acrossDeg;
  const transversalDeg = upright ? acrossDeg : upSlopeDeg;
  return (
    modifierFromTable(pair.longitudinal, longitudinalDeg) *
    modifierFromTable(pair.transversal, transversalDeg)
  );
}

/**
 * Diffuse modifier of an isotropic hemisphere from the two tables of a ribbed collector: mean of K_L K_T over the
 * hemisphere, weighted with cos θ.
 * @param longitudinal ten modifiers from 0° to 90° in steps of 10° [-] 0–1.5
 * @param transversal likewise [-] 0–1.5
 * @returns diffuse modifier Kd [-]
 * @see ISO 9806:2017 Annex B (from memory), with the product of both tables
 */
export function diffuseModifierFromPair(
  longitudinal: readonly number[],
  transversal: readonly number[],
): number {
  let weighted = 0;
  let weights = 0;
  for (let i = 0; i < PAIR_STEPS; i++) {
    const incidence = toRadians(((i + 0.5) * 90) / PAIR_STEPS);
    const weight = Math.sin(2 * incidence);
    for (let j = 0; j < PAIR_STEPS; j++) {
      const turn = toRadians(((j + 0.5) * 90) / PAIR_STEPS);
      const along = toDegrees(Math.atan(Math.tan(incidence) * Math.cos(turn)));
      const across = toDegrees(Math.atan(Math.tan(incidence) * Math.sin(turn)));
      weighted += weight * modifierFromTable(longitudinal, along) * modifierFromTable(transversal, across);
      weights += weight;
    }
  }
  return weighted / weights;
}
