/** Moving through the system matrix by keyboard. */

/** A place in the table: rows are states then outputs, columns states then inputs. */
export interface MatrixPlace {
  readonly row: number;
  readonly column: number;
}

/**
 * Where `key` leads from `place` in a table of `rows` × `columns`: arrows one step, Home and End along the row, Page Up and
 * Page Down to the ends of the column. From nowhere every one of them enters at the first entry.
 *
 * @returns null where the key does not move, or there is no entry at all.
 */
export function placeAfter(key: string, place: MatrixPlace | null, rows: number, columns: number): MatrixPlace | null {
  const step = STEPS[key];
  if (step === undefined || rows === 0 || columns === 0) return null;
  if (place === null) return { row: 0, column: 0 };
  const [down, right] = step;
  return { row: within(place.row + down, rows), column: within(place.column + right, columns) };
}

/** [rows down, columns to the right]. */
const STEPS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
  PageUp: [Number.NEGATIVE_INFINITY, 0],
  PageDown: [Number.POSITIVE_INFINITY, 0],
  Home: [0, Number.NEGATIVE_INFINITY],
  End: [0, Number.POSITIVE_INFINITY],
};

function within(index: number, count: number): number {
  return Math.max(0, Math.min(count - 1, index));
}
