import { HOURS_PER_YEAR, KWH_PER_J, MONTH_START_HOUR, SECONDS_PER_HOUR } from '@/lib/units/constants';
import type { ArrayLoop } from './array-loop';
import type { Plan } from './plan';
import type { HourColumns } from './results';
import type { YearState } from './year-state';

/** Sums per month [J], in the order of one row of `monthJ`. */
export const MONTH_FIELDS = [
  'heating',
  'tap',
  'solarHeating',
  'solarTap',
  'backupHeating',
  'backupTap',
  'unmet',
  'collected',
  'plane',
  'storeLoss',
  'pipeLoss',
  'unused',
  'pump',
  'pumpS',
  'starts',
  'outdoorCS',
] as const;
export type MonthField = (typeof MONTH_FIELDS)[number];
const WIDTH = MONTH_FIELDS.length;

const MONTH_OF_HOUR = new Uint8Array(HOURS_PER_YEAR);
for (let month = 0; month < 12; month++) {
  MONTH_OF_HOUR.fill(month, MONTH_START_HOUR[month]!, MONTH_START_HOUR[month + 1]!);
}

/** Places in `Tally.hour`. */
export const HOUR = {
  SOLAR_HEATING: 0,
  SOLAR_TAP: 1,
  BACKUP_HEATING: 2,
  BACKUP_TAP: 3,
  TAP_LOAD: 4,
  UNMET: 5,
  DOWNWARD: 6,
  STORE_LOSS: 7,
  VENTILATION: 8,
  TRANSMISSION: 9,
  WINDOW_RELOSS: 10,
  SUPPLY: 11,
  RETURN: 12,
  /** sum of the duties, by which supply and return are weighted [-] */
  DUTY: 13,
} as const;

/** Allocates the hourly columns of a year. */
export function createColumns(layers: number): HourColumns {
  const column = () => new Float32Array(HOURS_PER_YEAR);
  return {
    outdoorC: column(),
    planeWm2: column(),
    arrayW: column(),
    pumpShare: column(),
    arrayC: column(),
    solarHeatingW: column(),
    solarTapW: column(),
    backupHeatingW: column(),
    backupTapW: column(),
    unmetW: column(),
    storeTopC: column(),
    storeBottomC: column(),
    storeLayersC: new Float32Array(HOURS_PER_YEAR * layers),
    roomC: column(),
    floorSurfaceC: column(),
    supplyC: column(),
    returnC: column(),
    dryPlateC: column(),
    dryCoverC: column(),
    dryBackC: column(),
    carrier: new Uint8Array(HOURS_PER_YEAR),
    overLimit: new Uint8Array(HOURS_PER_YEAR),
  };
}

/** Books one year while it runs: hourly columns as 32-bit floats, every sum in double precision. */
export class Tally {
  columns: HourColumns;
  readonly monthJ = new Float64Array(12 * WIDTH);

  // heat of the whole year [J]
  arraySunJ = 0;
  arrayLossJ = 0;
  pipeLossJ = 0;
  storeLossJ = 0;
  backupJ = 0;
  /** energy bought for the backup */
  boughtJ = 0;
  windowSunJ = 0;
  internalJ = 0;
  ventilationJ = 0;
  transmissionJ = 0;
  windowRelossJ = 0;
  downwardJ = 0;
  tapJ = 0;
  dismountedJ = 0;
  /** stored heat at the start and change over the year [J] */
  readonly startJ = new Float64Array(4);
  readonly changeJ = new Float64Array(4);

  starts = 0;
  /** time in this hour in which a pump ran [s] */
  pumpS = 0;
  coldestInletC = Infinity;
  plateMaxC = -Infinity;

  private hourStarts = 0;
  private givenJ = 0;
  private hourPipeJ = 0;
  private pumpJ = 0;
  private unusedJ = 0;
  /** mean powers [W] and loop temperatures [°C] of the hour that is being worked, by `HOUR` */
  readonly hour = new Float64Array(14);

  constructor(layers: number) {
    this.columns = createColumns(layers);
  }

