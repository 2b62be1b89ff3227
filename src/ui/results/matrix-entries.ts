/**
 * What stands in each place of the system matrix: A and B over C and D, rows and columns counted through. The table asks
 * for one entry at a time, so that a large model costs only what is in view.
 */

import { entryAt, type Rational, type SparseMatrix, ZERO } from '../../algebra/index.ts';
import type { StateSpace, SystemMatrices } from '../../compile/index.ts';
import {
  figureOf,
  figureText,
  formatFraction,
  isWritableFraction,
  type Notation,
  type Real,
} from '../figures/index.ts';

/** One entry as shown. */
export interface MatrixEntry {
  readonly text: string;
  readonly isZero: boolean;
  /** Digits were lost on the way to `text`. */
  readonly isRounded: boolean;
  /** The whole value, where `text` does not say it. */
  readonly whole: string | null;
  /** The same as one MathML element, where it is a formula. */
  readonly mathml?: string;
}

/** The entry in `row` (0 … n + p − 1) and `column` (0 … n + m − 1). */
export type EntryAt = (row: number, column: number) => MatrixEntry;

/** Significant digits of a decimal entry. */
export const ENTRY_DIGITS = 6;

/** A zero, as shown. */
export const NOTHING: MatrixEntry = { text: '0', isZero: true, isRounded: false, whole: null };

/** Entries of `model` in `notation`; decimals where there are no exact ones to show. */
export function entriesOf(model: StateSpace, notation: Notation): EntryAt {
  const exact = whyNoFractions(model) === null ? model.rational : null;
  if (exact === null) return partitioned(model.numeric, model.states.length, 0, value => decimalEntry(value));
  const write = notation === 'fractions' ? fractionEntry : (value: Rational) => decimalEntry(value, value);
  return partitioned(exact, model.states.length, ZERO, write);
}

/** An entry in symbols of the parameters. */
export interface SymbolCell {
  readonly text: string;
  readonly mathml: string;
}

/** Entries in symbols, rows and columns as in the table. */
export function symbolEntries(rows: readonly (readonly SymbolCell[])[]): EntryAt {
  return (row, column) => {
    const cell = rows[row]?.[column];
    if (cell === undefined || cell.text === '0') return NOTHING;
    return { text: cell.text, isZero: false, isRounded: false, whole: cell.text, mathml: cell.mathml };
  };
}

/** Why `model` has decimals only, or null where its entries are exact. */
export function whyNoFractions(model: StateSpace): string | null {
  if (model.rational === null) return 'Derived in floating point: decimals only.';
  if (model.irrational.length === 0) return null;
  return `Not rational: ${model.irrational.join(', ')}. Decimals only.`;
}

function partitioned<T>(
  matrices: SystemMatrices<T>,
  states: number,
  zero: T,
  write: (value: T) => MatrixEntry,
): EntryAt {
  const { A, B, C, D } = matrices;
  const pick = (left: SparseMatrix<T>, right: SparseMatrix<T>, row: number, column: number) =>
    column < states ? entryAt(left, row, column, zero) : entryAt(right, row, column - states, zero);
  return (row, column) => write(row < states ? pick(A, B, row, column) : pick(C, D, row - states, column));
}

function fractionEntry(value: Rational): MatrixEntry {
  if (value.n === 0n) return NOTHING;
  if (!isWritableFraction(value)) return decimalEntry(value, value);
  return { text: formatFraction(value), isZero: false, isRounded: false, whole: null };
}

function decimalEntry(value: Real, exact: Rational | null = null): MatrixEntry {
  const isZero = typeof value === 'number' ? value === 0 : value.n === 0n;
  if (isZero) return NOTHING;
  const figure = figureOf(value, ENTRY_DIGITS);
  const isRounded = figure.isRounded;
  return { text: figureText(figure), isZero: false, isRounded, whole: isRounded ? wholeText(value, exact) : null };
}

/** The fraction where it can be read, otherwise as many digits as a double holds. */
function wholeText(value: Real, exact: Rational | null): string {
  if (exact !== null && isWritableFraction(exact)) return formatFraction(exact);
  return figureText(figureOf(value, 17));
}
