import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { RETURN_MARGIN_K, type EmitterDuty } from './emitter-duty';
import type { HourDrive } from './hour-drive';
import { fieldsOf, type FieldPlan, type Plan } from './plan';
import type { Tally } from './tally';
import type { YearState } from './year-state';

/** Switches of the pumps within one step after which their state is held to the end of the step. */
const SWITCH_CAP = 60;
const TIME_TOLERANCE_S = 1e-7;
const SHORTEST_S = 1e-3;
/** Substitutions for the share of tap water that runs through a coil. */
const COIL_ROUNDS = 3;

/**
 * Arrays and store through one outer step, in sub-steps that end at the next switch of a pump, at a share θ of a
 * layer's flush, or with the step.
 */
export class ChargeStep {
  /** heat of the step [J]: store to emitters, store to taps, store to its room, arrays to the slab */
  storeJ = 0.5;
  tapJ = 0.5;
  lossJ = 0.5;
  slabJ = 0.5;

  private readonly fields: FieldPlan[];
  private readonly drawsStore: boolean;
  private switches = 0;
  private topC = 0.5;
  private sinkC = 0.5;
  private dtS = 0.5;
  private running = 0;

  constructor(
    private readonly plan: Plan,
    private readonly state: YearState,
    private readonly hour: HourDrive,
    private readonly emitters: EmitterDuty,
    private readonly tally: Tally,
  ) {
    this.fields = fieldsOf(plan);
    this.drawsStore = plan.hasArray && !plan.toSlab;
  }

  /** Advances arrays and store by `stepS`. */
  advance(stepS: number): void {
    const { store, network } = this.state;
    const { toSlab } = this.plan;
    this.storeJ = this.tapJ = this.lossJ = this.slabJ = 0;
    this.switches = 0;
    let rest = stepS;
    while (rest > TIME_TOLERANCE_S) {
      this.topC = toSlab ? network.airC : store.topC;
      this.sinkC = toSlab ? network.slabC : store.bottomC;
      if (this.stopPumps()) continue;
      this.setDraws();
      this.setCharges();
      this.dtS = Math.min(rest, store.stepLimitS(this.plan.theta));
      if (this.startPumps()) continue;
      if (this.dtS < TIME_TOLERANCE_S) this.dtS = Math.min(rest, SHORTEST_S);
      this.move();
      this.book();
      rest -= this.dtS;
      this.state.subSteps++;
    }
  }

  /** Locks and unlocks the sink, drains arrays that are to stop; whether any did. */
  private stopPumps(): boolean {
    const { state, topC } = this;
    const { limitC, unlockK } = this.plan;
    const overLimit = topC > limitC;
    if (overLimit) state.locked = true;
    else if (state.locked && topC < limitC - unlockK) state.locked = false;
    const held = this.switches >= SWITCH_CAP;
    let switched = false;
    for (let k = 0; k < state.loops.length; k++) {
      const loop = state.loops[k]!;
      loop.sinkC = this.sinkC;
      if (!loop.full || held || !(overLimit || loop.wantsStop())) continue;
      loop.drain(state.store);
      this.switches++;
      switched = true;
    }
    return switched;
  }

  /** What emitters and taps draw from the store in this sub-step. */
  private setDraws(): void {
    const { plan, hour, emitters, topC } = this;
    const { store } = this.state;
    const { flows } = store;
    const { supplyC, returnC, duty } = emitters;
    flows.heatingKgPerS = flows.tapKgPerS = flows.coilKgPerS = 0;
    flows.returnC = returnC;
    if (!this.drawsStore) return;
    if (emitters.demandW > 0 && !plan.ideal) {
      const fullKgPerS = duty * plan.loopKgPerS;
      if (topC >= supplyC) flows.heatingKgPerS = (fullKgPerS * (supplyC - returnC)) / (topC - returnC);
      else if (topC > returnC + RETURN_MARGIN_K) flows.heatingKgPerS = fullKgPerS;
    }
    if (hour.tapLoadW <= 0 || topC <= hour.mainsC) return;
    if (plan.coilWPerK > 0) this.setCoil();
    else {
      const preheatedK = flows.effectiveness * (topC - hour.mainsC);
      const wantedK = plan.tapSetC - hour.mainsC;
      flows.tapKgPerS = preheatedK > wantedK ? (hour.tapKgPerS * wantedK) / preheatedK : hour.tapKgPerS;
    }
  }

