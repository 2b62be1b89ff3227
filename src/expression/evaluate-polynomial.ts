/** Text to the numbers of a polynomial in s, for the fields of a transfer function. */

import { ONE, ZERO } from '../algebra/index.ts';
import { fail, ok, type Result } from '../problem/index.ts';
import { combineQuantities, doubleOf, isZeroQuantity, negate, type Quantity, toValue } from './arithmetic.ts';
import { evaluateNode, finiteFault, type Scope, unknownNames } from './evaluate.ts';
import type { Value } from './expression.ts';
import { parseExpression } from './parse.ts';
import { type CoefficientArithmetic, HIGHEST_DEGREE, readPolynomial } from './polynomial-arithmetic.ts';

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
  const result = readPolynomial(parsed.value, numbersFor(scope));
  if (!result.ok) return result;
  const values = result.value.map(toValue);
  for (const value of values) {
    const fault = finiteFault(text, value);
    if (fault !== null) return fail(fault);
  }
  return ok(values);
}

function numbersFor(scope: Scope): CoefficientArithmetic<Quantity> {
  return {
    zero: ZERO,
    one: ONE,
    node: (node, parts) => evaluateNode(node, parts, scope),
    combine: combineQuantities,
    negate,
    exponent: (_, value) => {
      const isWhole = typeof value !== 'number' && value.d === 1n;
      return isWhole && Math.abs(doubleOf(value)) <= HIGHEST_DEGREE ? doubleOf(value) : null;
    },
  };
}
