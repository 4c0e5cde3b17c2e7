/**
 * The collector array and its outdoor pipes: full and running, or empty. Each state follows the exact
 * exponential of its linearised balance around the stable root of the quadratic loss, so that the moments at
 * which the controller switches come in closed form.
 *
 * @see ISO 9806:2017, collector model of clause 24 (from memory); own definition of the drained state, method pages, choices
 */

import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import type { StoreLayers } from './store-layers';

/** What does not change during a year. */
export interface ArrayLoopInput {
  /** effective area on the basis of the curve [m²] */
  areaM2: number;
  a2: number;
  /** [J/K] */
  dryCapacityJPerK: number;
  /** water of array and outdoor pipes when full [kg] */
  waterKg: number;
  /** wall of the outdoor pipes [J/K] */
  pipeCapacityJPerK: number;
  /** loss of the pipe of one way [W/K] */
  pipeLossWPerK: number;
  flowKgPerS: number;
  /** heat handed to the sink / greatest possible, 1 when the sink's own water runs through the array [-] */
  handover: number;
  /** the loop has its own vessel: its water rests there, not in the store */
  ownVessel: boolean;
  /** loss of the vessel while the water rests in it [W/K], room around it [°C] */
  vesselLossWPerK: number;
  vesselRoomC: number;
  startK: number;
  stopK: number;
  inhibitC: number;
  minimumRunS: number;
}

export class ArrayLoop {
  readonly input: ArrayLoopInput;
  private readonly waterJPerK: number;
  private readonly fullJPerK: number;
  private readonly flowWPerK: number;
  /** share of the excess over outdoor air that survives one pipe [-] */
  private readonly pipeKept: number;
  /** inlet − air = `fromArray` (T − air) + `fromSink` (sink − air) */
  private readonly fromArray: number;
  private readonly fromSink: number;

  /** hour's drive: absorbed sun [W/m²], linear loss [W/(m²K)], outdoor air [°C] */
  absorbedWm2 = 0.5;
  a1 = 0.5;
  outdoorC = 0.5;

  /** the array hangs outside in this hour */
  mounted = false;
  full = false;
  /** water and plate while full, plate while empty [°C] */
  arrayC = 10.5;
  pipeC = 10.5;
  /** water resting in the loop's own vessel [°C] */
  vesselC = 10.5;
  /** what is left of the minimum run [s] */
  mustRunS = 0.5;

  /** length of the sub-step [s], sink (bottom layer of the store, or the slab) [°C]: set before each call that reads them */
  dtS = 0.5;
  sinkC = 0.5;
  /** time until the controller switches [s], water coming back to the store [°C]: answers of the last call */
  switchS = 0.5;
  chargeC = 0.5;

  /** of the last sub-step: heat lost by array, by pipes, given to the store [J] */
  arrayLossJ = 0.5;
  pipeLossJ = 0.5;
  givenJ = 0.5;

  private root = 0.5;
  private rootLossWm2 = 0.5;
  private slope = 0.5;
  private decay = 0.5;

  constructor(input: ArrayLoopInput) {
    this.input = input;
    this.waterJPerK = input.waterKg * CP;
    this.fullJPerK = input.dryCapacityJPerK + this.waterJPerK;
    this.flowWPerK = input.flowKgPerS * CP;
    const kept = this.flowWPerK > 0 ? Math.exp(-input.pipeLossWPerK / this.flowWPerK) : 0;
    const shared = 1 + kept * kept * (1 - input.handover);
    this.pipeKept = kept;
    this.fromArray = (2 * kept * kept * (1 - input.handover)) / shared;
    this.fromSink = (kept * input.handover) / shared;
  }

  /** Heat held by plate, water and pipe wall above 0 °C, water in the store not counted [J]. */
  heatJ(): number {
    const { dryCapacityJPerK, pipeCapacityJPerK, ownVessel } = this.input;
    const array = this.full ? this.fullJPerK : dryCapacityJPerK;
    const vessel = ownVessel && !this.full ? this.waterJPerK * this.vesselC : 0;
    return array * this.arrayC + pipeCapacityJPerK * this.pipeC + vessel;
  }

