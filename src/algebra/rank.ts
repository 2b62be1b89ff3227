/**
 * The exact rank of a rational matrix. A rank modulo a prime is never above the true one; enough primes against Hadamard's
 * bound prove that it is not below either.
 */

import { bitLength } from './integer.ts';
import { inverseModulo, primeAt, reduce, residue } from './modular/index.ts';
import { overOneDenominator } from './polynomial.ts';
import type { Rational } from './rational.ts';

/**
 * The rank of the matrix with these rows, 0 where there are none. O(rows · columns · rank) for each prime: one where the rank
 * is full, else as many as the bits of a minor of one more row need.
 */
export function rankOf(rows: readonly (readonly Rational[])[]): number {
  const whole = rows.map(row => overOneDenominator(row).numerators).filter(row => row.some(x => x !== 0n));
  const full = Math.min(whole.length, rows[0]?.length ?? 0);
  const lengths = whole.map(rowBits).sort((a, b) => b - a);
  let rank = 0;
  let provedBits = 0;
  for (let i = 0; rank < full; i++) {
    const p = primeAt(i);
    const found = rankModulo(whole, p);
    if (found > rank) {
      rank = found;
      provedBits = 0;
    }
    // Minors with one more row are divisible by every prime that gave no higher rank.
    if (found === rank) provedBits += Math.log2(p);
    const minorBits = lengths.slice(0, rank + 1).reduce((sum, bits) => sum + bits, 0);
    if (provedBits > minorBits + 1) break;
  }
  return rank;
}

/** Bits of a row's Euclidean length, rounded up to a half: a minor is below the product of such lengths (Hadamard 1893). */
function rowBits(row: readonly bigint[]): number {
  return bitLength(row.reduce((sum, x) => sum + x * x, 0n)) / 2;
}

/** Rank modulo p by elimination. */
function rankModulo(matrix: readonly (readonly bigint[])[], p: number): number {
  const rows = matrix.map(row => Float64Array.from(row, x => residue(x, p)));
  const columns = rows[0]?.length ?? 0;
  const inverse = 1 / p;
  let rank = 0;
  for (let j = 0; j < columns && rank < rows.length; j++) {
    const found = rows.findIndex((row, i) => i >= rank && row[j] !== 0);
    if (found < 0) continue;
    const pivot = rows[found]!;
    rows[found] = rows[rank]!;
    rows[rank++] = pivot;
    const scale = inverseModulo(pivot[j]!, p);
    for (let i = rank; i < rows.length; i++) {
      const row = rows[i]!;
      if (row[j] === 0) continue;
      const factor = p - reduce(row[j]! * scale, p, inverse);
      for (let k = j; k < columns; k++) row[k] = reduce(row[k]! + factor * pivot[k]!, p, inverse);
    }
  }
  return rank;
}
