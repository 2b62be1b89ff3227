/** Keys of the commands on what is selected: arranging, aligning, signs, pulling out, duplicating, finding. */

import { alignChosen, spreadChosen } from '../commands/align-chosen.ts';
import { arrangeChosen } from '../commands/arrange-chosen.ts';
import { chosenWires, straightenWires } from '../commands/bend-chosen.ts';
import { setSignOfWires, turnLastSign } from '../commands/change-sign.ts';
import { chooseNextWire } from '../commands/choose-wire.ts';
import { duplicateChosen } from '../commands/clipboard.ts';
import { cutChosen } from '../commands/cut-chosen.ts';
import { foldChosen, unfoldChosen } from '../commands/fold-chosen.ts';
import { pullOutChosen } from '../commands/insert-in-wire.ts';
import type { KeyRow } from '../keys/index.ts';
import { actions, store } from '../store/index.ts';
import { focusedBlock } from './focus-block.ts';

const ON_SHEET = { group: 'On the sheet' } as const;
const ON_WIRE = { group: 'On a wire' } as const;

export const COMMAND_KEYS: readonly KeyRow[] = [
  { ...ON_WIRE, keys: ['n'], does: 'select the next wire at the selected block or wire', act: nextWire },
  {
    ...ON_WIRE,
    keys: ['r'],
    does: 'take the bends of the selected wire out',
    act: () => straightenWires(chosenWires()),
  },
  {
    ...ON_WIRE,
    keys: ['+', '-'],
    does: 'set its sign at the summing point it ends at',
    act: ({ key }) => setSignOfWires(key === '-' ? '-' : '+'),
  },
  { ...ON_WIRE, keys: ['c'], does: 'cut it to measure margins there, or take the cut away', act: () => cutChosen() },
  {
    ...ON_SHEET,
    keys: ['h'],
    does: 'pull the selected blocks out of their wires, which close behind them',
    act: () => pullOutChosen(),
  },
  {
    ...ON_SHEET,
    keys: ['s'],
    does: 'turn the sign of the wire drawn last to a summing point',
    act: () => turnLastSign(),
  },
  { ...ON_SHEET, keys: ['l'], does: 'arrange the selected blocks, or the whole drawing', act: arrange },
  { ...ON_SHEET, keys: ['Ctrl+a'], does: 'select everything', act: selectAll },
  { ...ON_SHEET, keys: ['Alt+g'], does: 'fold the selected blocks into a group', act: () => foldChosen() },
  { ...ON_SHEET, keys: ['Alt+Shift+g'], does: 'unfold the selected group', act: () => unfoldChosen() },
  { ...ON_SHEET, keys: ['Ctrl+d'], does: 'duplicate', act: () => duplicateChosen() },
  {
    ...ON_SHEET,
    keys: ['Alt+ArrowLeft'],
    does: 'align the selected blocks at their left edges',
    act: () => alignChosen('left'),
  },
  { ...ON_SHEET, keys: ['Alt+ArrowRight'], does: 'at their right edges', act: () => alignChosen('right') },
  { ...ON_SHEET, keys: ['Alt+ArrowUp'], does: 'at their upper edges', act: () => alignChosen('top') },
  { ...ON_SHEET, keys: ['Alt+ArrowDown'], does: 'at their lower edges', act: () => alignChosen('bottom') },
  { ...ON_SHEET, keys: ['Alt+c'], does: 'align their centres in a row', act: () => alignChosen('row') },
  { ...ON_SHEET, keys: ['Alt+Shift+c'], does: 'align their centres in a column', act: () => alignChosen('column') },
  { ...ON_SHEET, keys: ['Alt+s'], does: 'spread them evenly across', act: () => spreadChosen('across') },
  { ...ON_SHEET, keys: ['Alt+Shift+s'], does: 'spread them evenly down', act: () => spreadChosen('down') },
  { group: 'See', keys: ['Ctrl+f'], does: 'find a block by name, value or parameter', act: find },
];

function nextWire(): boolean {
  return chooseNextWire(chosenBlock());
}

function arrange(_: unknown, fitDrawing: () => void): boolean {
  void arrangeChosen().then(isWhole => isWhole && fitDrawing());
  return true;
}

function find(): boolean {
  actions.openFinding(true);
  return true;
}

function selectAll(): boolean {
  const { blocks, annotations = [] } = store.getState().document.diagram;
  const ids = (items: readonly { readonly id: string }[]) => new Set(items.map(({ id }) => id));
  actions.select({ blocks: ids(blocks), wires: new Set(), annotations: ids(annotations) });
  return true;
}

/** The one block that is selected or has the focus; null while wires are selected, so that they can be gone through. */
function chosenBlock(): string | null {
  const { blocks, wires } = store.getState().selection;
  if (wires.size > 0) return null;
  return [...blocks][0] ?? focusedBlock();
}
