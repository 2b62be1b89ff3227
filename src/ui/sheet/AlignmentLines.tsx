/** The alignment lines of what is being dragged, thin, over the paper. */

import { useMemo } from 'react';
import { ViewportPortal } from 'reactflow';
import { blockRectangle, enclosing, GRID, type Rectangle } from '../../diagram/geometry/index.ts';
import { type State, useStore } from '../store/index.ts';
import { alignmentLines } from './alignment-lines.ts';
import type { PlacedSheet } from './usePlacedSheet.ts';

const held = (state: State) => state.held;

/** Neighbours farther off are no company to align with. */
const REACH = 40 * GRID;

export function AlignmentLines({ sheet, geometry }: PlacedSheet) {
  const moved = useStore(held);
  const lines = useMemo(() => {
    if (moved === null) return [];
    const [moving, others]: [Rectangle[], Rectangle[]] = [[], []];
    for (const block of sheet.blocks) {
      const placed = geometry.get(block.id);
      if (placed !== undefined) (moved.has(block.id) ? moving : others).push(blockRectangle(block, placed));
    }
    const frame = enclosing(moving);
    return frame === null ? [] : alignmentLines(frame, others, REACH);
  }, [moved, sheet, geometry]);
  if (lines.length === 0) return null;
  return (
    <ViewportPortal>
      <svg className="alignment-lines" aria-hidden="true">
        {lines.map(({ axis, at, from, to }) =>
          axis === 'x' ? (
            <line key={`x ${at}`} x1={at} x2={at} y1={from} y2={to} />
          ) : (
            <line key={`y ${at}`} x1={from} x2={to} y1={at} y2={at} />
          ),
        )}
      </svg>
    </ViewportPortal>
  );
}
