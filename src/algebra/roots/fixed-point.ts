/**
 * A polynomial and its slope at a point, in whole numbers that stand for multiples of 2⁻ᴾ, with bounds on every rounding:
 * the ground under the certificate of a root. The variable is scaled by a power of two so that the point lies in the unit
 * disc and the largest coefficient is about one.
 */

import { bitLength } from '../integer.ts';
import type { IntegerPolynomial } from '../integer-polynomial.ts';

/** (x + i·y) · 2^(exponent − bits), |x + i·y| ≤ 2^bits. */
export interface FixedPoint {
  readonly x: bigint;
  readonly y: bigint;
  readonly exponent: number;
  readonly bits: number;
}

/** f and f′ at a point, all in units of 2⁻ᴾ, with bounds on their errors in the same units. */
export interface FixedValue {
  readonly re: bigint;
  readonly im: bigint;
  readonly slopeRe: bigint;
  readonly slopeIm: bigint;
  readonly error: number;
  readonly slopeError: number;
}

/** The coefficients of f in w = s / 2^exponent, descending, floors of multiples of 2^−bits, the largest between ½ and 1. */
export function fixedCoefficients(f: IntegerPolynomial, exponent: number, bits: number): readonly bigint[] {
  const n = f.length - 1;
  let top = Number.NEGATIVE_INFINITY;
  f.forEach((c, j) => {
    if (c !== 0n) top = Math.max(top, bitLength(c) + exponent * (n - j));
  });
  return f.map((c, j) => {
    const shift = exponent * (n - j) + bits - top;
    return shift >= 0 ? c << BigInt(shift) : c >> BigInt(-shift);
  });
}

/**
 * Value and slope at the real x / 2^bits, |x| ≤ 2^bits, by Horner's scheme. Each of the n + 1 coefficients carries less than
 * one unit from its own floor and one from the step that follows; on |w| ≤ 1 such an error adds at most itself to the value
 * and its power to the slope, and each step of the slope adds one unit more.
 */
export function evaluateAtReal(coefficients: readonly bigint[], x: bigint, bits: number): FixedValue {
  const n = coefficients.length - 1;
  const shift = BigInt(bits);
  let value = coefficients[0]!;
  let slope = 0n;
  for (let j = 1; j <= n; j++) {
    slope = ((slope * x) >> shift) + value;
    value = ((value * x) >> shift) + coefficients[j]!;
  }
  return { re: value, im: 0n, slopeRe: slope, slopeIm: 0n, error: 2 * (n + 1), slopeError: n * (n + 1) + n };
}

/** Bits that the modulus squared has beyond the others, so that its own rounding is nothing beside theirs up to degree 10,000. */
const GUARD_BITS = 64;

/**
 * Value and slope at (x + i·y) / 2^bits in the unit disc, by division by the real quadratic w² − tw + q that has the point and
 * its conjugate as roots: two real products a coefficient in place of four (Bairstow 1914). An error in step j of the first
 * division is the same as one in coefficient j, which gives the bounds of the real case with one unit more a coefficient for
 * the guard bits; the second division's errors count with 2|y| ≤ 2.
 */
export function evaluateAtComplex(coefficients: readonly bigint[], x: bigint, y: bigint, bits: number): FixedValue {
  const n = coefficients.length - 1;
  const shift = BigInt(bits);
  const guard = BigInt(GUARD_BITS);
  const wide = shift + guard;
  const t = x << (guard + 1n);
  const q =
    bits > GUARD_BITS ? (x * x + y * y) >> BigInt(bits - GUARD_BITS) : (x * x + y * y) << BigInt(GUARD_BITS - bits);
  // b: quotient of f by the quadratic; d: quotient of that quotient.
  let [b1, b2, d1, d2] = [0n, 0n, 0n, 0n];
  for (let j = 0; j <= n - 2; j++) {
    const b = ((t * b1 - q * b2) >> wide) + coefficients[j]!;
    [b1, b2] = [b, b1];
    if (j === n - 2) break;
    const d = ((t * d1 - q * d2) >> wide) + b;
    [d1, d2] = [d, d1];
  }
  // Now b1 = b[n − 2], b2 = b[n − 3], d1 = d[n − 3], d2 = d[n − 4]; the remainder is linear.
  const linear = ((t * b1 - q * b2) >> wide) + coefficients[n - 1]!;
  const re = ((linear * x) >> shift) + coefficients[n]! - ((q * b1) >> wide);
  const im = (linear * y) >> shift;
  const quotientRe = ((d1 * x) >> shift) + b1 - ((q * d2) >> wide);
  const quotientIm = (d1 * y) >> shift;
  // f′(w) = 2iy Q(w) + linear.
  const slopeRe = linear - ((quotientIm * y) >> (shift - 1n));
  const slopeIm = (quotientRe * y) >> (shift - 1n);
  const error = 3 * (n + 1) + 3;
  return { re, im, slopeRe, slopeIm, error, slopeError: 1.5 * n * (n + 1) + 6 * (n + 1) + 6 };
}
