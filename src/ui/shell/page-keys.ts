/** Keys that count wherever the focus is, but in a field that has its own: undo, redo, export. */

import type { KeyRow } from '../keys/index.ts';
import { actions } from '../store/index.ts';

export const PAGE_KEYS: readonly KeyRow[] = [
  { group: 'Everywhere', keys: ['Ctrl+z'], does: 'undo', act: done(actions.undo) },
  { group: 'Everywhere', keys: ['Ctrl+y', 'Ctrl+Shift+z'], does: 'redo', act: done(actions.redo) },
  { group: 'Everywhere', keys: ['Ctrl+e'], does: 'export', act: done(() => actions.openDialog('export')) },
];

/** The key is taken even where nothing is left to undo: the browser has no use for it either. */
function done(act: () => void): KeyRow['act'] {
  return () => {
    act();
    return true;
  };
}
