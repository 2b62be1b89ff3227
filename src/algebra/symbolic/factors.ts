/**
 * Polynomials taken apart for print: numbers, parameters, known factors, factors that lack a parameter, repeated factors.
 * Not a complete factorization: a² − b² stays whole.
 */

import { subtractPolynomials } from './add.ts';
import { collectIn, spreadIn } from './coefficients.ts';
import { splitContent } from './content.ts';
import { exactQuotient, knownQuotient } from './divide.ts';
import { DEFAULT_LIMITS, Effort, withinEffort } from './effort.ts';
import { commonDivisor, commonDivisorOfAll, withPositiveSign } from './gcd.ts';
import {
  degreesOf,
  equalPolynomials,
  isConstantPolynomial,
  isOnePolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  scalePolynomial,
  signOf,
  variablePolynomial,
} from './polynomial.ts';
import { isProvenIrreducible } from './probe.ts';
import type { RationalFunction } from './rational-function.ts';

/** A factor of positive sign and content one, with how often it divides. */
export interface RepeatedFactor {
  readonly polynomial: SymbolicPolynomial;
  readonly multiplicity: number;
}

/** sign · integer · Π name ^ exponent · Π polynomial ^ multiplicity. */
export interface Factors {
  readonly sign: 1 | -1;
  /** Positive. */
  readonly integer: bigint;
  /** Parameters that divide, by code unit, each once. */
  readonly monomial: readonly { readonly name: string; readonly exponent: number }[];
  readonly polynomials: readonly RepeatedFactor[];
}

/** Number and parameters taken out of a nonzero polynomial, the rest left whole. */
export function contentFactors(p: SymbolicPolynomial): Factors {
  const { integer, monomial, rest } = splitContent(p);
  const sign = signOf(rest);
  return {
    sign,
    integer,
    monomial: p.variables.flatMap((name, v) => (monomial[v] === 0 ? [] : [{ name, exponent: monomial[v]! }])),
    polynomials: isConstantPolynomial(rest) ? [] : [{ polynomial: withPositiveSign(rest), multiplicity: 1 }],
  };
}

/**
 * As `contentFactors`, with the rest divided by the known polynomials as often as they go, then by what its coefficients
 * over a parameter share, then into square-free factors (Yun, SYMSAC 1976).
 */
export function factorsOf(p: SymbolicPolynomial, known: readonly SymbolicPolynomial[], effort: Effort): Factors {
  const content = contentFactors(p);
  const found: RepeatedFactor[] = [];
  for (const { polynomial } of content.polynomials) {
    let rest = polynomial;
    for (const candidate of known) {
      for (const factor of contentFactors(candidate).polynomials) {
        const { quotient, multiplicity } = dividedOut(rest, factor.polynomial, effort);
        if (multiplicity === 0) continue;
        rest = quotient;
        split(factor.polynomial, multiplicity, found, effort);
      }
    }
    split(rest, 1, found, effort);
  }
  return { ...content, polynomials: found };
}

function dividedOut(
  p: SymbolicPolynomial,
  divisor: SymbolicPolynomial,
  effort: Effort,
): { readonly quotient: SymbolicPolynomial; readonly multiplicity: number } {
  let quotient = p;
  let multiplicity = 0;
  while (!isConstantPolynomial(quotient)) {
    const next = exactQuotient(quotient, divisor, effort);
    if (next === null) break;
    quotient = next;
    multiplicity++;
  }
  return { quotient, multiplicity };
}

/** Adds the factors of p ^ multiplicity, p of positive sign and content one, to a list. */
function split(p: SymbolicPolynomial, multiplicity: number, found: RepeatedFactor[], effort: Effort): void {
  if (isConstantPolynomial(p)) return;
  const degrees = degreesOf(p);
  if (degrees.every(degree => degree === 1) && isProvenIrreducible(p, effort)) {
    record(p, multiplicity, found);
    return;
  }
  for (const name of p.variables) {
    const shared = commonDivisorOfAll([...spreadIn(p, name).values()], effort);
    if (isConstantPolynomial(shared)) continue;
    split(shared, multiplicity, found, effort);
    split(withPositiveSign(knownQuotient(p, shared, effort)), multiplicity, found, effort);
    return;
  }
  const lowest = Math.min(...degrees);
  if (lowest === 1) {
    // Of degree one in a parameter and without a divisor free of it: irreducible.
    record(p, multiplicity, found);
    return;
  }
  for (const part of squareFreeFactors(p, p.variables[degrees.indexOf(lowest)]!, effort)) {
    record(part.polynomial, part.multiplicity * multiplicity, found);
  }
}

/** Yun's algorithm in one variable; p shares no divisor free of it. */
function squareFreeFactors(p: SymbolicPolynomial, name: string, effort: Effort): RepeatedFactor[] {
  const slope = derivative(p, name);
  const repeated = commonDivisor(p, slope, effort);
  if (isOnePolynomial(repeated)) return [{ polynomial: p, multiplicity: 1 }];
  const factors: RepeatedFactor[] = [];
  let simple = knownQuotient(p, repeated, effort);
  let rest = knownQuotient(slope, repeated, effort);
  for (let multiplicity = 1; !isConstantPolynomial(simple); multiplicity++) {
    const next = subtractPolynomials(rest, derivative(simple, name));
    const factor = commonDivisor(simple, next, effort);
    if (!isConstantPolynomial(factor)) factors.push({ polynomial: factor, multiplicity });
    simple = knownQuotient(simple, factor, effort);
    rest = knownQuotient(next, factor, effort);
  }
  return factors;
}

function derivative(p: SymbolicPolynomial, name: string): SymbolicPolynomial {
  const slope = new Map<number, SymbolicPolynomial>();
  for (const [exponent, coefficient] of spreadIn(p, name)) {
    if (exponent > 0) slope.set(exponent - 1, scalePolynomial(coefficient, BigInt(exponent)));
  }
  return collectIn(slope, name);
}

function record(polynomial: SymbolicPolynomial, multiplicity: number, found: RepeatedFactor[]): void {
  const at = found.findIndex(factor => equalPolynomials(factor.polynomial, polynomial));
  const present = found[at];
  if (present === undefined) found.push({ polynomial, multiplicity });
  else found[at] = { polynomial, multiplicity: present.multiplicity + multiplicity };
}

/** The factors of a function's denominator, numbers left out, each as a function of its own. */
export function denominatorFactors(
  { denominator }: RationalFunction,
  effort = new Effort(DEFAULT_LIMITS),
): RationalFunction[] {
  if (isConstantPolynomial(denominator)) return [];
  const outcome = withinEffort(() => factorsOf(denominator, [], effort));
  const { monomial, polynomials } = outcome.finished ? outcome.value : contentFactors(denominator);
  return [
    ...monomial.map(({ name }) => variablePolynomial(name)),
    ...polynomials.map(({ polynomial }) => polynomial),
  ].map(numerator => ({ numerator, denominator: ONE_POLYNOMIAL }));
}
