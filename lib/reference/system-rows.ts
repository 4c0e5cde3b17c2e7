import {
  loadExchangerCorrection,
  monthlyFraction,
  storageCorrection,
  waterHeatingCorrection,
} from '@/lib/physics/monthly-fraction';
import { StoreLayers } from '@/lib/simulation/store-layers';
import { HOURS_PER_DAY, KWH_PER_J, SECONDS_PER_HOUR } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const DUFFIE_BECKMAN_20 = 'Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, ch. 20';
const KLEIN = 'Klein, Beckman & Duffie, Solar Energy 18 (1976) 113; polynomial read in three public codes';

const fractions = (points: readonly (readonly [x: number, y: number])[]) =>
  Object.fromEntries(points.map(([x, y]) => [`${x}, ${y}`, monthlyFraction(x, y)]));

/** A store left alone for `hours`, in steps of a quarter of an hour. */
function leftAlone(store: StoreLayers, hours: number): { lostKwh: number } {
  const steps = 4 * hours;
  let lostJ = 0;
  store.dtS = SECONDS_PER_HOUR / 4;
  for (let i = 0; i < steps; i++) {
    store.predict();
    store.correct();
    lostJ += store.lossJ;
  }
  return { lostKwh: lostJ * KWH_PER_J };
}

/** Share of the first water at the top after `turnovers` of cold water through `layers` from below. */
function flushed(layers: number, turnovers: number): number {
  const kg = 600;
  const steps = 4000 * layers;
  const store = new StoreLayers(layers, kg, new Float64Array(layers), 0, 0);
  store.t.fill(1);
  store.flows.heatingKgPerS = (turnovers * kg) / steps;
  store.flows.returnC = 0;
  store.flows.returnLevel = layers - 1;
  store.dtS = 1;
  for (let i = 0; i < steps; i++) {
    store.predict();
    store.correct();
  }
  return store.topC;
}

const flushes = [
  [1, 1, 0.367879],
  [3, 1, 0.42319],
  [10, 0.5, 0.968172],
  [10, 1, 0.45793],
  [10, 1.5, 0.069854],
  [20, 0.8, 0.812249],
] as const;

