import { degreeDaysOfMean } from '@/lib/calibration/degree-days';
import { straightLine } from '@/lib/calibration/straight-line';
import { studentT95 } from '@/lib/calibration/student-t';
import type { ReferenceRow } from './reference-row';

/** x and y of the data set "Norris". */
const NORRIS: readonly [number, number][] = [
  [0.2, 0.1],
  [337.4, 338.8],
  [118.2, 118.1],
  [884.6, 888.0],
  [10.1, 9.2],
  [226.5, 228.1],
  [666.3, 668.5],
  [996.3, 998.5],
  [448.6, 449.1],
  [777.0, 778.9],
  [558.2, 559.2],
  [0.4, 0.3],
  [0.6, 0.1],
  [775.5, 778.1],
  [666.9, 668.8],
  [338.0, 339.3],
  [447.5, 448.9],
  [11.6, 10.8],
  [556.0, 557.7],
  [228.1, 228.3],
  [995.8, 998.0],
  [887.6, 888.8],
  [120.2, 119.6],
  [0.3, 0.3],
  [0.3, 0.6],
  [556.8, 557.6],
  [339.1, 339.3],
  [887.2, 888.0],
  [999.0, 998.5],
  [779.0, 778.9],
  [11.1, 10.2],
  [118.3, 117.6],
  [229.2, 228.9],
  [669.1, 668.4],
  [448.9, 449.2],
  [0.5, 0.2],
];

/** Thermometer reading [°C] and correction [°C]. */
const THERMOMETER: readonly [number, number][] = [
  [21.521, -0.171], [22.012, -0.169], [22.512, -0.166], [23.003, -0.159], [23.507, -0.164], [23.999, -0.165],
  [24.513, -0.156], [25.002, -0.157], [25.503, -0.159], [26.01, -0.161], [26.511, -0.16],
]; // prettier-ignore

/** 0.975 point of Student's distribution by degrees of freedom. */
const STUDENT: readonly [number, number][] = [
  [3, 3.182],
  [4, 2.776],
  [5, 2.571],
  [7, 2.365],
  [10, 2.228],
  [15, 2.131],
  [20, 2.086],
  [30, 2.042],
];

export const calibrationRows: ReferenceRow[] = [
  {
    id: 'K4',
    title: 'Straight line through the data set “Norris”',
    source: 'NIST StRD, linear regression, certified values',
    provenance: 'read',
    tier: 'A',
    expected: {
      intercept: -0.262323073774029,
      slope: 1.00211681802045,
      interceptSd: 0.232818234301152,
      slopeSd: 0.000429796848199937,
      residualSd: 0.884796396144373,
      r2: 0.999993745883712,
      covariance: -7.743275363156e-5,
    },
    tolerance: 1e-9,
    relative: true,
    compute: () => ({
      ...straightLine(
        NORRIS.map(([x]) => x),
        NORRIS.map(([, y]) => y),
      ),
    }),
  },
  {
    id: 'K11',
    title: 'Calibration line of a thermometer about 20 °C',
    source: 'JCGM 100:2008 (GUM), H.3, as printed',
    provenance: 'from memory',
    tier: 'B',
    expected: {
      intercept: -0.1712,
      slope: 0.00218,
      interceptSd: 0.0029,
      slopeSd: 0.00067,
      residualSd: 0.0035,
    },
    tolerance: { intercept: 5e-5, slope: 5e-6, interceptSd: 5e-5, slopeSd: 5e-6, residualSd: 5e-5 },
    compute: () => ({
      ...straightLine(
        THERMOMETER.map(([reading]) => reading - 20),
        THERMOMETER.map(([, correction]) => correction),
      ),
    }),
  },
  {
    id: 'A16',
    title: 'Degree days of a month from its mean, 30 d, base 15.5 °C, mean 10 °C',
    source: 'CIBSE TM41, formula of Hitchin',
    provenance: 'from memory',
    tier: 'B',
    expected: { degreeDays: 168.392 },
    tolerance: 0.001,
    compute: () => ({ degreeDays: degreeDaysOfMean(30, 15.5, 10) }),
  },
  {
    id: 'K-t',
    title: 'Student’s distribution, 0.975 point by degrees of freedom',
    source: 'printed tables of the t distribution',
    provenance: 'from memory',
    tier: 'B',
    expected: Object.fromEntries(STUDENT.map(([freedom, t]) => [`${freedom}`, t])),
    tolerance: Object.fromEntries(STUDENT.map(([freedom]) => [`${freedom}`, freedom < 5 ? 0.02 : 0.002])),
    compute: () => Object.fromEntries(STUDENT.map(([freedom]) => [`${freedom}`, studentT95(freedom)])),
  },
];
