/** Drawings kept on the device: IndexedDB in the browser, one record a drawing and a list of what there is. */

export type { BinnedDrawing, KeptDrawing, StorageAnswer } from './drawings.ts';
export {
  binnedDrawings,
  bringBack,
  keepDrawing,
  keepVersion,
  keptDrawings,
  lastOpened,
  readKept,
  removeForGood,
  removeKept,
  setLastOpened,
  versionsOf,
} from './drawings.ts';
export type { KeptVersion } from './thinned.ts';
