/**
 * Wires of one output share a trunk. Each is drawn from where it leaves those drawn before it, so that no stretch is inked
 * twice and looks bolder than the rest.
 */

import type { Point } from '../../diagram/index.ts';

/** The end of `points` that none of the earlier routes from the same port has drawn; at least its last two points. */
export function ownPart(points: readonly Point[], earlier: readonly (readonly Point[])[]): readonly Point[] {
  return earlier.map(other => afterSharing(points, other)).reduce(shorter, points);
}

function shorter(a: readonly Point[], b: readonly Point[]): readonly Point[] {
  return lengthOf(b) < lengthOf(a) ? b : a;
}

/** `points` from where it parts from `other`; both start at the same port. */
function afterSharing(points: readonly Point[], other: readonly Point[]): readonly Point[] {
  for (let k = 0; k + 1 < points.length; k++) {
    const [start, end] = [points[k], points[k + 1]];
    const [otherStart, otherEnd] = [other[k], other[k + 1]];
    if (start === undefined || end === undefined) return points;
    if (otherStart === undefined || otherEnd === undefined || !isSame(start, otherStart)) return points.slice(k);
    if (isSame(end, otherEnd)) continue;
    if (!isAhead(start, end, otherEnd)) return points.slice(k);
    const rest = points.slice(k + 1);
    return distance(start, otherEnd) < distance(start, end) ? [otherEnd, ...rest] : rest;
  }
  return points.slice(-2);
}

/** Whether both lie in the same one of the four directions from `start`. */
function isAhead(start: Point, a: Point, b: Point): boolean {
  const sameX = Math.sign(a[0] - start[0]) === Math.sign(b[0] - start[0]);
  return sameX && Math.sign(a[1] - start[1]) === Math.sign(b[1] - start[1]);
}

function isSame(a: Point, b: Point): boolean {
  return a[0] === b[0] && a[1] === b[1];
}

function distance(a: Point, b: Point): number {
  return Math.abs(a[0] - b[0]) + Math.abs(a[1] - b[1]);
}

function lengthOf(points: readonly Point[]): number {
  return points.slice(1).reduce((sum, point, k) => sum + distance(points[k] ?? point, point), 0);
}
