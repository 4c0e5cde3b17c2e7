import { describe, expect, it, vi } from 'vitest';
import { steadyPower } from '@/lib/physics/collector';
import { beamModifier } from '@/lib/physics/incidence-angle';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import type { HourColumns, YearResult } from '@/lib/simulation/results';
import { createSimulator, runPlan, type SimulationInput } from '@/lib/simulation/simulate';
import { SiteCache } from '@/lib/simulation/site-cache';
import { StoreLayers } from '@/lib/simulation/store-layers';
import { Tally } from '@/lib/simulation/tally';
import { HOURS_PER_DAY, HOURS_PER_YEAR, MONTH_START_HOUR, STEFAN_BOLTZMANN, toKelvin, toRadians, WH_PER_KWH } from '@/lib/units/constants'; // prettier-ignore
import {
  example,
  idealHeat,
  lowland,
  onlyFloor,
  onlyRadiators,
  supply55,
  yearOf,
  type Change,
} from './example-runs';

/* What must be true of any year (model.md section 11); own requirements unless a source stands beside them. */

// the stiffest design takes seconds by itself, and a shared machine some more
vi.setConfig({ testTimeout: 60_000 });

const winterMonths = Array.from({ length: 12 }, (_, m) => m < 4 || m > 8);
const noMonths = Array<boolean>(12).fill(false);
const simulator = createSimulator();
const run = (change: Change) => yearOf(example(change), simulator);

const cases: Record<string, Change> = {
  'the demonstration': {},
  'floor alone': { house: { emitters: onlyFloor } },
  'radiators at 55 °C, cloudy lowland': {
    house: { emitters: onlyRadiators },
    supply: supply55,
    weather: lowland,
  },
  'ideal set point': { house: { emitters: idealHeat } },
  'store inside the house': { store: { insideHouse: true, roomC: 20 } },
  'one layer': { store: { layers: 1 } },
  'twelve layers': { store: { layers: 12 } },
  'unglazed mat': { cover: 'none' },
  'twin-wall sheet': { cover: 'twin-wall' },
  'selective plate': { cover: 'selective glass' },
  'winter months': { array: { mountedMonths: winterMonths } },
  'three months in summer': { array: { mountedMonths: winterMonths.map((_, m) => m > 4 && m < 8) } },
  'no backup worth the name': {
    backup: { fuel: 'wood', ratedW: 500, seasonalEfficiency: 0.7 },
  },
  'no backup': { backup: { fuel: 'wood', ratedW: 0, seasonalEfficiency: 0.7 } },
  'small store, large array, low limit': {
    array: { areaM2: 60, flowKgPerSM2: 0.03 },
    store: { volumeL: 200 },
    controller: { storeLimitC: 50 },
  },
  'long pipes with heavy walls': {
    array: { pipeLengthM: 60, pipeCapacityJPerMK: 3000, pipeLossWPerMK: 0.6 },
  },
  'accurate steps': { numerics: { theta: 0.25 } },
};

describe('energy balance of the year', () => {
  for (const [name, change] of Object.entries(cases)) {
    it(`closes to 1e-11 of its inputs: ${name}`, () => {
      const { balance } = run(change);
      expect(balance.residualShare).toBeLessThanOrEqual(1e-11);
      expect(balance.inKwh.windowSun).toBeGreaterThan(0);
    });
  }

  it('reports heat that is missing instead of hiding it', () => {
    expect(run(cases['no backup']!).year.unmetKwh).toBeGreaterThan(100);
    expect(run({ backup: { fuel: 'gas', ratedW: 40_000, seasonalEfficiency: 0.9 } }).year.unmetKwh).toBe(0); // prettier-ignore
  });
});

