import type { HouseRecord } from '@/lib/schemas/house';
import { builtFields } from '@/lib/simulation/built-fields';
import type { StudyAnswer } from '@/lib/study/study-question';
import { formatShare, formatSignificant, formatTyped, withUnit } from '@/lib/units/display';
import { backupSchema } from '@/lib/schemas/house';
import { pricesSchema } from '@/lib/schemas/prices';
import type { Prices } from '@/lib/schemas/prices';
import { collectorSchema } from '@/lib/schemas/collector';
import { arraySchema } from '@/lib/schemas/design';
import {
  CHOICES_LINK,
  COLLECTOR_CURVE,
  COST_OF_HEAT,
  FRACTIONS,
  REPLACEMENTS,
  YEAR_LOOP,
  designInputs,
  enteredInput,
  equationLink,
} from './explanation';
import type { Explanation } from './explanation';
import { fuelAmount, pricePerKwh } from './verdict-words';
import type { VerdictNumber } from './verdict-words';

const kwh = (value: number) => withUnit(formatSignificant(value, 3), 'kWh');

/** Opens one number of the verdict: its equation in words, the inputs with their values, the source. */
export function explain(
  number: VerdictNumber,
  answer: StudyAnswer,
  house: HouseRecord,
  prices: Prices,
): Explanation {
  const { design, result, cost } = answer;
  const { year } = result;
  const solarKwh = year.solarHeatingKwh + year.solarTapKwh;
  const fuel = (boughtKwh: number) => {
    const { figure, unit } = fuelAmount(boughtKwh, house, prices);
    return withUnit(figure, unit);
  };
  const backupKwh = year.backupHeatingKwh + year.backupTapKwh;
  const efficiency =
    house.backup.fuel === 'heat pump'
      ? {
          name: 'heat for each kilowatt-hour drawn, over the year',
          value: formatSignificant(backupKwh / year.boughtKwh, 2),
        }
      : enteredInput(backupSchema.shape.seasonalEfficiency, house.backup.seasonalEfficiency);
  const perKg = enteredInput(pricesSchema.shape.fuelKwhPerKg, prices.fuelKwhPerKg);
  switch (number) {
    case 'area':
    case 'secondArea':
      return explainArea(number, answer);
    case 'share':
      return {
        title: 'Share carried by the sun',
        value: formatShare(year.fractions.solar),
        equation: 'solar heat divided by solar heat plus backup heat',
        inputs: [
          { name: 'store to the heating', value: kwh(year.solarHeatingKwh) },
          { name: 'store to hot water', value: kwh(year.solarTapKwh) },
          { name: 'backup to the heating', value: kwh(year.backupHeatingKwh) },
          { name: 'backup to hot water', value: kwh(year.backupTapKwh) },
        ],
        entered: designInputs(design),
        source: 'Solar fraction of ISO 9488; sums over the hours of this run.',
        method: [FRACTIONS, YEAR_LOOP, COLLECTOR_CURVE, CHOICES_LINK],
      };
    case 'price':
      return {
        title: 'Cost of solar heat',
        value: pricePerKwh(cost.heat.perKwh, prices.currency),
        equation:
          'present value of building, upkeep, pump power and replacements less what is left at the end, divided by the discounted solar heat',
        inputs: [
          ...cost.heat.receipt.map((line) => ({
            name: line.label,
            value: pricePerKwh(line.perKwh, prices.currency),
          })),
          { name: 'solar heat a year', value: kwh(solarKwh) },
        ],
        entered: priceInputs(prices),
        source: 'Form of IEA SHC Task 54; house emitters and boiler are not counted.',
        method: [COST_OF_HEAT, REPLACEMENTS],
      };
    case 'fuel':
      return {
        title: 'Fuel still bought',
        value: fuel(year.boughtKwh),
        equation: 'backup heat to heating and hot water, divided by the efficiency of the backup',
        inputs: [
          { name: 'backup to the heating', value: kwh(year.backupHeatingKwh) },
          { name: 'backup to hot water', value: kwh(year.backupTapKwh) },
          efficiency,
          { name: 'bought energy', value: kwh(year.boughtKwh) },
          perKg,
        ],
        entered: designInputs(design),
        source: 'Sums over the hours of this run.',
        method: [YEAR_LOOP, CHOICES_LINK],
      };
    case 'reference':
      return {
        title: 'Fuel without the sun',
        value: fuel(year.referenceBoughtKwh),
        equation:
          'need of the same house in the same year without array and store, divided by the efficiency of the backup',
        inputs: [{ name: 'need without the sun', value: kwh(year.referenceNeedKwh) }, efficiency, perKg],
        source: 'A run of its own with the same house and weather.',
        method: [YEAR_LOOP, equationLink('Heat loss of the house', 'house', 'houseHeat'), CHOICES_LINK],
      };
  }
}

/** Opens the area of one of the two fields. */
function explainArea(number: 'area' | 'secondArea', { design, result: { year } }: StudyAnswer): Explanation {
  const { collector, array } = (number === 'secondArea' && design.second) || design;
  const fields = builtFields(design);
  const wholeM2 = fields.reduce((sum, field) => sum + field.array.areaM2, 0);
  return {
    title: number === 'area' ? 'Array area' : 'Area of the second field',
    value: withUnit(formatTyped(array.areaM2), 'm²'),
    equation: `An input: ${number === 'area' ? 'the lever below sets it' : 'the form “Loop and store” sets it'}.`,
    inputs: [
      enteredInput(arraySchema.shape.areaM2, array.areaM2),
      { name: 'area basis of the curve', value: collector.curve.areaBasis },
      enteredInput(collectorSchema.shape.widthFactor, collector.widthFactor),
      {
        name: `collected per square metre${fields.length > 1 ? ' of both fields' : ''}`,
        value: kwh(year.collectedKwh / wholeM2),
      },
    ],
    source: 'Area basis as in ISO 9806.',
    method: [COLLECTOR_CURVE, equationLink('Another area basis', 'collector', 'toAreaBasis')],
  };
}

/** The entered prices behind a cost of heat. */
export function priceInputs(prices: Prices) {
  const { realRate, years, upkeepPerYear, storeFixed, storePerL, electricityPerKwh } = pricesSchema.shape;
  return [
    enteredInput(realRate, prices.realRate),
    enteredInput(years, prices.years),
    enteredInput(storeFixed, prices.storeFixed, prices.currency),
    enteredInput(storePerL, prices.storePerL, prices.currency),
    enteredInput(upkeepPerYear, prices.upkeepPerYear, prices.currency),
    enteredInput(electricityPerKwh, prices.electricityPerKwh, prices.currency),
  ];
}
