/**
 * Controllability, observability and the modes that no transfer function shows, decided exactly by the Kalman decomposition:
 * the reachable subspace, then what the outputs can tell apart of it.
 *
 * Kalman 1963, SIAM J. Control 1, "Mathematical description of linear dynamical systems".
 */

import {
  characteristicPolynomial,
  dividePolynomials,
  type EchelonBasis,
  entryAt,
  fromRows,
  invariantSubspace,
  multiplyByMatrix,
  type Rational,
  type SparseMatrix,
  ZERO,
} from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { characteristicOf, type Effort, type ExactModel, exactModel, remembered } from './exact-model.ts';
import { type Root, rootsOf } from './poles.ts';

/** Whether a structural property holds, and how that is known; null where the model has too many states for exact answers. */
export interface Structural {
  readonly holds: boolean | null;
  /** Whether a proof holds for the doubles that stand in for irrational values. */
  readonly standsIn: boolean;
}

/** A pole that no transfer function shows, `multiplicity` times of those in the characteristic polynomial. */
export interface HiddenMode extends Root {
  /** Whether the inputs do not reach it (its multiplicity among the uncontrollable modes is not zero). */
  readonly isUncontrollable: boolean;
  /** Whether the outputs do not show it. */
  readonly isUnobservable: boolean;
}

/** Whether the inputs reach every state: rank of (B, AB, …, Aⁿ⁻¹B) = n. Without inputs false, without states true. */
export function isControllable(model: StateSpace, effort: Effort = 'ordinary'): Structural {
  return structural(model, effort, exact => reachable(exact).pivots.length);
}

/** Whether the outputs tell all states apart: rank of (C; CA; …; CAⁿ⁻¹) = n. Without outputs false, without states true. */
export function isObservable(model: StateSpace, effort: Effort = 'ordinary'): Structural {
  return structural(model, effort, exact => distinguishable(exact).pivots.length);
}

function structural(model: StateSpace, effort: Effort, dimension: (exact: ExactModel) => number): Structural {
  const exact = exactModel(model, effort);
  if (exact === null) return { holds: null, standsIn: false };
  return { holds: dimension(exact) === model.states.length, standsIn: exact.standsIn };
}

/** Dimensions of the reachable subspace and of the one that the outputs see; null where the model is too large. */
export function kalmanRanks(
  model: StateSpace,
  effort: Effort = 'ordinary',
): { readonly controllable: number; readonly observable: number } | null {
  const exact = exactModel(model, effort);
  if (exact === null) return null;
  return { controllable: reachable(exact).pivots.length, observable: distinguishable(exact).pivots.length };
}

/**
 * The poles whose multiplicity in the characteristic polynomial exceeds that in the pole polynomial of the transfer matrix
 * (McMillan 1952), in the order of the poles; empty for a minimal model, and for one without inputs or outputs, which has no
 * transfer function to show anything. Null where the model is too large, or its poles cannot be separated.
 */
export function hiddenModes(model: StateSpace, effort: Effort = 'ordinary'): readonly HiddenMode[] | null {
  if (model.inputs.length === 0 || model.outputs.length === 0) return [];
  const exact = exactModel(model, effort);
  return exact === null ? null : remembered(hidden, exact, () => ({ modes: hiddenOf(exact) })).modes;
}

const hidden = new WeakMap<ExactModel, { readonly modes: readonly HiddenMode[] | null }>();
const reachables = new WeakMap<ExactModel, EchelonBasis>();
const distinguishables = new WeakMap<ExactModel, EchelonBasis>();

/** Basis of the states that the inputs reach. */
export function reachable(exact: ExactModel): EchelonBasis {
  const { A, B } = exact.matrices;
  return remembered(reachables, exact, () => invariantSubspace(A, B));
}

/** Basis of the rows (C; CA; …): what the outputs can tell about the state. */
export function distinguishable(exact: ExactModel): EchelonBasis {
  const { A, C } = exact.matrices;
  return remembered(distinguishables, exact, () => invariantSubspace(transposedSparse(A), transposedSparse(C)));
}

function hiddenOf(exact: ExactModel): readonly HiddenMode[] | null {
  const n = exact.matrices.A.rows;
  const reached = reachable(exact);
  const seen = distinguishable(exact);
  if (reached.pivots.length === n && seen.pivots.length === n) return [];
  const { A, C } = exact.matrices;
  const shown = minimalMatrix(restrictedTo(reached, A), imageOf(reached, C));
  const modesOutside = (M: SparseMatrix<Rational>): readonly Root[] | null =>
    rootsOf(dividePolynomials(characteristicOf(exact), characteristicPolynomial(M)).quotient);
  const unshown = modesOutside(shown);
  const unreached = modesOutside(restrictedTo(reached, A));
  const unseen = modesOutside(restrictedTo(seen, transposedSparse(A)));
  if (unshown === null || unreached === null || unseen === null) return null;
  return unshown.map(mode => ({
    ...mode,
    isUncontrollable: holdsRoot(unreached, mode),
    isUnobservable: holdsRoot(unseen, mode),
  }));
}

/** Both are the nearest doubles of the same number where the roots are the same. */
function holdsRoot(roots: readonly Root[], { re, im }: Root): boolean {
  return roots.some(root => root.re === re && root.im === im);
}

/** The matrix by which A acts on the coordinates of the subspace: A v_j = Σ v_i M_ij, and coordinates are the pivot entries. */
function restrictedTo({ pivots, rows }: EchelonBasis, A: SparseMatrix<Rational>): SparseMatrix<Rational> {
  const images = rows.map(row => multiplyByMatrix(A, row));
  return sparse(
    pivots.map(pivot => images.map(image => image[pivot] ?? ZERO)),
    pivots.length,
  );
}

/** C on the coordinates of the subspace. */
function imageOf({ rows }: EchelonBasis, C: SparseMatrix<Rational>): SparseMatrix<Rational> {
  return transposedSparse(
    sparse(
      rows.map(row => multiplyByMatrix(C, row)),
      C.rows,
    ),
  );
}

/** The part of a reachable A that C shows. */
function minimalMatrix(A: SparseMatrix<Rational>, C: SparseMatrix<Rational>): SparseMatrix<Rational> {
  const transposedA = transposedSparse(A);
  return restrictedTo(invariantSubspace(transposedA, transposedSparse(C)), transposedA);
}

function sparse(rows: readonly (readonly Rational[])[], columns: number): SparseMatrix<Rational> {
  return fromRows(rows, columns, ({ n }) => n === 0n);
}

function transposedSparse(matrix: SparseMatrix<Rational>): SparseMatrix<Rational> {
  const rows = Array.from({ length: matrix.columns }, (_, j) =>
    Array.from({ length: matrix.rows }, (_, i) => entryAt(matrix, i, j, ZERO)),
  );
  return sparse(rows, matrix.rows);
}
