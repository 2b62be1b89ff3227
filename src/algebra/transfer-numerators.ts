/**
 * Exact transfer functions as numerators over the characteristic polynomial. Each channel is reduced to the states that lie
 * between its input and its output; its Markov parameters times their characteristic polynomial, modulo as many primes as a
 * bound on the coefficients asks for, give the numerator.
 */

import { characteristicPolynomial } from './characteristic-polynomial.ts';
import {
  denominatorProduct,
  integersFromResidues,
  inverseModulo,
  markovParameters,
  numeratorModulo,
  primeAt,
  reduce,
  residue,
  rowBits,
  rowsModulo,
  type ScaledRows,
  scaledRows,
} from './modular/index.ts';
import {
  dividePolynomials,
  overOneDenominator,
  type Polynomial,
  polynomial,
  productOfPolynomials,
} from './polynomial.ts';
import { ONE, type Rational, rationalOver, ZERO } from './rational.ts';
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
  const toOutput = Array.from({ length: C.rows }, (_, i) => reached(A, columnsInRow(C, i)));
  const parts = new Map<string, Part>();
  const table = toOutput.map(() => new Array<Polynomial>(B.columns).fill([]));
  for (let j = 0; j < B.columns; j++) {
    const begins = reached(forward, rowsInColumn(B, j));
    for (const { states, outputs } of groupedByStates(begins, toOutput)) {
      const key = states.join(' ');
      const part = parts.get(key) ?? madePart(A, states, characteristic);
      parts.set(key, part);
      const system = bordered(part.A, states, outputs, { B, C, D, input: j });
      numeratorsOf(part, system, outputs.length).forEach((numerator, k) => {
        table[outputs[k]!]![j] = productOfPolynomials([numerator, part.rest]);
      });
    }
  }
  return table;
}

/** The states of a channel: their matrix, its characteristic polynomial, and that of the states left out. */
interface Part {
  readonly A: SparseMatrix<Rational>;
  /** The characteristic polynomial as whole numbers over one denominator. */
  readonly numerators: readonly bigint[];
  readonly denominator: bigint;
  readonly rest: Polynomial;
  /** Its images modulo primes, filled as they are needed. */
  readonly images: Map<number, Float64Array>;
}

function madePart(A: SparseMatrix<Rational>, states: readonly number[], characteristic: Polynomial): Part {
  const isWhole = states.length === A.rows;
  const inner = principalSubmatrix(A, states);
  const own = isWhole ? characteristic : characteristicPolynomial(inner);
  const rest = isWhole ? [ONE] : dividePolynomials(characteristic, own).quotient;
  return { A: inner, ...overOneDenominator(own), rest, images: new Map() };
}

/** The outputs put together by the states that lie between the input and them. */
function groupedByStates(
  begins: Uint8Array,
  toOutput: readonly Uint8Array[],
): { readonly states: readonly number[]; readonly outputs: readonly number[] }[] {
  const groups = new Map<string, { readonly states: readonly number[]; readonly outputs: number[] }>();
  toOutput.forEach((ends, output) => {
    const states = Array.from(begins.keys()).filter(k => begins[k] === 1 && ends[k] === 1);
    const key = states.join(' ');
    const group = groups.get(key);
    if (group === undefined) groups.set(key, { states, outputs: [output] });
    else group.outputs.push(output);
  });
  return [...groups.values()];
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

/** One input with its columns of B and D, and the rows of C and D to choose from. */
interface Borders {
  readonly B: SparseMatrix<Rational>;
  readonly C: SparseMatrix<Rational>;
  readonly D: SparseMatrix<Rational>;
  readonly input: number;
}

/** [A, b; C, d] for the given states, outputs and the one input. */
function bordered(
  A: SparseMatrix<Rational>,
  states: readonly number[],
  outputs: readonly number[],
  { B, C, D, input }: Borders,
): SparseMatrix<Rational> {
  const n = A.rows;
  const column: number[] = [];
  const values: Rational[] = [];
  const rowStart = [0];
  const push = (j: number, value: Rational): void => {
    if (value.n === 0n) return;
    column.push(j);
    values.push(value);
  };
  states.forEach((state, i) => {
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) push(A.column[k]!, A.values[k]!);
    push(n, entryAt(B, state, input, ZERO));
    rowStart.push(values.length);
  });
  for (const output of outputs) {
    states.forEach((state, j) => {
      push(j, entryAt(C, output, state, ZERO));
    });
    push(n, entryAt(D, output, input, ZERO));
    rowStart.push(values.length);
  }
  const rows = n + outputs.length;
  return { rows, columns: n + 1, rowStart: Int32Array.from(rowStart), column: Int32Array.from(column), values };
}

/**
 * The numerators of c(sI − A)⁻¹b + d for the outputs' rows [c, d] of the system: each is det [sI − A, −b; c, d], brought to
 * whole numbers row by row, which also bounds its coefficients.
 */
function numeratorsOf(part: Part, matrix: SparseMatrix<Rational>, outputs: number): Polynomial[] {
  const n = part.A.rows;
  const system = scaledRows(matrix);
  const states = denominatorProduct({ ...system, denominators: system.denominators.slice(0, n) });
  const rows = Array.from({ length: outputs }, (_, k) => system.denominators[n + k]!);
  const images = rows.map((): Float64Array[] => []);
  const primes: number[] = [];
  // One bit for the sign, one for the rounding of the logarithms.
  let missingBits = numeratorBits(system, n) + 2;
  for (let i = 0; missingBits > 0; i++) {
    const p = primeAt(i);
    const image = rowsModulo(system, p);
    if (image === null) continue;
    const markov = markovParameters(image, n, 0, p);
    const characteristic = characteristicImage(part, p);
    markov.forEach((parameters, k) => {
      const scale = reduce(residue(states.scale, p) * residue(rows[k]!, p), p, 1 / p);
      images[k]!.push(numeratorModulo(characteristic, parameters, scale, p));
    });
    primes.push(p);
    missingBits -= Math.log2(p);
  }
  return images.map((image, k) => {
    const [scale, base] = [states.scale * rows[k]!, states.base * rows[k]!];
    return polynomial(integersFromResidues(image, primes).map(x => rationalOver(x, scale, base)));
  });
}

/** Bits of the longest numerator: those of the states' rows and of the longest output row. */
function numeratorBits(system: ScaledRows, n: number): number {
  const bits = rowBits(system, n);
  const inRows = (from: number, to: number): number[] => bits.slice(from, to);
  return inRows(0, n).reduce((sum, x) => sum + x, 0) + Math.max(...inRows(n, system.rows));
}

/** The characteristic polynomial modulo p, monic; p divides no denominator of the matrix and so none of its own. */
function characteristicImage({ numerators, denominator, images }: Part, p: number): Float64Array {
  const kept = images.get(p);
  if (kept !== undefined) return kept;
  const factor = inverseModulo(residue(denominator, p), p);
  const image = Float64Array.from(numerators, x => reduce(residue(x, p) * factor, p, 1 / p));
  images.set(p, image);
  return image;
}
