/**
 * Gaussian elimination of a sparse complex system. Written for the self-check alone, so that a fault in the derivation's
 * elimination cannot hide in both.
 */

import type { ComplexSystem } from './complex-system.ts';
import { eliminateCore } from './core-elimination.ts';
import { begin, type ComplexFactors } from './elimination-steps.ts';
import { takeColumnsOfOne, takeRowsOfOne } from './substitution.ts';

/**
 * Factors a system: rows with one unknown left first, as substitution does, then unknowns that one row is left to hold, then
 * the core between.
 *
 * @returns null where no pivot other than zero is left.
 */
export function factorComplex(system: ComplexSystem): ComplexFactors | null {
  const work = begin(system);
  takeRowsOfOne(work);
  takeColumnsOfOne(work);
  return eliminateCore(work) ? work.factors : null;
}
