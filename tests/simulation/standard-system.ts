import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { ArrayLoop } from '@/lib/simulation/array-loop';
import { StoreLayers } from '@/lib/simulation/store-layers';
import { HOURS_PER_YEAR, SECONDS_PER_HOUR } from '@/lib/units/constants';

/** Room that the load holds and down to which its exchanger works [°C]. */
const ROOM_C = 20;
/** Relief of the pressurised store of the standard system [°C]. */
const RELIEF_C = 100;
const STORE_L_PER_M2 = 75;
const FLOW_KG_PER_S_M2 = 0.015;
/** ε C_min / UA of the load exchanger, the standard value of the method [-]. */
export const EXCHANGER_RATIO = 2;
const THETA = 0.25;
const NOTHING_LEFT_S = 1e-7;
const SHORTEST_S = 1e-3;

export interface StandardSystem {
  areaM2: number;
  /** linear loss on the mean water temperature [W/(m²K)] */
  a1: number;
  /** loss of the house [W/K] */
  lossWPerK: number;
  /** sun that the curve absorbs in each hour [W/m²] */
  absorbedWm2: Float64Array;
  outdoorC: Float64Array;
}

/**
 * A year of the standard system of the monthly correlation (Klein, Beckman & Duffie 1976), worked by the product's
 * own array and store: closed loop that stays filled (its water is part of the plate's capacity, so starting and
 * stopping move none), one layer of 75 L/m², neither pipe nor store losses, load Q = UA·max(0, 20 °C − θe) through
 * an exchanger of ε C = 2 UA that works down to 20 °C; a backup beside it gives the rest.
 * @returns load and solar heat of the year [J]
 */
export function runStandardSystem(system: StandardSystem): { loadJ: number; solarJ: number } {
  const { areaM2, lossWPerK, outdoorC, absorbedWm2 } = system;
  const store = new StoreLayers(1, STORE_L_PER_M2 * areaM2, new Float64Array(1), 0, ROOM_C);
  store.t[0] = ROOM_C;
  const loop = new ArrayLoop({
    areaM2,
    a2: 0,
    dryCapacityJPerK: 5000 * areaM2,
    waterKg: 0,
    pipeCapacityJPerK: 0,
    pipeLossWPerK: 0,
    flowKgPerS: FLOW_KG_PER_S_M2 * areaM2,
    handover: 1,
    ownVessel: false,
    vesselLossWPerK: 0,
    vesselRoomC: 20,
    startK: 3,
    stopK: 0.5,
    inhibitC: 1000,
    minimumRunS: 0,
  });
  loop.arrayC = outdoorC[0]!;
  loop.a1 = system.a1;
  store.flows.returnC = ROOM_C;
  let loadJ = 0;
  let solarJ = 0;
  // the first year only finds the store's temperature
  for (let pass = 0; pass < 2; pass++) {
    loadJ = solarJ = 0;
    for (let h = 0; h < HOURS_PER_YEAR; h++) {
      loop.outdoorC = outdoorC[h]!;
      loop.absorbedWm2 = absorbedWm2[h]!;
      const loadW = lossWPerK * Math.max(0, ROOM_C - outdoorC[h]!);
      loadJ += loadW * SECONDS_PER_HOUR;
      solarJ += runHour(loop, store, loadW, EXCHANGER_RATIO * lossWPerK);
    }
  }
  return { loadJ, solarJ };
}

/** One hour in sub-steps as in the year loop; returns the heat that the load took from the store [J]. */
function runHour(loop: ArrayLoop, store: StoreLayers, loadW: number, exchangerWPerK: number): number {
  const { flows } = store;
  const charge = flows.charges[0]!;
  let given = 0;
  let rest = SECONDS_PER_HOUR;
  while (rest > NOTHING_LEFT_S) {
    loop.sinkC = store.bottomC;
    const hot = store.topC > RELIEF_C;
    if (loop.full && (hot || loop.wantsStop())) loop.drain(store);
    if (loop.full) {
      loop.prepareRunning();
      loop.findStop();
    } else {
      loop.prepareEmpty();
      loop.findStart();
      if (!hot && loop.switchS <= NOTHING_LEFT_S) {
        loop.fill(store);
        continue;
      }
    }
    const excessK = store.topC - ROOM_C;
    const wantedW = Math.min(loadW, exchangerWPerK * excessK);
    flows.heatingKgPerS = wantedW > 0 ? wantedW / (CP * excessK) : 0;
    charge.kgPerS = loop.full ? loop.input.flowKgPerS : 0;
    const untilSwitch = hot && !loop.full ? Infinity : Math.max(loop.switchS, SHORTEST_S);
    const dt = Math.min(rest, untilSwitch, store.stepLimitS(THETA));
    loop.dtS = store.dtS = dt;
    advance(loop, store);
    given += flows.heatingKgPerS * CP * (store.topMeanC - ROOM_C) * dt;
    rest -= dt;
  }
  return given;
}

function advance(loop: ArrayLoop, store: StoreLayers): void {
  const charge = store.flows.charges[0]!;
  if (loop.full) {
    loop.findCharge();
    charge.waterC = charge.firstC = loop.chargeC;
    store.predict();
    loop.shiftSink(store.bottomMeanC);
    loop.findCharge();
    charge.waterC = loop.chargeC;
    store.correct();
    loop.advanceRunning();
  } else {
    store.predict();
    store.correct();
    loop.advanceEmpty();
  }
}
