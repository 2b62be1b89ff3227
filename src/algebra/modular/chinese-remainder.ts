/**
 * Whole numbers from their residues modulo several primes (Chinese remainder theorem). Everything that is computed modulo
 * primes comes back to exact numbers here; that enough primes were taken is the caller's promise.
 */

import { inverseModulo, reduce, residue } from './primes.ts';

/** Numbers known modulo `modulus`, each in 0 … modulus − 1. */
export interface Lift {
  readonly modulus: bigint;
  readonly residues: readonly bigint[];
}

/** The lift extended by residues modulo the prime p, which does not divide its modulus; null starts a new one. */
export function combineResidues(lift: Lift | null, residues: ArrayLike<number>, p: number): Lift {
  if (lift === null) return { modulus: BigInt(p), residues: Array.from(residues, x => BigInt(x)) };
  const { modulus } = lift;
  const factor = inverseModulo(residue(modulus, p), p);
  const inverse = 1 / p;
  const extended = lift.residues.map((x, i) => {
    const missing = reduce((residues[i]! - residue(x, p)) * factor, p, inverse);
    return missing === 0 ? x : x + modulus * BigInt(missing);
  });
  return { modulus: modulus * BigInt(p), residues: extended };
}

/** The numbers of least magnitude with these residues. */
export function symmetric({ modulus, residues }: Lift): bigint[] {
  const half = modulus >> 1n;
  return residues.map(x => (x > half ? x - modulus : x));
}

/**
 * The whole numbers of least magnitude from residues modulo distinct primes: `images[k][j]` is number j modulo `primes[k]`.
 * Right where each number's magnitude is below half the product of the primes. Mixed-radix digits are found in doubles, and
 * only then put together (Garner 1959). O(primes²) for each number.
 */
export function integersFromResidues(images: readonly Float64Array[], primes: readonly number[]): bigint[] {
  const inverses = productInverses(primes);
  const radices = primes.map(p => BigInt(p));
  const modulus = radices.reduce((product, p) => product * p, 1n);
  const half = modulus >> 1n;
  const digits = new Float64Array(primes.length);
  return Array.from(images[0] ?? [], (_, j) => {
    for (let k = 0; k < primes.length; k++) digits[k] = nextDigit(images[k]![j]!, k, digits, primes, inverses);
    let value = 0n;
    for (let k = primes.length - 1; k >= 0; k--) value = value * radices[k]! + BigInt(digits[k]!);
    return value > half ? value - modulus : value;
  });
}

/** (p₀ p₁ … p_{k − 1})⁻¹ modulo p_k, for each k. */
function productInverses(primes: readonly number[]): Float64Array {
  return Float64Array.from(primes, (p, k) => {
    const inverse = 1 / p;
    let product = 1;
    for (let i = 0; i < k; i++) product = reduce(product * (primes[i]! % p), p, inverse);
    return inverseModulo(product, p);
  });
}

/** Digit k of the number whose digits below k are known and whose residue modulo p_k is `target`. */
function nextDigit(
  target: number,
  k: number,
  digits: Float64Array,
  primes: readonly number[],
  inverses: Float64Array,
): number {
  const p = primes[k]!;
  const inverse = 1 / p;
  let value = 0;
  for (let i = k - 1; i >= 0; i--) value = reduce(value * primes[i]! + digits[i]!, p, inverse);
  return reduce((target - value) * inverses[k]!, p, inverse);
}
