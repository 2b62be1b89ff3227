/** Bending a wire by hand: which straight pieces it has, and its bend points after one of them was shifted sideways. */

import type { Point } from '../../diagram/index.ts';

/** One straight piece of a route. */
export interface Piece {
  /** Its place along the route, from 0. */
  readonly index: number;
  readonly isHorizontal: boolean;
  readonly middle: Point;
  readonly length: number;
}

/** The pieces of a route that have a length, in order from the output to the input. */
export function piecesOf(points: readonly Point[]): readonly Piece[] {
  return points.slice(1).flatMap(([x, y], index) => {
    const [x0, y0] = points[index] ?? [x, y];
    const length = Math.abs(x - x0) + Math.abs(y - y0);
    if (length === 0) return [];
    return [{ index, isHorizontal: y === y0, middle: [(x + x0) / 2, (y + y0) / 2] as const, length }];
  });
}

/**
 * The bend points of a route after one piece was shifted at right angles to itself. A piece that ends at a port keeps a short
 * stub there, from which the wire steps over.
 *
 * @param to    the new y of a horizontal piece, the new x of a vertical one.
 * @param stub  length of what stays at a port; half the piece where that is shorter.
 */
export function bentVia(points: readonly Point[], piece: Piece, to: number, stub: number): readonly Point[] {
  const [start, end] = [points[piece.index], points[piece.index + 1]];
  if (start === undefined || end === undefined) return [];
  const isFirst = piece.index === 0;
  const isLast = piece.index === points.length - 2;
  const reach = Math.min(stub, piece.length / 3);
  const leave = isFirst ? towards(start, end, reach) : start;
  const arrive = isLast ? towards(end, start, reach) : end;
  const shifted = ([x, y]: Point): Point => (piece.isHorizontal ? [x, to] : [to, y]);
  const moved = [...(isFirst ? [leave] : []), shifted(leave), shifted(arrive), ...(isLast ? [arrive] : [])];
  const before = points.slice(1, Math.max(1, piece.index));
  const after = points.slice(piece.index + 2, -1);
  return withoutRepeats([...before, ...moved, ...after]);
}

function towards([x0, y0]: Point, [x, y]: Point, length: number): Point {
  return [x0 + Math.sign(x - x0) * length, y0 + Math.sign(y - y0) * length];
}

function withoutRepeats(points: readonly Point[]): readonly Point[] {
  return points.filter(([x, y], index) => {
    const former = points[index - 1];
    return former === undefined || former[0] !== x || former[1] !== y;
  });
}
