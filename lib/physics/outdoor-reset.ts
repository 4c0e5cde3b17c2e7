/** Supply by outdoor temperature, fixed by the design day. */
export interface HeatingCurve {
  /** set point of the room θi [°C] */
  roomC: number;
  /** θe,d [°C] */
  designOutdoorC: number;
  /** supply on the design day [°C] */
  designSupplyC: number;
  /** supply − return on the design day [K] */
  designSpreadK: number;
  /** exponent of the emitter's law: floor 1.1, radiator 1.3 [-] */
  exponent: number;
  /** limiter: never hotter than this [°C] */
  limitC: number;
}

/**
 * Share of the design load at an outdoor temperature: φ = (θi − θe)/(θi − θe,d), not below 0.
 * @param curve design day [°C]
 * @param outdoorC outdoor temperature [°C]
 * @returns share [-]; above 1 on days colder than the design day
 * @see EN 12831-1:2017, load proportional to the temperature difference
 */
export function loadShare(curve: HeatingCurve, outdoorC: number): number {
  return Math.max(0, (curve.roomC - outdoorC) / (curve.roomC - curve.designOutdoorC));
}

/**
 * Set supply of an outdoor reset: θV = θi + Δm φ^(1/n) + ½ Δw φ, limited. Δm is the mean excess and Δw the spread of
 * the design day.
 * @param curve design day, exponent [-] and limiter [°C]
 * @param outdoorC outdoor temperature [°C]
 * @returns set supply [°C], from the room's set point to the limiter
 * @see the emitter laws of EN 442-2 and EN 1264-2 solved for the mean water temperature
 */
export function resetSupplyC(curve: HeatingCurve, outdoorC: number): number {
  const share = loadShare(curve, outdoorC);
  const meanExcess = curve.designSupplyC - curve.designSpreadK / 2 - curve.roomC;
  const supply = curve.roomC + meanExcess * share ** (1 / curve.exponent) + (curve.designSpreadK / 2) * share;
  return Math.min(curve.limitC, supply);
}

/**
 * Return that belongs to the set supply at the design flow: θR = θV − Δw φ.
 * @param curve design day, exponent [-] and limiter [°C]
 * @param outdoorC outdoor temperature [°C]
 * @returns return temperature [°C], not below the room's set point
 * @see the emitter laws of EN 442-2 and EN 1264-2 solved for the mean water temperature
 */
export function resetReturnC(curve: HeatingCurve, outdoorC: number): number {
  const back = resetSupplyC(curve, outdoorC) - curve.designSpreadK * loadShare(curve, outdoorC);
  return Math.max(curve.roomC, back);
}
