/** Parts of a sheet: what lies in them, and where a move leaves everything outside as it is. */

import type { Rectangle } from '../geometry/index.ts';
import type { Point } from '../types.ts';
import type { PortEnd, Route } from './types.ts';

export const EVERYWHERE: Rectangle = {
  left: Number.NEGATIVE_INFINITY,
  top: Number.NEGATIVE_INFINITY,
  right: Number.POSITIVE_INFINITY,
  bottom: Number.POSITIVE_INFINITY,
};

/** Whether two rectangles share a point. */
export function overlap(a: Rectangle, b: Rectangle): boolean {
  return a.left <= b.right && a.right >= b.left && a.top <= b.bottom && a.bottom >= b.top;
}

/** Whether a point lies in a rectangle or on its edge. */
export function holds({ left, top, right, bottom }: Rectangle, [x, y]: Point): boolean {
  return left <= x && x <= right && top <= y && y <= bottom;
}

/** Whether a route touches a rectangle. */
export function touches(route: Route, area: Rectangle): boolean {
  for (let index = 1; index < route.length; index += 1) {
    const [x0, y0] = route[index - 1]!;
    const [x1, y1] = route[index]!;
    const isBesideX = Math.max(x0, x1) < area.left || Math.min(x0, x1) > area.right;
    const isBesideY = Math.max(y0, y1) < area.top || Math.min(y0, y1) > area.bottom;
    if (!isBesideX && !isBesideY) return true;
  }
  return false;
}

/**
 * What of a route lies in a region: the route itself where it is inside, else its straight pieces, cut off at the
 * edges.
 */
export function clipped(route: Route, region: Rectangle): readonly Route[] {
  if (route.every(point => holds(region, point))) return [route];
  const inside: Route[] = [];
  for (let index = 1; index < route.length; index += 1) {
    const piece: Route = [route[index - 1]!, route[index]!];
    if (touches(piece, region)) inside.push(piece.map(point => nearestWithin(region, point)));
  }
  return inside;
}

function nearestWithin({ left, top, right, bottom }: Rectangle, [x, y]: Point): Point {
  return [Math.min(right, Math.max(left, x)), Math.min(bottom, Math.max(top, y))];
}

/** How far around its ends a wire's way may lead. */
const REACH = 260;

/** The part of the sheet that new ways between these ends, joined to these routes, are sought in. */
export function regionAround(ends: readonly PortEnd[], routes: readonly Route[]): Rectangle {
  const points = [...ends.map(({ x, y }): Point => [x, y]), ...routes.flat()];
  let { left, top, right, bottom } = { left: Infinity, top: Infinity, right: -Infinity, bottom: -Infinity };
  for (const [x, y] of points) {
    left = Math.min(left, x);
    top = Math.min(top, y);
    right = Math.max(right, x);
    bottom = Math.max(bottom, y);
  }
  return { left: left - REACH, top: top - REACH, right: right + REACH, bottom: bottom + REACH };
}
