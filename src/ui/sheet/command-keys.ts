/** Keys of the commands on what is selected: arranging, aligning, signs, pulling out, duplicating, finding. */

import { alignChosen, spreadChosen } from '../commands/align-chosen.ts';
import { arrangeChosen } from '../commands/arrange-chosen.ts';
import { chosenWires, straightenWires } from '../commands/bend-chosen.ts';
import { setSignOfWires, turnLastSign } from '../commands/change-sign.ts';
import { chooseNextWire } from '../commands/choose-wire.ts';
import { duplicateChosen } from '../commands/clipboard.ts';
import { cutChosen } from '../commands/cut-chosen.ts';
import { pullOutChosen } from '../commands/insert-in-wire.ts';
import { actions, store } from '../store/index.ts';
import { focusedBlock } from './focus-block.ts';

/** Plain keys: whether one was a command's and did something. */
export function commandKey({ key }: KeyboardEvent, fitDrawing: () => void): boolean {
  switch (key) {
    case 'c':
      return cutChosen();
    case 'h':
      return pullOutChosen();
    case 'l':
      void arrangeChosen().then(isWhole => isWhole && fitDrawing());
      return true;
    case 'n':
      return chooseNextWire(chosenBlock());
    case 'r':
      return straightenWires(chosenWires());
    case 's':
      return turnLastSign();
    case '+':
    case '-':
      return setSignOfWires(key);
    default:
      return false;
  }
}

/** Keys with Ctrl, or Cmd. */
export function controlKey({ key, shiftKey }: KeyboardEvent): boolean {
  if (shiftKey) return false;
  switch (key.toLowerCase()) {
    case 'a':
      return selectAll();
    case 'd':
      return duplicateChosen();
    case 'f':
      actions.openFinding(true);
      return true;
    default:
      return false;
  }
}

/** Keys with Alt, by their place on the keyboard since Alt changes what some letters write. */
export function altKey({ code, shiftKey, ctrlKey, metaKey }: KeyboardEvent): boolean {
  if (ctrlKey || metaKey) return false;
  switch (code) {
    case 'ArrowLeft':
      return alignChosen('left');
    case 'ArrowRight':
      return alignChosen('right');
    case 'ArrowUp':
      return alignChosen('top');
    case 'ArrowDown':
      return alignChosen('bottom');
    case 'KeyC':
      return alignChosen(shiftKey ? 'column' : 'row');
    case 'KeyS':
      return spreadChosen(shiftKey ? 'down' : 'across');
    default:
      return false;
  }
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
