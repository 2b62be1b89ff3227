/**
 * A polynomial as the terms that are written: signs apart from magnitudes, coefficients of one left out, zeros skipped.
 * Markup, LaTeX and words are all made from these.
 */

import type { Rational } from '../../algebra/index.ts';
import { type Figure, figureOf, USUAL_DIGITS } from './figure.ts';
import type { Real } from './rounded-digits.ts';

/** How exact coefficients are written; a double is always a decimal. */
export type Notation = 'fractions' | 'decimals';

/** |coefficient|, with `figure` never negative; a whole number is a figure. */
export type Magnitude =
  | { readonly kind: 'one' }
  | { readonly kind: 'figure'; readonly figure: Figure }
  | { readonly kind: 'fraction'; readonly numerator: string; readonly denominator: string };

/** One term: sign, magnitude, power of the variable. */
export interface Term {
  readonly isNegative: boolean;
  /** `one` only beside a power of the variable. */
  readonly magnitude: Magnitude;
  readonly power: number;
}

/** Digits that a numerator or denominator may have before its fraction is harder to read than its decimal. */
const LONGEST_WRITTEN_FRACTION = 9;

/** Whether `value` fits on the screen as a fraction; one that does not is shown as a decimal, rounded. */
export function isWritableFraction({ n, d }: Rational): boolean {
  const digits = (n < 0n ? -n : n).toString().length;
  return digits <= LONGEST_WRITTEN_FRACTION && d.toString().length <= LONGEST_WRITTEN_FRACTION;
}

/**
 * The terms of a polynomial in descending powers, from its coefficients in the same order; a single zero for the zero
 * polynomial.
 */
export function polynomialTerms(
  coefficients: readonly Real[],
  notation: Notation,
  significant: number = USUAL_DIGITS,
): readonly Term[] {
  const terms = coefficients.flatMap((coefficient, index): Term[] => {
    const power = coefficients.length - 1 - index;
    return isZero(coefficient) ? [] : [termOf(coefficient, power, notation, significant)];
  });
  return terms.length > 0 ? terms : [termOf(0, 0, notation, significant)];
}

/** Whether some coefficient lost digits, so that the polynomial is written with ≈. */
export function hasRoundedTerm(terms: readonly Term[]): boolean {
  return terms.some(({ magnitude }) => magnitude.kind === 'figure' && magnitude.figure.isRounded);
}

function termOf(coefficient: Real, power: number, notation: Notation, significant: number): Term {
  if (isFractional(coefficient) && notation === 'fractions' && isWritableFraction(coefficient)) {
    const { n, d } = coefficient;
    const numerator = (n < 0n ? -n : n).toString();
    return { isNegative: n < 0n, magnitude: { kind: 'fraction', numerator, denominator: d.toString() }, power };
  }
  const figure = figureOf(coefficient, significant);
  const magnitude: Magnitude =
    figure.mantissa === '1' && figure.exponent === null && power > 0
      ? { kind: 'one' }
      : { kind: 'figure', figure: { ...figure, isNegative: false } };
  return { isNegative: figure.isNegative, magnitude, power };
}

function isFractional(value: Real): value is Rational {
  return typeof value !== 'number' && value.d !== 1n;
}

function isZero(value: Real): boolean {
  return typeof value === 'number' ? value === 0 : value.n === 0n;
}
