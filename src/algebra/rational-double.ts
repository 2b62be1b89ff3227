/**
 * Between rationals and doubles: exact on the way in, rounded once on the way out. The only place of the exact room where
 * a value is rounded to be shown.
 */

import { bitLength, exponentOf } from './integer.ts';
import { type Rational, ZERO } from './rational.ts';

/** Whole numbers up to 2⁵³ are doubles (IEEE 754 binary64 has 53 bits). */
const LARGEST_EXACT = 9007199254740992n;

/** 2⁻¹⁰⁷⁴ is the spacing of the subnormal doubles, 2⁻¹⁰²² the least normal one. */
const SUBNORMAL_EXPONENT = -1074;

/** Bits of the quotient beyond which only "is anything left" matters: 53 and the rounding bit, with room for the estimate. */
const QUOTIENT_BITS = 58;

/** The nearest double, ties to even, subnormals included; ±Infinity from 2¹⁰²⁴ − 2⁹⁷⁰ on, as IEEE 754 rounds; never −0. */
export function toDouble(value: Rational): number {
  const { n, d } = value;
  if (n <= LARGEST_EXACT && n >= -LARGEST_EXACT && d <= LARGEST_EXACT) return Number(n) / Number(d);
  if (d === 1n) return Number(n);
  return n < 0n ? 0 - positiveQuotient(-n, d) : positiveQuotient(n, d);
}

/** n / d rounded; both positive. */
function positiveQuotient(n: bigint, d: bigint): number {
  // The unit of the quotient, 2^unit, gives it QUOTIENT_BITS bits or one more, but is never finer than a subnormal's.
  const wanted = bitLength(n) - bitLength(d) - QUOTIENT_BITS;
  const isSubnormal = wanted + QUOTIENT_BITS <= SUBNORMAL_EXPONENT + 52;
  // Two bits below the last subnormal bit: the rounding bit and the sticky bit.
  const unit = isSubnormal ? SUBNORMAL_EXPONENT - 2 : wanted;
  const numerator = unit < 0 ? n << BigInt(-unit) : n;
  const denominator = unit > 0 ? d << BigInt(unit) : d;
  const quotient = numerator / denominator;
  const isInexact = quotient * denominator !== numerator;
  if (!isSubnormal) return scale(Number(isInexact ? quotient | 1n : quotient), unit);
  return roundQuarters(quotient, isInexact) * 2 ** SUBNORMAL_EXPONENT;
}

/** quotient / 4 (with something left below it where `isInexact`) to the nearest whole number, ties to even. */
function roundQuarters(quotient: bigint, isInexact: boolean): number {
  const whole = quotient >> 2n;
  const rest = quotient & 3n;
  const isAbove = rest === 3n || (rest === 2n && (isInexact || (whole & 1n) === 1n));
  return Number(isAbove ? whole + 1n : whole);
}

/** x · 2^power for a normal result or overflow; in two steps, since 2^power alone may leave the range of doubles. */
function scale(x: number, power: number): number {
  const half = Math.trunc(power / 2);
  return x * 2 ** half * 2 ** (power - half);
}

/** Results and numerators within 2^±1000 need no care for the ends of the range. */
const SAFE_BITS = 1000;

/** The nearest double of n · 2^exponent, as `toDouble` rounds; quicker, since a whole number rounds by itself. */
export function dyadicToDouble(n: bigint, exponent: number): number {
  const size = bitLength(n);
  if (size < SAFE_BITS && Math.abs(size + exponent) < SAFE_BITS) return scale(Number(n), exponent);
  return toDouble(exponent < 0 ? { n, d: 1n << BigInt(-exponent) } : { n: n << BigInt(exponent), d: 1n });
}

/** The exact value of a finite double. */
export function rationalFromDouble(x: number): Rational {
  if (!Number.isFinite(x)) throw new RangeError(`no rational equals ${x}`);
  if (x === 0) return ZERO;
  if (Number.isInteger(x)) return { n: BigInt(x), d: 1n };
  // Below one in magnitude or with a fraction: a whole multiple of 2^(exponent − 52), 2⁻¹⁰⁷⁴ at the least.
  let power = Math.min(-SUBNORMAL_EXPONENT, 52 - exponentOf(x));
  let scaled = scale(x, power);
  const trailing = trailingZeros(scaled);
  scaled /= 2 ** trailing;
  power -= trailing;
  return { n: BigInt(scaled), d: 1n << BigInt(power) };
}

/** How often two divides a nonzero whole number below 2⁵³. */
function trailingZeros(x: number): number {
  const low = (x % 4294967296) | 0;
  if (low !== 0) return 31 - Math.clz32(low & -low);
  const high = Math.trunc(x / 4294967296) | 0;
  return 32 + 31 - Math.clz32(high & -high);
}
