/** Sheet with tubes under it. */
export interface FinAndTube {
  /** distance of the tubes [m] */
  tubeSpacingM: number;
  /** outer diameter of the tubes [m] */
  tubeDiameterM: number;
  /** inner diameter of the tubes [m] */
  tubeBoreM: number;
  sheetThicknessM: number;
  /** [W/(m K)] */
  sheetConductivity: number;
  /** conductance of the bond per metre of tube, Infinity for a perfect one [W/(m K)] */
  bondWPerMK: number;
  /** from tube wall to fluid [W/(m²K)] */
  fluidFilmWPerM2K: number;
}

/**
 * Fin efficiency of the sheet between two tubes: F = tanh(x)/x, x = √(UL/(k δ)) (W − D)/2.
 * @param absorber sheet and tubes [m], [W/(m K)]
 * @param lossWPerM2K overall loss UL [W/(m²K)] above 0
 * @returns fin efficiency [-] 0–1
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 6.5.12
 */
export function finEfficiency(
  absorber: Pick<FinAndTube, 'tubeSpacingM' | 'tubeDiameterM' | 'sheetThicknessM' | 'sheetConductivity'>,
  lossWPerM2K: number,
): number {
  const m = Math.sqrt(lossWPerM2K / (absorber.sheetConductivity * absorber.sheetThicknessM));
  const x = (m * (absorber.tubeSpacingM - absorber.tubeDiameterM)) / 2;
  return x > 0 ? Math.tanh(x) / x : 1;
}

/**
 * Collector efficiency factor:
 * F' = (1/UL) / (W [1/(UL (D + (W − D) F)) + 1/Cb + 1/(π Di hf)]).
 * @param absorber sheet and tubes [m], [W/(m K)], [W/(m²K)]
 * @param lossWPerM2K overall loss UL [W/(m²K)] above 0
 * @returns F' [-] 0–1
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.5.18
 */
export function collectorEfficiencyFactor(absorber: FinAndTube, lossWPerM2K: number): number {
  const { tubeSpacingM: spacing, tubeDiameterM: diameter } = absorber;
  const collecting = diameter + (spacing - diameter) * finEfficiency(absorber, lossWPerM2K);
  const resistance =
    1 / (lossWPerM2K * collecting) +
    1 / absorber.bondWPerMK +
    1 / (Math.PI * absorber.tubeBoreM * absorber.fluidFilmWPerM2K);
  return 1 / (lossWPerM2K * spacing * resistance);
}

/**
 * Efficiency factor of a flat absorber wetted over its whole face: F' = 1/(1 + UL/hf).
 * @param lossWPerM2K overall loss UL [W/(m²K)] from 0
 * @param fluidFilmWPerM2K from plate to fluid, sheet included [W/(m²K)] above 0
 * @returns F' [-] 0–1
 * @see Duffie & Beckman, 4th ed. 2013, sec. 6.14
 */
export function wettedPlateFactor(lossWPerM2K: number, fluidFilmWPerM2K: number): number {
  return 1 / (1 + lossWPerM2K / fluidFilmWPerM2K);
}

/**
 * Collector flow factor: F'' = c (1 − e^(−1/c)), c = ṁ cp/(A UL F').
 * @param capacityFlowWPerM2K ṁ cp per area [W/(m²K)] above 0
 * @param lossWPerM2K overall loss UL [W/(m²K)] above 0
 * @param efficiencyFactor F' [-] 0–1
 * @returns F'' [-] 0–1
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.7.5
 */
export function collectorFlowFactor(
  capacityFlowWPerM2K: number,
  lossWPerM2K: number,
  efficiencyFactor: number,
): number {
  const c = capacityFlowWPerM2K / (lossWPerM2K * efficiencyFactor);
  return c * (1 - Math.exp(-1 / c));
}

/**
 * Heat removal factor: FR = F' F''.
 * @param capacityFlowWPerM2K ṁ cp per area [W/(m²K)] above 0
 * @param lossWPerM2K overall loss UL [W/(m²K)] above 0
 * @param efficiencyFactor F' [-] 0–1
 * @returns FR [-] 0–1
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.7.4
 */
export function heatRemovalFactor(
  capacityFlowWPerM2K: number,
  lossWPerM2K: number,
  efficiencyFactor: number,
): number {
  return efficiencyFactor * collectorFlowFactor(capacityFlowWPerM2K, lossWPerM2K, efficiencyFactor);
}

/**
 * Loss through the back and the edges per collector area: U = k/t_back + (k/t_edge) P h / A.
 * @param conductivity of the insulation [W/(m K)] 0.02–0.2
 * @param backThicknessM [m] above 0
 * @param edgeThicknessM [m] above 0
 * @param perimeterM of the collector [m]
 * @param boxHeightM height of the edge [m]
 * @param areaM2 of the collector [m²]
 * @returns { back, edge } losses [W/(m²K)]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.4.10–6.4.11
 */
export function backAndEdgeLoss(
  conductivity: number,
  backThicknessM: number,
  edgeThicknessM: number,
  perimeterM: number,
  boxHeightM: number,
  areaM2: number,
): { back: number; edge: number } {
  return {
    back: conductivity / backThicknessM,
    edge: ((conductivity / edgeThicknessM) * perimeterM * boxHeightM) / areaM2,
  };
}
