import { STEFAN_BOLTZMANN, toKelvin } from '@/lib/units/constants';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K } from './water';

/** Coefficients of the efficiency curve of ISO 9806:2017 per square metre of one stated area. */
export interface CurveCoefficients {
  /** η0,b [-] */
  eta0Beam: number;
  /** Kd [-] */
  diffuseModifier: number;
  /** a1 at 3 m/s [W/(m²K)] */
  a1: number;
  /** a2 [W/(m²K²)] */
  a2: number;
  /** a3 [J/(m³K)] */
  a3: number;
  /** a4 [-] */
  a4: number;
  /** a6 [s/m] */
  a6: number;
  /** a7 [s/m] */
  a7?: number;
  /** a8 [W/(m²K⁴)] */
  a8?: number;
}

/** What the weather does to the collector in one instant. */
export interface CollectorSurroundings {
  /** beam irradiance on the plane [W/m²] */
  beamWm2: number;
  /** incidence-angle modifier of the beam [-] */
  beamModifier: number;
  /** diffuse and reflected irradiance on the plane [W/m²] */
  diffuseWm2: number;
  airC: number;
  /** wind at the collector [m/s] */
  windMPerS: number;
  /** long-wave irradiance in the plane of the collector [W/m²] */
  longwaveWm2: number;
}

/** Wind at which a1 of ISO 9806:2017 stands [m/s]. */
export const REFERENCE_WIND_M_PER_S = 3;
/** Share of beam in the hemispherical irradiance of ISO 9806:2017 [-]. */
export const REFERENCE_BEAM_SHARE = 0.85;
/** Irradiance and air of the standard stagnation temperature of ISO 9806:2017 [W/m²], [°C]. */
export const STAGNATION_IRRADIANCE_WM2 = 1000;
export const STAGNATION_AIR_C = 30;

const LEAST_SHARE_OF_A1 = 0.3;
/** Excess of a low-temperature collector over outdoor air at which the folded a8 loses what it should [K]. */
const FOLD_EXCESS_K = 40;

/**
 * Linear loss at the wind of the hour: a1 + a3 (u − 3), not below 0.3 a1.
 * @param a1 loss at 3 m/s [W/(m²K)] 0.5–30
 * @param a3 wind dependence [J/(m³K)] 0–5
 * @param windMPerS wind at the collector [m/s] from 0
 * @returns linear loss [W/(m²K)]
 * @remarks the lower bound is the product's own choice: a curve tested at 2–4 m/s says nothing of a calm night
 * @see ISO 9806:2017, 23 (from memory): reduced wind u' = u − 3 m/s
 */
export function linearLoss(a1: number, a3: number, windMPerS: number): number {
  return Math.max(LEAST_SHARE_OF_A1 * a1, a1 + a3 * (windMPerS - REFERENCE_WIND_M_PER_S));
}

/**
 * Quadratic loss with the fourth-power term folded in: a2 + a8 Δr², Δr = 40 K.
 * @param a2 quadratic loss [W/(m²K²)] from 0
 * @param a8 fourth-power loss [W/(m²K⁴)] 0–1e-6; 0 for nearly all collectors below 100 °C
 * @returns quadratic loss that loses the same at an excess of 40 K [W/(m²K²)]
 * @remarks The year follows the exact root of a quadratic, in which Δ⁴ has no place. The fold errs by
 *   a8 Δ² (Δr² − Δ²): at most 0.25 a8 Δr⁴ too much below 40 K (0.006 W/m² for a8 = 1e-8), and too little above
 *   (0.3 W/m² at 80 K). `steadyPower` takes the term as it stands.
 * @see ISO 9806:2017, 23, quasi-dynamic equation (from memory); the fold is the product's own
 */
export function quadraticLoss(a2: number, a8: number): number {
  return a2 + a8 * FOLD_EXCESS_K ** 2;
}

