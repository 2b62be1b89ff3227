/** The straight piece at each port: no wire bends before it has left its port by an arrowhead's length. */

import { HALF_GRID, type Rectangle } from '../geometry/index.ts';
import { lineAfter, lineAt } from './grid-lines.ts';
import { occupyNodes, type SheetGrid, STANDING, STUB_END, TIGHT } from './sheet-grid.ts';
import { isHorizontal, outward, type PortEnd } from './types.ts';

/** Room for an arrowhead and a little more, and what is left of it where blocks stand close. */
const STUB = 16;
export const SHORT_STUB = 10;

/** Keeps the way straight out of a port free for its own net, and others rather off the place where that net turns. */
export function reserveStub(grid: SheetGrid, end: PortEnd, net: number): void {
  const nodes = stubNodes(grid, end);
  occupyNodes(grid, nodes, isHorizontal(end.side), net);
  const last = nodes.at(-1);
  if (last !== undefined) grid.surroundings[last]! |= STUB_END;
}

/**
 * The nodes straight out of a port, to where a wire may turn; empty where the port's line is missing or leads off the
 * grid.
 */
export function stubNodes(grid: SheetGrid, end: PortEnd): readonly number[] {
  const [x, y] = outward(end.side);
  const isLevel = x !== 0;
  const lines = isLevel ? grid.xs : grid.ys;
  const lane = isLevel ? lineAt(grid.ys, end.y) : lineAt(grid.xs, end.x);
  const port = isLevel ? end.x : end.y;
  const step = x + y;
  const nodes: number[] = [];
  let short = 0;
  if (lane < 0) return nodes;
  for (let line = lineAfter(lines, port, step); line >= 0 && line < lines.length; line += step) {
    const node = isLevel ? lane * grid.columns + line : line * grid.columns + lane;
    const distance = Math.abs(lines[line]! - port);
    nodes.push(node);
    if (short === 0 && distance >= SHORT_STUB) short = nodes.length;
    if (distance < STUB) continue;
    return (grid.surroundings[node]! & STANDING) < TIGHT ? nodes : nodes.slice(0, short);
  }
  return nodes.slice(0, short);
}

/** The longest that the straight piece at a port can be: up to the next line beyond its least length. */
const LONGEST = STUB + HALF_GRID;

/** The line straight out of a port, as far as the wire may have to run there. */
export function stubArea({ x, y, side }: PortEnd): Rectangle {
  const [outX, outY] = outward(side);
  const [endX, endY] = [x + LONGEST * outX, y + LONGEST * outY];
  return { left: Math.min(x, endX), right: Math.max(x, endX), top: Math.min(y, endY), bottom: Math.max(y, endY) };
}
