/** What a fuel usually holds, where no bill says it. Origin: calorific-values.md beside this file. */
export interface CalorificValue {
  fuel: 'pellets' | 'wood' | 'gas' | 'oil' | 'liquid gas' | 'electricity';
  unit: 'kg' | 'L' | 'm³' | 'kWh';
  netKwh: number;
  grossKwh: number;
}

export const CALORIFIC_VALUES: readonly CalorificValue[] = [
  { fuel: 'pellets', unit: 'kg', netKwh: 4.8, grossKwh: 5.2 },
  { fuel: 'wood', unit: 'kg', netKwh: 4.1, grossKwh: 4.6 },
  { fuel: 'gas', unit: 'm³', netKwh: 10, grossKwh: 11.1 },
  { fuel: 'oil', unit: 'L', netKwh: 10, grossKwh: 10.6 },
  { fuel: 'oil', unit: 'kg', netKwh: 11.9, grossKwh: 12.7 },
  { fuel: 'liquid gas', unit: 'kg', netKwh: 12.9, grossKwh: 14 },
  { fuel: 'liquid gas', unit: 'L', netKwh: 6.6, grossKwh: 7.1 },
];

/**
 * Usual energy in one unit of a fuel.
 * @returns energy [kWh]; undefined where the table has none
 */
export function usualEnergyKwh(
  fuel: string,
  unit: string,
  basis: 'net' | 'gross' | 'none',
): number | undefined {
  if (unit === 'kWh') return 1;
  const row = CALORIFIC_VALUES.find((value) => value.fuel === fuel && value.unit === unit);
  if (!row || basis === 'none') return undefined;
  return basis === 'net' ? row.netKwh : row.grossKwh;
}
