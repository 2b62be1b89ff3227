/** The steps of a sparse complex elimination as they are recorded, whichever way they are found. */

import { type ColumnIndex, type ComplexSystem, columnIndex } from './complex-system.ts';

/**
 * Steps of the elimination in order, flat. Step k took row[k] and column[k]; what was left of the row is rest[i] for
 * restStart[k] ≤ i < restStart[k + 1], and target[i] for targetStart[k] ≤ i < targetStart[k + 1] are the rows that lost
 * factor[i] times it.
 */
export interface ComplexFactors {
  readonly columns: ColumnIndex;
  readonly row: number[];
  readonly column: number[];
  readonly pivotRe: number[];
  readonly pivotIm: number[];
  readonly restStart: number[];
  readonly rest: number[];
  readonly restRe: number[];
  readonly restIm: number[];
  readonly targetStart: number[];
  readonly target: number[];
  readonly factorRe: number[];
  readonly factorIm: number[];
}

/** A system being factored. */
export interface Work {
  readonly system: ComplexSystem;
  readonly factors: ComplexFactors;
  /** 1 once taken. */
  readonly rowDone: Uint8Array;
  readonly columnDone: Uint8Array;
  /** Entries of each row in columns not taken, and of each column in rows not taken. */
  readonly rowCount: Int32Array;
  readonly columnCount: Int32Array;
}

/** Nothing taken yet. */
export function begin(system: ComplexSystem): Work {
  const { size, start } = system;
  const columns = columnIndex(system);
  return {
    system,
    factors: {
      columns,
      row: [],
      column: [],
      pivotRe: [],
      pivotIm: [],
      restStart: [0],
      rest: [],
      restRe: [],
      restIm: [],
      targetStart: [0],
      target: [],
      factorRe: [],
      factorIm: [],
    },
    rowDone: new Uint8Array(size),
    columnDone: new Uint8Array(size),
    rowCount: Int32Array.from({ length: size }, (_, i) => start[i + 1]! - start[i]!),
    columnCount: Int32Array.from({ length: size }, (_, c) => columns.start[c + 1]! - columns.start[c]!),
  };
}

/** Begins a step; its rest and targets are pushed before `endStep`. */
export function beginStep(
  { factors, rowDone, columnDone }: Work,
  row: number,
  column: number,
  re: number,
  im: number,
): void {
  factors.row.push(row);
  factors.column.push(column);
  factors.pivotRe.push(re);
  factors.pivotIm.push(im);
  rowDone[row] = 1;
  columnDone[column] = 1;
}

/** Ends the step in hand. */
export function endStep({ factors }: Work): void {
  factors.restStart.push(factors.rest.length);
  factors.targetStart.push(factors.target.length);
}

/** An entry left of the row of the step in hand. */
export function pushRest({ factors }: Work, column: number, re: number, im: number): void {
  factors.rest.push(column);
  factors.restRe.push(re);
  factors.restIm.push(im);
}

/** A row that loses (re, im) / pivot times the row of the step in hand. */
export function pushTarget({ factors }: Work, row: number, re: number, im: number): void {
  const pivotRe = factors.pivotRe[factors.pivotRe.length - 1]!;
  const pivotIm = factors.pivotIm[factors.pivotIm.length - 1]!;
  const size = pivotRe * pivotRe + pivotIm * pivotIm;
  factors.target.push(row);
  factors.factorRe.push((re * pivotRe + im * pivotIm) / size);
  factors.factorIm.push((im * pivotRe - re * pivotIm) / size);
}
