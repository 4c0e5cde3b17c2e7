/**
 * `npm run check:system`: five weeks of plan and year loop against the same equations written a second time and
 * integrated by a library, the limits that a system must reach, and the collector at a fixed inlet over two years.
 * Exits non-zero when a heat flow of the fine run lies 0.1 % off, or a limit is missed. The ordinary steps of 15 min
 * are printed beside it and not judged here: `npm run accuracy` judges them by their year.
 */
import { compareWeek, FLOW_TOLERANCE, systemCases, type ComparedWeek } from '../system/cases';
import { fixedInletRow, limitRows, twoYears, type LimitRow } from '../system/limits';

const percent = (share: number, digits: number) => `${(100 * share).toFixed(digits)} %`.padStart(11);
const kwh = (value: number) => value.toFixed(3).padStart(11);

function printWeek({ name, weather, flows, reference, fine, standard }: ComparedWeek): boolean {
  console.info(`\n${name} (${weather})`);
  console.info(
    `  ${'heat flow'.padEnd(19)} ${'equations'.padStart(11)} ${'engine 5 s'.padStart(11)} ${'off by'.padStart(11)} ${'15 min'.padStart(11)} ${'off by'.padStart(11)}`,
  );
  let kept = true;
  for (const flow of flows) {
    const within = flow.fine <= FLOW_TOLERANCE;
    kept &&= within;
    console.info(
      `  ${flow.flow.padEnd(19)} ${kwh(flow.referenceKwh)} ${kwh(flow.fineKwh)} ${percent(flow.fine, 4)} ${kwh(flow.standardKwh)} ${percent(flow.standard, 3)} ${within ? 'ok' : 'MISSED'}`,
    );
  }
  const worst = Math.max(...flows.map((flow) => flow.fine));
  const ordinary = Math.max(...flows.map((flow) => flow.standard));
  console.info(
    `  starts ${reference.starts}, ${fine.starts}, ${standard.starts}; pump hours ${reference.pumpHours.toFixed(3)}, ${fine.pumpHours.toFixed(3)}, ${standard.pumpHours.toFixed(3)}; worst flow${percent(worst, 4)}, ordinary steps${percent(ordinary, 3)}`,
  );
  return kept;
}

function printRow({ name, value, expected, tolerance, within }: LimitRow): boolean {
  const off = expected === 0 ? value : value / expected - 1;
  console.info(
    `  ${name.padEnd(62)} ${value.toPrecision(10).padStart(13)} ${expected.toPrecision(10).padStart(13)} ${off.toExponential(1).padStart(9)} (≤ ${tolerance}) ${within ? 'ok' : 'MISSED'}`,
  );
  return within;
}

console.info(
  'weeks: heat in kWh by the separate equations (odex, 1e-9), by the engine in steps of 5 s and of 15 min',
);
const weeks = systemCases().map((subject) => printWeek(compareWeek(subject)));
console.info('\nlimits: engine, expected, difference');
const limits = limitRows().map(printRow);
const { years, real } = twoYears();
console.info(
  `\nfixed inlet over two ${real ? 'real years' : 'built-in climates (no real years beside the checkout)'}`,
);
const inlets = years.map((year) => printRow(fixedInletRow(year)));

const missed = [...weeks, ...limits, ...inlets].filter((kept) => !kept).length;
console.info(
  `\n${weeks.length} weeks at ${100 * FLOW_TOLERANCE} % for every heat flow, ${limits.length} limits, ${inlets.length} years: ${missed} missed`,
);
process.exitCode = missed > 0 ? 1 : 0;
