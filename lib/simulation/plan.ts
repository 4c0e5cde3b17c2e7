/**
 * Everything that the year loop reads, flattened into typed arrays and plain numbers. A plan is built once per
 * change of inputs (`build-plan.ts`); the loop itself knows neither designs nor weather files.
 */
import type { NetworkInput } from '@/lib/physics/house-network';
import type { ArrayLoopInput } from './array-loop';

/** Hourly columns of one collector field, 8,760 values each. */
export interface FieldColumns {
  /** sun absorbed by the collector at its curve, all terms that do not depend on its temperature [W/m²] */
  absorbedWm2: Float64Array;
  /** linear loss with its wind term [W/(m²K)] */
  a1: Float64Array;
  /** irradiance on the plane of the array [W/m²] */
  planeWm2: Float64Array;
  /** 1 while the array hangs outside */
  mounted: Uint8Array;
}

/** One collector field on the store. */
export interface FieldPlan {
  array: ArrayLoopInput;
  columns: FieldColumns;
  pumpW: number;
}

/** Hourly columns of 8,760 values. */
export interface PlanColumns extends FieldColumns {
  /** outdoor air, mean of the hour [°C] */
  outdoorC: Float64Array;
  /** sun through the windows [W] */
  windowSunW: Float64Array;
  /** set point of the room air [°C] */
  roomSetC: Float64Array;
  /** useful heat / bought energy of the backup for rooms and for taps [-] */
  heatingEfficiency: Float64Array;
  tapEfficiency: Float64Array;
  /** set supply of the emitter loop [°C] */
  supplySetC: Float64Array;
  /** tapped water at the tap's set temperature [kg/s] */
  tapKgPerS: Float64Array;
  mainsC: Float64Array;
}

/** Step of the table of radiators and its length: 0 to 80 K. */
export const EXCESS_STEP_K = 0.5;
export const EXCESS_STEPS = 160;

/** The collector fields of a plan, one or two. */
export function fieldsOf(plan: Plan): FieldPlan[] {
  const first = { array: plan.array, columns: plan.columns, pumpW: plan.pumpW };
  return plan.second ? [first, plan.second] : [first];
}

export interface Plan {
  columns: PlanColumns;
  theta: number;
  /** outer steps of an hour: 4, or 720 for the fine run that judges them */
  stepsPerHour: number;
  /** sub-steps after which the run is given up */
  subStepCap: number;

  /** false without an array in any month: then the store is not there either */
  hasArray: boolean;
  /** the array heats the slab of the floor itself; there is no store */
  toSlab: boolean;
  array: ArrayLoopInput;
  /** sink above which charging is locked: top of the store, or room air with the slab as sink; unlocked this much lower */
  limitC: number;
  unlockK: number;
  pumpW: number;
  /** a second field of another kind on the same store */
  second: FieldPlan | null;

  layers: number;
  storeKg: number;
  storeLossWPerK: Float64Array;
  conductionWPerK: number;
  storeRoomC: number;
  storeInside: boolean;

  network: NetworkInput;
  ventilationWPerK: number;
  windowOpening: boolean;
  internalW: number;
  /** day set point, the start of the first year [°C] */
  roomSetC: number;
  /** static loss of the house, for the size of unmet heat [W/K] */
  staticLossWPerK: number;

  /** heat straight to the air node with ideal set point instead of emitters */
  ideal: boolean;
  loopKgPerS: number;
  /** supply water to slab, upward part [W/K] */
  floorWPerK: number;
  /** K_H of EN 1264 [W/(m²K)] */
  floorKH: number;
  floorAreaM2: number;
  floorDownward: number;
  /** radiators [W/K] by the excess of the supply over the room in steps of `EXCESS_STEP_K`, at the loop's flow */
  radiatorWPerK: Float64Array;

  tapSetC: number;
  exchangerEffectiveness: number;
  /** coil instead of a plate exchanger [W/K]; 0 = plate */
  coilWPerK: number;
  ratedW: number;
}
