/**
 * Greatest common divisors of polynomials in many parameters. Cheap facts first: content, variables that only one side
 * has, a modular probe that proves most pairs coprime, trial division; what is left goes through a remainder sequence.
 */

import { greatestCommonDivisor } from '../integer.ts';
import { unionOfVariables } from './alignment.ts';
import { coefficientsOver } from './coefficients.ts';
import { integerContent, monomialContent, monomialPolynomial, splitContent } from './content.ts';
import { exactQuotient } from './divide.ts';
import type { Effort } from './effort.ts';
import { multiplyPolynomials } from './multiply.ts';
import {
  constantPolynomial,
  degreesOf,
  equalPolynomials,
  isConstantPolynomial,
  isOnePolynomial,
  isZeroPolynomial,
  negatePolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  signOf,
  ZERO_POLYNOMIAL,
} from './polynomial.ts';
import { divisorDegreeBounds } from './probe.ts';
import { divisorByRemainders } from './remainder-sequence.ts';

/**
 * The greatest common divisor over the integers, of positive sign (`signOf`); gcd(0, b) = ± b, gcd(0, 0) = 0.
 *
 * Linear in the terms where the two are coprime. Else trial division, then a remainder sequence in the
 * variable in which the divisor can have the lowest degree, recursively in the others (Brown, J. ACM 18, 1971).
 */
export function commonDivisor(a: SymbolicPolynomial, b: SymbolicPolynomial, effort: Effort): SymbolicPolynomial {
  if (isZeroPolynomial(a)) return withPositiveSign(b);
  if (isZeroPolynomial(b)) return withPositiveSign(a);
  if (isOnePolynomial(a) || isOnePolynomial(b)) return ONE_POLYNOMIAL;
  effort.spend(a.coefficients.length + b.coefficients.length);
  if (equalPolynomials(a, b)) return withPositiveSign(a);
  const content = commonContent(a, b);
  if (a.coefficients.length === 1 || b.coefficients.length === 1) return content;
  const rest = divisorOfRests(splitContent(a).rest, splitContent(b).rest, effort);
  return isOnePolynomial(rest) ? content : multiplyPolynomials(content, rest, effort);
}

/** The number and the parameters that divide every term of both. */
function commonContent(a: SymbolicPolynomial, b: SymbolicPolynomial): SymbolicPolynomial {
  const integer = greatestCommonDivisor(integerContent(a), integerContent(b));
  if (isConstantPolynomial(a) || isConstantPolynomial(b)) return constantPolynomial(integer);
  const left = monomialContent(a);
  const right = monomialContent(b);
  const exponents = a.variables.map((name, v) => {
    const column = left[v] === 0 ? -1 : b.variables.indexOf(name);
    return column < 0 ? 0 : Math.min(left[v]!, right[column]!);
  });
  return monomialPolynomial(integer, a.variables, exponents);
}

/** The greatest common divisor of a list, of positive sign; 0 for an empty one. Shortest first, and no further than one. */
export function commonDivisorOfAll(list: readonly SymbolicPolynomial[], effort: Effort): SymbolicPolynomial {
  const byLength = [...list].sort((p, q) => p.coefficients.length - q.coefficients.length);
  let divisor: SymbolicPolynomial = ZERO_POLYNOMIAL;
  for (const polynomial of byLength) {
    divisor = commonDivisor(divisor, polynomial, effort);
    if (isOnePolynomial(divisor)) break;
  }
  return divisor;
}

/** p, or −p where the sign of p is negative. */
export function withPositiveSign(p: SymbolicPolynomial): SymbolicPolynomial {
  return signOf(p) < 0 ? negatePolynomial(p) : p;
}

/** The divisor of two polynomials of content one, neither a number. */
function divisorOfRests(a: SymbolicPolynomial, b: SymbolicPolynomial, effort: Effort): SymbolicPolynomial {
  const variables = unionOfVariables(a.variables, b.variables);
  const bounds = divisorDegreeBounds(a, variables, effort)(b);
  if (bounds.every(bound => bound === 0)) return ONE_POLYNOMIAL;
  // The divisor holds none of the variables of bound zero, so it divides the coefficients over these.
  const absent = new Set(variables.filter((_, v) => bounds[v] === 0));
  if (absent.size > 0) {
    return commonDivisorOfAll([...coefficientsOver(a, absent), ...coefficientsOver(b, absent)], effort);
  }
  for (const [divisor, other] of [
    [b, a],
    [a, b],
  ] as const) {
    const mayDivide = degreesOf(divisor).every((degree, v) => degree === bounds[v]);
    if (mayDivide && exactQuotient(other, divisor, effort) !== null) return withPositiveSign(divisor);
  }
  return withPositiveSign(divisorByRemainders(a, b, bounds, commonDivisorOfAll, effort));
}
