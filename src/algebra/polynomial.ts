/**
 * Polynomials in one variable over the rationals: ring operations, division, value and derivative. Stands on rationals;
 * products and sums of many terms go through whole numbers over one denominator, which saves most gcds.
 */

import { greatestCommonDivisor } from './integer.ts';
import {
  addRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  type Rational,
  rational,
  subtractRationals,
  ZERO,
} from './rational.ts';

/** Coefficients in descending powers, the first not zero; the zero polynomial is empty. */
export type Polynomial = readonly Rational[];

/** The polynomial with these coefficients (descending powers), leading zeros dropped. */
export function polynomial(coefficients: readonly Rational[]): Polynomial {
  const first = coefficients.findIndex(({ n }) => n !== 0n);
  return first < 0 ? [] : first === 0 ? coefficients : coefficients.slice(first);
}

/** p + q. */
export function addPolynomials(p: Polynomial, q: Polynomial): Polynomial {
  return combine(p, q, addRationals);
}

/** p − q. */
export function subtractPolynomials(p: Polynomial, q: Polynomial): Polynomial {
  return combine(p, q, subtractRationals);
}

function combine(p: Polynomial, q: Polynomial, operation: (a: Rational, b: Rational) => Rational): Polynomial {
  const length = Math.max(p.length, q.length);
  const sums = Array.from({ length }, (_, i) =>
    operation(p[i - length + p.length] ?? ZERO, q[i - length + q.length] ?? ZERO),
  );
  return polynomial(sums);
}

/** c · p. */
export function scalePolynomial(c: Rational, p: Polynomial): Polynomial {
  return c.n === 0n ? [] : p.map(coefficient => multiplyRationals(c, coefficient));
}

/** p · q. O(deg p · deg q). */
export function multiplyPolynomials(p: Polynomial, q: Polynomial): Polynomial {
  return productOfPolynomials([p, q]);
}

/** The product of all factors, 1 for none; brought to lowest terms once, at the end. O(degree²). */
export function productOfPolynomials(factors: readonly Polynomial[]): Polynomial {
  if (factors.some(factor => factor.length === 0)) return [];
  const proper = factors.filter(factor => !isOne(factor));
  if (proper.length === 1) return proper[0]!;
  let product: readonly bigint[] = [1n];
  let scale = 1n;
  for (const factor of proper) {
    const { numerators, denominator } = overOneDenominator(factor);
    product = multiplyIntegers(product, numerators);
    scale *= denominator;
  }
  return product.map(coefficient => rational(coefficient, scale));
}

function isOne(p: Polynomial): boolean {
  return p.length === 1 && p[0]!.n === 1n && p[0]!.d === 1n;
}

function multiplyIntegers(f: readonly bigint[], g: readonly bigint[]): bigint[] {
  const sums = new Array<bigint>(f.length + g.length - 1).fill(0n);
  f.forEach((a, i) => {
    if (a === 0n) return;
    for (let j = 0; j < g.length; j++) if (g[j] !== 0n) sums[i + j] = sums[i + j]! + a * g[j]!;
  });
  return sums;
}

/** Numerators of the coefficients over their least common denominator, which is positive. */
export function overOneDenominator(p: readonly Rational[]): {
  readonly numerators: readonly bigint[];
  readonly denominator: bigint;
} {
  let denominator = 1n;
  for (const { d } of p) {
    if (d !== 1n && denominator % d !== 0n) denominator *= d / greatestCommonDivisor(denominator, d);
  }
  if (denominator === 1n) return { numerators: p.map(({ n }) => n), denominator };
  return { numerators: p.map(({ n, d }) => (n === 0n ? 0n : n * (denominator / d))), denominator };
}

/** Quotient and remainder of p by q, deg remainder < deg q; q is not zero. */
export function dividePolynomials(
  p: Polynomial,
  q: Polynomial,
): { readonly quotient: Polynomial; readonly remainder: Polynomial } {
  const [leading] = q;
  if (leading === undefined) throw new RangeError('a division of a polynomial by zero');
  const rest = [...p];
  const steps = p.length - q.length + 1;
  const quotient: Rational[] = [];
  for (let i = 0; i < steps; i++) {
    const head = rest[i] ?? ZERO;
    const factor = head.n === 0n ? ZERO : divideRationals(head, leading);
    quotient.push(factor);
    if (factor.n === 0n) continue;
    for (let j = 1; j < q.length; j++) {
      rest[i + j] = subtractRationals(rest[i + j] ?? ZERO, multiplyRationals(factor, q[j] ?? ZERO));
    }
  }
  return { quotient, remainder: polynomial(rest.slice(Math.max(0, steps))) };
}

/** p divided by its leading coefficient; the zero polynomial stays. */
export function monic(p: Polynomial): Polynomial {
  const [leading] = p;
  if (leading === undefined || (leading.n === 1n && leading.d === 1n)) return p;
  return p.map(coefficient => divideRationals(coefficient, leading));
}

/** dp/ds. */
export function derivative(p: Polynomial): Polynomial {
  const degree = p.length - 1;
  return p.slice(0, -1).map(({ n, d }, i) => rational(n * BigInt(degree - i), d));
}

/** p(x) (Horner 1819). */
export function evaluatePolynomialAt(p: Polynomial, x: Rational): Rational {
  let value = ZERO;
  for (const coefficient of p) value = addRationals(multiplyRationals(value, x), coefficient);
  return value;
}

/** p(−s). */
export function reflectPolynomial(p: Polynomial): Polynomial {
  return p.map((coefficient, i) => ((p.length - 1 - i) % 2 === 0 ? coefficient : negateRational(coefficient)));
}
