import { climates } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { collectorByCover } from '@/data/collectors/generic';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import type { Design, House } from '@/lib/simulation/design';
import type { Plan } from '@/lib/simulation/plan';
import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { sharedWeather } from '../weather/shared-weather';
import { engineWeek } from './engine-week';
import { FLOWS, type Flow } from './equations';
import { hoursOfWeek } from './hours';
import { integrateWeek, type WeekStart, type WeekSums } from './integrate-week';

/** Every heat flow of the fine run lies so near the separate equations [-]. */
export const FLOW_TOLERANCE = 1e-3;
const REAL_FILE = 'USA_IL_Chicago_TMY3.epw';
const FINE_STEPS_PER_HOUR = 720;
const NOTHING_KWH = 1e-6;
/** Differences that never let the pump stop, and never let it start. */
export const ALWAYS = { startK: -1e6, stopK: -1e6 };
export const NEVER = { startK: Infinity };

/** One week of a house and a design in a weather. */
export interface SystemCase {
  name: string;
  house: House;
  design: Design;
  weather: WeatherYear;
  /** first day of the week, 0 = 1 January */
  firstDay: number;
  /** the same sun in every hour instead of that of the weather [W/m²], [W] */
  constantSun?: { sunWm2: number; windowSunW: number };
  start: WeekStart;
}

const { house: demoHouse, designs } = demonstration;
const { floor, radiators } = demoHouse.emitters;
const months = Array<boolean>(12).fill(true);

export function houseWith(change: Partial<House>): House {
  return {
    ...demoHouse,
    horizon: [],
    hotWater: { ...demoHouse.hotWater, profile: 'M' },
    backup: { ...demoHouse.backup, ratedW: 60_000 },
    ...change,
  };
}

interface DesignChange {
  cover: Design['collector']['cover'];
  array?: Partial<Design['array']>;
  controller?: Partial<Design['controller']>;
  store?: Partial<Design['store']>;
  supply?: Partial<Design['supply']>;
}

export function designWith(change: DesignChange): Design {
  const [first] = designs;
  return {
    ...first,
    collector: collectorByCover[change.cover],
    array: { ...first.array, mountedMonths: months, ...change.array },
    controller: { ...first.controller, storeLimitC: 200, inhibitC: 1000, ...change.controller },
    store: { ...first.store, ...change.store },
    supply: { ...first.supply, ...change.supply },
  };
}

/** A weather of one air and one wind; its sun comes from the case. */
export function constantWeather(outdoorC: number, windMPerS: number): WeatherYear {
  const column = (value: number) => new Float64Array(HOURS_PER_YEAR).fill(value);
  return {
    ...climates[0]!.weatherYear(),
    name: `${outdoorC} °C, ${windMPerS} m/s`,
    pointValues: 'interval',
    dryBulbC: column(outdoorC),
    windMPerS: column(windMPerS),
  };
}

/** A real year when it lies beside the checkout, else the second built-in climate. */
export function realWeather(): WeatherYear {
  if (!sharedWeather.present) return climates[1]!.weatherYear();
  const read = readWeather(sharedWeather.bytes(REAL_FILE));
  if (!read.ok) throw new Error(read.message);
  return read.year;
}

const { emitters } = demoHouse;
const onFloor: House['emitters'] = { ...emitters, radiators: { ...radiators, ratedW: 0 } };
const onRadiators: House['emitters'] = {
  ...emitters,
  floor: { ...floor, areaM2: 0 },
  radiators: { ...radiators, ratedW: 16_000 },
};
const onBoth: House['emitters'] = { ...emitters, radiators: { ...radiators, ratedW: 8_000 } };
const at55 = { designSupplyC: 55, designSpreadK: 12, limitC: 65 };

