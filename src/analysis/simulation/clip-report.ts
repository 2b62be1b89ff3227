/** What the limiters did in a simulation: when each clipped, and which integrators wound up meanwhile. */

import { entryAt } from '../../algebra/index.ts';
import type { OpenedModel } from '../../compile/index.ts';
import type { Piece } from './history.ts';

/** One limiter at one of its limits for a while. */
export interface Clipping {
  readonly limiter: string;
  readonly side: 'lower' | 'upper';
  /** s. */
  readonly from: number;
  readonly to: number;
  /**
   * States that feed the limiter directly and moved on in the direction that drives it farther over its limit, by how much: integral
   * wind-up.
   */
  readonly windUp: readonly { readonly state: string; readonly change: number }[];
}

/** Every time that a limiter clipped, in the order in which it began. */
export function clippings(opened: OpenedModel, pieces: readonly Piece[]): readonly Clipping[] {
  const found: Clipping[] = [];
  opened.limiters.forEach((_, k) => {
    let begin = 0;
    while (begin < pieces.length) {
      const side = pieces[begin]!.clips[k]!;
      let end = begin;
      while (end + 1 < pieces.length && pieces[end + 1]!.clips[k] === side) end += 1;
      if (side !== 0) found.push(clipping(opened, pieces, k, begin, end));
      begin = end + 1;
    }
  });
  return found.sort((a, b) => a.from - b.from);
}

/** A change below this share of the state's own size is rounding. */
const VISIBLE = 1e-9;

function clipping(opened: OpenedModel, pieces: readonly Piece[], k: number, begin: number, end: number): Clipping {
  const { limiters, outputs, delays, states, matrices } = opened;
  const [first, last] = [pieces[begin]!, pieces[end]!];
  const side = first.clips[k] === 1 ? 'upper' : 'lower';
  const row = outputs.length + delays.length + k;
  const after = pieces[end + 1]?.states ?? last.statesAfter;
  const windUp = states.flatMap(({ name }, i) => {
    const change = (after[i] ?? 0) - (first.states[i] ?? 0);
    const push = entryAt(matrices.C, row, i, 0) * change;
    const isOutward = side === 'upper' ? push > 0 : push < 0;
    const isVisible = Math.abs(change) > VISIBLE * Math.max(Math.abs(after[i] ?? 0), Math.abs(first.states[i] ?? 0));
    return isOutward && isVisible ? [{ state: name, change }] : [];
  });
  return { limiter: limiters[k]!.name, side, from: first.from, to: last.to, windUp };
}
