/**
 * The pole map on the screen: pole-map-frame.ts says what part of the plane is shown, pole-map-drawing.ts draws it,
 * pole-map-pointer.ts says what is pointed at.
 */

import { type KeyboardEvent, type PointerEvent, useMemo, useState } from 'react';
import { RaisedText, type Root, useContainerWidth } from '../figures/index.ts';
import { plotFileName, svgFile } from './drawing.ts';
import { PlotMarks } from './PlotMarks.tsx';
import { FILE, SCREEN } from './palette.ts';
import { crossHair, pointedMarks, poleMapDrawing } from './pole-map-drawing.ts';
import { type MapView, mapFrame, mapSize } from './pole-map-frame.ts';
import { placeRoots } from './pole-map-marks.ts';
import { type MapPointer, pointerAfter, pointerAt, pointerWords, rootsPointedAt, steps } from './pole-map-pointer.ts';
import { RootList } from './RootList.tsx';
import type { SavedPlot } from './StepPlot.tsx';

interface PoleMapProps {
  /** Both of each conjugate pair. */
  readonly poles: readonly Root[];
  /** null: not computed. */
  readonly zeros: readonly Root[] | null;
  readonly onSave?: (plot: SavedPlot) => void;
  /** Id of a table with the same values beside the map; without one the map brings its own. */
  readonly tableId?: string;
}

/** Poles and zeros in the s-plane, with a read-out at the pointer and by arrow keys. */
export function PoleMap({ poles, zeros, onSave, tableId }: PoleMapProps) {
  const { ref, width } = useContainerWidth<HTMLDivElement>();
  const [view, setView] = useState<MapView>('dominant');
  const [pointer, setPointer] = useState<MapPointer | null>(null);
  const size = useMemo(() => mapSize(width || ANY_WIDTH), [width]);
  const drawing = useMemo(() => poleMapDrawing(poles, zeros, view, size, SCREEN), [poles, zeros, view, size]);
  const frame = useMemo(() => mapFrame(poles, zeros ?? NONE, view, size), [poles, zeros, view, size]);
  const placed = useMemo(() => placeRoots(frame, poles, zeros ?? NONE), [frame, poles, zeros]);
  const stops = useMemo(() => steps(placed), [placed]);
  const pointed = pointer === null ? [] : rootsPointedAt(pointer, placed, stops);
  const words = pointer === null ? drawing.description : pointerWords(pointer, frame, stops);
  const hair = pointer?.kind === 'point' ? crossHair(frame, pointer.x, pointer.y, SCREEN) : [];

  const follow = (event: PointerEvent<HTMLDivElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    setPointer(pointerAt(frame, stops, placed, event.clientX - box.left, event.clientY - box.top));
  };
  const step = (event: KeyboardEvent) => {
    const next = pointerAfter(event.key, pointer, stops.length);
    if (next === null) return;
    event.preventDefault();
    setPointer(next);
  };
  const now = pointer?.kind === 'root' ? pointer.stop + 1 : 0;
  return (
    <div className="pole-map">
      <div className="plot-measure" ref={ref}>
        <div
          className="plot-frame"
          role="slider"
          tabIndex={0}
          aria-label="Pole map, arrow keys go from root to root"
          aria-details={tableId}
          aria-valuemin={0}
          aria-valuemax={stops.length}
          aria-valuenow={now}
          aria-valuetext={words}
          onPointerMove={follow}
          onPointerDown={follow}
          onPointerLeave={() => setPointer(null)}
          onBlur={() => setPointer(null)}
          onKeyDown={step}
        >
          {width > 0 && (
            <svg className="plot-svg" width={size.width} height={size.height} aria-hidden="true">
              <PlotMarks marks={drawing.marks} />
              <PlotMarks marks={[...hair, ...pointedMarks(pointed, SCREEN)]} />
            </svg>
          )}
        </div>
      </div>
      <p className="pole-map-words">
        <RaisedText text={words} />
      </p>
      <div className="plot-more">
        {tableId === undefined && <RootList placed={placed} />}
        {(view === 'all' || placed.some(({ isBeyond }) => isBeyond)) && (
          <button
            type="button"
            className="plot-choice"
            aria-pressed={view === 'all'}
            onClick={() => setView(view === 'all' ? 'dominant' : 'all')}
          >
            Show all
          </button>
        )}
        {onSave !== undefined && (
          <button
            type="button"
            className="plot-save"
            onClick={() =>
              onSave({
                name: plotFileName('poles-and-zeros'),
                svg: svgFile(poleMapDrawing(poles, zeros, view, size, FILE)),
              })
            }
          >
            Save as SVG
          </button>
        )}
      </div>
    </div>
  );
}

const NONE: readonly Root[] = [];

/** Before the container is measured; nothing is drawn then. */
const ANY_WIDTH = 320;
