/** A cross on each wire that is cut, with the cut's name, in the middle of the wire's longest piece. */

import './cut-marks.css';
import { ViewportPortal } from 'reactflow';
import type { Point } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { type State, useStore } from '../store/index.ts';
import { piecesOf } from './bend-wire.ts';
import type { PlacedSheet } from './usePlacedSheet.ts';

/** Half the side of a cross, and how far over it its name stands, sheet units. */
const HALF = 7;
const OVER = 13;

const chosen = (state: State) => state.document.diagram.cuts;

export function CutMarks({ sheet, routes }: PlacedSheet) {
  const cuts = useStore(chosen);
  if (cuts === undefined) return null;
  const places = new Map(
    sheet.wires.map((wire, index) => [wireKey(wire), middleOf(routes.wires[index]?.points ?? [])]),
  );
  return (
    <ViewportPortal>
      <svg className="cut-marks" aria-hidden="true">
        {cuts.map(({ to, name }, index) => {
          const key = to.join(':');
          const at = places.get(key);
          if (at === undefined || at === null) return null;
          const [x, y] = at;
          return (
            <g key={key}>
              <path d={`M${x - HALF} ${y - HALF}l${2 * HALF} ${2 * HALF}m0 ${-2 * HALF}l${-2 * HALF} ${2 * HALF}`} />
              <text x={x} y={y - OVER}>
                {name ?? `cut ${index + 1}`}
              </text>
            </g>
          );
        })}
      </svg>
    </ViewportPortal>
  );
}

function middleOf(points: readonly Point[]): Point | null {
  const pieces = piecesOf(points);
  const [first, ...others] = pieces;
  if (first === undefined) return null;
  return others.reduce((longest, piece) => (piece.length > longest.length ? piece : longest), first).middle;
}
