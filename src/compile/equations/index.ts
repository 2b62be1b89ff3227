/** Second pass: one linear equation for every signal, in flat sparse rows. */

export type { DifferentiatedSignal, Equations, ModelState } from './equations.ts';
export { RowAccumulator } from './row-accumulator.ts';
export { changedRows, copyRow, hasSamePlaces, isSameRow } from './row-changes.ts';
export { cutMatrix, RowStore } from './row-store.ts';
export { writeEquations } from './write-equations.ts';
