/**
 * Figures of a simulated step response, found on its polynomials: rise time, overshoot, peak and settling by the definitions of
 * IEC 60050-351, with the limits 10 %, 90 % and 2 %. What has not settled within the horizon has no settling time.
 */

import type { Piece } from './history.ts';
import { valueIn } from './history.ts';
import { DEGREE } from './piece-polynomials.ts';

/** Times in s; null where the quantity does not exist or lies beyond the horizon. */
export interface SimulatedFigures {
  readonly overshootPercent: number;
  readonly peak: number | null;
  readonly peakTime: number | null;
  readonly riseTime10to90: number | null;
  readonly settlingTime2percent: number | null;
}

/** Samples between the nodes of a piece. */
const FINE = 4 * DEGREE;
const HALVINGS = 60;
/** An excess below this share of the final value is the error of the polynomials. */
const ROUNDING = 2 ** -36;

/** @param final  Not zero. */
export function simulatedFigures(pieces: readonly Piece[], signal: number, final: number): SimulatedFigures {
  const share = (t: number, piece: Piece) => valueIn(piece, signal, t) / final;
  const peak = highest(pieces, share);
  const hasOvershoot = peak.value > 1 + ROUNDING;
  const from = firstTime(pieces, (t, piece) => share(t, piece) - 0.1);
  const to = firstTime(pieces, (t, piece) => share(t, piece) - 0.9);
  return {
    overshootPercent: hasOvershoot ? 100 * (peak.value - 1) : 0,
    peak: hasOvershoot ? peak.value * final : null,
    peakTime: hasOvershoot ? peak.t : null,
    riseTime10to90: from === null || to === null ? null : to - from,
    settlingTime2percent: lastTime(pieces, (t, piece) => Math.abs(share(t, piece) - 1) - 0.02),
  };
}

type Measure = (t: number, piece: Piece) => number;

const fineTimes = ({ from, to }: Piece) => Array.from({ length: FINE + 1 }, (_, k) => from + ((to - from) * k) / FINE);

function highest(pieces: readonly Piece[], measure: Measure): { readonly t: number; readonly value: number } {
  let best = { t: 0, value: Number.NEGATIVE_INFINITY };
  for (const piece of pieces) {
    const times = fineTimes(piece);
    times.forEach((t, k) => {
      if (!(measure(t, piece) > best.value)) return;
      const top = narrowed(times[k - 1] ?? t, times[k + 1] ?? t, moment => measure(moment, piece));
      const value = measure(top, piece);
      best = value > measure(t, piece) ? { t: top, value } : { t, value: measure(t, piece) };
    });
  }
  return best;
}

/** A maximum between two times by thirds. */
function narrowed(from: number, to: number, f: (t: number) => number): number {
  let [a, b] = [from, to];
  for (let k = 0; k < 2 * HALVINGS; k++) {
    const [left, right] = [a + (b - a) / 3, b - (b - a) / 3];
    if (f(left) < f(right)) a = left;
    else b = right;
  }
  return (a + b) / 2;
}

/** The first time at which the measure has come from below to zero; null where it never does. */
function firstTime(pieces: readonly Piece[], measure: Measure): number | null {
  for (const piece of pieces) {
    const times = fineTimes(piece);
    for (let k = 0; k < times.length; k++) {
      if (measure(times[k]!, piece) < 0) continue;
      return k === 0 ? times[0]! : crossing(times[k - 1]!, times[k]!, t => measure(t, piece) >= 0);
    }
  }
  return null;
}

/** The last time at which the measure is positive; null where it still is at the end, 0 where it never is. */
function lastTime(pieces: readonly Piece[], measure: Measure): number | null {
  for (let p = pieces.length - 1; p >= 0; p--) {
    const piece = pieces[p]!;
    const times = fineTimes(piece);
    for (let k = times.length - 1; k >= 0; k--) {
      if (measure(times[k]!, piece) <= 0) continue;
      if (k === times.length - 1) return p === pieces.length - 1 ? null : piece.to;
      return crossing(times[k]!, times[k + 1]!, t => measure(t, piece) <= 0);
    }
  }
  return 0;
}

/** Where a condition turns true between two times. */
function crossing(from: number, to: number, holds: (t: number) => boolean): number {
  let [low, high] = [from, to];
  for (let k = 0; k < HALVINGS; k++) {
    const middle = (low + high) / 2;
    if (holds(middle)) high = middle;
    else low = middle;
  }
  return high;
}
