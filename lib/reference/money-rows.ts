import { annuityFactor, presentValueFactor } from '@/lib/economics/annuity';
import { netPresentValue } from '@/lib/economics/cash-flow';
import { costOfHeat, type HeatCostInput } from '@/lib/economics/cost-of-heat';
import { FUEL_CO2_KG_PER_GJ, GAS_NET_PER_GROSS, co2KgPerKwh } from '@/lib/economics/fuel-co2';
import type { ReferenceRow } from './reference-row';

const ANNUITIES: readonly [number, number, number][] = [
  [0.03, 20, 0.067216],
  [0.03, 25, 0.057428],
  [0.04, 20, 0.073582],
  [0.05, 15, 0.096342],
  [0.05, 20, 0.080243],
  [0.05, 25, 0.070952],
  [0.06, 10, 0.135868],
  [0.08, 20, 0.101852],
  [0.1, 20, 0.11746],
  [0, 20, 0.05],
];
const GROWING: readonly [number, number, number, number][] = [
  [0.05, 0.03, 20, 15.964784],
  [0.05, 0.05, 20, 19.047619],
  [0.08, 0.04, 20, 13.247461],
  [0.03, 0.05, 20, 23.45333],
];

const plant: HeatCostInput = {
  investment: [{ label: 'plant', amount: 6000 }],
  grant: 0,
  upkeepPerYear: 60,
  pumpKwhPerYear: 0,
  electricityPerKwh: 0.28,
  replacements: [],
  realRate: 0.03,
  years: 25,
  solarKwhPerYear: 3000,
  savedKwhPerYear: 3000,
};

export const moneyRows: ReferenceRow[] = [
  {
    id: 'H1',
    title: 'Annuity factors, rate/years',
    source: 'standard compound-interest tables',
    provenance: 'from memory',
    tier: 'B',
    expected: Object.fromEntries(ANNUITIES.map(([r, n, a]) => [`${r}/${n}`, a])),
    tolerance: 1e-6,
    compute: () => Object.fromEntries(ANNUITIES.map(([r, n]) => [`${r}/${n}`, annuityFactor(r, n)])),
  },
  {
    id: 'H2',
    title: 'Present value of a growing payment, rate/growth/years',
    source: 'closed form of the geometric series',
    provenance: 'derived',
    tier: 'C',
    expected: Object.fromEntries(GROWING.map(([r, e, n, value]) => [`${r}/${e}/${n}`, value])),
    tolerance: 1e-6,
    compute: () =>
      Object.fromEntries(GROWING.map(([r, e, n]) => [`${r}/${e}/${n}`, presentValueFactor(r, n, e)])),
  },
  {
    id: 'H3',
    title: 'Cost of heat: 6,000 at the start, 60 a year, 3,000 kWh a year, five variations',
    source: 'IEA SHC Task 54, levelised cost of heat (form read); values recomputed in two languages',
    provenance: 'derived',
    tier: 'C',
    expected: {
      'r 3 %, 25 a': 0.134856,
      'r 0 %, 25 a': 0.1,
      'r 5 %, 20 a': 0.180485,
      'grant 1,500': 0.106142,
      'yield −0.5 %/a': 0.142037,
    },
    tolerance: 1e-6,
    compute: () => ({
      'r 3 %, 25 a': costOfHeat(plant).perKwh,
      'r 0 %, 25 a': costOfHeat({ ...plant, realRate: 0 }).perKwh,
      'r 5 %, 20 a': costOfHeat({ ...plant, realRate: 0.05, years: 20 }).perKwh,
      'grant 1,500': costOfHeat({ ...plant, grant: 1500 }).perKwh,
      'yield −0.5 %/a': costOfHeat({ ...plant, yieldLossPerYear: 0.005 }).perKwh,
    }),
  },
  {
    id: 'H4',
    title: 'Net present value: −6,000, 500 a year growing 2 %, 4 %, 25 years',
    source: 'definition',
    provenance: 'derived',
    tier: 'C',
    expected: { value: 3614.528 },
    tolerance: 1e-3,
    compute: () => ({ value: netPresentValue(6000, 500, 0.02, 0.04, 25) }),
  },
  {
    id: 'H6',
    title: 'CO₂ per kilowatt hour of net calorific value',
    source: 'IPCC 2006 Guidelines, Vol. 2, Ch. 2, default factors',
    provenance: 'from memory',
    tier: 'B',
    expected: {
      gas: 0.20196,
      oil: 0.26676,
      lpg: 0.22716,
      'residual oil': 0.27864,
      anthracite: 0.35388,
      wood: 0.4032,
    },
    tolerance: 1e-5,
    compute: () =>
      Object.fromEntries(
        Object.entries(FUEL_CO2_KG_PER_GJ).map(([fuel, factor]) => [fuel, co2KgPerKwh(factor)]),
      ),
  },
  {
    id: 'H6-gross',
    title: 'CO₂ of gas per kilowatt hour of gross calorific value',
    source: 'UK government conversion factor 2008, 0.185 kg/kWh gross',
    provenance: 'read',
    tier: 'A',
    expected: { gas: 0.185 },
    tolerance: 0.004,
    compute: () => ({ gas: co2KgPerKwh(FUEL_CO2_KG_PER_GJ.gas) * GAS_NET_PER_GROSS }),
  },
  {
    id: 'H7',
    title: 'CO₂ of commercial gas at 52.7 kg/GJ',
    source: 'New Zealand Ministry for the Environment, table 1 (2006): 0.190 kg/kWh',
    provenance: 'read',
    tier: 'A',
    expected: { gas: 0.19 },
    tolerance: 0.001,
    compute: () => ({ gas: co2KgPerKwh(52.7) }),
  },
];
