import { agreement, type Agreement } from './agreement';
import { degreeDays, type OutdoorDays } from './degree-days';
import { smallInverse } from './small-inverse';
import { straightLine } from './straight-line';
import { studentT95 } from './student-t';

/** Mean heating power of an interval and the weather it stood in. */
export interface SignaturePoint {
  powerW: number;
  days: number;
  outdoor: readonly OutdoorDays[];
}

/** A number and half of its 95 % band. */
export interface Banded {
  value: number;
  band: number;
}

/** The energy signature of a house: base load below, slope above the hinge. */
export interface EnergySignature {
  /** heat that does not follow the weather [W] */
  base: Banded;
  /** heat per degree below the hinge [W/K] */
  slope: Banded;
  /** outdoor temperature at which heating begins [°C] */
  hinge: Banded;
  /** power that the line gives to each point [W] */
  fittedW: number[];
  /** of the line itself against its points, three numbers fitted */
  fit: Agreement;
  /** variances and covariances of base, slope and hinge, in this order; empty where the points do not hold them apart */
  covariance: number[][];
  /** multiplies a standard deviation to half of a 95 % band [-] */
  coverage: number;
}

/** Where the hinge is looked for [°C]. */
export const HINGE_FROM_C = 5;
export const HINGE_TO_C = 24;
const HINGE_STEP_K = 0.25;
const HINGE_PRECISION_K = 1e-6;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Mean degrees below a hinge over an interval [K]. */
function degreesBelow(point: SignaturePoint, hingeC: number): number {
  return degreeDays(point.outdoor, hingeC) / point.days;
}

interface HingedLine {
  baseW: number;
  slopeWPerK: number;
  squares: number;
  baseHeld: boolean;
}

/** The best line for one hinge; a base load below nothing is held at nothing. */
function lineAt(points: readonly SignaturePoint[], hingeC: number): HingedLine {
  const x = points.map((point) => degreesBelow(point, hingeC));
  const y = points.map((point) => point.powerW);
  const w = points.map((point) => point.days);
  const line = straightLine(x, y, w);
  if (line.intercept >= 0)
    return { baseW: line.intercept, slopeWPerK: line.slope, squares: line.weightedSquares, baseHeld: false };
  const xx = x.reduce((sum, value, i) => sum + w[i]! * value * value, 0);
  const slope = x.reduce((sum, value, i) => sum + w[i]! * value * y[i]!, 0) / xx;
  const squares = x.reduce((sum, value, i) => sum + w[i]! * (y[i]! - slope * value) ** 2, 0);
  return { baseW: 0, slopeWPerK: slope, squares, baseHeld: true };
}

function bestHingeC(points: readonly SignaturePoint[]): number {
  const squares = (hingeC: number) => lineAt(points, hingeC).squares;
  let best = HINGE_FROM_C;
  let least = Infinity;
  for (let hinge = HINGE_FROM_C; hinge <= HINGE_TO_C; hinge += HINGE_STEP_K) {
    const here = squares(hinge);
    if (here < least) [best, least] = [hinge, here];
  }
  let low = Math.max(HINGE_FROM_C, best - HINGE_STEP_K);
  let high = Math.min(HINGE_TO_C, best + HINGE_STEP_K);
  while (high - low > HINGE_PRECISION_K) {
    const left = high - GOLDEN * (high - low);
    const right = low + GOLDEN * (high - low);
    if (squares(left) <= squares(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}

/** Change of the mean degrees below with the hinge [-]: the share of the interval that is heated. */
function heatedShare(point: SignaturePoint, hingeC: number): number {
  const stepK = 0.05;
  return (degreesBelow(point, hingeC + stepK) - degreesBelow(point, hingeC - stepK)) / (2 * stepK);
}

/**
 * Covariance of base, slope and hinge about the best fit: s² (JᵀWJ)⁻¹, J = [1, D, slope·share heated]. A base load
 * held at nothing has none.
 */
function covarianceOf(
  points: readonly SignaturePoint[],
  line: HingedLine,
  hingeC: number,
): { covariance: number[][]; freedom: number } {
  const columns = points.map((point) => [
    ...(line.baseHeld ? [] : [1]),
    degreesBelow(point, hingeC),
    line.slopeWPerK * heatedShare(point, hingeC),
  ]);
  const size = line.baseHeld ? 2 : 3;
  const normal = Array.from({ length: size }, (_, i) =>
    Array.from({ length: size }, (_, j) =>
      points.reduce((sum, { days }, k) => sum + days * columns[k]![i]! * columns[k]![j]!, 0),
    ),
  );
  const freedom = points.length - size;
  const inverse = smallInverse(normal);
  if (!inverse || freedom < 1) return { covariance: [], freedom };
  const scaled = inverse.map((row) => row.map((value) => (value * line.squares) / freedom));
  return { covariance: line.baseHeld ? [[0, 0, 0], ...scaled.map((row) => [0, ...row])] : scaled, freedom };
}

/**
 * Fits P = base + slope·D(hinge), D the mean degrees of an interval below the hinge, by least squares weighted with
 * the days of the intervals: for each hinge a straight line in closed form, over the hinges a one-dimensional search.
 * @param points intervals: mean power [W], length [d], outdoor temperatures [°C]
 * @returns base [W], slope [W/K] and hinge [°C] with 95 % bands of the linearised fit
 * @remarks The slope is the heat loss of the house only as far as its other gains do not follow the outdoor
 * temperature: sun through windows is less in the cold months and makes the slope a little steeper. The hinge is
 * looked for from 5 to 24 °C.
 * @see ASHRAE Handbook—Fundamentals 2017, ch. 19, change-point and variable-base degree-day models; ASHRAE Guideline
 * 14-2014, annex D (both from memory)
 */
export function energySignature(points: readonly SignaturePoint[]): EnergySignature {
  const hingeC = bestHingeC(points);
  const line = lineAt(points, hingeC);
  const { covariance, freedom } = covarianceOf(points, line, hingeC);
  const coverage = freedom >= 2 ? studentT95(freedom) : NaN;
  const band = (i: number) => coverage * Math.sqrt(covariance[i]?.[i] ?? NaN);
  const fittedW = points.map((point) => line.baseW + line.slopeWPerK * degreesBelow(point, hingeC));
  return {
    base: { value: line.baseW, band: band(0) },
    slope: { value: line.slopeWPerK, band: band(1) },
    hinge: { value: hingeC, band: band(2) },
    fittedW,
    fit: agreement(
      points.map((point) => point.powerW * point.days),
      points.map((point, i) => fittedW[i]! * point.days),
      line.baseHeld ? 2 : 3,
    ),
    covariance,
    coverage,
  };
}

/**
 * Half of the 95 % band of the line at one outdoor temperature.
 * @param signature fitted line
 * @param outdoorC outdoor temperature [°C]
 * @returns half width of the band [W]
 * @see ASHRAE Guideline 14-2014, annex D, uncertainty of a regression (from memory)
 */
export function lineBandW(signature: EnergySignature, outdoorC: number): number {
  const below = signature.hinge.value - outdoorC;
  const gradient = below > 0 ? [1, below, signature.slope.value] : [1, 0, 0];
  let variance = 0;
  for (let i = 0; i < 3; i++)
    for (let j = 0; j < 3; j++)
      variance += gradient[i]! * gradient[j]! * (signature.covariance[i]?.[j] ?? NaN);
  return signature.coverage * Math.sqrt(variance);
}
