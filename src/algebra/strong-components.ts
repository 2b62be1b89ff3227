/**
 * Strongly connected components of a matrix's graph, in which entry (i, j) leads from j to i. The characteristic polynomial
 * is the product of those of the diagonal blocks that they cut out, so the expensive steps meet smaller matrices.
 */

import type { SparseMatrix } from './sparse-matrix.ts';

/**
 * Index sets of the components, each ascending; a component comes after those it depends on. Isolated indices are components
 * of their own (Tarjan 1972, SIAM J. Comput. 1, with a stack of its own instead of recursion). O(rows + entries).
 */
export function strongComponents(matrix: SparseMatrix<unknown>): number[][] {
  const { rows: n, rowStart, column } = matrix;
  const order = new Int32Array(n).fill(-1);
  const low = new Int32Array(n);
  const next = rowStart.slice(0, n);
  const isOpen = new Uint8Array(n);
  const open: number[] = [];
  const components: number[][] = [];
  let visited = 0;
  const enter = (v: number, path: number[]): void => {
    order[v] = visited;
    low[v] = visited++;
    isOpen[v] = 1;
    open.push(v);
    path.push(v);
  };
  for (let root = 0; root < n; root++) {
    if (order[root]! >= 0) continue;
    const path: number[] = [];
    enter(root, path);
    while (path.length > 0) {
      const v = path[path.length - 1]!;
      if (next[v]! < rowStart[v + 1]!) {
        const w = column[next[v]!++]!;
        if (order[w]! < 0) enter(w, path);
        else if (isOpen[w] === 1 && order[w]! < low[v]!) low[v] = order[w]!;
        continue;
      }
      path.pop();
      const parent = path[path.length - 1];
      if (parent !== undefined && low[v]! < low[parent]!) low[parent] = low[v]!;
      if (low[v] === order[v]) components.push(closeComponent(v, open, isOpen));
    }
  }
  return components;
}

/** Takes the component whose first visited index is v off the stack of open ones. */
function closeComponent(v: number, open: number[], isOpen: Uint8Array): number[] {
  const members = open.splice(open.lastIndexOf(v));
  for (const w of members) isOpen[w] = 0;
  return members.sort((a, b) => a - b);
}

/** The square submatrix on the given ascending indices. */
export function principalSubmatrix<T>(matrix: SparseMatrix<T>, indices: readonly number[]): SparseMatrix<T> {
  if (indices.length === matrix.rows && matrix.rows === matrix.columns) return matrix;
  const place = new Map(indices.map((index, k) => [index, k]));
  const rowStart = new Int32Array(indices.length + 1);
  const column: number[] = [];
  const values: T[] = [];
  indices.forEach((i, row) => {
    for (let k = matrix.rowStart[i]!; k < matrix.rowStart[i + 1]!; k++) {
      const j = place.get(matrix.column[k]!);
      if (j === undefined) continue;
      column.push(j);
      values.push(matrix.values[k]!);
    }
    rowStart[row + 1] = values.length;
  });
  return { rows: indices.length, columns: indices.length, rowStart, column: Int32Array.from(column), values };
}
