import { HOURS_PER_DAY, WH_PER_KWH } from '@/lib/units/constants';
import { agreement, type Agreement } from './agreement';
import type { HeatInterval, HouseByBills } from './calibrate-house';
import { dayOfTypicalYear } from './day-number';
import { degreeDays, outdoorDays, type Outdoor } from './degree-days';
import { energySignature, type Banded } from './energy-signature';

/** The simulated house beside its bills. */
export interface ModelAgainstBills {
  /** heat of the simulated house in each interval, at the weather of the bills [kWh] */
  heatKwh: number[];
  agreement: Agreement;
  /** slope of the bills / slope of the simulated house, the same line fitted to both [-] */
  ratio: Banded;
  /** slope of the simulated house [W/K] */
  slopeWPerK: number;
}

const W_PER_KWH_PER_DAY = WH_PER_KWH / HOURS_PER_DAY;

function typicalHeatKwh({ from, to }: HeatInterval, modelDayKwh: ArrayLike<number>): number {
  let sum = 0;
  for (let day = from; day < to; day++) sum += modelDayKwh[dayOfTypicalYear(day)]!;
  return sum;
}

/**
 * Compares the simulated house with its bills, like with like: the line that is fitted to the bills is fitted to the
 * simulated heat of the same intervals too. Sun through windows, set-points and losses under a heated floor bend both
 * lines alike, so that the ratio of their slopes is the ratio of the heat losses to first order.
 * @param found what the bills say
 * @param outdoor typical days and real months [°C]
 * @param modelDayKwh heat of the simulated house on each of the 365 days of the typical year [kWh]
 * @returns heat [kWh], agreement [-] and ratio [-]; undefined where the bills have no slope or there is no typical year
 * @remarks where the mean of a real month is known, the simulated heat is moved by its own slope to that month
 * @see ASHRAE Guideline 14-2014, 5.3.2 (from memory): one parameter for a simulation; the ratio of slopes is an own
 * definition
 */
export function modelAgainstBills(
  found: HouseByBills,
  outdoor: Outdoor,
  modelDayKwh: ArrayLike<number>,
): ModelAgainstBills | undefined {
  const { typicalDayC } = outdoor;
  const { intervals, lossWPerK } = found;
  if (!lossWPerK || !typicalDayC) return undefined;
  const typical = intervals.map((interval) => ({
    days: interval.days,
    powerW: (typicalHeatKwh(interval, modelDayKwh) / interval.days) * W_PER_KWH_PER_DAY,
    outdoor: outdoorDays(interval.from, interval.to, { typicalDayC, monthMeanC: {} })!,
  }));
  const line = energySignature(typical);
  const slope = line.slope.value;
  if (!(slope > 0)) return undefined;
  const heatKwh = intervals.map((interval, i) => {
    const { outdoor: days, powerW } = typical[i]!;
    const colder = degreeDays(interval.outdoor, line.hinge.value) - degreeDays(days, line.hinge.value);
    return (powerW * interval.days + slope * colder) / W_PER_KWH_PER_DAY;
  });
  const measured = intervals.map((interval) => interval.heatKwh);
  return {
    heatKwh,
    agreement: agreement(measured, heatKwh, 1),
    ratio: { value: lossWPerK.value / slope, band: lossWPerK.band / slope },
    slopeWPerK: slope,
  };
}
