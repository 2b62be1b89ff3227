/** What a simulation has computed so far: one piece of time after the other, and the value of any signal at any time in them. */

import type { ClipState } from './mode-system.ts';
import { NODES, valueWithin } from './piece-polynomials.ts';

export interface Piece {
  /** s. */
  readonly from: number;
  readonly to: number;
  /** Signals × NODES, row-major. */
  readonly values: Float64Array;
  /** States at the start. */
  readonly states: Float64Array;
  /** And at the end. */
  readonly statesAfter: Float64Array;
  /** Of every limiter. */
  readonly clips: readonly ClipState[];
}

/** The piece that holds t; at a border the one that ends or begins there, within `tolerance` seconds. */
export function pieceAt(
  pieces: readonly Piece[],
  t: number,
  side: 'before' | 'after',
  tolerance: number,
): Piece | undefined {
  let low = 0;
  let high = pieces.length - 1;
  // The last piece that begins before t, or at it where the side after it is asked for.
  const limit = side === 'after' ? t + tolerance : t - tolerance;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (pieces[middle]!.from <= limit) low = middle;
    else high = middle - 1;
  }
  return pieces[low];
}

/** The value of a signal at t in a piece; beyond its borders that at the border. */
export function valueIn({ from, to, values }: Piece, signal: number, t: number): number {
  const part = to > from ? Math.max(0, Math.min(1, (t - from) / (to - from))) : 0;
  return valueWithin(values, signal * NODES, part);
}
