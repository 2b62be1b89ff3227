/** Polynomials and rational functions of a few parameters: read from text, or generated short. */

import fc from 'fast-check';
import { createSymbolicField, type RationalFunction, type SymbolicField } from '../../src/algebra/symbolic/index.ts';
import type { SymbolicPolynomial } from '../../src/algebra/symbolic/polynomial.ts';
import { evaluateIn, parseExpression } from '../../src/expression/index.ts';

/** The rational function that a text of format.md says, every name a parameter; the text is well formed. */
export function functionOf(text: string, field: SymbolicField = createSymbolicField()): RationalFunction {
  const parsed = parseExpression(text);
  const value = parsed.ok ? evaluateIn(parsed.value, field, name => field.variable(name)) : null;
  if (value === null) throw new Error(`no rational function: ${text}`);
  return value;
}

/** The polynomial that a text says. */
export function polynomialOf(text: string): SymbolicPolynomial {
  const { numerator, denominator } = functionOf(text);
  if (denominator.variables.length > 0 || denominator.coefficients[0] !== 1n) throw new Error(`no polynomial: ${text}`);
  return numerator;
}

/** Names that differ in length and in case, in no alphabetical order. */
export const NAMES = ['tau', 'K1', 'J', 'b', 'K2'] as const;

const term = fc
  .tuple(
    fc.integer({ min: -9, max: 9 }),
    fc.array(fc.tuple(fc.constantFrom(...NAMES), fc.integer({ min: 1, max: 2 })), { maxLength: 3 }),
  )
  .map(([coefficient, powers]) => [`(${coefficient})`, ...powers.map(([name, power]) => `${name}^${power}`)].join('*'));

/** Texts of sums of up to four terms, the number zero among them. */
export const polynomialText: fc.Arbitrary<string> = fc
  .array(term, { minLength: 1, maxLength: 4 })
  .map(terms => terms.join(' + '));

export const anyPolynomial: fc.Arbitrary<SymbolicPolynomial> = polynomialText.map(polynomialOf);

export const nonzeroPolynomial: fc.Arbitrary<SymbolicPolynomial> = anyPolynomial.filter(p => p.coefficients.length > 0);

/** Quotients of such sums over such sums that are not zero. */
export const anyFunction: fc.Arbitrary<RationalFunction> = fc
  .tuple(polynomialText, polynomialText)
  .filter(([, below]) => polynomialOf(below).coefficients.length > 0)
  .map(([above, below]) => functionOf(`(${above})/(${below})`));

export const nonzeroFunction: fc.Arbitrary<RationalFunction> = anyFunction.filter(
  f => f.numerator.coefficients.length > 0,
);
