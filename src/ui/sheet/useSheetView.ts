/** Tells the write-a-block line and the commands what is seen of the sheet and where the pointer is over it. */

import { useEffect } from 'react';
import { useReactFlow } from 'reactflow';
import { setSheetView } from '../write-line/sheet-view.ts';
import { glideView } from './glide-view.ts';
import { setConverter, setPointer } from './pointer.ts';

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
      onScreen: ([x, y]) => flow.flowToScreenPosition({ x, y }),
      reveal: ([x, y]) => {
        const box = visibleBox();
        const place = flow.flowToScreenPosition({ x, y });
        const dx = beyond(place.x, box.left + EDGE, box.right - EDGE);
        const dy = beyond(place.y, box.top + EDGE / 2, box.bottom - EDGE / 2);
        if (dx === 0 && dy === 0) return;
        const { x: left, y: top, zoom } = flow.getViewport();
        glideView(flow, { x: left - dx, y: top - dy, zoom }, MILLISECONDS);
      },
    });
    setConverter((x, y) => {
      const place = flow.screenToFlowPosition({ x, y }, { snapToGrid: false });
      return [place.x, place.y];
    });
  }, [flow]);
  useEffect(followPointer, []);
}

/** Only a mouse or a pen stays over the sheet; where a finger was last says nothing. */
function followPointer(): () => void {
  const onMove = ({ target, clientX, clientY, pointerType }: PointerEvent) => {
    const isOver = pointerType !== 'touch' && target instanceof Element && target.closest('.sheet') !== null;
    setPointer(isOver ? [clientX, clientY] : null);
  };
  window.addEventListener('pointermove', onMove, { passive: true });
  return () => window.removeEventListener('pointermove', onMove);
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
