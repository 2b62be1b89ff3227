/**
 * Rational functions of the parameters as a field, for the same elimination that runs over rationals and doubles. Each
 * field counts its own effort; create one for each derivation.
 */

import type { Field } from '../field.ts';
import { Effort, type EffortLimits } from './effort.ts';
import {
  addFunctions,
  divideFunctions,
  equalFunctions,
  functionFromRational,
  functionFromVariable,
  isShorterFunction,
  isZeroFunction,
  multiplyFunctions,
  negateFunction,
  ONE_FUNCTION,
  powerOfFunction,
  type RationalFunction,
  subtractFunctions,
  ZERO_FUNCTION,
} from './rational-function.ts';

/** The field of rational functions over ℚ; its operations may throw `EffortSpent`. */
export interface SymbolicField extends Field<RationalFunction> {
  readonly name: 'symbolic';
  /** What has been and may be spent by this field's operations. */
  readonly effort: Effort;
  /** A parameter, or an opaque atom (`sqrt(2)`) that prints as its text. */
  variable(name: string): RationalFunction;
  /** f to a whole power of either sign; f is not zero where it is negative. */
  power(f: RationalFunction, exponent: number): RationalFunction;
}

/**
 * A field under limits of effort, `DEFAULT_LIMITS` where none are given. Run what uses it in `withinEffort`.
 *
 * Of two pivots the one with fewer terms is the better, then the one of lower degree.
 */
export function createSymbolicField(limits: Partial<EffortLimits> = {}): SymbolicField {
  const effort = new Effort(limits);
  return {
    name: 'symbolic',
    effort,
    zero: ZERO_FUNCTION,
    one: ONE_FUNCTION,
    add: (f, g) => addFunctions(f, g, effort),
    subtract: (f, g) => subtractFunctions(f, g, effort),
    multiply: (f, g) => multiplyFunctions(f, g, effort),
    divide: (f, g) => divideFunctions(f, g, effort),
    negate: negateFunction,
    isZero: isZeroFunction,
    equals: equalFunctions,
    fromRational: functionFromRational,
    isBetterPivot: isShorterFunction,
    variable: functionFromVariable,
    power: (f, exponent) => powerOfFunction(f, exponent, effort),
  };
}
