import { J_PER_KWH } from '@/lib/units/constants';

const GJ_PER_KWH = J_PER_KWH / 1e9;

/** CO₂ of burning on the net calorific value [kg/GJ]; wood is biogenic and counted apart by convention. */
export const FUEL_CO2_KG_PER_GJ = {
  gas: 56.1,
  oil: 74.1,
  lpg: 63.1,
  'residual oil': 77.4,
  anthracite: 98.3,
  wood: 112,
} as const;

/** Net/gross calorific value of natural gas [-]. */
export const GAS_NET_PER_GROSS = 0.901;

/**
 * CO₂ per kilowatt hour of fuel: EF · 0.0036 GJ/kWh.
 * @param kgPerGj emission factor [kg/GJ]
 * @returns emission [kg/kWh] on the same calorific value as the factor
 * @see IPCC 2006 Guidelines, Vol. 2, Ch. 2, default factors (from memory)
 */
export function co2KgPerKwh(kgPerGj: number): number {
  return kgPerGj * GJ_PER_KWH;
}
