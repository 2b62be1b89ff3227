/**
 * Exact transfer functions as numerators over the characteristic polynomial. Each channel is reduced to the states that lie
 * between its input and its output; its Markov parameters times their characteristic polynomial, modulo as many primes as a
 * bound on the coefficients asks for, give the numerator.
 */

import { characteristicPolynomial } from './characteristic-polynomial.ts';
import { integersFromResidues } from './chinese-remainder.ts';
import {
  dividePolynomials,
  overOneDenominator,
  type Polynomial,
  polynomial,
  productOfPolynomials,
} from './polynomial.ts';
import { inverseModulo, primeAt, reduce, residue } from './primes.ts';
import { ONE, type Rational, rational, ZERO } from './rational.ts';
import { coefficientBits, multiplyModulo, rowsModulo, type ScaledRows, scaledRows } from './scaled-rows.ts';
import { entryAt, type SparseMatrix } from './sparse-matrix.ts';
import { principalSubmatrix } from './strong-components.ts';

/**
 * The numerators of C(sI − A)⁻¹B + D over det(sI − A), nothing cancelled, outputs × inputs; empty where a channel is zero. For
 * one channel pass one column of B and D and one row of C and D.
 *
 * @param characteristic  det(sI − A), monic.
 */
export function transferNumerators(
  A: SparseMatrix<Rational>,
  B: SparseMatrix<Rational>,
  C: SparseMatrix<Rational>,
  D: SparseMatrix<Rational>,
  characteristic: Polynomial,
): Polynomial[][] {
  const forward = successors(A);
  const fromInput = Array.from({ length: B.columns }, (_, j) => reached(forward, rowsInColumn(B, j)));
  const toOutput = Array.from({ length: C.rows }, (_, i) => reached(A, columnsInRow(C, i)));
  const parts = new Map<string, Part>();
  const partOf = (states: readonly number[]): Part => {
    const key = states.join(' ');
    const part = parts.get(key) ?? madePart(A, states, characteristic);
    parts.set(key, part);
    return part;
  };
  return toOutput.map((ends, i) =>
    fromInput.map((begins, j) => {
      const states = Array.from({ length: A.rows }, (_, k) => k).filter(k => begins[k] === 1 && ends[k] === 1);
      const direct = entryAt(D, i, j, ZERO);
      const part = partOf(states);
      const b = states.map(k => entryAt(B, k, j, ZERO));
      const c = states.map(k => entryAt(C, i, k, ZERO));
      return productOfPolynomials([channelNumerator(part, b, c, direct), part.rest]);
    }),
  );
}

/** The states of a channel: their matrix, its characteristic polynomial, and that of the states left out. */
interface Part {
  readonly A: SparseMatrix<Rational>;
  readonly characteristic: Polynomial;
  readonly rest: Polynomial;
}

function madePart(A: SparseMatrix<Rational>, states: readonly number[], characteristic: Polynomial): Part {
  if (states.length === A.rows) return { A, characteristic, rest: [ONE] };
  const inner = principalSubmatrix(A, states);
  const own = characteristicPolynomial(inner);
  return { A: inner, characteristic: own, rest: dividePolynomials(characteristic, own).quotient };
}

/** The pattern of Aᵀ: row k lists the states that state k feeds. */
function successors(A: SparseMatrix<Rational>): Pattern {
  const lists = Array.from({ length: A.rows }, (): number[] => []);
  for (let i = 0; i < A.rows; i++) {
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) lists[A.column[k]!]!.push(i);
  }
  const rowStart = new Int32Array(A.rows + 1);
  lists.forEach((list, i) => {
    rowStart[i + 1] = rowStart[i]! + list.length;
  });
  return { rows: A.rows, rowStart, column: Int32Array.from(lists.flat()) };
}

type Pattern = Pick<SparseMatrix<unknown>, 'rows' | 'rowStart' | 'column'>;

/** Flags of all rows that are reached from the given ones along the pattern, themselves included. */
function reached(pattern: Pattern, from: readonly number[]): Uint8Array {
  const isReached = new Uint8Array(pattern.rows);
  const stack = [...from];
  for (const k of from) isReached[k] = 1;
  for (let i = stack.pop(); i !== undefined; i = stack.pop()) {
    for (let k = pattern.rowStart[i]!; k < pattern.rowStart[i + 1]!; k++) {
      const j = pattern.column[k]!;
      if (isReached[j] === 1) continue;
      isReached[j] = 1;
      stack.push(j);
    }
  }
  return isReached;
}

