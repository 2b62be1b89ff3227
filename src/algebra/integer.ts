/**
 * Whole numbers of any size: greatest common divisor and length in bits. The lowest step of the exact room; rationals,
 * polynomials and the refinement of roots stand on it.
 */

/** Two numbers of at most this many bits go by plain remainders, which is the faster way there (measured: 64 to 10,000 bits). */
const LONG = 2n ** 64n;

/** Greatest common divisor of two nonnegative integers; gcd(0, 0) = 0 (Euclid; long numbers by Lehmer 1938). */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let x = a;
  let y = b;
  if (x > LONG && y > LONG) [x, y] = shortenedPair(x, y);
  while (y !== 0n) {
    const remainder = x % y;
    x = y;
    y = remainder;
  }
  return x;
}

/** Leading bits on which the quotients of several steps are found at once: cofactors and sums stay below 2⁵³. */
const LEADING_BITS = 51;

/**
 * A pair with the same gcd whose smaller number is at most `LONG` (Lehmer 1938, Amer. Math. Monthly 45, as algorithm L of
 * Knuth, The Art of Computer Programming 2, section 4.5.2).
 */
function shortenedPair(a: bigint, b: bigint): [bigint, bigint] {
  let [x, y] = a < b ? [b, a] : [a, b];
  while (y > LONG) {
    const shift = BigInt(bitLength(x) - LEADING_BITS);
    const [A, B, C, D] = leadingCofactors(Number(x >> shift), Number(y >> shift));
    if (B === 0) [x, y] = [y, x % y];
    else [x, y] = [BigInt(A) * x + BigInt(B) * y, BigInt(C) * x + BigInt(D) * y];
  }
  return [x, y];
}

/** The steps of Euclid that x and y decide whatever follows their bits, as one linear map; B = 0 where they decide none. */
function leadingCofactors(leadingX: number, leadingY: number): [number, number, number, number] {
  let x = leadingX;
  let y = leadingY;
  let A = 1;
  let B = 0;
  let C = 0;
  let D = 1;
  while (y + C !== 0 && y + D !== 0) {
    const quotient = Math.floor((x + A) / (y + C));
    if (quotient !== Math.floor((x + B) / (y + D))) break;
    const nextC = A - quotient * C;
    const nextD = B - quotient * D;
    const nextY = x - quotient * y;
    A = C;
    B = D;
    x = y;
    C = nextC;
    D = nextD;
    y = nextY;
  }
  return [A, B, C, D];
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
