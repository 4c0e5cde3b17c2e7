/** A line of money with its name; in the money of the price year. */
export interface MoneyLine {
  label: string;
  amount: number;
}

/** A part that is bought again each time its life is over. */
export interface ReplacementLine extends MoneyLine {
  /** life of the part [years], whole or not */
  everyYears: number;
}

export interface HeatCostInput {
  /** what the solar plant costs at the start; the house's own emitters and boiler do not belong here */
  investment: readonly MoneyLine[];
  grant: number;
  upkeepPerYear: number;
  pumpKwhPerYear: number;
  electricityPerKwh: number;
  replacements: readonly ReplacementLine[];
  /** real interest per year [-] */
  realRate: number;
  /** horizon [years] */
  years: number;
  /** useful solar heat in a year [kWh] */
  solarKwhPerYear: number;
  /** bought energy saved in a year [kWh] */
  savedKwhPerYear: number;
  /** loss of yield per year [-]; the t-th year gives (1 − d)^(t − 1) */
  yieldLossPerYear?: number;
}

export type ReceiptKind = 'investment' | 'grant' | 'upkeep' | 'pump' | 'replacement' | 'residual';

export interface ReceiptLine {
  kind: ReceiptKind;
  label: string;
  /** money of the price year, at the start; negative lines take off */
  presentValue: number;
  /** share in the cost of a kilowatt hour [money/kWh] */
  perKwh: number;
}

export interface HeatCost {
  /** cost of solar heat [money/kWh]; NaN without heat */
  perKwh: number;
  /** cost of a saved bought kilowatt hour [money/kWh]; NaN when nothing is saved */
  perSavedKwh: number;
  presentCost: number;
  /** discounted solar heat of the horizon [kWh] */
  presentHeatKwh: number;
  /** the lines add up to `perKwh` and `presentCost` */
  receipt: ReceiptLine[];
}

/**
 * Cost of solar heat: [I − S + Σ (upkeep + pump + replacements)/(1 + r)^t − RV/(1 + r)^n] / Σ Q/(1 + r)^t.
 * @param input investment, grant, yearly and repeated costs [money], rate [-], horizon [years], heat [kWh]
 * @returns cost per kilowatt hour [money/kWh] with a receipt whose lines add up to it
 * @remarks real prices throughout; a replacement due at the very end of the horizon is not bought; the part of a
 * life that is left at the end counts as residual value by straight line
 * @see IEA SHC Task 54, levelised cost of heat (form read; residual and replacement terms from memory)
 */
export function costOfHeat(input: HeatCostInput): HeatCost {
  const lines = presentValues(input);
  const presentCost = lines.reduce((sum, line) => sum + line.presentValue, 0);
  const presentHeatKwh = presentEnergy(input, input.solarKwhPerYear);
  const presentSavedKwh = presentEnergy(input, input.savedKwhPerYear);
  const per = (money: number, energy: number) => (energy > 0 ? money / energy : NaN);
  return {
    perKwh: per(presentCost, presentHeatKwh),
    perSavedKwh: per(presentCost, presentSavedKwh),
    presentCost,
    presentHeatKwh,
    receipt: lines.map((line) => ({ ...line, perKwh: per(line.presentValue, presentHeatKwh) })),
  };
}

function presentValues(input: HeatCostInput): Omit<ReceiptLine, 'perKwh'>[] {
  const yearly = presentEnergy({ ...input, yieldLossPerYear: 0 }, 1);
  const lines: Omit<ReceiptLine, 'perKwh'>[] = input.investment.map(({ label, amount }) => ({
    kind: 'investment',
    label,
    presentValue: amount,
  }));
  if (input.grant !== 0) lines.push({ kind: 'grant', label: 'grant', presentValue: -input.grant });
  lines.push(
    { kind: 'upkeep', label: 'upkeep', presentValue: input.upkeepPerYear * yearly },
    {
      kind: 'pump',
      label: 'pump power',
      presentValue: input.pumpKwhPerYear * input.electricityPerKwh * yearly,
    },
  );
  let residual = 0;
  for (const part of input.replacements) {
    const { presentValue, lifeLeft } = replacementValue(part, input.realRate, input.years);
    lines.push({ kind: 'replacement', label: part.label, presentValue });
    residual += (part.amount * lifeLeft) / (1 + input.realRate) ** input.years;
  }
  lines.push({ kind: 'residual', label: 'value left at the end', presentValue: -residual });
  return lines;
}

/**
 * Present value of all replacements of a part within a horizon, at each multiple of its life before the end, and
 * the share of its life left at the end.
 * @param part price [money] and life [years]
 * @param rate real interest per year [-]
 * @param years horizon [years]
 * @returns { presentValue [money], lifeLeft [-] }
 * @see straight-line residual value, VDI 2067-1 (from memory)
 */
export function replacementValue(
  part: ReplacementLine,
  rate: number,
  years: number,
): { presentValue: number; lifeLeft: number } {
  const times = Math.max(0, Math.ceil(years / part.everyYears - 1e-9) - 1);
  let presentValue = 0;
  for (let k = 1; k <= times; k++) presentValue += part.amount / (1 + rate) ** (k * part.everyYears);
  return { presentValue, lifeLeft: times + 1 - years / part.everyYears };
}

function presentEnergy(
  input: Pick<HeatCostInput, 'realRate' | 'years' | 'yieldLossPerYear'>,
  perYear: number,
): number {
  const kept = 1 - (input.yieldLossPerYear ?? 0);
  let sum = 0;
  for (let year = 1; year <= input.years; year++)
    sum += (perYear * kept ** (year - 1)) / (1 + input.realRate) ** year;
  return sum;
}
