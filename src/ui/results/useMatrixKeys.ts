import type { KeyboardEvent, RefObject } from 'react';
import { type MatrixPlace, placeAfter } from './matrix-keys.ts';
import { COLUMN_WIDTH, HEAD_HEIGHT, HEAD_WIDTH, offsetShowing, ROW_HEIGHT } from './matrix-window.ts';
import type { MatrixWindow } from './useMatrixWindow.ts';

interface MatrixKeys {
  readonly scroller: RefObject<HTMLElement | null>;
  readonly pointed: MatrixPlace | null;
  readonly rows: number;
  readonly columns: number;
  readonly window: MatrixWindow;
  readonly onPoint: ((row: number, column: number, by: 'walk' | 'keep') => void) | undefined;
  readonly onPointEnd: ((by: 'escape') => void) | undefined;
}

/** Answers keys over the matrix: moving points at the next entry and brings it into view, Enter keeps it, Escape lets go. */
export function useMatrixKeys(keys: MatrixKeys): (event: KeyboardEvent) => void {
  const { scroller, pointed, rows, columns, window, onPoint, onPointEnd } = keys;
  return event => {
    if (onPoint === undefined || event.altKey || event.ctrlKey || event.metaKey) return;
    if (event.key === 'Escape') onPointEnd?.('escape');
    if ((event.key === 'Enter' || event.key === ' ') && pointed !== null) {
      event.preventDefault();
      onPoint(pointed.row, pointed.column, 'keep');
      return;
    }
    const place = placeAfter(event.key, pointed, rows, columns);
    if (place === null) return;
    event.preventDefault();
    if (scroller.current !== null) bringIntoView(scroller.current, place, window.isPartial);
    onPoint(place.row, place.column, 'walk');
  };
}

function bringIntoView(scroller: HTMLElement, { row, column }: MatrixPlace, isPartial: boolean): void {
  if (!isPartial) {
    const cell = scroller.querySelector(`td[data-row="${row}"][data-column="${column}"]`);
    cell?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
    return;
  }
  scroller.scrollTo({
    left: offsetShowing(column, COLUMN_WIDTH, scroller.scrollLeft, scroller.clientWidth, HEAD_WIDTH),
    top: offsetShowing(row, ROW_HEIGHT, scroller.scrollTop, scroller.clientHeight, HEAD_HEIGHT),
  });
}
