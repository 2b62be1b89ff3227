/**
 * The plain elbow between two ports: what is drawn while a wire or a block is being dragged, and where no free way
 * exists. It looks at nothing but its two ends.
 */

import type { Point } from '../types.ts';
import { simplified } from './polyline.ts';
import { isHorizontal, outward, type PortEnd, type Route } from './types.ts';

/** How far an elbow leads straight out of a port. */
const STUB = 20;

/**
 * An orthogonal route of at most six bends that leaves and enters both ports straight.
 *
 * @param to  the port entered; a bare point while a wire is being drawn is entered from where it comes.
 */
export function elbowRoute(from: PortEnd, to: PortEnd): Route {
  const start: Point = [from.x, from.y];
  const end: Point = [to.x, to.y];
  const out = stub(from);
  const into = stub(to);
  if (faceEachOther(from, to)) return simplified([start, ...zed(start, end, isHorizontal(from.side)), end]);
  return simplified([start, out, ...between(out, into, from, to), into, end]);
}

function stub(end: PortEnd): Point {
  const [x, y] = outward(end.side);
  return [end.x + STUB * x, end.y + STUB * y];
}

/** One looks at the other across a gap. */
function faceEachOther(from: PortEnd, to: PortEnd): boolean {
  const [x, y] = outward(from.side);
  const [backX, backY] = outward(to.side);
  if (x !== -backX || y !== -backY) return false;
  return (to.x - from.x) * x + (to.y - from.y) * y > 0;
}

/** Half way along, across, and on. */
function zed(start: Point, end: Point, horizontal: boolean): readonly Point[] {
  if (horizontal) {
    const x = (start[0] + end[0]) / 2;
    return [
      [x, start[1]],
      [x, end[1]],
    ];
  }
  const y = (start[1] + end[1]) / 2;
  return [
    [start[0], y],
    [end[0], y],
  ];
}

/** From one stub's end to the other's without turning back on either. */
function between(out: Point, into: Point, from: PortEnd, to: PortEnd): readonly Point[] {
  const fromHorizontal = isHorizontal(from.side);
  const toHorizontal = isHorizontal(to.side);
  if (fromHorizontal && toHorizontal) {
    const aside =
      Math.abs(out[1] - into[1]) >= 2 * STUB ? (out[1] + into[1]) / 2 : Math.max(out[1], into[1]) + 2 * STUB;
    const same = from.side === to.side;
    if (same) {
      const x = from.side === 'right' ? Math.max(out[0], into[0]) : Math.min(out[0], into[0]);
      return [
        [x, out[1]],
        [x, into[1]],
      ];
    }
    return [
      [out[0], aside],
      [into[0], aside],
    ];
  }
  if (!fromHorizontal && !toHorizontal) {
    const aside =
      Math.abs(out[0] - into[0]) >= 2 * STUB ? (out[0] + into[0]) / 2 : Math.max(out[0], into[0]) + 2 * STUB;
    return [
      [aside, out[1]],
      [aside, into[1]],
    ];
  }
  return [corner(out, into, from, to)];
}

/** One bend where both ports look towards the corner, else the corner that is right for every pair of ports. */
function corner(out: Point, into: Point, from: PortEnd, to: PortEnd): Point {
  const ahead = (base: Point, goal: Point, side: PortEnd['side']): number => {
    const [x, y] = outward(side);
    return (goal[0] - base[0]) * x + (goal[1] - base[1]) * y;
  };
  const oneBend = ahead(out, into, from.side) >= 0 && ahead(into, out, to.side) >= 0;
  return isHorizontal(from.side) === oneBend ? [into[0], out[1]] : [out[0], into[1]];
}
