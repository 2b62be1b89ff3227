/**
 * Invariant zeros: the values of s at which the system matrix [sI − A, −B; C, D] loses rank against its normal rank, with
 * the multiplicity of its Smith form. They include decoupling zeros of a model that is not minimal.
 *
 * Rosenbrock 1970, State-space and Multivariable Theory; MacFarlane & Karcanias 1976, Int. J. Control 24.
 */

import { invariantZeroPolynomial, type Polynomial } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { type Effort, EXACT_LIMIT, type ExactModel, exactModel, numeratorOf, remembered } from './exact-model.ts';
import { type Root, rootsOf } from './poles.ts';

export type ZeroSet =
  /** Every part the nearest double, multiplicities exact; `standsIn`: of the doubles that stand in for irrational values. */
  | { readonly route: 'certified'; readonly zeros: readonly Root[]; readonly standsIn: boolean }
  /** Not computed; `reason` is ready for the screen. */
  | { readonly route: 'not-computed'; readonly zeros: readonly []; readonly reason: string };

/** The invariant zeros in the order of the poles; up to 32 states, up to 128 with `high` effort. */
export function zeros(model: StateSpace, effort: Effort = 'ordinary'): ZeroSet {
  const exact = exactModel(model, effort);
  if (exact === null) return { route: 'not-computed', zeros: [], reason: tooManyStates(model, 'Zeros', effort) };
  const { roots } = remembered(known, exact, () => ({ roots: rootsOf(zeroPolynomial(exact)) }));
  if (roots === null) return { route: 'not-computed', zeros: [], reason: NOT_SEPARATED };
  return { route: 'certified', zeros: roots, standsIn: exact.standsIn };
}

const known = new WeakMap<ExactModel, { readonly roots: readonly Root[] | null }>();

const NOT_SEPARATED = 'Some zeros lie too near each other to be told apart.';

/** Monic or constant; with one input and one output the numerator over the characteristic polynomial is the determinant. */
function zeroPolynomial(exact: ExactModel): Polynomial {
  const { A, B, C, D } = exact.matrices;
  if (B.columns === 1 && C.rows === 1) {
    const numerator = numeratorOf(exact, 0, 0);
    if (numerator.length > 0) return numerator;
  }
  return invariantZeroPolynomial(A, B, C, D);
}

/** Why a result is missing, for the screen. */
export function tooManyStates({ states }: StateSpace, what: string, effort: Effort): string {
  return `${what} are computed for up to ${EXACT_LIMIT[effort]} states; this model has ${states.length}.`;
}
