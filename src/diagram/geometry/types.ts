/**
 * What a placed block looks like on the sheet, in sheet units (one is a pixel at zoom 1), x to the right, y downwards.
 * Everything is relative to the block's centre unless it says otherwise. Colours are not here: a drawing carries roles.
 */

import type { Span } from '../../expression/index.ts';
import type { Point } from '../types.ts';

/** Grid squares of the sheet, and what block centres snap to. */
export const GRID = 20;

/** Half a square: what the lanes of wires keep apart. */
export const HALF_GRID = 10;

/** An upright rectangle by its edges. */
export interface Rectangle {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface Box {
  readonly width: number;
  readonly height: number;
}

export type Side = 'left' | 'right' | 'top' | 'bottom';

/** Where a wire meets the block and the side of the block that it meets. */
export interface PortPlace {
  readonly x: number;
  readonly y: number;
  readonly side: Side;
}

/** `math` the mathematics face, `figures` the fixed-width one, `plain` that of the interface. */
export type Face = 'math' | 'figures' | 'plain';

export type Anchor = 'start' | 'middle' | 'end';

/**
 * `symbol` what stands in the frame, `name` a signal or state, `caption` the name of a block that has no wire to carry
 * it, `title` a group's, `port` a group's port, `sign` beside an arrowhead, `unit` under a terminal, `value` under a
 * symbol.
 */
export type TextRole = 'symbol' | 'name' | 'caption' | 'title' | 'port' | 'sign' | 'unit' | 'value';

/** One line of text, its baseline at `y`. */
export interface TextShape {
  readonly kind: 'text';
  readonly x: number;
  readonly y: number;
  readonly anchor: Anchor;
  /** Height of the type in sheet units. */
  readonly size: number;
  readonly face: Face;
  readonly role: TextRole;
  readonly spans: readonly Span[];
}

/** Line widths: `thin` inside a frame, `line` frames and wires, `state` the frame of a block that holds a state. */
export type Ink = 'thin' | 'line' | 'state';

/** What a block is drawn of. Rectangles and circles are filled with the paper, lines are open. */
export type Shape =
  | {
      readonly kind: 'rectangle';
      readonly x: number;
      readonly y: number;
      readonly width: number;
      readonly height: number;
      /** Radius of the corners. */
      readonly corner: number;
      readonly ink: Ink;
    }
  | {
      readonly kind: 'circle';
      readonly x: number;
      readonly y: number;
      readonly radius: number;
      readonly ink: Ink;
    }
  | { readonly kind: 'line'; readonly points: readonly Point[]; readonly ink: Ink }
  | TextShape;

/** A text beside the block with the area that it takes, so that wires can keep clear of it. */
export interface Label {
  readonly text: TextShape;
  readonly area: Rectangle;
}

export type Outline = 'rectangle' | 'circle' | 'stadium' | 'terminal';

/** One block as it stands on its sheet. Ports and labels depend on the wires and on the blocks at their other ends. */
export interface BlockGeometry {
  readonly outline: Outline;
  readonly box: Box;
  /** In port order. */
  readonly inputs: readonly PortPlace[];
  readonly outputs: readonly PortPlace[];
  readonly labels: readonly Label[];
}

/** Geometry by block id. */
export type SheetGeometry = ReadonlyMap<string, BlockGeometry>;
