import { GRAVITY_M_PER_S2, PA_PER_BAR, STANDARD_PRESSURE_PA } from '@/lib/units/constants';

/**
 * Specific heat of water in the energy balance of the year [J/(kg K)]: one constant, so that heat is exactly
 * proportional to temperature and the balance closes. Within 0.3 % of the real value from 8 to 80 °C.
 */
export const WATER_SPECIFIC_HEAT_J_PER_KG_K = 4186;

/**
 * Mass of a litre in the energy balance [kg/L]: stores and arrays are filled cold and keep their mass while the
 * level rises with temperature.
 */
export const WATER_KG_PER_L = 1;

/** Density of hot water in hydrostatic limits [kg/m³], about 80 °C. */
export const HOT_WATER_DENSITY_KG_PER_M3 = 970;

const DENSITY = [999.86128, 6.0109172, -82.554826, 63.32551, -38.906221, 10.627291];
const SPECIFIC_HEAT = [4.2182741, -0.30373846, 0.92150095, -1.4577612, 1.2482726, -0.41045706];
const LN_VISCOSITY = [-6.3252831, -3.4527039, 3.2804881, -3.0753056, 1.9351655, -0.53788414];
const LN_SATURATION = [6.4154745, 7.2659811, -2.9874036, 1.1170762, -0.34765135, 0.063554021];
const CONDUCTIVITY = [0.55653508, 0.23493385, -0.15154337, 0.037730529];

const KJ = 1000;

function polynomial(coefficients: readonly number[], temperatureC: number): number {
  const x = temperatureC / 100;
  return coefficients.reduceRight((sum, c) => sum * x + c, 0);
}

/**
 * Density of liquid water at atmospheric pressure: polynomial in T/100.
 * @param temperatureC water temperature [°C] 0.5–99.5
 * @returns density [kg/m³], within 0.0014 % of the table
 * @see IAPWS-IF97 (2007), table of `reference D8`; own least-squares fit D9
 */
export function waterDensity(temperatureC: number): number {
  return polynomial(DENSITY, temperatureC);
}

/**
 * Specific heat of liquid water at atmospheric pressure: polynomial in T/100.
 * @param temperatureC water temperature [°C] 0.5–99.5
 * @returns specific heat [J/(kg K)], within 0.022 % of the table
 * @see IAPWS-IF97 (2007); own least-squares fit D9
 */
export function waterSpecificHeat(temperatureC: number): number {
  return KJ * polynomial(SPECIFIC_HEAT, temperatureC);
}

/**
 * Dynamic viscosity of liquid water: exponential of a polynomial in T/100.
 * @param temperatureC water temperature [°C] 0.5–99.5
 * @returns dynamic viscosity [Pa s], within 0.06 % of the table
 * @see IAPWS viscosity formulation (2008); own least-squares fit D9
 */
export function waterViscosity(temperatureC: number): number {
  return Math.exp(polynomial(LN_VISCOSITY, temperatureC));
}

/**
 * Thermal conductivity of liquid water: polynomial in T/100.
 * @param temperatureC water temperature [°C] 0.5–99.5
 * @returns conductivity [W/(m K)], within 0.14 % of the table
 * @see IAPWS thermal conductivity formulation (2011); own least-squares fit D9
 */
export function waterConductivity(temperatureC: number): number {
  return polynomial(CONDUCTIVITY, temperatureC);
}

/**
 * Saturation pressure of water: exponential of a polynomial in T/100.
 * @param temperatureC water temperature [°C] 0.5–99.5 (holds to 100 within 0.01 %)
 * @returns absolute pressure [Pa], within 0.0024 % of the table
 * @see IAPWS-IF97 (2007), region 4; own least-squares fit D9
 */
export function waterSaturationPressure(temperatureC: number): number {
  return Math.exp(polynomial(LN_SATURATION, temperatureC));
}

/**
 * Temperature at which water boils: the saturation pressure solved for temperature by Newton's rule on ln p,
 * started from the boiling point of the standard atmosphere.
 * @param pressurePa absolute pressure [Pa] 700–101 400
 * @returns boiling temperature [°C]
 * @remarks above 1 bar the fit is extrapolated and reads up to 0.1 K wrong at 1.05 bar
 * @see IAPWS-IF97 (2007), region 4; own least-squares fit D9
 */
export function boilingTemperatureC(pressurePa: number): number {
  const target = Math.log(pressurePa);
  const step = 0.01;
  let temperatureC = 100;
  for (let i = 0; i < 30; i++) {
    const value = polynomial(LN_SATURATION, temperatureC);
    const slope = (value - polynomial(LN_SATURATION, temperatureC - step)) / step;
    const change = (target - value) / slope;
    temperatureC += change;
    if (Math.abs(change) < 1e-9) break;
  }
  return temperatureC;
}

/**
 * Gauge pressure at the foot of a standing water column: p = ρgh.
 * @param heightM height of the column [m] from 0
 * @param temperatureC water temperature [°C] 0.5–99.5
 * @returns pressure above that of the air [bar]
 * @see hydrostatics; ISO 80000-4:2019, pressure
 */
export function columnPressureBar(heightM: number, temperatureC = 10): number {
  return (waterDensity(temperatureC) * GRAVITY_M_PER_S2 * heightM) / PA_PER_BAR;
}

/** Boiling point of water in the standard atmosphere by the fit of this file [°C]. */
export const STANDARD_BOILING_C = boilingTemperatureC(STANDARD_PRESSURE_PA);
