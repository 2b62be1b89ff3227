/**
 * One algebraic loop as a sparse linear system over a field, brought to triangular form. Drawings make loops of a few
 * entries a row: eliminating short rows first keeps them so, and over the rationals keeps the numbers short.
 */

import type { RowStore } from '../equations/index.ts';
import type { Arithmetic } from '../quantities/index.ts';

/** A factored system of n equations; opaque, to be handed to `solveFactored`. */
export interface LoopFactors<T> {
  readonly size: number;
  /** Row operations in order: row target[k] lost factor[k] × row source[k]. */
  readonly operations: readonly RowOperation<T>[];
  /** n pivots in order; the columns of a pivot row are those not eliminated before it. */
  readonly pivots: readonly Pivot<T>[];
}

interface RowOperation<T> {
  readonly target: number;
  readonly source: number;
  readonly factor: T;
}

interface Pivot<T> {
  readonly row: number;
  readonly column: number;
  readonly value: T;
  /** The row's other entries at the time. */
  readonly columns: readonly number[];
  readonly values: readonly T[];
}

/**
 * A pivot is at least this fraction of the largest entry of its row, so that rounding errors grow by at most 11 a step. The
 * usual compromise between growth and fill (Duff, Erisman & Reid 1986, Direct Methods for Sparse Matrices, section 5.4).
 * Exact elements weigh the same and pass always.
 */
const PIVOT_THRESHOLD = 0.1;

/** Rows looked at for each pivot once a candidate is found (Zlatev 1980, SIAM J. Numer. Anal. 17, finds 2 to 4 enough). */
const ROWS_SEARCHED = 4;

/**
 * Gaussian elimination of a square system, pivots by least fill (r − 1)(c − 1) in r entries of the row and c of the column
 * (Markowitz 1957, Management Science 3), the better element among equals.
 *
 * @param system  n rows over the columns 0 to n − 1.
 * @returns       null where the system is singular: over an exact field a proof, in doubles an exact zero.
 */
export function factorLoop<T>(arithmetic: Arithmetic<T>, system: RowStore<T>): LoopFactors<T> | null {
  const work = newWork(arithmetic, system);
  const operations: RowOperation<T>[] = [];
  const pivots: Pivot<T>[] = [];
  for (let step = 0; step < work.size; step++) {
    const pivot = takePivot(work);
    if (pivot === null) return null;
    pivots.push(pivot);
    for (const target of work.rowsOfColumn[pivot.column]!) {
      const factor = work.done[target] === 1 ? null : eliminate(work, target, pivot);
      if (factor !== null) operations.push({ target, source: pivot.row, factor });
    }
  }
  return { size: work.size, operations, pivots };
}

interface Work<T> {
  readonly arithmetic: Arithmetic<T>;
  readonly size: number;
  readonly columns: number[][];
  readonly values: T[][];
  /** 1 once a row has been a pivot row. */
  readonly done: Uint8Array;
  /** Rows that hold or once held a column. */
  readonly rowsOfColumn: number[][];
  readonly columnCount: Int32Array;
  /** Rows of each length, as a doubly linked list; −1 ends it. */
  readonly firstOfLength: Int32Array;
  readonly nextRow: Int32Array;
  readonly previousRow: Int32Array;
  /** Position of a column in the row in hand, 0 for none, else counted from 1. */
  readonly position: Int32Array;
}

function newWork<T>(arithmetic: Arithmetic<T>, { rows, start, column, values }: RowStore<T>): Work<T> {
  const work: Work<T> = {
    arithmetic,
    size: rows,
    columns: [],
    values: [],
    done: new Uint8Array(rows),
    rowsOfColumn: Array.from({ length: rows }, () => []),
    columnCount: new Int32Array(rows),
    firstOfLength: new Int32Array(rows + 1).fill(-1),
    nextRow: new Int32Array(rows),
    previousRow: new Int32Array(rows),
    position: new Int32Array(rows),
  };
  for (let row = 0; row < rows; row++) {
    const own: number[] = [];
    const ownValues: T[] = [];
    for (let k = start[row]!; k < start[row + 1]!; k++) {
      own.push(column[k]!);
      ownValues.push(values[k]!);
      work.rowsOfColumn[column[k]!]!.push(row);
      work.columnCount[column[k]!]! += 1;
    }
    work.columns.push(own);
    work.values.push(ownValues);
  }
  for (let row = rows - 1; row >= 0; row--) enlist(work, row);
  return work;
}