function rowsInColumn(B: SparseMatrix<Rational>, j: number): number[] {
  return Array.from({ length: B.rows }, (_, i) => i).filter(i => entryAt(B, i, j, ZERO).n !== 0n);
}

function columnsInRow(C: SparseMatrix<Rational>, i: number): number[] {
  return Array.from(C.column.subarray(C.rowStart[i]!, C.rowStart[i + 1]!));
}

/**
 * The numerator of c(sI − A)⁻¹b + d: det [sI − A, −b; c, d], brought to whole numbers row by row, which also bounds its
 * coefficients (Hadamard 1893).
 */
function channelNumerator(
  { A, characteristic }: Part,
  b: readonly Rational[],
  c: readonly Rational[],
  d: Rational,
): Polynomial {
  const n = A.rows;
  const system = scaledRows(bordered(A, b, c, d));
  const scale = system.denominators.reduce((product, denominator) => product * denominator, 1n);
  const overAll = overOneDenominator(characteristic);
  const images: Float64Array[] = [];
  const primes: number[] = [];
  // One bit for the sign, one for the rounding of the logarithms.
  let missingBits = coefficientBits(system, n) + 2;
  for (let i = 0; missingBits > 0; i++) {
    const p = primeAt(i);
    const markov = markovParameters(system, p);
    if (markov === null) continue;
    const factor = reduce(residue(scale, p) * inverseModulo(residue(overAll.denominator, p), p), p, 1 / p);
    const image = Float64Array.from(overAll.numerators, coefficient =>
      reduce(residue(coefficient, p) * factor, p, 1 / p),
    );
    images.push(productStart(image, markov, p));
    primes.push(p);
    missingBits -= Math.log2(p);
  }
  return polynomial(integersFromResidues(images, primes).map(coefficient => rational(coefficient, scale)));
}

/** [A, b; c, d]. */
function bordered(
  A: SparseMatrix<Rational>,
  b: readonly Rational[],
  c: readonly Rational[],
  d: Rational,
): SparseMatrix<Rational> {
  const n = A.rows;
  const column: number[] = [];
  const values: Rational[] = [];
  const rowStart = new Int32Array(n + 2);
  const push = (j: number, value: Rational): void => {
    if (value.n === 0n) return;
    column.push(j);
    values.push(value);
  };
  for (let i = 0; i < n; i++) {
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) push(A.column[k]!, A.values[k]!);
    push(n, b[i] ?? ZERO);
    rowStart[i + 1] = values.length;
  }
  c.forEach((value, j) => {
    push(j, value);
  });
  push(n, d);
  rowStart[n + 1] = values.length;
  return { rows: n + 1, columns: n + 1, rowStart, column: Int32Array.from(column), values };
}

/** d, cb, cAb, … cAⁿ⁻¹b modulo p from [A, b; c, d], or null where p divides a denominator. */
function markovParameters(system: ScaledRows, p: number): Float64Array | null {
  const image = rowsModulo(system, p);
  if (image === null) return null;
  const n = system.rows - 1;
  const parameters = new Float64Array(n + 1);
  // [A, b; c, d] times the unit vector of the input gives [b; d]; times [Aᵏb; 0] it gives [Aᵏ⁺¹b; cAᵏb].
  let x: Float64Array = new Float64Array(n + 1);
  let next: Float64Array = new Float64Array(n + 1);
  x[n] = 1;
  for (let k = 0; k <= n; k++) {
    multiplyModulo(image, x, next, p);
    parameters[k] = next[n]!;
    next[n] = 0;
    [x, next] = [next, x];
  }
  return parameters;
}

/** The n + 1 coefficients of f(s) · (h₀ + h₁/s + h₂/s² + …) down to the constant one, modulo p; f of degree n. */
function productStart(f: Float64Array, h: Float64Array, p: number): Float64Array {
  const inverse = 1 / p;
  return f.map((_, power) => {
    let sum = 0;
    for (let q = 0; q <= power; q++) {
      sum += f[q]! * h[power - q]!;
      if ((q & 3) === 3) sum = reduce(sum, p, inverse);
    }
    return reduce(sum, p, inverse);
  });
}
