/**
 * The change of state that separates what the inputs reach and the outputs show from the rest (Kalman 1963, SIAM J. Control 1,
 * "Mathematical description of linear dynamical systems"), chosen so that the new states read as the drawing's own: the
 * coordinates of the reachable subspace are states of the model, and of their combinations that the outputs tell apart each
 * begins with one of them.
 */

import {
  type EchelonBasis,
  fromRows,
  invariantSubspace,
  multiplyByMatrix,
  negateRational,
  ONE,
  type Rational,
  type SparseMatrix,
  toRows,
  ZERO,
} from '../../algebra/index.ts';
import type { ExactModel } from '../exact-model.ts';
import { reachable } from '../structure.ts';
import { combinationOf, productOf, type RationalRows } from './rational-rows.ts';

export interface KalmanChange {
  /** z = S x, n × n and nonsingular: first the `minimal` states, then those reached but not shown, then those not reached. */
  readonly S: RationalRows;
  /** States of the minimal model: its McMillan degree. */
  readonly minimal: number;
  /** Dimension of the reachable subspace. */
  readonly reached: number;
  /** Of the minimal model: k × k, k × m, p × k; D stays as it is. */
  readonly A: RationalRows;
  readonly B: RationalRows;
  readonly C: RationalRows;
}

/** The change of state of a model; the identity where it is minimal. O(n³) operations on exact numbers. */
export function kalmanChange(exact: ExactModel): KalmanChange {
  const { A, B, C } = exact.matrices;
  const n = A.rows;
  const reached = reachable(exact);
  const { pivots, rows: V } = reached;
  const r = pivots.length;
  const images = V.map(v => multiplyByMatrix(A, v));
  const reachedA = pivots.map(pivot => images.map(image => image[pivot]!));
  const written = toRows(B, ZERO);
  const reachedB = pivots.map(pivot => written[pivot]!);
  const shown = V.map(v => multiplyByMatrix(C, v)); // r × p: C on the coordinates, transposed
  const seen = invariantSubspace(sparse(transposed(reachedA, r), r), sparse(shown, C.rows));
  const W = seen.rows;
  const movement = productOf(W, reachedA, r);
  return {
    S: [...W.map(row => onStates(row, pivots, n)), ...hiddenRows(seen, reached, n)],
    minimal: W.length,
    reached: r,
    A: movement.map(row => seen.pivots.map(q => row[q]!)),
    B: productOf(W, reachedB, B.columns),
    C: Array.from({ length: C.rows }, (_, i) => seen.pivots.map(q => shown[q]![i]!)),
  };
}

/** A row over the pivots' states as a row over all states. */
function onStates(row: readonly Rational[], pivots: readonly number[], n: number): Rational[] {
  const whole = new Array<Rational>(n).fill(ZERO);
  pivots.forEach((pivot, i) => {
    whole[pivot] = row[i]!;
  });
  return whole;
}

/** The rows of S behind the minimal ones: reached states as they are, then what of a state the reached ones do not make up. */
function hiddenRows(seen: EchelonBasis, { pivots, rows: V }: EchelonBasis, n: number): Rational[][] {
  const unit = (state: number) => Array.from({ length: n }, (_, i) => (i === state ? ONE : ZERO));
  const isSeen = new Set(seen.pivots);
  const isReached = new Set(pivots);
  const unseen = pivots.filter((_, i) => !isSeen.has(i)).map(unit);
  const free = Array.from({ length: n }, (_, state) => state).filter(state => !isReached.has(state));
  const unreached = free.map(state => {
    const factors = V.map(v => negateRational(v[state]!));
    const rest = combinationOf(factors, pivots.map(unit), n);
    rest[state] = ONE;
    return rest;
  });
  return [...unseen, ...unreached];
}

function transposed(rows: RationalRows, columns: number): Rational[][] {
  return Array.from({ length: columns }, (_, j) => rows.map(row => row[j]!));
}

function sparse(rows: RationalRows, columns: number): SparseMatrix<Rational> {
  return fromRows(rows, columns, ({ n }) => n === 0n);
}
