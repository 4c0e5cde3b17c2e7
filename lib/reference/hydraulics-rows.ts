import { activationEnergy, arrheniusFactor, ruleOfTenFactor } from '@/lib/physics/ageing';
import {
  SIPHON_VELOCITY_M_PER_S,
  siphonBoilingC,
  siphonLimitM,
  steadyStopDifferenceK,
} from '@/lib/physics/drain-back';
import { pipeLossWPerMK } from '@/lib/physics/pipe';
import {
  drainVelocity,
  flowVelocity,
  frictionFactor,
  pressureDropPa,
  reynoldsNumber,
} from '@/lib/physics/pipe-flow';
import { frictionHeadM, liftPowerW, pumpEnergyKwh } from '@/lib/physics/pump';
import { waterDensity, waterViscosity } from '@/lib/physics/water';
import {
  FT_PER_M,
  L_PER_M3,
  L_PER_US_GALLON,
  M_PER_INCH,
  PA_PER_PSI,
  SECONDS_PER_MINUTE,
} from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const COLEBROOK = 'Colebrook equation (form read in two papers); values by fixed point and by Newton';
const SOLAR_MANUAL = 'solar installation manual, p. 28–29, and a trade journal';

const at50C = { density: 988.05, viscosity: 546.5e-6 };
const DRAWN_TUBE_M = 1.5e-6;
const at20C = { density: waterDensity(20), viscosity: waterViscosity(20) };

const FRICTION: readonly [number, number, number][] = [
  [4e3, 0, 0.039907],
  [1e4, 0, 0.030883],
  [1e4, 0.001, 0.032382],
  [1e5, 0, 0.01799],
  [1e5, 0.0001, 0.018514],
  [1e5, 0.001, 0.022175],
  [1e6, 0.0001, 0.013441],
  [1e6, 0.001, 0.019943],
  [1e8, 0.05, 0.071551],
];

const SIPHON_TEMPERATURES = [50, 60, 70, 80, 85, 90, 95];
// prettier-ignore
const SIPHON_LIMITS: Record<string, readonly number[]> = {
  '0': [9.183, 8.44, 7.313, 5.657, 4.575, 3.29, 1.772],
  '1000': [8.001, 7.253, 6.119, 4.455, 3.37, 2.08, 0.558],
  '1500': [7.452, 6.701, 5.564, 3.897, 2.81, 1.518, -0.006],
  '2000': [6.93, 6.176, 5.037, 3.366, 2.277, 0.984, -0.542],
};
// prettier-ignore
const SIPHON_BOILING: Record<string, readonly number[]> = {
  '0': [99.97, 97.24, 94.25, 90.96, 87.3, 83.13, 78.3, 72.5, 65.16],
  '1500': [94.98, 91.77, 88.2, 84.17, 79.52, 73.99, 67.09, 57.76, 42.57],
};

const table = (
  rows: Record<string, readonly number[]>,
  value: (altitude: number, index: number, expected: number) => number,
) =>
  Object.fromEntries(
    Object.entries(rows).flatMap(([altitude, values]) =>
      values.map((expected, i) => [`${altitude} m, ${i}`, value(Number(altitude), i, expected)]),
    ),
  );

const BORES_INCH = [0.569, 0.811, 1.055, 1.291, 1.527];
const SIPHON_GPM = [1.59, 3.22, 5.45, 8.16, 11.42];

/** The flow at which the bore reaches the siphon velocity: velocity is proportional to flow. */
function siphonFlowGpm(boreInch: number): number {
  const perM3PerS = flowVelocity(1, boreInch * M_PER_INCH);
  return ((SIPHON_VELOCITY_M_PER_S / perM3PerS) * L_PER_M3 * SECONDS_PER_MINUTE) / L_PER_US_GALLON;
}

