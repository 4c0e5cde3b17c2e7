import { presentValueFactor } from './annuity';

/**
 * Net present value of a saving that grows: NPV = −I + s Σ (1 + e)^(t−1)/(1 + r)^t.
 * @param investment I at the start [money]
 * @param firstSaving s of the first year, upkeep taken off [money/year]
 * @param growth e of the saving per year [-]
 * @param rate r per year [-]
 * @param years n [-]
 * @returns net present value [money]
 * @see definition of net present value; VDI 2067-1 (from memory)
 */
export function netPresentValue(
  investment: number,
  firstSaving: number,
  growth: number,
  rate: number,
  years: number,
): number {
  return firstSaving * presentValueFactor(rate, years, growth) - investment;
}

/**
 * Simple payback: I/s.
 * @param investment I at the start [money]
 * @param yearlySaving s, upkeep taken off [money/year]
 * @returns time [years]; Infinity when nothing is saved
 * @see definition of simple payback
 */
export function simplePaybackYears(investment: number, yearlySaving: number): number {
  return yearlySaving > 0 ? investment / yearlySaving : Infinity;
}

/**
 * Discounted payback: the first year after which the sum of discounted savings covers the investment.
 * @param investment I at the start [money]
 * @param firstSaving s of the first year [money/year]
 * @param growth e of the saving per year [-]
 * @param rate r per year [-]
 * @param mostYears horizon looked at [years]
 * @returns time [years], whole years; Infinity when not within the horizon
 * @see definition of discounted payback
 */
export function discountedPaybackYears(
  investment: number,
  firstSaving: number,
  growth: number,
  rate: number,
  mostYears = 60,
): number {
  for (let year = 1; year <= mostYears; year++) {
    if (netPresentValue(investment, firstSaving, growth, rate, year) >= 0) return year;
  }
  return Infinity;
}
