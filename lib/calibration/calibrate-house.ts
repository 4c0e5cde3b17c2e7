import { DAYS_PER_YEAR, HOURS_PER_DAY, HOURS_PER_YEAR, WH_PER_KWH } from '@/lib/units/constants';
import type { BillInterval, BillRow, RowAnswer } from './bill-row';
import { degreeDays, meanOutdoorC, outdoorDays, type Outdoor, type OutdoorDays } from './degree-days';
import {
  energySignature,
  HINGE_FROM_C,
  HINGE_TO_C,
  type Banded,
  type EnergySignature,
  type SignaturePoint,
} from './energy-signature';
import { intervalsBetweenDates } from './intervals-between-dates';
import { intervalsOfMeter } from './intervals-of-meter';
import { slopeRefusals } from './slope-refusal';

/** Readings and what turns them into heat. */
export interface Bills {
  way: 'between two dates' | 'meter readings';
  /** energy in one unit of the bills [kWh] */
  kwhPerUnit: number;
  /** useful heat / energy in the fuel, on the same calorific value [-] */
  efficiency: number;
  /** fuel of the same meter for cooking and the like [kWh/a] */
  otherKwhPerYear: number;
  /** heat of a stove that is on no bill [kWh/a], and how well it is known [-] */
  stoveKwhPerYear: number;
  stoveBandShare: number;
  meterDigits: number;
  rows: readonly BillRow[];
}

/** An interval with its heat and its weather. */
export interface HeatInterval extends BillInterval, SignaturePoint {
  meanC: number;
  /** useful heat [kWh] */
  heatKwh: number;
}

/** What the bills say of the house. */
export interface HouseByBills {
  intervals: HeatInterval[];
  answers: RowAnswer[];
  /** rows that count, and of these the estimated ones */
  counted: number;
  estimated: number;
  /** days that the intervals cover [d] */
  days: number;
  /** why no slope is read; empty when there is one */
  refusals: string[];
  signature?: EnergySignature;
  /** heat loss of the house with the stove's heat added [W/K] */
  lossWPerK?: Banded;
  /** heat that does not follow the weather [kWh/d] */
  baseKwhPerDay?: Banded;
  /** where no slope is read: the heat loss between these [W/K] */
  lossRange?: { low: number; high: number };
  /** heat of the year of the outdoor days, without the stove's [kWh/a] */
  yearKwh?: number;
}

const W_PER_KWH_PER_DAY = WH_PER_KWH / HOURS_PER_DAY;
/** Heating limits between which a house is taken to lie where no hinge is found [°C]. */
const HINGE_LOW_C = 12;
const HINGE_HIGH_C = 17;

/**
 * Useful heat of an interval: (quantity·h − other·N/365)·η.
 * @param quantity used [unit of the bills] from 0
 * @param days N [d]
 * @param bills energy per unit h [kWh], other use [kWh/a], efficiency η [-]
 * @returns heat [kWh] from 0
 * @see own definition
 */
export function usefulHeatKwh(
  quantity: number,
  days: number,
  bills: Pick<Bills, 'kwhPerUnit' | 'otherKwhPerYear' | 'efficiency'>,
): number {
  const fuelKwh = quantity * bills.kwhPerUnit - (bills.otherKwhPerYear * days) / DAYS_PER_YEAR;
  return Math.max(0, fuelKwh) * bills.efficiency;
}

function withHeat(
  intervals: readonly BillInterval[],
  bills: Bills,
  outdoor: Outdoor,
  answers: RowAnswer[],
): HeatInterval[] {
  return intervals.flatMap((interval) => {
    const days = interval.to - interval.from;
    const weather = outdoorDays(interval.from, interval.to, outdoor);
    if (!weather) {
      for (const row of interval.rows)
        answers.push({
          row,
          kind: 'left out',
          text: 'No outdoor temperature is known for it: choose a weather year, or type the mean of its months. Left out.',
        });
      return [];
    }
    const heatKwh = usefulHeatKwh(interval.quantity, days, bills);
    const powerW = (heatKwh / days) * W_PER_KWH_PER_DAY;
    return [{ ...interval, days, outdoor: weather, meanC: meanOutdoorC(weather), heatKwh, powerW }];
  });
}

/** A stove heats when the house needs it: its heat of a year goes with the degree days of the year. */
function stoveWPerK(stoveKwh: number, points: readonly HeatInterval[], hingeC: number): number {
  const sum = points.reduce((total, point) => total + degreeDays(point.outdoor, hingeC), 0);
  const days = points.reduce((total, point) => total + point.days, 0);
  const perYear = (sum / days) * DAYS_PER_YEAR;
  return perYear > 0 ? (stoveKwh * W_PER_KWH_PER_DAY) / perYear : 0;
}