/** The five weeks. */
export function systemCases(): SystemCase[] {
  return [
    {
      name: 'constant weather, pump forced on, floor',
      house: houseWith({ emitters: onFloor }),
      design: designWith({ cover: 'selective glass', controller: ALWAYS, store: { volumeL: 2000 } }),
      weather: constantWeather(2, 4),
      firstDay: 0,
      constantSun: { sunWm2: 190, windowSunW: 200 },
      start: { storeC: [40, 38, 36, 34, 32, 30, 28, 26], roomC: 20 },
    },
    {
      name: 'constant weather, pump forced off, radiators',
      house: houseWith({ emitters: onRadiators }),
      design: designWith({
        cover: 'glass',
        controller: NEVER,
        store: { volumeL: 3000, shape: 'cylinder' },
        supply: at55,
      }),
      weather: constantWeather(-3, 2),
      firstDay: 0,
      constantSun: { sunWm2: 300, windowSunW: 100 },
      start: { storeC: [85, 84, 82, 80, 75, 70, 60, 50], roomC: 20 },
    },
    {
      name: 'synthetic weather, pump switching once, radiators',
      house: houseWith({ emitters: onRadiators, windowOpening: false }),
      design: designWith({
        cover: 'twin-wall',
        controller: { stopK: -1e6 },
        store: { volumeL: 2500 },
        supply: at55,
      }),
      weather: climates[0]!.weatherYear(),
      firstDay: 60,
      start: { storeC: [50, 48, 45, 42, 38, 34, 30, 26], roomC: 20 },
    },
    {
      name: 'synthetic weather, draining and refilling, floor, soft absorber',
      house: houseWith({ emitters: onFloor }),
      design: designWith({ cover: 'film', array: { pipeCapacityJPerMK: 1500 } }),
      weather: climates[0]!.weatherYear(),
      firstDay: 75,
      start: { storeC: [36, 35, 34, 33, 32, 31, 30, 29], roomC: 20 },
    },
    {
      name: 'real weather, draining and refilling, floor and radiators, store inside',
      house: houseWith({
        emitters: onBoth,
        setback: { on: true, nightC: 18, fromHour: 22, toHour: 6 },
      }),
      design: designWith({
        cover: 'selective glass',
        array: { areaM2: 16, flowKgPerSM2: 0.015 },
        store: { volumeL: 1200, layers: 5, insideHouse: true, roomC: 20 },
        supply: { designSupplyC: 45, designSpreadK: 8, limitC: 55 },
      }),
      weather: realWeather(),
      firstDay: 45,
      start: { storeC: [45, 42, 38, 34, 30], roomC: 20 },
    },
  ];
}

/** The plan of the product, its columns turned so that the week comes first. */
export function planOf({ house, design, weather, firstDay, constantSun }: SystemCase): Plan {
  const plan = new PlanBuilder().plan({ house, design, weather, numerics: { theta: 0.5, skyModel: 'hdkr' } });
  const first = firstDay * HOURS_PER_DAY;
  const turned = Object.entries(plan.columns).map(([name, column]: [string, Float64Array | Uint8Array]) => {
    const copy = column.slice();
    copy.set(column.subarray(first));
    copy.set(column.subarray(0, first), HOURS_PER_YEAR - first);
    return [name, copy];
  });
  const columns = Object.fromEntries(turned) as Plan['columns'];
  if (constantSun) {
    columns.absorbedWm2.fill(constantSun.sunWm2);
    columns.windowSunW.fill(constantSun.windowSunW);
  }
  return { ...plan, columns };
}

export interface ComparedFlow {
  flow: Flow;
  /** by the separate equations, and by the engine in fine and in ordinary steps [kWh] */
  referenceKwh: number;
  fineKwh: number;
  standardKwh: number;
  /** relative errors [-]; 0 where both give nothing */
  fine: number;
  standard: number;
}

export interface ComparedWeek {
  name: string;
  weather: string;
  flows: ComparedFlow[];
  reference: WeekSums;
  fine: WeekSums;
  standard: WeekSums;
}

/** Relative error; none where both are nothing but rounding. */
function errorOf(value: number, truth: number): number {
  return Math.max(Math.abs(value), Math.abs(truth)) < NOTHING_KWH ? 0 : Math.abs(value / truth - 1);
}

/** Works a week three times: by the separate equations, and by the engine in steps of 5 s and of 15 min. */
export function compareWeek(subject: SystemCase): ComparedWeek {
  const { house, design, weather, firstDay, constantSun, start } = subject;
  const hours = hoursOfWeek(house, design, weather, firstDay, constantSun);
  const reference = integrateWeek(house, design, hours, start);
  const plan = planOf(subject);
  const fine = engineWeek({ ...plan, stepsPerHour: FINE_STEPS_PER_HOUR }, start);
  const standard = engineWeek(plan, start);
  const flows = FLOWS.map((flow) => {
    const [referenceKwh, fineKwh, standardKwh] = [reference, fine, standard].map(
      ({ flowKwh }) => flowKwh[flow],
    ) as [number, number, number];
    return {
      flow,
      referenceKwh,
      fineKwh,
      standardKwh,
      fine: errorOf(fineKwh, referenceKwh),
      standard: errorOf(standardKwh, referenceKwh),
    };
  });
  return { name: subject.name, weather: weather.name, flows, reference, fine, standard };
}
