/**
 * The step response on the screen: step-drawing.ts makes the drawing, step-read-out.ts what follows the pointer, step-content.ts
 * the words. Promises a summary, a read-out by key and a table to whoever cannot see the curve.
 */

import { type KeyboardEvent, type PointerEvent, useId, useMemo, useState } from 'react';
import { MathName, RaisedText, useContainerWidth } from '../figures/index.ts';
import { plotFileName, type Size, svgFile } from './drawing.ts';
import { HorizonGrip } from './HorizonGrip.tsx';
import { PlotMarks } from './PlotMarks.tsx';
import { FILE, SCREEN } from './palette.ts';
import { StepTable } from './StepTable.tsx';
import { contentSummary, peakOf, type StepContent, stepTitle } from './step-content.ts';
import { stepDrawing } from './step-drawing.ts';
import { stepFrame, stepSize } from './step-frame.ts';
import { momentAfter, readOutLines, readOutMarks } from './step-read-out.ts';

/** A drawing to keep. */
export interface SavedPlot {
  /** A file name that every system takes. */
  readonly name: string;
  /** The text of an SVG file. */
  readonly svg: string;
}

/** Before the container is measured; nothing is drawn then. */
const ANY_WIDTH = 480;

interface StepPlotProps {
  readonly content: StepContent;
  readonly onSave?: (plot: SavedPlot) => void;
  /** The hand has dragged the time axis: the plot is to end at this time, s. */
  readonly onHorizon?: (seconds: number) => void;
}

/** The response to a unit step: the curve, its figures in words, a read-out and a table. */
export function StepPlot({ content, onSave, onHorizon }: StepPlotProps) {
  const summaryId = useId();
  const { ref, width } = useContainerWidth<HTMLDivElement>();
  const [moment, setMoment] = useState<number | null>(null);
  const size = useMemo(() => stepSize(width || ANY_WIDTH), [width]);
  const frame = useMemo(() => stepFrame(content, size), [content, size]);
  const drawing = useMemo(() => stepDrawing(content, size, SCREEN), [content, size]);
  const time = moment === null ? null : Math.min(moment, frame.horizon);
  const start = peakOf(content.metrics)?.time ?? frame.horizon;

  const follow = (event: PointerEvent<HTMLDivElement>) =>
    setMoment(frame.timeAt(event.clientX - event.currentTarget.getBoundingClientRect().left));
  const step = (event: KeyboardEvent) => {
    const next = momentAfter(event.key, time ?? start, frame.horizon);
    if (next === null) return;
    event.preventDefault();
    setMoment(next);
  };
  return (
    <div className="step-plot">
      <div className="plot-measure" ref={ref}>
        <div
          className="plot-frame"
          role="slider"
          tabIndex={0}
          aria-label={stepTitle(content)}
          aria-describedby={summaryId}
          aria-valuemin={0}
          aria-valuemax={frame.horizon}
          aria-valuenow={time ?? start}
          aria-valuetext={readOutLines(content, time ?? start).join(', ')}
          onPointerMove={follow}
          onPointerDown={follow}
          onPointerLeave={() => setMoment(null)}
          onFocus={event => event.currentTarget.matches(':focus-visible') && setMoment(start)}
          onBlur={() => setMoment(null)}
          onKeyDown={step}
        >
          {width > 0 && (
            <svg className="plot-svg" width={size.width} height={size.height} aria-hidden="true">
              <PlotMarks marks={drawing.marks} />
              {time !== null && <PlotMarks marks={readOutMarks(content, frame, time, SCREEN)} />}
            </svg>
          )}
        </div>
        {onHorizon !== undefined && width > 0 && <HorizonGrip frame={frame} onHorizon={onHorizon} />}
      </div>
      <p className="step-plot-summary" id={summaryId}>
        {content.words === undefined ? (
          <>
            step in <MathName name={content.input} /> → <MathName name={content.output} />
          </>
        ) : (
          content.words.title
        )}
        : <RaisedText text={contentSummary(content)} />
        {content.envelope !== undefined && ' · the band: over the tolerances'}
      </p>
      <div className="plot-more">
        <StepTable content={content} horizon={frame.horizon} />
        {onSave !== undefined && (
          <button type="button" className="plot-save" onClick={() => onSave(savedPlot(content, size))}>
            Save as SVG
          </button>
        )}
      </div>
    </div>
  );
}

function savedPlot(content: StepContent, size: Size): SavedPlot {
  return {
    name: plotFileName('step', content.input, content.output),
    svg: svgFile(stepDrawing(content, size, FILE)),
  };
}
