import type { SolarFractions } from './results';

/** Electricity to primary heat in the extended savings, an input by convention [-]. */
export const ELECTRIC_EFFICIENCY = 0.4;

/** Energies of a year [kWh] that the fractions compare. */
export interface FractionInput {
  solarKwh: number;
  backupKwh: number;
  /** bought for the backup, unmet heat bought too */
  boughtKwh: number;
  pumpKwh: number;
  /** bought by the same house without sun and store, same comfort */
  referenceBoughtKwh: number;
}

/**
 * Three solar fractions, side by side because they answer different questions:
 * `f_sol = Qsol/(Qsol + Qaux)`; `f_sav,therm = 1 − (Qaux/ηaux)/(Qneed/ηref)`, unmet heat added to Qaux;
 * `f_sav,ext` the same with `Wpump/0.4` added to the bought energy.
 * @param input energies [kWh]
 * @returns fractions [-]; 0 without any need
 * @see ISO 9488:2022 (solar fraction); IEA SHC Task 26, Solar Heating Systems for Houses, 2003 (fractional savings, from memory)
 */
export function solarFractions(input: FractionInput): SolarFractions {
  const delivered = input.solarKwh + input.backupKwh;
  const { boughtKwh, referenceBoughtKwh: reference } = input;
  return {
    solar: delivered > 0 ? input.solarKwh / delivered : 0,
    savedThermal: reference > 0 ? 1 - boughtKwh / reference : 0,
    savedExtended: reference > 0 ? 1 - (boughtKwh + input.pumpKwh / ELECTRIC_EFFICIENCY) / reference : 0,
  };
}
