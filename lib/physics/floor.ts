import { MM_PER_M } from '@/lib/units/constants';

/** Surface film of a heated floor that EN 1264 puts into K_H, convection and radiation [W/(m²K)]. */
export const FLOOR_FILM_W_PER_M2K = 10.8;

/** Surface temperatures and heat flows that EN 1264 allows. */
export const FLOOR_LIMITS = {
  /** occupied zone [°C] */
  occupiedC: 29,
  /** edge strip up to 1 m wide [°C] */
  edgeC: 35,
  /** bath: room temperature plus 9 K [K] */
  bathExcessK: 9,
  /** heat flow at 9 K and 15 K of excess [W/m²] */
  occupiedWm2: 100,
  edgeWm2: 175,
} as const;

const TYPE_A_B = 6.7;
const REFERENCE_SCREED_M = 0.045;
const REFERENCE_SPACING_M = 0.075;
/** a_T of type A at R_λ,B = 0, 0.05, 0.10, 0.15 m²K/W */
const SPACING_FACTORS = [1.23, 1.188, 1.156, 1.134];
const COVERING_STEP = 0.05;
const LEAST_EXCESS_K = 0.5;

/**
 * Heat from a floor surface: q = 8.92 (θF,m − θi)^1.1.
 * @param excessK mean surface − room [K] 0–20
 * @returns heat flow [W/m²]
 * @see EN 1264-2:2008, 6, basic characteristic curve
 */
export function floorSurfaceHeat(excessK: number): number {
  return 8.92 * Math.max(0, excessK) ** 1.1;
}

/**
 * Mean surface excess for a heat flow, the characteristic inverted: ΔT = (q/8.92)^(1/1.1).
 * @param heatWm2 heat flow [W/m²] from 0
 * @returns mean surface − room [K]
 * @see EN 1264-2:2008, 6
 */
export function floorSurfaceExcess(heatWm2: number): number {
  return (Math.max(0, heatWm2) / 8.92) ** (1 / 1.1);
}

/**
 * Surface coefficient of the floor's law: h = 8.92 max(|ΔT|, 0.5 K)^0.1.
 * @param excessK surface − room [K]
 * @returns coefficient, convection and radiation [W/(m²K)]
 * @remarks below 0.5 K the coefficient is held, so that it never vanishes
 * @see EN 1264-2:2008, 6; the bound at 0.5 K is an own choice
 */
export function floorSurfaceCoefficient(excessK: number): number {
  return 8.92 * Math.max(Math.abs(excessK), LEAST_EXCESS_K) ** 0.1;
}

/**
 * Equivalent conductance of a wet floor, type A: K_H = B a_B a_T^(1 − T/0.075), B = 6.7 W/m²K,
 * a_B = (1/10.8 + 0.045)/(1/10.8 + s_u/λ_E + R_λ,B).
 * @param spacingMm pipe spacing T [mm] 50–375
 * @param screedMm screed above the pipes s_u [mm] 30–80
 * @param screedConductivity λ_E [W/(m K)] 0.8–2
 * @param coveringM2KPerW resistance of the covering R_λ,B [m²K/W] 0–0.15
 * @returns K_H [W/(m²K)]
 * @remarks pipe 20 mm; a screed other than 45 mm enters through s_u/λ_E, not through the standard's a_U
 * (difference about 1 % at 65 mm)
 * @see EN 1264-2:2008, 6 and Table A.1 (from memory)
 */
export function floorConductance(
  spacingMm: number,
  screedMm: number,
  screedConductivity: number,
  coveringM2KPerW: number,
): number {
  const film = 1 / FLOOR_FILM_W_PER_M2K;
  const covering =
    (film + REFERENCE_SCREED_M) / (film + screedMm / MM_PER_M / screedConductivity + coveringM2KPerW);
  const exponent = 1 - spacingMm / MM_PER_M / REFERENCE_SPACING_M;
  return TYPE_A_B * covering * spacingFactor(coveringM2KPerW) ** exponent;
}

function spacingFactor(coveringM2KPerW: number): number {
  const last = SPACING_FACTORS.length - 1;
  const position = Math.min(last, Math.max(0, coveringM2KPerW / COVERING_STEP));
  const lower = Math.min(last - 1, Math.floor(position));
  const share = position - lower;
  return SPACING_FACTORS[lower]! * (1 - share) + SPACING_FACTORS[lower + 1]! * share;
}

/**
 * Logarithmic excess of the heating water: ΔθH = (θV − θR)/ln((θV − θi)/(θR − θi)).
 * @param supplyC θV [°C]
 * @param returnC θR [°C]
 * @param roomC θi [°C]
 * @returns excess [K]; 0 when the return is not above the room
 * @see EN 1264-2:2008, eq. 1; EN 442-2
 */
export function logarithmicExcess(supplyC: number, returnC: number, roomC: number): number {
  const supply = supplyC - roomC;
  const back = returnC - roomC;
  if (!(back > 0 && supply > 0)) return 0;
  const ratio = supply / back;
  return Math.abs(ratio - 1) < 1e-9 ? back : (supply - back) / Math.log(ratio);
}

/**
 * Water to slab, the film taken out of K_H: U = 1/(1/K_H − 1/10.8).
 * @param conductance K_H [W/(m²K)] below 10.8
 * @returns conductance from mean water to slab surface [W/(m²K)]
 * @see EN 1264-2:2008, 6: K_H holds the film of 10.8 W/(m²K)
 */
export function waterToSlabConductance(conductance: number): number {
  return 1 / (1 / conductance - 1 / FLOOR_FILM_W_PER_M2K);
}

/**
 * Supply to slab for a water flow, so that supply, slab and room in series carry in steady state what
 * q = K_H ΔθH gives at whatever spread: G = 1/(1/(C (1 − e^(−K_H A/C))) − 1/(10.8 A)).
 * @param areaM2 heated floor [m²] above 0
 * @param conductance K_H [W/(m²K)] below 10.8
 * @param capacityFlowWPerK C = ṁ cp of the loop [W/K] above 0
 * @returns conductance from supply temperature to slab surface [W/K]
 * @remarks exact with the film fixed at 10.8; with the film by its law −7…+2 % between 20 and 100 W/m²
 * @see EN 1264-2:2008, 6 and eq. 1: logarithmic excess integrated along the loop
 */
export function supplyToSlabConductance(
  areaM2: number,
  conductance: number,
  capacityFlowWPerK: number,
): number {
  const toRoom = capacityFlowWPerK * -Math.expm1((-conductance * areaM2) / capacityFlowWPerK);
  return 1 / (1 / toRoom - 1 / (FLOOR_FILM_W_PER_M2K * areaM2));
}

/**
 * Heat that a slab or screed holds per kelvin: C = d ρ c.
 * @param thicknessMm d [mm] 20–300
 * @param densityKgPerM3 ρ [kg/m³]
 * @param specificHeat c [J/(kg K)]
 * @returns capacity [J/(m²K)]
 * @see ISO 13786:2017, thin-layer limit
 */
export function slabCapacity(thicknessMm: number, densityKgPerM3 = 2000, specificHeat = 1000): number {
  return (thicknessMm / MM_PER_M) * densityKgPerM3 * specificHeat;
}
