/**
 * The sizes, ports, labels and shapes of blocks on the sheet. The sheet on the screen, the wires' routes, the arranging
 * and the sheet's SVG all start here. Everything is a pure function of the document.
 */

export { annotationArea, annotationDrawing, FRAME_TITLE, textHeight } from './annotation-drawing.ts';
export { blockBox, blockOutline } from './block-box.ts';
export { blockDrawing, holdsState } from './block-drawing.ts';
export { SCRIPT_SCALE, SCRIPT_SHIFT, textWidth } from './character-widths.ts';
export { blockRectangle, enclosing, sheetBounds, snap } from './sheet-bounds.ts';
export { sheetGeometry } from './sheet-geometry.ts';
export type {
  Anchor,
  BlockGeometry,
  Box,
  Face,
  Ink,
  Label,
  Outline,
  PortPlace,
  Rectangle,
  Shape,
  SheetGeometry,
  Side,
  TextRole,
  TextShape,
} from './types.ts';
export { GRID, HALF_GRID } from './types.ts';
