/** One wire along its route, with an arrowhead at the port it ends at. */

import { memo } from 'react';
import { BaseEdge, type EdgeProps } from 'reactflow';
import type { WireFlowEdge } from './useSheetWires.ts';
import { arrowHead, wirePath } from './wire-path.ts';

export const WireEdge = memo(function WireEdge({ id, data, selected }: EdgeProps<WireFlowEdge>) {
  const points = data?.points ?? [];
  if (points.length < 2) return null;
  const state = selected === true ? ' wire-selected' : '';
  return (
    <>
      <BaseEdge
        id={id}
        path={wirePath(selected === true ? points : (data?.own ?? points))}
        className={`wire${state}`}
        interactionWidth={0}
      />
      <path className="wire-reach react-flow__edge-interaction" d={wirePath(points)} />
      <path className={`wire-head${state}`} d={arrowHead(points)} />
    </>
  );
});
