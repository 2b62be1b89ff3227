/**
 * Fifth pass, for drawings that differentiate: from rows over states, derivatives and inputs to rows over states and inputs
 * alone. Stands after the elimination; others skip it.
 */

import type { Result } from '../../problem/index.ts';
import type { Equations, ModelState } from '../equations/index.ts';
import { RowStore } from '../equations/index.ts';
import type { FlatDrawing } from '../flatten/index.ts';
import { derivativeOfInput, differentiationWithoutSolution } from './derivative-findings.ts';
import { type Descriptor, descriptorOf, firstDerivative, firstInput, type Row } from './descriptor.ts';
import { reduceIndex } from './reduce-index.ts';
import { shiftStates } from './shift-states.ts';

/** States that are left and what they and the outputs are fed. */
export interface ReducedModel<T> {
  /** In document order. A differentiation that acts as a lag has brought one; one that a constraint binds is gone. */
  readonly states: readonly ModelState[];
  /** The states' derivatives, then the outputs, over those states and the inputs. */
  readonly rows: RowStore<T>;
  /** Names of the states that an input was taken from. */
  readonly shiftedStates: readonly string[];
}

/**
 * The model without derivatives; refused where an output needs the derivative of an input, one problem for each such pair,
 * or where the derivatives are not determined.
 *
 * @param reduced  The rows that `eliminate` gives.
 */
export function reduceDerivatives<T>(
  drawing: FlatDrawing,
  equations: Equations<T>,
  reduced: RowStore<T>,
): Result<ReducedModel<T>> {
  const descriptor = descriptorOf(equations, reduced);
  const open = reduceIndex(descriptor);
  if (open.length > 0) {
    const numbers = open.map(column => column - firstDerivative(descriptor));
    return { ok: false, problems: [differentiationWithoutSolution(drawing, equations, numbers)] };
  }
  const shifted = shiftStates(descriptor);
  const improper = improperEntries(descriptor);
  if (improper.length > 0) {
    const problems = improper.map(([output, input]) => derivativeOfInput(drawing, equations, reduced, output, input));
    return { ok: false, problems };
  }
  const order = stateOrder(equations, descriptor);
  return {
    ok: true,
    value: {
      states: order.map(({ state }) => state),
      rows: rowsInOrder(equations, descriptor, order),
      shiftedStates: order.filter(({ column }) => shifted.includes(column)).map(({ state }) => state.name),
    },
  };
}

/** Output and input of each derivative that is left in an output, in order, each pair once. */
function improperEntries<T>(descriptor: Descriptor<T>): [output: number, input: number][] {
  const derivatives = firstInput(descriptor) + descriptor.inputs;
  return descriptor.outputs.flatMap((row, output) => {
    const inputs = [...row.keys()].filter(column => column >= derivatives);
    const numbers = new Set(inputs.map(column => (column - derivatives) % descriptor.inputs));
    return [...numbers].sort((a, b) => a - b).map((input): [number, number] => [output, input]);
  });
}

interface PlacedState {
  readonly column: number;
  readonly state: ModelState;
}

/** The states that are left, those of differentiations where their blocks stand. */
function stateOrder<T>({ states, differentiated }: Equations<T>, { motion }: Descriptor<T>): PlacedState[] {
  const own = states.map((state, i) => ({ column: i, state, place: i + 0.5 }));
  const lags = differentiated.map(({ statesBefore, ...name }, k) => {
    return { column: states.length + k, state: { ...name, initial: 0 }, place: statesBefore };
  });
  return [...own, ...lags].filter(({ column }) => motion.has(column)).sort((a, b) => a.place - b.place);
}

function rowsInOrder<T>(
  { arithmetic, inputs }: Equations<T>,
  descriptor: Descriptor<T>,
  order: readonly PlacedState[],
): RowStore<T> {
  const places = new Map(order.map(({ column }, place) => [column, place]));
  inputs.forEach((_, j) => {
    places.set(firstInput(descriptor) + j, order.length + j);
  });
  const rows = new RowStore(arithmetic);
  const write = (row: Row<T>) => {
    for (const [column, value] of row) rows.push(places.get(column)!, value);
    rows.endRow();
  };
  for (const { column } of order) write(descriptor.motion.get(column)!);
  descriptor.outputs.forEach(write);
  return rows;
}
