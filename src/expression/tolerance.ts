/** Tolerances of parameters: `"10 %"` of the value, or an absolute amount. */

import {
  compareRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  type Rational,
  toDouble,
  ZERO,
} from '../algebra/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import { evaluateQuantity, type Scope } from './evaluate.ts';
import type { Value } from './expression.ts';
import { quote } from './wording.ts';

const HUNDRED: Rational = { n: 100n, d: 1n };

/**
 * The plus-or-minus amount that a tolerance says for a parameter of the given value, in the parameter's unit, never negative. A
 * percentage is of the value's magnitude.
 */
export function evaluateTolerance(text: string, nominal: Value, scope: Scope): Result<Value> {
  const trimmed = text.trim();
  const isPercentage = trimmed.endsWith('%');
  const amount = evaluateQuantity(isPercentage ? trimmed.slice(0, -1) : trimmed, scope);
  if (!amount.ok) return amount;
  const { exact, double } = amount.value;
  if (exact === null ? double < 0 : compareRationals(exact, ZERO) < 0) {
    return fail(problem('bad-expression', `${quote(text)} is a negative tolerance. Leave out its sign.`));
  }
  return ok(isPercentage ? shareOf(nominal, amount.value) : amount.value);
}

function shareOf(nominal: Value, percentage: Value): Value {
  const [x, p] = [nominal.exact, percentage.exact];
  if (x === null || p === null) return { exact: null, double: (Math.abs(nominal.double) * percentage.double) / 100 };
  const product = divideRationals(multiplyRationals(x, p), HUNDRED);
  const exact = product.n < 0n ? negateRational(product) : product;
  return { exact, double: toDouble(exact) };
}
