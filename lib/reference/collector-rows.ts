import {
  backAndEdgeLoss,
  collectorEfficiencyFactor,
  collectorFlowFactor,
  finEfficiency,
  heatRemovalFactor,
} from '@/lib/physics/absorber';
import {
  beamEfficiency,
  curveRootC,
  efficiency,
  flowFactorRatio,
  fromEn12975Unglazed,
  hemisphericalEfficiency,
  inletForm,
  plateLossFromTest,
  steadyPower,
} from '@/lib/physics/collector';
import {
  approximateTransmittanceAbsorptance,
  coverDiffuseReflectance,
  coverOptics,
  groundEffectiveAngleDeg,
  reflectionTransmittance,
  refractionDeg,
  sheetModifier,
  skyEffectiveAngleDeg,
  surfaceReflectance,
  transmittanceAbsorptance,
} from '@/lib/physics/cover';
import { gapNusselt, gapTilt } from '@/lib/physics/gap-convection';
import { beamModifier, diffuseModifierFromB0, diffuseModifierFromTable } from '@/lib/physics/incidence-angle';
import { pipeLossFactors } from '@/lib/physics/pipe';
import { kleinTopLoss, topLoss } from '@/lib/physics/top-loss';
import { STEFAN_BOLTZMANN, toKelvin, toRadians } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const DUFFIE_BECKMAN = 'Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013';
const CERTIFICATE =
  'public ISO 9806:2017 certificate annex of a selective flat plate (2022), product name withheld';
const DATA_SHEET = 'public data sheet of a selective flat plate (2019), name withheld';
const IAM_TESTS = 'published test values of an open solar library';
const HOLLANDS = 'Hollands, Unny, Raithby & Konicek, J. Heat Transfer 98 (1976) 189';
const KLEIN = 'Klein, Solar Energy 23 (1979) 271';

const NO_LONGWAVE = 315;
const certificate = {
  eta0Beam: 0.739,
  diffuseModifier: 0.91,
  a1: 3.51,
  a2: 0.017,
  a3: 0,
  a4: 0,
  a6: 0,
};

function certificatePower(deltaK: number): number {
  return steadyPower(certificate, 20 + deltaK, {
    beamWm2: 850,
    beamModifier: 1,
    diffuseWm2: 150,
    airC: 20,
    windMPerS: 3,
    longwaveWm2: NO_LONGWAVE,
  });
}

function efficiencyTable(eta0: number, a1: number, a2: number): Record<string, number> {
  const rows = Array.from({ length: 11 }, (_, i) => [
    (i / 100).toFixed(2),
    efficiency(eta0, a1, a2, i * 10, 1000),
  ]);
  return Object.fromEntries(rows) as Record<string, number>;
}

const nusselt = (rayleigh: number, tiltDeg: number, value: number): ReferenceRow => ({
  id: `CT-13-${rayleigh}-${tiltDeg}`,
  title: `Nusselt number of an inclined gap, Ra ${rayleigh}, tilt ${tiltDeg}°`,
  source: HOLLANDS,
  provenance: 'derived',
  tier: 'C',
  expected: { value },
  tolerance: 0.001,
  compute: () => ({ value: gapNusselt(rayleigh, gapTilt(tiltDeg)) }),
});

const klein = (args: Parameters<typeof kleinTopLoss>, value: number): ReferenceRow => ({
  id: `CT-14-${args[0]}-${args[4]}-${args[6]}`,
  title: `Top loss in closed form: plate ${args[0]} °C, air ${args[1]} °C, emittance ${args[4]}, ${args[6]} cover(s)`,
  source: `${KLEIN} (${DUFFIE_BECKMAN}, eq. 6.4.9)`,
  provenance: 'derived',
  tier: 'C',
  expected: { value },
  tolerance: 0.001,
  compute: () => ({ value: kleinTopLoss(...args) }),
});

const angleModifier = (incidenceDeg: number, value: number): ReferenceRow => ({
  id: `CT-05-${incidenceDeg}`,
  title: `Incidence-angle modifier of the b0 form at ${incidenceDeg}°, b0 = 0.05`,
  source: `${IAM_TESTS}, after Souka & Safwat (1966) and ASHRAE 93`,
  provenance: 'read',
  tier: 'A',
  expected: { value },
  tolerance: 1e-7,
  compute: () => ({ value: beamModifier(0.05, Math.cos(toRadians(incidenceDeg))) }),
});

