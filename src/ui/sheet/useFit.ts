/** Puts the whole drawing in view, under the commands, beside the title block and above the write-a-block line. */

import { useCallback } from 'react';
import { useReactFlow } from 'reactflow';
import { enclosing, type Rectangle, sheetBounds } from '../../diagram/geometry/index.ts';
import { routeWires } from '../../diagram/routing/index.ts';
import { store } from '../store/index.ts';
import { type FitLimits, fitPlacement } from './fit-drawing.ts';
import { glideView } from './glide-view.ts';

/** As small as a thousand blocks need, which take up to some 30,000 units. */
const LIMITS: FitLimits = { largestZoom: 1.2, smallestZoom: 0.03, margin: 26 };

const MILLISECONDS = 200;

/** @returns a function that fits at once, or gliding where `glide` is true and motion is not unwelcome. */
export function useFit(): (glide: boolean) => void {
  const flow = useReactFlow();
  return useCallback(
    glide => {
      const sheet = document.querySelector('.sheet')?.getBoundingClientRect();
      const drawing = drawnBounds();
      if (sheet === undefined || drawing === null) return;
      const line = within(sheet, '.write-line');
      const tools = within(sheet, '.sheet-toolbar');
      const top = tools === null ? 0 : Math.max(0, tools.bottom - LIMITS.margin / 2);
      const area = { left: 0, top, right: sheet.width, bottom: line?.top ?? sheet.height };
      const placement = fitPlacement(drawing, area, within(sheet, '.title-block'), LIMITS);
      glideView(flow, placement, glide ? MILLISECONDS : 0);
    },
    [flow],
  );
}

/** Blocks, labels and wires of the drawing on screen; null where the sheet is empty. */
function drawnBounds(): Rectangle | null {
  const { diagram } = store.getState().document;
  const blocks = sheetBounds(diagram);
  if (blocks === null) return null;
  const corners = routeWires(diagram).wires.flatMap(({ points }) =>
    points.map(([x, y]) => ({ left: x, right: x, top: y, bottom: y })),
  );
  return enclosing([blocks, ...corners]) ?? blocks;
}

/** An element's place in the sheet's own pixels; null where it stands below the sheet, as in a narrow window. */
function within(sheet: DOMRect, selector: string): Rectangle | null {
  const box = document.querySelector(selector)?.getBoundingClientRect();
  if (box === undefined || box.top >= sheet.bottom) return null;
  return {
    left: box.left - sheet.left,
    right: box.right - sheet.left,
    top: box.top - sheet.top,
    bottom: box.bottom - sheet.top,
  };
}
