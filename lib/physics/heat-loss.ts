import { SECONDS_PER_HOUR } from '@/lib/units/constants';

/** Heat capacity of air by volume [J/(m³K)] (ISO 13790:2008, clause 9.3.1). */
const AIR_CAPACITY_J_PER_M3K = 1200;

/** A piece of the shell; for a thermal bridge the area is its length and U its ψ. */
export interface LossElement {
  areaM2: number;
  uWPerM2K: number;
  factor: number;
}

/**
 * Heat that one piece of the shell lets through per degree: H = A U b.
 * @param element area [m²] (length [m] of a bridge), U [W/(m²K)] (ψ [W/(m K)]), temperature factor b [-] 0–1.2
 * @returns transmission [W/K]
 * @see ISO 13789:2017, transmission heat transfer coefficient; EN 12831-1 for the factor
 */
export function elementLoss(element: LossElement): number {
  return element.areaM2 * element.uWPerM2K * element.factor;
}

/**
 * Heat that the exchange of air takes per degree: H = ρ c n V.
 * @param airChangePerH air change [1/h] 0.05–3
 * @param volumeM3 heated volume [m³]
 * @returns ventilation [W/K]
 * @see ISO 13790:2008, clause 9.3.1: ρ c = 1200 J/(m³K)
 */
export function airChangeLoss(airChangePerH: number, volumeM3: number): number {
  return (AIR_CAPACITY_J_PER_M3K * airChangePerH * volumeM3) / SECONDS_PER_HOUR;
}