const sheet = (incidenceDeg: number, value: number): ReferenceRow => ({
  id: `CT-06-${incidenceDeg}`,
  title: `Modifier of a cover sheet at ${incidenceDeg}°: n 1.526, K 4 /m, 2 mm`,
  source: `${IAM_TESTS}, after De Soto, Klein & Beckman, Solar Energy 80 (2006) 78`,
  provenance: 'read',
  tier: 'A',
  expected: { value },
  tolerance: 1e-7,
  compute: () => ({ value: sheetModifier(incidenceDeg, 1.526, 0.008) }),
});

const copperFin = {
  tubeSpacingM: 0.15,
  tubeDiameterM: 0.01,
  tubeBoreM: 0.01,
  sheetThicknessM: 0.0005,
  sheetConductivity: 385,
  bondWPerMK: Infinity,
  fluidFilmWPerM2K: 300,
};

export const collectorRows: ReferenceRow[] = [
  {
    id: 'CT-01',
    title: 'Power of a certified flat plate per gross square metre, 85 % beam, 1000 W/m²',
    source: CERTIFICATE,
    provenance: 'read',
    tier: 'A',
    expected: { '0': 729, '10': 692, '30': 608, '50': 511, '70': 400, '83': 321 },
    tolerance: 0.5,
    compute: () =>
      Object.fromEntries([0, 10, 30, 50, 70, 83].map((delta) => [String(delta), certificatePower(delta)])),
  },
  {
    id: 'CT-02',
    title: 'Hemispherical from beam efficiency of the same certificate, and back',
    source: `${CERTIFICATE}: η0,b 0.739 and power 729 W/m² without loss`,
    provenance: 'read',
    tier: 'A',
    expected: { hemispherical: 0.729, beam: 0.739 },
    tolerance: 0.0005,
    compute: () => ({
      hemispherical: hemisphericalEfficiency(0.739, 0.91),
      beam: beamEfficiency(0.729, 0.91),
    }),
  },
  {
    id: 'CT-03',
    title: 'Diffuse modifier from the published table of beam modifiers',
    source: CERTIFICATE,
    provenance: 'read',
    tier: 'A',
    expected: { value: 0.91 },
    tolerance: 0.01,
    compute: () => ({
      value: diffuseModifierFromTable([1, 1, 0.99, 0.98, 0.97, 0.94, 0.9, 0.8, 0.5, 0]),
    }),
  },
  {
    id: 'CT-04',
    title: 'Diffuse modifier of the b0 form',
    source: 'isotropic hemisphere of the clamped b0 form, closed form',
    provenance: 'derived',
    tier: 'C',
    expected: { '0.05': 0.95238, '0.10': 0.90909, '0.15': 0.86957 },
    tolerance: 2e-5,
    compute: () => ({
      '0.05': diffuseModifierFromB0(0.05),
      '0.10': diffuseModifierFromB0(0.1),
      '0.15': diffuseModifierFromB0(0.15),
    }),
  },
  angleModifier(22.5, 0.99588039),
  angleModifier(45, 0.97928932),
  sheet(22.5, 0.99926198),
  sheet(45, 0.98797788),
  sheet(67.5, 0.8893998),
  {
    id: 'CT-07A',
    title: 'Efficiency table of a data sheet over (Tm − Ta)/G',
    source: DATA_SHEET,
    provenance: 'read',
    tier: 'A',
    expected: {
      '0.00': 0.8,
      '0.01': 0.76,
      '0.02': 0.72,
      '0.03': 0.68,
      '0.04': 0.63,
      '0.05': 0.59,
      '0.06': 0.54,
      '0.07': 0.49,
      '0.08': 0.43,
      '0.09': 0.38,
      '0.10': 0.32,
    },
    tolerance: 0.0055,
    compute: () => efficiencyTable(0.795, 3.627, 0.011),
  },
  {
    id: 'CT-07B',
    title: 'Efficiency table of a second data sheet over (Tm − Ta)/G',
    source: DATA_SHEET,
    provenance: 'read',
    tier: 'A',
    expected: {
      '0.00': 0.8,
      '0.01': 0.76,
      '0.02': 0.72,
      '0.03': 0.68,
      '0.04': 0.64,
      '0.05': 0.59,
      '0.06': 0.55,
      '0.07': 0.5,
      '0.08': 0.44,
      '0.09': 0.39,
      '0.10': 0.34,
    },
    tolerance: 0.0055,
    compute: () => efficiencyTable(0.801, 3.653, 0.01),
  },
  {
    id: 'CT-08',
    title:
      'Root of the certified curve at 1000 W/m² and 30 °C (the declared stagnation temperature is 189.4 °C)',
    source: CERTIFICATE,
    provenance: 'derived',
    tier: 'C',
    expected: { rootC: 158.2 },
    tolerance: 0.1,
    compute: () => ({ rootC: curveRootC(729, 3.51, 0.017, 30) }),
  },
  {
    id: 'CT-09',
    title: 'Unglazed collector of EN 12975-2 in the form of ISO 9806:2017, 800 W/m², 15 K, 4.5 m/s',
    source: 'EN 12975-2:2006 and ISO 9806:2017, definitions (from memory): identity',
    provenance: 'derived',
    tier: 'C',
    expected: { powerWm2: 230.46955 },
    tolerance: 1e-9,
    compute: () => ({
      powerWm2: steadyPower(
        fromEn12975Unglazed({ eta0: 0.92, bu: 0.015, b1: 12, b2: 3, epsilonPerAlpha: 0.95 }),
        35,
        {
          beamWm2: 800,
          beamModifier: 1,
          diffuseWm2: 0,
          airC: 20,
          windMPerS: 4.5,
          longwaveWm2: STEFAN_BOLTZMANN * toKelvin(20) ** 4 - 90,
        },
      ),
    }),
  },
  {
    id: 'CT-10',
    title: 'Inlet form from mean-fluid form at 0.02 kg/(s m²)',
    source: `${DUFFIE_BECKMAN}, sec. 6.19`,
    provenance: 'derived',
    tier: 'C',
    expected: { frTauAlpha: 0.7596, frUl: 4.382 },
    tolerance: 0.0005,
    compute: () => inletForm(0.78, 4.5, 0.02),
  },
  {
    id: 'CT-11',
    title: 'Flow correction from 0.015 to 0.03 kg/(s m²)',
    source: `${DUFFIE_BECKMAN}, eq. 6.20.1–6.20.4`,
    provenance: 'derived',
    tier: 'C',
    expected: { plateLoss: 4.1331, ratio: 1.01645 },
    tolerance: 1e-4,
    compute: () => {
      const plateLoss = plateLossFromTest(4, 0.015);
      return { plateLoss, ratio: flowFactorRatio(plateLoss, 0.015, 0.03) };
    },
  },
  {
    id: 'CT-12',
    title: 'Collector and pipes as one collector',
    source: `Beckman, Solar Energy 21 (1978) 531; ${DUFFIE_BECKMAN}, eq. 10.3.8–10.3.9`,
    provenance: 'derived',
    tier: 'C',
    expected: { tauAlpha: 0.998289, loss: 1.0415 },
    tolerance: 1e-5,
    compute: () => ({ ...pipeLossFactors(0.6 * 3, 0.6 * 3, 1050, 20 * 4) }),
  },
  nusselt(10000, 0, 2.391),
  nusselt(10000, 45, 1.9),
  nusselt(100000, 45, 3.67),
  nusselt(100000, 60, 3.393),
  klein([60, 10, 45, 10, 0.95, 0.88, 1], 5.738),
  klein([60, 10, 45, 10, 0.1, 0.88, 1], 3.253),
  klein([40, 0, 60, 5, 0.95, 0.88, 1], 4.378),
  klein([150, 25, 45, 20, 0.95, 0.88, 1], 9.484),
  klein([100, 10, 45, 10, 0.95, 0.88, 2], 3.876),
  {
    id: 'DB-22',
    title: 'Fresnel reflectance of glass at 0° and 60°',
    source: `${DUFFIE_BECKMAN}, Ex. 5.1.1`,
    provenance: 'from memory',
    tier: 'B',
    expected: { r0: 0.0434, r60: 0.093, inside60: 34.58 },
    tolerance: { r0: 5e-5, r60: 0.0006, inside60: 0.005 },
    compute: () => ({
      r0: surfaceReflectance(0, 1.526).mean,
      r60: surfaceReflectance(60, 1.526).mean,
      inside60: refractionDeg(60, 1.526),
    }),
  },
  {
    id: 'DB-23',
    title: 'Two covers that only reflect',
    source: `${DUFFIE_BECKMAN}, Ex. 5.1.2`,
    provenance: 'from memory',
    tier: 'B',
    expected: { tau0: 0.85, tau60: 0.76 },
    tolerance: 0.005,
    compute: () => ({
      tau0: reflectionTransmittance(0, 1.526, 2),
      tau60: reflectionTransmittance(60, 1.526, 2),
    }),
  },
  {
    id: 'DB-24',
    title: 'Absorbing cover at 60°: K 32 /m, 2.3 mm',
    source: `${DUFFIE_BECKMAN}, Ex. 5.3.1`,
    provenance: 'derived',
    tier: 'C',
    expected: { transmittance: 0.768, reflectance: 0.147, absorptance: 0.085 },
    tolerance: 0.0006,
    compute: () => ({ ...coverOptics(60, 1.526, 32 * 0.0023) }),
  },
  {
    id: 'DB-25',
    title: '(τα) of one cover at 50°, KL 0.0370, α 0.90',
    source: `${DUFFIE_BECKMAN}, eq. 5.5.1–5.5.2`,
    provenance: 'derived',
    tier: 'C',
    expected: { tau: 0.852, diffuse: 0.152, product: 0.7786, approximate: 0.7745 },
    tolerance: 0.0006,
    compute: () => {
      const tau = coverOptics(50, 1.526, 0.037).transmittance;
      const diffuse = coverDiffuseReflectance(1.526, 0.037);
      return {
        tau,
        diffuse,
        product: transmittanceAbsorptance(tau, 0.9, diffuse),
        approximate: approximateTransmittanceAbsorptance(tau, 0.9),
      };
    },
  },
  {
    id: 'DB-26',
    title: 'Effective angles of sky and ground at 45° and 60° tilt',
    source: `Brandemuehl & Beckman, Solar Energy 24 (1980) 511; ${DUFFIE_BECKMAN}, eq. 5.4.1–5.4.2`,
    provenance: 'derived',
    tier: 'C',
    expected: { sky45: 56.49, ground45: 69.41, sky60: 56.76, ground60: 64.97 },
    tolerance: 0.006,
    compute: () => ({
      sky45: skyEffectiveAngleDeg(45),
      ground45: groundEffectiveAngleDeg(45),
      sky60: skyEffectiveAngleDeg(60),
      ground60: groundEffectiveAngleDeg(60),
    }),
  },
  {
    id: 'DB-27',
    title: 'Top loss of a black plate at 100 °C under one glass cover',
    source: `${DUFFIE_BECKMAN}, Ex. 6.4.1`,
    provenance: 'from memory',
    tier: 'B',
    expected: { lossWPerM2K: 6.62, coverC: 48.5 },
    tolerance: { lossWPerM2K: 0.03, coverC: 0.5 },
    compute: () => ({
      ...topLoss({
        plateC: 100,
        airC: 10,
        skyC: 10,
        gapM: 0.025,
        tiltDeg: 45,
        plateEmittance: 0.95,
        coverEmittance: 0.88,
        coverLongwaveTransmittance: 0,
        windWPerM2K: 10,
      }),
    }),
  },
  {
    id: 'DB-29',
    title: 'Back and edge loss of a 10 m × 3 m collector, and the overall loss with a top loss of 6.6',
    source: `${DUFFIE_BECKMAN}, sec. 6.4, example`,
    provenance: 'from memory',
    tier: 'B',
    expected: { back: 0.9, edge: 0.12, overall: 7.6 },
    tolerance: { back: 0.001, edge: 0.004, overall: 0.05 },
    compute: () => {
      const { back, edge } = backAndEdgeLoss(0.045, 0.05, 0.025, 26, 0.075, 30);
      return { back, edge, overall: 6.6 + back + edge };
    },
  },
  {
    id: 'DB-30',
    title: 'Fin efficiency and efficiency factor of a copper sheet with tubes',
    source: `${DUFFIE_BECKMAN}, Ex. 6.5.1`,
    provenance: 'from memory',
    tier: 'B',
    expected: { fin: 0.937, factor: 0.841 },
    tolerance: 0.0006,
    compute: () => ({
      fin: finEfficiency(copperFin, 8),
      factor: collectorEfficiencyFactor(copperFin, 8),
    }),
  },
  {
    id: 'DB-31',
    title: 'Flow factor and heat removal factor, 0.03 kg/s through 2 m²',
    source: `${DUFFIE_BECKMAN}, Ex. 6.7.1`,
    provenance: 'from memory',
    tier: 'B',
    expected: { flowFactor: 0.949, heatRemoval: 0.8 },
    tolerance: { flowFactor: 0.001, heatRemoval: 0.005 },
    compute: () => {
      const capacityFlow = (0.03 * 4190) / 2;
      return {
        flowFactor: collectorFlowFactor(capacityFlow, 8, 0.841),
        heatRemoval: heatRemovalFactor(capacityFlow, 8, 0.841),
      };
    },
  },
];