/** Checks of whole parts of the system: the layered store of the year loop and the monthly correlation. */
export const systemRows: ReferenceRow[] = [
  {
    id: 'DB-34',
    title: 'Monthly correlation of the solar fraction, spot values (X, Y)',
    source: KLEIN,
    provenance: 'derived',
    tier: 'C',
    expected: {
      '1, 0.5': 0.39274,
      '2, 1': 0.6827,
      '4, 1': 0.5743,
      '6, 1.5': 0.739613,
      '1.54, 0.41': 0.286359,
      '0, 1': 0.8055,
    },
    tolerance: 1e-5,
    compute: () =>
      fractions([
        [1, 0.5],
        [2, 1],
        [4, 1],
        [6, 1.5],
        [1.54, 0.41],
        [0, 1],
      ]),
  },
  {
    id: 'I3',
    title: 'Monthly correlation of the solar fraction, method B of the standard',
    source: 'EN 15316-4-3 method B, liquid systems',
    provenance: 'from memory',
    tier: 'C',
    expected: {
      '2, 1': 0.6827,
      '1, 0.5': 0.3927375,
      '5, 2': 0.97,
      '3, 0.3': 0.1084305,
      '10, 0.3': 0,
      '8, 2.5': 0.9723875,
    },
    tolerance: 1e-7,
    compute: () =>
      fractions([
        [2, 1],
        [1, 0.5],
        [5, 2],
        [3, 0.3],
        [10, 0.3],
        [8, 2.5],
      ]),
  },
  {
    id: 'I3-store',
    title: 'Storage correction of method B at 37.5 to 300 L/m²',
    source: 'EN 15316-4-3 method B',
    provenance: 'from memory',
    tier: 'C',
    expected: { '37.5': 1.18921, '50': 1.10668, '75': 1, '100': 0.9306, '150': 0.8409, '300': 0.70711 },
    tolerance: 6e-6,
    compute: () =>
      Object.fromEntries(
        [37.5, 50, 75, 100, 150, 300].map((litres) => [String(litres), storageCorrection(litres)]),
      ),
  },
  {
    id: 'DB-35',
    title: 'Storage correction of the monthly correlation',
    source: DUFFIE_BECKMAN_20,
    provenance: 'derived',
    tier: 'C',
    expected: { '37.5': 1.19, '75': 1, '150': 0.84, '300': 0.71 },
    tolerance: 0.006,
    compute: () =>
      Object.fromEntries([37.5, 75, 150, 300].map((litres) => [String(litres), storageCorrection(litres)])),
  },
  {
    id: 'DB-36',
    title: 'Load-exchanger correction of the monthly correlation, Z 0.5 to 50',
    source: `${DUFFIE_BECKMAN_20} (Z = 2 about 1.0)`,
    provenance: 'derived',
    tier: 'C',
    expected: { '0.5': 0.882, '1': 0.956, '2': 0.996, '10': 1.031, '50': 1.038 },
    tolerance: 6e-4,
    compute: () =>
      Object.fromEntries([0.5, 1, 2, 10, 50].map((z) => [String(z), loadExchangerCorrection(z)])),
  },
  {
    id: 'DB-37',
    title: 'Water-heating correction of the monthly correlation: 60 °C from 10 °C at −7 °C',
    source: `${DUFFIE_BECKMAN_20}; formula read in five public codes`,
    provenance: 'derived',
    tier: 'C',
    expected: { factor: 1.28262 },
    tolerance: 1e-5,
    compute: () => ({ factor: waterHeatingCorrection(60, 10, -7) }),
  },
  {
    id: 'D1-store',
    title: 'The store of the year loop left alone: 1,000 kg, UA 3.5 W/K, 70 °C in 15 °C',
    source: 'Newton’s law of cooling, closed form',
    provenance: 'derived',
    tier: 'C',
    expected: { after24hC: 66.166877, lost24hKwh: 4.457071, after168hC: 48.170057 },
    tolerance: 1e-5,
    compute: () => {
      const store = new StoreLayers(1, 1000, new Float64Array([3.5]), 0, 15);
      store.t[0] = 70;
      const { lostKwh } = leftAlone(store, HOURS_PER_DAY);
      const after24hC = store.topC;
      leftAlone(store, 6 * HOURS_PER_DAY);
      return { after24hC, lost24hKwh: lostKwh, after168hC: store.topC };
    },
  },
  {
    id: 'D2',
    title: 'Equal mixed layers flushed: first water left at the outlet (layers, turnovers)',
    source: 'tanks in series, Erlang distribution',
    provenance: 'derived',
    tier: 'C',
    expected: Object.fromEntries(
      flushes.map(([layers, turnovers, left]) => [`${layers}, ${turnovers}`, left]),
    ),
    tolerance: 1e-6,
    compute: () =>
      Object.fromEntries(
        flushes.map(([layers, turnovers]) => [`${layers}, ${turnovers}`, flushed(layers, turnovers)]),
      ),
  },
  {
    id: 'D3',
    title: 'Two layers of 500 kg at 40 K, conduction 0.625 W/K: difference after a day',
    source: 'closed form of two conducting nodes',
    provenance: 'derived',
    tier: 'C',
    expected: { differenceK: 37.988325 },
    tolerance: 1e-5,
    compute: () => {
      const store = new StoreLayers(2, 1000, new Float64Array(2), 0.625, 20);
      store.t.set([60, 20]);
      leftAlone(store, HOURS_PER_DAY);
      return { differenceK: store.topC - store.bottomC };
    },
  },
  {
    id: 'DB-38',
    title: 'Mixed store over an hour: 1,500 kg at 45 °C, load 12 MJ, UA 11.1 W/K in 20 °C',
    source: 'Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, example 8.3.1',
    provenance: 'from memory',
    tier: 'B',
    expected: { afterC: 42.9 },
    tolerance: 0.05,
    compute: () => {
      const store = new StoreLayers(1, 1500, new Float64Array([11.1]), 0, 20);
      store.t[0] = 45;
      store.coolBottom(12e6);
      leftAlone(store, 1);
      return { afterC: store.topC };
    },
  },
];
