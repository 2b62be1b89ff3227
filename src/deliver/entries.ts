/**
 * The entries of A, B, C and D as a format wants them: written-out rows, each entry a formula, a fraction or a decimal turned
 * into whatever that format prints. The one place that decides which of the three an entry is.
 */

import { type Rational, type SparseMatrix, toRows, ZERO } from '../algebra/index.ts';
import type { Formula } from '../algebra/symbolic/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { ModelContext } from './format.ts';
import { formulasOf } from './formulas.ts';
import { type MatrixRows, mapMatrices } from './matrix-rows.ts';

/** How a format prints an entry. */
export interface Printer<T> {
  readonly formula: (value: Formula) => T;
  readonly fraction: (value: Rational) => T;
  readonly decimal: (value: number) => T;
}

/** Entries as they are printed, and what is to be said where they are not written as was asked. */
export interface PrintedRows<T> extends MatrixRows<T> {
  readonly note: string | null;
}

/** The nearest doubles, row by row. */
export function numericRows(model: StateSpace): MatrixRows<number> {
  return mapMatrices(model.numeric, matrix => toRows(matrix, 0));
}

/** The exact entries, row by row; null where the model is not exact throughout. */
export function exactRows(model: StateSpace): MatrixRows<Rational> | null {
  if (model.rational === null || model.irrational.length > 0) return null;
  return mapMatrices(model.rational, matrix => toRows(matrix, ZERO));
}

/** Each entry in the notation that is asked for, or where the model has none in that, in the next plainer one. */
export function printedRows<T>(context: ModelContext, printer: Printer<T>): PrintedRows<T> {
  const { notation, derivation } = context;
  const formulas = notation === 'symbols' ? formulasOf(context) : null;
  if (formulas !== null && formulas.rows !== null) {
    return { ...printed(formulas.rows, printer.formula), note: formulas.note || null };
  }
  const exact = notation === 'decimals' ? null : exactRows(derivation.model);
  if (exact !== null) {
    const note = formulas === null ? null : `Entries are fractions. ${formulas.note}`;
    return { ...printed(exact, printer.fraction), note };
  }
  const note = notation === 'decimals' ? null : `Entries are decimals. ${formulas?.note || NOT_EXACT}`;
  return { ...printed(numericRows(derivation.model), printer.decimal), note };
}

const NOT_EXACT = 'The model is not exact, see its warnings.';

function printed<S, T>(rows: MatrixRows<S>, print: (value: S) => T): MatrixRows<T> {
  return mapMatrices(rows, matrix => matrix.map(row => row.map(print)));
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
