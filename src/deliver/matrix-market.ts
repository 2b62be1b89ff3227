/**
 * The model as Matrix Market exchange files (NIST: Boisvert, Pozo & Remington 1996, NISTIR 5935), one a matrix, in a zip:
 * A.mtx, B.mtx, C.mtx, D.mtx and x0.mtx, coordinate form, entries column by column. Names stand in the comments.
 */

import type { SparseMatrix } from '../algebra/index.ts';
import type { SignalName } from '../compile/index.ts';
import { zipped } from './archive.ts';
import { CAUTION } from './caution.ts';
import { nonzeroEntries } from './entries.ts';
import type { ModelContext } from './format.ts';
import { wrapped } from './one-line.ts';

/** The exchange format is in ASCII with lines of at most 1024 characters; comments here keep well below. */
const COMMENT_WIDTH = 100;

/** The zip of the five files. */
export function writeMatrixMarket({ derivation: { model } }: ModelContext) {
  const { states, inputs, outputs, numeric, initialState, title } = model;
  const file = (name: string, meaning: string, matrix: Entries, rows: readonly Label[], columns: readonly Label[]) => ({
    name: `${name}.mtx`,
    content: matrixFile(
      [title, `${name}: ${meaning}`, ...labels('row', rows), ...labels('column', columns), CAUTION],
      matrix,
    ),
  });
  return zipped([
    file('A', 'dx/dt = A x + B u', entriesOf(numeric.A), states, states),
    file('B', 'dx/dt = A x + B u', entriesOf(numeric.B), states, inputs),
    file('C', 'y = C x + D u', entriesOf(numeric.C), outputs, states),
    file('D', 'y = C x + D u', entriesOf(numeric.D), outputs, inputs),
    file('x0', 'x at time zero', entriesOfColumn(initialState), states, []),
  ]);
}

type Label = Pick<SignalName, 'name'>;

interface Entries {
  readonly rows: number;
  readonly columns: number;
  readonly entries: readonly { readonly row: number; readonly column: number; readonly value: number }[];
}

function entriesOf(matrix: SparseMatrix<number>): Entries {
  return { rows: matrix.rows, columns: matrix.columns, entries: nonzeroEntries(matrix) };
}

function entriesOfColumn(values: readonly number[]): Entries {
  const entries = values.map((value, row) => ({ row, column: 0, value })).filter(({ value }) => value !== 0);
  return { rows: values.length, columns: 1, entries };
}

function labels(side: 'row' | 'column', names: readonly Label[]): string[] {
  return names.map(({ name }, i) => `${side} ${i + 1}: ${name}`);
}

/** One exchange file: header, comments, the size line, an entry a line with row and column counted from 1. */
function matrixFile(comments: readonly string[], { rows, columns, entries }: Entries): string {
  const lines = [
    '%%MatrixMarket matrix coordinate real general',
    ...comments.flatMap(comment => wrapped(inAscii(comment), COMMENT_WIDTH)).map(line => `% ${line}`.trimEnd()),
    `${rows} ${columns} ${entries.length}`,
    ...entries.map(({ row, column, value }) => `${row + 1} ${column + 1} ${value}`),
  ];
  return `${lines.join('\n')}\n`;
}

/** Characters outside ASCII as their code point: ω becomes U+03C9. */
function inAscii(text: string): string {
  return text.replace(/[^\p{ASCII}]/gu, character => {
    const code = (character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');
    return `U+${code}`;
  });
}