/**
 * Sun that the curve turns into heat before losses: η0,b (Kb Gb + Kd Gd) − a6 u' G.
 * @param curve coefficients [-], [s/m]
 * @param at surroundings of the instant [W/m²], [m/s]
 * @returns optical gain [W/m²] from 0
 * @see ISO 9806:2017, 23, quasi-dynamic equation (from memory)
 */
export function opticalGain(curve: CurveCoefficients, at: CollectorSurroundings): number {
  const reducedWind = at.windMPerS - REFERENCE_WIND_M_PER_S;
  const taken = curve.eta0Beam * (at.beamModifier * at.beamWm2 + curve.diffuseModifier * at.diffuseWm2);
  return Math.max(0, taken - curve.a6 * reducedWind * (at.beamWm2 + at.diffuseWm2));
}

/**
 * Steady power per square metre at a mean fluid temperature:
 * q = η0,b(Kb Gb + Kd Gd) − a1 Δ − a2 Δ|Δ| − a3 u'Δ − a6 u'G + (a4 − a7 u')(EL − σTa⁴) − a8 Δ⁴, Δ = Tm − Ta.
 * @param curve coefficients [-], [W/(m²K)], [W/(m²K²)], [J/(m³K)], [s/m]
 * @param fluidC mean fluid temperature [°C] 0–150
 * @param at surroundings of the instant [W/m²], [°C], [m/s]
 * @returns power per area of the curve's basis [W/m²]; negative when the collector loses
 * @remarks Δ < 0 lies outside the tests a curve comes from: extrapolated with the sign of the loss turned
 * @see ISO 9806:2017, 23, quasi-dynamic equation (from memory)
 */
export function steadyPower(curve: CurveCoefficients, fluidC: number, at: CollectorSurroundings): number {
  const delta = fluidC - at.airC;
  const reducedWind = at.windMPerS - REFERENCE_WIND_M_PER_S;
  const netLongwave = at.longwaveWm2 - STEFAN_BOLTZMANN * toKelvin(at.airC) ** 4;
  return (
    opticalGain(curve, at) -
    linearLoss(curve.a1, curve.a3, at.windMPerS) * delta -
    curve.a2 * delta * Math.abs(delta) +
    (curve.a4 - (curve.a7 ?? 0) * reducedWind) * netLongwave -
    (curve.a8 ?? 0) * delta ** 3 * Math.abs(delta)
  );
}

/**
 * Efficiency at an irradiance by the three-term curve: η = η0 − a1 Δ/G − a2 Δ²/G.
 * @param eta0 efficiency without loss [-] 0–1
 * @param a1 linear loss [W/(m²K)] 0–30
 * @param a2 quadratic loss [W/(m²K²)] 0–0.1
 * @param deltaK mean fluid temperature − air [K] from 0
 * @param irradianceWm2 irradiance on the plane [W/m²] above 0
 * @returns efficiency [-]; negative beyond the root
 * @see EN 12975-2:2006, 6.1.4.8 (from memory)
 */
export function efficiency(
  eta0: number,
  a1: number,
  a2: number,
  deltaK: number,
  irradianceWm2: number,
): number {
  return eta0 - (a1 * deltaK + a2 * deltaK * Math.abs(deltaK)) / irradianceWm2;
}

/**
 * Hemispherical from beam efficiency at 85 % beam: η0,hem = η0,b (0.85 + 0.15 Kd).
 * @param eta0Beam beam efficiency [-] 0–1
 * @param diffuseModifier Kd [-] 0–1.2
 * @returns hemispherical efficiency [-]
 * @see ISO 9806:2017 Annex B
 */
export function hemisphericalEfficiency(eta0Beam: number, diffuseModifier: number): number {
  return eta0Beam * (REFERENCE_BEAM_SHARE + (1 - REFERENCE_BEAM_SHARE) * diffuseModifier);
}

