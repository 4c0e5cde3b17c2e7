import { climates } from '@/data/climates/climates';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import type { Plan } from '@/lib/simulation/plan';
import { monthSum, Tally } from '@/lib/simulation/tally';
import { runYear } from '@/lib/simulation/year';
import { YearState } from '@/lib/simulation/year-state';
import { HOURS_PER_YEAR, J_PER_KWH } from '@/lib/units/constants';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { sharedWeather } from '../weather/shared-weather';
import { ALWAYS, constantWeather, designWith, houseWith, NEVER, planOf, type SystemCase } from './cases';
import { CP, linearLossAt } from './coefficients';
import { engineWeek, WEEK_HOURS } from './engine-week';
import { acceptedSunOf, hourMean } from './hours';

const YEAR_FILES = ['USA_IL_Chicago_TMY3.epw', '724666TYA.CSV'];
const INLET_C = 30;
/** Litres of a store that a year of sun does not warm. */
const INFINITE_L = 1e15;
/** So small a capacity that the array is at its steady state at once, and yet not nothing [J/(m²K)]. */
const HARDLY_ANY = 1e-4;

/** One thing that must come out as said. */
export interface LimitRow {
  name: string;
  value: number;
  expected: number;
  /** allowed difference: of the expected value, or absolute where that is 0 */
  tolerance: number;
  within: boolean;
}

function row(name: string, value: number, expected: number, tolerance: number): LimitRow {
  const difference = expected === 0 ? Math.abs(value) : Math.abs(value / expected - 1);
  return { name, value, expected, tolerance, within: difference <= tolerance };
}

const layersC = [45, 45, 45, 45];
const bare = { pipeLengthM: 0, pipeCapacityJPerMK: 0 };

function weekOf(change: Partial<SystemCase>): SystemCase {
  return {
    name: 'limit',
    house: houseWith({}),
    design: designWith({ cover: 'glass', store: { layers: 4 } }),
    weather: constantWeather(2, 3),
    firstDay: 0,
    constantSun: { sunWm2: 300, windowSunW: 0 },
    start: { storeC: layersC, roomC: 20 },
    ...change,
  };
}

/** A design whose array has neither capacity nor pipes, on a store without loss. */
function steadyDesign(controller: SystemCase['design']['controller'], volumeL: number): SystemCase['design'] {
  const design = designWith({
    cover: 'selective glass',
    array: bare,
    controller,
    store: { layers: 1, volumeL, insulationConductivity: 0 },
  });
  const curve = { ...design.collector.curve, dryCapacityJPerM2K: HARDLY_ANY, waterContentLPerM2: 0 };
  return { ...design, collector: { ...design.collector, curve } };
}

/** Steady heat at a fixed inlet [W]: A (S − a1 Δ − a2 Δ|Δ|) = 2 ṁc (T − Tin), solved for its warm root. */
function steadyW(
  areaM2: number,
  sunWm2: number,
  a1: number,
  a2: number,
  flowWPerK: number,
  outdoorC: number,
): number {
  const drive = areaM2 * sunWm2 + 2 * flowWPerK * (INLET_C - outdoorC);
  const linear = areaM2 * a1 + 2 * flowWPerK;
  const root = (2 * Math.abs(drive)) / (linear + Math.sqrt(linear ** 2 + 4 * areaM2 * a2 * Math.abs(drive)));
  return 2 * flowWPerK * (outdoorC + Math.sign(drive) * root - INLET_C);
}

