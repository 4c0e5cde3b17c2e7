import type { HouseRecord } from '@/lib/schemas/house';
import type { DesignRecord } from '@/lib/schemas/design';
import type { Prices } from '@/lib/schemas/prices';
import type { CollectorRecord } from '@/lib/schemas/collector';
import { builtFields } from '@/lib/simulation/built-fields';
import type { StudyAnswer } from '@/lib/study/study-question';
import {
  currencySign,
  formatFixed,
  formatShare,
  formatSignificant,
  formatTyped,
  withUnit,
} from '@/lib/units/display';

export type VerdictNumber = 'area' | 'secondArea' | 'share' | 'price' | 'fuel' | 'reference';

/** A run of words, or a number that opens how it was computed. */
export type VerdictPart = string | { number: VerdictNumber; text: string };

export const COLLECTOR_WORDS: Record<CollectorRecord['cover'], string> = {
  none: 'bare absorbers',
  film: 'film-covered absorbers',
  glass: 'glass-covered absorbers',
  'twin-wall': 'twin-wall sheet',
  'selective glass': 'factory collectors',
};

/** A fuel bought by weight reads in kilograms, others in kilowatt hours. */
const FUEL_WORDS: Record<HouseRecord['backup']['fuel'], { verb: string; noun: string; byWeight: boolean }> = {
  pellets: { verb: 'the boiler burns', noun: 'of pellets', byWeight: true },
  wood: { verb: 'the boiler burns', noun: 'of wood', byWeight: true },
  oil: { verb: 'the boiler burns', noun: 'of oil', byWeight: true },
  gas: { verb: 'the boiler burns', noun: 'of gas', byWeight: false },
  'heat pump': { verb: 'the heat pump draws', noun: 'of electricity', byWeight: false },
  electric: { verb: 'the heater draws', noun: 'of electricity', byWeight: false },
};

/** Bought energy in the measure in which it is bought. */
export function fuelAmount(
  boughtKwh: number,
  house: HouseRecord,
  prices: Prices,
): { figure: string; unit: string } {
  const { byWeight } = FUEL_WORDS[house.backup.fuel];
  const amount = byWeight ? boughtKwh / prices.fuelKwhPerKg : boughtKwh;
  return { figure: formatSignificant(amount, 3), unit: byWeight ? 'kg' : 'kWh' };
}

/** Cost of a kilowatt hour with three decimals, as bills have it. */
export function pricePerKwh(price: number, currency: string): string {
  return withUnit(formatFixed(price, 3), `${currencySign(currency)}/kWh`);
}

/** "24 m² of film-covered absorbers", and those of a second field where there is one. */
function fieldParts(design: DesignRecord): VerdictPart[] {
  return builtFields(design).flatMap(({ collector, array }, place): VerdictPart[] => [
    ...(place > 0 ? [' and '] : []),
    {
      number: array === design.array ? 'area' : 'secondArea',
      text: withUnit(formatTyped(array.areaM2), 'm²'),
    },
    ` of ${COLLECTOR_WORDS[collector.cover]}`,
  ]);
}

/** The verdict: what the array carries, at what price, and what is still bought instead of what. */
export function verdictParts(answer: StudyAnswer, house: HouseRecord, prices: Prices): VerdictPart[] {
  const { design, result, cost } = answer;
  const { verb, noun } = FUEL_WORDS[house.backup.fuel];
  const bought = fuelAmount(result.year.boughtKwh, house, prices);
  const reference = fuelAmount(result.year.referenceBoughtKwh, house, prices);
  if (builtFields(design).length === 0 || !(result.year.fractions.solar > 0)) {
    return [
      'Without sun on the array nothing is carried: ',
      `${verb} `,
      { number: 'fuel', text: withUnit(bought.figure, bought.unit) },
      ` ${noun} a year.`,
    ];
  }
  return [
    'With ',
    ...fieldParts(design),
    ' the sun carries ',
    { number: 'share', text: formatShare(result.year.fractions.solar) },
    ' of this house’s heat at ',
    { number: 'price', text: pricePerKwh(cost.heat.perKwh, prices.currency) },
    `; ${verb} `,
    { number: 'fuel', text: withUnit(bought.figure, bought.unit) },
    ` ${noun} instead of `,
    { number: 'reference', text: reference.figure },
    '.',
  ];
}

/** The verdict as plain text, for those who listen. */
export function verdictText(parts: readonly VerdictPart[]): string {
  return parts.map((part) => (typeof part === 'string' ? part : part.text)).join('');
}
