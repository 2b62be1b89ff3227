/**
 * Reduced row echelon form of written-out rational rows: the exact elimination of the exact room. Zeros cost nothing, so that
 * the sparse rows of a drawing stay cheap.
 */

import { rationalField } from './fields.ts';
import { divideRationals, multiplyRationals, type Rational, subtractRationals } from './rational.ts';

/**
 * Brings the rows to reduced echelon form with respect to their first `columns` entries, in place: pivot rows first, each with
 * 1 in its pivot column, where all other rows have 0. Of several pivots the shortest is taken (Gauss and Jordan). O(rows² ·
 * length) operations.
 *
 * @returns  The pivot columns, ascending; as many as the rank.
 */
export function reduceRows(rows: Rational[][], columns: number): number[] {
  const pivots: number[] = [];
  for (let j = 0; j < columns && pivots.length < rows.length; j++) {
    const at = shortestPivot(rows, j, pivots.length);
    if (at < 0) continue;
    const row = rows[at]!;
    rows[at] = rows[pivots.length]!;
    rows[pivots.length] = row;
    const head = row[j]!;
    row.forEach((x, k) => {
      if (x.n !== 0n) row[k] = divideRationals(x, head);
    });
    rows.forEach((other, i) => {
      if (i !== pivots.length) subtractMultiple(other, other[j]!, row);
    });
    pivots.push(j);
  }
  return pivots;
}

function shortestPivot(rows: readonly (readonly Rational[])[], j: number, from: number): number {
  let best = -1;
  for (let i = from; i < rows.length; i++) {
    const x = rows[i]![j]!;
    if (x.n === 0n) continue;
    if (best < 0 || rationalField.isBetterPivot(x, rows[best]![j]!)) best = i;
  }
  return best;
}

/** target −= factor · row, in place. */
export function subtractMultiple(target: Rational[], factor: Rational, row: readonly Rational[]): void {
  if (factor.n === 0n) return;
  row.forEach((x, k) => {
    if (x.n !== 0n) target[k] = subtractRationals(target[k]!, multiplyRationals(factor, x));
  });
}
