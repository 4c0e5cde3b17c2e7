/** Mean excess of the rating 75/65/20 °C [K]. */
export const RATED_EXCESS_K = 50;

const MOST_ROUNDS = 30;

/**
 * Output of a radiator against its rating: (ΔT/50 K)^n.
 * @param excessK mean excess of the water over the room [K] from 0
 * @param exponent n of the type [-] 1.0–1.4, 1.3 for panels
 * @returns factor on the rated output [-]; 0 for no excess
 * @see EN 442-2:2014, characteristic equation Φ = K_M ΔT^n
 */
export function radiatorFactor(excessK: number, exponent: number): number {
  return excessK > 0 ? (excessK / RATED_EXCESS_K) ** exponent : 0;
}

/**
 * Rating at 75/65/20 °C from an output stated at other temperatures: Φ50 = Φ (50/ΔT)^n.
 * @param outputW stated output [W]
 * @param supplyC stated supply [°C]
 * @param returnC stated return [°C]
 * @param roomC stated room [°C]
 * @param exponent n of the type [-] 1.0–1.4
 * @returns rated output [W]
 * @see EN 442-2:2014
 */
export function ratedOutput(
  outputW: number,
  supplyC: number,
  returnC: number,
  roomC: number,
  exponent: number,
): number {
  return outputW / radiatorFactor(arithmeticExcess(supplyC, returnC, roomC), exponent);
}

/**
 * Arithmetic mean excess: (θV + θR)/2 − θi.
 * @param supplyC θV [°C]
 * @param returnC θR [°C]
 * @param roomC θi [°C]
 * @returns excess [K]
 * @see EN 442-2:2014: the rating's excess of 50 K is arithmetic
 */
export function arithmeticExcess(supplyC: number, returnC: number, roomC: number): number {
  return (supplyC + returnC) / 2 - roomC;
}

/**
 * Heat of a radiator at its supply and flow: the mean excess x that solves Φ50 (x/50)^n = 2 C (θV − θi − x),
 * by Newton's rule from the right, where the sum of both sides is monotone and convex.
 * @param ratedW rated output at 75/65/20 °C Φ50 [W] from 0
 * @param exponent n [-] 1–1.4
 * @param supplyC θV [°C]
 * @param capacityFlowWPerK C = ṁ cp [W/K] from 0
 * @param roomC θi [°C]
 * @returns heat to the room [W]; 0 when the supply is not above the room
 * @remarks arithmetic mean excess also at wide spreads, where the logarithmic mean would give less; never more than
 * what cools the water to the room, which the arithmetic mean would allow where the flow is small for the radiator
 * @see EN 442-2:2014; energy balance of the water
 */
export function radiatorHeat(
  ratedW: number,
  exponent: number,
  supplyC: number,
  capacityFlowWPerK: number,
  roomC: number,
): number {
  const most = supplyC - roomC;
  if (!(most > 0 && capacityFlowWPerK > 0 && ratedW > 0)) return 0;
  const carry = 2 * capacityFlowWPerK;
  let excess = most;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const output = ratedW * (excess / RATED_EXCESS_K) ** exponent;
    const change = (output - carry * (most - excess)) / ((exponent * output) / excess + carry);
    excess -= change;
    if (change < 1e-10 * most) break;
  }
  return Math.min(ratedW * (excess / RATED_EXCESS_K) ** exponent, capacityFlowWPerK * most);
}

/**
 * Return temperature of a loop: θR = θV − Φ/C.
 * @param supplyC θV [°C]
 * @param heatW Φ [W]
 * @param capacityFlowWPerK C = ṁ cp [W/K] above 0
 * @returns return temperature [°C]
 * @see energy balance of the water, EN 442-2:2014
 */
export function loopReturnC(supplyC: number, heatW: number, capacityFlowWPerK: number): number {
  return supplyC - heatW / capacityFlowWPerK;
}

/**
 * Water flow for a heat and a spread: ṁ = Φ/(cp ΔT).
 * @param heatW Φ [W]
 * @param spreadK supply − return [K] above 0
 * @param specificHeat of the water [J/(kg K)]
 * @returns mass flow [kg/s]
 * @see energy balance of the water, EN 1264-3
 */
export function loopFlow(heatW: number, spreadK: number, specificHeat: number): number {
  return heatW / (specificHeat * spreadK);
}
