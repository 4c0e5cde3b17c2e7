import type { YearResult } from '@/lib/simulation/results';
import { discountedPaybackYears, simplePaybackYears } from './cash-flow';
import { costOfHeat, type HeatCost, type MoneyLine, type ReplacementLine } from './cost-of-heat';

/** Prices of a project; money without a currency, which the project names. */
export interface PriceList {
  fuelPerKwh: number;
  fuelKwhPerKg: number;
  fuelCo2KgPerKwh: number;
  electricityPerKwh: number;
  storeFixed: number;
  storePerL: number;
  pumpAndControl: number;
  pipeFixed: number;
  pipePerM: number;
  interfaceFixed: number;
  upkeepPerYear: number;
  ownHours: number;
  hourlyRate: number;
  grant: number;
  /** real interest [%] */
  realRate: number;
  years: number;
}

/** What of a design costs money. */
export interface PricedDesign {
  collector: {
    pricePerM2: number;
    replacements: readonly { label: string; pricePerM2: number; everyYears: number }[];
  };
  array: { areaM2: number; pipeLengthM: number };
  /** a second field on the same store, with pipes, pump and control of its own */
  second?: Pick<PricedDesign, 'collector' | 'array'> | null;
  store: { volumeL: number };
}

export interface DesignCost {
  /** material and bought work, own hours not counted */
  toBuild: number;
  investment: MoneyLine[];
  heat: HeatCost;
  ownHours: number;
  /** own hours at the project's rate; 0 while they are not priced */
  ownHoursAmount: number;
  /** bought energy saved in a year [kWh], and its money less the pump's power */
  savedKwhPerYear: number;
  savedMoneyPerYear: number;
  boughtMoneyPerYear: number;
  referenceMoneyPerYear: number;
  /** a useful kilowatt hour from the backup [money/kWh] */
  backupHeatPerKwh: number;
  /** weight of the fuel with and without the sun [kg] */
  fuelKg: number;
  referenceFuelKg: number;
  savedCo2KgPerYear: number;
  simplePaybackYears: number;
  discountedPaybackYears: number;
}

/**
 * Prices a design: what it costs to build, what its solar heat costs over the years counted, and what it saves.
 * A design without array costs nothing.
 *
 * @param design areas [m²], pipe each way [m], store [L], collector prices [money/m²]
 * @param prices price list [money]
 * @param result simulated year [kWh]
 * @returns money and energies of the design
 * @see IEA SHC Task 54 form of the cost of heat, see `cost-of-heat.ts`; nothing for the house's own emitters or boiler
 */
export function designCost(
  design: PricedDesign,
  prices: PriceList,
  result: Pick<YearResult, 'year'>,
): DesignCost {
  const { year } = result;
  const fields = [design, ...(design.second ? [design.second] : [])].filter(({ array }) => array.areaM2 > 0);
  const built = fields.length > 0;
  const pipesM = fields.reduce((total, { array }) => total + array.pipeLengthM, 0);
  const ofField = (place: number) => (place > 0 ? ' of the second field' : '');
  const ownHoursAmount = built ? prices.ownHours * prices.hourlyRate : 0;
  const investment: MoneyLine[] = built
    ? [
        ...fields.map(({ collector, array }, place) => ({
          label: `collectors${ofField(place)}`,
          amount: collector.pricePerM2 * array.areaM2,
        })),
        { label: 'store', amount: prices.storeFixed + prices.storePerL * design.store.volumeL },
        { label: 'pump and control', amount: prices.pumpAndControl * fields.length },
        {
          label: 'pipes',
          amount: prices.pipeFixed + prices.pipePerM * 2 * pipesM,
        },
        { label: 'mixing and interface', amount: prices.interfaceFixed },
      ]
    : [];
  const toBuild = investment.reduce((sum, line) => sum + line.amount, 0);
  const priced: MoneyLine[] =
    ownHoursAmount > 0 ? [...investment, { label: 'own hours', amount: ownHoursAmount }] : investment;
  const replacements: ReplacementLine[] = fields.flatMap(({ collector, array }, place) =>
    collector.replacements.map(({ label, pricePerM2, everyYears }) => ({
      label: label + ofField(place),
      amount: pricePerM2 * array.areaM2,
      everyYears,
    })),
  );
  const savedKwhPerYear = year.referenceBoughtKwh - year.boughtKwh;
  const pumpMoney = year.pumpKwh * prices.electricityPerKwh;
  const savedMoneyPerYear = savedKwhPerYear * prices.fuelPerKwh - pumpMoney;
  const realRate = prices.realRate / 100;
  const upkeep = built ? prices.upkeepPerYear : 0;
  const spent = toBuild + ownHoursAmount - prices.grant;
  const netSaving = savedMoneyPerYear - upkeep;
  return {
    toBuild,
    investment,
    heat: costOfHeat({
      investment: priced,
      grant: built ? prices.grant : 0,
      upkeepPerYear: upkeep,
      pumpKwhPerYear: year.pumpKwh,
      electricityPerKwh: prices.electricityPerKwh,
      replacements,
      realRate,
      years: prices.years,
      solarKwhPerYear: year.solarHeatingKwh + year.solarTapKwh,
      savedKwhPerYear,
    }),
    ownHours: built ? prices.ownHours : 0,
    ownHoursAmount,
    savedKwhPerYear,
    savedMoneyPerYear,
    boughtMoneyPerYear: year.boughtKwh * prices.fuelPerKwh + pumpMoney,
    referenceMoneyPerYear: year.referenceBoughtKwh * prices.fuelPerKwh,
    backupHeatPerKwh: (prices.fuelPerKwh * year.referenceBoughtKwh) / year.referenceNeedKwh,
    fuelKg: year.boughtKwh / prices.fuelKwhPerKg,
    referenceFuelKg: year.referenceBoughtKwh / prices.fuelKwhPerKg,
    savedCo2KgPerYear: savedKwhPerYear * prices.fuelCo2KgPerKwh,
    simplePaybackYears: built ? simplePaybackYears(spent, netSaving) : NaN,
    discountedPaybackYears: built ? discountedPaybackYears(spent, netSaving, 0, realRate) : NaN,
  };
}
