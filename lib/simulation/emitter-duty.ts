import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import type { HourDrive } from './hour-drive';
import type { Plan } from './plan';
import type { YearState } from './year-state';

/** Proportional band of the thermostat, ± half [K]. */
export const HALF_BAND_K = 0.5;
/** Share of a radiator's heat that goes to the air node, the rest to the surfaces. */
const RADIATOR_TO_AIR = 0.7;
/** Surplus of the store over the return that makes its draw worth while [K]. */
export const RETURN_MARGIN_K = 1;

/**
 * The thermostat and what it asks of floor and radiators in one step: a duty at full loop flow and set supply,
 * solved in closed form for the air of the same step, so that nothing chatters.
 */
export class EmitterDuty {
  /** share of the step in which the loop runs [-] */
  duty = 0.0;
  supplyC = 0.5;
  returnC = 0.5;
  /** heat asked for [W]; floor (upward) and radiators at full duty [W] */
  demandW = 0.0;
  floorW = 0.0;
  radiatorW = 0.0;
  private readonly loopWPerK: number;
  private readonly floorShareUp: number;
  /** air of the step before [°C]: the radiators see it, the free response would be a room without their heat */
  private roomC = 0.5;

  constructor(private readonly plan: Plan) {
    this.loopWPerK = plan.loopKgPerS * CP;
    this.floorShareUp = 1 - plan.floorDownward;
  }

  /** Solves the free response of the house and decides the duty of this step. */
  decide(hour: HourDrive, { network, store }: YearState): void {
    this.roomC = network.airC;
    network.solve();
    this.duty = this.demandW = this.floorW = this.radiatorW = 0;
    this.supplyC = this.returnC = hour.setC;
    if (!hour.heatingAllowed) return;
    const { ideal, ratedW } = this.plan;
    const lackingK = hour.roomSetC - network.airC;
    if (ideal) {
      this.demandW = Math.min(ratedW, Math.max(0, lackingK / network.airRise(1, 0, 0)));
      return;
    }
    const rise = this.emit(hour.radiatorWPerK, network);
    const duty = Math.min(1, Math.max(0, (lackingK + HALF_BAND_K) / (2 * HALF_BAND_K + rise)));
    const lift = ratedW / (duty * this.loopWPerK);
    const topC = store.topC;
    if (duty > 0 && topC + lift < this.supplyC && topC > this.returnC + RETURN_MARGIN_K) {
      // the backup cannot lift the whole loop to its set supply: the supply stays where its power ends
      this.supplyC = topC + lift;
      this.emit(hour.radiatorWPerK, network);
    }
    this.duty = duty;
    this.demandW = duty * (this.floorW / this.floorShareUp + this.radiatorW);
  }

  /** Heat of floor and radiators at `supplyC` and the return that follows; answers the rise of the air [K]. */
  private emit(radiatorWPerK: number, network: YearState['network']): number {
    const { floorWPerK } = this.plan;
    const floorW = floorWPerK > 0 ? Math.max(0, floorWPerK * (this.supplyC - network.slabC)) : 0;
    const radiatorW = Math.max(0, radiatorWPerK * (this.supplyC - this.roomC));
    this.floorW = floorW;
    this.radiatorW = radiatorW;
    this.returnC = this.supplyC - (floorW / this.floorShareUp + radiatorW) / this.loopWPerK;
    return network.airRise(RADIATOR_TO_AIR * radiatorW, (1 - RADIATOR_TO_AIR) * radiatorW, floorW);
  }
}
