/**
 * A quick look at a common divisor before the dear search for it: every variable in turn is kept, the others are put at
 * fixed points modulo a prime, and the divisor of the two images bounds the degree of the true one (Brown, J. ACM 18,
 * 1971). All bounds zero proves two polynomials coprime. A bound is never too low: an image counts only where a leading
 * coefficient has survived.
 */

import { type AlignedTerms, alignTo, degreesOver } from './alignment.ts';
import type { Effort } from './effort.ts';
import type { SymbolicPolynomial } from './polynomial.ts';

/** The largest prime below 2²⁶: products of two residues are exact doubles. */
const PROBE_PRIME = 67108859;
const PROBE_PRIME_INTEGER = 67108859n;
const PRIME_INVERSE = 1 / PROBE_PRIME;

/** A term is put at its points for about this many variables in the time of a product of two terms. */
const VARIABLES_AN_OPERATION = 16;

/** Points tried where both leading coefficients vanish; each misses with a chance of some degree/2²⁶. */
const ATTEMPTS = 3;

/**
 * A linear congruential generator modulo 2³² of full period: the increment is odd and the multiplier one more than a
 * multiple of four (Hull & Dobell, SIAM Review 4, 1962).
 */
const GENERATOR = { multiplier: 1664525, increment: 1013904223 } as const;

/** a · b modulo the prime; both reduced. */
function times(a: number, b: number): number {
  const product = a * b;
  // The quotient may be off by one, never by more.
  const rest = product - Math.floor(product * PRIME_INVERSE) * PROBE_PRIME;
  return rest < 0 ? rest + PROBE_PRIME : rest >= PROBE_PRIME ? rest - PROBE_PRIME : rest;
}

/** a + b modulo the prime; the sum below twice the prime. */
function plus(a: number, b: number): number {
  const sum = a + b;
  return sum >= PROBE_PRIME ? sum - PROBE_PRIME : sum;
}

/** a^exponent modulo the prime. */
function power(a: number, exponent: number): number {
  if (exponent === 1) return a;
  let result = 1;
  let square = a;
  for (let rest = exponent; rest > 0; rest = Math.floor(rest / 2)) {
    if (rest % 2 === 1) result = times(result, square);
    if (rest > 1) square = times(square, square);
  }
  return result;
}

function inverse(a: number): number {
  return power(a, PROBE_PRIME - 2);
}

function residue(value: bigint): number {
  // Most coefficients are short, and a double spares the division of whole numbers.
  const short = Number(value);
  const rest = Math.abs(short) < PROBE_PRIME ? short : Number(value % PROBE_PRIME_INTEGER);
  return rest < 0 ? rest + PROBE_PRIME : rest;
}

/** `count` points from 1 to the prime less one, the same ones for the same attempt. */
function pointsOf(count: number, attempt: number): number[] {
  let state = attempt + 1;
  return Array.from({ length: count }, () => {
    state = (Math.imul(state, GENERATOR.multiplier) + GENERATOR.increment) >>> 0;
    return 1 + (state % (PROBE_PRIME - 1));
  });
}

/** Upper bounds of the degrees of a common divisor with one polynomial, for one other after the other. */
export type DegreeBounds = (other: SymbolicPolynomial) => number[];

/**
 * Upper bounds of the degree that a common divisor of p and another has in each of `variables`, which hold those of both.
 * The images of p are made once and serve for all the others.
 *
 * @returns one bound a variable. Linear in the terms but for Euclid's algorithm on the images.
 */
export function divisorDegreeBounds(p: SymbolicPolynomial, variables: readonly string[], effort: Effort): DegreeBounds {
  const terms = alignTo(p, variables);
  const degrees = degreesOver(p, variables);
  const everyVariable = variables.map((_, v) => v);
  const images: number[][][] = [];
  return other => {
    const otherTerms = alignTo(other, variables);
    const otherDegrees = degreesOver(other, variables);
    const bounds = degrees.map((degree, v) => Math.min(degree, otherDegrees[v]!));
    let open = everyVariable.filter(v => bounds[v]! > 0);
    for (let attempt = 0; attempt < ATTEMPTS && open.length > 0; attempt++) {
      const points = pointsOf(variables.length, attempt);
      images[attempt] ??= imagesAt(terms, degrees, points, everyVariable, effort);
      const otherImages = imagesAt(otherTerms, otherDegrees, points, open, effort);
      open = open.filter((v, k) => {
        const image = images[attempt]![v]!;
        const otherImage = otherImages[k]!;
        if (image.at(-1) === 0 && otherImage.at(-1) === 0) return true;
        bounds[v] = Math.min(bounds[v]!, divisorDegree(image, otherImage, effort));
        return false;
      });
    }
    return bounds;
  };
}

