/** Tells the write-a-block line what is seen of the sheet. */

import { useEffect } from 'react';
import { useReactFlow } from 'reactflow';
import { setSheetView } from '../write-line/sheet-view.ts';

/** Pixels that a revealed block keeps from the edge: half a wide block and its label. */
const EDGE = 110;

const MILLISECONDS = 160;

export function useSheetView(): void {
  const flow = useReactFlow();
  useEffect(() => {
    const at = (across: number, down: number): [number, number] => {
      const box = visibleBox();
      const { x, y } = flow.screenToFlowPosition({
        x: box.left + across * (box.right - box.left),
        y: box.top + down * (box.bottom - box.top),
      });
      return [x, y];
    };
    setSheetView({
      start: () => at(0.12, 0.35),
      centre: () => at(0.5, 0.5),
      reveal: ([x, y]) => {
        const box = visibleBox();
        const place = flow.flowToScreenPosition({ x, y });
        const dx = beyond(place.x, box.left + EDGE, box.right - EDGE);
        const dy = beyond(place.y, box.top + EDGE / 2, box.bottom - EDGE / 2);
        if (dx === 0 && dy === 0) return;
        const { x: left, y: top, zoom } = flow.getViewport();
        const still = window.matchMedia('(prefers-reduced-motion: reduce)').matches;
        void flow.setViewport({ x: left - dx, y: top - dy, zoom }, still ? {} : { duration: MILLISECONDS });
      },
    });
  }, [flow]);
}

/** The sheet above the write-a-block line, in pixels of the window. */
function visibleBox(): { left: number; top: number; right: number; bottom: number } {
  const box = document.querySelector('.sheet')?.getBoundingClientRect() ?? new DOMRect();
  const line = document.querySelector('.write-line')?.getBoundingClientRect();
  const bottom = line === undefined || line.top > box.bottom ? box.bottom : line.top;
  return { left: box.left, top: box.top, right: box.right, bottom };
}

/** How far a value lies outside a range, signed. */
function beyond(value: number, low: number, high: number): number {
  return value < low ? value - low : Math.max(0, value - high);
}
