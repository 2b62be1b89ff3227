/** Arranges the selected blocks, or the whole drawing where none is selected: one undo step, gliding to the new places. */

import type { Place } from '../../diagram/arranging/index.ts';
import type { Edit, Sheet } from '../../diagram/index.ts';
import { framesFollowing } from '../annotations/inside-frame.ts';
import { glide } from '../sheet/glide.ts';
import { actions, store } from '../store/index.ts';
import { countedBlocks } from './chosen-blocks.ts';

/**
 * Whether the whole drawing was arranged, so that it may have to be fitted to the sheet again. What arranges is loaded when
 * it is first asked for.
 */
export async function arrangeChosen(): Promise<boolean> {
  const { selection, document } = store.getState();
  const { arrangeBlocks } = await import('../../diagram/arranging/index.ts');
  // An undo or another edit in the meantime was meant for the drawing as it stood: it is not arranged over.
  if (store.getState().document !== document) return false;
  const sheet = document.diagram;
  if (sheet.blocks.length === 0) {
    actions.notify('There is nothing to arrange yet.');
    return false;
  }
  const isWhole = selection.blocks.size < 2;
  const edits = arrangingEdits(sheet, arrangeBlocks(sheet, isWhole ? new Set() : selection.blocks));
  glide();
  const said = `Arranged ${isWhole ? 'the drawing' : countedBlocks(selection.blocks.size)}.`;
  return actions.editTogether(edits, said).length === 0 && isWhole;
}

/** Places, directions, the bend points that then lead nowhere taken out, and frames around what they stood around. */
export function arrangingEdits(sheet: Sheet, places: readonly Place[]): readonly Edit[] {
  const moved = new Set(places.map(({ id }) => id));
  const isMirrored = new Set(sheet.blocks.filter(({ mirrored }) => mirrored === true).map(({ id }) => id));
  const turned = places.filter(({ id, mirrored }) => isMirrored.has(id) !== mirrored).map(({ id }) => id);
  const bent = sheet.wires.filter(
    ({ via, from, to }) => via !== undefined && via.length > 0 && (moved.has(from[0]) || moved.has(to[0])),
  );
  return [
    { kind: 'placeBlocks', places: places.map(({ id, at }) => [id, at]) },
    { kind: 'mirrorBlocks', ids: turned },
    ...bent.map(({ to }): Edit => ({ kind: 'setVia', to, via: [] })),
    ...framesFollowing(sheet, new Map(places.map(({ id, at }) => [id, at]))),
  ];
}
