/** One text or frame: its drawing, the part the hand takes it by, the grip that sizes it. */

import { memo, type PointerEvent, useRef, useState } from 'react';
import { annotationArea, annotationDrawing, snap } from '../../diagram/geometry/index.ts';
import type { Annotation, Point } from '../../diagram/index.ts';
import { placeOf } from '../sheet/pointer.ts';
import { ShapeView } from '../sheet/ShapeView.tsx';
import { actions, store } from '../store/index.ts';
import { beginRewriting, sizeAnnotation, sizeOnGrid } from './annotation-commands.ts';

interface AnnotationViewProps {
  readonly annotation: Annotation;
  /** How far the hand has moved it. */
  readonly by: Point | null;
  readonly isSelected: boolean;
  readonly isWritten: boolean;
  readonly sentence: string;
  readonly onDrag: (id: string, by: Point) => void;
  /** Null where the drag was broken off. */
  readonly onDrop: (id: string, by: Point | null) => void;
}

export const AnnotationView = memo(function AnnotationView(props: AnnotationViewProps) {
  const { annotation, by, isSelected, isWritten, sentence, onDrag, onDrop } = props;
  const [sized, setSized] = useState<Annotation['size'] | null>(null);
  const shown = sized === null ? annotation : { ...annotation, size: sized };
  const { id, kind } = annotation;
  const area = annotationArea(shown);
  const [width, height] = [area.right - area.left, area.bottom - area.top];
  const drag = useDrag({
    onStart: event => choose(id, event.shiftKey || event.ctrlKey || event.metaKey),
    onMove: by => onDrag(id, snap(by)),
    onEnd: by => onDrop(id, by === null ? null : snap(by)),
  });
  const sizing = useDrag({
    onMove: ([dx, dy]) => setSized(sizeOnGrid(annotation, [annotation.size[0] + dx, annotation.size[1] + dy])),
    onEnd: by => {
      setSized(null);
      if (by !== null) sizeAnnotation(id, [annotation.size[0] + by[0], annotation.size[1] + by[1]]);
    },
  });
  return (
    // biome-ignore lint/a11y/useSemanticElements: a part of a drawing, not of a form
    <div
      className={`annotation annotation-${kind}${isSelected ? ' annotation-selected' : ''}`}
      data-annotation={id}
      role="group"
      aria-label={sentence}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: it takes keys, as a block does
      tabIndex={0}
      style={{ left: area.left + (by?.[0] ?? 0), top: area.top + (by?.[1] ?? 0), width, height }}
    >
      <svg className="annotation-drawing" width={width} height={height} aria-hidden="true">
        {isSelected && kind === 'text' && <rect className="annotation-outline" width={width} height={height} />}
        {Array.from(annotationDrawing(shown).entries(), ([place, shape]) =>
          isWritten && shape.kind === 'text' ? null : <ShapeView key={place} shape={shape} />,
        )}
      </svg>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: the keys are those of the annotation around it */}
      <div className="annotation-hold nopan" onDoubleClick={() => beginRewriting(id)} {...drag} />
      {isSelected && <div className="annotation-size nopan" {...sizing} />}
    </div>
  );
});

function choose(id: string, isAdded: boolean): void {
  const { selection } = store.getState();
  const before = selection.annotations ?? new Set<string>();
  if (isAdded) actions.select({ ...selection, annotations: new Set([...before, id]) });
  else if (!before.has(id)) actions.selectAnnotations([id]);
}

interface DragEvents {
  readonly onStart?: (event: PointerEvent) => void;
  /** Sheet units since the start. */
  readonly onMove: (by: Point) => void;
  readonly onEnd: (by: Point | null) => void;
}

/** Pixels that the hand trembles. */
const TREMBLE = 3;

/** A drag in sheet units, from the press to the release or to its being broken off. */
function useDrag({ onStart, onMove, onEnd }: DragEvents) {
  const start = useRef<{ readonly pixels: Point; readonly place: Point; isDrag: boolean } | null>(null);
  const by = ({ clientX, clientY }: PointerEvent, [x, y]: Point): Point => {
    const place = placeOf(clientX, clientY);
    return [place[0] - x, place[1] - y];
  };
  const end = (event: PointerEvent, isKept: boolean) => {
    const begun = start.current;
    start.current = null;
    if (begun?.isDrag === true) onEnd(isKept ? by(event, begun.place) : null);
  };
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      event.stopPropagation();
      event.currentTarget.setPointerCapture(event.pointerId);
      const pixels: Point = [event.clientX, event.clientY];
      start.current = { pixels, place: placeOf(...pixels), isDrag: false };
      onStart?.(event);
    },
    onPointerMove: (event: PointerEvent) => {
      const begun = start.current;
      if (begun === null) return;
      const far = Math.hypot(event.clientX - begun.pixels[0], event.clientY - begun.pixels[1]) > TREMBLE;
      if (!far && !begun.isDrag) return;
      begun.isDrag = true;
      onMove(by(event, begun.place));
    },
    onPointerUp: (event: PointerEvent) => end(event, true),
    onPointerCancel: (event: PointerEvent) => end(event, false),
  };
}
