/**
 * Magnitude and phase on the screen: bode-drawing.ts makes the drawing. Promises a summary, a read-out by key and a table to
 * whoever cannot see the curves.
 */

import { type KeyboardEvent, type PointerEvent, useId, useMemo, useState } from 'react';
import { RaisedText, useContainerWidth } from '../figures/index.ts';
import { FILE, nearestSample, PlotMarks, plotFileName, type SavedPlot, SCREEN, svgFile } from '../plots/index.ts';
import type { BodeContent } from './bode-content.ts';
import { bodeDrawing, readOutLines, readOutMarks } from './bode-drawing.ts';
import { bodeFrame, bodeSize } from './bode-frame.ts';
import { FrequencyTable } from './FrequencyTable.tsx';

/** Before the container is measured; nothing is drawn then. */
const ANY_WIDTH = 480;

/** Samples that a key goes on by. */
const STEPS: Readonly<Record<string, number>> = {
  ArrowRight: 1,
  ArrowUp: 1,
  ArrowLeft: -1,
  ArrowDown: -1,
  PageUp: 20,
  PageDown: -20,
  Home: Number.NEGATIVE_INFINITY,
  End: Number.POSITIVE_INFINITY,
};

interface BodePlotProps {
  readonly content: BodeContent;
  readonly onSave: (plot: SavedPlot) => void;
}

/** Magnitude above, phase below, with a read-out, a table and a file to keep. */
export function BodePlot({ content, onSave }: BodePlotProps) {
  const summaryId = useId();
  const { ref, width } = useContainerWidth<HTMLDivElement>();
  const [at, setAt] = useState<number | null>(null);
  const size = useMemo(() => bodeSize(width || ANY_WIDTH), [width]);
  const frame = useMemo(() => bodeFrame(content, size), [content, size]);
  const drawing = useMemo(() => bodeDrawing(content, size, SCREEN), [content, size]);
  const { omega } = content.curve;
  const start = content.marks[0]?.omega ?? omega[omega.length >> 1] ?? 1;
  const last = omega.length - 1;

  const follow = (event: PointerEvent<HTMLDivElement>) =>
    setAt(frame.omegaAt(event.clientX - event.currentTarget.getBoundingClientRect().left));
  const step = (event: KeyboardEvent) => {
    const by = STEPS[event.key];
    if (by === undefined) return;
    event.preventDefault();
    const next = Math.max(0, Math.min(last, nearestSample(omega, at ?? start) + by));
    setAt(omega[next] ?? start);
  };
  return (
    <div className="step-plot">
      <div className="plot-measure" ref={ref}>
        <div
          className="plot-frame"
          role="slider"
          tabIndex={0}
          aria-label={content.title}
          aria-describedby={summaryId}
          aria-valuemin={omega[0] ?? 0}
          aria-valuemax={omega[last] ?? 1}
          aria-valuenow={at ?? start}
          aria-valuetext={readOutLines(content, at ?? start).join(', ')}
          onPointerMove={follow}
          onPointerDown={follow}
          onPointerLeave={() => setAt(null)}
          onFocus={event => event.currentTarget.matches(':focus-visible') && setAt(start)}
          onBlur={() => setAt(null)}
          onKeyDown={step}
        >
          {width > 0 && (
            <svg className="plot-svg" width={size.width} height={size.height} aria-hidden="true">
              <PlotMarks marks={drawing.marks} />
              {at !== null && <PlotMarks marks={readOutMarks(content, frame, at, SCREEN)} />}
            </svg>
          )}
        </div>
      </div>
      <p className="step-plot-summary" id={summaryId}>
        <RaisedText text={content.summary} />
      </p>
      <div className="plot-more">
        <FrequencyTable content={content} />
        <button
          type="button"
          className="plot-save"
          onClick={() =>
            onSave({ name: plotFileName(...content.words), svg: svgFile(bodeDrawing(content, size, FILE)) })
          }
        >
          Save as SVG
        </button>
      </div>
    </div>
  );
}