/**
 * Beam from hemispherical efficiency at 85 % beam: η0,b = η0,hem / (0.85 + 0.15 Kd).
 * @param eta0Hemispherical hemispherical efficiency [-] 0–1
 * @param diffuseModifier Kd [-] 0–1.2
 * @returns beam efficiency [-]
 * @see ISO 9806:2017 Annex B
 */
export function beamEfficiency(eta0Hemispherical: number, diffuseModifier: number): number {
  return eta0Hemispherical / (REFERENCE_BEAM_SHARE + (1 - REFERENCE_BEAM_SHARE) * diffuseModifier);
}

/**
 * The same collector on another area: every coefficient times A_from/A_to, so that power stays. Modifiers stay.
 * @param curve coefficients per square metre of the old area [-], [W/(m²K)]
 * @param fromM2 area they refer to [m²] above 0
 * @param toM2 area wanted [m²] above 0
 * @returns coefficients per square metre of the new area [-], [W/(m²K)]
 * @see ISO 9806:2017, 3 and 26: gross area; EN 12975-2:2006: aperture or absorber area (from memory)
 */
export function toAreaBasis(curve: CurveCoefficients, fromM2: number, toM2: number): CurveCoefficients {
  const share = fromM2 / toM2;
  return {
    eta0Beam: curve.eta0Beam * share,
    diffuseModifier: curve.diffuseModifier,
    a1: curve.a1 * share,
    a2: curve.a2 * share,
    a3: curve.a3 * share,
    a4: curve.a4 * share,
    a6: curve.a6 * share,
    a7: (curve.a7 ?? 0) * share,
    a8: (curve.a8 ?? 0) * share,
  };
}

/**
 * Glazed collector tested to EN 12975-2 or ISO 9806:2013, whose wind terms start at 0 m/s, in the form of 2017:
 * η0,b = η0 − 3 c6, a1 = c1 + 3 c3, a2 = c2, a3 = c3, a4 = c4, a6 = c6.
 * @param old coefficients of the old form [-], [W/(m²K)], [W/(m²K²)], [J/(m³K)], [s/m]
 * @returns coefficients of ISO 9806:2017 [-], [W/(m²K)], [W/(m²K²)], [J/(m³K)], [s/m]
 * @see ISO 9806:2017 Annex B; EN 12975-2:2006, 6.3 (from memory)
 */
export function fromEn12975Glazed(old: {
  eta0: number;
  diffuseModifier: number;
  c1: number;
  c2: number;
  c3: number;
  c4: number;
  c6: number;
}): CurveCoefficients {
  return {
    eta0Beam: old.eta0 - REFERENCE_WIND_M_PER_S * old.c6,
    diffuseModifier: old.diffuseModifier,
    a1: old.c1 + REFERENCE_WIND_M_PER_S * old.c3,
    a2: old.c2,
    a3: old.c3,
    a4: old.c4,
    a6: old.c6,
  };
}

/**
 * Unglazed collector, q = η0 (1 − bu u)(G + (ε/α)(EL − σTa⁴)) − (b1 + b2 u) Δ, in the form of ISO 9806:2017.
 * @param old η0 [-], bu [s/m], b1 [W/(m²K)], b2 [J/(m³K)], ε/α [-]
 * @returns coefficients of ISO 9806:2017 [-], [W/(m²K)], [J/(m³K)], [s/m]
 * @remarks an identity: both forms give the same power at any wind
 * @see EN 12975-2:2006, 6.2 and ISO 9806:2017 Annex B (from memory)
 */
export function fromEn12975Unglazed(old: {
  eta0: number;
  bu: number;
  b1: number;
  b2: number;
  epsilonPerAlpha: number;
}): CurveCoefficients {
  const calm = old.eta0 * (1 - REFERENCE_WIND_M_PER_S * old.bu);
  return {
    eta0Beam: calm,
    diffuseModifier: 1,
    a1: old.b1 + REFERENCE_WIND_M_PER_S * old.b2,
    a2: 0,
    a3: old.b2,
    a4: calm * old.epsilonPerAlpha,
    a6: old.eta0 * old.bu,
    a7: old.eta0 * old.bu * old.epsilonPerAlpha,
  };
}

