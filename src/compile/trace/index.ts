/** Why an entry of the system matrix is what it is: start at `traceable`, then `traceEntry` and `entriesOn`. */

export { type DrawingPart, entriesOn } from './entries-on.ts';
export type { EntryEnd, EntryPlace, Trace, TracedPath, TracedStep, TracedValue, TracedWalk } from './trace.ts';
export { traceEntry } from './trace-entry.ts';
export { type TracedDrawing, traceable } from './traced-drawing.ts';
export type { WireEnd } from './traced-parts.ts';
