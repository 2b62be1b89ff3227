/** Text to the numbers of a polynomial in s, for the fields of a transfer function. */

import { ONE, ZERO } from '../algebra/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import { combineQuantities, isKept, isZeroQuantity, negate, type Quantity, toValue } from './arithmetic.ts';
import { type CoefficientArithmetic, coefficientLists } from './coefficient-lists.ts';
import { evaluateNode, finiteFault, type Scope, unknownNames } from './evaluate.ts';
import type { Expression, Value } from './expression.ts';
import { parseExpression } from './parse.ts';
import { HIGHEST_DEGREE, readPolynomial } from './polynomial-reading.ts';
import { coefficientsOf, wholePolynomials } from './whole-polynomials.ts';
import { quote } from './wording.ts';

/**
 * The coefficients of a polynomial in s, in descending powers without zeros in front; the zero polynomial is `[]`. Where it
 * is shorter than `polynomialAsWritten`, the order is lowered. Refused as `evaluateQuantity`, and where s has another power
 * than 0 to 200.
 */
export function evaluatePolynomial(text: string, scope: Scope): Result<readonly Value[]> {
  const written = polynomialAsWritten(text, scope);
  if (!written.ok) return written;
  const first = written.value.findIndex(value => !isZeroQuantity(value.exact ?? value.double));
  return ok(first < 0 ? [] : written.value.slice(first));
}

/**
 * The coefficients with the zeros in front kept, so that there is one more than the degree written: `"m*s^2 + s"` has three
 * also for m = 0. At least one.
 */
export function polynomialAsWritten(text: string, scope: Scope): Result<readonly Value[]> {
  const parsed = parseExpression(text);
  if (!parsed.ok) return parsed;
  const unknown = unknownNames(parsed.value, scope);
  if (unknown !== null) return unknown;
  const coefficients = exactPolynomial(parsed.value, scope) ?? readPolynomial(parsed.value, lists(scope));
  if (!coefficients.ok) return coefficients;
  const values: Value[] = [];
  for (const coefficient of coefficients.value) {
    if (typeof coefficient !== 'number' && !isKept(coefficient)) return fail(coefficientTooLong(text));
    const value = toValue(coefficient);
    const fault = finiteFault(text, value);
    if (fault !== null) return fail(fault);
    values.push(value);
  }
  return ok(values);
}

function coefficientTooLong(text: string) {
  const message = `A coefficient of ${quote(text)} has more than 8192 binary digits. Round the numbers in it.`;
  return problem('bad-expression', message);
}

/** Carries no message: whoever sees it takes the way for irrational numbers. */
const NOT_EXACT = fail(problem('bad-expression', 'Some part of it is irrational.'));

/** The coefficients where every part of it is exact; null where one is not. */
function exactPolynomial(expression: Expression, scope: Scope): Result<readonly Quantity[]> | null {
  const arithmetic = wholePolynomials({
    node: (node, parts) => {
      const value = evaluateNode(node, parts, scope);
      if (!value.ok) return value;
      return typeof value.value === 'number' ? NOT_EXACT : ok(value.value);
    },
    exponent: (_, value) => wholeExponent(value),
  });
  const result = readPolynomial(expression, arithmetic);
  if (result.ok) return ok(coefficientsOf(result.value));
  return result === NOT_EXACT ? null : result;
}

/** The way for polynomials with irrational parts. */
function lists(scope: Scope) {
  const arithmetic: CoefficientArithmetic<Quantity> = {
    zero: ZERO,
    one: ONE,
    node: (node, parts) => evaluateNode(node, parts, scope),
    combine: combineQuantities,
    negate,
    isZero: value => typeof value !== 'number' && value.n === 0n,
    exponent: (_, value) => wholeExponent(value),
  };
  return coefficientLists(arithmetic);
}

function wholeExponent(value: Quantity): number | null {
  if (typeof value === 'number' || value.d !== 1n) return null;
  const exponent = Number(value.n);
  return Math.abs(exponent) <= HIGHEST_DEGREE ? exponent : null;
}
