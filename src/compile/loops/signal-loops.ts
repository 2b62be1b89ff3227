/**
 * Third pass: the order in which signals can be resolved, and the algebraic loops among them. A signal depends on those in
 * its equation; the strongly connected components of that relation are the loops.
 */

import type { Equations } from '../equations/index.ts';
import { type Components, type Graph, stronglyConnectedComponents } from './components.ts';

/** Components of the signals, each after those that it depends on. */
export interface SignalOrder {
  readonly components: Components;
  /** For each component 1 where it is an algebraic loop: several signals, or one in its own equation. */
  readonly isLoop: Uint8Array;
  /** For each component 1 where a state's derivative, a differentiated signal or an output needs it. */
  readonly isNeeded: Uint8Array;
}

/** The resolving order of all signals, members of a loop ascending. Linear in the terms of the equations. */
export function orderSignals<T>({ rows, signals, known }: Equations<T>): SignalOrder {
  const graph: Graph = { nodes: signals, start: rows.start, target: rows.column, offset: known };
  const components = stronglyConnectedComponents(
    graph,
    Int32Array.from({ length: signals }, (_, s) => s),
  );
  const isLoop = new Uint8Array(components.count);
  for (let c = 0; c < components.count; c++) {
    const [from, to] = [components.start[c]!, components.start[c + 1]!];
    components.member.subarray(from, to).sort();
    if (to - from > 1 || dependsOnItself(graph, components.member[from]!)) isLoop[c] = 1;
  }
  return { components, isLoop, isNeeded: neededComponents(graph, components, rows.rows) };
}

function dependsOnItself({ start, target, offset }: Graph, signal: number): boolean {
  for (let k = start[signal]!; k < start[signal + 1]!; k++) {
    if (target[k] === offset + signal) return true;
  }
  return false;
}

/** Backwards through the order: a component is needed where a row behind the signals or a needed component uses it. */
function neededComponents(graph: Graph, { count, start, member }: Components, rows: number): Uint8Array {
  const needed = new Uint8Array(graph.nodes);
  const need = (row: number) => {
    for (let k = graph.start[row]!; k < graph.start[row + 1]!; k++) {
      const signal = graph.target[k]! - graph.offset;
      if (signal >= 0) needed[signal] = 1;
    }
  };
  for (let row = graph.nodes; row < rows; row++) need(row);
  const result = new Uint8Array(count);
  for (let c = count - 1; c >= 0; c--) {
    for (let i = start[c]!; i < start[c + 1]! && result[c] === 0; i++) result[c] = needed[member[i]!]!;
    if (result[c] === 0) continue;
    for (let i = start[c]!; i < start[c + 1]!; i++) need(member[i]!);
  }
  return result;
}
