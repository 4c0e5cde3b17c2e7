import type { Prices } from '@/lib/schemas/prices';
import type { StudyAnswer } from '@/lib/study/study-question';
import { currencySign, formatFixed, formatShare, formatSignificant, withUnit } from '@/lib/units/display';
import {
  CHOICES_LINK,
  COLLECTOR_CURVE,
  COST_OF_HEAT,
  FRACTIONS,
  YEAR_LOOP,
  designInputs,
  equationLink,
} from './explanation';
import type { ExplainedInput, Explanation, MethodLink } from './explanation';
import { priceInputs } from './how-computed';
import { pricePerKwh } from './verdict-words';

export type FractionName = 'solar' | 'savedThermal' | 'savedExtended';
export type BalanceName =
  'arraySun' | 'arrayLoss' | 'pipeLoss' | 'storeLoss' | 'given' | 'unused' | 'pump' | 'residual';
export type CostName = 'toBuild' | 'backupHeat' | 'perKwh' | 'perSavedKwh';

const kwh = (value: number) => withUnit(formatSignificant(value, 3), 'kWh');

const FRACTION_WORDS: Record<FractionName, { title: string; equation: string }> = {
  solar: { title: 'Solar fraction', equation: 'solar heat divided by solar heat plus backup heat' },
  savedThermal: {
    title: 'Thermal savings',
    equation: '1 − bought energy / bought energy of the same house without sun and store',
  },
  savedExtended: {
    title: 'Extended savings',
    equation: '1 − (bought energy + pump / 0.4) / bought energy of the same house without sun and store',
  },
};

/** Opens one of the three solar fractions. */
export function explainFraction(name: FractionName, { design, result: { year } }: StudyAnswer): Explanation {
  const inputs: ExplainedInput[] =
    name === 'solar'
      ? [
          { name: 'solar heat', value: kwh(year.solarHeatingKwh + year.solarTapKwh) },
          { name: 'backup heat', value: kwh(year.backupHeatingKwh + year.backupTapKwh) },
        ]
      : [
          { name: 'bought energy', value: kwh(year.boughtKwh) },
          { name: 'unmet heat, counted as bought', value: kwh(year.unmetKwh) },
          { name: 'bought without sun and store', value: kwh(year.referenceBoughtKwh) },
        ];
  if (name === 'savedExtended') inputs.push({ name: 'pump, electricity', value: kwh(year.pumpKwh) });
  return {
    ...FRACTION_WORDS[name],
    value: formatShare(year.fractions[name]),
    inputs,
    entered: designInputs(design),
    source: 'Named as in ISO 9488 and IEA SHC Task 26; sums over the hours of this run.',
    method: [FRACTIONS, YEAR_LOOP, CHOICES_LINK],
  };
}

interface BalanceWords {
  title: string;
  equation: string;
  method: MethodLink;
}

const BALANCE_WORDS: Record<Exclude<BalanceName, 'residual'>, BalanceWords> = {
  arraySun: {
    title: 'Sun on the array',
    equation: 'sun that the mounted array turns into heat before losses, hour by hour',
    method: equationLink('Optical gain', 'collector', 'opticalGain'),
  },
  arrayLoss: {
    title: 'Lost at the array',
    equation: 'loss of the curve at the temperature of plate and water, full or empty',
    method: COLLECTOR_CURVE,
  },
  pipeLoss: {
    title: 'Lost in pipes',
    equation: 'loss of both outdoor pipes while water runs, and of their wall while it does not',
    method: equationLink('Loss of an insulated pipe', 'loop', 'pipeLossWPerMK'),
  },
  storeLoss: {
    title: 'Lost from the store',
    equation: 'loss of each layer through its surface to the room of the store',
    method: equationLink('Loss by layer', 'store', 'layerLossesWPerK'),
  },
  given: {
    title: 'Given to heating and hot water',
    equation: 'heat drawn from the store for the heating and for hot water',
    method: equationLink('Layers of the store', 'store', 'StoreLayers'),
  },
  unused: {
    title: 'Left over',
    equation: 'what the array could have given at the bottom temperature while the store was locked',
    method: COLLECTOR_CURVE,
  },
  pump: {
    title: 'Pump',
    equation: 'electric power of the pump times the hours it ran',
    method: equationLink('Power to lift water', 'loop', 'liftPowerW'),
  },
};

