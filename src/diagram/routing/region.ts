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

/** The straight pieces of a route as rectangles without width or height. */
export function pieces(route: Route): readonly Rectangle[] {
  return route.slice(1).map(([x1, y1], index) => {
    const [x0, y0] = route[index] ?? [x1, y1];
    return { left: Math.min(x0, x1), right: Math.max(x0, x1), top: Math.min(y0, y1), bottom: Math.max(y0, y1) };
  });
}

/** What of a route lies in a region: the route itself where that is everywhere, else its straight pieces, cut off at the edges. */
export function clipped(route: Route, region: Rectangle): readonly Route[] {
  if (region === EVERYWHERE) return [route];
  return pieces(route)
    .filter(piece => overlap(piece, region))
    .map(({ left, top, right, bottom }) => [
      [Math.max(left, region.left), Math.max(top, region.top)],
      [Math.min(right, region.right), Math.min(bottom, region.bottom)],
    ]);
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
