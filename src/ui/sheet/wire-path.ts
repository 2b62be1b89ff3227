/** SVG path data of a wire and of its arrowhead, in sheet units. */

import type { Point } from '../../diagram/index.ts';

const HEAD_LENGTH = 9;
const HEAD_HALF_WIDTH = 3.5;

/** Straight segments through the points. */
export function wirePath(points: readonly Point[]): string {
  return points.map(([x, y], i) => `${i === 0 ? 'M' : 'L'}${x} ${y}`).join('');
}

/** A filled head whose tip is the last point, along the last segment that has a length. */
export function arrowHead(points: readonly Point[]): string {
  const tip = points.at(-1);
  if (tip === undefined) return '';
  const from = points.findLast(([x, y]) => x !== tip[0] || y !== tip[1]) ?? [tip[0] - 1, tip[1]];
  const length = Math.hypot(tip[0] - from[0], tip[1] - from[1]);
  const [ux, uy] = [(tip[0] - from[0]) / length, (tip[1] - from[1]) / length];
  const [bx, by] = [tip[0] - ux * HEAD_LENGTH, tip[1] - uy * HEAD_LENGTH];
  const left = `${bx - uy * HEAD_HALF_WIDTH} ${by + ux * HEAD_HALF_WIDTH}`;
  const right = `${bx + uy * HEAD_HALF_WIDTH} ${by - ux * HEAD_HALF_WIDTH}`;
  return `M${tip[0]} ${tip[1]}L${left}L${right}Z`;
}
