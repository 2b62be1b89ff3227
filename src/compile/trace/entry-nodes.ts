/** Where an entry of the system matrix begins and ends in the signal-flow graph, and what stands in the way of tracing it. */

import type { StateSpace } from '../state-space.ts';
import { type ActionGraph, reachedFrom } from './action-graph.ts';
import type { EntryEnd, EntryPlace } from './trace.ts';
import type { TracedDrawing } from './traced-drawing.ts';

export interface EntryNodes {
  readonly from: EntryEnd;
  readonly to: EntryEnd;
  /** Node of the column: a state or an input; −1 where nothing uses it. */
  readonly source: number;
  /** Node of the row: a state's derivative or an output; −1 for a state that no block has of its own. */
  readonly sink: number;
}

/** The ends of the entry; `place` is one of the system matrix. */
export function nodesOfEntry(traced: TracedDrawing, { row, column }: EntryPlace): EntryNodes {
  const { model } = traced;
  const n = model.states.length;
  return {
    from: endOf(model, column, column < n ? 'state' : 'input'),
    to: endOf(model, row, row < n ? 'derivative' : 'output'),
    source: columnNode(traced, column),
    sink: rowNode(traced, row),
  };
}

/** Node of a column of the system matrix: the state or the input; −1 where nothing uses it. */
export function columnNode(traced: TracedDrawing, column: number): number {
  const n = traced.model.states.length;
  if (column >= n) return traced.graph.numberOf({ kind: 'input', index: column - n, level: 0 });
  return stateNode(traced, column, 0);
}

/** Node of a row of the system matrix: the state's derivative or the output; −1 for a state that no block has of its own. */
export function rowNode(traced: TracedDrawing, row: number): number {
  const n = traced.model.states.length;
  if (row >= n) return traced.graph.numberOf({ kind: 'output', index: row - n, level: 0 });
  return stateNode(traced, row, 1);
}

function stateNode({ model, ownStates, graph, hasOwnStates }: TracedDrawing, state: number, level: number): number {
  const index = hasOwnStates ? state : ownStates.indexOf(model.states[state]?.name ?? '');
  return index < 0 ? -1 : graph.numberOf({ kind: 'state', index, level });
}

function endOf({ states, inputs, outputs }: StateSpace, place: number, kind: EntryEnd['kind']): EntryEnd {
  const others = kind === 'input' ? inputs : outputs;
  const signal = place < states.length ? states[place] : others[place - states.length];
  if (signal === undefined) throw new RangeError('a place outside the system matrix');
  return { name: signal.name, block: signal.block, kind };
}

/**
 * Why paths alone do not give the entry, as a sentence; null where they do. Only drawings that differentiate have such entries:
 * where a differentiation acts as a lag, binds states to one another, or reaches an input so that a state was shifted.
 */
export function whyNotTraceable(traced: TracedDrawing, { from, to, sink }: EntryNodes): string | null {
  const { graph, model, ownStates, hasOwnStates } = traced;
  const added = [from, to].find(({ name, kind }) => kind !== 'input' && kind !== 'output' && !ownStates.includes(name));
  if (added !== undefined) {
    return `${added.name} is the state of a differentiation that acts as a lag: it comes of reducing the equations together, not of paths.`;
  }
  if (sink < 0) return null;
  const needed = reachedFrom(graph, [sink], 'backwards');
  if (differentiates(graph, needed)) {
    if (!hasOwnStates || [...needed].some(node => graph.endless.has(node))) {
      return `A differentiation on the way to ${to.name} acts as a lag or binds states to one another: the entry comes of reducing the equations together, not of paths.`;
    }
  } else if (bindsStates(traced, needed)) {
    return `A state that ${to.name} depends on is bound to others by a differentiation: the entry comes of reducing the equations together, not of paths.`;
  }
  const shifted = new Set(model.shiftedStates);
  const isShifted = [...needed].some(node => {
    const { kind, index, level } = graph.nodes[node]!;
    return (kind === 'input' && level > 0) || (kind === 'state' && shifted.has(ownStates[index]!));
  });
  if (from.kind === 'input' && shifted.size > 0 && isShifted) {
    return `A state was shifted by an input, since its equation holds that input’s derivative: the entry gathers what the shift brings, which no path shows.`;
  }
  return null;
}

function differentiates({ nodes }: ActionGraph, needed: ReadonlySet<number>): boolean {
  return [...needed].some(node => {
    const { kind, level } = nodes[node]!;
    return kind === 'signal' && level > 0;
  });
}

/** Whether a state that is needed is no state of the model. */
function bindsStates({ graph, model, ownStates, hasOwnStates }: TracedDrawing, needed: ReadonlySet<number>): boolean {
  if (hasOwnStates) return false;
  const kept = new Set(model.states.map(({ name }) => name));
  return [...needed].some(node => {
    const { kind, index, level } = graph.nodes[node]!;
    return kind === 'state' && level === 0 && !kept.has(ownStates[index]!);
  });
}
