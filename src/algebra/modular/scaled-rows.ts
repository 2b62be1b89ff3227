/**
 * Rational matrices brought to whole numbers row by row, and their images modulo a prime: the door between exact matrices
 * and everything that is computed modulo primes.
 */

import { absolute, bitLength, greatestCommonDivisor } from '../integer.ts';
import type { Rational } from '../rational.ts';
import type { SparseMatrix } from '../sparse-matrix.ts';
import { inverseModulo, reduce, residue } from './primes.ts';

/** Row i holds the whole numbers `numerators[k]` over the one denominator `denominators[i]`, in the pattern of a SparseMatrix. */
export interface ScaledRows {
  readonly rows: number;
  readonly columns: number;
  readonly rowStart: Int32Array;
  readonly column: Int32Array;
  readonly numerators: readonly bigint[];
  /** The numerators as doubles, NaN where that would round. */
  readonly shortNumerators: Float64Array;
  /** rows long, positive. */
  readonly denominators: readonly bigint[];
}

/** A matrix modulo a prime, by compressed rows, entries in 0 … p − 1. */
export interface ModularRows {
  readonly rows: number;
  readonly rowStart: Int32Array;
  readonly column: Int32Array;
  readonly values: Float64Array;
}

/** The rows of the matrix over their least common denominators. */
export function scaledRows(matrix: SparseMatrix<Rational>): ScaledRows {
  const { rows, columns, rowStart, column, values } = matrix;
  const numerators: bigint[] = [];
  const denominators: bigint[] = [];
  for (let i = 0; i < rows; i++) {
    let denominator = 1n;
    for (let k = rowStart[i]!; k < rowStart[i + 1]!; k++) {
      const { d } = values[k]!;
      if (d !== 1n && denominator % d !== 0n) denominator *= d / greatestCommonDivisor(denominator, d);
    }
    for (let k = rowStart[i]!; k < rowStart[i + 1]!; k++) {
      const { n, d } = values[k]!;
      numerators.push(d === denominator ? n : n * (denominator / d));
    }
    denominators.push(denominator);
  }
  const shortNumerators = Float64Array.from(numerators, x => {
    const double = Number(x);
    return Number.isSafeInteger(double) ? double : Number.NaN;
  });
  return { rows, columns, rowStart, column, numerators, shortNumerators, denominators };
}

/** Product of the denominators, and a number that all its prime factors divide: their least common multiple. */
export function denominatorProduct({ denominators }: ScaledRows): { readonly scale: bigint; readonly base: bigint } {
  let scale = 1n;
  let base = 1n;
  for (const d of denominators) {
    scale *= d;
    if (base % d !== 0n) base *= d / greatestCommonDivisor(base, d);
  }
  return { scale, base };
}

/** The image of the matrix modulo p, or null where p divides a denominator. */
export function rowsModulo(matrix: ScaledRows, p: number): ModularRows | null {
  const { rows, rowStart, column, numerators, shortNumerators, denominators } = matrix;
  const values = new Float64Array(numerators.length);
  const inverse = 1 / p;
  for (let i = 0; i < rows; i++) {
    const denominator = denominators[i] === 1n ? 1 : residue(denominators[i]!, p);
    if (denominator === 0) return null;
    const factor = denominator === 1 ? 1 : inverseModulo(denominator, p);
    for (let k = rowStart[i]!; k < rowStart[i + 1]!; k++) {
      const short = shortNumerators[k]!;
      const value = Number.isNaN(short) ? residue(numerators[k]!, p) : reduce(short, p, inverse);
      values[k] = factor === 1 ? value : reduce(value * factor, p, inverse);
    }
  }
  return { rows, rowStart, column, values };
}

/** Products below 2⁵⁰ that may be added to a reduced sum before the next reduction, so that all stays below 2⁵³. */
const SUMMANDS = 7;

/** target = M x modulo p. */
export function multiplyModulo(M: ModularRows, x: Float64Array, target: Float64Array, p: number): void {
  const { rows, rowStart, column, values } = M;
  const inverse = 1 / p;
  for (let i = 0; i < rows; i++) {
    let sum = 0;
    const end = rowStart[i + 1]!;
    for (let k = rowStart[i]!; k < end; ) {
      const stop = Math.min(end, k + SUMMANDS);
      for (; k < stop; k++) sum += values[k]! * x[column[k]!]!;
      sum = reduce(sum, p, inverse);
    }
    target[i] = sum;
  }
}

/** x · y modulo p. */
export function innerProductModulo(x: Float64Array, y: Float64Array, p: number): number {
  const inverse = 1 / p;
  let sum = 0;
  for (let i = 0; i < x.length; ) {
    const stop = Math.min(x.length, i + SUMMANDS);
    for (; i < stop; i++) sum += x[i]! * y[i]!;
    sum = reduce(sum, p, inverse);
  }
  return sum;
}

/**
 * For each row the bits of a bound on its length on |s| = 1 in s diag(δ) − N, N the whole numbers of the rows, δ their
 * denominators on the diagonal of the first `states` rows. The product of the lengths bounds the determinant there (Hadamard
 * 1893), and so each of its coefficients (Cauchy's estimate).
 */
export function rowBits(matrix: ScaledRows, states: number): number[] {
  return matrix.denominators.map((denominator, i) => {
    let onDiagonal = i < states ? denominator : 0n;
    let squares = 0n;
    for (let k = matrix.rowStart[i]!; k < matrix.rowStart[i + 1]!; k++) {
      const magnitude = absolute(matrix.numerators[k]!);
      if (matrix.column[k] === i) onDiagonal += magnitude;
      else squares += magnitude * magnitude;
    }
    return bitLength(squares + onDiagonal * onDiagonal) / 2;
  });
}
