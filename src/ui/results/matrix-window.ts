/**
 * Which rows and columns of a large table are in view. Up to SMALL_MODEL states the whole table is in the page; beyond it
 * rows and columns have one size and only those in view, with a margin, are made.
 */

/**
 * States up to which every entry is in the page. Measured in Chromium on two slow cores: redrawing 40 states with all their
 * cells takes 23 ms with layout, more than a frame, 400 states windowed 3 ms; time goes with the square of the states.
 */
export const SMALL_MODEL = 24;

/** CSS pixels of a row; system-matrix.css holds the same figure. */
export const ROW_HEIGHT = 26;
/** CSS pixels of a column of a windowed table. */
export const COLUMN_WIDTH = 92;
/** CSS pixels of the row heads of a windowed table. */
export const HEAD_WIDTH = 128;
/** CSS pixels of the column heads; system-matrix.css holds the same figure. */
export const HEAD_HEIGHT = 30;

/** Rows or columns made beyond each edge of the view, so that a short scroll shows no gap before the next frame. */
const MARGIN = 4;

/** Indices first ≤ i < end, with the room that those left out take before and after, CSS pixels. */
export interface Span {
  readonly first: number;
  readonly end: number;
  readonly before: number;
  readonly after: number;
}

/** The part of `count` items of `size` pixels that `offset … offset + extent` meets. */
export function spanInView(count: number, size: number, offset: number, extent: number): Span {
  const first = clamp(Math.floor(offset / size) - MARGIN, 0, count);
  const end = clamp(Math.ceil((offset + extent) / size) + MARGIN, first, count);
  return { first, end, before: first * size, after: (count - end) * size };
}

/** All of `count` items. */
export function wholeSpan(count: number): Span {
  return { first: 0, end: count, before: 0, after: 0 };
}

/**
 * Where to scroll so that the item at `index` is in view, moving as little as possible.
 *
 * @param hidden pixels at the start of the view that sticky heads cover.
 */
export function offsetShowing(index: number, size: number, offset: number, extent: number, hidden: number): number {
  const start = index * size;
  if (start < offset) return start;
  const end = start + size + hidden;
  return end > offset + extent ? end - extent : offset;
}

function clamp(value: number, least: number, most: number): number {
  return Math.max(least, Math.min(most, value));
}
