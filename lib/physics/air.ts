import { KELVIN_OFFSET, STANDARD_PRESSURE_PA } from '@/lib/units/constants';

/** Gas constant of dry air [J/(kg K)]. */
export const AIR_GAS_CONSTANT_J_PER_KG_K = 287.053;
/** Specific heat of dry air [J/(kg K)], 0–100 °C within 0.5 %. */
export const AIR_SPECIFIC_HEAT_J_PER_KG_K = 1006;

/**
 * Air pressure by altitude: p = p0 (1 − 2.25577e-5 h)^5.25588.
 * @param altitudeM height above the sea [m] −400–5000
 * @returns absolute pressure [Pa]
 * @see ISO 2533:1975, standard atmosphere, troposphere
 */
export function airPressureAtAltitude(altitudeM: number): number {
  return STANDARD_PRESSURE_PA * (1 - 2.25577e-5 * altitudeM) ** 5.25588;
}

/**
 * Density of dry air: ρ = p/(R T).
 * @param temperatureC air temperature [°C] −40–200
 * @param pressurePa absolute pressure [Pa]
 * @returns density [kg/m³]
 * @see ISO 2533:1975, perfect gas law
 */
export function airDensity(temperatureC: number, pressurePa = STANDARD_PRESSURE_PA): number {
  return pressurePa / (AIR_GAS_CONSTANT_J_PER_KG_K * (temperatureC + KELVIN_OFFSET));
}

/**
 * Dynamic viscosity of air by Sutherland's law: μ = 1.458e-6 T^1.5/(T + 110.4).
 * @param temperatureK absolute temperature [K] 200–500
 * @returns dynamic viscosity [Pa s]
 * @see US Standard Atmosphere 1976, eq. 51
 */
export function airViscosity(temperatureK: number): number {
  return (1.458e-6 * temperatureK * Math.sqrt(temperatureK)) / (temperatureK + 110.4);
}

/**
 * Thermal conductivity of air: k = 2.64638e-3 T^1.5/(T + 245.4 · 10^(−12/T)).
 * @param temperatureK absolute temperature [K] 200–500
 * @returns conductivity [W/(m K)]
 * @see US Standard Atmosphere 1976, eq. 53
 */
export function airConductivity(temperatureK: number): number {
  return (
    (2.64638e-3 * temperatureK * Math.sqrt(temperatureK)) /
    (temperatureK + 245.4 * Math.exp((-12 * Math.LN10) / temperatureK))
  );
}

/**
 * Kinematic viscosity of air: ν = μ/ρ.
 * @param temperatureC air temperature [°C] −40–200
 * @param pressurePa absolute pressure [Pa]
 * @returns kinematic viscosity [m²/s]
 * @see US Standard Atmosphere 1976, eq. 52
 */
export function airKinematicViscosity(temperatureC: number, pressurePa = STANDARD_PRESSURE_PA): number {
  return airViscosity(temperatureC + KELVIN_OFFSET) / airDensity(temperatureC, pressurePa);
}

/**
 * Thermal diffusivity of air: α = k/(ρ cp).
 * @param temperatureC air temperature [°C] −40–200
 * @param pressurePa absolute pressure [Pa]
 * @returns thermal diffusivity [m²/s]
 * @see US Standard Atmosphere 1976, eq. 53; definition of diffusivity
 */
export function airDiffusivity(temperatureC: number, pressurePa = STANDARD_PRESSURE_PA): number {
  return (
    airConductivity(temperatureC + KELVIN_OFFSET) /
    (airDensity(temperatureC, pressurePa) * AIR_SPECIFIC_HEAT_J_PER_KG_K)
  );
}
