/** The wire under the hand while it is drawn: at right angles, from its port or its branching point to the pointer. */

import type { ConnectionLineComponentProps, Position } from 'reactflow';
import type { Side } from '../../diagram/geometry/index.ts';
import { elbowRoute, type PortEnd } from '../../diagram/routing/index.ts';
import { type BranchStart, wireGesture } from './wire-gesture.ts';
import { arrowHead, wirePath } from './wire-path.ts';

const SIDES: Readonly<Record<Position, Side>> = { left: 'left', right: 'right', top: 'top', bottom: 'bottom' };

/** Radius of the dot at a branching point, as those on the sheet. */
const DOT = 3.5;

export function DrawnWire({ fromX, fromY, toX, toY, fromHandle, toPosition }: ConnectionLineComponentProps) {
  const gesture = wireGesture();
  const branch = gesture?.kind === 'branch' ? gesture.start : null;
  const port = { x: fromX, y: fromY, side: SIDES[fromHandle.position] };
  const here = branch === null ? port : branchEnd(branch, toX, toY);
  const there = { x: toX, y: toY, side: SIDES[toPosition] };
  const points = fromHandle.type === 'target' ? elbowRoute(there, here) : elbowRoute(here, there);
  return (
    <g>
      <path className="wire wire-drawn" d={wirePath(points)} />
      <path className="wire-head wire-drawn" d={arrowHead(points)} />
      {branch !== null && <circle className="wire-head" cx={branch.at[0]} cy={branch.at[1]} r={DOT} />}
    </g>
  );
}

/** A branch leaves its wire at right angles, towards the pointer. */
function branchEnd({ at: [x, y], isHorizontal }: BranchStart, toX: number, toY: number): PortEnd {
  const side: Side = isHorizontal ? (toY < y ? 'top' : 'bottom') : toX < x ? 'left' : 'right';
  return { x, y, side };
}
