/**
 * The smallest subspace that a matrix maps into itself and that contains given vectors: the reachable states of a model, and
 * by transposes the ones that its outputs cannot tell apart. Found modulo primes, put together as rationals and then proved
 * by multiplying out, so neither a small nor a large dimension rests on luck.
 */

import { absolute, bitLength } from './integer.ts';
import {
  combineResidues,
  inverseModulo,
  type Lift,
  type ModularRows,
  multiplyModulo,
  primeAt,
  reduce,
  rowsModulo,
  scaledRows,
} from './modular/index.ts';
import { addRationals, multiplyRationals, ONE, type Rational, rational, ZERO } from './rational.ts';
import { entryAt, type SparseMatrix } from './sparse-matrix.ts';

/** A basis in reduced row echelon form: row i is 1 in column `pivots[i]`, where all other rows are 0. */
export interface EchelonBasis {
  /** Ascending. */
  readonly pivots: readonly number[];
  readonly rows: readonly (readonly Rational[])[];
}

/**
 * Basis of span{B, AB, A²B, …} for A n × n and B n × m, each basis vector a row of n entries. The dimension modulo a prime
 * is never above the true one; a basis is returned once it has been verified exactly to hold B and to be invariant, or once
 * it fills the whole space. O(n³) for one prime; as many primes as the entries of the basis need, one where it is full.
 */
export function invariantSubspace(A: SparseMatrix<Rational>, B: SparseMatrix<Rational>): EchelonBasis {
  const n = A.rows;
  const scaledA = scaledRows(A);
  const scaledB = scaledRows(B);
  let best: Attempt | null = null;
  for (let i = 0; ; i++) {
    const p = primeAt(i);
    const modularA = rowsModulo(scaledA, p);
    const modularB = rowsModulo(scaledB, p);
    if (modularA === null || modularB === null) continue;
    const image = modularSubspace(modularA, modularB, B.columns, p);
    if (image.pivots.length === n) return { pivots: image.pivots, rows: unitRows(n) };
    const attempt: Attempt | null = attemptWith(best, image, p, n);
    if (attempt === null) continue;
    best = attempt;
    const { pivots, lift, primes } = attempt;
    if ((primes & (primes - 1)) !== 0) continue; // tried after 1, 2, 4, 8, … primes
    const rows = reconstructedRows(pivots, lift, n);
    if (rows !== null && isInvariantAndHolds({ pivots, rows }, A, B)) return { pivots, rows };
  }
}

/** The entries outside the pivot columns as far as the primes with one shape of basis tell them. */
interface Attempt {
  readonly pivots: readonly number[];
  readonly lift: Lift;
  readonly primes: number;
}

/** The attempt with one more prime; a new one where that prime's basis tells more; null where it tells less. */
function attemptWith(best: Attempt | null, image: ModularBasis, p: number, n: number): Attempt | null {
  const order = best === null ? 1 : compareShapes(image.pivots, best.pivots);
  if (order < 0) return null;
  const former = order > 0 ? null : best;
  const lift = combineResidues(former?.lift ?? null, freeEntries(image, n), p);
  return { pivots: image.pivots, lift, primes: (former?.primes ?? 0) + 1 };
}

interface ModularBasis {
  readonly pivots: readonly number[];
  readonly rows: readonly Float64Array[];
}

/** The same subspace modulo p, in reduced echelon form. */
function modularSubspace(A: ModularRows, B: ModularRows, columns: number, p: number): ModularBasis {
  const n = A.rows;
  const byPivot: (Float64Array | undefined)[] = new Array(n);
  const found: Float64Array[] = [];
  const insert = (v: Float64Array): void => {
    if (reduceByBasis(v, byPivot, p)) found.push(v);
  };
  for (let j = 0; j < columns && found.length < n; j++) insert(columnModulo(B, j));
  for (let k = 0; k < found.length && found.length < n; k++) {
    const next = new Float64Array(n);
    multiplyModulo(A, found[k]!, next, p);
    insert(next);
  }
  const pivots: number[] = [];
  for (let column = 0; column < n; column++) if (byPivot[column] !== undefined) pivots.push(column);
  const rows = pivots.map(pivot => byPivot[pivot]!);
  if (rows.length < n) clearAbovePivots(rows, pivots, p);
  return { pivots, rows };
}

function columnModulo(B: ModularRows, j: number): Float64Array {
  const v = new Float64Array(B.rows);
  for (let i = 0; i < B.rows; i++) {
    for (let k = B.rowStart[i]!; k < B.rowStart[i + 1]!; k++) if (B.column[k] === j) v[i] = B.values[k]!;
  }
  return v;
}

/** Subtracts from v what the basis already spans; where something is left, v is scaled to leading 1 and enters the basis. */
function reduceByBasis(v: Float64Array, byPivot: (Float64Array | undefined)[], p: number): boolean {
  const inverse = 1 / p;
  for (let column = 0; column < v.length; column++) {
    const head = v[column]!;
    if (head === 0) continue;
    const row = byPivot[column];
    if (row === undefined) {
      const factor = inverseModulo(head, p);
      for (let j = column; j < v.length; j++) v[j] = reduce(v[j]! * factor, p, inverse);
      byPivot[column] = v;
      return true;
    }
    const factor = p - head;
    for (let j = column; j < v.length; j++) v[j] = reduce(v[j]! + factor * row[j]!, p, inverse);
  }
  return false;
}