  /** Clears everything for a new year and notes the heat stored at its start. */
  begin(state: YearState): void {
    this.monthJ.fill(0);
    this.boughtJ = 0;
    this.arraySunJ = this.arrayLossJ = this.pipeLossJ = this.storeLossJ = this.backupJ = 0;
    this.windowSunJ = this.internalJ = this.ventilationJ = this.transmissionJ = this.windowRelossJ = 0;
    this.downwardJ = this.tapJ = this.dismountedJ = 0;
    this.starts = this.hourStarts = 0;
    this.coldestInletC = Infinity;
    this.plateMaxC = -Infinity;
    this.noteStored(state, this.startJ);
  }

  /** Notes the change of stored heat at the end of the year. */
  end(state: YearState): void {
    this.noteStored(state, this.changeJ);
    for (let i = 0; i < 4; i++) this.changeJ[i]! -= this.startJ[i]!;
  }

  /** Heat given to rooms and taps, what was missing, and what was bought for it [kWh]. */
  need(): { needKwh: number; unmetKwh: number; boughtKwh: number } {
    let need = 0;
    let unmet = 0;
    for (let month = 0; month < 12; month++) {
      need += monthSum(this.monthJ, month, 'heating') + monthSum(this.monthJ, month, 'tap');
      unmet += monthSum(this.monthJ, month, 'unmet');
    }
    return { needKwh: need * KWH_PER_J, unmetKwh: unmet * KWH_PER_J, boughtKwh: this.boughtJ * KWH_PER_J };
  }

  /** Change of stored heat over the year / heat that went in [-]. */
  storedShare(): number {
    const change = this.changeJ.reduce((sum, heatJ) => sum + heatJ, 0);
    const input = this.arraySunJ + this.backupJ + this.windowSunJ + this.internalJ;
    return input > 0 ? Math.abs(change) / input : 0;
  }

  private noteStored(state: YearState, into: Float64Array): void {
    into.fill(0);
    for (const loop of state.loops) {
      const pipes = loop.input.pipeCapacityJPerK * loop.pipeC;
      into[0]! += loop.heatJ() - pipes;
      into[1]! += pipes;
    }
    into[2] = state.store.heatJ();
    into[3] = state.network.heatJ();
  }

  /** Books a sub-step of a collector field. */
  book(loop: ArrayLoop, sunJ: number, pumpJ: number): void {
    this.arraySunJ += sunJ;
    this.arrayLossJ += loop.arrayLossJ;
    this.hourPipeJ += loop.pipeLossJ;
    this.givenJ += loop.givenJ;
    this.pumpJ += pumpJ;
  }

  /** Books what a field could have given at the sink's temperature in its sub-step while the sink was locked. */
  bookUnused(loop: ArrayLoop, excessK: number): void {
    const { areaM2, a2 } = loop.input;
    const power = loop.absorbedWm2 - loop.a1 * excessK - a2 * excessK * Math.abs(excessK);
    if (power > 0) this.unusedJ += areaM2 * power * loop.dtS;
  }

