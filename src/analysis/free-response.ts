/**
 * The motion of ż = M z from a given start, seen through y = C z: steps, ramps and impulses are free responses of a system
 * extended by the states of their input. Under every time answer; promises some 14 digits of the peak, stiff or lightly
 * damped, because states are balanced by powers of two and steps are z ← z + F z with F = e^(M h) − I.
 */

import {
  type Balanced,
  balanceSystem,
  type DenseMatrix,
  exponentialChain,
  exponentialMinusIdentity,
  multiplyVector,
  oneNorm,
} from '../numeric/index.ts';

/** M is n × n, C p × n, start n long. */
export interface FreeSystem {
  readonly M: DenseMatrix;
  readonly C: DenseMatrix;
  readonly start: Float64Array;
}

/** A balanced system with its transition matrices over one interval and its halves, quarters, … */
export interface Propagator {
  readonly M: DenseMatrix;
  readonly C: DenseMatrix;
  readonly start: Float64Array;
  /** s. */
  readonly interval: number;
  /** `levels[k]` is e^(M · interval / 2ᵏ) − I. */
  readonly levels: readonly DenseMatrix[];
}

/** A state with what its sums have rounded away (Kahan 1965, Commun. ACM 8), changed in place by `advance`. */
export interface Motion {
  readonly z: Float64Array;
  readonly lost: Float64Array;
  /** Room for F z. */
  readonly step: Float64Array;
}

/** Terms of the exponential series that reach 2⁻⁵³ of the first one at norm 1/2: (1/2)^15 / 15! < 2⁻⁵³. */
const SERIES_TERMS = 15;

/** Prepares whole steps of `interval` seconds (finite, positive), level 0 alone. O(n³), once. */
export function stepPropagator(system: FreeSystem, interval: number): Propagator {
  const { balanced, scaled } = prepared(system, interval);
  return propagatorOf(balanced, interval, [exponentialMinusIdentity(scaled)]);
}

/** Prepares the state at any time in an interval, halved at least `fewestHalvings` times. O(n³ log ‖M interval‖), once. */
export function finePropagator(system: FreeSystem, interval: number, fewestHalvings = 0): Propagator {
  const { balanced, scaled } = prepared(system, interval);
  const norm = oneNorm(scaled);
  const halvings = norm > 0.5 ? Math.ceil(Math.log2(norm)) + 1 : 0;
  const { levels } = exponentialChain(scaled, Math.max(halvings, fewestHalvings));
  return propagatorOf(balanced, interval, [...levels].reverse());
}

function prepared({ M, C, start }: FreeSystem, interval: number) {
  const n = M.rows;
  const balanced = balanceSystem(M, { rows: n, columns: 1, data: start }, C);
  const scaled: DenseMatrix = { rows: n, columns: n, data: balanced.A.data.map(entry => entry * interval) };
  return { balanced, scaled };
}

function propagatorOf({ A, B, C }: Balanced, interval: number, levels: readonly DenseMatrix[]): Propagator {
  return { M: A, C, start: B.data, interval, levels };
}

/** The motion at time 0. */
export function initialMotion({ start }: Propagator): Motion {
  return motionFrom(start);
}

function motionFrom(z: Float64Array): Motion {
  return { z: z.slice(), lost: new Float64Array(z.length), step: new Float64Array(z.length) };
}

/** Moves the motion on by interval / 2^level, in place. O(n²). */
export function advance({ levels }: Propagator, { z, lost, step }: Motion, level: number): void {
  multiplyVector(levels[level]!, z, step);
  for (let i = 0; i < z.length; i++) {
    const change = step[i]! + lost[i]!;
    const moved = z[i]! + change;
    lost[i] = change - (moved - z[i]!);
    z[i] = moved;
  }
}

/**
 * The state `elapsed` seconds after z, 0 ≤ elapsed ≤ interval, of a fine propagator, over whose last level ‖M t‖₁ ≤ 1/2: by the halves that make it up, the rest by the series.
 * O(n² (levels + 15)); z is left alone.
 */
export function stateAfter(propagator: Propagator, z: Float64Array, elapsed: number): Float64Array {
  const motion = motionFrom(z);
  let rest = elapsed;
  for (let level = 0; level < propagator.levels.length; level++) {
    const part = propagator.interval * 2 ** -level;
    if (rest < part) continue;
    advance(propagator, motion, level);
    rest -= part;
  }
  return rest > 0 ? bySeries(propagator.M, motion, rest) : motion.z;
}

/** e^(M t) z by its series, as z + t M (z + t/2 M (z + t/3 M (…))). */
function bySeries(M: DenseMatrix, { z, step }: Motion, t: number): Float64Array {
  const sum = z.slice();
  for (let k = SERIES_TERMS; k > 0; k--) {
    multiplyVector(M, sum, step);
    const factor = t / k;
    for (let i = 0; i < z.length; i++) sum[i] = z[i]! + factor * step[i]!;
  }
  return sum;
}

/** M z. */
export function derivative(M: DenseMatrix, z: Float64Array): Float64Array {
  const result = new Float64Array(z.length);
  multiplyVector(M, z, result);
  return result;
}

/** Row `output` of C times z. */
export function outputOf({ data, columns }: DenseMatrix, output: number, z: Float64Array): number {
  let sum = 0;
  for (let j = 0; j < columns; j++) sum += data[output * columns + j]! * z[j]!;
  return sum;
}
