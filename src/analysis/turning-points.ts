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
 * The output at its turning points in interval k (between points k and k + 1) by the cubic through both ends and slopes;
 * none, one or two. Off by `turnMargin` at most where the interval resolves its modes.
 */
export function estimatedTurns(response: ResolvedResponse, output: number, k: number): readonly number[] {
  const { y, h, left, a, b } = cubicOf(response, output, k);
  return cubicTurns(left, a, b).map(x => y + h * x * (left + x * (b + x * a)));
}

/** y(k + x h) = y + h (left x + b x² + a x³) for x in 0 … 1. */
function cubicOf(response: ResolvedResponse, output: number, k: number) {
  const y = response.y[output]!;
  const slope = response.slope[output]!;
  const h = response.t[k + 1]! - response.t[k]!;
  const [left, right] = [slope[k]!, slope[k + 1]!];
  const rise = (y[k + 1]! - y[k]!) / h;
  return { y: y[k]!, h, left, right, a: left + right - 2 * rise, b: 3 * rise - 2 * left - right };
}

/** The roots of left + 2 b x + 3 a x² between 0 and 1, ascending. */
function cubicTurns(left: number, a: number, b: number): readonly number[] {
  const discriminant = b * b - 3 * a * left;
  if (!(discriminant > 0)) return [];
  const far = -(b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant)); // no cancellation
  return [far / (3 * a), left / far].filter(x => x > 0 && x < 1).sort((p, q) => p - q);
}

/** How far a true turn may lie from its estimate: 1/64 of the movement that the slopes at both ends would make. */
export function turnMargin(response: ResolvedResponse, output: number, k: number): number {
  const slope = response.slope[output]!;
  const h = response.t[k + 1]! - response.t[k]!;
  return ((Math.abs(slope[k]!) + Math.abs(slope[k + 1]!)) * h) / 64;
}

/** The turning points in interval k, in ascending time, each found on the response itself. */
export function turningPoints(response: ResolvedResponse, output: number, k: number): readonly CurvePoint[] {
  const { h, left, right, a, b } = cubicOf(response, output, k);
  const roots = cubicTurns(left, a, b);
  const { M, C } = response.propagator;
  const rateAt = (z: Float64Array) => {
    const rate = derivative(M, z);
    return { value: outputOf(C, output, rate), slope: outputOf(C, output, derivative(M, rate)) };
  };
  const stateAt = (t: number) => stateAfter(response.propagator, stateOf(response, k), t);
  const found: CurvePoint[] = [];
  roots.forEach((root, i) => {
    // Each root between cuts half way to its neighbours; the ends of the interval themselves where the slope is not zero.
    const low = ((roots[i - 1] ?? (left === 0 ? root / 2 : -root)) + root) / 2;
    const high = ((roots[i + 1] ?? (right === 0 ? 1 : 2 - root)) + root) / 2;
    const [before, after] = [rateAt(stateAt(low * h)).value, rateAt(stateAt(high * h)).value];
    if (before > 0 === after > 0) return;
    const t = refinedRoot(response, k, low * h, high * h, rateAt);
    found.push({ t: response.t[k]! + t, y: outputOf(C, output, stateAt(t)) });
  });
  return found;
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

/** The interval cut at its turning points where they could matter for the level. */
function monotonePieces(
  response: ResolvedResponse,
  output: number,
  k: number,
  level: number,
): readonly (readonly [CurvePoint, CurvePoint])[] {
  const left = { t: response.t[k]!, y: response.y[output]![k]! };
  const right = { t: response.t[k + 1]!, y: response.y[output]![k + 1]! };
  const turns = estimatedTurns(response, output, k);
  if (turns.length === 0) return [[left, right]];
  const margin = turnMargin(response, output, k);
  const below = Math.min(left.y, right.y, ...turns.map(turn => turn - margin));
  const above = Math.max(left.y, right.y, ...turns.map(turn => turn + margin));
  if (level < below || level > above) return [];
  const points = [left, ...turningPoints(response, output, k), right];
  return points.slice(1).map((point, i) => [points[i]!, point] as const);
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
