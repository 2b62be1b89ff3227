/** Keys for single blocks: parts by their letter, moving by squares, wiring, mirroring, removing; and for what is seen. */

import { GRID } from '../../diagram/geometry/index.ts';
import { bendChosen } from '../commands/bend-chosen.ts';
import { chosenIds } from '../commands/chosen-blocks.ts';
import { placePartInWire } from '../commands/insert-in-wire.ts';
import type { KeyRow } from '../keys/index.ts';
import { actions, store } from '../store/index.ts';
import { beginWriting } from '../write-line/begin-writing.ts';
import { PARTS } from '../write-line/parts.ts';
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

const ON_SHEET = { group: 'On the sheet' } as const;
const PLACE = { group: 'Place a block' } as const;

const ARROWS = Object.keys(MOVES);
const LONG_ARROWS = ARROWS.map(key => `Shift+${key}`);

/** What starts the write-a-block line: digits, brackets, signs, and capital letters, since small ones place parts. */
const WRITING = [...'0123456789', ...'ABCDEFGHIJKLMNOPQRSTUVWXYZ', ...'([+->.@"'];

export const BLOCK_KEYS: readonly KeyRow[] = [
  ...PARTS.map(
    ({ id, key, label }): KeyRow => ({
      ...PLACE,
      keys: [key.toLowerCase()],
      does: `${label}; into the selected wire where it can stand in one`,
      act: () => placeByKey(id),
    }),
  ),
  { ...PLACE, keys: WRITING, does: 'write a block: opens the line with that character', act: ({ key }) => write(key) },
  { ...ON_SHEET, keys: ['Enter'], does: "open the block's fields, or end the wire that was begun", act: enter },
  { ...ON_SHEET, keys: [' '], does: 'add the block in focus to the selection, or take it out', act: toggleFocused },
  {
    ...ON_SHEET,
    keys: ARROWS,
    does: 'move the selected blocks by one square, or bend the selected wire',
    act: ({ key }) => move(key, 1),
  },
  {
    ...ON_SHEET,
    keys: LONG_ARROWS,
    does: 'move the selected blocks by five squares',
    act: ({ key }) => move(key, LONG_MOVE),
  },
  {
    ...ON_SHEET,
    keys: ['w'],
    does: 'wire the selected block: choose where to with Tab, Enter connects',
    act: beginWire,
  },
  { ...ON_SHEET, keys: ['m'], does: 'mirror', act: mirrorChosen },
  { ...ON_SHEET, keys: ['Delete', 'Backspace'], does: 'remove what is selected', act: () => removeSelected(false) },
  {
    ...ON_SHEET,
    keys: ['Shift+Delete', 'Shift+Backspace'],
    does: 'remove it so that the wires close behind',
    act: () => removeSelected(true),
  },
  { ...ON_SHEET, keys: ['Escape'], does: 'let go of what is selected or begun', act: letGo },
];

export const VIEW_KEYS: readonly KeyRow[] = [
  { group: 'See', keys: ['z'], does: 'fit the drawing to the sheet', act: fit },
  { group: 'See', keys: ['p'], does: 'print the sheet on one page, with its title block', act: print },
  { group: 'See', keys: ['?'], does: 'this page', act: openKeys },
];

function placeByKey(part: string): boolean {
  placePartInWire(part, null);
  return true;
}

function move(key: string, squares: number): boolean {
  const step = MOVES[key];
  return step !== undefined && (bendChosen(step) || moveChosen(step, squares));
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

/** The block goes where the pointer is, unless it is chained to a selected one or goes into a selected wire. */
function write(key: string): boolean {
  const at = pointerPlace();
  const { blocks, wires } = store.getState().selection;
  if (at !== null && blocks.size !== 1 && wires.size !== 1) actions.beginWritingAt({ at, from: null });
  beginWriting(key);
  return true;
}

function fit(_: unknown, fitDrawing: () => void): boolean {
  fitDrawing();
  return true;
}

function print(): boolean {
  window.print();
  return true;
}

function openKeys(): boolean {
  actions.openDialog('keys');
  return true;
}
