/**
 * Invariant zeros of a state-space model as the roots of an exact polynomial. The system matrix is reduced, by steps that
 * change none of its invariant polynomials but units, to one with an invertible feedthrough, whose zeros are the eigenvalues
 * of a matrix. Infinite zeros and singular parts fall away on the way, whatever the numbers of inputs and outputs are.
 */

import { characteristicPolynomial } from './characteristic-polynomial.ts';
import type { Polynomial } from './polynomial.ts';
import { negateRational, type Rational, ZERO } from './rational.ts';
import { reduceRows, subtractMultiple } from './row-reduction.ts';
import { fromRows, type SparseMatrix, toRows } from './sparse-matrix.ts';
import { squareSystemDeterminant } from './square-zeros.ts';

type Rows = readonly (readonly Rational[])[];

/** Written-out rows: A states × states, B states × inputs, C outputs × states, D outputs × inputs. */
interface System {
  readonly states: number;
  readonly inputs: number;
  readonly outputs: number;
  readonly A: Rows;
  readonly B: Rows;
  readonly C: Rows;
  readonly D: Rows;
}

/**
 * The product of the invariant polynomials in the Smith form of [sI − A, −B; C, D], monic: its roots with their multiplicities
 * are the invariant zeros, decoupling zeros included; 1 where there is none. Right for any number of inputs and outputs and any
 * normal rank. A square model with a determinant that does not vanish takes the short way of `squareSystemDeterminant`; others
 * O(n³) exact operations, and the characteristic polynomial of what is left.
 *
 * The reduction of Emami-Naeini & Van Dooren (1982, Automatica 18), here by exact elimination in place of orthogonal
 * transformations, so that every rank is decided.
 */
export function invariantZeroPolynomial(
  A: SparseMatrix<Rational>,
  B: SparseMatrix<Rational>,
  C: SparseMatrix<Rational>,
  D: SparseMatrix<Rational>,
): Polynomial {
  const direct = B.columns === C.rows ? squareSystemDeterminant(besideAndBelow(A, B, C, D), A) : null;
  if (direct !== null) return direct;
  return reducedZeroPolynomial(A, B, C, D);
}

/** The same by the reduction alone, which any model can take. */
export function reducedZeroPolynomial(
  A: SparseMatrix<Rational>,
  B: SparseMatrix<Rational>,
  C: SparseMatrix<Rational>,
  D: SparseMatrix<Rational>,
): Polynomial {
  const whole: System = {
    states: A.rows,
    inputs: B.columns,
    outputs: C.rows,
    A: toRows(A, ZERO),
    B: toRows(B, ZERO),
    C: toRows(C, ZERO),
    D: toRows(D, ZERO),
  };
  const square = withRegularRows(dual(withRegularRows(whole)));
  return characteristicPolynomial(fromRows(zeroDynamics(square), square.states, ({ n }) => n === 0n));
}

/** [A, B; C, D]. */
function besideAndBelow(
  A: SparseMatrix<Rational>,
  B: SparseMatrix<Rational>,
  C: SparseMatrix<Rational>,
  D: SparseMatrix<Rational>,
): SparseMatrix<Rational> {
  const beside = (left: SparseMatrix<Rational>, right: SparseMatrix<Rational>): Rational[][] => {
    const others = toRows(right, ZERO);
    return toRows(left, ZERO).map((row, i) => [...row, ...others[i]!]);
  };
  return fromRows([...beside(A, B), ...beside(C, D)], A.rows + B.columns, ({ n }) => n === 0n);
}

/** The system with all matrices transposed, inputs and outputs exchanged. */
function dual({ states, inputs, outputs, A, B, C, D }: System): System {
  return {
    states,
    inputs: outputs,
    outputs: inputs,
    A: transposed(A, states),
    B: transposed(C, states),
    C: transposed(B, inputs),
    D: transposed(D, inputs),
  };
}

function transposed(rows: Rows, columns: number): Rational[][] {
  return Array.from({ length: columns }, (_, j) => rows.map(row => row[j]!));
}

/**
 * A system with the same invariant zeros whose D has independent rows. Outputs without feedthrough, made as few as possible,
 * fix combinations of states at zero; these states are taken out and the equations of their derivatives become outputs.
 */
function withRegularRows(system: System): System {
  for (let current = system; ; ) {
    const outputs = current.D.map((row, i) => [...row, ...current.C[i]!]);
    const rank = reduceRows(outputs, current.inputs).length;
    const D = outputs.slice(0, rank).map(row => row.slice(0, current.inputs));
    const C = outputs.slice(0, rank).map(row => row.slice(current.inputs));
    const fixed = outputs.slice(rank).map(row => row.slice(current.inputs));
    const pivots = reduceRows(fixed, current.states);
    if (pivots.length === 0) return { ...current, outputs: rank, C, D };
    current = withoutFixedStates({ ...current, outputs: rank, C, D }, fixed.slice(0, pivots.length), pivots);
  }
}

/**
 * Takes the states in the pivot columns out. `fixed` gives, in echelon form, y = x_J + R x_F = 0 for the states J in the
 * pivot columns and the others F; in the states (x_F, y) the columns of y can be cleared by these rows, and what is left of the
 * rows of ẏ has no s in it.
 */
function withoutFixedStates({ inputs, A, B, C, D }: System, fixed: Rows, pivots: readonly number[]): System {
  const isPivot = new Set(pivots);
  const free = A.map((_, i) => i).filter(i => !isPivot.has(i));
  const R = fixed.map(row => free.map(j => row[j]!));
  // [left side on x_F | on u] of a row in x and u, once x_J = −R x_F is put in.
  const onFree = (row: readonly Rational[], direct: readonly Rational[]): Rational[] => {
    const inStates = free.map(j => row[j]!);
    pivots.forEach((j, k) => {
      subtractMultiple(inStates, row[j]!, R[k]!);
    });
    return [...inStates, ...direct];
  };
  const kept = free.map(i => onFree(A[i]!, B[i]!));
  const taken = pivots.map((i, k) => {
    const row = onFree(A[i]!, B[i]!);
    R[k]!.forEach((factor, f) => {
      subtractMultiple(row, negateRational(factor), kept[f]!);
    });
    return row;
  });
  const outputs = [...taken, ...C.map((row, i) => onFree(row, D[i]!))];
  const n = free.length;
  return {
    states: n,
    inputs,
    outputs: outputs.length,
    A: kept.map(row => row.slice(0, n)),
    B: kept.map(row => row.slice(n)),
    C: outputs.map(row => row.slice(0, n)),
    D: outputs.map(row => row.slice(n)),
  };
}

/** A − B D⁻¹ C for an invertible D: what is left of the motion when the inputs hold all outputs at zero. */
function zeroDynamics({ inputs, A, B, C, D }: System): Rows {
  const solution = D.map((row, i) => [...row, ...C[i]!]);
  reduceRows(solution, inputs);
  return A.map((row, i) => {
    const motion = [...row];
    B[i]!.forEach((b, k) => {
      subtractMultiple(motion, b, solution[k]!.slice(inputs));
    });
    return motion;
  });
}
