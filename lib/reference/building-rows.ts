import {
  designHeatLoadW,
  infiltrationPerH,
  transmissionWPerK,
  ventilationWPerK,
} from '@/lib/physics/design-heat-load';
import { solarApertureM2, windowGainW } from '@/lib/physics/window-gain';
import type { ReferenceRow } from './reference-row';

const house = [
  { areaM2: 120, uWPerM2K: 0.3, factor: 1 },
  { areaM2: 80, uWPerM2K: 0.2, factor: 1 },
  { areaM2: 80, uWPerM2K: 0.25, factor: 1 },
  { areaM2: 15, uWPerM2K: 1.4, factor: 1 },
];

/** Low-mass test box, 8 × 6 × 2.7 m with 12 m² of glass. */
const box = [
  { areaM2: 63.6, uWPerM2K: 0.514, factor: 1 },
  { areaM2: 48, uWPerM2K: 0.039, factor: 1 },
  { areaM2: 48, uWPerM2K: 0.318, factor: 1 },
  { areaM2: 12, uWPerM2K: 3, factor: 1 },
];

export const buildingRows: ReferenceRow[] = [
  {
    id: 'A8',
    title: 'Design heat load of a small house at −12 °C',
    source: 'EN 12831-1, simplified form',
    provenance: 'from memory',
    tier: 'B',
    expected: { lossWPerK: 135.5, loadW: 4336 },
    tolerance: 0.1,
    compute: () => {
      const lossWPerK = transmissionWPerK(house) + ventilationWPerK(0.5, 250);
      return { lossWPerK, loadW: designHeatLoadW(lossWPerK, 20, -12) };
    },
  },
  {
    id: 'A10',
    title: 'Sun through 10 m² of window',
    source: 'ISO 13790:2008, 11.3–11.4',
    provenance: 'from memory',
    tier: 'B',
    expected: { gainW: 1020.6 },
    tolerance: 0.01,
    compute: () => ({ gainW: windowGainW(solarApertureM2(10, 0.3, 0.6, 0.9), 300) }),
  },
  {
    id: 'A11',
    title: 'Infiltration from n50 = 6 in 250 m³',
    source: 'EN 12831-1; rule n50/20',
    provenance: 'from memory',
    tier: 'B',
    expected: { airChangePerH: 0.3, lossWPerK: 25.5 },
    tolerance: 0.01,
    compute: () => ({
      airChangePerH: infiltrationPerH(6),
      lossWPerK: ventilationWPerK(infiltrationPerH(6), 250),
    }),
  },
  {
    id: 'A12',
    title: 'Transmission of the low-mass test box without infiltration (104.3 − 18.44 W/K)',
    source: 'ANSI/ASHRAE 140, Table 1',
    provenance: 'from memory',
    tier: 'B',
    expected: { lossWPerK: 85.86 },
    tolerance: 0.05,
    compute: () => ({ lossWPerK: transmissionWPerK(box) }),
  },
];
