/** A straight line through points, with what is known of its two numbers. */
export interface StraightLine {
  intercept: number;
  slope: number;
  /** Σ w (y − ŷ)² */
  weightedSquares: number;
  /** residual standard deviation, of a point of weight 1 */
  residualSd: number;
  interceptSd: number;
  slopeSd: number;
  covariance: number;
  /** coefficient of determination [-] */
  r2: number;
}

/**
 * Straight line by weighted least squares about the centre of the points: b1 = Σ w (x−x̄)(y−ȳ) / Σ w (x−x̄)²,
 * b0 = ȳ − b1 x̄; Var b1 = s²/Σ w (x−x̄)², s² = Σ w (y−ŷ)²/(n − 2).
 * @param x abscissae [any]
 * @param y ordinates [any]
 * @param weights w of each point, in proportion to 1/variance [-] above 0
 * @returns line with its standard deviations, in the units of x and y
 * @remarks fewer than three points leave the standard deviations not a number
 * @see N. R. Draper & H. Smith, Applied Regression Analysis, 3rd ed. 1998, sec. 1.2–1.4 and 9.2 (from memory)
 */
export function straightLine(
  x: ArrayLike<number>,
  y: ArrayLike<number>,
  weights?: ArrayLike<number>,
): StraightLine {
  const n = x.length;
  const w = (i: number) => weights?.[i] ?? 1;
  let sum = 0;
  let meanX = 0;
  let meanY = 0;
  for (let i = 0; i < n; i++) {
    sum += w(i);
    meanX += w(i) * x[i]!;
    meanY += w(i) * y[i]!;
  }
  meanX /= sum;
  meanY /= sum;
  let xx = 0;
  let xy = 0;
  let yy = 0;
  for (let i = 0; i < n; i++) {
    xx += w(i) * (x[i]! - meanX) ** 2;
    xy += w(i) * (x[i]! - meanX) * (y[i]! - meanY);
    yy += w(i) * (y[i]! - meanY) ** 2;
  }
  const slope = xx > 0 ? xy / xx : 0;
  const intercept = meanY - slope * meanX;
  let weightedSquares = 0;
  for (let i = 0; i < n; i++) weightedSquares += w(i) * (y[i]! - intercept - slope * x[i]!) ** 2;
  const variance = n > 2 ? weightedSquares / (n - 2) : NaN;
  return {
    intercept,
    slope,
    weightedSquares,
    residualSd: Math.sqrt(variance),
    interceptSd: Math.sqrt(variance * (1 / sum + meanX ** 2 / xx)),
    slopeSd: Math.sqrt(variance / xx),
    covariance: (-variance * meanX) / xx,
    r2: 1 - weightedSquares / yy,
  };
}
