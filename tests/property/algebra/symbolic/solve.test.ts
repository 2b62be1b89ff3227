import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Field } from '../../../../src/algebra/field.ts';
import { rationalField } from '../../../../src/algebra/fields.ts';
import { type Rational, rational } from '../../../../src/algebra/rational.ts';
import {
  createSymbolicField,
  evaluateAt,
  type RationalFunction,
  solveSymbolic,
} from '../../../../src/algebra/symbolic/index.ts';
import { SEED } from '../../../arbitraries/rationals.ts';
import { functionOf, NAMES } from '../../../arbitraries/symbolic.ts';

/** Entries of loops: mostly nothing, else a number, a gain, its inverse, a sum. */
const entry = fc.constantFrom('0', '0', '0', '1', '-1', '1/2', 'K1', '-K1', '1/J', 'b/J', 'K1 + K2', 'tau*b - 1');
const system = fc
  .integer({ min: 1, max: 5 })
  .chain(n =>
    fc.tuple(
      fc.array(fc.array(entry, { minLength: n, maxLength: n }), { minLength: n, maxLength: n }),
      fc.array(fc.array(entry, { minLength: 2, maxLength: 2 }), { minLength: n, maxLength: n }),
    ),
  );

const read = (rows: string[][]) => rows.map(row => row.map(text => functionOf(text)));

/** Gauss-Jordan elimination on the first nonzero pivot over any field; null where the matrix is singular. */
function eliminated<T>(field: Field<T>, matrix: T[][], rightSides: T[][]): T[][] | null {
  const rows = matrix.map((row, i) => [...row, ...(rightSides[i] ?? [])]);
  for (let k = 0; k < rows.length; k++) {
    const at = rows.findIndex((row, i) => i >= k && !field.isZero(row[k] ?? field.zero));
    const pivotRow = rows[at];
    if (pivotRow === undefined) return null;
    rows.splice(at, 1);
    const pivot = pivotRow[k] ?? field.one;
    const scaled = pivotRow.map(value => field.divide(value, pivot));
    rows.forEach((row, i) => {
      const factor = row[k] ?? field.zero;
      rows[i] = row.map((value, j) => field.subtract(value, field.multiply(factor, scaled[j] ?? field.zero)));
    });
    rows.splice(k, 0, scaled);
  }
  return rows.map(row => row.slice(matrix.length));
}

describe('systems solved in symbols', () => {
  test('the solution is that of an elimination over the field itself', () => {
    fc.assert(
      fc.property(system, ([matrix, rightSides]) => {
        const field = createSymbolicField();
        const solution = solveSymbolic(read(matrix), read(rightSides), field.effort);
        expect(solution?.values ?? null).toEqual(eliminated(field, read(matrix), read(rightSides)));
      }),
      { seed: SEED, numRuns: 50 },
    );
  });

  test('numbers put in before or after the elimination give the same, wherever the numbers have a solution', () => {
    const point = new Map<string, Rational>(NAMES.map((name, k) => [name, rational(BigInt(2 * k + 3), BigInt(k + 2))]));
    const at = (f: RationalFunction) => evaluateAt(f, rationalField, name => point.get(name) ?? rationalField.zero);
    const numbers = (rows: string[][]) => read(rows).map(row => row.map(f => at(f) ?? rationalField.zero));
    fc.assert(
      fc.property(system, ([matrix, rightSides]) => {
        const expected = eliminated(rationalField, numbers(matrix), numbers(rightSides));
        fc.pre(expected !== null);
        const solution = solveSymbolic(read(matrix), read(rightSides), createSymbolicField().effort);
        expect(solution?.values.map(row => row.map(at))).toEqual(expected);
      }),
      { seed: SEED, numRuns: 50 },
    );
  });
});
