/** Drawings that differentiate too much or in a loop without solution, in the words of the screen. */

import { type Problem, problem } from '../../problem/index.ts';
import type { DifferentiatedSignal, Equations, RowStore } from '../equations/index.ts';
import type { FlatDrawing } from '../flatten/index.ts';
import { titleOf } from '../flatten/index.ts';

const REMEDY = 'Put a lag in its place, or take the output from behind an integrator.';

/** The refusal of an output that needs the derivative of an input. */
export function derivativeOfInput<T>(
  drawing: FlatDrawing,
  equations: Equations<T>,
  reduced: RowStore<T>,
  output: number,
  input: number,
): Problem {
  const blocks = between(equations, reduced, output, input);
  const message =
    `Output ${equations.outputs[output]!.name} needs a derivative of input ${equations.inputs[input]!.name}, ` +
    `which ${namesOf(drawing, blocks)} would have to form. ${REMEDY}`;
  return problem('derivative-of-input', message, { blocks });
}

/** The refusal of differentiations that determine nothing, `open` by their numbers. */
export function differentiationWithoutSolution<T>(
  drawing: FlatDrawing,
  { differentiated }: Equations<T>,
  open: readonly number[],
): Problem {
  const blocks = pathsOfDifferentiated(open.map(k => differentiated[k]!));
  const message =
    `The algebraic loop through ${namesOf(drawing, blocks)} has no unique solution. ` +
    'Change a gain or put an integrator in it.';
  return problem('loop-without-solution', message, { blocks });
}

function pathsOfDifferentiated(signals: readonly DifferentiatedSignal[]): string[] {
  return [...new Set(signals.map(({ block }) => block))];
}

function namesOf({ blocks }: FlatDrawing, paths: readonly string[]): string {
  const titles = paths.map(path => {
    const flat = blocks.find(block => block.path === path);
    return flat === undefined ? path : titleOf(flat);
  });
  return titles.length < 2 ? titles.join() : `${titles.slice(0, -1).join(', ')} and ${titles.at(-1)}`;
}

/**
 * The differentiating blocks on some way from the input to the output. Row r of the reduced equations gives known r, as far
 * as it is a state or a derivative; outputs have the rows and inputs the columns behind.
 */
function between<T>(equations: Equations<T>, reduced: RowStore<T>, output: number, input: number): string[] {
  const inner = equations.states.length + equations.differentiated.length;
  const isInner = (node: number) => node < inner;
  const columnsOf = (row: number) => [...reduced.column.subarray(reduced.start[row], reduced.start[row + 1])];
  const rowsOf: number[][] = Array.from({ length: inner + equations.inputs.length }, () => []);
  for (let row = 0; row < reduced.rows; row++) for (const column of columnsOf(row)) rowsOf[column]!.push(row);
  const fromInput = reachable(rowsOf[inner + input]!.filter(isInner), node => rowsOf[node]!.filter(isInner));
  const toOutput = reachable(columnsOf(inner + output).filter(isInner), node => columnsOf(node).filter(isInner));
  const first = equations.states.length;
  return pathsOfDifferentiated(
    equations.differentiated.filter((_, k) => fromInput.has(first + k) && toOutput.has(first + k)),
  );
}

function reachable(start: readonly number[], next: (node: number) => readonly number[]): ReadonlySet<number> {
  const found = new Set(start);
  for (const node of found) for (const other of next(node)) found.add(other);
  return found;
}
