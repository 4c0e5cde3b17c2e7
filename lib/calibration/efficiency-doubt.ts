/** Which calorific value an energy is counted on; electricity has none. */
export type CalorificBasis = 'net' | 'gross' | 'none';

const MOST: Record<CalorificBasis, number> = { gross: 1, net: 1.11, none: 6 };
const LEAST = 0.5;

/**
 * Says why an efficiency cannot be right on its calorific basis.
 * @param efficiency useful heat / energy of the fuel, over a year [-]
 * @param basis calorific value
 * @returns a sentence; undefined when the efficiency can be right
 * @see above 1.00 on the gross or 1.11 on the net value condensing gives no more heat than the fuel holds: net/gross of
 * natural gas 0.90 (IPCC 2006 Guidelines, from memory); below 0.5: common practice, no source
 */
export function efficiencyDoubt(efficiency: number, basis: CalorificBasis): string | undefined {
  if (efficiency < LEAST)
    return `An efficiency of ${efficiency} over the year is less than an open stove gives. Which calorific value is it on?`;
  if (efficiency <= MOST[basis]) return undefined;
  return basis === 'none'
    ? `A heat pump does not give ${efficiency} times its electricity over a year.`
    : `An efficiency of ${efficiency} on the ${basis} calorific value gives more heat than the fuel holds. Is it on the ${basis === 'gross' ? 'net' : 'gross'} value, or is it a heat pump?`;
}
