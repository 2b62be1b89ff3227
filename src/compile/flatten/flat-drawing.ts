/**
 * A drawing without groups: every block in document order, every output port a numbered signal, every input port with the
 * signal that feeds it. What `flatten` makes and every later pass reads.
 */

import type { Block, GroupBlock } from '../../diagram/index.ts';

/** Every kind that is left once groups are opened. */
export type SimpleBlock = Exclude<Block, GroupBlock>;

/** A block with its place in the drawing. */
export interface FlatBlock {
  readonly block: SimpleBlock;
  /** Ids of the groups around it and its own: `outer.inner.id`. */
  readonly path: string;
  /** The same with names in place of ids: how its states, inputs and outputs are called. */
  readonly name: string;
  /**
   * `boundary` for the input and output blocks on a group's own sheet, which hand their signal through; `external` for
   * those of the top sheet; `inner` for everything else.
   */
  readonly role: 'inner' | 'boundary' | 'external';
}

export interface FlatDrawing {
  readonly blocks: readonly FlatBlock[];
  /** blocks + 1 long: block b has the input ports inputStart[b] ≤ i < inputStart[b + 1]. */
  readonly inputStart: Int32Array;
  /** blocks + 1 long: block b gives the signals signalStart[b] ≤ s < signalStart[b + 1], one an output port. */
  readonly signalStart: Int32Array;
  /** For each input port the signal that feeds it, or `OPEN`. */
  readonly source: Int32Array;
}

/** In place of a signal: the port has no wire and reads zero. */
export const OPEN = -1;

/** How many signals there are. */
export function signalCount(drawing: FlatDrawing): number {
  return drawing.signalStart[drawing.blocks.length] ?? 0;
}

/** For each signal the index of the block that gives it. */
export function blockOfSignals(drawing: FlatDrawing): Int32Array {
  const owner = new Int32Array(signalCount(drawing));
  for (let b = 0; b < drawing.blocks.length; b++) owner.fill(b, drawing.signalStart[b], drawing.signalStart[b + 1]);
  return owner;
}
