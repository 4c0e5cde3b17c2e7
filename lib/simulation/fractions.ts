import type { SolarFractions } from './results';

/** Electricity to primary heat in the extended savings, an input by convention [-]. */
export const ELECTRIC_EFFICIENCY = 0.4;

/** Energies of a year [kWh] that the fractions compare. */
export interface FractionInput {
  solarKwh: number;
  backupKwh: number;
  unmetKwh: number;
  pumpKwh: number;
  /** heat need of the same house without sun and store, same comfort */
  referenceNeedKwh: number;
  backupEfficiency: number;
  referenceEfficiency: number;
}

/**
 * Three solar fractions, side by side because they answer different questions:
 * `f_sol = Qsol/(Qsol + Qaux)`; `f_sav,therm = 1 − (Qaux/ηaux)/(Qneed/ηref)`, unmet heat added to Qaux;
 * `f_sav,ext` the same with `Wpump/0.4` added.
 * @param input energies [kWh], efficiencies [-]
 * @returns fractions [-]; 0 without any need
 * @see ISO 9488:2022 (solar fraction); IEA SHC Task 26, Solar Heating Systems for Houses, 2003 (fractional savings, from memory)
 */
export function solarFractions(input: FractionInput): SolarFractions {
  const delivered = input.solarKwh + input.backupKwh;
  const reference = input.referenceNeedKwh / input.referenceEfficiency;
  const bought = (input.backupKwh + input.unmetKwh) / input.backupEfficiency;
  return {
    solar: delivered > 0 ? input.solarKwh / delivered : 0,
    savedThermal: reference > 0 ? 1 - bought / reference : 0,
    savedExtended: reference > 0 ? 1 - (bought + input.pumpKwh / ELECTRIC_EFFICIENCY) / reference : 0,
  };
}
