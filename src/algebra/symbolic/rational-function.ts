/**
 * Quotients of polynomials in the parameters, always in lowest terms: the elements of the symbolic field. Sums and products
 * reduce by small common divisors on the way instead of one large one at the end (Henrici, J. ACM 3, 1956; Knuth,
 * TAOCP 2, 4.5.1).
 */

import type { Rational } from '../rational.ts';
import { addPolynomials } from './add.ts';
import { unionOfVariables } from './alignment.ts';
import { integerContent } from './content.ts';
import { knownQuotient } from './divide.ts';
import type { Effort } from './effort.ts';
import { commonDivisor } from './gcd.ts';
import { multiplyPolynomials, powerOfPolynomial } from './multiply.ts';
import {
  constantPolynomial,
  equalPolynomials,
  isOnePolynomial,
  isZeroPolynomial,
  negatePolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  signOf,
  totalDegree,
  variablePolynomial,
  ZERO_POLYNOMIAL,
} from './polynomial.ts';
import { divisorDegreeBounds } from './probe.ts';

/**
 * numerator / denominator without a common divisor, integer factors included, so that equal functions are equal records.
 * The denominator's sign is positive: of its terms of lowest total degree the lexicographically first (names by code unit)
 * has a positive coefficient, so it reads `1 − K`, never `K − 1`. Zero is 0/1.
 */
export interface RationalFunction {
  readonly numerator: SymbolicPolynomial;
  readonly denominator: SymbolicPolynomial;
}

/** 0/1. */
export const ZERO_FUNCTION: RationalFunction = { numerator: ZERO_POLYNOMIAL, denominator: ONE_POLYNOMIAL };
/** 1/1. */
export const ONE_FUNCTION: RationalFunction = { numerator: ONE_POLYNOMIAL, denominator: ONE_POLYNOMIAL };

/** The quotient of two polynomials in lowest terms; the denominator is not zero. */
export function rationalFunction(
  numerator: SymbolicPolynomial,
  denominator: SymbolicPolynomial,
  effort: Effort,
): RationalFunction {
  if (isZeroPolynomial(denominator)) throw new RangeError('a rational function with denominator zero');
  if (isZeroPolynomial(numerator)) return ZERO_FUNCTION;
  const common = commonDivisor(numerator, denominator, effort);
  return withPositiveDenominator(knownQuotient(numerator, common, effort), knownQuotient(denominator, common, effort));
}

/**
 * Quotients of many polynomials by one, in lowest terms; the denominator is not zero. One probe of the denominator serves
 * for all; only what it does not prove coprime is looked at one by one.
 */
export function functionsOver(
  denominator: SymbolicPolynomial,
  numerators: readonly SymbolicPolynomial[],
  effort: Effort,
): RationalFunction[] {
  const isNegative = signOf(denominator) < 0;
  const positive = isNegative ? negatePolynomial(denominator) : denominator;
  const variables = numerators.reduce((all, p) => unionOfVariables(all, p.variables), denominator.variables);
  const bounds = divisorDegreeBounds(positive, variables, effort);
  const content = integerContent(positive);
  return numerators.map(given => {
    const numerator = isNegative ? negatePolynomial(given) : given;
    const isCoprime = content === 1n && !isZeroPolynomial(numerator) && bounds(numerator).every(bound => bound === 0);
    return isCoprime ? { numerator, denominator: positive } : rationalFunction(numerator, positive, effort);
  });
}

/** A number as a rational function. */
export function functionFromRational({ n, d }: Rational): RationalFunction {
  return { numerator: constantPolynomial(n), denominator: constantPolynomial(d) };
}

/** A parameter, or an opaque atom that prints as its text, as a rational function. */
export function functionFromVariable(name: string): RationalFunction {
  return { numerator: variablePolynomial(name), denominator: ONE_POLYNOMIAL };
}

/** Whether f is zero. */
export function isZeroFunction(f: RationalFunction): boolean {
  return isZeroPolynomial(f.numerator);
}

/** Whether two functions are the same; a comparison of terms, since both are in lowest terms. */
export function equalFunctions(f: RationalFunction, g: RationalFunction): boolean {
  return equalPolynomials(f.numerator, g.numerator) && equalPolynomials(f.denominator, g.denominator);
}

/** −f. */
export function negateFunction(f: RationalFunction): RationalFunction {
  return { numerator: negatePolynomial(f.numerator), denominator: f.denominator };
}

