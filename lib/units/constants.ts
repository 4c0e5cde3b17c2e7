/**
 * The only place where the numbers of unit systems and of nature are written. No dependency, so that physics
 * may import it. Factors convert by multiplication: `areaFt2 = areaM2 * FT2_PER_M2`.
 */

/** 0 °C on the Kelvin scale [K]. */
export const KELVIN_OFFSET = 273.15;

export const SECONDS_PER_MINUTE = 60;
export const SECONDS_PER_HOUR = 3600;
export const MINUTES_PER_HOUR = 60;
export const HOURS_PER_DAY = 24;
export const DAYS_PER_YEAR = 365;
/** Hours of a weather year: 29 February is left out. */
export const HOURS_PER_YEAR = 8760;
export const MS_PER_HOUR = 3_600_000;
/** The earth turns so far in an hour of solar time [°/h]. */
export const DEGREES_PER_HOUR = 15;

/** Days of each month in a year of 365 days. */
export const DAYS_IN_MONTH: readonly number[] = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/** First hour of each month in a weather year, with the year's end as 13th entry [h]. */
export const MONTH_START_HOUR: readonly number[] = [
  0, 744, 1416, 2160, 2880, 3624, 4344, 5088, 5832, 6552, 7296, 8016, 8760,
];

export const J_PER_WH = 3600;
export const WH_PER_J = 1 / J_PER_WH;
export const J_PER_KWH = 3.6e6;
export const KWH_PER_J = 1 / J_PER_KWH;
export const J_PER_MJ = 1e6;
export const KWH_PER_MJ = J_PER_MJ / J_PER_KWH;
export const W_PER_KW = 1000;
export const WH_PER_KWH = 1000;

/** Stefan-Boltzmann constant [W/(m²K⁴)], CODATA 2018. */
export const STEFAN_BOLTZMANN = 5.670374419e-8;
/** Solar constant [W/m²] as in Duffie & Beckman, Solar Engineering of Thermal Processes, sec. 1.2. */
export const SOLAR_CONSTANT_W_PER_M2 = 1367;
/** Standard acceleration of free fall [m/s²], ISO 80000-3. */
export const GRAVITY_M_PER_S2 = 9.80665;
/** Standard atmosphere at sea level [Pa], ISO 2533. */
export const STANDARD_PRESSURE_PA = 101_325;

export const PA_PER_BAR = 1e5;
export const PA_PER_MBAR = 100;
export const PA_PER_KPA = 1000;
export const L_PER_M3 = 1000;
export const MM_PER_M = 1000;
export const CM_PER_M = 100;

/** International foot, pound and the units built on them (NIST Special Publication 811). */
export const M_PER_FT = 0.3048;
export const M_PER_INCH = 0.0254;
export const FT_PER_M = 1 / M_PER_FT;
export const INCH_PER_M = 1 / M_PER_INCH;
export const FT2_PER_M2 = FT_PER_M * FT_PER_M;
export const KG_PER_LB = 0.45359237;
export const LB_PER_KG = 1 / KG_PER_LB;
/** US liquid gallon [L]. */
export const L_PER_US_GALLON = 3.785411784;
export const US_GALLON_PER_L = 1 / L_PER_US_GALLON;
/** International Table British thermal unit [J]. */
export const J_PER_BTU = 1055.05585262;
export const BTU_PER_J = 1 / J_PER_BTU;
export const BTU_PER_WH = J_PER_WH / J_PER_BTU;
export const KBTU_PER_KWH = J_PER_KWH / (1000 * J_PER_BTU);
/** Pound-force per square inch [Pa]. */
export const PA_PER_PSI = 6894.757293168;
export const FAHRENHEIT_PER_KELVIN = 1.8;
export const FAHRENHEIT_OFFSET = 32;

export const RADIANS_PER_DEGREE = Math.PI / 180;
export const DEGREES_PER_RADIAN = 180 / Math.PI;

/**
 * Degrees to radians.
 * @param degrees angle [°]
 * @returns angle [rad]
 * @see ISO 80000-3:2019, plane angle
 */
export function toRadians(degrees: number): number {
  return degrees * RADIANS_PER_DEGREE;
}

/**
 * Radians to degrees.
 * @param radians angle [rad]
 * @returns angle [°]
 * @see ISO 80000-3:2019, plane angle
 */
export function toDegrees(radians: number): number {
  return radians * DEGREES_PER_RADIAN;
}

/**
 * Celsius to kelvin: T = θ + 273.15.
 * @param celsius temperature [°C] from −273.15
 * @returns absolute temperature [K]
 * @see ISO 80000-5:2019, Celsius temperature
 */
export function toKelvin(celsius: number): number {
  return celsius + KELVIN_OFFSET;
}

/**
 * Kelvin to Celsius: θ = T − 273.15.
 * @param kelvin absolute temperature [K] from 0
 * @returns temperature [°C]
 * @see ISO 80000-5:2019, Celsius temperature
 */
export function toCelsius(kelvin: number): number {
  return kelvin - KELVIN_OFFSET;
}
