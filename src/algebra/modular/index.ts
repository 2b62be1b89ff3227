/**
 * Computing modulo primes below 2²⁵ in doubles: residues, polynomials, matrices, and the way back to whole numbers. What is
 * exact and large is put together from here.
 */

export type { Lift } from './chinese-remainder.ts';
export { combineResidues, integersFromResidues, symmetric } from './chinese-remainder.ts';
export { markovParameters, numeratorModulo } from './markov-parameters.ts';
export { characteristicByHessenberg, minimalByRecurrence } from './modular-characteristic.ts';
export type { ModularPolynomial } from './modular-polynomial.ts';
export { imageModulo, modularGcd } from './modular-polynomial.ts';
export { inverseModulo, primeAt, reduce, residue } from './primes.ts';
export type { ModularRows, ScaledRows } from './scaled-rows.ts';
export { denominatorProduct, multiplyModulo, rowBits, rowsModulo, scaledRows } from './scaled-rows.ts';
