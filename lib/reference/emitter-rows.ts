import { floorConductance, floorSurfaceHeat, logarithmicExcess, slabCapacity } from '@/lib/physics/floor';
import { heatPumpCop } from '@/lib/physics/heat-pump';
import { resetReturnC, resetSupplyC } from '@/lib/physics/outdoor-reset';
import { arithmeticExcess, loopFlow, radiatorFactor } from '@/lib/physics/radiator';
import { SECONDS_PER_HOUR, WH_PER_J } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

// prettier-ignore
const RADIATOR_TABLE: Record<string, number> = {
  '5': 0.05, '10': 0.123, '15': 0.209, '20': 0.304, '25': 0.406, '30': 0.515, '35': 0.629, '40': 0.748,
  '45': 0.872, '50': 1, '55': 1.132, '60': 1.267, '65': 1.406, '70': 1.549, '75': 1.694,
};

const radiatorDay = {
  roomC: 20,
  designOutdoorC: -10,
  designSupplyC: 55,
  designSpreadK: 10,
  exponent: 1.3,
  limitC: 90,
};
const floorDay = { ...radiatorDay, designSupplyC: 35, designSpreadK: 5, exponent: 1.1 };

export const emitterRows: ReferenceRow[] = [
  {
    id: 'B1',
    title: 'Heat of a floor surface 9 K and 15 K above the room',
    source: 'EN 1264-2; pair 9 K → 100 W/m², 15 K → 175 W/m² in two trade pages that cite it',
    provenance: 'read',
    tier: 'A',
    expected: { '9 K': 100, '15 K': 175 },
    tolerance: 0.5,
    compute: () => ({ '9 K': floorSurfaceHeat(9), '15 K': floorSurfaceHeat(15) }),
  },
  {
    id: 'B2',
    title: 'Logarithmic excess of supply/return/room',
    source: 'EN 1264-2, eq. 1; EN 442-2',
    provenance: 'from memory',
    tier: 'B',
    expected: {
      '35/30/20': 12.331517,
      '45/35/20': 19.576152,
      '40/35/20': 17.380297,
      '75/65/20': 49.832887,
      '55/45/20': 29.720134,
    },
    tolerance: 1e-6,
    compute: () => ({
      '35/30/20': logarithmicExcess(35, 30, 20),
      '45/35/20': logarithmicExcess(45, 35, 20),
      '40/35/20': logarithmicExcess(40, 35, 20),
      '75/65/20': logarithmicExcess(75, 65, 20),
      '55/45/20': logarithmicExcess(55, 45, 20),
    }),
  },
  {
    id: 'B3',
    title: 'K_H of a wet floor type A: spacing [mm] / λ_E / R_λ,B, screed 45 mm',
    source: 'EN 1264-2, clause 6 and Table A.1',
    provenance: 'from memory',
    tier: 'B',
    expected: {
      '75/1/0': 6.7,
      '150/1/0': 5.4472,
      '150/1.2/0': 5.7612,
      '150/1.2/0.1': 3.4658,
      '150/1.2/0.15': 2.9024,
      '300/1.2/0': 3.808,
      '300/1.2/0.1': 2.5935,
    },
    tolerance: 1e-3,
    compute: () => ({
      '75/1/0': floorConductance(75, 45, 1, 0),
      '150/1/0': floorConductance(150, 45, 1, 0),
      '150/1.2/0': floorConductance(150, 45, 1.2, 0),
      '150/1.2/0.1': floorConductance(150, 45, 1.2, 0.1),
      '150/1.2/0.15': floorConductance(150, 45, 1.2, 0.15),
      '300/1.2/0': floorConductance(300, 45, 1.2, 0),
      '300/1.2/0.1': floorConductance(300, 45, 1.2, 0.1),
    }),
  },
  {
    id: 'B5',
    title: 'Radiator output against its rating at 5 to 75 K, n = 1.3',
    source: 'trade conversion table for EN 442 ratings; 60 K and 20 K on two more pages',
    provenance: 'read',
    tier: 'A',
    expected: RADIATOR_TABLE,
    tolerance: 0.0005,
    compute: () =>
      Object.fromEntries(
        Object.keys(RADIATOR_TABLE).map((excess) => [excess, radiatorFactor(Number(excess), 1.3)]),
      ),
  },
  {
    id: 'B5-rating',
    title: 'Arithmetic excess of the rating 75/65/20 °C',
    source: 'EN 442-2:2014: rated at 50 K',
    provenance: 'from memory',
    tier: 'B',
    expected: { excessK: 50 },
    tolerance: 1e-12,
    compute: () => ({ excessK: arithmeticExcess(75, 65, 20) }),
  },
  {
    id: 'B7',
    title: 'Outdoor reset at 5 °C: radiators 55/45 and floor 35/30 at −10 °C',
    source: 'emitter law inverted, textbook form',
    provenance: 'derived',
    tier: 'C',
    expected: { radiatorV: 40.101907, radiatorR: 35.101907, floorV: 27.906507, floorR: 25.406507 },
    tolerance: 1e-6,
    compute: () => ({
      radiatorV: resetSupplyC(radiatorDay, 5),
      radiatorR: resetReturnC(radiatorDay, 5),
      floorV: resetSupplyC(floorDay, 5),
      floorR: resetReturnC(floorDay, 5),
    }),
  },
  {
    id: 'B8',
    title: 'Heat held by 65 mm of screed',
    source: 'C = dρc; ISO 13786 thin layer',
    provenance: 'derived',
    tier: 'C',
    expected: { whPerM2K: 36.1111, tauH: 3.343621 },
    tolerance: { whPerM2K: 5e-5, tauH: 1e-5 },
    compute: () => ({
      whPerM2K: slabCapacity(65) * WH_PER_J,
      tauH: slabCapacity(65) / 10.8 / SECONDS_PER_HOUR,
    }),
  },
  {
    id: 'B9',
    title: 'Loop flow for 3 kW at 5 K',
    source: 'ṁ = P/(c ΔT)',
    provenance: 'derived',
    tier: 'C',
    expected: { kgPerS: 0.143335 },
    tolerance: 1e-6,
    compute: () => ({ kgPerS: loopFlow(3000, 5, 4186) }),
  },
  {
    id: 'H8',
    title: 'Heat pump COP as 0.45 of Carnot, source 2 °C',
    source: 'Carnot’s theorem',
    provenance: 'derived',
    tier: 'C',
    expected: { '35': 4.202045, '45': 3.329477 },
    tolerance: 1e-6,
    compute: () => ({ '35': heatPumpCop(2, 35), '45': heatPumpCop(2, 45) }),
  },
];