function clearAbovePivots(rows: readonly Float64Array[], pivots: readonly number[], p: number): void {
  const inverse = 1 / p;
  for (let k = rows.length - 1; k > 0; k--) {
    const pivotRow = rows[k]!;
    for (let i = 0; i < k; i++) {
      const row = rows[i]!;
      const head = row[pivots[k]!]!;
      if (head === 0) continue;
      const factor = p - head;
      for (let j = pivots[k]!; j < row.length; j++) row[j] = reduce(row[j]! + factor * pivotRow[j]!, p, inverse);
    }
  }
}

/** Positive where a is the more telling shape: a larger dimension, or the same with earlier pivots. */
function compareShapes(a: readonly number[], b: readonly number[]): number {
  if (a.length !== b.length) return a.length - b.length;
  const differs = a.findIndex((pivot, i) => pivot !== b[i]);
  return differs < 0 ? 0 : b[differs]! - a[differs]!;
}

/** The entries outside the pivot columns, row by row. */
function freeEntries({ pivots, rows }: ModularBasis, n: number): Float64Array {
  const free = freeColumns(pivots, n);
  return Float64Array.from(rows.flatMap(row => free.map(column => row[column]!)));
}

function freeColumns(pivots: readonly number[], n: number): number[] {
  const isPivot = new Uint8Array(n);
  for (const pivot of pivots) isPivot[pivot] = 1;
  return Array.from({ length: n }, (_, column) => column).filter(column => isPivot[column] === 0);
}

/** The basis with rational entries, null where one of them needs more primes. */
function reconstructedRows(pivots: readonly number[], { modulus, residues }: Lift, n: number): Rational[][] | null {
  const free = freeColumns(pivots, n);
  const rows: Rational[][] = [];
  for (let i = 0; i < pivots.length; i++) {
    const row = new Array<Rational>(n).fill(ZERO);
    row[pivots[i]!] = ONE;
    for (let j = 0; j < free.length; j++) {
      const value = rationalFromResidue(residues[i * free.length + j]!, modulus);
      if (value === null) return null;
      row[free[j]!] = value;
    }
    rows.push(row);
  }
  return rows;
}

/**
 * The one n / d ≡ x modulo `modulus` with |n| and d at most 2ᵏ, 2²ᵏ⁺¹ below the modulus; null where there is none (Wang,
 * Guy & Davenport 1982, SIGSAM Bull. 16).
 */
function rationalFromResidue(x: bigint, modulus: bigint): Rational | null {
  const limit = 1n << BigInt((bitLength(modulus) - 2) >> 1);
  let [r0, r1, t0, t1] = [modulus, x, 0n, 1n];
  while (r1 > limit) {
    const quotient = r0 / r1;
    [r0, r1] = [r1, r0 - quotient * r1];
    [t0, t1] = [t1, t0 - quotient * t1];
  }
  return t1 === 0n || absolute(t1) > limit ? null : rational(r1, t1);
}

function isInvariantAndHolds(basis: EchelonBasis, A: SparseMatrix<Rational>, B: SparseMatrix<Rational>): boolean {
  for (let j = 0; j < B.columns; j++) {
    const column = Array.from({ length: B.rows }, (_, i) => entryAt(B, i, j, ZERO));
    if (!isInSpan(column, basis)) return false;
  }
  return basis.rows.every(row => isInSpan(multiplyByMatrix(A, row), basis));
}

/** Whether v is the combination of the rows that its pivot entries name. */
function isInSpan(v: readonly Rational[], { pivots, rows }: EchelonBasis): boolean {
  const sum = new Array<Rational>(v.length).fill(ZERO);
  pivots.forEach((pivot, i) => {
    const factor = v[pivot]!;
    if (factor.n === 0n) return;
    rows[i]!.forEach((entry, j) => {
      if (entry.n !== 0n) sum[j] = addRationals(sum[j]!, multiplyRationals(factor, entry));
    });
  });
  return v.every((entry, j) => entry.n === sum[j]!.n && entry.d === sum[j]!.d);
}

/** A v. */
export function multiplyByMatrix(A: SparseMatrix<Rational>, v: readonly Rational[]): Rational[] {
  return Array.from({ length: A.rows }, (_, i) => {
    let sum = ZERO;
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) {
      const factor = v[A.column[k]!]!;
      if (factor.n !== 0n) sum = addRationals(sum, multiplyRationals(A.values[k]!, factor));
    }
    return sum;
  });
}

function unitRows(n: number): Rational[][] {
  return Array.from({ length: n }, (_, i) => {
    const row = new Array<Rational>(n).fill(ZERO);
    row[i] = ONE;
    return row;
  });
}
