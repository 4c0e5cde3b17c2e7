/**
 * Effectiveness of a counter-flow exchanger: ε = (1 − e^(−N(1−C)))/(1 − C e^(−N(1−C))); N/(1 + N) when balanced.
 * @param transferUnits N = UA/C_min [-] from 0
 * @param capacityRatio C = C_min/C_max [-] 0–1
 * @returns effectiveness [-] 0–1
 * @see Kays & London, Compact Heat Exchangers (from memory); effectiveness–NTU relations
 */
export function counterFlowEffectiveness(transferUnits: number, capacityRatio: number): number {
  if (1 - capacityRatio < 1e-9) return transferUnits / (1 + transferUnits);
  const decay = Math.exp(-transferUnits * (1 - capacityRatio));
  return (1 - decay) / (1 - capacityRatio * decay);
}

/**
 * Effectiveness of a parallel-flow exchanger: ε = (1 − e^(−N(1+C)))/(1 + C).
 * @param transferUnits N = UA/C_min [-] from 0
 * @param capacityRatio C = C_min/C_max [-] 0–1
 * @returns effectiveness [-] 0–1
 * @see Kays & London, Compact Heat Exchangers (from memory); effectiveness–NTU relations
 */
export function parallelFlowEffectiveness(transferUnits: number, capacityRatio: number): number {
  return (1 - Math.exp(-transferUnits * (1 + capacityRatio))) / (1 + capacityRatio);
}

/**
 * Effectiveness of a coil in a mixed store: ε = 1 − e^(−N).
 * @param transferUnits N = UA/(ṁ cp) of the coil [-] from 0
 * @returns effectiveness [-] 0–1
 * @see effectiveness–NTU relations with C = 0 (from memory)
 */
export function coilEffectiveness(transferUnits: number): number {
  return -Math.expm1(-transferUnits);
}

/**
 * Heat through an exchanger: Q = ε C_min (θ_hot − θ_cold), both at their inlets.
 * @param effectiveness ε [-] 0–1
 * @param leastCapacityFlowWPerK C_min [W/K] from 0
 * @param hotInC inlet of the warm side [°C]
 * @param coldInC inlet of the cold side [°C]
 * @returns heat [W]; 0 when nothing can flow from warm to cold
 * @see definition of effectiveness; Kays & London (from memory)
 */
export function exchangedHeatW(
  effectiveness: number,
  leastCapacityFlowWPerK: number,
  hotInC: number,
  coldInC: number,
): number {
  return effectiveness * leastCapacityFlowWPerK * Math.max(0, hotInC - coldInC);
}

/**
 * Penalty of an exchanger between collector and store: FR'/FR = 1/(1 + (A FR UL/Cc)(Cc/(ε C_min) − 1)).
 * @param lossWPerK A FR UL of the array [W/K] from 0
 * @param collectorCapacityFlow Cc [W/K] above 0
 * @param leastCapacityFlow C_min [W/K] above 0
 * @param effectiveness ε [-] 0–1
 * @returns factor [-] 0–1
 * @remarks a direct drain-back loop has no exchanger
 * @see de Winter, Solar Energy 17 (1975) 335; Duffie & Beckman, 4th ed. 2013, eq. 10.2.3
 */
export function collectorExchangerFactor(
  lossWPerK: number,
  collectorCapacityFlow: number,
  leastCapacityFlow: number,
  effectiveness: number,
): number {
  const penalty = collectorCapacityFlow / (effectiveness * leastCapacityFlow) - 1;
  return 1 / (1 + (lossWPerK / collectorCapacityFlow) * penalty);
}
