/**
 * Last pass: the model against the drawing's raw equations, by a route that shares nothing with the derivation but the
 * reading of quantities. In complex doubles, whatever field the derivation ran over.
 */

import type { Diagram } from '../../diagram/index.ts';
import type { Scope } from '../../expression/index.ts';
import { randomSigned } from '../../numeric/index.ts';
import type { SelfCheck, StateSpace } from '../state-space.ts';
import { type Complex, modulus } from './complex.ts';
import { testFrequencies } from './frequencies.ts';
import { awayFromZero, type Jitter, jitterOf } from './random.ts';
import { type RawDrawing, rawDrawing } from './raw-drawing.ts';
import { jittered, type RawLaw } from './raw-laws.ts';
import { type Residual, residuals } from './residuals.ts';
import { type Drive, solveDrawing } from './solve-drawing.ts';
import { transferResiduals } from './transfer-residuals.ts';

/**
 * Largest drawing, in unknowns, that is solved at complex frequencies. Beyond, its states are held at random values and
 * only the static equations are solved, which takes time in proportion to their number.
 */
const LARGEST_AT_FREQUENCIES = 1_500;

/** Random vectors of states and inputs in place of frequencies. */
const HELD_VECTORS = 3;

/** Inputs that are driven one by one; further ones share these drives, each with a random factor. */
const SEPARATE_DRIVES = 8;

/**
 * Largest relative difference that rounding may leave: units in the last place for each unknown and each state, whose
 * coefficients every answer runs through, with a floor of about 4e-13. A difference is taken relative to the terms of its
 * equation and to what a relative change of the drawing's coefficients makes of it, so that the limit need not know the
 * conditioning.
 */
function differenceLimit({ unknowns, states }: RawDrawing): number {
  return Number.EPSILON * Math.max(2048, 16 * unknowns + 32 * states);
}

/** The random relative change of the coefficients: its effect is far above rounding, and still linear in the change. */
const JITTER = 2 ** -40;

/**
 * Compares the model with its drawing, at three complex frequencies or with held random states.
 *
 * @param diagram, scope  What the model was derived from, without a problem.
 */
export function selfCheck(diagram: Diagram, scope: Scope, model: StateSpace): SelfCheck {
  const drawing = rawDrawing(diagram, scope);
  const limit = differenceLimit(drawing);
  const isOneSided = model.inputs.length === 0 || model.outputs.length === 0;
  if (isOneSided && (drawing.isImproper || model.states.length === 0))
    return { error: 0, limit, passed: true, frequencies: 0, vectors: 0 };
  const isHeld = drawing.unknowns > LARGEST_AT_FREQUENCIES && !drawing.isImproper;
  const comparisons = isHeld ? [heldComparison(drawing, model)] : frequencyComparisons(drawing, model);
  const errors = comparisons.map(comparison => largestError(comparison, limit));
  const compared = errors.filter(error => error !== null);
  const error = compared.length === 0 ? 1 : compared.reduce((a, b) => Math.max(a, b), 0);
  return {
    error,
    limit,
    passed: error <= limit,
    frequencies: isHeld ? 0 : compared.length || comparisons.length,
    vectors: isHeld ? HELD_VECTORS : 0,
  };
}

/** The equations' differences, with every coefficient changed as `jitter` says; null where there is no answer. */
type Comparison = (jitter: Jitter | null) => readonly Residual[] | null;

function heldComparison(drawing: RawDrawing, { states, inputs, numeric }: StateSpace): Comparison {
  const random = randomSigned(1);
  const vector = (length: number) => Array.from({ length }, () => awayFromZero(random));
  const drives = Array.from({ length: HELD_VECTORS }, () => ({
    inputs: vector(inputs.length),
    states: vector(states.length),
  }));
  return jitter => {
    if (drawing.states !== states.length) return null;
    const answers = solveDrawing(drawing, 'held', drives, lawsOf(drawing, jitter));
    return answers?.flatMap(answer => residuals(numeric, answer)) ?? null;
  };
}

/** One for each test frequency, with milder ones in reserve where its powers leave the doubles. */
function frequencyComparisons(drawing: RawDrawing, model: StateSpace): Comparison[] {
  const drives = frequencyDrives(drawing);
  return testFrequencies(model.numeric.A).map(s => jitter => {
    if (!drawing.isImproper && drawing.states !== model.states.length) return null;
    for (const milder of [s, towardsOne(s, 0.5), towardsOne(s, 0)]) {
      const found = compareAt(drawing, model, milder, drives, jitter);
      if (found?.every(({ scale }) => Number.isFinite(scale))) return found;
    }
    return null;
  });
}

/** The same direction, the modulus raised to a power. */
function towardsOne({ re, im }: Complex, exponent: number): Complex {
  const size = Math.hypot(re, im);
  return { re: (re / size) * size ** exponent, im: (im / size) * size ** exponent };
}

function compareAt(
  drawing: RawDrawing,
  { numeric }: StateSpace,
  s: Complex,
  drives: readonly Drive[],
  jitter: Jitter | null,
): readonly Residual[] | null {
  const answers = solveDrawing(drawing, s, drives, lawsOf(drawing, jitter));
  if (answers === null) return null;
  if (!drawing.isImproper) return answers.flatMap(answer => residuals(numeric, answer));
  return transferResiduals(numeric, s, answers, jitter);
}

function lawsOf({ blocks }: RawDrawing, jitter: Jitter | null): readonly RawLaw[] {
  return blocks.map(({ law }) => (jitter === null ? law : jittered(law, jitter)));
}

/** Each input by itself from rest, then random initial states without input; with differentiations from rest only. */
function frequencyDrives(drawing: RawDrawing): Drive[] {
  const { states, inputs } = drawing;
  const random = randomSigned(2);
  const rest = new Array<number>(states).fill(0);
  const drives = Array.from({ length: Math.min(inputs.length, SEPARATE_DRIVES) }, (_, drive) => ({
    inputs: inputs.map((_, j) => {
      if (j % SEPARATE_DRIVES !== drive) return 0;
      return inputs.length <= SEPARATE_DRIVES ? 1 : awayFromZero(random);
    }),
    states: rest,
  }));
  if (drawing.isImproper || states === 0) return drives;
  return [...drives, { inputs: inputs.map(() => 0), states: rest.map(() => awayFromZero(random)) }];
}

/** Largest relative difference; 1 where it is no number, null where the drawing has no answer at this frequency. */
function largestError(comparison: Comparison, limit: number): number | null {
  const found = comparison(null);
  if (found === null) return null;
  const error = largestRatio(found, ({ scale }) => scale);
  if (error <= limit) return error;
  const changed = comparison(jitterOf(JITTER, 3));
  if (changed === null) return error;
  return largestRatio(found, ({ scale, difference }, i) => {
    const after = changed[i]!.difference;
    return scale + Math.hypot(after.re - difference.re, after.im - difference.im) / JITTER;
  });
}

/**
 * Terms below this, against drives of 1, are at the end of the range of doubles and have lost their digits: 2⁻¹⁰²² is the
 * smallest number with all of them.
 */
const VANISHED = 2 ** -960;

function largestRatio(found: readonly Residual[], scaleOf: (residual: Residual, i: number) => number): number {
  let largest = 0;
  found.forEach((residual, i) => {
    const size = modulus(residual.difference);
    const ratio = size < VANISHED ? 0 : size / scaleOf(residual, i);
    largest = Math.max(largest, Number.isFinite(ratio) ? ratio : 1);
  });
  return largest;
}
