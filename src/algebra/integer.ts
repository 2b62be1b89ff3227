/**
 * Whole numbers of any size: greatest common divisor and length in bits. The lowest step of the exact room; rationals,
 * polynomials and the refinement of roots stand on it.
 */

/** Greatest common divisor of two nonnegative integers; gcd(0, 0) = 0 (Euclid; V8's own remainder beats a detour by doubles). */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let x = a;
  let y = b;
  while (y !== 0n) {
    const remainder = x % y;
    x = y;
    y = remainder;
  }
  return x;
}

/** |x|. */
export function absolute(x: bigint): bigint {
  return x < 0n ? -x : x;
}

const view = new DataView(new ArrayBuffer(8));

/** The unbiased exponent of a finite normal double: floor(log₂ |x|). */
export function exponentOf(x: number): number {
  view.setFloat64(0, x);
  return ((view.getUint32(0) >>> 20) & 0x7ff) - 1023;
}

/** Bits of |x|: the least k with |x| < 2ᵏ; 0 for 0. */
export function bitLength(x: bigint): number {
  if (x === 0n) return 0;
  const magnitude = x < 0n ? -x : x;
  const approximate = Number(magnitude);
  if (approximate === Number.POSITIVE_INFINITY) {
    const digits = magnitude.toString(16);
    return 4 * digits.length + 28 - Math.clz32(Number.parseInt(digits.charAt(0), 16));
  }
  const length = exponentOf(approximate) + 1;
  // Rounding to a double may have carried |x| up to the power of two above it.
  return length > 53 && magnitude >> BigInt(length - 1) === 0n ? length - 1 : length;
}
