/** The wire under the hand while it is drawn: at right angles, from its port to the pointer. */

import type { ConnectionLineComponentProps } from 'reactflow';
import type { Point } from '../../diagram/index.ts';
import { arrowHead, wirePath } from './wire-path.ts';

export function DrawnWire({ fromX, fromY, toX, toY, fromHandle }: ConnectionLineComponentProps) {
  const middle = (fromX + toX) / 2;
  const forwards: readonly Point[] = [
    [fromX, fromY],
    [middle, fromY],
    [middle, toY],
    [toX, toY],
  ];
  const points = fromHandle.type === 'target' ? forwards.toReversed() : forwards;
  return (
    <g>
      <path className="wire wire-drawn" d={wirePath(points)} />
      <path className="wire-head wire-drawn" d={arrowHead(points)} />
    </g>
  );
}
