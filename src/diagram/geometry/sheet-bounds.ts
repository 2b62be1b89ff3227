/** Places on the sheet: snapping to the grid, a block's rectangle, the rectangle of a whole drawing. */

import type { Block, Point, Sheet } from '../types.ts';
import { sheetGeometry } from './sheet-geometry.ts';
import { type BlockGeometry, GRID, type Rectangle, type SheetGeometry } from './types.ts';

/** The grid point nearest to a point, halves away from zero downwards and to the right. */
export function snap([x, y]: Point): Point {
  const onGrid = (value: number): number => Math.floor(value / GRID + 0.5) * GRID + 0;
  return [onGrid(x), onGrid(y)];
}

/** A block's frame in sheet coordinates, `margin` wider on every side. */
export function blockRectangle(block: Block, { box }: BlockGeometry, margin = 0): Rectangle {
  const [x, y] = block.at ?? [0, 0];
  const halfWidth = box.width / 2 + margin;
  const halfHeight = box.height / 2 + margin;
  return { left: x - halfWidth, right: x + halfWidth, top: y - halfHeight, bottom: y + halfHeight };
}

/** The smallest rectangle around all rectangles; null where there are none. */
export function enclosing(rectangles: readonly Rectangle[]): Rectangle | null {
  const first = rectangles[0];
  if (first === undefined) return null;
  let { left, top, right, bottom } = first;
  for (const rectangle of rectangles) {
    left = Math.min(left, rectangle.left);
    top = Math.min(top, rectangle.top);
    right = Math.max(right, rectangle.right);
    bottom = Math.max(bottom, rectangle.bottom);
  }
  return { left, top, right, bottom };
}

/**
 * The smallest rectangle around every block of the sheet, with its labels and the bend points of its wires, and around
 * its annotations; null for an empty sheet.
 *
 * @param geometry  that of the same sheet, where it is at hand.
 */
export function sheetBounds(sheet: Sheet, geometry: SheetGeometry = sheetGeometry(sheet)): Rectangle | null {
  const rectangles: Rectangle[] = [];
  for (const block of sheet.blocks) {
    const placed = geometry.get(block.id);
    if (placed === undefined) continue;
    const [x, y] = block.at ?? [0, 0];
    rectangles.push(blockRectangle(block, placed));
    for (const { area } of placed.labels) {
      rectangles.push({ left: x + area.left, right: x + area.right, top: y + area.top, bottom: y + area.bottom });
    }
  }
  for (const { via } of sheet.wires) {
    for (const [x, y] of via ?? []) rectangles.push({ left: x, right: x, top: y, bottom: y });
  }
  for (const { at, size } of sheet.annotations ?? []) {
    rectangles.push({ left: at[0], right: at[0] + size[0], top: at[1], bottom: at[1] + size[1] });
  }
  return enclosing(rectangles);
}
