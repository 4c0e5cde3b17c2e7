import { OF_SECOND_FIELD } from './built-fields';
import { markCarriers } from './carriers';
import { judgeDryHours, type DryColumns } from './dry-hours';
import { ENGINE_VERSION } from './engine-version';
import { solarFractions } from './fractions';
import { houseHeat } from './house-heat';
import type { Plan } from './plan';
import type { EnergyBalance, EnergyRow, PartDryness, YearResult } from './results';
import type { ReferenceNeed, SimulationInput } from './simulate';
import { monthSum, type MonthField, type Tally } from './tally';
import type { YearState } from './year-state';
import {
  DAYS_IN_MONTH,
  HOURS_PER_DAY,
  HOURS_PER_YEAR,
  J_PER_KWH,
  SECONDS_PER_HOUR,
} from '@/lib/units/constants';

/** Turns the sums and columns of a run into the result that people read. */
export function assembleResult(
  input: SimulationInput,
  plan: Plan,
  state: YearState,
  tally: Tally,
  reference: ReferenceNeed,
  dry: readonly DryColumns[],
): YearResult {
  const { columns } = tally;
  const heat = houseHeat(input.house);
  const carrierHours = markCarriers(columns, heat.designLoadW);
  const parts = judgeFields(input, plan, dry, columns);
  const months = Array.from({ length: 12 }, (_, month) => monthRow(tally, month));
  const sum = yearRow(months);
  const backupKwh = sum.backupHeatingKwh + sum.backupTapKwh;
  const boughtKwh = tally.boughtJ / J_PER_KWH;
  // heat that nobody gave is counted as bought at the mean efficiency of the reference house
  const meanEfficiency = reference.boughtKwh > 0 ? reference.needKwh / reference.boughtKwh : 1;
  return {
    engineVersion: ENGINE_VERSION,
    layers: plan.layers,
    theta: plan.theta,
    subSteps: state.subSteps,
    weatherName: input.weather.name,
    synthetic: input.weather.synthetic,
    columns,
    months,
    year: {
      ...sum,
      fractions: solarFractions({
        solarKwh: sum.solarHeatingKwh + sum.solarTapKwh,
        backupKwh,
        boughtKwh: boughtKwh + sum.unmetKwh / meanEfficiency,
        pumpKwh: sum.pumpKwh,
        referenceBoughtKwh: reference.boughtKwh + reference.unmetKwh / meanEfficiency,
      }),
      referenceNeedKwh: reference.needKwh,
      boughtKwh,
      referenceBoughtKwh: reference.boughtKwh,
      roomMinC: least(columns.roomC),
      roomMaxC: largest(columns.roomC),
      floorMaxC: largest(columns.floorSurfaceC),
      floorHeatedMaxC: largestWhile(columns.floorSurfaceC, columns.supplyC),
      southern: input.weather.latitudeDeg < 0,
      latitudeDeg: input.weather.latitudeDeg,
      storeMaxC: largest(columns.storeTopC),
      plateMaxC: tally.plateMaxC,
      colderThanAirHours: colderThanAir(columns),
      coldestInletC: tally.coldestInletC,
      carrierHours,
      overLimitHours: columns.overLimit.reduce((hours, mark) => (mark ? hours + 1 : hours), 0),
      designLoadW: heat.designLoadW,
    },
    balance: energyBalance(tally, plan),
    dryParts: parts,
  };
}

/** Judges the dry hours of each collector field; the columns of the result show the first. */
function judgeFields(
  input: SimulationInput,
  plan: Plan,
  dry: readonly DryColumns[],
  columns: YearResult['columns'],
): PartDryness[] {
  const { collector, second } = input.design;
  const first = judgeDryHours(dry[0]!, plan.columns.mounted, plan.columns.planeWm2, collector, columns);
  if (!second || !plan.second) return first;
  const unseen = () => new Float32Array(HOURS_PER_YEAR);
  const aside = {
    dryPlateC: unseen(),
    dryCoverC: unseen(),
    dryBackC: unseen(),
    overLimit: columns.overLimit,
  };
  const { mounted, planeWm2 } = plan.second.columns;
  const others = judgeDryHours(dry[1]!, mounted, planeWm2, second.collector, aside, first.length);
  return [...first, ...others.map((part) => ({ ...part, name: part.name + OF_SECOND_FIELD }))];
}

