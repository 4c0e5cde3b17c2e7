import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { createSimulator } from '@/lib/simulation/simulate';
import { checkedRow } from './check-row';
import type { CheckedRow } from './check-row';
import { balanceOf, convergence } from './convergence';
import type { BalanceOfDesign, ConvergenceSubject, ConvergenceYear } from './convergence';
import { referenceRows } from './reference-rows';

/** All that the validation page shows. */
export interface Validation {
  rows: CheckedRow[];
  years: ConvergenceYear[];
  balances: BalanceOfDesign[];
}

/** Work done of work to do, and what has come since the last step. */
export interface ValidationStep extends Validation {
  done: number;
  total: number;
}

const ROWS_PER_STEP = 8;

function subjects(): ConvergenceSubject[] {
  const weather = climateYear(demonstration.climateId);
  if (!weather) throw new Error('The climate of the demonstration is missing.');
  return demonstration.designs.map((design) => ({
    design: design.name,
    input: { weather, house: demonstration.house, design, numerics: { theta: 0.5, skyModel: 'hdkr' } },
  }));
}

/**
 * Runs every check, then the convergence and the balance of the demonstration, a piece at a time.
 * @yields what has come, so that a page can show it and stop the rest
 */
export function* validationSteps(): Generator<ValidationStep> {
  const all = subjects();
  const total = referenceRows.length + all.length;
  for (let at = 0; at < referenceRows.length; at += ROWS_PER_STEP) {
    const rows = referenceRows.slice(at, at + ROWS_PER_STEP).map(checkedRow);
    yield { rows, years: [], balances: [], done: at + rows.length, total };
  }
  const simulator = createSimulator();
  for (const [at, subject] of all.entries()) {
    yield {
      rows: [],
      years: convergence(simulator, subject),
      balances: [balanceOf(simulator, subject)],
      done: referenceRows.length + at + 1,
      total,
    };
  }
}

/** The whole of it at once. */
export function validate(): Validation {
  const whole: Validation = { rows: [], years: [], balances: [] };
  for (const { rows, years, balances } of validationSteps()) {
    whole.rows.push(...rows);
    whole.years.push(...years);
    whole.balances.push(...balances);
  }
  return whole;
}
