/**
 * `npm run bench`: how long a year takes, in one run and as ratios to a calibration loop of the same mix of
 * operations (exp, sqrt, an array stencil). It only prints: machines are noisy, so nothing is judged here.
 *
 * A weather file beside the checkout (`../shared/weather`) is parsed where it is there; else a file made here.
 */
import { existsSync, readFileSync } from 'node:fs';
import { performance } from 'node:perf_hooks';
import { climates } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import { createSimulator } from '@/lib/simulation/simulate';
import { Tally } from '@/lib/simulation/tally';
import { runYear } from '@/lib/simulation/year';
import { YearState } from '@/lib/simulation/year-state';
import { planeYear } from '@/lib/sun/plane-year';
import { sunYear } from '@/lib/sun/sun-year';
import { readWeather } from '@/lib/weather/read-weather';

const WEATHER_FILE = '../shared/weather/USA_IL_Chicago_TMY3.epw';
const SHARE_OF_RUNS = 0.5;

function timed(run: () => void): number {
  const start = performance.now();
  run();
  return performance.now() - start;
}

/** Median of `runs` runs [ms]. */
function median(runs: number, run: () => void): number {
  const times = Array.from({ length: runs }, () => timed(run)).sort((a, b) => a - b);
  return times[Math.floor(SHARE_OF_RUNS * runs)]!;
}

const field = new Float64Array(8).fill(20);
let sink = 0;
/** 50,000 sub-steps of a made-up store: two stencils over eight layers, an exponential, a square root. */
function calibrate(): void {
  for (let i = 0; i < 50_000; i++) {
    const decay = Math.exp(-1e-4 * (i & 1023));
    const root = Math.sqrt(1 + field[3]! * field[3]!);
    for (let pass = 0; pass < 2; pass++) {
      let above = field[0]!;
      for (let k = 0; k < 8; k++) {
        const here = field[k]!;
        field[k] = here + 1e-3 * (above - here) * decay + 1e-6 * (root - here);
        above = here;
      }
    }
    sink += root;
  }
}

const numerics = { theta: 0.5, skyModel: 'hdkr' } as const;
const { house, designs } = demonstration;
const design = designs[0]!;

const coldStart = performance.now();
const weather = climates[0]!.weatherYear();
const weatherReady = performance.now();
createSimulator().run({ weather, house, design, numerics });
const firstResult = performance.now() - weatherReady;

const sunCold = timed(() => {
  const sun = sunYear(weather, weather.sunShiftH);
  planeYear(weather, sun, { tiltDeg: 58, azimuthDeg: 171 }, 'hdkr');
});
const file = existsSync(WEATHER_FILE) ? readFileSync(WEATHER_FILE) : undefined;
const parseCold = file ? timed(() => void readWeather(file)) : NaN;
const parseWarm = file ? median(9, () => void readWeather(file)) : NaN;

const builder = new PlanBuilder();
function year(theta: number): () => void {
  const plan = builder.plan({ weather, house, design, numerics: { theta, skyModel: 'hdkr' } });
  const state = new YearState(plan);
  const tally = new Tally(plan.layers);
  return () => void runYear(plan, state, tally);
}
const half = year(0.5);
const quarter = year(0.25);
const simulator = createSimulator();
let area = 10;
const tick = () => {
  area = area === 10 ? 11 : 10;
  simulator.run({
    weather,
    house,
    design: { ...design, array: { ...design.array, areaM2: area } },
    numerics,
  });
};
for (let i = 0; i < 10; i++) [calibrate, half, quarter, tick].forEach((run) => run());
const rounds = Array.from({ length: 15 }, () => [calibrate, half, quarter, tick].map((run) => timed(run)));
const column = (k: number) => rounds.map((round) => round[k]!).sort((a, b) => a - b)[7]!;
const [unit, halfMs, quarterMs, tickMs] = [0, 1, 2, 3].map(column) as [number, number, number, number];

const rows: [string, number][] = [
  ['calibration loop', unit],
  ['warm year, θ 0.5', halfMs],
  ['warm year, θ 0.25', quarterMs],
  ['slider tick: plan, pre-run year, year, result', tickMs],
  ['first result, cold (weather there)', firstResult],
  ['synthetic weather year, cold', weatherReady - coldStart],
  ['sun and one plane, cold engine, no cache', sunCold],
  ['1.6 MB weather file, first parse', parseCold],
  ['1.6 MB weather file, warm', parseWarm],
];
console.info('median of one run on this machine; the ratio is to the calibration loop');
for (const [label, ms] of rows) {
  const text = Number.isNaN(ms)
    ? 'no file beside the checkout'
    : `${ms.toFixed(1).padStart(8)} ms  ${(ms / unit).toFixed(2).padStart(7)}`;
  console.info(`${text}  ${label}`);
}
if (!Number.isFinite(sink)) console.info('calibration ran out of bounds');
