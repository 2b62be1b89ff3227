/**
 * Where the sheet has to be put so that the whole drawing is seen and the title block hides nothing of it: the largest zoom
 * among the free areas beside the title block.
 */

import type { Rectangle } from '../../diagram/geometry/index.ts';

export interface Placement {
  readonly x: number;
  readonly y: number;
  readonly zoom: number;
}

export interface FitLimits {
  readonly largestZoom: number;
  readonly smallestZoom: number;
  /** Paper left free around the drawing, pixels. */
  readonly margin: number;
}

/**
 * @param drawing  bounds of the drawing, sheet units.
 * @param area     the visible sheet, pixels from its own corner.
 * @param block    the title block in the same pixels, null where none covers the sheet.
 */
export function fitPlacement(
  drawing: Rectangle,
  area: Rectangle,
  block: Rectangle | null,
  limits: FitLimits,
): Placement {
  const whole = placedIn(area, drawing, limits);
  if (block === null || !covers(block, drawing, whole)) return whole;
  const above = { ...area, bottom: block.top };
  const left = { ...area, right: block.left };
  const candidates = [above, left].map(free => placedIn(free, drawing, limits));
  const best = candidates.reduce((a, b) => (b.zoom > a.zoom ? b : a));
  return best.zoom > limits.smallestZoom ? best : whole;
}

function placedIn(free: Rectangle, drawing: Rectangle, limits: FitLimits): Placement {
  const width = Math.max(1, free.right - free.left - 2 * limits.margin);
  const height = Math.max(1, free.bottom - free.top - 2 * limits.margin);
  const wanted = Math.min(width / extent(drawing.left, drawing.right), height / extent(drawing.top, drawing.bottom));
  const zoom = Math.min(limits.largestZoom, Math.max(limits.smallestZoom, wanted));
  return {
    zoom,
    x: (free.left + free.right) / 2 - (zoom * (drawing.left + drawing.right)) / 2,
    y: (free.top + free.bottom) / 2 - (zoom * (drawing.top + drawing.bottom)) / 2,
  };
}

function extent(from: number, to: number): number {
  return Math.max(1, to - from);
}

function covers(block: Rectangle, drawing: Rectangle, { x, y, zoom }: Placement): boolean {
  return (
    x + zoom * drawing.right > block.left &&
    x + zoom * drawing.left < block.right &&
    y + zoom * drawing.bottom > block.top &&
    y + zoom * drawing.top < block.bottom
  );
}
