/**
 * "8,760": a count as messages print it. Loading the platform's number formats would cost more than reading a file.
 * @param count whole number [-]
 * @returns words
 * @see own definition
 */
export function withThousands(count: number): string {
  return String(count).replace(/\B(?=(\d{3})+$)/g, ',');
}
