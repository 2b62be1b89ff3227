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

/** A number of magnitude ½ to 1 and either sign. */
export function awayFromZero(random: () => number): number {
  const value = random();
  return value < 0 ? (value - 1) / 2 : (value + 1) / 2;
}

/** A factor near 1 for every coefficient in turn: 1 itself, or a small random change. */
export type Jitter = () => number;

/** Changes every coefficient by a random fraction, between half of `size` and all of it. */
export function jitterOf(size: number, seed: number): Jitter {
  const random = randomSigned(seed);
  return () => 1 + size * awayFromZero(random);
}
