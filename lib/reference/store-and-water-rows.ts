import { airPressureAtAltitude } from '@/lib/physics/air';
import {
  coilEffectiveness,
  collectorExchangerFactor,
  counterFlowEffectiveness,
  parallelFlowEffectiveness,
} from '@/lib/physics/heat-exchanger';
import { hotShare, mainsC, tapHeatKwh, tappedMassKg, tappingHeatKwh } from '@/lib/physics/hot-water';
import {
  STORE_CLASSES,
  classStandingLossW,
  cooledC,
  defaultStoreLossWPerK,
  lossFromCoolDownWPerK,
  lossFromStandingW,
} from '@/lib/physics/store-loss';
import {
  boilingTemperatureC,
  waterConductivity,
  waterDensity,
  waterSaturationPressure,
  waterSpecificHeat,
  waterViscosity,
} from '@/lib/physics/water';
import { DAYS_PER_YEAR } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const IAPWS =
  'IAPWS-IF97, viscosity 2008, conductivity 2011; table computed with an independent IAPWS library';

/** °C, kg/m³, kJ/(kg K), µPa s, W/(m K), kPa */
const WATER_TABLE: readonly [number, number, number, number, number, number][] = [
  [5, 999.967, 4.20495, 1518.17, 0.56779, 0.8726],
  [10, 999.702, 4.19545, 1305.9, 0.57878, 1.2282],
  [20, 998.206, 4.18479, 1001.6, 0.59801, 2.3392],
  [30, 995.652, 4.18002, 797.22, 0.6144, 4.2467],
  [40, 992.224, 4.17855, 652.73, 0.6285, 7.3844],
  [50, 988.047, 4.17955, 546.52, 0.64064, 12.3513],
  [60, 983.211, 4.18276, 466.04, 0.65102, 19.9458],
  [70, 977.779, 4.1881, 403.56, 0.65978, 31.2006],
  [80, 971.803, 4.19552, 354.06, 0.66701, 47.4147],
  [90, 965.319, 4.20502, 314.18, 0.6728, 70.1824],
  [95, 961.895, 4.21057, 297.09, 0.67518, 84.6089],
];

const water = (
  id: string,
  title: string,
  column: 1 | 2 | 3 | 4 | 5,
  tolerance: number,
  property: (temperatureC: number) => number,
): ReferenceRow => ({
  id,
  title,
  source: IAPWS,
  provenance: 'derived',
  tier: 'C',
  expected: Object.fromEntries(WATER_TABLE.map((row) => [`${row[0]} °C`, row[column]])),
  tolerance,
  relative: true,
  compute: () => Object.fromEntries(WATER_TABLE.map((row) => [`${row[0]} °C`, property(row[0])])),
});

// prettier-ignore
const CLASS_LIMITS: Record<keyof typeof STORE_CLASSES, readonly [number, number, number, number]> = {
  'A+': [25.44, 31.81, 36.44, 43.46],
  A: [35.32, 43.88, 50.11, 59.55],
  B: [49.42, 61.37, 70.06, 83.23],
  C: [69.22, 86.01, 98.22, 116.71],
  D: [86.18, 107.0, 122.15, 145.08],
  E: [112.19, 139.73, 159.75, 190.07],
  F: [136.12, 169.7, 194.13, 231.11],
};
const CLASS_VOLUMES = [100, 200, 300, 500];
const CLASSES = Object.keys(STORE_CLASSES) as (keyof typeof STORE_CLASSES)[];

const mains = (
  place: string,
  meanC: number,
  amplitudeK: number,
  values: readonly number[],
): ReferenceRow => ({
  id: `C3-${place}`,
  title: `Cold water over the year, reference set ${place}`,
  source: 'EN 12976-2, Annex B, reference conditions',
  provenance: 'from memory',
  tier: 'B',
  expected: Object.fromEntries([15, 45, 137, 228].map((day, i) => [`day ${day}`, values[i]!])),
  tolerance: 1e-3,
  compute: () =>
    Object.fromEntries([15, 45, 137, 228].map((day) => [`day ${day}`, mainsC(meanC, amplitudeK, day)])),
});

const daySum = (profile: Parameters<typeof tappingHeatKwh>[0]) =>
  tappingHeatKwh(profile).reduce((sum, kwh) => sum + kwh, 0);