/** Zero area, no loss, no load, infinite store. */
export function limitRows(): LimitRow[] {
  const zeroArea = weekOf({
    design: designWith({ cover: 'glass', array: { areaM2: 0 }, store: { layers: 4 } }),
  });
  const none = engineWeek(planOf(zeroArea), zeroArea.start).flowKwh;

  const still = weekOf({
    design: designWith({
      cover: 'glass',
      controller: NEVER,
      store: { layers: 4, insulationConductivity: 0 },
    }),
    house: houseWith({ hotWater: { ...houseWith({}).hotWater, litresPerDay: 0 } }),
    weather: constantWeather(25, 3),
  });
  const kept = engineWeek(planOf(still), still.start);

  const noLoss = weekOf({
    design: steadyDesign({ ...designWith({ cover: 'glass' }).controller, ...ALWAYS }, 50_000),
    start: { storeC: [20], roomC: 20 },
    house: still.house,
    weather: still.weather,
  });
  const { curve } = noLoss.design.collector;
  const losslessCollector = { ...noLoss.design.collector, curve: { ...curve, a1: 0, a2: 0, a3: 0 } };
  const all = engineWeek(
    planOf({ ...noLoss, design: { ...noLoss.design, collector: losslessCollector } }),
    noLoss.start,
  );

  const infinite = weekOf({
    design: steadyDesign(noLoss.design.controller, INFINITE_L),
    start: { storeC: [INLET_C], roomC: 20 },
  });
  const steady = engineWeek(planOf(infinite), infinite.start);
  const { array, collector } = infinite.design;
  const byHand =
    (WEEK_HOURS / 1000) *
    steadyW(
      array.areaM2 * collector.widthFactor,
      300,
      linearLossAt(infinite.design, 3),
      collector.curve.a2,
      array.flowKgPerSM2 * array.areaM2 * CP,
      2,
    );

  return [
    row('zero area: into the store [kWh]', none['into the store'], 0, 0),
    row('zero area: store to rooms and taps [kWh]', none['store to rooms'] + none['store to taps'], 0, 0),
    row('no loss, no draw: warmest layer [°C]', Math.max(...kept.layersC), 45, 1e-12),
    row('no loss, no draw: coldest layer [°C]', Math.min(...kept.layersC), 45, 1e-12),
    row('no load: rooms and taps, store and backup [kWh]', loadOf(kept.flowKwh), 0, 0),
    row(
      'no loss of array and pipes: into the store [kWh]',
      all.flowKwh['into the store'],
      all.flowKwh['sun on the array'],
      1e-6,
    ),
    row('infinite store: into the store [kWh]', steady.flowKwh['into the store'], byHand, 1e-6),
    row('infinite store: its temperature [°C]', steady.layersC[0]!, INLET_C, 1e-9),
  ];
}

const loadOf = (flow: ReturnType<typeof engineWeek>['flowKwh']) =>
  flow['store to rooms'] + flow['store to taps'] + flow['backup to rooms'] + flow['backup to taps'];

/** Two real years when they lie beside the checkout, else the two built-in climates. */
export function twoYears(): { years: WeatherYear[]; real: boolean } {
  if (!sharedWeather.present) return { years: climates.map((climate) => climate.weatherYear()), real: false };
  const years = YEAR_FILES.map((file) => {
    const read = readWeather(sharedWeather.bytes(file));
    if (!read.ok) throw new Error(`${file}: ${read.message}`);
    return read.year;
  });
  return { years, real: true };
}

/**
 * The engine's year of a collector at a fixed inlet against the hourly sum of its curve by hand. The store has no
 * loss, no draw and so much water that its temperature stands; the array has no capacity and no pipes; the pump starts
 * and stops at no difference at all (a millionth of a kelvin and a least run of a second keep the two from meeting):
 * then each hour gives what the curve gives, or nothing.
 */
export function fixedInletRow(weather: WeatherYear): LimitRow {
  const controller = { startK: 1e-6, stopK: 0, minimumRunS: 1, storeLimitC: 1e9, inhibitC: 1e9 };
  const design = steadyDesign(controller, INFINITE_L);
  const house = houseWith({ hotWater: { ...houseWith({}).hotWater, litresPerDay: 0 } });
  const plan: Plan = new PlanBuilder().plan({
    house,
    design,
    weather,
    numerics: { theta: 0.5, skyModel: 'hdkr' },
  });
  plan.columns.roomSetC.fill(-100);
  const state = new YearState(plan);
  state.store.t.fill(INLET_C);
  const tally = new Tally(plan.layers);
  const status = runYear(plan, state, tally);
  if (status !== 'done') throw new Error(`the year ended: ${status}`);
  let collectedJ = 0;
  for (let month = 0; month < 12; month++) collectedJ += monthSum(tally.monthJ, month, 'collected');

  const sunWm2 = acceptedSunOf(design, weather);
  const areaM2 = design.array.areaM2 * design.collector.widthFactor;
  const flowWPerK = design.array.flowKgPerSM2 * design.array.areaM2 * CP;
  let byHandKwh = 0;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const a1 = linearLossAt(design, hourMean(weather, weather.windMPerS, h));
    const outdoorC = hourMean(weather, weather.dryBulbC, h);
    byHandKwh +=
      Math.max(0, steadyW(areaM2, sunWm2(h), a1, design.collector.curve.a2, flowWPerK, outdoorC)) / 1000;
  }
  return row(`fixed inlet of ${INLET_C} °C, ${weather.name} [kWh]`, collectedJ / J_PER_KWH, byHandKwh, 1e-6);
}
