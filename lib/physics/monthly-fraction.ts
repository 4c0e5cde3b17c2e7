/**
 * The monthly correlation of Klein, Beckman and Duffie (1976) for liquid-based space heating: a second opinion on
 * a year, made from twelve months of radiation, temperature and load. It describes its own standard system (store
 * of 75 L/m², load exchanger ε C = 2 UA, backup beside the sun) and not the drain-back loop of this product.
 */

/** Reference temperature of the loss ratio [°C]. */
const REFERENCE_C = 100;
const STANDARD_STORE_L_PER_M2 = 75;
/** Loss ratio at which the polynomial stops falling [-]. */
const LARGEST_LOSS_RATIO = 18;

/**
 * Part of a month's load that the sun carries:
 * f = 1.029 Y − 0.065 X − 0.245 Y² + 0.0018 X² + 0.0215 Y³, held to 0–1.
 * @param lossRatio X [-] 0–18; held to 18, where the polynomial would begin to rise
 * @param gainRatio Y [-] 0–3
 * @returns monthly fraction f [-] 0–1
 * @remarks annual fraction = Σ f Q / Σ Q over the months; its standard error against hourly simulation at five
 * sites is 0.014 (MIL-HDBK-1003/13A, sec. 3.0)
 * @see Klein, Beckman & Duffie, Solar Energy 18 (1976) 113; EN 15316-4-3 method B
 */
export function monthlyFraction(lossRatio: number, gainRatio: number): number {
  const x = Math.min(LARGEST_LOSS_RATIO, lossRatio);
  const y = gainRatio;
  const f = 1.029 * y - 0.065 * x - 0.245 * y * y + 0.0018 * x * x + 0.0215 * y * y * y;
  return Math.min(1, Math.max(0, f));
}

/**
 * Loss ratio of a month: X = A FR UL (100 − θa) Δt / Q.
 * @param lossWPerK A FR UL, exchanger factor included [W/K] from 0
 * @param airC monthly mean air temperature θa [°C]
 * @param seconds length of the month Δt [s]
 * @param loadJ load of the month Q [J] above 0
 * @returns X [-]
 * @see Klein, Beckman & Duffie, Solar Energy 18 (1976) 113; Duffie & Beckman, 4th ed. 2013, ch. 20
 */
export function lossRatio(lossWPerK: number, airC: number, seconds: number, loadJ: number): number {
  return (lossWPerK * (REFERENCE_C - airC) * seconds) / loadJ;
}

/**
 * Gain ratio of a month: Y = A FR(τα) H / Q.
 * @param absorbedJPerM2 FR(τα) H, incidence modifier and exchanger factor included [J/m²] from 0
 * @param areaM2 A [m²] from 0
 * @param loadJ load of the month Q [J] above 0
 * @returns Y [-]
 * @see Klein, Beckman & Duffie, Solar Energy 18 (1976) 113; Duffie & Beckman, 4th ed. 2013, ch. 20
 */
export function gainRatio(absorbedJPerM2: number, areaM2: number, loadJ: number): number {
  return (absorbedJPerM2 * areaM2) / loadJ;
}

/**
 * Factor on X for another store: (v/75)^−0.25.
 * @param litresPerM2 store per collector area v [L/m²] 37.5–300
 * @returns factor [-]
 * @see Duffie & Beckman, 4th ed. 2013, ch. 20; EN 15316-4-3 method B
 */
export function storageCorrection(litresPerM2: number): number {
  return (litresPerM2 / STANDARD_STORE_L_PER_M2) ** -0.25;
}

/**
 * Factor on Y for another load exchanger: 0.39 + 0.65 e^(−0.139/Z), Z = ε C_min / UA.
 * @param exchangerRatio Z [-] 0.5–50
 * @returns factor [-]; about 1 at Z = 2
 * @see Duffie & Beckman, 4th ed. 2013, ch. 20
 */
export function loadExchangerCorrection(exchangerRatio: number): number {
  return 0.39 + 0.65 * Math.exp(-0.139 / exchangerRatio);
}

/**
 * Factor on X where the load is hot water only: (11.6 + 1.18 θw + 3.86 θm − 2.32 θa)/(100 − θa).
 * @param waterC hot water θw [°C] 50–70
 * @param mainsC cold water θm [°C] 5–25
 * @param airC monthly mean air temperature θa [°C]
 * @returns factor [-]
 * @see Duffie & Beckman, 4th ed. 2013, ch. 20
 */
export function waterHeatingCorrection(waterC: number, mainsC: number, airC: number): number {
  return (11.6 + 1.18 * waterC + 3.86 * mainsC - 2.32 * airC) / (REFERENCE_C - airC);
}
