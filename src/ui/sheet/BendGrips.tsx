/** Grips in the middle of a selected wire's straight pieces: dragged sideways, they bend it, as one undo step. */

import { type PointerEvent, useState } from 'react';
import { GRID, HALF_GRID } from '../../diagram/geometry/index.ts';
import type { Point } from '../../diagram/index.ts';
import { bendWire } from '../commands/bend-chosen.ts';
import { bentVia, type Piece, piecesOf } from './bend-wire.ts';
import { placeOf } from './pointer.ts';
import { wirePath } from './wire-path.ts';

/** Pieces shorter than this have no room for a grip. */
const SHORTEST = 2 * GRID;

/** What is seen of a grip and what the hand finds, sheet units. */
const SEEN = { along: 14, across: 6 } as const;
const FOUND = 22;

interface BendGripsProps {
  /** The wire's key. */
  readonly wire: string;
  readonly points: readonly Point[];
}

export function BendGrips({ wire, points }: BendGripsProps) {
  const [bent, setBent] = useState<readonly Point[] | null>(null);
  const viaAt = (piece: Piece, { clientX, clientY }: PointerEvent): readonly Point[] => {
    const place = placeOf(clientX, clientY)[piece.isHorizontal ? 1 : 0];
    return bentVia(points, piece, Math.round(place / HALF_GRID) * HALF_GRID, GRID);
  };
  return (
    <>
      {bent !== null && <path className="wire wire-drawn" d={wirePath(bent)} />}
      {piecesOf(points)
        .filter(({ length }) => length >= SHORTEST)
        .map(piece => (
          <Grip
            key={piece.index}
            piece={piece}
            onDrag={event => {
              const [first, last] = [points[0], points.at(-1)];
              if (first !== undefined && last !== undefined) setBent([first, ...viaAt(piece, event), last]);
            }}
            onDrop={event => {
              if (bent !== null) bendWire(wire, viaAt(piece, event));
              setBent(null);
            }}
          />
        ))}
    </>
  );
}

interface GripProps {
  readonly piece: Piece;
  readonly onDrag: (event: PointerEvent) => void;
  readonly onDrop: (event: PointerEvent) => void;
}

function Grip({ piece: { middle, isHorizontal }, onDrag, onDrop }: GripProps) {
  const [width, height] = isHorizontal ? [SEEN.along, SEEN.across] : [SEEN.across, SEEN.along];
  return (
    <g
      className={`bend-grip bend-grip-${isHorizontal ? 'down' : 'across'}`}
      transform={`translate(${middle[0]} ${middle[1]})`}
      onPointerDown={event => {
        if (event.button !== 0) return;
        event.stopPropagation();
        event.currentTarget.setPointerCapture(event.pointerId);
      }}
      onPointerMove={event => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) onDrag(event);
      }}
      onPointerUp={onDrop}
      onPointerCancel={onDrop}
    >
      <rect className="grip-reach" x={-FOUND / 2} y={-FOUND / 2} width={FOUND} height={FOUND} />
      <rect className="grip-seen" x={-width / 2} y={-height / 2} width={width} height={height} />
    </g>
  );
}
