/** What placing a block has to know of the visible sheet, and ask of it; the sheet hands its own functions in. */

import type { Point } from '../../diagram/index.ts';

export interface SheetView {
  /** Where the first block of an empty sheet goes: at the left, since signals run to the right. Sheet units. */
  readonly start: () => Point;
  /** The middle of what is seen. */
  readonly centre: () => Point;
  /** Where a point of the sheet is in the window, pixels. */
  readonly onScreen: (point: Point) => { readonly x: number; readonly y: number };
  /** Pans as far as is needed to see the point. */
  readonly reveal: (point: Point) => void;
}

let current: SheetView = {
  start: () => [0, 0],
  centre: () => [0, 0],
  onScreen: ([x, y]) => ({ x, y }),
  reveal: () => undefined,
};

export function sheetView(): SheetView {
  return current;
}

export function setSheetView(view: SheetView): void {
  current = view;
}
