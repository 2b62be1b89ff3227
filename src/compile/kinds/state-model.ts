/** ẋ = A x + B u, y = C x + D u with the block's own matrices. */

import { portCounts, type Quantity, type StateModelBlock } from '../../diagram/index.ts';
import { combine, fail, ok, problem, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { numberedStates } from './companion-form.ts';
import type { Contribution } from './contribution.ts';

type Rows = readonly (readonly Quantity[])[];

/** A state model's law; matrices whose shapes do not fit together are refused. */
export function stateModel<T>(block: StateModelBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const misfit = shapeFault(block);
  if (misfit !== null) return fail(problem('bad-value', misfit));
  const matrices = combine([block.A, block.B, block.C, block.D].map(rows => readRows(rows, reader)));
  const initial = combine((block.initial ?? []).map(text => reader.double(text)));
  if (!matrices.ok) return matrices;
  if (!initial.ok) return initial;
  const [A = [], B = [], C = [], D = []] = matrices.value;
  const states = numberedStates(A.length, initial.value);
  return ok({ states, A, B, C, D, derivatives: [], derivativeSuffixes: [], lowered: [] });
}

function readRows<T>(rows: Rows, reader: QuantityReader<T>): Result<T[][]> {
  return combine(rows.map(row => combine(row.map(text => reader.quantity(text)))));
}

/** A sentence without the block's name, null where the shapes fit. */
function shapeFault(block: StateModelBlock): string | null {
  const n = block.A.length;
  const { inputs, outputs } = portCounts(block);
  const wanted = [
    ['A', block.A, n, n],
    ['B', block.B, n, inputs],
    ['C', block.C, outputs, n],
    ['D', block.D, outputs, inputs],
  ] as const;
  for (const [name, rows, height, width] of wanted) {
    if (rows.length !== height || rows.some(row => row.length !== width)) {
      return `${name} is to have ${height} rows of ${width}. Make its shape fit the other matrices.`;
    }
  }
  const given = block.initial?.length ?? n;
  return given === n ? null : `it has ${n} states but ${given} initial values. Give one for each state.`;
}
