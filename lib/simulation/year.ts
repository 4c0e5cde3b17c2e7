/**
 * The year: 8,760 hours in outer steps (a quarter of an hour by default) (house, thermostat, emitters, taps); inside each
 * of them array and store advance by sub-steps that end at the next switch of the pump, at a share θ of a layer's
 * flush, or at the end of the step. No allocation inside.
 */
import { HouseNetwork } from '@/lib/physics/house-network';
import { floorSurfaceCoefficient } from '@/lib/physics/floor';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { HOURS_PER_YEAR, SECONDS_PER_HOUR } from '@/lib/units/constants';
import { ArrayLoop } from './array-loop';
import { EXCESS_STEP_K, EXCESS_STEPS, fieldsOf, type Plan } from './plan';
import { StoreLayers } from './store-layers';
import { HOUR, type Tally } from './tally';

/** Switches of the pump within one step after which its state is held to the end of the step. */
const SWITCH_CAP = 60;
const TIME_TOLERANCE_S = 1e-7;
/** Windows are opened above this room temperature and then exchange four times the air. */
const OPENING_C = 25;
const OPENING_FACTOR = 4;
/** Proportional band of the thermostat, ± half [K]. */
const HALF_BAND_K = 0.5;
const RADIATOR_TO_AIR = 0.7;
/** Surplus of the store over the return that makes its draw worth while [K]. */
const RETURN_MARGIN_K = 1;
/** Substitutions for the share of tap water that runs through a coil. */
const COIL_ROUNDS = 3;

const {
  SOLAR_HEATING,
  SOLAR_TAP,
  BACKUP_HEATING,
  BACKUP_TAP,
  TAP_LOAD,
  UNMET,
  DOWNWARD,
  STORE_LOSS,
  VENTILATION,
  TRANSMISSION,
  WINDOW_RELOSS,
  SUPPLY,
  RETURN,
} = HOUR;

/** Temperatures beyond these are the sign of a state that ran away [°C]. */
const LEAST_SOUND_C = -200;
const GREATEST_SOUND_C = 1000;

export type YearStatus = 'done' | 'too stiff' | 'not finite';

/** The bodies that carry heat from one hour to the next. */
export class YearState {
  readonly network: HouseNetwork;
  readonly store: StoreLayers;
  /** one for each collector field */
  readonly loops: ArrayLoop[];
  locked = false;
  windowsOpen = false;
  subSteps = 0;
  /** hour in which a run was given up [h] */
  lastHour = 0;

  constructor(plan: Plan) {
    this.network = new HouseNetwork(plan.network);
    this.network.reset(plan.roomSetC);
    this.store = new StoreLayers(
      plan.layers,
      plan.storeKg,
      plan.storeLossWPerK,
      plan.conductionWPerK,
      plan.storeRoomC,
      fieldsOf(plan).length,
    );
    this.store.t.fill(plan.roomSetC);
    this.loops = fieldsOf(plan).map(({ array }) => {
      if (!array.ownVessel) this.store.takeFromBottom(-array.waterKg);
      const loop = new ArrayLoop(array);
      loop.arrayC = loop.pipeC = plan.columns.outdoorC[0]!;
      loop.vesselC = array.vesselRoomC;
      return loop;
    });
  }
}

/**
 * Runs one year from the given state and books it.
 *
 * @param plan what does not change
 * @param state bodies at the start, moved to the end of the year
 * @param tally columns and sums of this year, overwritten
 * @param firstHour hour of the year to begin with [h]; later than 0 for the pre-period
 * @returns 'done', or why the run was given up
 */
