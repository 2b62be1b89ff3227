/** Generators of rational matrices: sparse as drawings make them, dense, block triangular, derogatory. */

import fc from 'fast-check';
import { fromRows, type Rational, type SparseMatrix, ZERO } from '../../src/algebra/index.ts';
import { shortRational } from './rationals.ts';

/** Rows × columns with about one entry in `spread` not zero. */
export function rowsOf(rows: number, columns: number, spread: number): fc.Arbitrary<Rational[][]> {
  const entry = fc.oneof({ weight: spread - 1, arbitrary: fc.constant(ZERO) }, { weight: 1, arbitrary: shortRational });
  const row = fc.array(entry, { minLength: columns, maxLength: columns });
  return fc.array(row, { minLength: rows, maxLength: rows });
}

/** Square matrices of up to `size` rows, from dense to nearly empty. */
export function squareRows(size: number): fc.Arbitrary<Rational[][]> {
  return fc
    .tuple(fc.integer({ min: 0, max: size }), fc.constantFrom(1, 2, 3, 6))
    .chain(([n, spread]) => rowsOf(n, n, spread));
}

/** The sparse form of written-out rows. */
export function sparse(
  rows: readonly (readonly Rational[])[],
  columns: number = rows[0]?.length ?? 0,
): SparseMatrix<Rational> {
  return fromRows(rows, columns, ({ n }) => n === 0n);
}
