/**
 * Poles: the eigenvalues of A, certified from the exact characteristic polynomial where the model's size allows, else by the
 * balanced QR iteration. The answer says which.
 */

import { findCertifiedRoots, type Polynomial } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { eigenvalues } from '../numeric/index.ts';
import { denseOf } from './channel-system.ts';
import { characteristicFactorsOf, type Effort, type ExactModel, exactModel, remembered } from './exact-model.ts';

/** A root with its multiplicity; a complex pair is two entries. */
export interface Root {
  /** 1/s. */
  readonly re: number;
  readonly im: number;
  readonly multiplicity: number;
}

export type PoleSet =
  /** Every part the nearest double, multiplicities exact; `standsIn`: of the doubles that stand in for irrational values. */
  | { readonly route: 'certified'; readonly poles: readonly Root[]; readonly standsIn: boolean }
  /** Eigenvalues in doubles; each counts once, since a multiple pole comes out as a cluster. */
  | { readonly route: 'floating'; readonly poles: readonly Root[] }
  /** The QR iteration gave up. */
  | { readonly route: 'not-converged'; readonly poles: readonly [] };

/**
 * The poles of the model, by real part descending, then by imaginary part descending. Certified up to 32 states, up to 128
 * with `high` effort.
 */
export function poles(model: StateSpace, effort: Effort = 'ordinary'): PoleSet {
  const exact = exactModel(model, effort);
  const certified = exact === null ? null : exactPoles(exact);
  if (exact !== null && certified !== null) return { route: 'certified', poles: certified, standsIn: exact.standsIn };
  const values = eigenvalues(denseOf(model.numeric.A));
  if (values === null) return { route: 'not-converged', poles: [] };
  const found = Array.from(values.re, (re, i) => ({ re, im: values.im[i]!, multiplicity: 1 }));
  return { route: 'floating', poles: found.sort(byRealThenImaginary) };
}

/** The certified roots of the characteristic polynomial; null where they could not be separated. */
export function exactPoles(exact: ExactModel): readonly Root[] | null {
  return remembered(known, exact, () => ({ roots: rootsOfProduct(characteristicFactorsOf(exact)) })).roots;
}

const known = new WeakMap<ExactModel, { readonly roots: readonly Root[] | null }>();

/**
 * The roots of a polynomial, in the order of the model file: each part the nearest double and 0 exactly where it is, so a
 * sign is a proof; null where they could not be separated.
 */
export function rootsOf(p: Polynomial): readonly Root[] | null {
  return rootsOfProduct([p]);
}

function rootsOfProduct(factors: readonly Polynomial[]): readonly Root[] | null {
  const roots = findCertifiedRoots(factors);
  return roots === null ? null : roots.map(({ re, im, multiplicity }) => ({ re, im, multiplicity }));
}

/** The model file's order: real part descending, then imaginary part descending. */
function byRealThenImaginary(a: Root, b: Root): number {
  return b.re - a.re || b.im - a.im;
}
