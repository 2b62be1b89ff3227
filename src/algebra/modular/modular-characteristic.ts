/**
 * The characteristic polynomial of a matrix modulo a prime: by the linear recurrence of u·Aᵏv where that reaches far enough,
 * by Hessenberg's form otherwise. The exact polynomial is put together from these images.
 */

import { inverseModulo, reduce } from './primes.ts';
import { innerProductModulo, type ModularRows, multiplyModulo } from './scaled-rows.ts';

/**
 * A monic factor of A's minimal polynomial modulo p, descending powers: the recurrence of u·Aᵏv, which for all but about n
 * of p vectors is the minimal polynomial itself (Wiedemann 1986, IEEE Trans. Inf. Theory 32). Where its degree is the largest
 * that the minimal polynomial can have, it is that polynomial, whatever u and v are. O(n · entries + n²).
 */
export function minimalByRecurrence(A: ModularRows, p: number): Float64Array {
  const n = A.rows;
  const left = scatteredVector(n, p, 1);
  let right = scatteredVector(n, p, 2);
  let next: Float64Array = new Float64Array(n);
  const sequence = new Float64Array(2 * n);
  for (let k = 0; k < 2 * n; k++) {
    sequence[k] = innerProductModulo(left, right, p);
    if (k === 2 * n - 1) break;
    multiplyModulo(A, right, next, p);
    [right, next] = [next, right];
  }
  return shortestRecurrence(sequence, p);
}

/** n residues without a pattern, the same in every run: a linear congruential sequence (Lewis, Goodman & Miller 1969). */
function scatteredVector(n: number, p: number, seed: number): Float64Array {
  const vector = new Float64Array(n);
  let state = 48271 * seed;
  for (let i = 0; i < n; i++) {
    state = (state * 16807) % 2147483647;
    vector[i] = state % p;
  }
  return vector;
}

/**
 * The shortest c with c₀ = 1 and Σ cⱼ sequence[i − j] = 0 for every i that it reaches, in descending powers of its
 * characteristic polynomial (Massey 1969, IEEE Trans. Inf. Theory 15). O(length²).
 */
export function shortestRecurrence(sequence: Float64Array, p: number): Float64Array {
  const inverse = 1 / p;
  const size = sequence.length + 1;
  const current = new Float64Array(size);
  let previous = new Float64Array(size);
  current[0] = 1;
  previous[0] = 1;
  let length = 0;
  let shift = 1;
  let previousDiscrepancy = 1;
  for (let i = 0; i < sequence.length; i++) {
    const discrepancy = discrepancyAt(i, length, current, sequence, p);
    if (discrepancy === 0) {
      shift++;
      continue;
    }
    const factor = p - reduce(discrepancy * inverseModulo(previousDiscrepancy, p), p, inverse);
    const grows = 2 * length <= i;
    const kept = grows ? current.slice() : previous;
    const top = i + 1 - length;
    for (let j = 0; j + shift < size && j <= Math.max(top, length); j++) {
      const term = previous[j]!;
      if (term !== 0) current[j + shift] = reduce(current[j + shift]! + factor * term, p, inverse);
    }
    if (grows) {
      length = i + 1 - length;
      previous = kept;
      previousDiscrepancy = discrepancy;
      shift = 1;
    } else shift++;
  }
  return current.slice(0, length + 1);
}

function discrepancyAt(i: number, length: number, c: Float64Array, sequence: Float64Array, p: number): number {
  const inverse = 1 / p;
  let sum = 0;
  for (let j = 0; j <= length; j++) {
    sum += c[j]! * sequence[i - j]!;
    if ((j & 3) === 3) sum = reduce(sum, p, inverse);
  }
  return reduce(sum, p, inverse);
}

/**
 * det(sI − A) modulo p by Hessenberg's form and the recurrence of its leading blocks (Cohen 1993, A Course in Computational
 * Algebraic Number Theory, algorithm 2.2.9). O(n³).
 */
export function characteristicByHessenberg(A: ModularRows, p: number): Float64Array {
  const n = A.rows;
  const H = Array.from({ length: n }, (_, i) => {
    const row = new Float64Array(n);
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) row[A.column[k]!] = A.values[k]!;
    return row;
  });
  toHessenberg(H, p);
  return hessenbergCharacteristic(H, p);
}

/** Brings the square H to upper Hessenberg form by similarity, in place. */
function toHessenberg(H: Float64Array[], p: number): void {
  const n = H.length;
  for (let m = 1; m < n - 1; m++) {
    let pivot = m;
    while (pivot < n && H[pivot]![m - 1] === 0) pivot++;
    if (pivot === n) continue;
    if (pivot !== m) {
      [H[m], H[pivot]] = [H[pivot]!, H[m]!];
      for (const row of H) [row[m], row[pivot]] = [row[pivot]!, row[m]!];
    }
    clearBelow(H, m, p);
  }
}

/** Clears column m − 1 below row m by rows, and undoes it by columns. */
function clearBelow(H: readonly Float64Array[], m: number, p: number): void {
  const n = H.length;
  const inverse = 1 / p;
  const pivotRow = H[m]!;
  const scale = inverseModulo(pivotRow[m - 1]!, p);
  const factors = new Float64Array(n);
  for (let i = m + 1; i < n; i++) {
    const row = H[i]!;
    if (row[m - 1] === 0) continue;
    const factor = reduce(row[m - 1]! * scale, p, inverse);
    const minus = p - factor;
    for (let j = m - 1; j < n; j++) row[j] = reduce(row[j]! + minus * pivotRow[j]!, p, inverse);
    factors[i] = factor;
  }
  for (const row of H) {
    let sum = row[m]!;
    for (let i = m + 1; i < n; i++) {
      sum += factors[i]! * row[i]!;
      if ((i & 3) === 0) sum = reduce(sum, p, inverse);
    }
    row[m] = reduce(sum, p, inverse);
  }
}

/** The characteristic polynomial of an upper Hessenberg matrix, n + 1 coefficients in descending powers. */
function hessenbergCharacteristic(H: readonly Float64Array[], p: number): Float64Array {
  const n = H.length;
  const inverse = 1 / p;
  // leading[m] is the polynomial of the m × m leading block, ascending powers.
  const leading: Float64Array[] = [Float64Array.of(1)];
  for (let m = 1; m <= n; m++) {
    const previous = leading[m - 1]!;
    const next = new Float64Array(m + 1);
    const minus = p - H[m - 1]![m - 1]!;
    for (let j = 0; j < m; j++) {
      next[j + 1] = reduce(next[j + 1]! + previous[j]!, p, inverse);
      next[j] = reduce(next[j]! + minus * previous[j]!, p, inverse);
    }
    let product = 1;
    for (let i = 1; i < m && product !== 0; i++) {
      product = reduce(product * H[m - i]![m - i - 1]!, p, inverse);
      const factor = p - reduce(product * H[m - i - 1]![m - 1]!, p, inverse);
      const lower = leading[m - i - 1]!;
      for (let j = 0; j < lower.length; j++) next[j] = reduce(next[j]! + factor * lower[j]!, p, inverse);
    }
    leading.push(next);
  }
  return leading[n]!.reverse();
}
