/**
 * One wire along its route, with an arrowhead at the port it ends at. Dragging from it draws a branch, from its arrowhead moves
 * that end; selected, it shows the grips that bend it and those of its two ends.
 */

import { memo } from 'react';
import { BaseEdge, type EdgeProps } from 'reactflow';
import type { Point } from '../../diagram/index.ts';
import { useHand } from './load-hand.ts';
import type { WireFlowEdge } from './useSheetWires.ts';
import { type WireEnds, watchWire } from './wire-gesture.ts';
import { arrowHead, wirePath } from './wire-path.ts';

export const WireEdge = memo(function WireEdge(edge: EdgeProps<WireFlowEdge>) {
  const { id, data, selected } = edge;
  const points = data?.points ?? [];
  if (points.length < 2) return null;
  const state = selected === true ? ' wire-selected' : '';
  const ends: WireEnds = {
    wire: id,
    source: { block: edge.source, handle: edge.sourceHandleId ?? 'out:0' },
    target: { block: edge.target, handle: edge.targetHandleId ?? 'in:0' },
  };
  return (
    <>
      <BaseEdge
        id={id}
        path={wirePath(selected === true ? points : (data?.own ?? points))}
        className={`wire${state}`}
        interactionWidth={0}
      />
      <path
        className="wire-reach react-flow__edge-interaction"
        d={wirePath(points)}
        onPointerDown={event => watchWire(event, ends, points)}
      />
      <path className={`wire-head${state}`} d={arrowHead(points)} />
      {selected === true && <Grips ends={ends} points={points} />}
    </>
  );
});

function Grips({ ends, points }: { readonly ends: WireEnds; readonly points: readonly Point[] }) {
  const hand = useHand();
  if (hand === null) return null;
  return (
    <>
      <hand.BendGrips wire={ends.wire} points={points} />
      <hand.EndGrips ends={ends} points={points} />
    </>
  );
}
