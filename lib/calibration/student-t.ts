/** Point of the normal distribution above which 2.5 % lie. */
const NORMAL_975 = 1.959963984540054;

/**
 * Factor from a standard deviation to half of a 95 % band: the 0.975 point of Student's distribution by its expansion
 * about that of the normal, z + g1/ν + g2/ν² + g3/ν³ + g4/ν⁴.
 * @param freedom ν, points less fitted numbers [-] from 2
 * @returns t [-], within 1 % from ν = 3
 * @see M. Abramowitz & I. A. Stegun, Handbook of Mathematical Functions, 1964, 26.7.5 (from memory)
 */
export function studentT95(freedom: number): number {
  const z = NORMAL_975;
  const g1 = (z ** 3 + z) / 4;
  const g2 = (5 * z ** 5 + 16 * z ** 3 + 3 * z) / 96;
  const g3 = (3 * z ** 7 + 19 * z ** 5 + 17 * z ** 3 - 15 * z) / 384;
  const g4 = (79 * z ** 9 + 776 * z ** 7 + 1482 * z ** 5 - 1920 * z ** 3 - 945 * z) / 92160;
  return z + g1 / freedom + g2 / freedom ** 2 + g3 / freedom ** 3 + g4 / freedom ** 4;
}
