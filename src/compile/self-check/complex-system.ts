/**
 * Sparse linear equations in complex doubles, as flat compressed rows: how the self-check writes the drawing down. Row i is
 * what determines unknown i.
 */

/** Row i holds (re[k], im[k]) in column[k] for start[i] ≤ k < start[i + 1], each column at most once. */
export interface ComplexSystem {
  readonly size: number;
  readonly start: Int32Array;
  readonly column: Int32Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** A vector of complex numbers. */
export interface ComplexVector {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** A system being written, row after row. */
export class SystemWriter {
  private readonly start: number[] = [0];
  private readonly column: number[] = [];
  private readonly re: number[] = [];
  private readonly im: number[] = [];

  /** Adds an entry to the row in hand; to one that it holds already, the sum is kept. */
  add(column: number, re: number, im: number): void {
    const first = this.start[this.start.length - 1]!;
    for (let k = first; k < this.column.length; k++) {
      if (this.column[k] !== column) continue;
      this.re[k]! += re;
      this.im[k]! += im;
      return;
    }
    this.column.push(column);
    this.re.push(re);
    this.im.push(im);
  }

  /** Ends the row in hand. */
  endRow(): void {
    this.start.push(this.column.length);
  }

  /** The system of the rows so far. */
  finish(): ComplexSystem {
    return {
      size: this.start.length - 1,
      start: Int32Array.from(this.start),
      column: Int32Array.from(this.column),
      re: Float64Array.from(this.re),
      im: Float64Array.from(this.im),
    };
  }
}

/** For each column the rows that hold it: row[k] for start[c] ≤ k < start[c + 1], and where in the rows the entry stands. */
export interface ColumnIndex {
  readonly start: Int32Array;
  readonly row: Int32Array;
  readonly at: Int32Array;
}

/** The columns of a system. Linear in its entries. */
export function columnIndex({ size, start, column }: ComplexSystem): ColumnIndex {
  const columnStart = new Int32Array(size + 1);
  for (let k = 0; k < column.length; k++) columnStart[column[k]! + 1]! += 1;
  for (let c = 0; c < size; c++) columnStart[c + 1]! += columnStart[c]!;
  const next = columnStart.slice();
  const row = new Int32Array(column.length);
  const at = new Int32Array(column.length);
  for (let i = 0; i < size; i++) {
    for (let k = start[i]!; k < start[i + 1]!; k++) {
      const place = next[column[k]!]!;
      next[column[k]!] = place + 1;
      row[place] = i;
      at[place] = k;
    }
  }
  return { start: columnStart, row, at };
}

/**
 * 1 for each unknown that a path of rows leads to from the right-hand side. The others are zero, whatever rounding makes
 * of them.
 */
export function reachedUnknowns({ start, row }: ColumnIndex, { re, im }: ComplexVector): Uint8Array {
  const isReached = new Uint8Array(re.length);
  const waiting: number[] = [];
  for (let i = 0; i < re.length; i++) {
    if (re[i] === 0 && im[i] === 0) continue;
    isReached[i] = 1;
    waiting.push(i);
  }
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    for (let k = start[next]!; k < start[next + 1]!; k++) {
      if (isReached[row[k]!] === 1) continue;
      isReached[row[k]!] = 1;
      waiting.push(row[k]!);
    }
  }
  return isReached;
}

/** Leaves b − A x in b; returns the largest |b − A x| of a row relative to its |A| |x| + |b|. */
export function subtractProduct(
  { size, start, column, re, im }: ComplexSystem,
  x: ComplexVector,
  b: ComplexVector,
): number {
  let largest = 0;
  for (let i = 0; i < size; i++) {
    let sumRe = b.re[i]!;
    let sumIm = b.im[i]!;
    let terms = Math.abs(sumRe) + Math.abs(sumIm);
    for (let k = start[i]!; k < start[i + 1]!; k++) {
      const xRe = x.re[column[k]!]!;
      const xIm = x.im[column[k]!]!;
      const termRe = re[k]! * xRe - im[k]! * xIm;
      const termIm = re[k]! * xIm + im[k]! * xRe;
      sumRe -= termRe;
      sumIm -= termIm;
      terms += Math.abs(termRe) + Math.abs(termIm);
    }
    b.re[i] = sumRe;
    b.im[i] = sumIm;
    const left = Math.abs(sumRe) + Math.abs(sumIm);
    if (left > largest * terms) largest = left / terms;
  }
  return largest;
}
