/**
 * Sparse linear equations in complex doubles: how the self-check solves the drawing directly. Written for it alone, so that
 * a fault in the elimination cannot hide in both.
 */

/** One row: entries (re[k], im[k]) in columns column[k], each column at most once. */
export interface ComplexRow {
  readonly column: number[];
  readonly re: number[];
  readonly im: number[];
}

/** Opaque; for `solveComplex`. */
export interface ComplexFactors {
  readonly steps: readonly Step[];
}

interface Step {
  readonly row: number;
  readonly column: number;
  readonly pivotRe: number;
  readonly pivotIm: number;
  /** What is left of the row right of the pivot. */
  readonly rest: ComplexRow;
  /** Rows that lost a multiple of this one, with the multiples. */
  readonly targets: readonly number[];
  readonly factorRe: readonly number[];
  readonly factorIm: readonly number[];
}

/** A pivot is at least this fraction of the largest entry of its column: multipliers stay below 10. */
const THRESHOLD = 0.1;

interface Elimination {
  readonly rows: readonly ComplexRow[];
  readonly done: Uint8Array;
  /** For each column the rows that hold or held it. */
  readonly holders: number[][];
  readonly columnDone: Uint8Array;
  /** Columns waiting by how many rows hold them; entries may be out of date. */
  readonly waiting: number[][];
  readonly count: Int32Array;
  /** Place of a column in the row in hand, counted from 1. */
  readonly place: Int32Array;
}

/**
 * Factors a square system; the rows are used up. Always the column with the fewest rows, in it the shortest row whose
 * entry is not too small (threshold pivoting; Duff, Erisman & Reid 1986, Direct Methods for Sparse Matrices, chapter 7).
 *
 * @returns null where no pivot other than zero is left.
 */
export function factorComplex(rows: readonly ComplexRow[]): ComplexFactors | null {
  const work = begin(rows);
  const steps: Step[] = [];
  while (steps.length < rows.length) {
    const column = nextColumn(work);
    const step = column === null ? null : eliminateColumn(work, column);
    if (step === null) return null;
    steps.push(step);
  }
  return { steps };
}

function begin(rows: readonly ComplexRow[]): Elimination {
  const n = rows.length;
  const holders: number[][] = Array.from({ length: n }, () => []);
  rows.forEach(({ column }, row) => {
    for (const c of column) holders[c]!.push(row);
  });
  const waiting: number[][] = Array.from({ length: n + 1 }, () => []);
  const count = new Int32Array(n);
  for (let c = n - 1; c >= 0; c--) {
    count[c] = holders[c]!.length;
    waiting[count[c]!]!.push(c);
  }
  return {
    rows,
    done: new Uint8Array(n),
    holders,
    columnDone: new Uint8Array(n),
    waiting,
    count,
    place: new Int32Array(n),
  };
}

/** The open column held by the fewest rows; null where one is held by none. */
function nextColumn({ waiting, count, columnDone }: Elimination): number | null {
  for (let held = 0; held < waiting.length; held++) {
    const columns = waiting[held]!;
    for (let c = columns.pop(); c !== undefined; c = columns.pop()) {
      if (columnDone[c] === 0 && count[c] === held) return held === 0 ? null : c;
    }
  }
  return null;
}

function recount({ waiting, count }: Elimination, column: number, change: number): void {
  count[column]! += change;
  waiting[count[column]!]!.push(column);
}

function eliminateColumn(work: Elimination, column: number): Step | null {
  const holders = openHolders(work, column);
  const row = choosePivotRow(work, holders, column);
  if (row === null) return null;
  const rest = work.rows[row]!;
  const [pivotRe, pivotIm] = takeEntry(rest, column);
  work.done[row] = 1;
  work.columnDone[column] = 1;
  for (const c of rest.column) recount(work, c, -1);
  const targets: number[] = [];
  const factorRe: number[] = [];
  const factorIm: number[] = [];
  const size = pivotRe * pivotRe + pivotIm * pivotIm;
  for (const target of holders) {
    if (target === row) continue;
    const [re, im] = takeEntry(work.rows[target]!, column);
    const fRe = (re * pivotRe + im * pivotIm) / size;
    const fIm = (im * pivotRe - re * pivotIm) / size;
    subtract(work, target, rest, fRe, fIm);
    targets.push(target);
    factorRe.push(fRe);
    factorIm.push(fIm);
  }
  return { row, column, pivotRe, pivotIm, rest, targets, factorRe, factorIm };
}

