/** The minimal model of a drawing: the same transfer functions with as few states as there can be, and what each state is. */

import { fromRows, type Rational, type SparseMatrix, toDouble, ZERO } from '../../algebra/index.ts';
import type { SignalName, StateSpace, SystemMatrices } from '../../compile/index.ts';
import { type Effort, type ExactModel, exactModel, remembered } from '../exact-model.ts';
import { type KalmanChange, kalmanChange } from './kalman-change.ts';
import type { RationalRows } from './rational-rows.ts';

export interface MinimalModel {
  /** As any model; exact where the drawing's is. States that are none of the drawing's are called z_1, z_2 …. */
  readonly model: StateSpace;
  /** z = S x: rows the minimal states, columns the drawing's. */
  readonly change: RationalRows;
  /** Whether the initial state holds something that no input reaches, so that the free response is another one. */
  readonly losesInitialState: boolean;
}

/** The minimal model; the model itself where it is minimal, null where it has too many states for exact answers. */
export function minimalModel(model: StateSpace, effort: Effort = 'ordinary'): MinimalModel | null {
  const exact = exactModel(model, effort);
  return exact === null ? null : remembered(known, exact, () => reduced(model, exact, kalmanChangeOf(exact)));
}

const known = new WeakMap<ExactModel, MinimalModel>();
const changes = new WeakMap<ExactModel, KalmanChange>();

/** The change of state, computed once a model. */
export function kalmanChangeOf(exact: ExactModel): KalmanChange {
  return remembered(changes, exact, () => kalmanChange(exact));
}

function reduced(model: StateSpace, exact: ExactModel, change: KalmanChange): MinimalModel {
  const { minimal, S, reached } = change;
  const rows = S.slice(0, minimal);
  const start = S.map(row => row.reduce((sum, entry, i) => sum + toDouble(entry) * (model.initialState[i] ?? 0), 0));
  const losesInitialState = start.slice(reached).some(value => value !== 0);
  if (minimal === model.states.length) return { model, change: rows, losesInitialState };
  const inputs = model.inputs.length;
  const matrices: SystemMatrices<Rational> = {
    A: sparse(change.A, minimal),
    B: sparse(change.B, inputs),
    C: sparse(change.C, minimal),
    D: exact.matrices.D,
  };
  const shifted = new Set(model.shiftedStates);
  const states = namedStates(model.states, rows);
  return {
    model: {
      ...model,
      states,
      numeric: mapped(matrices),
      rational: model.rational === null ? null : matrices,
      initialState: start.slice(0, minimal),
      shiftedStates: states
        .filter((_, k) => rows[k]!.some((entry, i) => entry.n !== 0n && shifted.has(model.states[i]!.name)))
        .map(({ name }) => name),
    },
    change: rows,
    losesInitialState,
  };
}

/** A state that is one of the drawing's keeps its name, block and unit; any other is numbered and stands with its first one's block. */
function namedStates(states: readonly SignalName[], rows: RationalRows): SignalName[] {
  const taken = new Set(states.map(({ name }) => name));
  let prefix = 'z';
  while (rows.some((_, k) => taken.has(`${prefix}_${k + 1}`))) prefix += 'z';
  return rows.map((row, k) => {
    const terms = row.flatMap((entry, i) => (entry.n === 0n ? [] : [i]));
    const first = states[terms[0] ?? 0]!;
    return terms.length === 1 ? first : { name: `${prefix}_${k + 1}`, block: first.block };
  });
}

function mapped({ A, B, C, D }: SystemMatrices<Rational>): SystemMatrices<number> {
  const rounded = (matrix: SparseMatrix<Rational>): SparseMatrix<number> => ({
    ...matrix,
    values: Float64Array.from(Array.from(matrix.values), toDouble),
  });
  return { A: rounded(A), B: rounded(B), C: rounded(C), D: rounded(D) };
}

function sparse(rows: RationalRows, columns: number): SparseMatrix<Rational> {
  return fromRows(rows, columns, ({ n }) => n === ZERO.n);
}
