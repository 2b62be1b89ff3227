/**
 * Crossings and turning points of one output of a resolved response, found on the response itself: samples only tell where
 * to look, the root is found by evaluating the exponential from the nearest point. Under the metrics of a step.
 */

import { derivative, outputOf, stateAfter } from './free-response.ts';
import type { ResolvedResponse } from './resolved-response.ts';

/** A time (s) and the output there. */
export interface CurvePoint {
  readonly t: number;
  readonly y: number;
}

/** Most steps of a root's refinement; bisection alone ends within the bits of a double. */
const MOST_STEPS = 64;

/**
 * The turning point's value in interval k (between points k and k + 1) by the cubic through both ends and slopes, null
 * where the slope keeps its sign. Off by some 10⁻³ of what the output moves over the interval's time at its slopes.
 */
export function estimatedTurn(response: ResolvedResponse, output: number, k: number): number | null {
  const slope = response.slope[output]!;
  const y = response.y[output]!;
  const [left, right] = [slope[k]!, slope[k + 1]!];
  if (left === 0 || left > 0 === right > 0) return null;
  const h = response.t[k + 1]! - response.t[k]!;
  const rise = (y[k + 1]! - y[k]!) / h;
  // y(k + x h) = y + h (left x + b x² + a x³); the root of its derivative in 0 … 1 by the stable formula.
  const a = left + right - 2 * rise;
  const b = 3 * rise - 2 * left - right;
  const root = Math.sqrt(Math.max(0, b * b - 3 * a * left));
  const divisor = -b + (left > 0 ? root : -root);
  const x = divisor === 0 ? 0.5 : Math.min(1, Math.max(0, left / divisor));
  return y[k]! + h * x * (left + x * (b + x * a));
}

/** How far the true turn may lie from its estimate: 1/64 of the movement that the slopes at both ends would make. */
export function turnMargin(response: ResolvedResponse, output: number, k: number): number {
  const slope = response.slope[output]!;
  const h = response.t[k + 1]! - response.t[k]!;
  return ((Math.abs(slope[k]!) + Math.abs(slope[k + 1]!)) * h) / 64;
}

/** The turning point in interval k, whose slopes differ in sign. */
export function turningPoint(response: ResolvedResponse, output: number, k: number): CurvePoint {
  const { M, C } = response.propagator;
  const t = refinedRoot(response, k, 0, response.t[k + 1]! - response.t[k]!, z => {
    const rate = derivative(M, z);
    return { value: outputOf(C, output, rate), slope: outputOf(C, output, derivative(M, rate)) };
  });
  return { t: response.t[k]! + t, y: outputOf(C, output, stateAfter(response.propagator, stateOf(response, k), t)) };
}

/** The first (or last) time in interval k at which the output crosses the level, null where it does not. */
export function crossing(
  response: ResolvedResponse,
  output: number,
  k: number,
  level: number,
  which: 'first' | 'last',
): number | null {
  const pieces = monotonePieces(response, output, k, level);
  const crossed = pieces.filter(([a, b]) => a.y > level !== b.y > level);
  const piece = which === 'first' ? crossed[0] : crossed[crossed.length - 1];
  if (piece === undefined) return null;
  const { M, C } = response.propagator;
  const start = response.t[k]!;
  const t = refinedRoot(response, k, piece[0].t - start, piece[1].t - start, z => ({
    value: outputOf(C, output, z) - level,
    slope: outputOf(C, output, derivative(M, z)),
  }));
  return start + t;
}

/** The interval cut at its turning point where that could matter for the level. */
function monotonePieces(
  response: ResolvedResponse,
  output: number,
  k: number,
  level: number,
): readonly (readonly [CurvePoint, CurvePoint])[] {
  const left = { t: response.t[k]!, y: response.y[output]![k]! };
  const right = { t: response.t[k + 1]!, y: response.y[output]![k + 1]! };
  const turn = estimatedTurn(response, output, k);
  if (turn === null) return [[left, right]];
  const margin = turnMargin(response, output, k);
  const below = Math.min(left.y, right.y, turn - margin);
  const above = Math.max(left.y, right.y, turn + margin);
  if (level < below || level > above) return [];
  const middle = turningPoint(response, output, k);
  return [
    [left, middle],
    [middle, right],
  ];
}

function stateOf({ z, propagator }: ResolvedResponse, k: number): Float64Array {
  const n = propagator.start.length;
  return z.subarray(k * n, (k + 1) * n);
}

/**
 * The zero of a function of the state between `low` and `high` seconds after point k, where its signs differ: Newton's
 * iteration, bisection where a step would leave the bracket.
 */
function refinedRoot(
  response: ResolvedResponse,
  k: number,
  low: number,
  high: number,
  evaluate: (z: Float64Array) => { readonly value: number; readonly slope: number },
): number {
  const state = stateOf(response, k);
  const at = (t: number) => evaluate(stateAfter(response.propagator, state, t));
  const isPositive = at(high).value > 0;
  let [a, b] = [low, high];
  let t = (low + high) / 2;
  for (let step = 0; step < MOST_STEPS; step++) {
    const { value, slope } = at(t);
    if (value === 0) return t;
    if (value > 0 === isPositive) b = t;
    else a = t;
    const newton = t - value / slope;
    const next = newton > a && newton < b ? newton : (a + b) / 2;
    if (Math.abs(next - t) <= 2 * Number.EPSILON * (response.t[k]! + t)) return next;
    t = next;
  }
  return t;
}