describe('without an array', () => {
  const nothing = { 'no area': { areaM2: 0 }, 'no mounted month': { mountedMonths: noMonths } };
  for (const [name, array] of Object.entries(nothing)) {
    it(`the sun gives exactly nothing and the pump never starts: ${name}`, () => {
      const { year, columns } = run({ array });
      expect(year.solarHeatingKwh).toBe(0);
      expect(year.solarTapKwh).toBe(0);
      expect(year.collectedKwh).toBe(0);
      expect(year.fractions.solar).toBe(0);
      expect(year.starts).toBe(0);
      expect(year.pumpKwh).toBe(0);
      expect(columns.arrayW.every((w) => w === 0)).toBe(true);
    });
  }

  it('buys what the reference house buys', () => {
    const { year } = run({ array: { areaM2: 0 } });
    expect(year.boughtKwh).toBeCloseTo(year.referenceBoughtKwh, 6);
  });
});

describe('a store left alone', () => {
  it('without loss, conduction or draw it keeps every layer to the last digit', () => {
    const store = new StoreLayers(8, 2000, new Float64Array(8), 0, 12);
    const start = [71, 66, 60, 52, 47, 40, 31, 22];
    store.t.set(start);
    store.dtS = 900;
    for (let step = 0; step < 4 * HOURS_PER_YEAR; step++) {
      store.predict();
      store.correct();
    }
    expect([...store.t]).toEqual(start);
  });

  it('without loss conduction evens it out and loses nothing', () => {
    const store = new StoreLayers(4, 1000, new Float64Array(4), 2, 12);
    store.t.set([70, 50, 30, 10]);
    store.dtS = 900;
    for (let step = 0; step < 100 * HOURS_PER_YEAR; step++) {
      store.predict();
      store.correct();
    }
    for (const layerC of store.t) expect(layerC).toBeCloseTo(40, 9);
  });
});

describe('order of covers', () => {
  it('film < twin-wall < selective glass with radiators at 55 °C', () => {
    const solar = (cover: Change['cover']) => {
      const { year } = run({ cover, house: { emitters: onlyRadiators }, supply: supply55 });
      return year.solarHeatingKwh + year.solarTapKwh;
    };
    const [film, twinWall, selective] = [solar('film'), solar('twin-wall'), solar('selective glass')];
    expect(film).toBeGreaterThan(500);
    expect(twinWall).toBeGreaterThan(film);
    expect(selective).toBeGreaterThan(twinWall);
  });
});

/** Power of the steady curve in each hour at a fixed mean water temperature, losses never counted [W]. */
function handPowers({ weather, design, numerics }: SimulationInput, waterC: number): Float64Array {
  const { collector, array } = design;
  const site = new SiteCache(weather);
  const plane = site.plane(array, numerics.skyModel);
  const toSky = 0.5 * (1 + Math.cos(toRadians(array.tiltDeg)));
  return Float64Array.from({ length: HOURS_PER_YEAR }, (_, h) => {
    const airC = site.outdoorC[h]!;
    const cosine = Math.cos(toRadians(plane.incidenceDeg[h]!));
    const power = steadyPower(collector.curve, waterC, {
      beamWm2: plane.beamWm2[h]!,
      beamModifier: plane.beamWm2[h]! > 0 ? beamModifier(collector.curve.b0, cosine) : 0,
      diffuseWm2: plane.diffuseWm2[h]! + plane.groundWm2[h]!,
      airC,
      windMPerS: site.windMPerS[h]! * array.windFactor,
      longwaveWm2: toSky * weather.skyLongwaveWm2[h]! + (1 - toSky) * STEFAN_BOLTZMANN * toKelvin(airC) ** 4,
    });
    return array.areaM2 * collector.widthFactor * Math.max(0, power);
  });
}

/*
 * No hour is judged alone: the plate and the water in it carry heat from one hour into the next, so an hour after a
 * bright one may give more than its own sun. From midnight on, when the array stands cold and empty, the running sum
 * of a day cannot: all that is above the coldest water was taken in at a water at least as warm.
 */
