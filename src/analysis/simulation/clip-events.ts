/** When a limiter reaches a limit or comes back from it, found on the polynomial of what feeds it. */

import type { OpenedLimiter } from '../../compile/index.ts';
import type { ClipState } from './mode-system.ts';
import { DEGREE, NODES, valueWithin } from './piece-polynomials.ts';

/** How far what feeds a limiter lies on the wrong side for the state that the limiter is in; positive where the state is over. */
export function excess({ lower, upper }: OpenedLimiter, clip: ClipState, fed: number): number {
  switch (clip) {
    case 0:
      return Math.max(fed - upper, lower - fed);
    case 1:
      return upper - fed;
    case -1:
      return fed - lower;
    default:
      return clip satisfies never;
  }
}

/** The state that a limiter goes to when the one it is in is over. */
export function nextClip({ lower, upper }: OpenedLimiter, clip: ClipState, fed: number): ClipState {
  if (clip !== 0) return 0;
  return fed - upper >= lower - fed ? 1 : -1;
}

/** Samples of a piece between its nodes that are looked at. */
const SAMPLES = 4 * DEGREE;

/** Halvings: the bits of a double. */
const HALVINGS = 60;

/**
 * The first part (0 to 1) of a piece at which a limiter's state is over, by more than `tolerance`; null where it lasts.
 *
 * @param values  What feeds it at the nodes, from `offset` on.
 */
export function endOfClip(
  limiter: OpenedLimiter,
  clip: ClipState,
  values: ArrayLike<number>,
  offset: number,
  tolerance: number,
): number | null {
  const over = (part: number) => excess(limiter, clip, valueWithin(values, offset, part));
  let before = 0;
  for (let k = 1; k <= SAMPLES; k++) {
    const part = k / SAMPLES;
    if (over(part) > tolerance) return refined(over, before, part);
    before = part;
  }
  return null;
}

/** Where the excess turns positive between a part at which it is not and one at which it is. */
function refined(over: (part: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let k = 0; k < HALVINGS && high - low > Number.EPSILON * high; k++) {
    const middle = (low + high) / 2;
    if (over(middle) > 0) high = middle;
    else low = middle;
  }
  return high;
}

/** Positions of NODES values of one signal among all. */
export const offsetOf = (signal: number) => signal * NODES;