  /**
   * Linearises the balance `C dT/dt = A S + 2ṁc(Tin − T) − A(a1Δ + a2Δ|Δ|)` around its stable root.
   * @param flowWPerK 2ṁc while running, 0 while empty [W/K]
   * @param inletC Tin [°C]
   */
  private linearise(flowWPerK: number, inletC: number, capacityJPerK: number): void {
    const { areaM2, a2 } = this.input;
    const drive = areaM2 * this.absorbedWm2 + flowWPerK * (inletC - this.outdoorC);
    const p = areaM2 * this.a1 + flowWPerK;
    const size = Math.abs(drive);
    const excess = (2 * size) / (p + Math.sqrt(p * p + 4 * areaM2 * a2 * size));
    const delta = drive < 0 ? -excess : excess;
    this.root = this.outdoorC + delta;
    this.rootLossWm2 = this.a1 * delta + a2 * delta * excess;
    this.slope = this.a1 + a2 * (excess + Math.abs(this.arrayC - this.outdoorC));
    this.decay = (areaM2 * this.slope + flowWPerK) / capacityJPerK;
  }

  /** Time until the exponential passes `targetC` [s]; Infinity if it does not. */
  private timeTo(targetC: number): number {
    const ratio = (targetC - this.root) / (this.arrayC - this.root);
    return ratio > 0 && ratio < 1 ? -Math.log(ratio) / this.decay : Infinity;
  }

  /** Prepares a sub-step with the pump standing. */
  prepareEmpty(): void {
    this.linearise(0, 0, this.input.dryCapacityJPerK);
  }

  /** Time until the pump may start, into `switchS`: plate above bottom + start difference and below the inhibit temperature. */
  findStart(): void {
    const start = this.sinkC + this.input.startK;
    const inhibit = this.input.inhibitC;
    const plate = this.arrayC;
    let time = Infinity;
    if (start < inhibit) {
      if (plate > inhibit + 1e-9) {
        if (this.root < inhibit) time = this.timeTo(inhibit);
      } else if (plate >= start - 1e-9) {
        if (plate < inhibit || this.root < plate) time = 0;
      } else if (this.root > start) time = this.timeTo(start);
    }
    this.switchS = time;
  }

  /** The empty plate over `dtS`; the pipe wall relaxes to outdoor air. */
  advanceEmpty(): void {
    const { areaM2, pipeCapacityJPerK, pipeLossWPerK } = this.input;
    const dtS = this.dtS;
    const x = this.decay * dtS;
    const e = Math.exp(-x);
    const gap = this.arrayC - this.root;
    const meanGap = x > 1e-9 ? (gap * (1 - e)) / x : gap;
    this.arrayLossJ = areaM2 * (this.rootLossWm2 + this.slope * meanGap) * dtS;
    this.arrayC = this.root + gap * e;
    this.givenJ = 0;
    this.pipeLossJ = 0;
    const pipeGap = this.pipeC - this.outdoorC;
    if (pipeCapacityJPerK > 0 && Math.abs(pipeGap) > 1e-6 && pipeLossWPerK > 0) {
      const kept = Math.exp((-2 * pipeLossWPerK * dtS) / pipeCapacityJPerK);
      this.pipeLossJ = pipeCapacityJPerK * pipeGap * (1 - kept);
      this.pipeC = this.outdoorC + pipeGap * kept;
    }
    if (this.input.ownVessel && this.waterJPerK > 0) this.coolVessel();
  }

  /** Water resting in the vessel cools towards its room; booked with the pipes. */
  private coolVessel(): void {
    const { vesselLossWPerK, vesselRoomC } = this.input;
    const gap = this.vesselC - vesselRoomC;
    const kept = Math.exp((-vesselLossWPerK * this.dtS) / this.waterJPerK);
    this.pipeLossJ += this.waterJPerK * gap * (1 - kept);
    this.vesselC = vesselRoomC + gap * kept;
  }

  /** Prepares a running sub-step: the sink's water, pipes and hand-over seen from the array. */
  prepareRunning(): void {
    const { outdoorC, sinkC, fromArray, fromSink } = this;
    const excess = (fromSink / (1 - fromArray)) * (sinkC - outdoorC);
    this.linearise(2 * this.flowWPerK * (1 - fromArray), outdoorC + excess, this.fullJPerK);
  }

  /** Array temperature at which outlet − inlet is the stop difference [°C]. */
  private stopC(): number {
    const { outdoorC, sinkC, fromArray, fromSink } = this;
    return outdoorC + (0.5 * this.input.stopK + fromSink * (sinkC - outdoorC)) / (1 - fromArray);
  }

