/**
 * Present value of 1 paid at the end of each year, growing by e: Σ (1 + e)^(t−1)/(1 + r)^t.
 * @param rate r per year [-] above −1
 * @param years n [-] from 0
 * @param growth e per year [-] 0 without growth
 * @returns present value factor [-]
 * @see closed form of the geometric series; VDI 2067-1 (from memory)
 */
export function presentValueFactor(rate: number, years: number, growth = 0): number {
  if (Math.abs(rate - growth) < 1e-12) return years / (1 + rate);
  return (1 - ((1 + growth) / (1 + rate)) ** years) / (rate - growth);
}

/**
 * Yearly payment that pays back 1: a = r/(1 − (1 + r)^(−n)); 1/n without interest.
 * @param rate r per year [-] from 0
 * @param years n [-] above 0
 * @returns annuity factor [1/year]
 * @see standard compound-interest tables; VDI 2067-1 (from memory)
 */
export function annuityFactor(rate: number, years: number): number {
  return 1 / presentValueFactor(rate, years);
}

/**
 * Real from nominal interest: (1 + i)/(1 + e) − 1.
 * @param nominalRate i per year [-]
 * @param inflation e per year [-] above −1
 * @returns real rate per year [-]
 * @see Fisher equation
 */
export function realRate(nominalRate: number, inflation: number): number {
  return (1 + nominalRate) / (1 + inflation) - 1;
}
