/** Written-out rational matrices: the few products that the change of state needs, and null spaces. */

import {
  addRationals,
  type EchelonBasis,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  reduceRows,
  ZERO,
} from '../../algebra/index.ts';

export type RationalRows = readonly (readonly Rational[])[];

/** a · b, inner dimensions alike; `columns` is that of b, which may have no row. */
export function productOf(a: RationalRows, b: RationalRows, columns: number): Rational[][] {
  return a.map(row => {
    const sum = new Array<Rational>(columns).fill(ZERO);
    row.forEach((factor, k) => {
      if (factor.n === 0n) return;
      b[k]!.forEach((entry, j) => {
        if (entry.n !== 0n) sum[j] = addRationals(sum[j]!, multiplyRationals(factor, entry));
      });
    });
    return sum;
  });
}

/** Σ factors[i] · rows[i], of the given length. */
export function combinationOf(factors: readonly Rational[], rows: RationalRows, length: number): Rational[] {
  return productOf([factors], rows, length)[0]!;
}

/** A basis of the vectors of the given length that are orthogonal to all rows of an echelon basis, one a free column. */
export function complementOf({ pivots, rows }: EchelonBasis, length: number): Rational[][] {
  const isPivot = new Set(pivots);
  const free = Array.from({ length }, (_, column) => column).filter(column => !isPivot.has(column));
  return free.map(column => {
    const vector = new Array<Rational>(length).fill(ZERO);
    vector[column] = ONE;
    pivots.forEach((pivot, i) => {
      vector[pivot] = negateRational(rows[i]![column]!);
    });
    return vector;
  });
}

/** A basis of the vectors x with M x = 0, x of the given length. Exact elimination. */
export function kernelOf(M: RationalRows, length: number): Rational[][] {
  const rows = M.map(row => [...row]);
  const pivots = reduceRows(rows, length);
  return complementOf({ pivots, rows: rows.slice(0, pivots.length) }, length);
}
