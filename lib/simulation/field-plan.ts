/** One collector field of a plan: its loop, its pump and how its heat reaches the sink. */
import { quadraticLoss } from '@/lib/physics/collector';
import { supplyToSlabConductance } from '@/lib/physics/floor';
import { pressureDropPa } from '@/lib/physics/pipe-flow';
import { frictionHeadM, liftPowerW, runningFlowKgPerS, runningHeadM } from '@/lib/physics/pump';
import {
  waterDensity,
  waterViscosity,
  WATER_KG_PER_L,
  WATER_SPECIFIC_HEAT_J_PER_KG_K as CP,
} from '@/lib/physics/water';
import { L_PER_M3, MM_PER_M } from '@/lib/units/constants';
import type { CollectorArray, Design } from './design';
import type { Plan } from './plan';

/** One collector field: collectors and how they hang. */
export type Field = Pick<Design, 'collector' | 'array'>;

/** Water at which pipe friction is worked [°C]; roughness of drawn pipe [m]; bends and tees of one loop [-]. */
const FRICTION_WATER_C = 30;
const PIPE_ROUGHNESS_M = 1.5e-6;
const LOOP_FITTINGS = 12;
/** Greatest share of heat that an exchanger is trusted with [-]. */
const GREATEST_HANDOVER = 0.98;

/** Whether an array has area and months. */
export function hangs(array: CollectorArray): boolean {
  return array.areaM2 > 0 && array.mountedMonths.some(Boolean);
}

function boreSectionM2(boreMm: number): number {
  return 0.25 * Math.PI * (boreMm / MM_PER_M) ** 2;
}

/** What does not change of a field's loop during a year. */
export function arrayInput(
  design: Design,
  { collector, array }: Field,
  flowKgPerS: number,
  house: { floorKH: number; floorAreaM2: number; floorDownward: number },
): Plan['array'] {
  const { controller, loop, store } = design;
  const areaM2 = array.areaM2 * collector.widthFactor;
  const pipeWaterL = 2 * array.pipeLengthM * boreSectionM2(array.pipeBoreMm) * L_PER_M3;
  const ownVessel = loop.layout !== 'through the store';
  const reserveL = ownVessel ? loop.vesselReserveL : 0;
  const waterL = collector.curve.waterContentLPerM2 * areaM2 + pipeWaterL + reserveL;
  return {
    areaM2,
    a2: quadraticLoss(collector.curve.a2, collector.curve.a8),
    dryCapacityJPerK: collector.curve.dryCapacityJPerM2K * areaM2,
    waterKg: array.areaM2 > 0 ? waterL * WATER_KG_PER_L : 0,
    pipeCapacityJPerK: 2 * array.pipeLengthM * array.pipeCapacityJPerMK,
    pipeLossWPerK: array.pipeLengthM * array.pipeLossWPerMK,
    flowKgPerS,
    handover: handover(design, flowKgPerS, house),
    ownVessel,
    vesselLossWPerK: loop.vesselLossWPerK,
    vesselRoomC: store.roomC,
    // a pump that cannot lift the water never starts
    startK: flowKgPerS > 0 ? controller.startK : Infinity,
    stopK: controller.stopK,
    inhibitC: controller.inhibitC,
    minimumRunS: controller.minimumRunS,
  };
}

/** Share of the greatest possible heat that reaches the sink: all of it, the exchanger's, or the floor's at this flow. */
function handover(
  design: Design,
  flowKgPerS: number,
  house: { floorKH: number; floorAreaM2: number; floorDownward: number },
): number {
  const { layout, exchangerEffectiveness } = design.loop;
  if (layout === 'through the store') return 1;
  if (layout === 'vessel with exchanger') return exchangerEffectiveness;
  if (house.floorAreaM2 <= 0 || flowKgPerS <= 0) return GREATEST_HANDOVER;
  const upWPerK = (1 - house.floorDownward) * flowKgPerS * CP;
  const up = supplyToSlabConductance(house.floorAreaM2, house.floorKH, upWPerK);
  return Math.min(GREATEST_HANDOVER, up / upWPerK);
}

/** Flow and electric power of the running pump: the flow is given, or follows from its curve against lift and pipes. */
export function pumpDuty({ array, loop }: Pick<Design, 'array' | 'loop'>): {
  flowKgPerS: number;
  powerW: number;
  fillHeadM: number;
} {
  const density = waterDensity(FRICTION_WATER_C);
  const viscosity = waterViscosity(FRICTION_WATER_C);
  const run = {
    lengthM: 2 * array.pipeLengthM,
    boreM: array.pipeBoreMm / MM_PER_M,
    roughnessM: PIPE_ROUGHNESS_M,
    fittings: LOOP_FITTINGS,
  };
  const frictionM = (flowKgPerS: number) =>
    frictionHeadM(pressureDropPa(run, flowKgPerS / density, { density, viscosity }), density);
  const siphon = loop.pump.returnPipe === 'siphon';
  const given = array.flowKgPerSM2 * array.areaM2;
  const flowKgPerS =
    loop.pump.kind === 'flow' || array.areaM2 <= 0
      ? given
      : runningFlowKgPerS(
          loop.pump.shutOffHeadM,
          (loop.pump.greatestFlowLPerS * density) / L_PER_M3,
          (flow) => runningHeadM(array.liftM, frictionM(flow), siphon),
        );
  const headM = runningHeadM(array.liftM, frictionM(flowKgPerS), siphon);
  return {
    flowKgPerS,
    powerW: liftPowerW(flowKgPerS, headM, array.pumpEfficiency),
    fillHeadM: runningHeadM(array.liftM, frictionM(0.5 * flowKgPerS), false),
  };
}
