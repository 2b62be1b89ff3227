/**
 * The primes that exact results are computed modulo, and arithmetic modulo one of them in doubles. Every prime is below 2²⁵,
 * so that a product is below 2⁵⁰ and eight of them add up without rounding in the 53 bits of a double.
 */

/** The primes come in descending order from here. */
const LARGEST = 2 ** 25;

/** Odd numbers sieved at a time: 2¹⁵ of them hold about 3,800 primes near 2²⁵. */
const SEGMENT = 2 ** 15;

const found: number[] = [];
let sievedDownTo = LARGEST;

/** The i-th prime below 2²⁵, from the largest (i = 0) down (sieve of Eratosthenes, in segments). */
export function primeAt(i: number): number {
  while (found.length <= i) sieveNextSegment();
  return found[i]!;
}

function sieveNextSegment(): void {
  const low = sievedDownTo - 2 * SEGMENT;
  if (low < 2 ** 24) throw new RangeError('no primes of 25 bits are left');
  const isComposite = new Uint8Array(SEGMENT);
  for (let d = 3; d * d < sievedDownTo; d += 2) {
    // The first odd multiple of d from low on; entry k stands for low + 1 + 2k.
    let multiple = Math.ceil((low + 1) / d) * d;
    if (multiple % 2 === 0) multiple += d;
    for (let k = (multiple - low - 1) / 2; k < SEGMENT; k += d) isComposite[k] = 1;
  }
  for (let k = SEGMENT - 1; k >= 0; k--) if (isComposite[k] === 0) found.push(low + 1 + 2 * k);
  sievedDownTo = low;
}

/** x mod p in 0 … p − 1 for a whole x with |x| < 2⁵³; `inverse` is the double 1 / p. */
export function reduce(x: number, p: number, inverse: number): number {
  // The quotient is off by one at most, and every product here is below 2⁵³.
  const rest = x - p * Math.floor(x * inverse);
  return rest < 0 ? rest + p : rest >= p ? rest - p : rest;
}

/** a⁻¹ mod p for 0 < a < p < 2²⁵ (extended Euclid). */
export function inverseModulo(a: number, p: number): number {
  let r0 = p;
  let r1 = a;
  let t0 = 0;
  let t1 = 1;
  while (r1 !== 0) {
    const quotient = (r0 / r1) | 0;
    const r2 = r0 - quotient * r1;
    r0 = r1;
    r1 = r2;
    const t2 = t0 - quotient * t1;
    t0 = t1;
    t1 = t2;
  }
  return t0 < 0 ? t0 + p : t0;
}

/** x mod p in 0 … p − 1 for whole x of any size. */
export function residue(x: bigint, p: number): number {
  const rest = Number(x % BigInt(p));
  return rest < 0 ? rest + p : rest;
}
