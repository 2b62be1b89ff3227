/** Random factors that are the same on every run. */

import { randomSigned } from '../../numeric/index.ts';

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
