/** Whole numbers from their residues modulo several primes (Chinese remainder theorem). */

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