  /** Writes the columns of the hour whose mean powers stand in `hour`, and adds its sums to month and year. */
  closeHour(h: number, state: YearState, plan: Plan): void {
    const { columns: c, hour } = this;
    const solarHeatingW = hour[HOUR.SOLAR_HEATING]!;
    const solarTapW = hour[HOUR.SOLAR_TAP]!;
    const backupHeatingW = hour[HOUR.BACKUP_HEATING]!;
    const backupTapW = hour[HOUR.BACKUP_TAP]!;
    const unmetW = hour[HOUR.UNMET]!;
    const outdoorC = plan.columns.outdoorC[h]!;
    const planeWm2 = plan.columns.planeWm2[h]!;
    c.outdoorC[h] = outdoorC;
    c.planeWm2[h] = planeWm2;
    c.arrayW[h] = this.givenJ / SECONDS_PER_HOUR;
    c.pumpShare[h] = this.pumpS / SECONDS_PER_HOUR;
    const first = state.loops[0]!;
    c.arrayC[h] = first.mounted ? first.arrayC : outdoorC;
    c.solarHeatingW[h] = solarHeatingW;
    c.solarTapW[h] = solarTapW;
    c.backupHeatingW[h] = backupHeatingW;
    c.backupTapW[h] = backupTapW;
    c.unmetW[h] = unmetW;
    c.storeTopC[h] = state.store.topC;
    c.storeBottomC[h] = state.store.bottomC;
    const layers = state.store.count;
    for (let i = 0; i < layers; i++) c.storeLayersC[h * layers + i] = state.store.t[i]!;
    c.roomC[h] = state.network.airC;
    c.floorSurfaceC[h] = plan.floorWPerK > 0 ? state.network.slabC : state.network.airC;
    const duty = hour[HOUR.DUTY]!;
    c.supplyC[h] = duty > 0 ? hour[HOUR.SUPPLY]! / duty : NaN;
    c.returnC[h] = duty > 0 ? hour[HOUR.RETURN]! / duty : NaN;

    const m = this.monthJ;
    const row = MONTH_OF_HOUR[h]! * WIDTH;
    m[row]! += (solarHeatingW + backupHeatingW) * SECONDS_PER_HOUR;
    m[row + 1]! += hour[HOUR.TAP_LOAD]! * SECONDS_PER_HOUR;
    m[row + 2]! += solarHeatingW * SECONDS_PER_HOUR;
    m[row + 3]! += solarTapW * SECONDS_PER_HOUR;
    m[row + 4]! += backupHeatingW * SECONDS_PER_HOUR;
    m[row + 5]! += backupTapW * SECONDS_PER_HOUR;
    m[row + 6]! += unmetW * SECONDS_PER_HOUR;
    m[row + 7]! += this.givenJ;
    for (let k = 0; k < state.loops.length; k++) {
      const { mounted, input } = state.loops[k]!;
      const plane = k === 0 ? planeWm2 : plan.second!.columns.planeWm2[h]!;
      if (mounted) m[row + 8]! += plane * input.areaM2 * SECONDS_PER_HOUR;
    }
    m[row + 9]! += hour[HOUR.STORE_LOSS]! * SECONDS_PER_HOUR;
    m[row + 10]! += this.hourPipeJ;
    m[row + 11]! += this.unusedJ;
    m[row + 12]! += this.pumpJ;
    m[row + 13]! += this.pumpS;
    m[row + 14]! += this.starts - this.hourStarts;
    m[row + 15]! += outdoorC * SECONDS_PER_HOUR;

    this.boughtJ +=
      (backupHeatingW / plan.columns.heatingEfficiency[h]! + backupTapW / plan.columns.tapEfficiency[h]!) *
      SECONDS_PER_HOUR;
    this.backupJ += (backupHeatingW + backupTapW) * SECONDS_PER_HOUR;
    this.tapJ += (solarTapW + backupTapW) * SECONDS_PER_HOUR;
    this.storeLossJ += hour[HOUR.STORE_LOSS]! * SECONDS_PER_HOUR;
    this.ventilationJ += hour[HOUR.VENTILATION]! * SECONDS_PER_HOUR;
    this.transmissionJ += hour[HOUR.TRANSMISSION]! * SECONDS_PER_HOUR;
    this.windowRelossJ += hour[HOUR.WINDOW_RELOSS]! * SECONDS_PER_HOUR;
    this.downwardJ += hour[HOUR.DOWNWARD]! * SECONDS_PER_HOUR;
    this.pipeLossJ += this.hourPipeJ;
    this.windowSunJ += plan.columns.windowSunW[h]! * SECONDS_PER_HOUR;
    this.internalJ += plan.internalW * SECONDS_PER_HOUR;
    this.hourStarts = this.starts;
    this.givenJ = this.hourPipeJ = this.pumpS = this.pumpJ = this.unusedJ = 0;
  }
}

/** Month of an hour of the year, January = 0. */
export function monthOf(hour: number): number {
  return MONTH_OF_HOUR[hour]!;
}

/** One month's sum [J] (or [s], count, [°C s]). */
export function monthSum(monthJ: Float64Array, month: number, field: MonthField): number {
  return monthJ[month * WIDTH + MONTH_FIELDS.indexOf(field)]!;
}
