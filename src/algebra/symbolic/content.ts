/** What divides every term of a polynomial: a whole number and a monomial. Taken out before anything dearer is tried. */

import { absolute, greatestCommonDivisor } from '../integer.ts';
import { dividePolynomialByInteger, type SymbolicPolynomial, withoutUnusedVariables } from './polynomial.ts';

/** Greatest common divisor of the coefficients, positive; 0 for the zero polynomial. */
export function integerContent(p: SymbolicPolynomial): bigint {
  let content = 0n;
  for (const coefficient of p.coefficients) {
    content = greatestCommonDivisor(content, absolute(coefficient));
    if (content === 1n) break;
  }
  return content;
}

/** Lowest exponent of each variable, in the order of `variables`. */
export function monomialContent(p: SymbolicPolynomial): number[] {
  const n = p.variables.length;
  const lowest = p.exponents.slice(0, n);
  for (let k = n, v = 0; k < p.exponents.length; k++) {
    if (p.exponents[k]! < lowest[v]!) lowest[v] = p.exponents[k]!;
    if (++v === n) v = 0;
  }
  return lowest;
}

/** A polynomial as whole number × monomial × the rest. */
export interface ContentSplit {
  /** Positive; 0 for the zero polynomial. */
  readonly integer: bigint;
  /** Exponents over the variables of the whole. */
  readonly monomial: readonly number[];
  /** Integer content 1, no variable in every term; its sign is that of the whole. */
  readonly rest: SymbolicPolynomial;
}

/** Takes the integer and monomial content out of a nonzero polynomial. */
export function splitContent(p: SymbolicPolynomial): ContentSplit {
  const integer = integerContent(p);
  const monomial = monomialContent(p);
  const scaled = dividePolynomialByInteger(p, integer);
  if (monomial.every(exponent => exponent === 0)) return { integer, monomial, rest: scaled };
  const n = p.variables.length;
  const exponents = p.exponents.map((exponent, k) => exponent - monomial[k % n]!);
  return { integer, monomial, rest: withoutUnusedVariables(p.variables, exponents, scaled.coefficients) };
}

/** factor · Π variables ^ exponents as a polynomial of one term. */
export function monomialPolynomial(
  factor: bigint,
  variables: readonly string[],
  exponents: readonly number[],
): SymbolicPolynomial {
  return withoutUnusedVariables(variables, exponents, [factor]);
}