export const hydraulicsRows: ReferenceRow[] = [
  {
    id: 'E1',
    title: 'Darcy friction factor over Reynolds number and roughness',
    source: COLEBROOK,
    provenance: 'derived',
    tier: 'C',
    expected: Object.fromEntries(FRICTION.map(([re, rough, f]) => [`${re}/${rough}`, f])),
    tolerance: 1e-6,
    compute: () =>
      Object.fromEntries(FRICTION.map(([re, rough]) => [`${re}/${rough}`, frictionFactor(re, rough)])),
  },
  {
    id: 'E2',
    title: 'Pressure drop: 0.1 L/s, bore 20 mm, 30 m, ΣK 10, water at 50 °C',
    source: 'Darcy–Weisbach and Colebrook',
    provenance: 'derived',
    tier: 'C',
    expected: {
      velocity: 0.31831,
      reynolds: 11509.83,
      friction: 0.0298868,
      dropPa: 2744.539,
      headM: 0.28325,
    },
    tolerance: 1e-4,
    relative: true,
    compute: () => {
      const run = { lengthM: 30, boreM: 0.02, roughnessM: 1.5e-6, fittings: 10 };
      const velocity = flowVelocity(1e-4, run.boreM);
      const reynolds = reynoldsNumber(velocity, run.boreM, at50C);
      const dropPa = pressureDropPa(run, 1e-4, at50C);
      return {
        velocity,
        reynolds,
        friction: frictionFactor(reynolds, run.roughnessM / run.boreM),
        dropPa,
        headM: frictionHeadM(dropPa, at50C.density),
      };
    },
  },
  {
    id: 'E3',
    title:
      'Pressure drop: 0.05 L/s in 13 mm over 20 m at 50 °C; laminar 0.01 L/s in 20 mm over 10 m at 20 °C',
    source: 'Darcy–Weisbach; Hagen–Poiseuille',
    provenance: 'derived',
    tier: 'C',
    expected: { turbulentPa: 3458.775, laminarPa: 25.5055 },
    tolerance: { turbulentPa: 0.35, laminarPa: 0.026 },
    compute: () => ({
      turbulentPa: pressureDropPa(
        { lengthM: 20, boreM: 0.013, roughnessM: 1.5e-6, fittings: 0 },
        5e-5,
        at50C,
      ),
      laminarPa: pressureDropPa({ lengthM: 10, boreM: 0.02, roughnessM: 1.5e-6, fittings: 0 }, 1e-5, at20C),
    }),
  },
  {
    id: 'E4',
    title: 'Electric power to lift 600 L/h by 6 m at 25 %',
    source: 'P = ρgHQ/η',
    provenance: 'derived',
    tier: 'C',
    expected: { powerW: 39.2266 },
    tolerance: 1e-3,
    compute: () => ({ powerW: liftPowerW(600 / 3600, 6, 0.25) }),
  },
  {
    id: 'E5',
    title: 'Flow for the siphon-forming velocity of 2 ft/s in five copper tubes',
    source: SOLAR_MANUAL,
    provenance: 'read',
    tier: 'A',
    expected: Object.fromEntries(BORES_INCH.map((bore, i) => [`${bore} in`, SIPHON_GPM[i]!])),
    tolerance: 0.01,
    compute: () => Object.fromEntries(BORES_INCH.map((bore) => [`${bore} in`, siphonFlowGpm(bore)])),
  },
  {
    id: 'E6',
    title: 'Greatest siphon height at 200 °F, open and with 10 psi above the air',
    source: `${SOLAR_MANUAL}: inputs read, result from the reconstructed formula`,
    provenance: 'derived',
    tier: 'C',
    expected: { closedFt: 31.52, openFt: 7.57 },
    tolerance: 0.1,
    compute: () => ({
      closedFt: siphonLimitM(93.333, 0, 10 * PA_PER_PSI) * FT_PER_M,
      openFt: siphonLimitM(93.333) * FT_PER_M,
    }),
  },
  {
    id: 'E7',
    title: 'Height of an open siphon return before it boils, 50 to 95 °C, 0 to 2,000 m',
    source: 'hydrostatics with IAPWS vapour pressure',
    provenance: 'derived',
    tier: 'C',
    expected: table(SIPHON_LIMITS, (_altitude, _i, expected) => expected),
    tolerance: 0.01,
    compute: () => table(SIPHON_LIMITS, (altitude, i) => siphonLimitM(SIPHON_TEMPERATURES[i]!, altitude)),
  },
  {
    id: 'E8',
    title: 'Boiling temperature at the top of a siphon 0 to 8 m high, at sea level and 1,500 m',
    source: 'IAPWS-IF97 saturation temperature of p − ρgh',
    provenance: 'derived',
    tier: 'C',
    expected: table(SIPHON_BOILING, (_altitude, _i, expected) => expected),
    tolerance: 0.05,
    compute: () => table(SIPHON_BOILING, (altitude, i) => siphonBoilingC(i, altitude)),
  },
  {
    id: 'E9',
    title: 'Velocity of a full pipe draining by its fall, water at 20 °C, wall of drawn tube',
    source: 'Darcy–Weisbach and Colebrook',
    provenance: 'derived',
    tier: 'C',
    expected: { '20/0.02': 0.50328, '20/0.0208': 0.51524, '26/0.02': 0.60818, '20/0.04': 0.74883 },
    tolerance: 1e-4,
    relative: true,
    compute: () => ({
      '20/0.02': drainVelocity(0.02, 0.02, at20C, DRAWN_TUBE_M),
      '20/0.0208': drainVelocity(0.02, 0.0208333, at20C, DRAWN_TUBE_M),
      '26/0.02': drainVelocity(0.026, 0.02, at20C, DRAWN_TUBE_M),
      '20/0.04': drainVelocity(0.02, 0.04, at20C, DRAWN_TUBE_M),
    }),
  },
  {
    id: 'E12',
    title: 'Stop difference below which the controller hunts',
    source: 'Duffie & Beckman, Solar Engineering of Thermal Processes, chapter on controls',
    provenance: 'from memory',
    tier: 'B',
    expected: { direct: 0.509635, exchanger: 1.365095 },
    tolerance: 1e-5,
    compute: () => ({
      direct: steadyStopDifferenceK(8, 4, 0.015 * 4186),
      exchanger: steadyStopDifferenceK(10, 6, 0.015 * 4186, 0.7),
    }),
  },
  {
    id: 'J1',
    title: 'Loss of insulated pipes 22 + 20, 28 + 13 and 15 + 9 mm',
    source: 'ISO 12241',
    provenance: 'derived',
    tier: 'C',
    expected: { '22+20': 0.215709, '28+13': 0.312236, '15+9': 0.243799 },
    tolerance: 1e-6,
    compute: () => ({
      '22+20': pipeLossWPerMK(0.022, 0.02, 0.04, 10),
      '28+13': pipeLossWPerMK(0.028, 0.013, 0.04, 10),
      '15+9': pipeLossWPerMK(0.015, 0.009, 0.04, 10),
    }),
  },
  {
    id: 'J3',
    title: 'Energy of a 45 W pump in 1,500 h',
    source: 'definition',
    provenance: 'derived',
    tier: 'C',
    expected: { kwh: 67.5 },
    tolerance: 0,
    compute: () => ({ kwh: pumpEnergyKwh(45, 1500) }),
  },
  {
    id: 'F1',
    title: 'Activation energy that doubles the rate in 10 K, at 60 and at 20 °C',
    source: 'Arrhenius law',
    provenance: 'derived',
    tier: 'C',
    expected: { '60': 65.8845, '20': 51.2162 },
    tolerance: 1e-3,
    compute: () => ({ '60': activationEnergy(2, 60, 70), '20': activationEnergy(2, 20, 30) }),
  },
  {
    id: 'F2',
    title: 'Acceleration of the ageing of PVC, Ea 117.5 kJ/mol, and of Ea 80',
    source: 'Polymer Degradation and Stability 22 (1988) 31 (Ea read); Arrhenius law',
    provenance: 'derived',
    tier: 'C',
    expected: { '70': 3.44242, '80': 11.049, '100': 94.3642, '100 at 80': 22.108 },
    tolerance: 1e-4,
    relative: true,
    compute: () => ({
      '70': arrheniusFactor(117.5, 70, 60),
      '80': arrheniusFactor(117.5, 80, 60),
      '100': arrheniusFactor(117.5, 100, 60),
      '100 at 80': arrheniusFactor(80, 100, 60),
    }),
  },
  {
    id: 'F3',
    title: 'Rule of ten: 55 against 25 °C at Q10 = 2',
    source: 'ASTM F1980, worked value',
    provenance: 'read',
    tier: 'A',
    expected: { factor: 8 },
    tolerance: 1e-12,
    compute: () => ({ factor: ruleOfTenFactor(2, 55, 25) }),
  },
];
