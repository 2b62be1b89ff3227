/** The symbolic view of a drawing. */

export { deriveSymbolic, type SymbolicModel } from './derive-symbolic.ts';
export { expandedParameters } from './expanded-parameters.ts';
export { symbolicReader } from './symbolic-reader.ts';
