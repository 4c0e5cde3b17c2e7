/** Least clearness of a day that occurs [-]. */
const MIN_CLEARNESS = 0.05;

/**
 * Greatest clearness of a day in a month: Kx = 0.6313 + 0.267 K̄ − 11.9 (K̄ − 0.75)⁸.
 * @param monthlyClearness K̄ [-] 0.2…0.75
 * @returns Kx [-]
 * @see K. G. T. Hollands & R. G. Huget, A probability density function for the clearness index, Solar Energy 30 (1983) 195
 */
export function maxDailyClearness(monthlyClearness: number): number {
  return 0.6313 + 0.267 * monthlyClearness - 11.9 * Math.pow(monthlyClearness - 0.75, 8);
}

/**
 * Spread of the daily clearness about its monthly mean: the γ of
 * F(K) = (e^{γ·0.05} − e^{γK}) / (e^{γ·0.05} − e^{γKx}) that gives the mean K̄, found by bisection.
 * @param monthlyClearness K̄ [-] 0.2…0.75
 * @returns γ [-] about −6…12
 * @see P. Bendt, M. Collares-Pereira & A. Rabl, The frequency distribution of daily insolation values, Solar Energy 27 (1981) 1
 */
export function clearnessShape(monthlyClearness: number): number {
  const max = maxDailyClearness(monthlyClearness);
  let low = -60;
  let high = 60;
  for (let step = 0; step < 60; step++) {
    const gamma = (low + high) / 2;
    if (meanClearness(gamma, max) < monthlyClearness) low = gamma;
    else high = gamma;
  }
  return (low + high) / 2;
}

function meanClearness(gamma: number, max: number): number {
  const width = max - MIN_CLEARNESS;
  const x = gamma * width;
  // mean of a truncated exponential on [0.05, Kx]; its series about γ = 0 avoids 0/0
  if (Math.abs(x) < 1e-4) return MIN_CLEARNESS + width * (0.5 + x / 12);
  return MIN_CLEARNESS + width * (1 / (1 - Math.exp(-x)) - 1 / x);
}

/**
 * Clearness of the day below which a share of the month's days lies: the inverse of F(K).
 * @param share F [-] 0…1
 * @param monthlyClearness K̄ [-] 0.2…0.75
 * @param gamma γ of the month, from clearnessShape [-]
 * @returns K [-] 0.05…Kx
 * @see Bendt, Collares-Pereira & Rabl, Solar Energy 27 (1981) 1
 */
export function clearnessQuantile(share: number, monthlyClearness: number, gamma: number): number {
  const width = maxDailyClearness(monthlyClearness) - MIN_CLEARNESS;
  if (Math.abs(gamma * width) < 1e-9) return MIN_CLEARNESS + share * width;
  return MIN_CLEARNESS + Math.log1p(share * Math.expm1(gamma * width)) / gamma;
}