describe('collected heat against the hand sum of the curve at the coldest water that entered the array', () => {
  const judged: Record<string, Change> = {
    ...cases,
    'no pipe': { array: { pipeLengthM: 0 } },
    'least flow, no minimum run': { array: { flowKgPerSM2: 0.004 }, controller: { minimumRunS: 0 } },
  };
  for (const [name, change] of Object.entries(judged)) {
    it(`is never above it, from midnight to any hour of any day: ${name}`, () => {
      const input = example(change);
      const { year, columns } = yearOf(input, simulator);
      const hand = handPowers(input, year.coldestInletC);
      let above = 0;
      for (let day = 0; day < HOURS_PER_YEAR / HOURS_PER_DAY; day++) {
        let collected = 0;
        let allowed = 0;
        for (let h = day * HOURS_PER_DAY; h < (day + 1) * HOURS_PER_DAY; h++) {
          collected += columns.arrayW[h]!;
          allowed += hand[h]!;
          // half a 32-bit digit of the columns
          if (collected > allowed * (1 + 1e-6) + 1e-3) above++;
        }
      }
      expect(above).toBe(0);
      expect(year.collectedKwh).toBeGreaterThan(0);
      expect(year.collectedKwh).toBeLessThan(hand.reduce((sum, w) => sum + w, 0) / WH_PER_KWH);
    });
  }
});

/** Sum of an hourly column over a month, and of its absolute values [kWh]. */
function columnSum(column: Float32Array, month: number): { sum: number; size: number } {
  let sum = 0;
  let size = 0;
  for (let h = MONTH_START_HOUR[month]!; h < MONTH_START_HOUR[month + 1]!; h++) {
    sum += column[h]!;
    size += Math.abs(column[h]!);
  }
  return { sum: sum / WH_PER_KWH, size: size / WH_PER_KWH };
}

describe('hours, months and year', () => {
  const pairs = [
    ['arrayW', 'collectedKwh'],
    ['solarHeatingW', 'solarHeatingKwh'],
    ['solarTapW', 'solarTapKwh'],
    ['backupHeatingW', 'backupHeatingKwh'],
    ['backupTapW', 'backupTapKwh'],
    ['unmetW', 'unmetKwh'],
  ] as const;
  const result = run({ backup: { fuel: 'wood', ratedW: 4000, seasonalEfficiency: 0.7 } });

  for (const [column, field] of pairs) {
    it(`${column} sums to ${field} of each month within 1e-5`, () => {
      result.months.forEach((month, m) => {
        const { sum, size } = columnSum(result.columns[column], m);
        expect(Math.abs(sum - month[field])).toBeLessThanOrEqual(1e-5 * size);
      });
      expect(result.year[field]).toBeGreaterThan(0);
    });
  }

  it('the pump’s shares sum to its hours', () => {
    result.months.forEach((month, m) => {
      const { sum } = columnSum(result.columns.pumpShare, m);
      expect(Math.abs(sum * WH_PER_KWH - month.pumpHours)).toBeLessThanOrEqual(1e-5 * month.pumpHours);
    });
  });

  it('twelve months sum to the year', () => {
    const { meanOutdoorC, ...energies } = result.months[0]!;
    expect(meanOutdoorC).toBeLessThan(result.year.meanOutdoorC);
    for (const field of Object.keys(energies) as (keyof typeof energies)[]) {
      const sum = result.months.reduce((total, month) => total + month[field], 0);
      expect(Math.abs(sum - result.year[field])).toBeLessThanOrEqual(1e-12 * Math.abs(sum));
    }
  });

  it('heat to the house is that of sun and backup together', () => {
    const { heatingKwh, solarHeatingKwh, backupHeatingKwh } = result.year;
    expect(Math.abs(solarHeatingKwh + backupHeatingKwh - heatingKwh)).toBeLessThanOrEqual(1e-12 * heatingKwh);
  });

  it('each hour has one carrier', () => {
    expect(result.year.carrierHours.reduce((sum, hours) => sum + hours, 0)).toBe(HOURS_PER_YEAR);
  });
});

function bytesOf(result: YearResult): string {
  const { columns, ...rest } = result;
  const hex = (name: keyof HourColumns) => {
    const { buffer, byteOffset, byteLength } = columns[name];
    return Buffer.from(buffer, byteOffset, byteLength).toString('base64');
  };
  return JSON.stringify([rest, (Object.keys(columns) as (keyof HourColumns)[]).sort().map(hex)]);
}

