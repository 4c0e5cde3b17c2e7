import { HouseNetwork, hourlyNeed, type CapacityClass, type NetworkInput } from '@/lib/physics/house-network';
import { HOURS_PER_YEAR, J_PER_WH, SECONDS_PER_HOUR } from '@/lib/units/constants';
import { waveOutdoorC, waveSolarW } from './wave-weather';
import type { ReferenceRow } from './reference-row';

const ISO = 'ISO 13790:2008, annex C and clause 12.2 (text partly read in public, rest from memory)';

/** House H1 of the reference collection. */
const h1: NetworkInput = {
  floorAreaM2: 100,
  capacityClass: 'medium',
  opaqueWPerK: 90,
  windowWPerK: 21,
  slabCapacityJPerK: 0,
};
const VENTILATION = 40;

function steady(outdoorC: number, airC: number): number {
  const network = new HouseNetwork(h1);
  network.reset(airC);
  network.prepare(VENTILATION, 0, SECONDS_PER_HOUR);
  const risePerW = network.airRise(1, 0, 0);
  let need = 0;
  for (let h = 0; h < 20_000; h++) {
    network.drive(outdoorC, outdoorC, 0, 0, 0);
    network.solve();
    need = (airC - network.airC) / risePerW;
    network.add(need);
    network.advance();
  }
  return need;
}

function waveYear(capacityClass: CapacityClass) {
  const hours = Array.from({ length: HOURS_PER_YEAR }, (_, h) => ({
    outdoorC: waveOutdoorC(h),
    internalW: 300,
    solarW: waveSolarW(h),
  }));
  const { needW, airC } = hourlyNeed({ ...h1, capacityClass }, VENTILATION, hours, 20);
  return {
    heating_kWh: needW.reduce((sum, w) => sum + w, 0) / 1000,
    peak_W: Math.max(...needW),
    hours_heating: needW.filter((w) => w > 0).length,
    max_air_C: Math.max(...airC),
  };
}

/** The published synthetic years A6 by class: heating [kWh], peak [W], hours of heating, hottest air [°C]. */
export const WAVE_YEARS: Record<CapacityClass, [number, number, number, number]> = {
  'very light': [8526.4345, 2947.769, 5282, 27.8932],
  light: [8450.2888, 2902.666, 5290, 27.1556],
  medium: [8383.7442, 2827.979, 5349, 26.5112],
  heavy: [8339.3192, 2739.048, 5430, 26.035],
  'very heavy': [8316.9765, 2672.977, 5491, 25.7854],
};

export const houseRows: ReferenceRow[] = [
  {
    id: 'A1',
    title: 'Hourly network: coupling coefficients, medium class',
    source: ISO,
    provenance: 'derived',
    tier: 'C',
    expected: { H_is: 1552.5, H_ms: 2275, H_em: 93.7071 },
    tolerance: 1e-4,
    compute: () => {
      const network = new HouseNetwork(h1);
      return { H_is: network.hIs, H_ms: network.hMs, H_em: network.hEm };
    },
  },
  {
    id: 'A2',
    title: 'Hourly network: one hour with heating to 20 °C',
    source: ISO,
    provenance: 'derived',
    tier: 'C',
    expected: { Phi_H_W: 2788.8694, theta_m: 17.985206, theta_s: 18.751131, theta_air: 20 },
    tolerance: 1e-4,
    compute: () => {
      const { needW, network } = hourlyNeed(
        h1,
        VENTILATION,
        [{ outdoorC: -5, internalW: 300, solarW: 500 }],
        20,
        Infinity,
        18,
      );
      return {
        Phi_H_W: needW[0]!,
        theta_m: network.massC,
        theta_s: network.surfaceC,
        theta_air: network.airC,
      };
    },
  },
  {
    id: 'A4',
    title: 'Hourly network: steady state without gains, 30 K',
    source: 'closed form of the annex C network, H_ve + 1/(1/H_is + 1/(H_w + H_op))',
    provenance: 'derived',
    tier: 'C',
    expected: { Phi_H_W: 4307.7998 },
    tolerance: 1e-4,
    compute: () => ({ Phi_H_W: steady(-10, 20) }),
  },
  {
    id: 'A5',
    title: 'Hourly network: 24 hours of free cool-down',
    source: 'time constant Cm/(H_em + H_3) of the annex C network, Crank-Nicolson',
    provenance: 'derived',
    tier: 'C',
    expected: { theta_m_24h: 9.014996 },
    tolerance: 1e-5,
    compute: () => {
      const hours = Array.from({ length: 24 }, () => ({ outdoorC: 0, internalW: 0, solarW: 0 }));
      return { theta_m_24h: hourlyNeed(h1, VENTILATION, hours, -50).network.massC };
    },
  },
  ...(Object.keys(WAVE_YEARS) as CapacityClass[]).map((capacityClass): ReferenceRow => {
    const [heating_kWh, peak_W, hours_heating, max_air_C] = WAVE_YEARS[capacityClass];
    return {
      id: `A6-${capacityClass}`,
      title: `Synthetic year of 8,760 hours, class ${capacityClass}`,
      source: ISO,
      provenance: 'derived',
      tier: 'C',
      expected: { heating_kWh, peak_W, hours_heating, max_air_C },
      tolerance: { heating_kWh: 1e-4, peak_W: 1e-3, hours_heating: 0, max_air_C: 1e-4 },
      compute: () => waveYear(capacityClass),
    };
  }),
  {
    id: 'A17',
    title: 'Synthetic year without gains, medium class',
    source: 'annex C network, bounded by H_eff times degree hours',
    provenance: 'derived',
    tier: 'C',
    expected: { heating_kWh: 12589.8707 },
    tolerance: 1e-3,
    compute: () => {
      const hours = Array.from({ length: HOURS_PER_YEAR }, (_, h) => ({
        outdoorC: waveOutdoorC(h),
        internalW: 0,
        solarW: 0,
      }));
      const { needW } = hourlyNeed(h1, VENTILATION, hours, 20);
      return { heating_kWh: (needW.reduce((sum, w) => sum + w, 0) * SECONDS_PER_HOUR) / J_PER_WH / 1000 };
    },
  },
];
