/** Folds the selected blocks into a group, and unfolds the selected group, each one undo step; what came of it is selected. */

import { blockRectangle, sheetGeometry } from '../../diagram/geometry/index.ts';
import { type Diagram, displayName, type GroupBlock } from '../../diagram/index.ts';
import { actions, store } from '../store/index.ts';

/** True where there was something to fold, refused or not. */
export function foldChosen(): boolean {
  const { selection, document } = store.getState();
  if (selection.blocks.size === 0) {
    actions.notify('Select the blocks that are to be folded into a group.');
    return true;
  }
  actions.asOneStep(() => {
    const isRefused = actions.edit({ kind: 'foldBlocks', ids: [...selection.blocks] }).length > 0;
    const [folded] = isRefused ? [] : blocksSince(document.diagram);
    if (folded !== undefined) giveRoom(folded.id);
  });
  const [group] = blocksSince(document.diagram);
  if (group === undefined) return true;
  actions.selectBlocks([group.id]);
  actions.notify(`Folded ${selection.blocks.size} blocks into group ${displayName(group)}.`);
  return true;
}

/** Sheet units between the places that are tried, and how many are. */
const STEP = 20;
const MOST_STEPS = 60;

/** Moves a block down, or where that is shorter up, to where it covers no other one. */
function giveRoom(id: string): void {
  const sheet = store.getState().document.diagram;
  const geometry = sheetGeometry(sheet);
  const frames = sheet.blocks.flatMap(block => {
    const placed = geometry.get(block.id);
    return placed === undefined ? [] : [{ id: block.id, ...blockRectangle(block, placed) }];
  });
  const own = frames.find(frame => frame.id === id);
  if (own === undefined) return;
  const isFree = (dy: number) =>
    frames.every(
      other =>
        other === own ||
        other.left >= own.right + STEP ||
        other.right <= own.left - STEP ||
        other.top >= own.bottom + dy + STEP ||
        other.bottom <= own.top + dy - STEP,
    );
  for (let step = 0; step <= MOST_STEPS; step++) {
    const dy = [step * STEP, -step * STEP].find(isFree);
    if (dy === undefined) continue;
    if (dy !== 0) actions.edit({ kind: 'moveBlocks', ids: [id], dx: 0, dy });
    return;
  }
}

/** Unfolds the one group that is selected. */
export function unfoldChosen(): boolean {
  const { selection, document } = store.getState();
  const groups = document.diagram.blocks.filter(
    (block): block is GroupBlock => block.kind === 'group' && selection.blocks.has(block.id),
  );
  const [group] = groups;
  if (group === undefined || groups.length > 1) {
    actions.notify('Select one group to unfold.');
    return true;
  }
  if (actions.edit({ kind: 'unfoldGroup', id: group.id }).length > 0) return true;
  actions.selectBlocks(blocksSince(document.diagram).map(({ id }) => id));
  actions.notify(`Unfolded group ${displayName(group)}.`);
  return true;
}

/** The blocks that stand on the sheet now and did not before. */
function blocksSince({ blocks }: Diagram) {
  const known = new Set(blocks.map(({ id }) => id));
  return store.getState().document.diagram.blocks.filter(({ id }) => !known.has(id));
}