export function runYear(plan: Plan, state: YearState, tally: Tally, firstHour = 0): YearStatus {
  const { network, store, loops } = state;
  const fields = fieldsOf(plan);
  const flows = store.flows;
  const charges = flows.charges;
  const stepsPerHour = plan.stepsPerHour;
  const stepS = SECONDS_PER_HOUR / stepsPerHour;
  const columns = plan.columns;
  const { theta, ratedW, hasArray, toSlab, limitC, unlockK, loopKgPerS, floorWPerK, coilWPerK } = plan;
  const drawsStore = hasArray && !toSlab;
  const floorShareUp = 1 - plan.floorDownward;
  const loopWPerK = loopKgPerS * CP;
  const hasFloor = floorWPerK > 0;
  const storeInside = plan.storeInside;
  tally.begin(state);
  let subSteps = 0;
  let storeLossW = 0;
  let slabSunW = 0;
  flows.mainsC = columns.mainsC[0]!;
  flows.effectiveness = plan.exchangerEffectiveness;

  for (let h = firstHour; h < HOURS_PER_YEAR; h++) {
    const outdoorC = columns.outdoorC[h]!;
    const roomSetC = columns.roomSetC[h]!;
    const windowSunW = columns.windowSunW[h]!;
    const internalW = plan.internalW;
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      const field = fields[k]!.columns;
      loop.outdoorC = outdoorC;
      loop.absorbedWm2 = field.absorbedWm2[h]!;
      loop.a1 = field.a1[h]!;
      const mounted = hasArray && field.mounted[h] === 1 && loop.input.areaM2 > 0;
      if (mounted !== loop.mounted) {
        if (loop.full) loop.drain(store);
        tally.dismountedJ += loop.relax();
        loop.mounted = mounted;
      }
    }

    if (plan.windowOpening) state.windowsOpen = network.airC > OPENING_C && outdoorC < network.airC;
    const film = hasFloor ? plan.floorAreaM2 * floorSurfaceCoefficient(network.slabC - network.surfaceC) : 0;
    const ventilation = state.windowsOpen ? OPENING_FACTOR * plan.ventilationWPerK : plan.ventilationWPerK;
    network.prepare(ventilation, film, stepS);

    const gains = 0.5 * internalW + windowSunW;
    const gainToSurface = network.gainToSurface * gains;
    const gainToMass = network.gainToMass * gains;
    const gainToAir = 0.5 * internalW;
    const heatingAllowed = outdoorC < roomSetC;
    network.drive(outdoorC, outdoorC, gainToAir, gainToSurface, gainToMass);

    const setC = columns.supplySetC[h]!;
    const radiatorWPerK = radiatorConductance(plan.radiatorWPerK, setC - network.airC);

    const tapKgPerS = columns.tapKgPerS[h]!;
    const mainsC = columns.mainsC[h]!;
    const tapLoadW = tapKgPerS * CP * Math.max(0, plan.tapSetC - mainsC);
    flows.mainsC = mainsC;
    let supplySum = 0;
    let returnSum = 0;
    let dutySum = 0;
    let storeSum = 0;
    let tapStoreSum = 0;
    let backupSum = 0;
    let tapBackupSum = 0;
    let unmetSum = 0;
    let downwardSum = 0;
    let lossSum = 0;
    let airSum = 0;
    let surfaceSum = 0;
    let massSum = 0;

    for (let step = 0; step < stepsPerHour; step++) {
      // the free response takes the store's loss and the slab's sun of the step before
      if (storeInside || toSlab) {
        const inside = storeInside ? storeLossW : 0;
        network.drive(outdoorC, outdoorC, gainToAir + inside, gainToSurface, gainToMass, slabSunW);
      }
      // the radiators see the air of the step before: the free response would be the room without their own heat
      const roomC = network.airC;
      network.solve();

      // thermostat: duty of the emitters at full flow and set supply, solved for the air of this step
      let duty = 0;
      let floorW = 0;
      let radiatorW = 0;
      let returnC = setC;
      let supplyC = setC;
      let demandW = 0;
      if (heatingAllowed) {
        if (plan.ideal) {
          demandW = Math.min(ratedW, Math.max(0, (roomSetC - network.airC) / network.airRise(1, 0, 0)));
        } else {
          floorW = hasFloor ? Math.max(0, floorWPerK * (setC - network.slabC)) : 0;
          radiatorW = Math.max(0, radiatorWPerK * (setC - roomC));
          const rise = network.airRise(
            RADIATOR_TO_AIR * radiatorW,
            (1 - RADIATOR_TO_AIR) * radiatorW,
            floorW,
          );
          duty = Math.min(1, Math.max(0, (roomSetC + HALF_BAND_K - network.airC) / (2 * HALF_BAND_K + rise)));
          let fullW = floorW / floorShareUp + radiatorW;
          returnC = setC - fullW / loopWPerK;
          const lift = ratedW / (duty * loopWPerK);
          if (duty > 0 && store.topC + lift < setC && store.topC > returnC + RETURN_MARGIN_K) {
            // the backup cannot lift the whole loop to its set supply: the supply stays where its power ends
            supplyC = store.topC + lift;
            floorW = hasFloor ? Math.max(0, floorWPerK * (supplyC - network.slabC)) : 0;
            radiatorW = Math.max(0, radiatorWPerK * (supplyC - roomC));
            network.airRise(RADIATOR_TO_AIR * radiatorW, (1 - RADIATOR_TO_AIR) * radiatorW, floorW);
            fullW = floorW / floorShareUp + radiatorW;
            returnC = supplyC - fullW / loopWPerK;
          }
          demandW = duty * fullW;
          supplySum += duty * supplyC;
          returnSum += duty * returnC;
          dutySum += duty;
        }
      }

      // array and store
      let rest = stepS;
      let switches = 0;
      let storeHeatJ = 0;
      let tapHeatJ = 0;
      let lossJ = 0;
      let slabHeatJ = 0;
      while (rest > TIME_TOLERANCE_S) {
        const topC = toSlab ? network.airC : store.topC;
        const sinkC = toSlab ? network.slabC : store.bottomC;
        const held = switches >= SWITCH_CAP;
        const overLimit = topC > limitC;
        if (overLimit) state.locked = true;
        else if (state.locked && topC < limitC - unlockK) state.locked = false;
        let switched = false;
        for (let k = 0; k < loops.length; k++) {
          const loop = loops[k]!;
          loop.sinkC = sinkC;
          if (loop.full && !held && (overLimit || loop.wantsStop())) {
            loop.drain(store);
            switches++;
            switched = true;
          }
        }
        if (switched) continue;

        let heatingKgPerS = 0;
        if (drawsStore && demandW > 0 && !plan.ideal) {
          if (topC >= supplyC) heatingKgPerS = (duty * loopKgPerS * (supplyC - returnC)) / (topC - returnC);
          else if (topC > returnC + RETURN_MARGIN_K) heatingKgPerS = duty * loopKgPerS;
        }
        let preheatKgPerS = 0;
        let coilKgPerS = 0;
        if (drawsStore && tapLoadW > 0 && topC > mainsC) {
          if (coilWPerK > 0) {
            coilKgPerS = coilFlow(store, tapKgPerS, mainsC, plan.tapSetC, coilWPerK);
            flows.coilKept = Math.exp(-coilWPerK / (store.count * coilKgPerS * CP));
          } else {
            const preheatedK = flows.effectiveness * (topC - mainsC);
            const wantedK = plan.tapSetC - mainsC;
            preheatKgPerS = preheatedK > wantedK ? (tapKgPerS * wantedK) / preheatedK : tapKgPerS;
          }
        }
        flows.heatingKgPerS = heatingKgPerS;
        flows.tapKgPerS = preheatKgPerS;
        flows.coilKgPerS = coilKgPerS;
        flows.returnC = returnC;
        let running = 0;
        for (let k = 0; k < loops.length; k++) {
          const { full, input } = loops[k]!;
          charges[k]!.kgPerS = full && !toSlab ? input.flowKgPerS : 0;
          if (full) running++;
        }
        let dt = Math.min(rest, store.stepLimitS(theta));

        for (let k = 0; k < loops.length && !switched; k++) {
          const loop = loops[k]!;
          if (loop.full) {
            loop.prepareRunning();
            if (held) continue;
            loop.findStop();
            dt = Math.min(dt, loop.switchS);
          } else if (loop.mounted) {
            loop.prepareEmpty();
            if (state.locked || held) continue;
            loop.findStart();
            if (loop.switchS > TIME_TOLERANCE_S) dt = Math.min(dt, loop.switchS);
            else {
              loop.fill(store);
              tally.starts++;
              switches++;
              switched = true;
            }
          }
        }
        if (switched) continue;
        if (dt < TIME_TOLERANCE_S) dt = Math.min(rest, 1e-3);

        store.dtS = dt;
        flows.returnLevel = heatingKgPerS > 0 ? store.levelFor(returnC) : 0;
        for (let k = 0; k < loops.length; k++) {
          const loop = loops[k]!;
          loop.dtS = dt;
          if (!loop.full) continue;
          loop.findCharge();
          const port = charges[k]!;
          port.waterC = port.firstC = loop.chargeC;
          port.level = store.levelFor(loop.chargeC);
        }
        if (toSlab) store.lossJ = 0;
        else if (running > 0 || heatingKgPerS + preheatKgPerS + coilKgPerS > 0) {
          store.predict();
          for (let k = 0; k < loops.length; k++) {
            const loop = loops[k]!;
            if (!loop.full) continue;
            loop.shiftSink(store.bottomMeanC);
            loop.findCharge();
            charges[k]!.waterC = loop.chargeC;
          }
          store.correct();
        } else store.rest();
        for (let k = 0; k < loops.length; k++) {
          const loop = loops[k]!;
          if (loop.full) {
            loop.advanceRunning();
            if (toSlab) slabHeatJ += loop.givenJ;
            tally.book(loop, loop.input.areaM2 * loop.absorbedWm2 * dt, fields[k]!.pumpW * dt);
          } else if (loop.mounted) {
            loop.advanceEmpty();
            tally.book(loop, loop.input.areaM2 * loop.absorbedWm2 * dt, 0);
            if (loop.arrayC > tally.plateMaxC) tally.plateMaxC = loop.arrayC;
            if (state.locked) tally.bookUnused(loop, sinkC - outdoorC);
          }
        }
        if (running > 0) {
          tally.pumpS += dt;
          if (sinkC < tally.coldestInletC) tally.coldestInletC = sinkC;
        }
        if (heatingKgPerS > 0) storeHeatJ += heatingKgPerS * CP * (store.topMeanC - returnC) * dt;
        if (preheatKgPerS + coilKgPerS > 0) tapHeatJ += store.tapW * dt;
        lossJ += store.lossJ;
        rest -= dt;
        subSteps++;
      }

      // what the store really gave, the backup on top of it, and the house
      const storeW = storeHeatJ / stepS;
      const slabW = slabHeatJ / stepS;
      const tapStoreW = tapHeatJ / stepS;
      const tapBackupW = Math.min(ratedW, Math.max(0, tapLoadW - tapStoreW));
      const tapShortW = Math.max(0, tapLoadW - tapStoreW - tapBackupW);
      const backupW = Math.min(Math.max(0, ratedW - tapBackupW), Math.max(0, demandW - storeW));
      const givenW = storeW + backupW;
      storeLossW = lossJ / stepS;
      let downwardW = plan.floorDownward * slabW;
      slabSunW = slabW - downwardW;
      if (storeInside || toSlab) {
        const inside = storeInside ? storeLossW : 0;
        network.drive(outdoorC, outdoorC, gainToAir + inside, gainToSurface, gainToMass, slabSunW);
        network.solve();
      }
      // also when a coil has drawn the top below the return: what the loop loses is booked, not forgotten
      if (givenW !== 0 && demandW > 0) {
        const share = givenW / demandW;
        network.add(plan.ideal ? givenW : share * duty);
        if (!plan.ideal) downwardW += givenW - share * duty * (floorW + radiatorW);
      }
      network.advance();
      const lacking = heatingAllowed ? roomSetC - HALF_BAND_K - 1e-6 - network.airC : 0;
      const unmetW = tapShortW + (lacking > 0 ? lacking * plan.staticLossWPerK : 0);
      storeSum += storeW + slabW;
      tapStoreSum += tapStoreW;
      backupSum += backupW;
      tapBackupSum += tapBackupW;
      unmetSum += unmetW;
      downwardSum += downwardW;
      lossSum += storeLossW;
      airSum += network.airC;
      surfaceSum += network.surfaceC;
      massSum += network.massMeanC;
    }
    const mean = 1 / stepsPerHour;
    const hour = tally.hour;
    hour[SOLAR_HEATING] = storeSum * mean;
    hour[SOLAR_TAP] = tapStoreSum * mean;
    hour[BACKUP_HEATING] = backupSum * mean;
    hour[BACKUP_TAP] = tapBackupSum * mean;
    hour[TAP_LOAD] = tapLoadW;
    hour[UNMET] = unmetSum * mean;
    hour[DOWNWARD] = downwardSum * mean;
    hour[STORE_LOSS] = lossSum * mean;
    hour[VENTILATION] = network.hVe * (airSum * mean - outdoorC);
    hour[TRANSMISSION] =
      network.hW * (surfaceSum * mean - outdoorC) + network.hEm * (massSum * mean - outdoorC);
    hour[WINDOW_RELOSS] = gains * network.gainLost;
    hour[SUPPLY] = dutySum > 0 ? supplySum / dutySum : NaN;
    hour[RETURN] = dutySum > 0 ? returnSum / dutySum : NaN;
    tally.closeHour(h, state, plan);
    if (subSteps > plan.subStepCap || !sound(network.airC) || !sound(store.topC) || !sound(store.bottomC)) {
      state.lastHour = h;
      return subSteps > plan.subStepCap ? 'too stiff' : 'not finite';
    }
  }
  state.subSteps = subSteps;
  tally.end(state);
  return 'done';
}