/** f + g. */
export function addFunctions(f: RationalFunction, g: RationalFunction, effort: Effort): RationalFunction {
  if (isZeroFunction(f)) return g;
  if (isZeroFunction(g)) return f;
  if (equalPolynomials(f.denominator, g.denominator)) {
    const sum = addPolynomials(f.numerator, g.numerator);
    if (isOnePolynomial(f.denominator)) return held({ numerator: sum, denominator: f.denominator }, effort);
    return rationalFunction(sum, f.denominator, effort);
  }
  const common = commonDivisor(f.denominator, g.denominator, effort);
  const scaleF = knownQuotient(g.denominator, common, effort);
  const scaleG = knownQuotient(f.denominator, common, effort);
  const sum = addPolynomials(
    multiplyPolynomials(f.numerator, scaleF, effort),
    multiplyPolynomials(g.numerator, scaleG, effort),
  );
  if (isZeroPolynomial(sum)) return ZERO_FUNCTION;
  // Only a factor of `common` can still divide the sum.
  const cancelled = commonDivisor(sum, common, effort);
  const denominator = multiplyPolynomials(scaleG, knownQuotient(g.denominator, cancelled, effort), effort);
  return held({ numerator: knownQuotient(sum, cancelled, effort), denominator }, effort);
}

/** f − g. */
export function subtractFunctions(f: RationalFunction, g: RationalFunction, effort: Effort): RationalFunction {
  return addFunctions(f, negateFunction(g), effort);
}

/** f · g. */
export function multiplyFunctions(f: RationalFunction, g: RationalFunction, effort: Effort): RationalFunction {
  if (isZeroFunction(f) || isZeroFunction(g)) return ZERO_FUNCTION;
  const first = commonDivisor(f.numerator, g.denominator, effort);
  const second = commonDivisor(g.numerator, f.denominator, effort);
  return {
    numerator: multiplyPolynomials(
      knownQuotient(f.numerator, first, effort),
      knownQuotient(g.numerator, second, effort),
      effort,
    ),
    denominator: multiplyPolynomials(
      knownQuotient(f.denominator, second, effort),
      knownQuotient(g.denominator, first, effort),
      effort,
    ),
  };
}

/** 1 / f; f is not zero. */
function invertFunction(f: RationalFunction): RationalFunction {
  if (isZeroFunction(f)) throw new RangeError('a rational function divided by zero');
  return withPositiveDenominator(f.denominator, f.numerator);
}

/** f / g; g is not zero. */
export function divideFunctions(f: RationalFunction, g: RationalFunction, effort: Effort): RationalFunction {
  return multiplyFunctions(f, invertFunction(g), effort);
}

/** f to a whole power of either sign; f is not zero where the exponent is negative; 0⁰ = 1. */
export function powerOfFunction(f: RationalFunction, exponent: number, effort: Effort): RationalFunction {
  const { numerator, denominator } = exponent < 0 ? invertFunction(f) : f;
  const size = Math.abs(exponent);
  return {
    numerator: powerOfPolynomial(numerator, size, effort),
    denominator: powerOfPolynomial(denominator, size, effort),
  };
}

/** Terms of numerator and denominator together. */
function functionLength(f: RationalFunction): number {
  return f.numerator.coefficients.length + f.denominator.coefficients.length;
}

/** Whether f has fewer terms than g, or as many of lower degrees in all. */
export function isShorterFunction(f: RationalFunction, g: RationalFunction): boolean {
  const difference = functionLength(f) - functionLength(g);
  return difference < 0 || (difference === 0 && degreeSum(f) < degreeSum(g));
}

function degreeSum({ numerator, denominator }: RationalFunction): number {
  return degreeSumOf(numerator) + degreeSumOf(denominator);
}

function degreeSumOf(p: SymbolicPolynomial): number {
  let sum = 0;
  for (let t = 0; t < p.coefficients.length; t++) sum += totalDegree(p, t);
  return sum;
}

function withPositiveDenominator(numerator: SymbolicPolynomial, denominator: SymbolicPolynomial): RationalFunction {
  if (signOf(denominator) > 0) return { numerator, denominator };
  return { numerator: negatePolynomial(numerator), denominator: negatePolynomial(denominator) };
}

function held(f: RationalFunction, effort: Effort): RationalFunction {
  effort.holdTerms(f.numerator.coefficients.length);
  effort.holdTerms(f.denominator.coefficients.length);
  return f;
}
