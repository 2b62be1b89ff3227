/**
 * Transfer functions from the state-space model, exact: numerator over the characteristic polynomial with every common
 * factor cancelled, the denominator monic.
 */

import {
  dividePolynomials,
  greatestCommonDivisorOfPolynomials,
  ONE,
  type Polynomial,
  toDouble,
} from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import {
  allNumerators,
  characteristicOf,
  type Effort,
  type ExactModel,
  exactModel,
  numeratorOf,
  remembered,
} from './exact-model.ts';
import { tooManyStates } from './zeros.ts';

/** Coprime, the denominator monic; a channel that is zero is 0 over 1, the numerator empty. */
export interface ReducedFraction {
  readonly numerator: Polynomial;
  readonly denominator: Polynomial;
}

export type TransferFunction =
  | {
      readonly route: 'certified';
      readonly input: string;
      readonly output: string;
      readonly exact: ReducedFraction;
      /** The nearest doubles in descending powers of s; [0] for the zero channel. */
      readonly numerator: readonly number[];
      readonly denominator: readonly number[];
      /** Whether it is exact only for doubles that stand in for irrational values. */
      readonly standsIn: boolean;
    }
  | {
      readonly route: 'not-computed';
      readonly input: string;
      readonly output: string;
      /** Ready for the screen. */
      readonly reason: string;
    };

/** The transfer function from an input to an output, by their positions; up to 32 states, up to 128 with `high` effort. */
export function transferFunction(
  model: StateSpace,
  output: number,
  input: number,
  effort: Effort = 'ordinary',
): TransferFunction {
  const names = { input: model.inputs[input]?.name ?? '', output: model.outputs[output]?.name ?? '' };
  const exact = exactModel(model, effort);
  if (exact === null) {
    return { route: 'not-computed', ...names, reason: tooManyStates(model, 'Transfer functions', effort) };
  }
  const fraction = reducedFraction(exact, output, input);
  return {
    route: 'certified',
    ...names,
    exact: fraction,
    numerator: fraction.numerator.length === 0 ? [0] : fraction.numerator.map(toDouble),
    denominator: fraction.denominator.map(toDouble),
    standsIn: exact.standsIn,
  };
}

/** One transfer function for each output and input: output by output, its inputs in order. */
export function allTransferFunctions(model: StateSpace, effort: Effort = 'ordinary'): readonly TransferFunction[] {
  const exact = exactModel(model, effort);
  if (exact !== null) allNumerators(exact);
  return model.outputs.flatMap((_, output) =>
    model.inputs.map((_, input) => transferFunction(model, output, input, effort)),
  );
}

/** The channel's numerator and denominator without their common factor. */
export function reducedFraction(exact: ExactModel, output: number, input: number): ReducedFraction {
  const known = remembered(fractions, exact, () => new Map<string, ReducedFraction>());
  const key = `${output} ${input}`;
  const kept = known.get(key);
  if (kept !== undefined) return kept;
  const fraction = cancelled(numeratorOf(exact, output, input), characteristicOf(exact));
  known.set(key, fraction);
  return fraction;
}

const fractions = new WeakMap<ExactModel, Map<string, ReducedFraction>>();

function cancelled(numerator: Polynomial, denominator: Polynomial): ReducedFraction {
  if (numerator.length === 0) return { numerator, denominator: [ONE] };
  const common = greatestCommonDivisorOfPolynomials(numerator, denominator);
  if (common.length === 1) return { numerator, denominator };
  return {
    numerator: dividePolynomials(numerator, common).quotient,
    denominator: dividePolynomials(denominator, common).quotient,
  };
}
