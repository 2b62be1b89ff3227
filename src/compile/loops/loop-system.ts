/** The equations of one algebraic loop by themselves: y = M y + what comes from outside. */

import { type Equations, RowAccumulator, RowStore } from '../equations/index.ts';

/** Coefficients among the n signals of a loop. */
export interface LoopSystem<T> {
  /** M, n × n: what each signal takes from the others. */
  readonly gains: RowStore<T>;
  /** I − M. */
  readonly matrix: RowStore<T>;
}

/**
 * The system of the loop through the given signals.
 *
 * @param place  For each signal of the drawing its place in the loop, −1 outside it.
 */
export function loopSystem<T>(
  { arithmetic, rows, known }: Equations<T>,
  members: ArrayLike<number>,
  place: Int32Array,
): LoopSystem<T> {
  const { field } = arithmetic;
  const gains = new RowStore(arithmetic, members.length, 4 * members.length);
  const matrix = new RowStore(arithmetic, members.length, 4 * members.length);
  const row = new RowAccumulator(arithmetic, members.length);
  for (let i = 0; i < members.length; i++) {
    row.add(i, field.one);
    for (let k = rows.start[members[i]!]!; k < rows.start[members[i]! + 1]!; k++) {
      const column = rows.column[k]! - known;
      const j = column < 0 ? -1 : place[column]!;
      if (j < 0) continue;
      gains.push(j, rows.values[k]!);
      row.add(j, field.negate(rows.values[k]!));
    }
    gains.endRow();
    row.finishRow(matrix);
  }
  return { gains, matrix };
}
