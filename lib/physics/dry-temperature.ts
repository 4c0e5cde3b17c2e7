import { KELVIN_OFFSET, STANDARD_PRESSURE_PA, STEFAN_BOLTZMANN, toRadians } from '@/lib/units/constants';
import { STAGNATION_AIR_C, STAGNATION_IRRADIANCE_WM2, curveRootC } from './collector';
import { gapConvection, gapTilt } from './gap-convection';
import { longwaveFactors, planeLongwave, windConvection } from './longwave-exchange';

/** Irradiance on the plane below which the empty collector is taken as cold [W/m²]. */
export const DRY_IRRADIANCE_WM2 = 50;

/** Build of a collector with one cover. */
export interface DryBuild {
  absorberEmittance: number;
  coverEmittance: number;
  /** share of long-wave radiation that the cover lets through: PE film 0.8, glass 0 [-] */
  coverLongwaveTransmittance: number;
  /** between the faces of the cover: twin-wall sheet 1/U − 0.17, film and glass 0 [m²K/W] */
  coverResistanceM2KPerW: number;
  gapM: number;
  /** loss through back and edges, a face layer counted (`backLossWithFaceLayer`) [W/(m²K)] */
  backLossWPerM2K: number;
  tiltDeg: number;
  /** pressure of the air [Pa] */
  pressurePa?: number;
}

/** The hours: arrays of equal length, 8,760 for a year. */
export interface DryHours {
  /** irradiance on the plane, which decides what is calculated [W/m²] */
  planeWm2: Float64Array;
  /** sun that the absorber takes, cover and angle counted: (τα) (Kb Gb + Kd Gd) [W/m²] */
  absorbedWm2: Float64Array;
  dryBulbC: Float64Array;
  /** wind of the weather year [m/s] */
  windMPerS: Float64Array;
  /** wind at the collector / wind of the weather year [-] */
  windFactor: number;
  /** long-wave irradiance of the sky on the horizontal, σ T_sky⁴ [W/m²] */
  skyLongwaveWm2: Float64Array;
}

export interface DryTemperatures {
  plateC: Float64Array;
  /** inner face of the cover, its hottest place */
  coverC: Float64Array;
}

const TOLERANCE_K = 1e-3;
const MOST_ROUNDS = 60;
/** Convection grows with about the power 4/3 of the difference. */
const CONVECTION_SLOPE = 4 / 3;

/**
 * Steady temperature of the empty collector in every hour: absorber and cover in balance,
 * S = h_gap(Tp − Tc) + σF_pc(Tp⁴ − Tc⁴) + F_ps(σTp⁴ − EL) + Ub(Tp − Ta) and
 * h_gap(Tp − Tc) + σF_pc(Tp⁴ − Tc⁴) = h_w(To − Ta) + F_cs(σTo⁴ − EL), Tc = To + R q for a cover with resistance;
 * Newton's rule on Tp and To, started from the hour before.
 * @param build collector without its absorptance [-], [m], [m²K/W], [W/(m²K)], [°]
 * @param hours irradiance, air, wind, sky of each hour [W/m²], [°C], [m/s]
 * @param out arrays to fill with plate and inner cover temperature [°C]; air temperature below 50 W/m²
 * @returns nothing; the arrays are filled and nothing is allocated in the hours
 * @remarks no heat capacity: the highest value of an hour's mean sun; the sun taken by the cover itself is left out;
 * a twin-wall sheet is its resistance
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 6.4; Hollands et al. (1976) for
 * the gap; Watmuff et al. (1977) for the wind
 */
export function dryYear(build: DryBuild, hours: DryHours, out: DryTemperatures): void {
  const { plateToCover, plateToSky, coverToSky } = longwaveFactors(
    build.absorberEmittance,
    build.coverEmittance,
    build.coverLongwaveTransmittance,
  );
  const pressurePa = build.pressurePa ?? STANDARD_PRESSURE_PA;
  const resistance = build.coverResistanceM2KPerW;
  const back = build.backLossWPerM2K;
  const gapM = build.gapM;
  const tilt = gapTilt(build.tiltDeg);
  const cosTilt = Math.cos(toRadians(build.tiltDeg));
  const { planeWm2, absorbedWm2, dryBulbC, windMPerS, windFactor, skyLongwaveWm2 } = hours;
  const { plateC, coverC } = out;
  let plateRise = 40;
  let outerRise = 15;

  for (let h = 0; h < planeWm2.length; h++) {
    const airC = dryBulbC[h]!;
    if (!(planeWm2[h]! >= DRY_IRRADIANCE_WM2)) {
      plateC[h] = airC;
      coverC[h] = airC;
      continue;
    }
    const airK = airC + KELVIN_OFFSET;
    const longwave = planeLongwave(skyLongwaveWm2[h]!, STEFAN_BOLTZMANN * airK ** 4, cosTilt);
    const wind = windConvection(windFactor * windMPerS[h]!);
    const sun = absorbedWm2[h]!;
    let plateK = airK + plateRise;
    let outerK = airK + outerRise;
    let innerK = outerK;

    for (let round = 0; round < MOST_ROUNDS; round++) {
      const outer3 = STEFAN_BOLTZMANN * outerK * outerK * outerK;
      const away = wind * (outerK - airK) + coverToSky * (outer3 * outerK - longwave);
      const awaySlope = wind + 4 * coverToSky * outer3;
      innerK = outerK + resistance * away;
      const innerSlope = 1 + resistance * awaySlope;

      const plate3 = STEFAN_BOLTZMANN * plateK * plateK * plateK;
      const inner3 = STEFAN_BOLTZMANN * innerK * innerK * innerK;
      const gap = gapConvection(plateK, innerK, gapM, tilt, pressurePa);
      const up = gap * (plateK - innerK) + plateToCover * (plate3 * plateK - inner3 * innerK);
      const upByPlate = CONVECTION_SLOPE * gap + 4 * plateToCover * plate3;
      const upByOuter = -(CONVECTION_SLOPE * gap + 4 * plateToCover * inner3) * innerSlope;

      const plateError = sun - up - plateToSky * (plate3 * plateK - longwave) - back * (plateK - airK);
      const coverError = up - away;
      const a = upByPlate + 4 * plateToSky * plate3 + back;
      const d = awaySlope - upByOuter;
      const determinant = a * d + upByOuter * upByPlate;
      const plateStep = (plateError * d - upByOuter * coverError) / determinant;
      const outerStep = (a * coverError + upByPlate * plateError) / determinant;
      plateK += plateStep;
      outerK += outerStep;
      if (Math.abs(plateStep) < TOLERANCE_K && Math.abs(outerStep) < TOLERANCE_K) break;
    }
    plateRise = plateK - airK;
    outerRise = outerK - airK;
    plateC[h] = plateK - KELVIN_OFFSET;
    coverC[h] = innerK - KELVIN_OFFSET;
  }
}

