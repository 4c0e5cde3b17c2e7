import { HOT_STONE, packCarriers } from '@/components/mosaic/stones';
import { annuityFactor } from '@/lib/economics/annuity';
import { designCost } from '@/lib/economics/design-cost';
import type { ReceiptKind } from '@/lib/economics/cost-of-heat';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import { builtFields } from '@/lib/simulation/built-fields';
import type { YearResult } from '@/lib/simulation/results';
import { HOURS_PER_YEAR } from '@/lib/units/constants';

/** What a comparison shows of one design: plain figures that a page can send to the browser. */
export interface ComparedDesign {
  id: string;
  name: string;
  /** of all fields together */
  areaM2: number;
  /** the collector fields that are built: none, one or two */
  fields: { areaM2: number; cover: DesignRecord['collector']['cover'] }[];
  volumeL: number;
  weatherName: string;
  synthetic: boolean;
  roomSetC: number;
  /** one digit per hour: index into the carriers, or the mark of an empty array too hot; see `readStones` */
  stones: string;
  /** solar fraction [-] */
  solarShare: number;
  solarKwh: number;
  /** heat that the backup gives [kWh] */
  backupHeatKwh: number;
  boughtKwh: number;
  unmetKwh: number;
  /** cost of solar heat [money/kWh]; NaN without any */
  costPerKwh: number;
  toBuild: number;
  /** what a year costs to run: fuel, pump, upkeep and the yearly share of replacements [money/year] */
  runningPerYear: number;
  replaces: boolean;
  /** hours in which the empty array is too hot for one of its parts */
  hotHours: number;
  /** the part that is worst off when the array stands dry; undefined when all bear it */
  hotPart: { material: string; limitC: number; hottestC: number; hours: number } | undefined;
  /** cost of a kilowatt hour, line by line [money/kWh] */
  receipt: { kind: ReceiptKind; label: string; perKwh: number }[];
  ownHours: number;
  /** a useful kilowatt hour from the backup [money/kWh] */
  backupPerKwh: number;
}

function worstPart(result: YearResult): ComparedDesign['hotPart'] {
  const [worst] = result.dryParts
    .filter((part) => part.hoursAboveShort > 0)
    .sort((a, b) => b.hoursAboveShort - a.hoursAboveShort);
  return (
    worst && {
      material: worst.material,
      limitC: worst.shortTermLimitC,
      hottestC: worst.hottestC,
      hours: worst.hoursAboveShort,
    }
  );
}

/** The same designs under the part of their name before a comma, where that tells them apart. */
export function withShortNames(designs: readonly ComparedDesign[]): ComparedDesign[] {
  const short = designs.map(({ name }) => name.split(',')[0]!.trim());
  const telling = new Set(short).size === designs.length;
  return designs.map((design, i) => (telling ? { ...design, name: short[i]! } : design));
}

/** The stones of a comparison as bytes [8760]; they travel as digits, which pages compress well. */
export function readStones(digits: string): Uint8Array {
  return Uint8Array.from(digits, Number);
}

/** Draws the figures of a comparison from one simulated year. */
export function comparedDesign(
  id: string,
  design: DesignRecord,
  house: HouseRecord,
  prices: Prices,
  result: YearResult,
): ComparedDesign {
  const { year } = result;
  const built = builtFields(design);
  const cost = designCost(design, prices, result);
  const stones = new Uint8Array(HOURS_PER_YEAR);
  packCarriers(result.columns, stones);
  const presentUpkeep = cost.heat.receipt
    .filter(({ kind }) => kind === 'replacement' || kind === 'residual' || kind === 'upkeep')
    .reduce((sum, { presentValue }) => sum + presentValue, 0);
  return {
    id,
    name: design.name,
    areaM2: built.reduce((sum, { array }) => sum + array.areaM2, 0),
    fields: built.map(({ array, collector }) => ({ areaM2: array.areaM2, cover: collector.cover })),
    volumeL: design.store.volumeL,
    weatherName: result.weatherName,
    synthetic: result.synthetic,
    roomSetC: house.roomSetC,
    stones: stones.join(''),
    solarShare: year.fractions.solar,
    solarKwh: year.solarHeatingKwh + year.solarTapKwh,
    backupHeatKwh: year.backupHeatingKwh + year.backupTapKwh,
    boughtKwh: year.boughtKwh,
    unmetKwh: year.unmetKwh,
    costPerKwh: cost.heat.perKwh,
    toBuild: cost.toBuild,
    runningPerYear:
      cost.boughtMoneyPerYear + presentUpkeep * annuityFactor(prices.realRate / 100, prices.years),
    replaces: built.some(({ collector }) => collector.replacements.length > 0),
    hotHours: stones.reduce((sum, stone) => sum + (stone === HOT_STONE ? 1 : 0), 0),
    hotPart: worstPart(result),
    receipt: cost.heat.receipt.map(({ kind, label, perKwh }) => ({ kind, label, perKwh })),
    ownHours: cost.ownHours,
    backupPerKwh: cost.backupHeatPerKwh,
  };
}
