/** The selection slice: blocks by id, wires by the input port they end at (an input port takes one wire). */

import type { Sheet } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';

export interface SelectionSlice {
  readonly blocks: ReadonlySet<string>;
  readonly wires: ReadonlySet<string>;
  /** Texts and frames by id; none where absent. */
  readonly annotations?: ReadonlySet<string>;
}

export const NOTHING_SELECTED: SelectionSlice = { blocks: new Set(), wires: new Set() };

/** The selection without what is no longer on the sheet; the same object where nothing went. */
export function stillThere(selection: SelectionSlice, sheet: Sheet): SelectionSlice {
  const ids = new Set(sheet.blocks.map(({ id }) => id));
  const keys = new Set(sheet.wires.map(wireKey));
  const blocks = [...selection.blocks].filter(id => ids.has(id));
  const wires = [...selection.wires].filter(key => keys.has(key));
  const marked = [...(selection.annotations ?? [])];
  const annotations = marked.filter(id => sheet.annotations?.some(annotation => annotation.id === id));
  const same =
    blocks.length === selection.blocks.size &&
    wires.length === selection.wires.size &&
    annotations.length === marked.length;
  return same ? selection : { blocks: new Set(blocks), wires: new Set(wires), annotations: new Set(annotations) };
}
