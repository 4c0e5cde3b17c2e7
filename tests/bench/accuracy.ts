/**
 * `npm run accuracy`: solar heat of very different designs at θ = 0.5 and 0.25 against the engine's own run with
 * steps of five seconds for house, loop and store alike. Exits non-zero when a limit is missed.
 */
import { climates } from '@/data/climates/climates';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import type { Plan } from '@/lib/simulation/plan';
import { runPlan } from '@/lib/simulation/simulate';
import { monthSum, Tally } from '@/lib/simulation/tally';
import { randomDesigns } from './random-designs';

const DESIGNS = 24;
const FINER_EVERY = 4;
const FINER_STEPS_PER_HOUR = 1800;
const SEED = 20_261_201;
const FINE_STEPS_PER_HOUR = 720;
/** rms, the error that 22 of 24 designs stay within, and the worst [%] */
const LIMITS = { '0.5': [0.3, 0.6, 1], '0.25': [0.25, 0.45, 0.8] } as const;

function solarJ(plan: Plan): number {
  const tally = new Tally(plan.layers);
  const { status } = runPlan(plan, tally);
  if (status !== 'done') throw new Error(`run ended: ${status}`);
  let solar = 0;
  for (let month = 0; month < 12; month++) {
    solar += monthSum(tally.monthJ, month, 'solarHeating') + monthSum(tally.monthJ, month, 'solarTap');
  }
  return solar;
}

const weatherYears = climates.map((climate) => climate.weatherYear());
const builder = new PlanBuilder();
const errors: Record<keyof typeof LIMITS, number[]> = { '0.5': [], '0.25': [] };

console.info('error of yearly solar heat against the run with 5-second steps [%]');
console.info('  θ 0.5   θ 0.25    2 s    solar kWh   design');
for (const [i, { label, house, design }] of randomDesigns(DESIGNS, SEED).entries()) {
  const weather = weatherYears[i % weatherYears.length]!;
  const plan = (theta: number) =>
    builder.plan({ weather, house, design, numerics: { theta, skyModel: 'hdkr' } });
  const fine = solarJ({ ...plan(0.5), stepsPerHour: FINE_STEPS_PER_HOUR, subStepCap: Infinity });
  const row = (Object.keys(LIMITS) as (keyof typeof LIMITS)[]).map((theta) => {
    const error = 100 * (solarJ(plan(Number(theta))) / fine - 1);
    errors[theta].push(error);
    return error.toFixed(3).padStart(7);
  });
  const finer =
    i % FINER_EVERY === 0
      ? solarJ({ ...plan(0.5), stepsPerHour: FINER_STEPS_PER_HOUR, subStepCap: Infinity })
      : NaN;
  const ownError = Number.isNaN(finer) ? '' : (100 * (fine / finer - 1)).toFixed(3);
  console.info(
    `${row.join('  ')}  ${ownError.padStart(7)}  ${(fine / 3.6e6).toFixed(0).padStart(9)}   ${label}, ${weather.name}`,
  );
}

let failed = false;
for (const [theta, [rmsLimit, mostLimit, worstLimit]] of Object.entries(LIMITS)) {
  const sizes = errors[theta as keyof typeof LIMITS].map(Math.abs).sort((a, b) => a - b);
  const rms = Math.sqrt(sizes.reduce((sum, e) => sum + e * e, 0) / sizes.length);
  const most = sizes[Math.ceil((11 / 12) * sizes.length) - 1]!;
  const worst = sizes.at(-1)!;
  const good = rms <= rmsLimit && most <= mostLimit && worst <= worstLimit;
  failed ||= !good;
  console.info(
    `θ ${theta}: rms ${rms.toFixed(3)} (≤ ${rmsLimit}), 22 of 24 within ${most.toFixed(3)} (≤ ${mostLimit}), worst ${worst.toFixed(3)} (≤ ${worstLimit}) ${good ? 'kept' : 'MISSED'}`,
  );
}
process.exitCode = failed ? 1 : 0;