/**
 * Heat loss between two heating limits, from the whole heat of all intervals less a base load taken from elsewhere.
 * @param points intervals with heat [kWh], days [d] and weather [°C]
 * @param baseKwhPerDay base load [kWh/d]
 * @returns loss [W/K] for a limit of 17 °C and of 12 °C; undefined without cold days
 * @see own definition: 12 to 17 °C as heating limit is common practice, no source
 */
export function lossRange(
  points: readonly HeatInterval[],
  baseKwhPerDay: number,
): { low: number; high: number } | undefined {
  const days = points.reduce((sum, point) => sum + point.days, 0);
  const heatKwh = points.reduce((sum, point) => sum + point.heatKwh, 0) - baseKwhPerDay * days;
  const loss = (hingeC: number) => {
    const sum = points.reduce((total, point) => total + degreeDays(point.outdoor, hingeC), 0);
    return sum > 0 ? (Math.max(0, heatKwh) * W_PER_KWH_PER_DAY) / sum : NaN;
  };
  const [low, high] = [loss(HINGE_HIGH_C), loss(HINGE_LOW_C)];
  return Number.isFinite(low) && Number.isFinite(high) ? { low, high } : undefined;
}

function yearHeatKwh(signature: EnergySignature, typicalDayC: ArrayLike<number>): number {
  const year: OutdoorDays[] = Array.from(typicalDayC, (meanC) => ({ days: 1, meanC, scattered: false }));
  const heating = (signature.slope.value * degreeDays(year, signature.hinge.value)) / W_PER_KWH_PER_DAY;
  return heating + (signature.base.value * HOURS_PER_YEAR) / WH_PER_KWH;
}

const atEdge = (hingeC: number) => hingeC < HINGE_FROM_C + 0.01 || hingeC > HINGE_TO_C - 0.01;

/**
 * Heat loss and base load of a house from its fuel bills.
 * @param bills readings and what turns them into heat
 * @param outdoor days of a typical year, means of real months [°C]
 * @param hotWaterKwhPerDay base load for the range where no slope is read [kWh/d]
 * @returns intervals, answers to rows, and the fit or the reasons against one
 * @remarks where no real month is known, the weather of a typical year stands for that of the bills
 * @see `energySignature` for the fit; the stove's heat is shared by degree days: own definition
 */
export function calibrateHouse(bills: Bills, outdoor: Outdoor, hotWaterKwhPerDay: number): HouseByBills {
  const read =
    bills.way === 'meter readings'
      ? intervalsOfMeter(bills.rows, bills.meterDigits)
      : intervalsBetweenDates(bills.rows);
  const answers = [...read.answers];
  const intervals = withHeat(read.intervals, bills, outdoor, answers).sort((a, b) => a.from - b.from);
  const counted = bills.rows.length;
  const estimated = bills.rows.filter((row) => row.estimated).length;
  const days = intervals.reduce((sum, interval) => sum + interval.days, 0);
  const temperatures = intervals.map((interval) => interval.meanC);
  const refusals = slopeRefusals({
    intervals: intervals.length,
    days,
    estimatedShare: counted > 0 ? estimated / counted : 0,
    coldestC: Math.min(...temperatures),
    warmestC: Math.max(...temperatures),
  });
  answers.sort((a, b) => a.row - b.row);
  const found = { intervals, answers, counted, estimated, days };
  const signature = refusals.length === 0 ? energySignature(intervals) : undefined;
  if (signature && atEdge(signature.hinge.value))
    refusals.push(
      `No outdoor temperature between ${HINGE_FROM_C} and ${HINGE_TO_C} °C is found at which heating begins: the readings, or their dates, cannot be right.`,
    );
  else if (signature && !(signature.slope.value > signature.slope.band))
    refusals.push(
      'The heat of the bills does not follow the weather: the readings, or their dates, cannot be right.',
    );
  if (!signature || refusals.length > 0)
    return { ...found, refusals, lossRange: lossRange(intervals, hotWaterKwhPerDay) };
  const stove = stoveWPerK(bills.stoveKwhPerYear, intervals, signature.hinge.value);
  const base = signature.base;
  return {
    ...found,
    refusals,
    signature,
    lossWPerK: {
      value: signature.slope.value + stove,
      band: Math.hypot(signature.slope.band, stove * bills.stoveBandShare),
    },
    baseKwhPerDay: { value: base.value / W_PER_KWH_PER_DAY, band: base.band / W_PER_KWH_PER_DAY },
    ...(outdoor.typicalDayC ? { yearKwh: yearHeatKwh(signature, outdoor.typicalDayC) } : {}),
  };
}
