/**
 * Smallest, largest and mean value of a column without gaps.
 * @param values the hours, in the column's own unit
 * @returns smallest, largest and mean value in the same unit
 * @see own definition
 */
export function columnRange(values: Float64Array): { min: number; max: number; mean: number } {
  let min = Infinity;
  let max = -Infinity;
  let sum = 0;
  for (let h = 0; h < values.length; h++) {
    const value = values[h]!;
    if (value < min) min = value;
    if (value > max) max = value;
    sum += value;
  }
  return { min, max, mean: sum / values.length };
}