/** Rows not yet used that hold the column, each once. */
function openHolders({ holders, done, rows }: Elimination, column: number): number[] {
  const open: number[] = [];
  for (const row of new Set(holders[column]!)) {
    if (done[row] === 0 && rows[row]!.column.includes(column)) open.push(row);
  }
  return open;
}

function choosePivotRow({ rows }: Elimination, holders: readonly number[], column: number): number | null {
  let largest = 0;
  const sizes = holders.map(row => {
    const at = rows[row]!.column.indexOf(column);
    const size = Math.hypot(rows[row]!.re[at]!, rows[row]!.im[at]!);
    largest = Math.max(largest, size);
    return size;
  });
  let best: number | null = null;
  holders.forEach((row, i) => {
    if (sizes[i] === 0 || sizes[i]! < THRESHOLD * largest) return;
    if (best === null || rows[row]!.column.length < rows[best]!.column.length) best = row;
  });
  return best;
}

/** Takes a column's entry out of a row. */
function takeEntry({ column, re, im }: ComplexRow, wanted: number): [re: number, im: number] {
  const at = column.indexOf(wanted);
  const entry: [number, number] = [re[at]!, im[at]!];
  const last = column.length - 1;
  column[at] = column[last]!;
  re[at] = re[last]!;
  im[at] = im[last]!;
  column.pop();
  re.pop();
  im.pop();
  return entry;
}

/** Row target minus factor × rest. Entries that cancel are kept as zeros. */
function subtract(work: Elimination, target: number, rest: ComplexRow, fRe: number, fIm: number): void {
  const { column, re, im } = work.rows[target]!;
  const { place } = work;
  for (let k = 0; k < column.length; k++) place[column[k]!] = k + 1;
  for (let k = 0; k < rest.column.length; k++) {
    const c = rest.column[k]!;
    const changeRe = fRe * rest.re[k]! - fIm * rest.im[k]!;
    const changeIm = fRe * rest.im[k]! + fIm * rest.re[k]!;
    const at = place[c]! - 1;
    if (at >= 0) {
      re[at]! -= changeRe;
      im[at]! -= changeIm;
    } else {
      column.push(c);
      re.push(-changeRe);
      im.push(-changeIm);
      work.holders[c]!.push(target);
      recount(work, c, 1);
    }
  }
  for (const c of column) place[c] = 0;
}

/** A vector of complex numbers. */
export interface ComplexVector {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** A row of its own. */
export function copyRow({ column, re, im }: ComplexRow): ComplexRow {
  return { column: [...column], re: [...re], im: [...im] };
}

/** Most steps of refinement; each gains about as many digits as elimination kept, so two or three do where any do. */
const MOST_STEPS = 6;

/** Largest relative change of an entry that counts as rounding: a few units in the last place. */
const ROUNDING = 8 * Number.EPSILON;

/**
 * Solves for one right-hand side and refines until the solution answers to a system whose every entry differs by rounding
 * only. Elimination alone promises that for the largest entries; signals of a drawing differ by many orders of magnitude
 * (Oettli & Prager 1964, Numer. Math. 6; Skeel 1980, Math. Comp. 35; Arioli, Demmel & Duff 1989, SIAM J. Matrix Anal. Appl. 10).
 *
 * @param rows  The system that was factored; row i is what determines unknown i. An unknown that no path of rows leads to
 *              from the right-hand side is zero, and comes out so.
 */
export function solveRefined(
  rows: readonly ComplexRow[],
  factors: ComplexFactors,
  re: Float64Array,
  im: Float64Array,
): ComplexVector {
  const isReached = reachedUnknowns(rows, re, im);
  const solution = solveComplex(factors, re.slice(), im.slice());
  keepReached(solution, isReached);
  let before = Number.POSITIVE_INFINITY;
  for (let step = 0; step < MOST_STEPS; step++) {
    const left = { re: re.slice(), im: im.slice() };
    const error = subtractProduct(rows, solution, left);
    if (error <= ROUNDING || error > before / 2) break;
    before = error;
    const correction = solveComplex(factors, left.re, left.im);
    keepReached(correction, isReached);
    for (let i = 0; i < rows.length; i++) {
      solution.re[i]! += correction.re[i]!;
      solution.im[i]! += correction.im[i]!;
    }
  }
  return solution;
}

/** 1 for each unknown whose row has a right-hand side or holds a reached unknown. */
function reachedUnknowns(rows: readonly ComplexRow[], re: Float64Array, im: Float64Array): Uint8Array {
  const holders: number[][] = rows.map(() => []);
  rows.forEach(({ column }, row) => {
    for (const c of column) holders[c]!.push(row);
  });
  const isReached = new Uint8Array(rows.length);
  const waiting: number[] = [];
  const reach = (unknown: number) => {
    if (isReached[unknown] === 1) return;
    isReached[unknown] = 1;
    waiting.push(unknown);
  };
  for (let i = 0; i < rows.length; i++) if (re[i] !== 0 || im[i] !== 0) reach(i);
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) holders[next]!.forEach(reach);
  return isReached;
}

