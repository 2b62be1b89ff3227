/** Changing documents: every edit as plain data, and the one function that makes it. */

export type { DrawingEdit, Edit, SheetEdit, SheetPath } from './edit.ts';
export { editDiagram } from './edit-diagram.ts';
export { freshId, freshName } from './fresh.ts';