/** For each of the variables `kept` (positions) the coefficients, ascending, of p with all the others at their points. */
function imagesAt(
  p: AlignedTerms,
  degrees: readonly number[],
  points: readonly number[],
  kept: readonly number[],
  effort: Effort,
): number[][] {
  const n = degrees.length;
  const length = kept.reduce((sum, v) => sum + degrees[v]!, p.coefficients.length);
  effort.spend(Math.ceil((length * n) / VARIABLES_AN_OPERATION));
  const inverses = kept.map(v => inverse(points[v]!));
  const images = kept.map(v => new Array<number>(degrees[v]! + 1).fill(0));
  let total = 0;
  for (let t = 0; t < p.coefficients.length; t++) {
    let value = residue(p.coefficients[t]!);
    for (let v = 0; v < n; v++) {
      const exponent = p.exponents[t * n + v]!;
      if (exponent > 0) value = times(value, power(points[v]!, exponent));
    }
    total = plus(total, value);
    // What holds the kept variable moves from the power 0, where all terms are counted, to its own.
    for (let k = 0; k < kept.length; k++) {
      const exponent = p.exponents[t * n + kept[k]!]!;
      if (exponent === 0) continue;
      const image = images[k]!;
      image[exponent] = plus(image[exponent]!, times(value, power(inverses[k]!, exponent)));
      image[0] = plus(image[0]!, PROBE_PRIME - value);
    }
  }
  for (const image of images) image[0] = plus(image[0]!, total);
  return images;
}

/**
 * Whether p, in which no exponent is above one and that no number or variable divides, is proven irreducible by one look.
 *
 * Factors of such a polynomial share no variable, so where x and y are in different ones, the sum of all terms times that
 * of those with x and y equals the product of those with x and those with y, at any point (Shpilka & Volkovich, ICALP
 * 2010). That it does not for the first variable against every other proves that they are all in one factor.
 */
export function isProvenIrreducible(p: SymbolicPolynomial, effort: Effort): boolean {
  const n = p.variables.length;
  effort.spend(Math.ceil((p.coefficients.length * n) / VARIABLES_AN_OPERATION));
  const points = pointsOf(n, 0);
  const withVariable = new Array<number>(n).fill(0);
  const withFirstAnd = new Array<number>(n).fill(0);
  let total = 0;
  for (let t = 0; t < p.coefficients.length; t++) {
    let value = residue(p.coefficients[t]!);
    for (let v = 0; v < n; v++) if (p.exponents[t * n + v] === 1) value = times(value, points[v]!);
    total = plus(total, value);
    const hasFirst = p.exponents[t * n] === 1;
    for (let v = 0; v < n; v++) {
      if (p.exponents[t * n + v] !== 1) continue;
      withVariable[v] = plus(withVariable[v]!, value);
      if (hasFirst) withFirstAnd[v] = plus(withFirstAnd[v]!, value);
    }
  }
  for (let v = 1; v < n; v++) {
    if (times(total, withFirstAnd[v]!) === times(withVariable[0]!, withVariable[v]!)) return false;
  }
  return true;
}

/** Degree of the greatest common divisor modulo the prime of two coefficient lists, not both zero (Euclid). */
function divisorDegree(a: readonly number[], b: readonly number[], effort: Effort): number {
  let high = withoutLeadingZeros([...a]);
  let low = withoutLeadingZeros([...b]);
  while (low.length > 0) {
    effort.spend(low.length * Math.max(1, high.length - low.length + 1));
    reduce(high, low);
    [high, low] = [low, high];
  }
  return high.length - 1;
}

/** Leaves the remainder of `high` by `low` in `high`. */
function reduce(high: number[], low: readonly number[]): void {
  const leadInverse = inverse(low.at(-1)!);
  while (high.length >= low.length) {
    const factor = times(high.at(-1)!, leadInverse);
    const shift = high.length - low.length;
    for (let k = 0; k < low.length; k++) {
      const rest = high[shift + k]! - times(factor, low[k]!);
      high[shift + k] = rest < 0 ? rest + PROBE_PRIME : rest;
    }
    withoutLeadingZeros(high);
  }
}

function withoutLeadingZeros(list: number[]): number[] {
  while (list.length > 0 && list.at(-1) === 0) list.pop();
  return list;
}
