/** Exact objects of the tests from and to the way a textbook prints them. */

import {
  fromRows,
  type Polynomial,
  parseRational,
  type Rational,
  type SparseMatrix,
  toFraction,
} from '../../../src/algebra/index.ts';

function exactly(text: string): Rational {
  const value = parseRational(text);
  if (value === null) throw new Error(`not a number: ${text}`);
  return value;
}

/** Coefficients in descending powers: `1 -3/2 0`. */
export function poly(text: string): Polynomial {
  return text.split(' ').map(exactly);
}

export function written(p: Polynomial): string {
  return p.map(toFraction).join(' ');
}

export type WrittenRows = readonly (readonly (number | string)[])[];

export function exactRows(rows: WrittenRows): Rational[][] {
  return rows.map(row => row.map(entry => exactly(String(entry))));
}

export function matrix(rows: WrittenRows, columns: number = rows.length): SparseMatrix<Rational> {
  return fromRows(exactRows(rows), columns, ({ n }) => n === 0n);
}