export const storeAndWaterRows: ReferenceRow[] = [
  water('D8-density', 'Density of water', 1, 1e-4, waterDensity),
  water('D8-heat', 'Specific heat of water', 2, 1e-3, (t) => waterSpecificHeat(t) / 1000),
  water('D8-viscosity', 'Viscosity of water', 3, 0.01, (t) => waterViscosity(t) * 1e6),
  water('D8-conductivity', 'Thermal conductivity of water', 4, 0.02, waterConductivity),
  water('D8-saturation', 'Saturation pressure of water', 5, 1e-4, (t) => waterSaturationPressure(t) / 1000),
  {
    id: 'D8-boiling',
    title: 'Boiling temperature at 0.1 MPa',
    source: 'IAPWS-IF97, verification value of region 4: 372.755919 K',
    provenance: 'from memory',
    tier: 'B',
    expected: { boilingC: 99.605919 },
    tolerance: 0.01,
    compute: () => ({ boilingC: boilingTemperatureC(1e5) }),
  },
  {
    id: 'air-pressure',
    title: 'Standard atmosphere at 0, 1,000, 1,500 and 2,000 m',
    source: 'ISO 2533:1975, table (89,876; 84,559; 79,501 Pa)',
    provenance: 'from memory',
    tier: 'B',
    expected: { '0': 101325, '1000': 89876, '1500': 84559, '2000': 79501 },
    tolerance: 20,
    compute: () => ({
      '0': airPressureAtAltitude(0),
      '1000': airPressureAtAltitude(1000),
      '1500': airPressureAtAltitude(1500),
      '2000': airPressureAtAltitude(2000),
    }),
  },
  {
    id: 'D1',
    title: 'A store of 1,000 kg left alone: UA 3.5 W/K, 70 °C in 15 °C',
    source: 'Newton’s law of cooling, closed form',
    provenance: 'derived',
    tier: 'C',
    expected: { after24h: 66.166877, after168h: 48.170057 },
    tolerance: 1e-5,
    compute: () => ({
      after24h: cooledC(70, 15, 4186000, 3.5, 24),
      after168h: cooledC(70, 15, 4186000, 3.5, 168),
    }),
  },
  {
    id: 'DB-39',
    title: 'A store of 1,500 kg left alone for a day: UA 11.1 W/K, 45 °C in 20 °C',
    source: 'Newton’s law of cooling, closed form',
    provenance: 'derived',
    tier: 'C',
    expected: { after24h: 41.462 },
    tolerance: 0.001,
    compute: () => ({ after24h: cooledC(45, 20, 1500 * 4190, 11.1, 24) }),
  },
  {
    id: 'K3',
    title: 'Loss from a cool-down: 70 → 66 °C in 24 h, 1,000 kg in 15 °C',
    source: 'closed form of Newton’s law of cooling',
    provenance: 'derived',
    tier: 'C',
    expected: { lossWPerK: 3.658271 },
    tolerance: 1e-6,
    compute: () => ({ lossWPerK: lossFromCoolDownWPerK(4186000, 70, 66, 15, 24) }),
  },
  {
    id: 'D4',
    title: 'Exchanger effectiveness: NTU 2 counter C 0.5, balanced, parallel C 0.5; coil NTU 1',
    source: 'Kays & London, effectiveness–NTU relations',
    provenance: 'from memory',
    tier: 'B',
    expected: { counter: 0.7746, balanced: 0.666667, parallel: 0.633475, coil: 0.632121 },
    tolerance: { counter: 5e-5, balanced: 1e-6, parallel: 1e-6, coil: 1e-6 },
    compute: () => ({
      counter: counterFlowEffectiveness(2, 0.5),
      balanced: counterFlowEffectiveness(2, 1),
      parallel: parallelFlowEffectiveness(2, 0.5),
      coil: coilEffectiveness(1),
    }),
  },
  {
    id: 'DB-32',
    title: 'Exchanger between collector and store: effectiveness and penalty',
    source: 'de Winter, Solar Energy 17 (1975) 335; Duffie & Beckman, 4th ed. 2013, sec. 10.2',
    provenance: 'derived',
    tier: 'C',
    expected: { effectiveness: 0.67, factor: 0.96 },
    tolerance: 0.005,
    compute: () => {
      const effectiveness = counterFlowEffectiveness(6500 / 3771, 3771 / 4522.5);
      return { effectiveness, factor: collectorExchangerFactor(60 * 3.75, 4522.5, 3771, effectiveness) };
    },
  },
  {
    id: 'D6',
    title: 'Default loss of a solar store, 200 to 1,000 L',
    source: 'EN 15316-4-3; EN 12977-3 default',
    provenance: 'from memory',
    tier: 'B',
    expected: { '200': 2.2627, '300': 2.7713, '500': 3.5777, '1000': 5.0596 },
    tolerance: 1e-4,
    compute: () =>
      Object.fromEntries(
        [200, 300, 500, 1000].map((litres) => [String(litres), defaultStoreLossWPerK(litres)]),
      ),
  },
  {
    id: 'D7',
    title: 'Standing-loss limits of the energy label, A+ to F, 100 to 500 L',
    source: 'Regulation (EU) 812/2013, Annex II',
    provenance: 'read',
    tier: 'A',
    expected: Object.fromEntries(
      CLASSES.flatMap((name) =>
        CLASS_VOLUMES.map((litres, i) => [`${name} ${litres}`, CLASS_LIMITS[name][i]!]),
      ),
    ),
    tolerance: 0.01,
    compute: () =>
      Object.fromEntries(
        CLASSES.flatMap((name) =>
          CLASS_VOLUMES.map((litres) => [`${name} ${litres}`, classStandingLossW(name, litres)]),
        ),
      ),
  },
  {
    id: 'D7-loss',
    title: 'Loss coefficient of a store that stands at 50 W',
    source: 'Regulation (EU) 812/2013, Annex II: 65 °C in 20 °C',
    provenance: 'derived',
    tier: 'C',
    expected: { lossWPerK: 1.111111 },
    tolerance: 1e-6,
    compute: () => ({ lossWPerK: lossFromStandingW(50) }),
  },
  {
    id: 'C1',
    title: 'Load profiles sum to the published Q_ref',
    source: 'Regulations (EU) 812/2013 and 814/2013, load profiles',
    provenance: 'from memory',
    tier: 'B',
    expected: { S: 2.1, M: 5.845, L: 11.655, XL: 19.07 },
    tolerance: 1e-12,
    compute: () => ({ S: daySum('S'), M: daySum('M'), L: daySum('L'), XL: daySum('XL') }),
  },
  {
    id: 'C1-litres',
    title: 'Profiles M and L are about 100 and 200 L/day at 60 °C',
    source: 'page of a trade association',
    provenance: 'read',
    tier: 'A',
    expected: { M: 100, L: 200 },
    tolerance: 1,
    compute: () => ({ M: tappedMassKg(daySum('M'), 60, 10), L: tappedMassKg(daySum('L'), 60, 10) }),
  },
  {
    id: 'C2',
    title: 'A shower of 1.4 kWh at 40 °C, and the hot share of 40 L from 60 and 10 °C',
    source: 'energy balance',
    provenance: 'derived',
    tier: 'C',
    expected: { kg: 40.1338, hotL: 24 },
    tolerance: 1e-3,
    compute: () => ({ kg: tappedMassKg(1.4, 40, 10), hotL: 40 * hotShare(40, 60, 10) }),
  },
  mains('Stockholm', 8.5, 6.4, [2.976, 2.101, 8.5, 14.9]),
  mains('Wuerzburg', 10, 3, [7.411, 7, 10, 13]),
  mains('Davos', 5.4, 0.8, [4.709, 4.6, 5.4, 6.2]),
  mains('Athens', 17.8, 7.4, [11.413, 10.401, 17.8, 25.2]),
  {
    id: 'C5',
    title: 'Hot water of the reference household: 200 L/day at 45 °C from 10 °C',
    source: 'IEA SHC Task 26, draw-off profile paper',
    provenance: 'from memory',
    tier: 'B',
    expected: { kwhPerYear: 2970.9 },
    tolerance: 0.5,
    compute: () => ({ kwhPerYear: tapHeatKwh(200, 45, 10) * DAYS_PER_YEAR }),
  },
  {
    id: 'K1',
    title: 'Heat to warm 26 kg by 35 K',
    source: 'E = mcΔT',
    provenance: 'derived',
    tier: 'C',
    expected: { kwh: 1.058128 },
    tolerance: 1e-6,
    compute: () => ({ kwh: tapHeatKwh(26, 45, 10) }),
  },
];
