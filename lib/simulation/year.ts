/**
 * The year: 8,760 hours in outer steps of house, thermostat, emitters and taps (a quarter of an hour by default);
 * inside each of them array and store advance by sub-steps (`charge-step.ts`). No allocation inside a year.
 */
import { HOURS_PER_YEAR, SECONDS_PER_HOUR } from '@/lib/units/constants';
import { ChargeStep } from './charge-step';
import { EmitterDuty, HALF_BAND_K } from './emitter-duty';
import { HourDrive } from './hour-drive';
import type { Plan } from './plan';
import { HOUR, type Tally } from './tally';
import { type YearState } from './year-state';

/** Temperatures beyond these are the sign of a state that ran away [°C]. */
const LEAST_SOUND_C = -200;
const GREATEST_SOUND_C = 1000;

export type YearStatus = 'done' | 'too stiff' | 'not finite';

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
  const hour = new HourDrive(plan);
  const emitters = new EmitterDuty(plan);
  const charge = new ChargeStep(plan, state, hour, emitters, tally);
  const houseStep = new HouseStep(plan, state, hour, emitters, charge, tally);
  const { stepsPerHour, subStepCap } = plan;
  const stepS = SECONDS_PER_HOUR / stepsPerHour;
  tally.begin(state);
  state.subSteps = 0;
  state.storeLossW = state.slabSunW = 0;
  for (let h = firstHour; h < HOURS_PER_YEAR; h++) {
    hour.begin(h, state, tally, stepS);
    tally.hour.fill(0);
    for (let step = 0; step < stepsPerHour; step++) {
      houseStep.begin();
      charge.advance(stepS);
      houseStep.end(stepS);
    }
    tally.closeHour(h, state, plan);
    if (state.subSteps > subStepCap || !sound(state)) {
      state.lastHour = h;
      return state.subSteps > subStepCap ? 'too stiff' : 'not finite';
    }
  }
  tally.end(state);
  return 'done';
}

/** One outer step of the house around arrays and store. */
class HouseStep {
  private readonly mean: number;

  constructor(
    private readonly plan: Plan,
    private readonly state: YearState,
    private readonly hour: HourDrive,
    private readonly emitters: EmitterDuty,
    private readonly charge: ChargeStep,
    private readonly tally: Tally,
  ) {
    this.mean = 1 / plan.stepsPerHour;
  }

  /** Free response, with the store's loss and the slab's sun of the step before, and the duty of the emitters. */
  begin(): void {
    if (this.plan.storeInside || this.plan.toSlab) this.drive();
    this.emitters.decide(this.hour, this.state);
  }

  /** What the store really gave, the backup on top of it, and the house with both. */
  end(stepS: number): void {
    const { plan, state, hour, emitters, charge } = this;
    const { network } = state;
    const storeW = charge.storeJ / stepS;
    const slabW = charge.slabJ / stepS;
    const tapStoreW = charge.tapJ / stepS;
    const tapBackupW = Math.min(plan.ratedW, Math.max(0, hour.tapLoadW - tapStoreW));
    const tapShortW = Math.max(0, hour.tapLoadW - tapStoreW - tapBackupW);
    const left = Math.max(0, plan.ratedW - tapBackupW);
    const backupW = Math.min(left, Math.max(0, emitters.demandW - storeW));
    const givenW = storeW + backupW;
    let downwardW = plan.floorDownward * slabW;
    state.storeLossW = charge.lossJ / stepS;
    state.slabSunW = slabW - downwardW;
    if (plan.storeInside || plan.toSlab) {
      this.drive();
      network.solve();
    }
    // also when a coil has drawn the top below the return: what the loop loses is booked, not forgotten
    if (givenW !== 0 && emitters.demandW > 0) {
      const duty = plan.ideal ? givenW : (givenW / emitters.demandW) * emitters.duty;
      network.add(duty);
      if (!plan.ideal) downwardW += givenW - duty * (emitters.floorW + emitters.radiatorW);
    }
    network.advance();
    const setC = hour.roomSetC - HALF_BAND_K - 1e-6;
    const lackingK = hour.heatingAllowed ? Math.max(0, setC - network.airC) : 0;
    const { mean } = this;
    const means = this.tally.hour;
    means[HOUR.SOLAR_HEATING]! += (storeW + slabW) * mean;
    means[HOUR.SOLAR_TAP]! += tapStoreW * mean;
    means[HOUR.BACKUP_HEATING]! += backupW * mean;
    means[HOUR.BACKUP_TAP]! += tapBackupW * mean;
    means[HOUR.TAP_LOAD]! += hour.tapLoadW * mean;
    means[HOUR.UNMET]! += (tapShortW + lackingK * plan.staticLossWPerK) * mean;
    means[HOUR.DOWNWARD]! += downwardW * mean;
    this.bookHouse();
  }

  /** Adds the step's losses of house and store and the temperatures of the loop to the means of the hour. */
  private bookHouse(): void {
    const { mean, hour, emitters } = this;
    const { network, storeLossW } = this.state;
    const { outdoorC, gainsW } = hour;
    const means = this.tally.hour;
    const opaqueW = network.hEm * (network.massMeanC - outdoorC);
    means[HOUR.STORE_LOSS]! += storeLossW * mean;
    means[HOUR.VENTILATION]! += network.hVe * (network.airC - outdoorC) * mean;
    means[HOUR.TRANSMISSION]! += (network.hW * (network.surfaceC - outdoorC) + opaqueW) * mean;
    means[HOUR.WINDOW_RELOSS]! += gainsW * network.gainLost * mean;
    means[HOUR.DUTY]! += emitters.duty;
    means[HOUR.SUPPLY]! += emitters.duty * emitters.supplyC;
    means[HOUR.RETURN]! += emitters.duty * emitters.returnC;
  }

  /** Gains of the hour with the store's loss and the slab's sun. */
  private drive(): void {
    const { hour, state } = this;
    const toAirW = hour.gainToAirW + (this.plan.storeInside ? state.storeLossW : 0);
    const { outdoorC, gainToSurfaceW, gainToMassW } = hour;
    state.network.drive(outdoorC, outdoorC, toAirW, gainToSurfaceW, gainToMassW, state.slabSunW);
  }
}

/** Whether the state still has temperatures that a house can have. */
function sound({ network, store }: YearState): boolean {
  const lowest = Math.min(network.airC, store.topC, store.bottomC);
  const highest = Math.max(network.airC, store.topC, store.bottomC);
  return lowest > LEAST_SOUND_C && highest < GREATEST_SOUND_C;
}
