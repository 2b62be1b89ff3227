/** The straight piece at each port: no wire bends before it has left its port by an arrowhead's length. */

import { lineFrom } from './grid-lines.ts';
import { nodeAt, occupy, pointAt, type SheetGrid, TIGHT } from './sheet-grid.ts';
import { outward, type PortEnd } from './types.ts';

/** Room for an arrowhead and a little more, and what is left of it where blocks stand close. */
const STUB = 16;
export const SHORT_STUB = 10;

/** Keeps the way straight out of a port free for its own net. */
export function reserveStub(grid: SheetGrid, end: PortEnd, net: number): void {
  const node = stubNode(grid, end);
  if (node >= 0) occupy(grid, [[end.x, end.y], pointAt(grid, node)], net);
}

/** Where the straight piece at a port ends; −1 where the port lies on no line. */
export function stubNode(grid: SheetGrid, end: PortEnd): number {
  const roomy = nodeAhead(grid, end, STUB);
  if (roomy >= 0 && (grid.surroundings[roomy]! & 3) < TIGHT) return roomy;
  return nodeAhead(grid, end, SHORT_STUB);
}

/** The first node straight out of a port that is at least `distance` away. */
function nodeAhead(grid: SheetGrid, end: PortEnd, distance: number): number {
  const [x, y] = outward(end.side);
  const port = nodeAt(grid, [end.x, end.y]);
  if (port < 0) return -1;
  const lines = x !== 0 ? grid.xs : grid.ys;
  const wanted = (x !== 0 ? end.x : end.y) + (x + y) * distance;
  const above = lineFrom(lines, wanted);
  const index = x + y > 0 || lines[above] === wanted ? above : above - 1;
  if (index < 0 || index >= lines.length) return -1;
  const column = port % grid.columns;
  const row = (port - column) / grid.columns;
  return x !== 0 ? row * grid.columns + index : index * grid.columns + column;
}
