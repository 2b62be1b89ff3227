import { type RefObject, useMemo } from 'react';
import {
  COLUMN_WIDTH,
  HEAD_HEIGHT,
  HEAD_WIDTH,
  ROW_HEIGHT,
  SMALL_MODEL,
  type Span,
  spanInView,
  wholeSpan,
} from './matrix-window.ts';
import { useScrollView } from './useScrollView.ts';

/** The rows and columns that are in the page; `isPartial` where these are not all. */
export interface MatrixWindow {
  readonly isPartial: boolean;
  readonly rows: Span;
  readonly columns: Span;
}

/** The rows and columns that the scrolling element shows; all of them for a small model. */
export function useMatrixWindow(
  scroller: RefObject<HTMLElement | null>,
  states: number,
  rowCount: number,
  columnCount: number,
): MatrixWindow {
  const isPartial = states > SMALL_MODEL;
  const view = useScrollView(scroller, isPartial);
  // The spans change far less often than the pixels, so rows keep their columns while scrolling within one.
  const columns = spanInView(columnCount, COLUMN_WIDTH, view.left, view.width - HEAD_WIDTH);
  const rows = spanInView(rowCount, ROW_HEIGHT, view.top, view.height - HEAD_HEIGHT);
  const { first, end } = columns;
  // biome-ignore lint/correctness/useExhaustiveDependencies: a span is told by its first and its end
  const steadyColumns = useMemo(
    () => (isPartial ? columns : wholeSpan(columnCount)),
    [isPartial, columnCount, first, end],
  );
  return { isPartial, rows: isPartial ? rows : wholeSpan(rowCount), columns: steadyColumns };
}
