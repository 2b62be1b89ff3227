/**
 * How wide a polynomial comes out, estimated before it is laid out, to choose between one fraction and wrapped lines. The
 * widths are those of STIX Two Text, rounded up.
 */

import type { Magnitude, Term } from './polynomial-terms.ts';

/** Ems: a digit; a sign with the spaces around it; the variable; a raised digit; × 10 with its spaces. */
const DIGIT = 0.52;
const SIGN = 1.35;
const VARIABLE = 0.55;
const RAISED_DIGIT = 0.4;
const TIMES_TEN = 2.3;

/** Width of the terms on one line, ems; right to about a tenth. */
export function polynomialEms(terms: readonly Term[]): number {
  return terms.reduce((sum, term) => sum + SIGN + magnitudeEms(term.magnitude) + powerEms(term.power), 0);
}

function powerEms(power: number): number {
  if (power === 0) return 0;
  return power === 1 ? VARIABLE : VARIABLE + RAISED_DIGIT * String(power).length;
}

function magnitudeEms(magnitude: Magnitude): number {
  switch (magnitude.kind) {
    case 'one':
      return 0;
    case 'fraction':
      return DIGIT * Math.max(magnitude.numerator.length, magnitude.denominator.length);
    case 'figure': {
      const { mantissa, exponent } = magnitude.figure;
      const scale = exponent === null ? 0 : TIMES_TEN + RAISED_DIGIT * String(exponent).length;
      return DIGIT * mantissa.length + scale;
    }
    default:
      return magnitude satisfies never;
  }
}
