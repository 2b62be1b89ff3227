/** Drawings kept on the device: IndexedDB in the browser, one record a drawing and a list of what there is. */

export type { KeptDrawing, StorageAnswer } from './drawings.ts';
export { keepDrawing, keptDrawings, lastOpened, readKept, removeKept, setLastOpened } from './drawings.ts';
