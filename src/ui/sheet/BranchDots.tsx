/** The filled dots at branching points, over the wires and under nothing. */

import { memo } from 'react';
import { ViewportPortal } from 'reactflow';
import type { Point } from '../../diagram/index.ts';

const RADIUS = 3.5;

export const BranchDots = memo(function BranchDots({ dots }: { readonly dots: readonly Point[] }) {
  return (
    <ViewportPortal>
      <svg className="branch-dots" aria-hidden="true">
        {dots.map(([x, y]) => (
          <circle key={`${x} ${y}`} cx={x} cy={y} r={RADIUS} />
        ))}
      </svg>
    </ViewportPortal>
  );
});
