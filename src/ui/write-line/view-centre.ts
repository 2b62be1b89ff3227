/** Where the middle of the visible sheet is, in sheet units; the sheet says so whenever it is panned, zoomed or resized. */

import type { Point } from '../../diagram/index.ts';

let centre: () => Point = () => [0, 0];

export function viewCentre(): Point {
  return centre();
}

export function setViewCentre(read: () => Point): void {
  centre = read;
}
