/** Numbers that look random and are the same on every run. */

/** Modulus 2³¹ − 1 and multiplier of the minimal standard generator (Park, Miller & Stockmeyer 1993, Comm. ACM 36(7)). */
const MODULUS = 2 ** 31 - 1;
const MULTIPLIER = 48271;

/** A source of numbers between −1 and 1, never 0, from a seed of 1 to 2³¹ − 2. */
export function randomSigned(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * MULTIPLIER) % MODULUS;
    return (2 * state) / MODULUS - 1;
  };
}
