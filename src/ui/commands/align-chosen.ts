/** Aligning and spreading the chosen blocks, one undo step each. */

import { blockRectangle, sheetGeometry } from '../../diagram/geometry/index.ts';
import { actions, store } from '../store/index.ts';
import { type Alignment, alignedPlaces, type Direction, type Frame, spreadPlaces } from './align.ts';
import { chosenBlocks, countedBlocks } from './chosen-blocks.ts';

const SAID: Readonly<Record<Alignment, string>> = {
  left: 'at their left edges',
  right: 'at their right edges',
  top: 'at their upper edges',
  bottom: 'at their lower edges',
  row: 'in one row',
  column: 'in one column',
};

export function alignChosen(alignment: Alignment): boolean {
  const frames = chosenFrames();
  if (frames.length < 2) return refuse('Select two or more blocks to align them.');
  const said = `Aligned ${countedBlocks(frames.length)} ${SAID[alignment]}.`;
  actions.edit({ kind: 'placeBlocks', places: alignedPlaces(frames, alignment) }, said);
  return true;
}

export function spreadChosen(direction: Direction): boolean {
  const frames = chosenFrames();
  if (frames.length < 3) return refuse('Select three or more blocks to spread them evenly.');
  const way = direction === 'across' ? 'from left to right' : 'from top to bottom';
  const said = `Spread ${countedBlocks(frames.length)} evenly ${way}.`;
  actions.edit({ kind: 'placeBlocks', places: spreadPlaces(frames, direction) }, said);
  return true;
}

function chosenFrames(): readonly Frame[] {
  const geometry = sheetGeometry(store.getState().document.diagram);
  return chosenBlocks().flatMap(block => {
    const placed = geometry.get(block.id);
    return placed === undefined ? [] : [{ id: block.id, rectangle: blockRectangle(block, placed) }];
  });
}

function refuse(message: string): true {
  actions.notify(message, 'refused');
  return true;
}