describe('determinism', () => {
  it('gives the same bytes twice, whatever ran before and in a new simulator', () => {
    const input = example({ cover: 'glass', array: { tiltDeg: 51 } });
    const kept = createSimulator();
    const first = bytesOf(yearOf(input, kept));
    for (const change of [{ array: { areaM2: 0 } }, { weather: lowland }, { store: { layers: 12 } }]) {
      yearOf(example(change), kept);
    }
    // compared as booleans: a difference of megabytes helps nobody
    expect(bytesOf(yearOf(input, kept)) === first).toBe(true);
    expect(bytesOf(yearOf(example({ cover: 'glass', array: { tiltDeg: 51 } }))) === first).toBe(true);
  });
});

describe('designs that cannot be worked', () => {
  it('a run beyond its sub-steps is given up with a value, not an exception', () => {
    const plan = new PlanBuilder().plan(example());
    expect(runPlan({ ...plan, subStepCap: 1000 }, new Tally(plan.layers)).status).toBe('too stiff');
    expect(runPlan(plan, new Tally(plan.layers)).status).toBe('done');
  });

  it('the simulator answers a design too stiff for its time in words', () => {
    // a hall's loop flow through layers of 17 kg
    const outcome = simulator.run(
      example({
        house: { volumeM3: 8000, airChangePerH: 3, emitters: onlyRadiators },
        store: { volumeL: 200, layers: 12 },
        supply: { designSupplyC: 55, designSpreadK: 3, limitC: 65 },
        numerics: { theta: 0.05 },
      }),
    );
    expect(outcome).toMatchObject({ ok: false, code: 'too stiff' });
    if (!outcome.ok) expect(outcome.message).toMatch(/larger store, fewer layers or a smaller flow/);
  });

  it('a shell that its own inner surfaces cannot feed is refused in words', () => {
    const outcome = simulator.run(example({ house: { floorAreaM2: 10 } }));
    expect(outcome).toMatchObject({ ok: true });
    const shell = example().house.shell.map((element) => ({ ...element, areaM2: 10 * element.areaM2 }));
    const refused = simulator.run(example({ house: { floorAreaM2: 30, shell } }));
    expect(refused).toMatchObject({ ok: false, code: 'shell and floor disagree' });
    if (!refused.ok)
      expect(refused.message).toMatch(/inner surfaces of 30 m² of floor can give \(683 W\/K\)/);
  });

  it('a state that is no number ends the run with a value', () => {
    const { weather } = example();
    const dryBulbC = weather.dryBulbC.slice();
    dryBulbC[1000] = NaN;
    expect(simulator.run(example({ weather: { ...weather, dryBulbC } }))).toMatchObject({
      ok: false,
      code: 'not finite',
    });
  });
});

describe('the empty collector', () => {
  it('gives nothing in hours without pump', () => {
    for (const change of [{}, { cover: 'none' as const }, { array: { mountedMonths: winterMonths } }]) {
      const { columns } = run(change);
      let hours = 0;
      for (let h = 0; h < HOURS_PER_YEAR; h++) {
        if (columns.pumpShare[h] !== 0) continue;
        hours++;
        expect(columns.arrayW[h]).toBe(0);
      }
      expect(hours).toBeGreaterThan(4000);
    }
  });

  it('starts no pump in months in which it is not mounted', () => {
    const { months, columns } = run({ array: { mountedMonths: winterMonths } });
    months.forEach((month, m) => {
      if (winterMonths[m]) expect(month.starts).toBeGreaterThan(0);
      else expect(month).toMatchObject({ starts: 0, collectedKwh: 0, planeKwh: 0, pumpHours: 0 });
    });
    expect(columns.dryPlateC.slice(MONTH_START_HOUR[4], MONTH_START_HOUR[9]).every(Number.isNaN)).toBe(true);
  });
});
