import { HouseNetwork } from '@/lib/physics/house-network';
import { HOURS_PER_DAY, MONTH_START_HOUR } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import type { Design, House, Numerics } from './design';
import { assembleResult } from './assemble-result';
import { PlanBuilder } from './build-plan';
import type { DryColumns } from './dry-hours';
import type { Plan } from './plan';
import type { YearResult } from './results';
import { Tally } from './tally';
import { runYear, type YearStatus } from './year';
import { YearState } from './year-state';

export interface SimulationInput {
  weather: WeatherYear;
  house: House;
  design: Design;
  numerics: Numerics;
}

export type YearOutcome =
  | { ok: true; result: YearResult }
  | { ok: false; code: 'too stiff' | 'not finite' | 'shell and floor disagree' | 'layout'; message: string };

/** Need of the house without sun and store, kept while house and supply stay as they are. */
export interface ReferenceNeed {
  needKwh: number;
  unmetKwh: number;
  boughtKwh: number;
}

const MESSAGES: Record<Exclude<YearStatus, 'done'>, string> = {
  'too stiff':
    'This design switches or flushes its store too often to be worked within its time. Choose a larger store, fewer layers or a smaller flow.',
  'not finite':
    'The figures of this design ran out of bounds. Look for an input that is far from the others, such as a very small heat capacity.',
};

export interface Simulator {
  /** Runs the year of one design; caches of site, planes, dry hours and reference house are kept between runs. */
  run(input: SimulationInput): YearOutcome;
}

/** The pre-period: November and December, many times what store and walls remember. */
const PRE_PERIOD_FROM_H = MONTH_START_HOUR[10]!;
/** Change of stored heat over the year / heat that went in, above which the year is run once more [-]. */
const STORED_TOLERANCE = 1e-4;
const MOST_YEARS = 3;

/**
 * Runs the last two months to set the initial state, then the year that is booked; again while the heat stored at
 * its end differs from that at its start by more than the tolerance. The change is reported in the balance.
 */
export function runPlan(plan: Plan, tally: Tally): { status: YearStatus; state: YearState } {
  const state = new YearState(plan);
  let status = runYear(plan, state, tally, PRE_PERIOD_FROM_H);
  for (let year = 0; year < MOST_YEARS && status === 'done'; year++) {
    status = runYear(plan, state, tally);
    if (tally.storedShare() <= STORED_TOLERANCE) break;
  }
  return { status, state };
}

/**
 * A simulator for one thread.
 * @returns simulator; same inputs give the same digits, whatever ran before
 */
export function createSimulator(): Simulator {
  const builder = new PlanBuilder();
  const references = new Map<string, ReferenceNeed>();

  function reference(input: SimulationInput): ReferenceNeed | YearOutcome {
    const key = builder.referenceKey(input);
    const kept = references.get(key);
    if (kept) return kept;
    const plan = builder.referencePlan(input);
    const tally = new Tally(plan.layers);
    const { status, state } = runPlan(plan, tally);
    if (status !== 'done') return failure(status, state);
    const need = tally.need();
    if (references.size > 20) references.clear();
    references.set(key, need);
    return need;
  }

  return {
    run(input) {
      const plan = builder.plan(input);
      const refused = shellRefusal(plan) ?? layoutRefusal(plan);
      if (refused) return refused;
      const need = reference(input);
      if ('ok' in need) return need;
      const tally = new Tally(plan.layers);
      const { status, state } = runPlan(plan, tally);
      if (status !== 'done') return failure(status, state);
      return { ok: true, result: assembleResult(input, plan, state, tally, need, dryFields(builder, input)) };
    },
  };
}

/** The network has no meaning where the opaque shell loses more than its inner surfaces take up (ISO 13790, formula 64). */
function shellRefusal({ network }: Plan): YearOutcome | undefined {
  const { hMs } = new HouseNetwork(network);
  if (network.opaqueWPerK < hMs) return undefined;
  const figures = `${network.opaqueWPerK.toFixed(0)} W/K`;
  return {
    ok: false,
    code: 'shell and floor disagree',
    message: `Walls, roof and ground lose ${figures}, more than the inner surfaces of ${network.floorAreaM2} m² of floor can give (${hMs.toFixed(0)} W/K). Check areas and U of the shell against the heated floor area.`,
  };
}

function dryFields(builder: PlanBuilder, input: SimulationInput): DryColumns[] {
  const { second } = input.design;
  return second ? [builder.dry(input), builder.dry(input, second)] : [builder.dry(input)];
}

function failure(code: Exclude<YearStatus, 'done'>, { network, store, lastHour }: YearState): YearOutcome {
  const day = Math.floor(lastHour / HOURS_PER_DAY) + 1;
  const figure = (value: number) => (Number.isFinite(value) ? value.toFixed(1) : 'no number');
  const where = `It stopped on day ${day} at ${lastHour % HOURS_PER_DAY}:00 with ${figure(network.airC)} °C in the rooms and ${figure(store.topC)} to ${figure(store.bottomC)} °C in the store.`;
  return { ok: false, code, message: `${MESSAGES[code]} ${where}` };
}

function layoutRefusal(plan: Plan): YearOutcome | undefined {
  if (!plan.toSlab || plan.floorWPerK > 0) return undefined;
  return {
    ok: false,
    code: 'layout',
    message:
      'This design heats the floor slab, but the house has no heated floor. Give the house one, or lead the array through a store.',
  };
}