function monthRow(tally: Tally, month: number): EnergyRow {
  const of = (field: MonthField) => monthSum(tally.monthJ, month, field);
  const kwh = (field: MonthField) => of(field) / J_PER_KWH;
  const pumpHours = of('pumpS') / SECONDS_PER_HOUR;
  return {
    heatingKwh: kwh('heating'),
    tapKwh: kwh('tap'),
    solarHeatingKwh: kwh('solarHeating'),
    solarTapKwh: kwh('solarTap'),
    backupHeatingKwh: kwh('backupHeating'),
    backupTapKwh: kwh('backupTap'),
    unmetKwh: kwh('unmet'),
    collectedKwh: kwh('collected'),
    planeKwh: kwh('plane'),
    storeLossKwh: kwh('storeLoss'),
    pipeLossKwh: kwh('pipeLoss'),
    pumpKwh: kwh('pump'),
    unusedKwh: kwh('unused'),
    starts: of('starts'),
    pumpHours,
    meanOutdoorC: of('outdoorCS') / (DAYS_IN_MONTH[month]! * HOURS_PER_DAY * SECONDS_PER_HOUR),
  };
}

function yearRow(months: EnergyRow[]): EnergyRow {
  const year = { ...months[0]! };
  const keys = Object.keys(year) as (keyof EnergyRow)[];
  for (const key of keys) year[key] = months.reduce((sum, month) => sum + month[key], 0);
  const days = DAYS_IN_MONTH.reduce((sum, day) => sum + day, 0);
  year.meanOutdoorC = months.reduce((sum, m, i) => sum + m.meanOutdoorC * DAYS_IN_MONTH[i]!, 0) / days;
  return year;
}

function energyBalance(tally: Tally, plan: Plan): EnergyBalance {
  const kwh = (joules: number) => joules / J_PER_KWH;
  const inKwh = {
    arraySun: kwh(tally.arraySunJ),
    backup: kwh(tally.backupJ),
    windowSun: kwh(tally.windowSunJ),
    internal: kwh(tally.internalJ),
  };
  const outKwh = {
    arrayLoss: kwh(tally.arrayLossJ),
    pipeLoss: kwh(tally.pipeLossJ),
    // inside the house this heat stays in the rooms and leaves through the shell
    storeLoss: plan.storeInside ? 0 : kwh(tally.storeLossJ),
    houseTransmission: kwh(tally.transmissionJ),
    houseVentilation: kwh(tally.ventilationJ),
    windowReloss: kwh(tally.windowRelossJ),
    floorDownward: kwh(tally.downwardJ),
    tap: kwh(tally.tapJ),
    dismounted: kwh(tally.dismountedJ),
  };
  const storedKwh = {
    array: kwh(tally.changeJ[0]!),
    pipes: kwh(tally.changeJ[1]!),
    store: kwh(tally.changeJ[2]!),
    house: kwh(tally.changeJ[3]!),
  };
  const total = (parts: Record<string, number>) => Object.values(parts).reduce((sum, x) => sum + x, 0);
  const residualKwh = total(inKwh) - total(outKwh) - total(storedKwh);
  return { inKwh, outKwh, storedKwh, residualKwh, residualShare: Math.abs(residualKwh) / total(inKwh) };
}

function largest(values: Float32Array): number {
  let most = -Infinity;
  for (const value of values) if (value > most) most = value;
  return most;
}

/** Hours in which most of the time a pump ran with the first field colder than the air. */
function colderThanAir({ pumpShare, arrayC, outdoorC }: YearResult['columns']): number {
  let hours = 0;
  for (let h = 0; h < pumpShare.length; h++) if (pumpShare[h]! > 0.5 && arrayC[h]! < outdoorC[h]!) hours++;
  return hours;
}

/** Largest value in hours in which the other column has one. */
function largestWhile(values: Float32Array, running: Float32Array): number {
  let most = -Infinity;
  for (let h = 0; h < values.length; h++) {
    if (!Number.isNaN(running[h]!) && values[h]! > most) most = values[h]!;
  }
  return most;
}

function least(values: Float32Array): number {
  let most = Infinity;
  for (const value of values) if (value < most) most = value;
  return most;
}
