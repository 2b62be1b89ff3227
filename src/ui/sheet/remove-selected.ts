/** Removes the selected blocks with their wires, and the selected wires, as one step; focus goes to the sheet. */

import type { Edit } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { actions, store } from '../store/index.ts';
import { shownTitle } from './block-sentence.ts';
import { focusedBlock, focusSheet } from './focus-block.ts';

/** @param healing  what fed a removed block then feeds what it fed. */
export function removeSelected(healing: boolean): boolean {
  const { selection, document: slice } = store.getState();
  const { blocks, wires } = slice.diagram;
  const focused = focusedBlock();
  const gone =
    selection.blocks.size + selection.wires.size > 0 || focused === null ? selection.blocks : new Set([focused]);
  const cut = wires.filter(
    wire => selection.wires.has(wireKey(wire)) && !gone.has(wire.from[0]) && !gone.has(wire.to[0]),
  );
  if (gone.size + cut.length === 0) return false;
  const edits: Edit[] = cut.map(({ to }) => ({ kind: 'disconnect', to }));
  if (gone.size > 0) edits.push({ kind: healing ? 'removeBlocksHealing' : 'removeBlocks', ids: [...gone] });
  const titles = blocks.filter(({ id }) => gone.has(id)).map(shownTitle);
  if (cut.length > 0) titles.push(cut.length === 1 ? 'a wire' : `${cut.length} wires`);
  const healed = healing && gone.size > 0 ? ' The wires close behind.' : '';
  actions.editTogether(edits, `Removed ${titles.join(', ')}.${healed}`);
  focusSheet();
  return true;
}
