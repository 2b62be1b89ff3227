/**
 * A model's exact polynomials, computed once and shared by every exact answer: which matrices they are of, the characteristic
 * polynomial, the numerator of a channel. The models are immutable, so a memory keyed by them changes no answer.
 */

import {
  characteristicFactors,
  fromRows,
  type Polynomial,
  productOfPolynomials,
  type Rational,
  rationalFromDouble,
  type SparseMatrix,
  transferNumerators,
} from '../algebra/index.ts';
import type { StateSpace, SystemMatrices } from '../compile/index.ts';

/** How much time an exact answer may take: `ordinary` while a drawing is edited, `high` when it is asked for. */
export type Effort = 'ordinary' | 'high';

/** Most states for which exact answers are computed: some 20 ms and 0.5 s on the models measured (32 and 128 states). */
export const EXACT_LIMIT: Readonly<Record<Effort, number>> = { ordinary: 32, high: 128 };

export interface ExactModel {
  readonly matrices: SystemMatrices<Rational>;
  /** Whether some entries are doubles that stand in for irrational or rounded quantities, so that "exact" means those. */
  readonly standsIn: boolean;
}

/**
 * The exact matrices behind the answers: the drawing's where it has them, else its doubles taken as the rationals they are.
 * Null where the model has more states than the effort allows.
 */
export function exactModel(model: StateSpace, effort: Effort): ExactModel | null {
  if (model.states.length > EXACT_LIMIT[effort]) return null;
  return remembered(exactModels, model, () =>
    model.rational !== null
      ? { matrices: model.rational, standsIn: model.irrational.length > 0 }
      : { matrices: rationalMatrices(model.numeric), standsIn: true },
  );
}

/** det(sI − A), monic. */
export function characteristicOf(exact: ExactModel): Polynomial {
  return remembered(characteristics, exact, () => productOfPolynomials(characteristicFactorsOf(exact)));
}

/** The factors of det(sI − A) that belong to the strongly connected components of A. */
export function characteristicFactorsOf(exact: ExactModel): readonly Polynomial[] {
  return remembered(characteristicFactorLists, exact, () => characteristicFactors(exact.matrices.A));
}

/** The channel's numerator over the characteristic polynomial, nothing cancelled; empty where the channel is zero. */
export function numeratorOf(exact: ExactModel, output: number, input: number): Polynomial {
  const known = remembered(numerators, exact, () => new Map<string, Polynomial>());
  const key = `${output} ${input}`;
  const kept = known.get(key);
  if (kept !== undefined) return kept;
  const { A, B, C, D } = exact.matrices;
  const row = (M: SparseMatrix<Rational>): SparseMatrix<Rational> => rowOf(M, output);
  const column = (M: SparseMatrix<Rational>): SparseMatrix<Rational> => columnOf(M, input);
  const [[numerator] = []] = transferNumerators(A, column(B), row(C), column(row(D)), characteristicOf(exact));
  known.set(key, numerator ?? []);
  return numerator ?? [];
}

/** All numerators at once, outputs × inputs: one pass shares the powers of A. */
export function allNumerators(exact: ExactModel): readonly (readonly Polynomial[])[] {
  const { A, B, C, D } = exact.matrices;
  const all = remembered(numeratorTables, exact, () => transferNumerators(A, B, C, D, characteristicOf(exact)));
  const known = remembered(numerators, exact, () => new Map<string, Polynomial>());
  all.forEach((row, output) => {
    row.forEach((numerator, input) => {
      known.set(`${output} ${input}`, numerator);
    });
  });
  return all;
}

const exactModels = new WeakMap<StateSpace, ExactModel>();
const characteristicFactorLists = new WeakMap<ExactModel, readonly Polynomial[]>();
const characteristics = new WeakMap<ExactModel, Polynomial>();
const numerators = new WeakMap<ExactModel, Map<string, Polynomial>>();
const numeratorTables = new WeakMap<ExactModel, readonly (readonly Polynomial[])[]>();

/** What the memory holds for the key, computed on first need. */
export function remembered<K extends object, V>(memory: WeakMap<K, V>, key: K, compute: () => V): V {
  const kept = memory.get(key);
  if (kept !== undefined) return kept;
  const value = compute();
  memory.set(key, value);
  return value;
}

function rationalMatrices({ A, B, C, D }: SystemMatrices<number>): SystemMatrices<Rational> {
  const exactly = (matrix: SparseMatrix<number>): SparseMatrix<Rational> => ({
    ...matrix,
    values: Array.from(matrix.values, rationalFromDouble),
  });
  return { A: exactly(A), B: exactly(B), C: exactly(C), D: exactly(D) };
}

function rowOf({ columns, rowStart, column, values }: SparseMatrix<Rational>, row: number): SparseMatrix<Rational> {
  const [from, to] = [rowStart[row]!, rowStart[row + 1]!];
  return {
    rows: 1,
    columns,
    rowStart: Int32Array.of(0, to - from),
    column: column.slice(from, to),
    values: Array.from(values).slice(from, to),
  };
}

function columnOf(matrix: SparseMatrix<Rational>, wanted: number): SparseMatrix<Rational> {
  const rows = Array.from({ length: matrix.rows }, (_, i) => {
    for (let k = matrix.rowStart[i]!; k < matrix.rowStart[i + 1]!; k++) {
      if (matrix.column[k] === wanted) return [matrix.values[k]!];
    }
    return [{ n: 0n, d: 1n }];
  });
  return fromRows(rows, 1, ({ n }) => n === 0n);
}
