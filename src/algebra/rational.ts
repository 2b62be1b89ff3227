/**
 * Exact rational numbers. A decimal is read from its digits, never guessed from a JavaScript number; nothing here rounds
 * but `toDouble`, once, to the nearest double.
 */

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
  const divisor = greatestCommonDivisor(n < 0n ? -n : n, d < 0n ? -d : d);
  return d < 0n ? { n: -n / divisor, d: -d / divisor } : { n: n / divisor, d: d / divisor };
}

/** Greatest common divisor of two nonnegative integers, not both zero (Euclid). */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [x, y] = [a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

/** a + b. */
export function addRationals(a: Rational, b: Rational): Rational {
  if (a.d === 1n && b.d === 1n) return { n: a.n + b.n, d: 1n };
  return rational(a.n * b.d + b.n * a.d, a.d * b.d);
}

/** a − b. */
export function subtractRationals(a: Rational, b: Rational): Rational {
  if (a.d === 1n && b.d === 1n) return { n: a.n - b.n, d: 1n };
  return rational(a.n * b.d - b.n * a.d, a.d * b.d);
}

/** a · b. */
export function multiplyRationals(a: Rational, b: Rational): Rational {
  if (a.d === 1n && b.d === 1n) return { n: a.n * b.n, d: 1n };
  return rational(a.n * b.n, a.d * b.d);
}

/** a / b; b is not zero. */
export function divideRationals(a: Rational, b: Rational): Rational {
  return rational(a.n * b.d, a.d * b.n);
}

/** −a. */
export function negateRational(a: Rational): Rational {
  return { n: -a.n, d: a.d };
}

/** Negative, zero or positive as a is less than, equal to or greater than b. */
export function compareRationals(a: Rational, b: Rational): number {
  const difference = a.n * b.d - b.n * a.d;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}
