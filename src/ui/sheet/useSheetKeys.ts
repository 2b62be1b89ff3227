/** Keys on the sheet: parts by their letter, moving by squares, wiring, mirroring, removing, and the write-a-block line. */

import { useEffect } from 'react';
import { GRID } from '../../diagram/geometry/index.ts';
import { isTextField } from '../shell/usePageKeys.ts';
import { actions, store } from '../store/index.ts';
import { beginWriting } from '../write-line/begin-writing.ts';
import { partOf } from '../write-line/parts.ts';
import { placePart } from '../write-line/place-block.ts';
import { shownTitle } from './block-sentence.ts';
import { connectBlocks } from './connect-blocks.ts';
import { focusedBlock } from './focus-block.ts';
import { removeSelected } from './remove-selected.ts';
import { useFit } from './useFit.ts';

const MOVES: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-GRID, 0],
  ArrowRight: [GRID, 0],
  ArrowUp: [0, -GRID],
  ArrowDown: [0, GRID],
};

/** Squares that an arrow key moves with Shift held. */
const LONG_MOVE = 5;

/** Listens while the focus is on the sheet, or nowhere in particular. */
export function useSheetKeys(): void {
  const fitDrawing = useFit();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.altKey || isTextField(event.target) || !isOnSheet(event.target)) return;
      const isDone =
        event.ctrlKey || event.metaKey
          ? selectAll(event.key)
          : plainKey(event) || writingKey(event.key) || viewKey(event.key, fitDrawing);
      if (isDone) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [fitDrawing]);
}

function isOnSheet(target: EventTarget | null): boolean {
  if (document.querySelector('dialog[open]') !== null) return false;
  return target === document.body || (target instanceof Element && target.closest('.sheet') !== null);
}

function selectAll(key: string): boolean {
  if (key.toLowerCase() !== 'a') return false;
  actions.selectBlocks(store.getState().document.diagram.blocks.map(({ id }) => id));
  return true;
}

/** Whether the key did something to blocks. */
function plainKey({ key, shiftKey }: KeyboardEvent): boolean {
  const move = MOVES[key];
  if (move !== undefined) return moveSelected(move, shiftKey ? LONG_MOVE : 1);
  switch (key) {
    case 'Enter':
      return enter();
    case ' ':
      return toggleFocused();
    case 'Escape':
      return letGo();
    case 'Delete':
    case 'Backspace':
      return removeSelected();
    case 'm':
      return mirrorSelected();
    case 'w':
      return beginWire();
    default:
      return key.length === 1 && key === key.toLowerCase() && placeByKey(key);
  }
}

function placeByKey(key: string): boolean {
  const part = partOf(key);
  if (part === undefined || part.key !== key.toUpperCase()) return false;
  placePart(part.id, null);
  return true;
}

function moveSelected([dx, dy]: readonly [number, number], squares: number): boolean {
  const ids = [...chosen()];
  if (ids.length === 0) return false;
  actions.edit({ kind: 'moveBlocks', ids, dx: dx * squares, dy: dy * squares });
  return true;
}

/** The selected blocks, else the one that has the focus. */
function chosen(): ReadonlySet<string> {
  const { blocks } = store.getState().selection;
  const focused = focusedBlock();
  return blocks.size > 0 || focused === null ? blocks : new Set([focused]);
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
  actions.selectBlocks([]);
  return true;
}

function mirrorSelected(): boolean {
  const ids = [...chosen()];
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

/** What starts the write-a-block line: digits, brackets, signs, and capital letters, since small ones place parts. */
function writingKey(key: string): boolean {
  if (!/^[0-9A-Z([+\->.]$/.test(key)) return false;
  beginWriting(key);
  return true;
}

function viewKey(key: string, fitDrawing: (glide: boolean) => void): boolean {
  if (key === 'z') fitDrawing(true);
  else if (key === '?') actions.openDialog('keys');
  else return false;
  return true;
}
