/** Both ends of a sparse elimination, where nothing fills in: in a drawing, all that stands outside its loops. */

import { beginStep, endStep, pushRest, pushTarget, type Work } from './elimination-steps.ts';

/** Takes every row with one unknown left, over and over: only right-hand sides change. */
export function takeRowsOfOne(work: Work): void {
  const { system, factors, rowDone, columnDone, rowCount, columnCount } = work;
  const { columns } = factors;
  const waiting: number[] = [];
  for (let i = system.size - 1; i >= 0; i--) if (rowCount[i] === 1) waiting.push(i);
  for (let row = waiting.pop(); row !== undefined; row = waiting.pop()) {
    if (rowDone[row] === 1) continue;
    let k = system.start[row]!;
    while (columnDone[system.column[k]!] === 1) k += 1;
    if (system.re[k] === 0 && system.im[k] === 0) continue;
    const column = system.column[k]!;
    beginStep(work, row, column, system.re[k]!, system.im[k]!);
    for (let h = columns.start[column]!; h < columns.start[column + 1]!; h++) {
      const target = columns.row[h]!;
      if (rowDone[target] === 1) continue;
      pushTarget(work, target, system.re[columns.at[h]!]!, system.im[columns.at[h]!]!);
      rowCount[target]! -= 1;
      if (rowCount[target] === 1) waiting.push(target);
    }
    columnCount[column] = 0;
    endStep(work);
  }
  countColumns(work);
}

function countColumns({ system, rowDone, columnCount }: Work): void {
  columnCount.fill(0);
  for (let i = 0; i < system.size; i++) {
    if (rowDone[i] === 1) continue;
    for (let k = system.start[i]!; k < system.start[i + 1]!; k++) columnCount[system.column[k]!]! += 1;
  }
}

/** Takes every unknown that one row is left to hold, over and over: nothing is eliminated at all. */
export function takeColumnsOfOne(work: Work): void {
  const { system, factors, rowDone, columnDone, columnCount } = work;
  const { columns } = factors;
  const waiting: number[] = [];
  for (let c = system.size - 1; c >= 0; c--) if (columnDone[c] === 0 && columnCount[c] === 1) waiting.push(c);
  for (let column = waiting.pop(); column !== undefined; column = waiting.pop()) {
    if (columnDone[column] === 1) continue;
    let h = columns.start[column]!;
    while (rowDone[columns.row[h]!] === 1) h += 1;
    const row = columns.row[h]!;
    const [re, im] = [system.re[columns.at[h]!]!, system.im[columns.at[h]!]!];
    if (re === 0 && im === 0) continue;
    beginStep(work, row, column, re, im);
    for (let k = system.start[row]!; k < system.start[row + 1]!; k++) {
      const other = system.column[k]!;
      if (columnDone[other] === 1) continue;
      pushRest(work, other, system.re[k]!, system.im[k]!);
      columnCount[other]! -= 1;
      if (columnCount[other] === 1) waiting.push(other);
    }
    endStep(work);
  }
}