function keepReached({ re, im }: ComplexVector, isReached: Uint8Array): void {
  for (let i = 0; i < isReached.length; i++) {
    if (isReached[i] === 1) continue;
    re[i] = 0;
    im[i] = 0;
  }
}

/** Leaves b − A x in b; returns the largest |b − A x| relative to |A| |x| + |b| of its row. */
function subtractProduct(rows: readonly ComplexRow[], x: ComplexVector, b: ComplexVector): number {
  let largest = 0;
  rows.forEach(({ column, re, im }, i) => {
    let [sumRe, sumIm] = [b.re[i]!, b.im[i]!];
    let size = Math.abs(sumRe) + Math.abs(sumIm);
    for (let k = 0; k < column.length; k++) {
      const [xRe, xIm] = [x.re[column[k]!]!, x.im[column[k]!]!];
      const termRe = re[k]! * xRe - im[k]! * xIm;
      const termIm = re[k]! * xIm + im[k]! * xRe;
      sumRe -= termRe;
      sumIm -= termIm;
      size += Math.abs(termRe) + Math.abs(termIm);
    }
    b.re[i] = sumRe;
    b.im[i] = sumIm;
    const left = Math.abs(sumRe) + Math.abs(sumIm);
    if (left > largest * size) largest = left / size;
  });
  return largest;
}

/** Solves for one right-hand side, which is overwritten by what elimination makes of it. */
export function solveComplex({ steps }: ComplexFactors, re: Float64Array, im: Float64Array): ComplexVector {
  for (const { row, targets, factorRe, factorIm } of steps) {
    const [bRe, bIm] = [re[row]!, im[row]!];
    if (bRe === 0 && bIm === 0) continue;
    for (let k = 0; k < targets.length; k++) {
      re[targets[k]!]! -= factorRe[k]! * bRe - factorIm[k]! * bIm;
      im[targets[k]!]! -= factorRe[k]! * bIm + factorIm[k]! * bRe;
    }
  }
  const solution = { re: new Float64Array(re.length), im: new Float64Array(re.length) };
  for (let k = steps.length - 1; k >= 0; k--) {
    const { row, column, pivotRe, pivotIm, rest } = steps[k]!;
    let [sumRe, sumIm] = [re[row]!, im[row]!];
    for (let e = 0; e < rest.column.length; e++) {
      const [xRe, xIm] = [solution.re[rest.column[e]!]!, solution.im[rest.column[e]!]!];
      sumRe -= rest.re[e]! * xRe - rest.im[e]! * xIm;
      sumIm -= rest.re[e]! * xIm + rest.im[e]! * xRe;
    }
    const size = pivotRe * pivotRe + pivotIm * pivotIm;
    solution.re[column] = (sumRe * pivotRe + sumIm * pivotIm) / size;
    solution.im[column] = (sumIm * pivotRe - sumRe * pivotIm) / size;
  }
  return solution;
}
