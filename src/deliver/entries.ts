/**
 * The entries of A, B, C and D as a format wants them: written-out rows, each entry a fraction or a decimal turned into
 * whatever that format prints. The one place that decides which of the two an entry is.
 */

import { type Rational, type SparseMatrix, toRows, ZERO } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { Notation } from './format.ts';

/** A n × n, B n × m, C p × n, D p × m, row by row. */
export interface MatrixRows<T> {
  readonly A: readonly (readonly T[])[];
  readonly B: readonly (readonly T[])[];
  readonly C: readonly (readonly T[])[];
  readonly D: readonly (readonly T[])[];
}

/** How a format prints a number. */
export interface Printer<T> {
  readonly fraction: (value: Rational) => T;
  readonly decimal: (value: number) => T;
}

/** Whether the entries of `exact` are the model's own: none stands in for an irrational quantity. */
export function hasExactEntries(model: StateSpace): boolean {
  return model.rational !== null && model.irrational.length === 0;
}

/** The nearest doubles, row by row. */
export function numericRows(model: StateSpace): MatrixRows<number> {
  return mapMatrices(model.numeric, matrix => toRows(matrix, 0));
}

/** The exact entries, row by row; null where the model is not exact throughout. */
export function exactRows(model: StateSpace): MatrixRows<Rational> | null {
  if (model.rational === null || !hasExactEntries(model)) return null;
  return mapMatrices(model.rational, matrix => toRows(matrix, ZERO));
}

/** Each entry printed, as a fraction where that is asked for and the model is exact, as a decimal otherwise. */
export function printedRows<T>(model: StateSpace, notation: Notation, printer: Printer<T>): MatrixRows<T> {
  const exact = notation === 'fractions' ? exactRows(model) : null;
  return exact === null
    ? mapMatrices(numericRows(model), rows => rows.map(row => row.map(printer.decimal)))
    : mapMatrices(exact, rows => rows.map(row => row.map(printer.fraction)));
}

/** The same done to each of the four. */
export function mapMatrices<S, T>(
  { A, B, C, D }: { readonly A: S; readonly B: S; readonly C: S; readonly D: S },
  turn: (matrix: S) => T,
): { readonly A: T; readonly B: T; readonly C: T; readonly D: T } {
  return { A: turn(A), B: turn(B), C: turn(C), D: turn(D) };
}

/** A sparse matrix entry by entry, column by column from the left, rows from the top, counted from 0. */
export function nonzeroEntries(matrix: SparseMatrix<number>): { row: number; column: number; value: number }[] {
  const entries: { row: number; column: number; value: number }[] = [];
  for (let row = 0; row < matrix.rows; row++) {
    for (let k = matrix.rowStart[row] ?? 0; k < (matrix.rowStart[row + 1] ?? 0); k++) {
      entries.push({ row, column: matrix.column[k] ?? 0, value: matrix.values[k] ?? 0 });
    }
  }
  return entries.sort((a, b) => a.column - b.column || a.row - b.row);
}
