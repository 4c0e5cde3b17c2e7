/** Heat that a cubic metre of exchanged air carries per kelvin [Wh/(m³K)]. */
export const AIR_HEAT_WH_PER_M3K = 0.34;

/** Least air change for hygiene [1/h]; local rules prevail. */
export const HYGIENIC_AIR_CHANGE_PER_H = 0.5;

/** A part of the shell. */
export interface ShellPart {
  areaM2: number;
  uWPerM2K: number;
  /** temperature correction, 1 to outdoor air [-] */
  factor: number;
}

/**
 * Transmission of a shell: H = Σ f U A.
 * @param parts areas [m²], U-values [W/(m²K)], temperature corrections [-]
 * @returns transmission coefficient [W/K]
 * @see EN 12831-1:2017, 6.3 (simplified; from memory)
 */
export function transmissionWPerK(parts: readonly ShellPart[]): number {
  return parts.reduce((sum, part) => sum + part.areaM2 * part.uWPerM2K * part.factor, 0);
}

/**
 * Ventilation: H = 0.34 n V.
 * @param airChangePerH n [1/h] from 0
 * @param volumeM3 V of the heated air [m³] from 0
 * @returns ventilation coefficient [W/K]
 * @see EN 12831-1:2017, 6.3.3; 0.34 Wh/(m³K) (from memory)
 */
export function ventilationWPerK(airChangePerH: number, volumeM3: number): number {
  return AIR_HEAT_WH_PER_M3K * airChangePerH * volumeM3;
}

/**
 * Infiltration from a pressure test: n = n50/20.
 * @param n50PerH air change at 50 Pa [1/h] 0.3–15
 * @returns air change in use [1/h]
 * @see rule of thumb of airtightness tests; EN 12831-1:2017 (from memory)
 */
export function infiltrationPerH(n50PerH: number): number {
  return n50PerH / 20;
}

/**
 * Air change that counts: the larger of hygiene and infiltration.
 * @param n50PerH air change at 50 Pa [1/h] 0.3–15
 * @returns air change [1/h]
 * @see EN 12831-1:2017 (from memory)
 */
export function airChangePerH(n50PerH: number): number {
  return Math.max(HYGIENIC_AIR_CHANGE_PER_H, infiltrationPerH(n50PerH));
}

/**
 * Design heat load: Φ = H (θi − θe).
 * @param lossWPerK H, transmission and ventilation [W/K]
 * @param roomC θi [°C]
 * @param outdoorC design outdoor temperature θe [°C]
 * @returns load [W]
 * @remarks simplified form without reheat: the backup is sized by a licensed designer
 * @see EN 12831-1:2017, simplified method (from memory)
 */
export function designHeatLoadW(lossWPerK: number, roomC: number, outdoorC: number): number {
  return lossWPerK * Math.max(0, roomC - outdoorC);
}
