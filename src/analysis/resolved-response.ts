/**
 * A free response at times fine enough that nothing hides between them: steps follow the fastest mode that is still alive
 * and double as modes die out, so that microseconds and minutes of one response take a few hundred points. Under the
 * metrics of a step and the choice of a horizon.
 */

import { multiplyMatrices } from '../numeric/index.ts';
import { advance, type FreeSystem, finePropagator, initialMotion, outputOf, type Propagator } from './free-response.ts';

/** A pole that the response contains. */
export interface Mode {
  readonly re: number;
  readonly im: number;
  readonly multiplicity: number;
}

/** Points in ascending time from 0 to the horizon. */
export interface ResolvedResponse {
  readonly propagator: Propagator;
  /** s. */
  readonly t: Float64Array;
  /** State of point k from k · n on. */
  readonly z: Float64Array;
  /** One array an output: its values and their derivatives (per s). */
  readonly y: readonly Float64Array[];
  readonly slope: readonly Float64Array[];
}

/** Steps of at most this share of 1/|λ|: 12 points in a period, so that an interval holds one turning point at most. */
const STEP_BY_MODE = 0.5;

/** A horizon is halved at least this often: 64 steps where no mode asks for more. */
const FEWEST_HALVINGS = 6;

/** A mode asks for its steps while its decaying factor is above this. */
const ALIVE = 1e-7;

/** Steps and relative accuracy of a lifetime, of which two figures matter. */
const MOST_STEPS = 50;
const DECAY_DIGITS = 1e-3;

/** Modes within this factor in |λ| act together like one multiple pole. */
const CLUSTER = 1.5;

/** Most multiply-adds spent on one response (about 0.2 s), and most numbers kept of it. */
const MOST_WORK = 2e8;
const MOST_KEPT = 1e6;

/** Halvings of a horizon whose ticks a double still counts exactly. */
const MOST_LEVELS = 52;

/**
 * The response over `horizon` seconds resolved for these modes; null where that takes more points than are worth it (very
 * light damping in a large model) or the horizon spans more than 2⁵² of the fastest time.
 */
export function resolvedResponse(system: FreeSystem, modes: readonly Mode[], horizon: number): ResolvedResponse | null {
  const motionOf = finePropagator(system, horizon, FEWEST_HALVINGS);
  const finest = motionOf.levels.length - 1;
  if (finest > MOST_LEVELS) return null;
  const levels = plannedLevels(modes, horizon, finest);
  const n = system.start.length;
  if (levels === null || levels.length * n * n > MOST_WORK || levels.length * n > MOST_KEPT) return null;
  return followed(motionOf, levels);
}

/** The level of each step from 0 to the horizon; null where there are more than any model is worth. */
function plannedLevels(modes: readonly Mode[], horizon: number, finest: number): number[] | null {
  const limits = modes
    .map(mode => ({ step: STEP_BY_MODE / Math.hypot(mode.re, mode.im), until: lifetime(mode, modes, ALIVE) }))
    .filter(({ step }) => Number.isFinite(step))
    .sort((a, b) => a.step - b.step);
  const ticks = 2 ** finest;
  const levels: number[] = [];
  let alive = 0;
  for (let tick = 0; tick < ticks; ) {
    const t = horizon * (tick / ticks);
    while (alive < limits.length && limits[alive]!.until <= t) alive += 1;
    const step = limits[alive]?.step ?? horizon;
    const wanted = Math.min(finest, Math.max(FEWEST_HALVINGS, Math.ceil(Math.log2(horizon / step))));
    const level = alignedLevel(tick, wanted, finest);
    levels.push(level);
    if (levels.length > MOST_KEPT) return null;
    tick += 2 ** (finest - level);
  }
  return levels;
}

/** The coarsest level from `wanted` on whose steps start at this tick. */
function alignedLevel(tick: number, wanted: number, finest: number): number {
  let level = wanted;
  while (level < finest && tick % 2 ** (finest - level) !== 0) level += 1;
  return level;
}

/**
 * Seconds after which the mode, together with those near it, is below `share` of its largest part: where
 * x^(m−1) e^(−x) / (m−1)! is, for x = −Re p t and m of them. Infinite for a mode that does not decay.
 */
export function lifetime(mode: Mode, modes: readonly Mode[], share: number): number {
  if (mode.re >= 0) return Number.POSITIVE_INFINITY;
  const size = Math.hypot(mode.re, mode.im);
  let together = 0;
  for (const { re, im, multiplicity } of modes) {
    const other = Math.hypot(re, im);
    const isConjugate = re === mode.re && im === -mode.im && im !== 0;
    if (other <= CLUSTER * size && size <= CLUSTER * other && !isConjugate) together += multiplicity;
  }
  return decayTime(together, share) / -mode.re;
}

/** The x above m − 1 at which x^(m−1) e^(−x) / (m−1)! is `share`. */
function decayTime(m: number, share: number): number {
  let offset = -Math.log(share);
  for (let k = 2; k < m; k++) offset -= Math.log(k);
  let x = m - Math.log(share);
  for (let k = 0; k < MOST_STEPS; k++) {
    const next = Math.max(1, m - 1, offset + (m - 1) * Math.log(x)); // a contraction above m − 1
    if (Math.abs(next - x) < DECAY_DIGITS * x) return next;
    x = next;
  }
  return x;
}

function followed(motionOf: Propagator, levels: readonly number[]): ResolvedResponse {
  const n = motionOf.start.length;
  const points = levels.length + 1;
  const outputs = motionOf.C.rows;
  const response = {
    propagator: motionOf,
    t: new Float64Array(points),
    z: new Float64Array(points * n),
    y: Array.from({ length: outputs }, () => new Float64Array(points)),
    slope: Array.from({ length: outputs }, () => new Float64Array(points)),
  };
  const rates = multiplyMatrices(motionOf.C, motionOf.M); // ẏ = C M z
  const motion = initialMotion(motionOf);
  const ticks = 2 ** (motionOf.levels.length - 1);
  let tick = 0;
  for (let k = 0; k < points; k++) {
    response.z.set(motion.z, k * n);
    for (let output = 0; output < outputs; output++) {
      response.y[output]![k] = outputOf(motionOf.C, output, motion.z);
      response.slope[output]![k] = outputOf(rates, output, motion.z);
    }
    const level = levels[k];
    if (level === undefined) break;
    tick += ticks / 2 ** level;
    response.t[k + 1] = motionOf.interval * (tick / ticks);
    advance(motionOf, motion, level);
  }
  return response;
}
