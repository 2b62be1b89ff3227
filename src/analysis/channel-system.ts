/**
 * The dense part of a model that lies between one input and some outputs: states that the input cannot reach along any
 * action path, or that reach none of the outputs, are left out, so they cost nothing and cannot disturb. Before every time
 * and frequency answer.
 */

import { entryAt, type SparseMatrix } from '../algebra/index.ts';
import type { SystemMatrices } from '../compile/index.ts';
import { type DenseMatrix, zeroMatrix } from '../numeric/index.ts';

/** Kept states in model order; A k × k, B k × inputs, C outputs × k, D outputs × inputs. */
export interface ChannelSystem {
  readonly states: readonly number[];
  readonly A: DenseMatrix;
  readonly B: DenseMatrix;
  readonly C: DenseMatrix;
  readonly D: DenseMatrix;
}

/** The states on action paths from the input to one of the outputs, and their matrices. O(nonzeros + k²). */
export function channelSystem(
  matrices: SystemMatrices<number>,
  input: number,
  outputs: readonly number[],
): ChannelSystem {
  const { A, B, C } = matrices;
  const read = outputs.flatMap(output => rowPattern(C, output));
  const states = intersection(closure(successors(A), columnOf(B, input)), closure(rowsOf(A), read));
  return selectedSystem(matrices, states, [input], outputs);
}

/** The states from which an action path leads to one of the outputs, without inputs. */
export function observedSystem(matrices: SystemMatrices<number>, outputs: readonly number[]): ChannelSystem {
  const { A, C } = matrices;
  const read = closure(
    rowsOf(A),
    outputs.flatMap(output => rowPattern(C, output)),
  );
  return selectedSystem(matrices, intersection(read, read), [], outputs);
}

function selectedSystem(
  { A, B, C, D }: SystemMatrices<number>,
  states: readonly number[],
  inputs: readonly number[],
  outputs: readonly number[],
): ChannelSystem {
  return {
    states,
    A: denseSelection(A, states, states),
    B: denseSelection(B, states, inputs),
    C: denseSelection(C, outputs, states),
    D: denseSelection(D, outputs, inputs),
  };
}

/** The whole of a sparse matrix written out. */
export function denseOf(matrix: SparseMatrix<number>): DenseMatrix {
  const result = zeroMatrix(matrix.rows, matrix.columns);
  for (let i = 0; i < matrix.rows; i++) {
    for (let k = matrix.rowStart[i]!; k < matrix.rowStart[i + 1]!; k++) {
      result.data[i * matrix.columns + matrix.column[k]!] = matrix.values[k]!;
    }
  }
  return result;
}

/** The rows and columns asked for, written out. */
function denseSelection(
  matrix: SparseMatrix<number>,
  rows: readonly number[],
  columns: readonly number[],
): DenseMatrix {
  const result = zeroMatrix(rows.length, columns.length);
  const place = new Int32Array(matrix.columns).fill(-1);
  columns.forEach((column, j) => {
    place[column] = j;
  });
  rows.forEach((row, i) => {
    for (let k = matrix.rowStart[row]!; k < matrix.rowStart[row + 1]!; k++) {
      const j = place[matrix.column[k]!]!;
      if (j >= 0) result.data[i * columns.length + j] = matrix.values[k]!;
    }
  });
  return result;
}

function columnOf(matrix: SparseMatrix<number>, column: number): number[] {
  const rows: number[] = [];
  for (let i = 0; i < matrix.rows; i++) if (entryAt(matrix, i, column, 0) !== 0) rows.push(i);
  return rows;
}

function rowPattern({ rowStart, column }: SparseMatrix<number>, row: number): number[] {
  return [...column.subarray(rowStart[row]!, rowStart[row + 1]!)];
}

/** For each state, the states that feed it. */
function rowsOf(A: SparseMatrix<number>): number[][] {
  return Array.from({ length: A.rows }, (_, i) => rowPattern(A, i));
}

/** For each state, the states that it feeds. */
function successors(A: SparseMatrix<number>): number[][] {
  const lists: number[][] = Array.from({ length: A.columns }, () => []);
  for (let i = 0; i < A.rows; i++) for (const j of rowPattern(A, i)) lists[j]!.push(i);
  return lists;
}

/** Everything that can be reached from the start along the neighbours, the start included. */
function closure(neighbours: readonly (readonly number[])[], start: readonly number[]): Uint8Array {
  const seen = new Uint8Array(neighbours.length);
  const open = [...start];
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    if (seen[node] === 1) continue;
    seen[node] = 1;
    open.push(...neighbours[node]!);
  }
  return seen;
}

function intersection(a: Uint8Array, b: Uint8Array): number[] {
  const both: number[] = [];
  a.forEach((isIn, i) => {
    if (isIn === 1 && b[i] === 1) both.push(i);
  });
  return both;
}