/**
 * The factor on a1 and a2 of a certificate that puts the root of its curve at the declared stagnation temperature:
 * f = η0,hem · 1000/(a1 Δ + a2 Δ²), Δ = T_stg − 30 °C.
 * @param eta0Hemispherical hemispherical efficiency [-] 0–1
 * @param a1 linear loss [W/(m²K)] above 0
 * @param a2 quadratic loss [W/(m²K²)] from 0
 * @param stagnationC declared standard stagnation temperature [°C] above 30
 * @returns factor [-]
 * @see ISO 9806:2017, 11 (standard stagnation temperature, 1000 W/m² and 30 °C); own definition of the factor
 */
export function stagnationFactor(
  eta0Hemispherical: number,
  a1: number,
  a2: number,
  stagnationC: number,
): number {
  const rise = stagnationC - STAGNATION_AIR_C;
  return (eta0Hemispherical * STAGNATION_IRRADIANCE_WM2) / (a1 * rise + a2 * rise * rise);
}

/**
 * Dry temperature of every hour from a certificate: the curve with a1 and a2 times `stagnationFactor`, solved for
 * zero power at the sun and air of the hour.
 * @param curve η0,hem [-], a1 [W/(m²K)], a2 [W/(m²K²)], declared temperature [°C]
 * @param hours irradiance on the plane [W/m²], optical gain η0,b(Kb Gb + Kd Gd) [W/m²], air [°C]
 * @param plateC array to fill [°C]; air temperature below 50 W/m²
 * @returns nothing; the array is filled
 * @remarks wind and sky are those of the test; the cover's temperature stays unknown
 * @see ISO 9806:2017, 11 (from memory); own definition of the factor
 */
export function dryYearFromDeclared(
  curve: { eta0Hemispherical: number; a1: number; a2: number; stagnationC: number },
  hours: { planeWm2: Float64Array; opticalGainWm2: Float64Array; dryBulbC: Float64Array },
  plateC: Float64Array,
): void {
  const factor = stagnationFactor(curve.eta0Hemispherical, curve.a1, curve.a2, curve.stagnationC);
  const a1 = curve.a1 * factor;
  const a2 = curve.a2 * factor;
  for (let h = 0; h < plateC.length; h++) {
    const airC = hours.dryBulbC[h]!;
    const sunny = hours.planeWm2[h]! >= DRY_IRRADIANCE_WM2;
    plateC[h] = sunny ? curveRootC(hours.opticalGainWm2[h]!, a1, a2, airC) : airC;
  }
}

/**
 * Loss through the back with a heat-proof layer in front of its insulation: U = Ub/(1 + Ub R).
 * @param backLossWPerM2K loss through back and edges without the layer Ub [W/(m²K)]
 * @param faceLayerM2KPerW resistance of the layer R [m²K/W] from 0
 * @returns loss through back and edges [W/(m²K)]
 * @remarks the edges are counted as if they stood behind the layer too
 * @see ISO 6946:2017, 6.7, layers in series
 */
export function backLossWithFaceLayer(backLossWPerM2K: number, faceLayerM2KPerW: number): number {
  return backLossWPerM2K / (1 + backLossWPerM2K * faceLayerM2KPerW);
}

/**
 * Temperature at the hot face of the back insulation, behind a heat-proof layer: T = Ta + (Tp − Ta)/(1 + Ub R).
 * @param plateC plate temperature [°C]
 * @param airC air temperature [°C]
 * @param backLossWPerM2K loss through back and edges without the layer Ub [W/(m²K)]
 * @param faceLayerM2KPerW resistance of the layer R [m²K/W] from 0
 * @returns temperature of the insulation's hot face [°C]
 * @see ISO 6946:2017, 6.7, layers in series
 */
export function backFaceC(
  plateC: number,
  airC: number,
  backLossWPerM2K: number,
  faceLayerM2KPerW: number,
): number {
  return airC + (plateC - airC) / (1 + backLossWPerM2K * faceLayerM2KPerW);
}
