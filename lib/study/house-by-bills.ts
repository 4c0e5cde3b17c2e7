import { calibrateHouse, type HouseByBills } from '@/lib/calibration/calibrate-house';
import type { Outdoor } from '@/lib/calibration/degree-days';
import type { Banded } from '@/lib/calibration/energy-signature';
import { modelAgainstBills, type ModelAgainstBills } from '@/lib/calibration/model-against-bills';
import { tapHeatKwh } from '@/lib/physics/hot-water';
import type { BillsRecord } from '@/lib/schemas/bills';
import type { HouseRecord } from '@/lib/schemas/house';
import { houseHeat } from '@/lib/simulation/house-heat';

/** A house, what its bills say, and the simulated house beside them. */
export interface BillsStudy {
  byBills: HouseByBills;
  model?: ModelAgainstBills & {
    /** heat loss by the bills [W/K] */
    lossWPerK: Banded;
  };
  /** heat of the hot water as entered [kWh/d] */
  hotWaterKwhPerDay: number;
  outdoor: Outdoor;
}

/** Heat of a mean day's hot water at the tap [kWh]. */
export function hotWaterKwhPerDay({ litresPerDay, setC, mainsMeanC }: HouseRecord['hotWater']): number {
  return tapHeatKwh(litresPerDay, setC, mainsMeanC);
}

/**
 * Holds a house against its bills.
 * @param typicalDayC daily means of the weather year; null where none is chosen
 * @param modelDayKwh heat of the simulated house by day; absent while it is not worked
 */
export function houseByBills(
  bills: BillsRecord,
  house: HouseRecord,
  typicalDayC: readonly number[] | null,
  modelDayKwh?: readonly number[],
): BillsStudy {
  const monthMeanC = Object.fromEntries(bills.months.map(({ month, meanC }) => [month, meanC]));
  const outdoor: Outdoor = { monthMeanC, ...(typicalDayC ? { typicalDayC } : {}) };
  const hotWater = hotWaterKwhPerDay(house.hotWater);
  const byBills = calibrateHouse(bills, outdoor, hotWater);
  const model = modelDayKwh && modelAgainstBills(byBills, outdoor, modelDayKwh);
  const study = { byBills, hotWaterKwhPerDay: hotWater, outdoor };
  if (!model) return study;
  const { totalWPerK } = houseHeat(house);
  const { value, band } = model.ratio;
  return { ...study, model: { ...model, lossWPerK: { value: value * totalWPerK, band: band * totalWPerK } } };
}
