/** What the columns of the equations are called in workings, and which signals only hand another one on. */

import type { Equations } from '../equations/index.ts';
import { blockOfSignals, type FlatDrawing } from '../flatten/index.ts';

/** Names of all columns, no two alike among the knowns and the signals that have lines of their own. */
export interface ColumnNames {
  readonly names: readonly string[];
  /** For each signal whether it has a line of its own; the others stand under the name of what they hand on. */
  readonly hasLine: readonly boolean[];
}

/** A signal that is another column and nothing else, as an integrator's output is its state, takes that column's name. */
export function columnNames<T>(drawing: FlatDrawing, equations: Equations<T>): ColumnNames {
  const { states, differentiated, inputs, signals, known } = equations;
  const taken = new Set<string>();
  const unique = (name: string) => {
    let free = name;
    while (taken.has(free)) free += "'";
    taken.add(free);
    return free;
  };
  const knowns = [
    ...states.map(({ name }) => unique(name)),
    ...differentiated.map(({ name }) => unique(`${name}.rate`)),
    ...inputs.map(({ name }) => unique(name)),
  ];
  const handedOn = Array.from({ length: signals }, (_, signal) => handsOn(equations, signal));
  const owner = blockOfSignals(drawing);
  const own = Array.from({ length: signals }, (_, signal) =>
    handedOn[signal] === null ? unique(signalName(drawing, owner[signal]!, signal)) : '',
  );
  const named = (column: number): string => {
    let at = column;
    for (let next = handedOn[at - known]; next !== null && next !== undefined; next = handedOn[at - known]) at = next;
    return at < known ? knowns[at]! : own[at - known]!;
  };
  return {
    names: Array.from({ length: known + signals }, (_, column) => named(column)),
    hasLine: handedOn.map(column => column === null),
  };
}

/** The column that a signal is with coefficient one; null for any other equation, and for a ring that is nothing but that. */
function handsOn<T>({ arithmetic, rows, known }: Equations<T>, signal: number): number | null {
  const only = (row: number): number | null => {
    const k = rows.start[row]!;
    const isOne = rows.start[row + 1] === k + 1 && arithmetic.field.equals(rows.values[k]!, arithmetic.field.one);
    return isOne ? rows.column[k]! : null;
  };
  const first = only(signal);
  const met = new Set([signal]);
  for (let column = first; column !== null && column >= known; column = only(column - known)) {
    if (met.has(column - known)) return null;
    met.add(column - known);
  }
  return first;
}

function signalName({ blocks, signalStart }: FlatDrawing, block: number, signal: number): string {
  const ports = signalStart[block + 1]! - signalStart[block]!;
  const { name } = blocks[block]!;
  return ports === 1 ? name : `${name}.${signal - signalStart[block]! + 1}`;
}
