/** Keys for single blocks: parts by their letter, moving by squares, wiring, mirroring, removing; and for what is seen. */

import { GRID } from '../../diagram/geometry/index.ts';
import { bendChosen } from '../commands/bend-chosen.ts';
import { chosenIds } from '../commands/chosen-blocks.ts';
import { placePartInWire } from '../commands/insert-in-wire.ts';
import { actions, store } from '../store/index.ts';
import { beginWriting } from '../write-line/begin-writing.ts';
import { partOf } from '../write-line/parts.ts';
import { shownTitle } from './block-sentence.ts';
import { connectBlocks } from './connect-blocks.ts';
import { focusedBlock } from './focus-block.ts';
import { pointerPlace } from './pointer.ts';
import { removeSelected } from './remove-selected.ts';

const MOVES: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-GRID, 0],
  ArrowRight: [GRID, 0],
  ArrowUp: [0, -GRID],
  ArrowDown: [0, GRID],
};

/** Squares that an arrow key moves with Shift held. */
const LONG_MOVE = 5;

/** Whether the key did something to blocks. */
export function blockKey({ key, shiftKey }: KeyboardEvent): boolean {
  const move = MOVES[key];
  if (move !== undefined) return bendChosen(move) || moveChosen(move, shiftKey ? LONG_MOVE : 1);
  switch (key) {
    case 'Enter':
      return enter();
    case ' ':
      return toggleFocused();
    case 'Escape':
      return letGo();
    case 'Delete':
    case 'Backspace':
      return removeSelected(shiftKey);
    case 'm':
      return mirrorChosen();
    case 'w':
      return beginWire();
    default:
      return key.length === 1 && key === key.toLowerCase() && placeByKey(key);
  }
}

function placeByKey(key: string): boolean {
  const part = partOf(key);
  if (part === undefined || part.key !== key.toUpperCase()) return false;
  placePartInWire(part.id, null);
  return true;
}

function moveChosen([dx, dy]: readonly [number, number], squares: number): boolean {
  const ids = [...chosenIds()];
  if (ids.length === 0) return false;
  actions.edit({ kind: 'moveBlocks', ids, dx: dx * squares, dy: dy * squares });
  return true;
}

/** Ends a wire that was begun, else opens the fields of the block in focus. */
function enter(): boolean {
  const { wiringFrom } = store.getState().view;
  const target = focusedBlock() ?? [...store.getState().selection.blocks][0];
  if (target === undefined) return false;
  if (wiringFrom === null) actions.editFields(target);
  else if (connectBlocks([wiringFrom, 0], [target, null])) actions.beginWire(null);
  return true;
}

function toggleFocused(): boolean {
  const focused = focusedBlock();
  if (focused === null) return false;
  const blocks = new Set(store.getState().selection.blocks);
  if (!blocks.delete(focused)) blocks.add(focused);
  actions.selectBlocks(blocks);
  return true;
}

function letGo(): boolean {
  actions.beginWire(null);
  actions.editFields(null);
  actions.beginWritingAt(null);
  actions.selectBlocks([]);
  return true;
}

function mirrorChosen(): boolean {
  const ids = [...chosenIds()];
  if (ids.length === 0) return false;
  actions.edit({ kind: 'mirrorBlocks', ids }, 'Mirrored.');
  return true;
}

function beginWire(): boolean {
  const from = focusedBlock() ?? [...store.getState().selection.blocks][0];
  const block = store.getState().document.diagram.blocks.find(({ id }) => id === from);
  if (block === undefined) return false;
  actions.beginWire(block.id);
  actions.notify(`Wire from ${shownTitle(block)}: go to the block it leads to and press Enter. Escape lets go.`);
  return true;
}

/**
 * What starts the write-a-block line: digits, brackets, signs, and capital letters, since small ones place parts. The block goes
 * where the pointer is, unless it is chained to a selected one.
 */
export function writingKey(key: string): boolean {
  if (!/^[0-9A-Z([+\->.@"]$/.test(key)) return false;
  const at = pointerPlace();
  if (at !== null && store.getState().selection.blocks.size !== 1) actions.beginWritingAt({ at, from: null });
  beginWriting(key);
  return true;
}

/** Whether the key changed what is seen. */
export function viewKey(key: string, fitDrawing: () => void): boolean {
  if (key === 'z') fitDrawing();
  else if (key === 'p') window.print();
  else if (key === '?') actions.openDialog('keys');
  else return false;
  return true;
}
