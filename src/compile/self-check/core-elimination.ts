/** The core of a sparse elimination, where rows fill in: in a drawing, its loops. */

import { beginStep, endStep, pushRest, pushTarget, type Work } from './elimination-steps.ts';

/** A pivot of the core is at least this fraction of the largest entry of its column: multipliers stay below 10. */
const THRESHOLD = 0.1;

/**
 * Eliminates what is left: always the column with the fewest rows, in it the shortest row whose entry is not too small
 * (threshold pivoting; Duff, Erisman & Reid 1986, Direct Methods for Sparse Matrices, chapter 7). False where no pivot other
 * than zero is left.
 */
export function eliminateCore(work: Work): boolean {
  const core = coreOf(work);
  while (work.factors.row.length < work.system.size) {
    const column = nextColumn(core);
    if (column === null || !eliminateColumn(work, core, column)) return false;
  }
  return true;
}

interface CoreRow {
  readonly column: number[];
  readonly re: number[];
  readonly im: number[];
}

/** What neither end of the substitution reaches. */
interface Core {
  /** By row number; empty for rows taken. */
  readonly rows: readonly CoreRow[];
  /** For each column the core rows that hold or held it. */
  readonly holders: readonly number[][];
  readonly count: Int32Array;
  /** Columns by how many rows hold them; entries may be out of date. */
  readonly waiting: number[][];
  /** Place of a column in the row in hand, counted from 1. */
  readonly place: Int32Array;
  readonly columnDone: Uint8Array;
}

const TAKEN: CoreRow = { column: [], re: [], im: [] };
const NOBODY: number[] = [];

function coreOf({ system, rowDone, columnDone, factors }: Work): Core {
  const { size, start, column } = system;
  const left = size - factors.row.length;
  const rows: CoreRow[] = new Array<CoreRow>(size).fill(TAKEN);
  const holders: number[][] = new Array<number[]>(size).fill(NOBODY);
  for (let c = 0; c < size; c++) if (columnDone[c] === 0) holders[c] = [];
  for (let i = 0; i < size; i++) {
    if (rowDone[i] === 1) continue;
    const row: CoreRow = { column: [], re: [], im: [] };
    for (let k = start[i]!; k < start[i + 1]!; k++) {
      if (columnDone[column[k]!] === 1) continue;
      row.column.push(column[k]!);
      row.re.push(system.re[k]!);
      row.im.push(system.im[k]!);
      holders[column[k]!]!.push(i);
    }
    rows[i] = row;
  }
  const count = Int32Array.from(holders, list => list.length);
  const waiting: number[][] = Array.from({ length: left + 1 }, () => []);
  for (let c = size - 1; c >= 0; c--) if (columnDone[c] === 0) waiting[count[c]!]!.push(c);
  return { rows, holders, count, waiting, place: new Int32Array(size), columnDone };
}

/** The open column held by the fewest rows; null where one is held by none. */
function nextColumn({ waiting, count, columnDone }: Core): number | null {
  for (let held = 0; held < waiting.length; held++) {
    const columns = waiting[held]!;
    for (let c = columns.pop(); c !== undefined; c = columns.pop()) {
      if (columnDone[c] === 0 && count[c] === held) return held === 0 ? null : c;
    }
  }
  return null;
}

function recount({ waiting, count }: Core, column: number, change: number): void {
  count[column]! += change;
  waiting[count[column]!]!.push(column);
}

/** False where the column has no pivot. */
function eliminateColumn(work: Work, core: Core, column: number): boolean {
  const open = openHolders(work, core, column);
  const row = choosePivotRow(core, open, column);
  if (row === null) return false;
  const pivotRow = core.rows[row]!;
  const [pivotRe, pivotIm] = takeEntry(pivotRow, column);
  beginStep(work, row, column, pivotRe, pivotIm);
  for (let k = 0; k < pivotRow.column.length; k++) {
    pushRest(work, pivotRow.column[k]!, pivotRow.re[k]!, pivotRow.im[k]!);
    recount(core, pivotRow.column[k]!, -1);
  }
  const { factorRe, factorIm } = work.factors;
  for (const target of open) {
    if (target === row) continue;
    const [re, im] = takeEntry(core.rows[target]!, column);
    pushTarget(work, target, re, im);
    subtractRow(core, target, pivotRow, factorRe[factorRe.length - 1]!, factorIm[factorIm.length - 1]!);
  }
  endStep(work);
  return true;
}

/** Rows not yet taken that hold the column, each once. */
function openHolders({ rowDone }: Work, { holders, rows }: Core, column: number): number[] {
  const open: number[] = [];
  for (const row of holders[column]!) {
    if (rowDone[row] === 0 && rows[row]!.column.includes(column) && !open.includes(row)) open.push(row);
  }
  return open;
}

function choosePivotRow({ rows }: Core, holders: readonly number[], column: number): number | null {
  let largest = 0;
  const sizes = holders.map(row => {
    const at = rows[row]!.column.indexOf(column);
    const size = Math.abs(rows[row]!.re[at]!) + Math.abs(rows[row]!.im[at]!);
    largest = Math.max(largest, size);
    return size;
  });
  let best: number | null = null;
  for (let i = 0; i < holders.length; i++) {
    if (sizes[i] === 0 || sizes[i]! < THRESHOLD * largest) continue;
    const row = holders[i]!;
    if (best === null || rows[row]!.column.length < rows[best]!.column.length) best = row;
  }
  return best;
}

/** Takes a column's entry out of a row; the last takes its place. */
function takeEntry({ column, re, im }: CoreRow, wanted: number): readonly [re: number, im: number] {
  const at = column.indexOf(wanted);
  const entry = [re[at]!, im[at]!] as const;
  const last = column.length - 1;
  column[at] = column[last]!;
  re[at] = re[last]!;
  im[at] = im[last]!;
  column.length = last;
  re.length = last;
  im.length = last;
  return entry;
}

/** Row target minus factor × row. Entries that cancel are kept as zeros. */
function subtractRow(core: Core, target: number, row: CoreRow, fRe: number, fIm: number): void {
  const { column, re, im } = core.rows[target]!;
  const { place } = core;
  for (let k = 0; k < column.length; k++) place[column[k]!] = k + 1;
  for (let k = 0; k < row.column.length; k++) {
    const c = row.column[k]!;
    const changeRe = fRe * row.re[k]! - fIm * row.im[k]!;
    const changeIm = fRe * row.im[k]! + fIm * row.re[k]!;
    const at = place[c]! - 1;
    if (at >= 0) {
      re[at]! -= changeRe;
      im[at]! -= changeIm;
    } else {
      column.push(c);
      re.push(-changeRe);
      im.push(-changeIm);
      core.holders[c]!.push(target);
      recount(core, c, 1);
    }
  }
  for (let k = 0; k < column.length; k++) place[column[k]!] = 0;
}
