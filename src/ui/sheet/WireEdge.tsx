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
      <BaseEdge id={id} path={wirePath(points)} className={`wire${state}`} interactionWidth={14} />
      <path className={`wire-head${state}`} d={arrowHead(points)} />
    </>
  );
});
