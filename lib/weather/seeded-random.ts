/** A stream of uniform numbers in [0, 1). */
export type Random = () => number;

/**
 * Uniform random numbers that are the same for the same seed, on every machine.
 * @param seed any integer [-]
 * @returns a function that gives the next number in [0, 1)
 * @see mulberry32 by T. Ettinger, public domain (from memory)
 */
export function seededRandom(seed: number): Random {
  let state = seed | 0;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/**
 * Standard normal numbers by Box and Muller.
 * @param random uniform numbers in [0, 1)
 * @returns one number of mean 0 and standard deviation 1 [-]
 * @see G. E. P. Box & M. E. Muller, Ann. Math. Statist. 29 (1958) 610
 */
function standardNormal(random: Random): number {
  return Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
}

/**
 * A first-order autoregressive sequence of standard normal numbers: z' = φ z + √(1 − φ²) ε.
 * @param random uniform numbers in [0, 1)
 * @param length numbers to draw
 * @param lagOne φ, correlation of neighbours [-] −1…1
 * @returns z of mean 0, standard deviation 1 in the long run [-]
 * @see G. E. P. Box & G. M. Jenkins, Time Series Analysis, 1970, ch. 3
 */
export function autoregressive(random: Random, length: number, lagOne: number): Float64Array {
  const values = new Float64Array(length);
  const innovation = Math.sqrt(1 - lagOne * lagOne);
  let z = standardNormal(random);
  for (let i = 0; i < length; i++) {
    values[i] = z;
    z = lagOne * z + innovation * standardNormal(random);
  }
  return values;
}
