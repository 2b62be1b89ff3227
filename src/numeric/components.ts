/**
 * Strongly connected components of a square matrix's nonzero pattern: eigenvalues of the whole are those of the diagonal
 * blocks, so each block is balanced and reduced by itself and an uncoupled state keeps its eigenvalue to the last bit.
 */

import type { DenseMatrix } from './dense-matrix.ts';

/**
 * Index sets of the irreducible diagonal blocks of A (n × n), each ascending, ordered by their first index.
 *
 * Tarjan 1972, SIAM J. Comput. 1(2), with an explicit stack. O(n²) for the dense pattern.
 */
export function irreducibleBlocks(A: DenseMatrix): readonly (readonly number[])[] {
  const n = A.rows;
  const walk = { order: new Int32Array(n), low: new Int32Array(n), next: new Int32Array(n), open: [] as number[] };
  const isOpen = new Uint8Array(n);
  const blocks: number[][] = [];
  let visited = 0;
  const path: number[] = [];
  for (let root = 0; root < n; root++) {
    if (walk.order[root] !== 0) continue;
    path.push(root);
    while (path.length > 0) {
      const node = path[path.length - 1]!;
      if (walk.order[node] === 0) {
        walk.order[node] = walk.low[node] = ++visited;
        walk.open.push(node);
        isOpen[node] = 1;
      }
      const child = nextUnvisited(A, node, walk, isOpen);
      if (child >= 0) {
        path.push(child);
        continue;
      }
      path.pop();
      const parent = path[path.length - 1];
      if (parent !== undefined) walk.low[parent] = Math.min(walk.low[parent]!, walk.low[node]!);
      if (walk.low[node] === walk.order[node]) blocks.push(closeBlock(node, walk.open, isOpen));
    }
  }
  return blocks.sort((a, b) => a[0]! - b[0]!);
}

interface Walk {
  readonly order: Int32Array;
  readonly low: Int32Array;
  readonly next: Int32Array;
}

/** The next neighbour not yet visited, or −1; lowers the node's low link by open neighbours on the way. */
function nextUnvisited({ columns, data }: DenseMatrix, node: number, walk: Walk, isOpen: Uint8Array): number {
  for (let j = walk.next[node]!; j < columns; j++) {
    if (j === node || data[node * columns + j] === 0) continue;
    if (walk.order[j] === 0) {
      walk.next[node] = j;
      return j;
    }
    if (isOpen[j] === 1) walk.low[node] = Math.min(walk.low[node]!, walk.order[j]!);
  }
  walk.next[node] = columns;
  return -1;
}

function closeBlock(root: number, open: number[], isOpen: Uint8Array): number[] {
  const block = open.splice(open.lastIndexOf(root));
  for (const node of block) isOpen[node] = 0;
  return block.sort((a, b) => a - b);
}

/** The square submatrix of A with the given rows and columns. */
export function submatrix(A: DenseMatrix, rows: readonly number[], columns: readonly number[]): DenseMatrix {
  const data = new Float64Array(rows.length * columns.length);
  rows.forEach((row, i) => {
    columns.forEach((column, j) => {
      data[i * columns.length + j] = A.data[row * A.columns + column]!;
    });
  });
  return { rows: rows.length, columns: columns.length, data };
}
