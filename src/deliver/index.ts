/** What leaves the program: one file for each export format, and the table of them. */

export { CAUTION } from './caution.ts';
export type { DrawingFormat, Format, ModelContext, ModelFormat, Notation } from './format.ts';
export { FORMATS } from './formats.ts';
export { oneLine } from './one-line.ts';