/** Whether a temperature is a number that a house can have [°C]. */
function sound(temperatureC: number): boolean {
  return temperatureC > LEAST_SOUND_C && temperatureC < GREATEST_SOUND_C;
}

/** Reads the table of radiators [W/K] at an excess of the supply over the room [K]. */
function radiatorConductance(table: Float64Array, excessK: number): number {
  const position = Math.min(EXCESS_STEPS, Math.max(0, excessK / EXCESS_STEP_K));
  const step = Math.floor(position);
  const share = position - step;
  return table[step]! * (1 - share) + table[step + 1]! * share;
}

/**
 * Tap water through a coil, less than the whole draw when the mixing valve adds cold water to hold the tap's set
 * temperature: the flow whose outlet, mixed, gives the wanted heat, by repeated substitution.
 */
function coilFlow(
  store: StoreLayers,
  tapKgPerS: number,
  mainsC: number,
  setC: number,
  coilWPerK: number,
): number {
  let flow = tapKgPerS;
  for (let round = 0; round < COIL_ROUNDS; round++) {
    const outletC = store.coilOutletC(Math.exp(-coilWPerK / (store.count * flow * CP)), mainsC);
    if (outletC <= setC) return flow;
    flow = (tapKgPerS * (setC - mainsC)) / (outletC - mainsC);
  }
  return flow;
}
