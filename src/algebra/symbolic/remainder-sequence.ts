/**
 * The last resort of the common divisor: a polynomial remainder sequence in one variable, its coefficients polynomials in
 * the others. Divisors of these are found by the function that is handed in.
 */

import { collectIn, spreadIn } from './coefficients.ts';
import { exactQuotient, knownQuotient } from './divide.ts';
import type { Effort } from './effort.ts';
import { differenceOfProducts, multiplyPolynomials, powerOfPolynomial } from './multiply.ts';
import {
  degreesOf,
  isOnePolynomial,
  isZeroPolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  ZERO_POLYNOMIAL,
} from './polynomial.ts';

/** The greatest common divisor of a list, of polynomials with fewer variables than those in hand. */
export type DivisorOfAll = (list: readonly SymbolicPolynomial[], effort: Effort) => SymbolicPolynomial;

/** Coefficients of the ascending powers of the main variable; the last is not zero. */
type Univariate = readonly SymbolicPolynomial[];

/**
 * A greatest common divisor, up to sign, of a and b, which hold the same variables.
 *
 * @param bounds  upper bounds of the divisor's degree in each variable, all positive.
 * Subresultant sequence (Collins, J. ACM 14, 1967; Brown & Traub, J. ACM 18, 1971) in the variable of the lowest bound.
 */
export function divisorByRemainders(
  a: SymbolicPolynomial,
  b: SymbolicPolynomial,
  bounds: readonly number[],
  divisorOfAll: DivisorOfAll,
  effort: Effort,
): SymbolicPolynomial {
  const main = mainVariable(a, b, bounds);
  const name = a.variables[main]!;
  const left = primitivePart(univariate(a, name, effort), divisorOfAll, effort);
  const right = primitivePart(univariate(b, name, effort), divisorOfAll, effort);
  const content = divisorOfAll([left.content, right.content], effort);
  const divisor = primitiveDivisor(left.part, right.part, { name, bound: bounds[main]!, divisorOfAll }, effort);
  return isOnePolynomial(content) ? divisor : multiplyPolynomials(content, divisor, effort);
}

/** The variable of the lowest bound, then of the lowest degrees; the first of several. */
function mainVariable(a: SymbolicPolynomial, b: SymbolicPolynomial, bounds: readonly number[]): number {
  const degreesA = degreesOf(a);
  const degreesB = degreesOf(b);
  let main = 0;
  for (let v = 1; v < bounds.length; v++) {
    const difference = bounds[v]! - bounds[main]! || degreesA[v]! + degreesB[v]! - degreesA[main]! - degreesB[main]!;
    if (difference < 0) main = v;
  }
  return main;
}

interface MainVariable {
  readonly name: string;
  /** Upper bound of the divisor's degree in it. */
  readonly bound: number;
  readonly divisorOfAll: DivisorOfAll;
}

/** The divisor of two primitive polynomials; the sequence is left as soon as a remainder of low enough degree divides both. */
function primitiveDivisor(
  a: Univariate,
  b: Univariate,
  { name, bound, divisorOfAll }: MainVariable,
  effort: Effort,
): SymbolicPolynomial {
  const wholes = [collect(a, name), collect(b, name)];
  // The leading coefficient of the divisor divides this.
  const lead = divisorOfAll([a.at(-1)!, b.at(-1)!], effort);
  let [high, low] = a.length < b.length ? [b, a] : [a, b];
  let scale = ONE_POLYNOMIAL;
  let height = ONE_POLYNOMIAL;
  while (low.length > 1) {
    const guess = low.length - 1 > bound ? null : scaledToLead(low, lead, effort);
    if (guess !== null) {
      const candidate = collect(primitivePart(guess, divisorOfAll, effort).part, name);
      if (wholes.every(whole => exactQuotient(whole, candidate, effort) !== null)) return candidate;
    }
    const gap = high.length - low.length;
    const remainder = pseudoRemainder(high, low, effort);
    // The bound holds, so a remainder of zero has been met by the candidate before.
    if (remainder.length === 0) throw new Error('a remainder sequence ended without its divisor');
    const divisor = multiplyPolynomials(scale, powerOfPolynomial(height, gap, effort), effort);
    high = low;
    low = remainder.map(coefficient => knownQuotient(coefficient, divisor, effort));
    scale = high.at(-1)!;
    height = nextHeight(scale, height, gap, effort);
  }
  return ONE_POLYNOMIAL;
}

/** scale^gap / height^(gap − 1), which is a polynomial. */
function nextHeight(
  scale: SymbolicPolynomial,
  height: SymbolicPolynomial,
  gap: number,
  effort: Effort,
): SymbolicPolynomial {
  if (gap === 0) return height;
  const power = powerOfPolynomial(scale, gap, effort);
  return knownQuotient(power, powerOfPolynomial(height, gap - 1, effort), effort);
}

/**
 * p · lead over its own leading coefficient: where p is a multiple of the divisor by a polynomial in the other variables,
 * this is a smaller one, since the divisor's leading coefficient divides `lead`. Null where the quotient is not exact.
 */
function scaledToLead(p: Univariate, lead: SymbolicPolynomial, effort: Effort): Univariate | null {
  const own = p.at(-1)!;
  const scaled: SymbolicPolynomial[] = [];
  for (const coefficient of p) {
    const quotient = exactQuotient(multiplyPolynomials(coefficient, lead, effort), own, effort);
    if (quotient === null) return null;
    scaled.push(quotient);
  }
  return scaled;
}

/** The remainder of lead(low) ^ (deg high − deg low + 1) · high by low. */
function pseudoRemainder(high: Univariate, low: Univariate, effort: Effort): Univariate {
  const rest = [...high];
  const lead = low.at(-1)!;
  let steps = high.length - low.length + 1;
  while (rest.length >= low.length) {
    const shift = rest.length - low.length;
    const top = rest.pop()!;
    for (let k = 0; k < rest.length; k++) {
      const subtrahend = k < shift ? ZERO_POLYNOMIAL : low[k - shift]!;
      rest[k] = differenceOfProducts(lead, rest[k]!, top, subtrahend, effort);
    }
    steps--;
    while (rest.length > 0 && isZeroPolynomial(rest.at(-1)!)) rest.pop();
  }
  if (steps === 0) return rest;
  const missing = powerOfPolynomial(lead, steps, effort);
  return rest.map(coefficient => multiplyPolynomials(coefficient, missing, effort));
}

function primitivePart(
  p: Univariate,
  divisorOfAll: DivisorOfAll,
  effort: Effort,
): { readonly content: SymbolicPolynomial; readonly part: Univariate } {
  const content = divisorOfAll(
    p.filter(coefficient => !isZeroPolynomial(coefficient)),
    effort,
  );
  return { content, part: p.map(coefficient => knownQuotient(coefficient, content, effort)) };
}

function univariate(p: SymbolicPolynomial, name: string, effort: Effort): Univariate {
  const spread = spreadIn(p, name);
  const degree = Math.max(...spread.keys());
  effort.spend(degree);
  return Array.from({ length: degree + 1 }, (_, exponent) => spread.get(exponent) ?? ZERO_POLYNOMIAL);
}

function collect(p: Univariate, name: string): SymbolicPolynomial {
  const parts = new Map<number, SymbolicPolynomial>();
  p.forEach((coefficient, exponent) => {
    if (!isZeroPolynomial(coefficient)) parts.set(exponent, coefficient);
  });
  return collectIn(parts, name);
}
