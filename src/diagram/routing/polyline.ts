/** Orthogonal polylines without needless points. */

import type { Point } from '../types.ts';
import type { Route } from './types.ts';

/** The same line without repeated points and without points in the middle of a straight piece. A way back is kept. */
export function simplified(points: Route): Route {
  const kept: Point[] = [];
  for (const point of points) {
    const last = kept.at(-1);
    if (last !== undefined && last[0] === point[0] && last[1] === point[1]) continue;
    const before = kept.at(-2);
    if (last !== undefined && before !== undefined && goesOn(before, last, point)) kept.pop();
    kept.push(point);
  }
  return kept;
}

function goesOn(a: Point, b: Point, c: Point): boolean {
  const horizontal = a[1] === b[1] && b[1] === c[1] && (b[0] - a[0]) * (c[0] - b[0]) > 0;
  const vertical = a[0] === b[0] && b[0] === c[0] && (b[1] - a[1]) * (c[1] - b[1]) > 0;
  return horizontal || vertical;
}
