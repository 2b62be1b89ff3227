/**
 * Places for blocks: `placeUnplaced` when a drawing is opened whose file gives none, `arrangeBlocks` for a selection or
 * a whole sheet on request. Pure functions of the sheet.
 */

export type { Place } from './arrange.ts';
export { arrangeBlocks, placeUnplaced } from './place-unplaced.ts';