/** Opens a line of the balance, or its residual. */
export function explainBalance(name: BalanceName, answer: StudyAnswer, value: string): Explanation {
  const { design, result } = answer;
  if (name === 'residual') return explainResidual(answer, value);
  const { title, equation, method } = BALANCE_WORDS[name];
  const { year } = result;
  return {
    title,
    value,
    equation,
    inputs: [
      { name: 'sun on the plane while mounted', value: kwh(year.planeKwh) },
      { name: 'collected', value: kwh(year.collectedKwh) },
      { name: 'hours of the pump', value: withUnit(formatFixed(year.pumpHours), 'h') },
      { name: 'starts', value: formatFixed(year.starts) },
    ],
    entered: designInputs(design),
    source: 'Sum over the sub-steps of this run, in double precision.',
    method: [method, YEAR_LOOP, CHOICES_LINK],
  };
}

function explainResidual({ result: { balance, layers, theta } }: StudyAnswer, value: string): Explanation {
  const sum = (terms: object) =>
    Object.values(terms).reduce<number>((total, term) => total + Number(term), 0);
  return {
    title: 'Residual of the balance',
    value,
    equation: '|heat in − heat out − change of stored heat| / heat in',
    inputs: [
      { name: 'in', value: kwh(sum(balance.inKwh)) },
      { name: 'out', value: kwh(sum(balance.outKwh)) },
      { name: 'stored', value: kwh(sum(balance.storedKwh)) },
      { name: 'layers', value: formatFixed(layers) },
      { name: 'step θ', value: formatFixed(theta, 2) },
    ],
    source: 'Own definition; a closed balance does not prove the step small enough, see the convergence.',
    method: [{ text: 'Convergence and balance', href: '/validation' }, YEAR_LOOP],
  };
}

const COST_WORDS: Record<CostName, { title: string; equation: string }> = {
  toBuild: {
    title: 'To build',
    equation: 'collectors, store, pump and control, pipes, mixing and interface',
  },
  backupHeat: {
    title: 'Heat from the backup',
    equation: 'price of the fuel times bought energy, divided by the need, both without sun',
  },
  perKwh: {
    title: 'Cost of solar heat',
    equation:
      'present value of building, upkeep, pump power and replacements less what is left at the end, divided by the discounted solar heat',
  },
  perSavedKwh: {
    title: 'Cost of a saved kilowatt-hour',
    equation: 'the same present value divided by the discounted bought energy that is saved',
  },
};

/** Opens an amount of the receipt. */
export function explainCost(name: CostName, { cost, result }: StudyAnswer, prices: Prices): Explanation {
  const sign = currencySign(prices.currency);
  const values: Record<CostName, string> = {
    toBuild: withUnit(formatSignificant(cost.toBuild, 3), sign),
    backupHeat: pricePerKwh(cost.backupHeatPerKwh, prices.currency),
    perKwh: pricePerKwh(cost.heat.perKwh, prices.currency),
    perSavedKwh: pricePerKwh(cost.heat.perSavedKwh, prices.currency),
  };
  return {
    ...COST_WORDS[name],
    value: values[name],
    inputs: costInputs(name, cost, result.year, sign),
    entered: priceInputs(prices),
    source: 'Form of IEA SHC Task 54, real prices throughout; house emitters and boiler are not counted.',
    method: [COST_OF_HEAT, equationLink('Prices of a design', 'money', 'designCost')],
  };
}

function costInputs(
  name: CostName,
  cost: StudyAnswer['cost'],
  year: StudyAnswer['result']['year'],
  sign: string,
): ExplainedInput[] {
  const money = (amount: number) => withUnit(formatSignificant(amount, 3), sign);
  switch (name) {
    case 'toBuild':
      return cost.investment.map(({ label, amount }) => ({ name: label, value: money(amount) }));
    case 'backupHeat':
      return [
        { name: 'bought without sun', value: kwh(year.referenceBoughtKwh) },
        { name: 'need without sun', value: kwh(year.referenceNeedKwh) },
      ];
    case 'perKwh':
    case 'perSavedKwh':
      return [
        { name: 'present cost', value: money(cost.heat.presentCost) },
        { name: 'solar heat, discounted', value: kwh(cost.heat.presentHeatKwh) },
        { name: 'saved in a year', value: kwh(cost.savedKwhPerYear) },
      ];
  }
}
