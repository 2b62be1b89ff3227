/** The wire that runs under a point of the sheet. */

import type { Point, Sheet, Wire } from '../../diagram/index.ts';
import type { Routes } from '../../diagram/routing/index.ts';

/**
 * The wire nearest to a point, the later one where two are as near; null where none comes within reach.
 *
 * @param routes  those of the same sheet.
 * @param reach   sheet units.
 */
export function wireUnder(sheet: Sheet, routes: Routes, point: Point, reach: number): Wire | null {
  let nearest: Wire | null = null;
  let least = reach;
  for (const [index, wire] of sheet.wires.entries()) {
    const away = distanceToRoute(routes.wires[index]?.points ?? [], point);
    if (away > least) continue;
    nearest = wire;
    least = away;
  }
  return nearest;
}

/** The middle of a route's longest straight piece; null for a route without one. */
export function longestMiddle(points: readonly Point[]): Point | null {
  let longest = 0;
  let middle: Point | null = null;
  for (const [index, [x, y]] of points.entries()) {
    const [nextX, nextY] = points[index + 1] ?? [x, y];
    const length = Math.abs(nextX - x) + Math.abs(nextY - y);
    if (length <= longest) continue;
    longest = length;
    middle = [(x + nextX) / 2, (y + nextY) / 2];
  }
  return middle;
}

function distanceToRoute(points: readonly Point[], [x, y]: Point): number {
  let least = Number.POSITIVE_INFINITY;
  for (const [index, [x0, y0]] of points.entries()) {
    const next = points[index + 1];
    if (next === undefined) break;
    const dx = Math.max(Math.min(x0, next[0]) - x, 0, x - Math.max(x0, next[0]));
    const dy = Math.max(Math.min(y0, next[1]) - y, 0, y - Math.max(y0, next[1]));
    least = Math.min(least, Math.hypot(dx, dy));
  }
  return least;
}
