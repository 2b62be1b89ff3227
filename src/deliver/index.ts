/** What leaves the program: one file for each export format, and the table of them. */

export { CAUTION } from './caution.ts';
export type { Derived, DrawingFormat, Format, ModelContext, ModelFormat, Notation } from './format.ts';
export { FORMATS } from './formats.ts';
export { formulasOf } from './formulas.ts';
export { minimalDerivation } from './minimal-derivation.ts';
export { type ModelFile, modelFile, modelWarnings, type TransferFunctionEntry } from './model-file.ts';
export { oneLine } from './one-line.ts';
export { symbolMathml, type WrittenPolynomial, writtenPolynomial } from './written-symbols.ts';
