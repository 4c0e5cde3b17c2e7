import { Tally, monthSum } from '@/lib/simulation/tally';
import type { Plan } from '@/lib/simulation/plan';
import { runYear } from '@/lib/simulation/year';
import { YearState } from '@/lib/simulation/year-state';
import { HOURS_PER_DAY, J_PER_KWH, SECONDS_PER_HOUR } from '@/lib/units/constants';
import type { Flow } from './equations';
import type { WeekStart, WeekSums } from './integrate-week';

export const WEEK_HOURS = 7 * HOURS_PER_DAY;

/** Thrown out of the year once its first week is booked: the rest need not be worked. */
class WeekIsOver extends Error {}

/** A tally that ends the run with the last hour of the first week; its sums are then those of the week. */
class WeekTally extends Tally {
  override closeHour(h: number, state: YearState, plan: Plan): void {
    super.closeHour(h, state, plan);
    if (h === WEEK_HOURS - 1) throw new WeekIsOver();
  }
}

/** Runs the engine through the first 168 hours of a plan from a known state, without a pre-run. */
export function engineWeek(plan: Plan, start: WeekStart): WeekSums {
  const state = new YearState(plan);
  state.network.reset(start.roomC);
  state.store.t.set(start.storeC);
  const tally = new WeekTally(plan.layers);
  try {
    runYear(plan, state, tally);
    throw new Error('the year ended before its first week');
  } catch (error) {
    if (!(error instanceof WeekIsOver)) throw error;
  }
  const kwh = (joules: number) => joules / J_PER_KWH;
  const month = (field: Parameters<typeof monthSum>[2]) => monthSum(tally.monthJ, 0, field);
  const flowKwh: Record<Flow, number> = {
    'sun on the array': kwh(tally.arraySunJ),
    'lost by the array': kwh(tally.arrayLossJ),
    'lost by the pipes': kwh(tally.pipeLossJ),
    'into the store': kwh(month('collected')),
    'lost by the store': kwh(tally.storeLossJ),
    'store to rooms': kwh(month('solarHeating')),
    'store to taps': kwh(month('solarTap')),
    'backup to rooms': kwh(month('backupHeating')),
    'backup to taps': kwh(month('backupTap')),
    transmission: kwh(tally.transmissionJ),
    ventilation: kwh(tally.ventilationJ),
    'window re-loss': kwh(tally.windowRelossJ),
    'floor downwards': kwh(tally.downwardJ),
  };
  return {
    flowKwh,
    starts: tally.starts,
    pumpHours: month('pumpS') / SECONDS_PER_HOUR,
    layersC: [...state.store.t],
    airC: state.network.airC,
  };
}
