/** The pointing slice: the entry of the system matrix or the part of the drawing that is pointed at, and what the worker said of it. */

import type { TraceAnswer } from '../../worker/index.ts';

/** A block by its path, or the wire that ends at a port. */
export type PointedPart =
  | { readonly block: string }
  | { readonly wire: { readonly sheet: string; readonly block: string; readonly port: number } };

export interface PointingSlice {
  readonly entry: { readonly row: number; readonly column: number } | null;
  /** `hover` follows the pointer, `walk` the arrow keys; what is kept stays until it is let go. */
  readonly by: 'hover' | 'walk' | 'keep';
  readonly part: PointedPart | null;
  /** Blocks, by path, with states of modes that are hidden: marked while the structure is looked at. */
  readonly hidden: readonly string[];
  /** The last answer, perhaps of what was pointed at before. */
  readonly answer: TraceAnswer | null;
}

export const NOTHING_POINTED: PointingSlice = { entry: null, by: 'hover', part: null, hidden: [], answer: null };

/** The slice after an entry is pointed at: the pointer passes by what is kept or walked to; keeping the kept one lets go of it. */
export function entryPointed(
  slice: PointingSlice,
  row: number,
  column: number,
  by: PointingSlice['by'],
): PointingSlice {
  if (by === 'hover' && slice.entry !== null && slice.by !== 'hover') return slice;
  const isSame = slice.entry?.row === row && slice.entry.column === column;
  if (isSame && by === slice.by) return by === 'keep' ? { ...slice, entry: null, by: 'hover' } : slice;
  return { ...slice, entry: isSame ? slice.entry : { row, column }, by };
}

/** The slice after the pointer, the focus or Escape has left the entries: each ends its own way of pointing, Escape any. */
export function entryLeft(slice: PointingSlice, by: 'hover' | 'walk' | 'escape'): PointingSlice {
  const isOver = by === 'escape' || by === slice.by;
  return slice.entry === null || !isOver ? slice : { ...slice, entry: null, by: 'hover' };
}
