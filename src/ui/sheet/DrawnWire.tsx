/** The wire under the hand while it is drawn: at right angles, from its port to the pointer. */

import type { ConnectionLineComponentProps, Position } from 'reactflow';
import type { Side } from '../../diagram/geometry/index.ts';
import { elbowRoute } from '../../diagram/routing/index.ts';
import { arrowHead, wirePath } from './wire-path.ts';

const SIDES: Readonly<Record<Position, Side>> = { left: 'left', right: 'right', top: 'top', bottom: 'bottom' };

export function DrawnWire({ fromX, fromY, toX, toY, fromHandle, toPosition }: ConnectionLineComponentProps) {
  const here = { x: fromX, y: fromY, side: SIDES[fromHandle.position] };
  const there = { x: toX, y: toY, side: SIDES[toPosition] };
  const points = fromHandle.type === 'target' ? elbowRoute(there, here) : elbowRoute(here, there);
  return (
    <g>
      <path className="wire wire-drawn" d={wirePath(points)} />
      <path className="wire-head wire-drawn" d={arrowHead(points)} />
    </g>
  );
}
