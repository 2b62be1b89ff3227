/** Keys as tables, read by the handlers and by the page of keys. */

export { chordOf, isDoneBy, type KeyGroup, type KeyPress, type KeyRow, shownKeys } from './key-table.ts';
export { isInDialog, isTextField } from './text-field.ts';