/** Puts a row at the head of the list of its length. */
function enlist<T>({ columns, firstOfLength, nextRow, previousRow }: Work<T>, row: number): void {
  const length = columns[row]!.length;
  const next = firstOfLength[length]!;
  nextRow[row] = next;
  previousRow[row] = -1;
  if (next >= 0) previousRow[next] = row;
  firstOfLength[length] = row;
}

function delist<T>({ columns, firstOfLength, nextRow, previousRow }: Work<T>, row: number): void {
  const [next, previous] = [nextRow[row]!, previousRow[row]!];
  if (previous >= 0) nextRow[previous] = next;
  else firstOfLength[columns[row]!.length] = next;
  if (next >= 0) previousRow[next] = previous;
}

/** Chooses the next pivot and takes its row out of the work; null where a row has nothing left. */
function takePivot<T>(work: Work<T>): Pivot<T> | null {
  if (work.firstOfLength[0]! >= 0) return null;
  const at = findPivot(work);
  if (at === null) return null;
  delist(work, at.row);
  work.done[at.row] = 1;
  const columns = work.columns[at.row]!;
  const values = work.values[at.row]!;
  for (const column of columns) work.columnCount[column]! -= 1;
  const column = columns[at.position]!;
  const value = values[at.position]!;
  removeAt(columns, at.position);
  removeAt(values, at.position);
  return { row: at.row, column, value, columns, values };
}

interface Candidate {
  readonly row: number;
  readonly position: number;
  readonly cost: number;
}

function findPivot<T>(work: Work<T>): Candidate | null {
  let best: Candidate | null = null;
  let searched = 0;
  for (let length = 1; length <= work.size; length++) {
    for (let row = work.firstOfLength[length]!; row >= 0; row = work.nextRow[row]!) {
      best = betterOfRow(work, row, best);
      searched += 1;
      if (best !== null && (best.cost === 0 || searched >= ROWS_SEARCHED)) return best;
    }
  }
  return best;
}

function betterOfRow<T>(work: Work<T>, row: number, best: Candidate | null): Candidate | null {
  const { field, magnitude } = work.arithmetic;
  const values = work.values[row]!;
  const columns = work.columns[row]!;
  let largest = 0;
  for (const value of values) largest = Math.max(largest, magnitude(value));
  let better = best;
  for (let position = 0; position < columns.length; position++) {
    const value = values[position]!;
    if (magnitude(value) < PIVOT_THRESHOLD * largest) continue;
    const cost = (columns.length - 1) * (work.columnCount[columns[position]!]! - 1);
    const wins =
      better === null ||
      cost < better.cost ||
      (cost === better.cost && field.isBetterPivot(value, work.values[better.row]![better.position]!));
    if (wins) better = { row, position, cost };
  }
  return better;
}

/** Clears the pivot's column in one row; the factor, or null where the row does not hold that column. */
function eliminate<T>(work: Work<T>, target: number, pivot: Pivot<T>): T | null {
  const { field } = work.arithmetic;
  const columns = work.columns[target]!;
  const values = work.values[target]!;
  const at = columns.indexOf(pivot.column);
  if (at < 0) return null;
  delist(work, target);
  const factor = field.divide(values[at]!, pivot.value);
  removeAt(columns, at);
  removeAt(values, at);
  subtractRow(work, target, pivot, factor);
  enlist(work, target);
  return factor;
}

function subtractRow<T>(work: Work<T>, target: number, pivot: Pivot<T>, factor: T): void {
  const { field } = work.arithmetic;
  const { position, rowsOfColumn, columnCount } = work;
  const columns = work.columns[target]!;
  const values = work.values[target]!;
  for (let k = 0; k < columns.length; k++) position[columns[k]!] = k + 1;
  for (let k = 0; k < pivot.columns.length; k++) {
    const column = pivot.columns[k]!;
    const change = field.multiply(factor, pivot.values[k]!);
    const at = position[column]! - 1;
    if (at >= 0) values[at] = field.subtract(values[at]!, change);
    else {
      columns.push(column);
      values.push(field.negate(change));
      rowsOfColumn[column]!.push(target);
      columnCount[column]! += 1;
    }
  }
  for (let k = columns.length - 1; k >= 0; k--) {
    position[columns[k]!] = 0;
    if (!field.isZero(values[k]!)) continue;
    columnCount[columns[k]!]! -= 1;
    removeAt(columns, k);
    removeAt(values, k);
  }
}

/** Takes one entry out; the last takes its place. */
function removeAt<T>(list: T[], at: number): void {
  const last = list.pop();
  if (at < list.length && last !== undefined) list[at] = last;
}
