/**
 * Dense kernels in double precision: balancing, Hessenberg form, eigenvalues, linear systems, the exponential, frequency
 * response. A leaf: imports nothing of the project. Start at dense-matrix.ts.
 */

export type { Balanced } from './balance.ts';
export { balance, balanceSystem } from './balance.ts';
export type { ComplexMatrix } from './complex-lu.ts';
export { quotient, solveComplex } from './complex-lu.ts';
export { irreducibleBlocks, submatrix } from './components.ts';
export type { DenseMatrix } from './dense-matrix.ts';
export {
  denseFromRows,
  multiplyMatrices,
  multiplyVector,
  oneNorm,
  zeroMatrix,
} from './dense-matrix.ts';
export type { Eigenvalues } from './eigenvalues.ts';
export { eigenvalues } from './eigenvalues.ts';
export type { ExponentialChain } from './exponential.ts';
export { exponentialChain, exponentialMinusIdentity } from './exponential.ts';
export type { HessenbergSystem } from './hessenberg.ts';
export { hessenbergForm, hessenbergSystem } from './hessenberg.ts';
export type { ResponseFunction, ResponseSystem } from './hessenberg-response.ts';
export { responseOf } from './hessenberg-response.ts';
export type { LuFactors } from './lu.ts';
export { luDeterminant, luFactors, luSolve } from './lu.ts';
export { randomSigned } from './random.ts';
