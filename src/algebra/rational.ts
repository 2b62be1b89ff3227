/**
 * Exact rational numbers and their arithmetic. Nothing here rounds. Stands on whole numbers; fields, polynomials and the
 * derivation of a drawing stand on it, so the shapes that drawings are full of (0, ±1, whole numbers) take short ways.
 */

import { absolute, greatestCommonDivisor } from './integer.ts';

/** n / d in lowest terms, d > 0. */
export interface Rational {
  readonly n: bigint;
  readonly d: bigint;
}

export const ZERO: Rational = { n: 0n, d: 1n };
export const ONE: Rational = { n: 1n, d: 1n };

/** n / d brought to lowest terms; d is not zero. */
export function rational(n: bigint, d: bigint = 1n): Rational {
  if (d === 1n) return { n, d };
  if (d === 0n) throw new RangeError('a rational with denominator zero');
  const divisor = greatestCommonDivisor(absolute(n), absolute(d));
  if (divisor === 1n) return d < 0n ? { n: -n, d: -d } : { n, d };
  return d < 0n ? { n: -n / divisor, d: -d / divisor } : { n: n / divisor, d: d / divisor };
}

/**
 * n / d in lowest terms where d is positive, long, and every prime factor of it divides `base`: common factors are taken out by
 * remainders modulo the short `base`, which is faster than a gcd of two long numbers.
 */
export function rationalOver(n: bigint, d: bigint, base: bigint): Rational {
  if (n === 0n) return ZERO;
  let [rest, left] = [n, d];
  while (left !== 1n) {
    const common = greatestCommonDivisor(base, absolute(rest % base));
    const shared = common === 1n ? 1n : greatestCommonDivisor(common, left % common);
    // A prime that divides both divides `base`, and so `shared`.
    if (shared === 1n) break;
    rest /= shared;
    left /= shared;
  }
  return { n: rest, d: left };
}

/** a + b. Common denominators are found first, so that the gcds stay short (Henrici 1956, J. ACM 3). */
export function addRationals(a: Rational, b: Rational): Rational {
  if (a.n === 0n) return b;
  if (b.n === 0n) return a;
  return sum(a.n, a.d, b.n, b.d);
}

/** a − b. */
export function subtractRationals(a: Rational, b: Rational): Rational {
  if (b.n === 0n) return a;
  return sum(a.n, a.d, -b.n, b.d);
}

function sum(an: bigint, ad: bigint, bn: bigint, bd: bigint): Rational {
  if (ad === bd) return ad === 1n ? { n: an + bn, d: 1n } : rational(an + bn, ad);
  // a + p/q with whole a is in lowest terms when p/q is.
  if (ad === 1n) return { n: an * bd + bn, d: bd };
  if (bd === 1n) return { n: an + bn * ad, d: ad };
  const common = greatestCommonDivisor(ad, bd);
  if (common === 1n) return { n: an * bd + bn * ad, d: ad * bd };
  const left = ad / common;
  const n = an * (bd / common) + bn * left;
  // Only factors of `common` can be left to cancel.
  const rest = greatestCommonDivisor(absolute(n), common);
  return rest === 1n ? { n, d: left * bd } : { n: n / rest, d: left * (bd / rest) };
}

/** a · b. Factors are cancelled crosswise before the products are made. */
export function multiplyRationals(a: Rational, b: Rational): Rational {
  return product(a.n, a.d, b.n, b.d);
}

/** a / b; b is not zero. */
export function divideRationals(a: Rational, b: Rational): Rational {
  if (b.n > 0n) return product(a.n, a.d, b.d, b.n);
  if (b.n === 0n) throw new RangeError('a division of a rational by zero');
  return product(-a.n, a.d, b.d, -b.n);
}

function product(an: bigint, ad: bigint, bn: bigint, bd: bigint): Rational {
  if (an === 0n || bn === 0n) return ZERO;
  const left = bd === 1n ? 1n : greatestCommonDivisor(bd, absolute(an));
  const right = ad === 1n ? 1n : greatestCommonDivisor(ad, absolute(bn));
  const n = (left === 1n ? an : an / left) * (right === 1n ? bn : bn / right);
  const d = (right === 1n ? ad : ad / right) * (left === 1n ? bd : bd / left);
  return { n, d };
}

/** −a. */
export function negateRational(a: Rational): Rational {
  return { n: -a.n, d: a.d };
}

/** Negative, zero or positive as a is less than, equal to or greater than b. */
export function compareRationals(a: Rational, b: Rational): number {
  const left = a.n * b.d;
  const right = b.n * a.d;
  return left < right ? -1 : left > right ? 1 : 0;
}