  /**
   * Tap water through the coil, less than the whole draw when the mixing valve adds cold water to hold the tap's set
   * temperature: the flow whose outlet, mixed, gives the wanted heat, by repeated substitution.
   */
  private setCoil(): void {
    const { coilWPerK, tapSetC } = this.plan;
    const { tapKgPerS, mainsC } = this.hour;
    const { store } = this.state;
    let flow = tapKgPerS;
    let kept = Math.exp(-coilWPerK / (store.count * flow * CP));
    for (let round = 0; round < COIL_ROUNDS; round++) {
      const outletC = store.coilOutletC(kept, mainsC);
      if (outletC <= tapSetC) break;
      flow = (tapKgPerS * (tapSetC - mainsC)) / (outletC - mainsC);
      kept = Math.exp(-coilWPerK / (store.count * flow * CP));
    }
    store.flows.coilKgPerS = flow;
    store.flows.coilKept = kept;
  }

  /** Charging flow of each field. */
  private setCharges(): void {
    const { loops, store } = this.state;
    this.running = 0;
    for (let k = 0; k < loops.length; k++) {
      const { full, input } = loops[k]!;
      store.flows.charges[k]!.kgPerS = full && !this.plan.toSlab ? input.flowKgPerS : 0;
      if (full) this.running++;
    }
  }

  /** Shortens the sub-step to the next switch of a pump; fills an array whose start is due and says so. */
  private startPumps(): boolean {
    const { loops, store, locked } = this.state;
    const held = this.switches >= SWITCH_CAP;
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      if (loop.full) {
        loop.prepareRunning();
        if (held) continue;
        loop.findStop();
      } else if (loop.mounted) {
        loop.prepareEmpty();
        if (locked || held) continue;
        loop.findStart();
        if (loop.switchS <= TIME_TOLERANCE_S) {
          loop.fill(store);
          this.tally.starts++;
          this.switches++;
          return true;
        }
      } else continue;
      this.dtS = Math.min(this.dtS, loop.switchS);
    }
    return false;
  }

  /** Moves store and arrays by the sub-step. */
  private move(): void {
    const { loops, store } = this.state;
    const { flows } = store;
    store.dtS = this.dtS;
    flows.returnLevel = flows.heatingKgPerS > 0 ? store.levelFor(flows.returnC) : 0;
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      loop.dtS = this.dtS;
      if (!loop.full) continue;
      loop.findCharge();
      const port = flows.charges[k]!;
      port.waterC = port.firstC = loop.chargeC;
      port.level = store.levelFor(loop.chargeC);
    }
    if (this.plan.toSlab) store.lossJ = 0;
    else if (this.running > 0 || flows.heatingKgPerS + flows.tapKgPerS + flows.coilKgPerS > 0) {
      store.predict();
      if (this.running > 0) this.meetMeanSink();
      store.correct();
    } else store.rest();
  }

  /** The arrays meet the mean of the bottom layer over the sub-step. */
  private meetMeanSink(): void {
    const { loops, store } = this.state;
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      if (!loop.full) continue;
      loop.shiftSink(store.bottomMeanC);
      loop.findCharge();
      store.flows.charges[k]!.waterC = loop.chargeC;
    }
  }

  /** Advances the arrays and books what the sub-step gave. */
  private book(): void {
    const { tally, dtS, sinkC, hour } = this;
    const { loops, store, locked } = this.state;
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      const sunJ = loop.input.areaM2 * loop.absorbedWm2 * dtS;
      if (loop.full) {
        loop.advanceRunning();
        if (this.plan.toSlab) this.slabJ += loop.givenJ;
        tally.book(loop, sunJ, this.fields[k]!.pumpW * dtS);
      } else if (loop.mounted) {
        loop.advanceEmpty();
        tally.book(loop, sunJ, 0);
        if (loop.arrayC > tally.plateMaxC) tally.plateMaxC = loop.arrayC;
        if (locked) tally.bookUnused(loop, sinkC - hour.outdoorC);
      }
    }
    if (this.running > 0) {
      tally.pumpS += dtS;
      if (sinkC < tally.coldestInletC) tally.coldestInletC = sinkC;
    }
    const { flows } = store;
    if (flows.heatingKgPerS > 0)
      this.storeJ += flows.heatingKgPerS * CP * (store.topMeanC - flows.returnC) * dtS;
    if (flows.tapKgPerS + flows.coilKgPerS > 0) this.tapJ += store.tapW * dtS;
    this.lossJ += store.lossJ;
  }
}
