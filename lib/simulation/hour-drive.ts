import { floorSurfaceCoefficient } from '@/lib/physics/floor';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { EXCESS_STEP_K, EXCESS_STEPS, fieldsOf, type FieldPlan, type Plan } from './plan';
import type { Tally } from './tally';
import type { YearState } from './year-state';

/** Windows are opened above this room temperature and then exchange four times the air. */
const OPENING_C = 25;
const OPENING_FACTOR = 4;

/** What holds for all steps of one hour: weather, gains, set points, draws. Filled by `begin`, read by the steps. */
export class HourDrive {
  outdoorC = 0.5;
  roomSetC = 0.5;
  heatingAllowed = false;
  /** gains shared between surfaces and mass, and the part that goes to the air [W] */
  gainsW = 0.5;
  gainToAirW = 0.5;
  gainToSurfaceW = 0.5;
  gainToMassW = 0.5;
  /** set supply of the emitters [°C], radiators at it [W/K] */
  setC = 0.5;
  radiatorWPerK = 0.5;
  tapKgPerS = 0.5;
  mainsC = 0.5;
  tapLoadW = 0.5;
  private readonly fields: FieldPlan[];

  constructor(private readonly plan: Plan) {
    this.fields = fieldsOf(plan);
  }

  /** Reads hour `h` and prepares house and fields for steps of `stepS`. */
  begin(h: number, state: YearState, tally: Tally, stepS: number): void {
    const { columns, internalW, tapSetC } = this.plan;
    const { network } = state;
    const outdoorC = columns.outdoorC[h]!;
    this.outdoorC = outdoorC;
    this.roomSetC = columns.roomSetC[h]!;
    this.heatingAllowed = outdoorC < this.roomSetC;
    this.beginFields(h, state, tally);
    this.beginHouse(state, stepS);
    this.gainsW = 0.5 * internalW + columns.windowSunW[h]!;
    this.gainToAirW = 0.5 * internalW;
    this.gainToSurfaceW = network.gainToSurface * this.gainsW;
    this.gainToMassW = network.gainToMass * this.gainsW;
    network.drive(outdoorC, outdoorC, this.gainToAirW, this.gainToSurfaceW, this.gainToMassW);
    this.setC = columns.supplySetC[h]!;
    this.radiatorWPerK = radiatorConductance(this.plan.radiatorWPerK, this.setC - network.airC);
    this.tapKgPerS = columns.tapKgPerS[h]!;
    this.mainsC = columns.mainsC[h]!;
    this.tapLoadW = this.tapKgPerS * CP * Math.max(0, tapSetC - this.mainsC);
    state.store.flows.mainsC = this.mainsC;
  }

  /** Sun, loss and air of each field; arrays are put up and taken down. */
  private beginFields(h: number, { loops, store }: YearState, tally: Tally): void {
    for (let k = 0; k < loops.length; k++) {
      const loop = loops[k]!;
      const { absorbedWm2, a1, mounted } = this.fields[k]!.columns;
      loop.outdoorC = this.outdoorC;
      loop.absorbedWm2 = absorbedWm2[h]!;
      loop.a1 = a1[h]!;
      const hangs = this.plan.hasArray && mounted[h] === 1 && loop.input.areaM2 > 0;
      if (hangs === loop.mounted) continue;
      if (loop.full) loop.drain(store);
      tally.dismountedJ += loop.relax();
      loop.mounted = hangs;
    }
  }

  /** Film of the floor and exchange of air, for which the network is inverted once. */
  private beginHouse(state: YearState, stepS: number): void {
    const { plan, outdoorC } = this;
    const { network } = state;
    if (plan.windowOpening) state.windowsOpen = network.airC > OPENING_C && outdoorC < network.airC;
    const excessK = network.slabC - network.surfaceC;
    const film = plan.floorWPerK > 0 ? plan.floorAreaM2 * floorSurfaceCoefficient(excessK) : 0;
    const factor = state.windowsOpen ? OPENING_FACTOR : 1;
    network.prepare(factor * plan.ventilationWPerK, film, stepS);
  }
}

/** Reads the table of radiators [W/K] at an excess of the supply over the room [K]. */
function radiatorConductance(table: Float64Array, excessK: number): number {
  const position = Math.min(EXCESS_STEPS, Math.max(0, excessK / EXCESS_STEP_K));
  const step = Math.floor(position);
  const share = position - step;
  return table[step]! * (1 - share) + table[step + 1]! * share;
}
