/** Rings at both ends of a selected wire, just outside its ports: dragged, they move that end to another port. */

import type { Point } from '../../diagram/index.ts';
import { type WireEnds, watchEnd } from './wire-gesture.ts';

/** How far outside the port a ring stands: clear of the port's own handle. */
const OUTSIDE = 14;

interface EndGripsProps {
  readonly ends: WireEnds;
  readonly points: readonly Point[];
}

export function EndGrips({ ends, points }: EndGripsProps) {
  return (
    <>
      <EndGrip ends={ends} end="source" at={outside(points[0], points[1])} />
      <EndGrip ends={ends} end="target" at={outside(points.at(-1), points.at(-2))} />
    </>
  );
}

interface EndGripProps {
  readonly ends: WireEnds;
  readonly end: 'source' | 'target';
  readonly at: Point;
}

function EndGrip({ ends, end, at }: EndGripProps) {
  return (
    <g
      className="end-grip"
      data-end={end}
      transform={`translate(${at[0]} ${at[1]})`}
      onPointerDown={event => {
        event.stopPropagation();
        watchEnd(event, ends, end);
      }}
    >
      <circle className="grip-reach" r={10} />
      <circle className="grip-seen" r={5} />
    </g>
  );
}

function outside(port: Point = [0, 0], next: Point = port): Point {
  const length = Math.abs(next[0] - port[0]) + Math.abs(next[1] - port[1]);
  const reach = length === 0 ? 0 : Math.min(OUTSIDE, 0.7 * length) / length;
  return [port[0] + (next[0] - port[0]) * reach, port[1] + (next[1] - port[1]) * reach];
}
