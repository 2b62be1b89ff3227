/** What a command is for: the selected blocks, else the one that has the focus. */

import type { Block } from '../../diagram/index.ts';
import { focusedBlock } from '../sheet/focus-block.ts';
import { store } from '../store/index.ts';

/** Ids; empty where nothing is chosen. */
export function chosenIds(): ReadonlySet<string> {
  const { blocks } = store.getState().selection;
  const focused = focusedBlock();
  return blocks.size > 0 || focused === null ? blocks : new Set([focused]);
}

/** The chosen blocks in document order. */
export function chosenBlocks(): readonly Block[] {
  const ids = chosenIds();
  return store.getState().document.diagram.blocks.filter(({ id }) => ids.has(id));
}

/** `1 block`, `3 blocks`. */
export function countedBlocks(count: number): string {
  return count === 1 ? '1 block' : `${count} blocks`;
}