  /** Time until outlet − inlet falls below the stop difference, not before the minimum run is over; into `switchS`. */
  findStop(): void {
    const stop = this.stopC();
    let time = Infinity;
    if (this.arrayC <= stop + 1e-9) time = 0;
    else if (this.root < stop) time = this.timeTo(stop);
    this.switchS = Math.max(time, this.mustRunS);
  }

  /** Whether outlet − inlet is below the stop difference now and the minimum run is over. */
  wantsStop(): boolean {
    return this.mustRunS <= 1e-7 && this.arrayC <= this.stopC() + 1e-9;
  }

  /** Mean temperature at which heat comes to the sink in the sub-step, into `chargeC`; state untouched. */
  findCharge(): void {
    const { outdoorC, sinkC, pipeKept } = this;
    const x = this.decay * this.dtS;
    const gap = this.arrayC - this.root;
    const meanGap = x > 1e-9 ? (gap * (1 - Math.exp(-x))) / x : gap;
    const array = this.root + meanGap - outdoorC;
    const inlet = this.fromArray * array + this.fromSink * (sinkC - outdoorC);
    const hotC = outdoorC + (2 * array - inlet) * pipeKept;
    this.chargeC = sinkC + this.input.handover * (hotC - sinkC);
  }

  /** Moves `sinkC` to the mean of the sub-step and the root with it; exact for the linearised balance. */
  shiftSink(meanSinkC: number): void {
    const flow = 2 * this.flowWPerK;
    const step = (flow * (meanSinkC - this.sinkC) * this.fromSink) / (this.decay * this.fullJPerK);
    this.root += step;
    this.rootLossWm2 += this.slope * step;
    this.sinkC = meanSinkC;
  }

  /** The running array over `dtS`, after `shiftSink` and `findCharge`. */
  advanceRunning(): void {
    const { areaM2 } = this.input;
    const { dtS, outdoorC, sinkC, chargeC } = this;
    const x = this.decay * dtS;
    const e = Math.exp(-x);
    const gap = this.arrayC - this.root;
    const meanGap = x > 1e-9 ? (gap * (1 - e)) / x : gap;
    const array = this.root + meanGap - outdoorC;
    const inlet = this.fromArray * array + this.fromSink * (sinkC - outdoorC);
    this.arrayLossJ = areaM2 * (this.rootLossWm2 + this.slope * meanGap) * dtS;
    this.givenJ = this.flowWPerK * (chargeC - sinkC) * dtS;
    this.pipeLossJ = 2 * this.flowWPerK * (array - inlet) * dtS - this.givenJ;
    this.arrayC = this.root + gap * e;
    this.mustRunS -= dtS;
  }

  /** The pump starts: water of the bottom layer, or of the loop's own vessel, meets the dry plate and the pipe wall. */
  fill(store: StoreLayers): void {
    const { dryCapacityJPerK, pipeCapacityJPerK, waterKg, ownVessel } = this.input;
    const waterC = ownVessel ? this.vesselC : store.bottomC;
    const pipeHeatJ = pipeCapacityJPerK * (waterC - this.pipeC);
    this.arrayC = (dryCapacityJPerK * this.arrayC + this.waterJPerK * waterC) / this.fullJPerK;
    this.pipeC = waterC;
    if (ownVessel) this.arrayC -= pipeHeatJ / this.fullJPerK;
    else {
      store.takeFromBottom(waterKg);
      store.coolBottom(pipeHeatJ);
    }
    this.full = true;
    this.mustRunS = this.input.minimumRunS;
  }

  /** The pump stops: the outdoor water comes home at its temperature, into its level of the store or into the vessel. */
  drain(store: StoreLayers): void {
    if (this.input.ownVessel) this.vesselC = this.arrayC;
    else store.bringHome(this.input.waterKg, this.arrayC);
    this.full = false;
  }

  /**
   * The array is put up or taken down: the plate takes the temperature of outdoor air, a vessel that of its room.
   * @returns heat that leaves with it [J]
   */
  relax(): number {
    const { dryCapacityJPerK, ownVessel, vesselRoomC } = this.input;
    let heat = dryCapacityJPerK * (this.arrayC - this.outdoorC);
    this.arrayC = this.outdoorC;
    if (ownVessel) {
      heat += this.waterJPerK * (this.vesselC - vesselRoomC);
      this.vesselC = vesselRoomC;
    }
    return heat;
  }
}