/**
 * Mean-fluid form turned into inlet form: FR(τα) = η0/(1 + K/2), FR UL = UL/(1 + K/2), K = UL/(ṁ cp).
 * @param eta0 efficiency on the mean fluid temperature [-] 0–1
 * @param lossWPerM2K linear loss on the mean fluid temperature [W/(m²K)] 0–30
 * @param flowKgPerSM2 specific mass flow [kg/(s m²)] above 0
 * @param specificHeat of the fluid [J/(kg K)]
 * @returns { frTauAlpha [-], frUl [W/(m²K)] }
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 6.19
 */
export function inletForm(
  eta0: number,
  lossWPerM2K: number,
  flowKgPerSM2: number,
  specificHeat = WATER_SPECIFIC_HEAT_J_PER_KG_K,
): { frTauAlpha: number; frUl: number } {
  const factor = 1 / (1 + lossWPerM2K / (2 * flowKgPerSM2 * specificHeat));
  return { frTauAlpha: eta0 * factor, frUl: lossWPerM2K * factor };
}

/**
 * F'UL from a test in inlet form: F'UL = −g cp ln(1 − FR UL/(g cp)).
 * @param frUl loss in inlet form [W/(m²K)] below g cp
 * @param flowKgPerSM2 specific mass flow of the test [kg/(s m²)] above 0
 * @param specificHeat of the fluid [J/(kg K)]
 * @returns F'UL [W/(m²K)]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.20.4
 */
export function plateLossFromTest(
  frUl: number,
  flowKgPerSM2: number,
  specificHeat = WATER_SPECIFIC_HEAT_J_PER_KG_K,
): number {
  const capacityFlow = flowKgPerSM2 * specificHeat;
  return -capacityFlow * Math.log(1 - frUl / capacityFlow);
}

/**
 * Factor on FR(τα) and FR UL when a collector runs at another flow than in its test:
 * r = g_use (1 − e^(−F'UL/(g_use cp))) / (g_test (1 − e^(−F'UL/(g_test cp)))).
 * @param plateLoss F'UL [W/(m²K)]
 * @param testFlowKgPerSM2 specific mass flow of the test [kg/(s m²)] above 0
 * @param flowKgPerSM2 specific mass flow in use [kg/(s m²)] above 0
 * @param specificHeat of the fluid [J/(kg K)]
 * @returns factor [-]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 6.20.1–6.20.3
 */
export function flowFactorRatio(
  plateLoss: number,
  testFlowKgPerSM2: number,
  flowKgPerSM2: number,
  specificHeat = WATER_SPECIFIC_HEAT_J_PER_KG_K,
): number {
  const heatRemoved = (flow: number) =>
    flow * specificHeat * (1 - Math.exp(-plateLoss / (flow * specificHeat)));
  return heatRemoved(flowKgPerSM2) / heatRemoved(testFlowKgPerSM2);
}

/**
 * Root of a fitted efficiency curve: the temperature at which a1 Δ + a2 Δ² eats the optical gain.
 * @param opticalGainWm2 η0 G [W/m²] from 0
 * @param a1 linear loss [W/(m²K)] above 0
 * @param a2 quadratic loss [W/(m²K²)] from 0
 * @param airC air temperature [°C]
 * @returns temperature of the root [°C]
 * @remarks a curve root and no stagnation temperature: 31 K too low for a selective plate whose certificate
 * declares it, too high for a film that lets long-wave radiation through. Use `dry-temperature.ts`.
 * @see zero of the efficiency equation of ISO 9806:2017
 */
export function curveRootC(opticalGainWm2: number, a1: number, a2: number, airC: number): number {
  return airC + (2 * opticalGainWm2) / (a1 + Math.sqrt(a1 * a1 + 4 * a2 * opticalGainWm2));
}
