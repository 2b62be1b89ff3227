/** Drawings that differentiate too much or in a loop without solution, in the words of the screen. */

import { type Problem, problem } from '../../problem/index.ts';
import type { DifferentiatedSignal, Equations, RowStore } from '../equations/index.ts';
import type { FlatDrawing } from '../flatten/index.ts';
import { listTitles, pathsOf } from '../loops/index.ts';

const REMEDY = 'Put a lag in its place, or take the output from behind an integrator.';

/** The refusal of an output that needs the derivative of an input. */
export function derivativeOfInput<T>(
  drawing: FlatDrawing,
  equations: Equations<T>,
  reduced: RowStore<T>,
  output: number,
  input: number,
): Problem {
  const blocks = blocksOf(drawing, between(equations, reduced, output, input));
  const message =
    `Output ${equations.outputs[output]!.name} needs a derivative of input ${equations.inputs[input]!.name}, ` +
    `which ${listTitles(drawing, blocks)} would have to form. ${REMEDY}`;
  return problem('derivative-of-input', message, { blocks: pathsOf(drawing, blocks) });
}

/** The refusal of differentiations that determine nothing, `open` by their numbers. */
export function differentiationWithoutSolution<T>(
  drawing: FlatDrawing,
  { differentiated }: Equations<T>,
  open: readonly number[],
): Problem {
  const blocks = blocksOf(
    drawing,
    open.map(k => differentiated[k]!),
  );
  const message =
    `The algebraic loop through ${listTitles(drawing, blocks)} has no unique solution. ` +
    'Change a gain or put an integrator in it.';
  return problem('loop-without-solution', message, { blocks: pathsOf(drawing, blocks) });
}

/** Indices of the blocks that differentiate the signals, in document order, each once. */
function blocksOf(drawing: FlatDrawing, signals: readonly DifferentiatedSignal[]): number[] {
  const paths = new Set(signals.map(({ block }) => block));
  return drawing.blocks.flatMap(({ path }, b) => (paths.has(path) ? [b] : []));
}

/**
 * The differentiating blocks on some way from the input to the output. Row r of the reduced equations gives known r, as far
 * as it is a state or a derivative; outputs have the rows and inputs the columns behind.
 */
function between<T>(
  equations: Equations<T>,
  reduced: RowStore<T>,
  output: number,
  input: number,
): DifferentiatedSignal[] {
  const inner = equations.states.length + equations.differentiated.length;
  const isInner = (node: number) => node < inner;
  const columnsOf = (row: number) => [...reduced.column.subarray(reduced.start[row], reduced.start[row + 1])];
  const rowsOf: number[][] = Array.from({ length: inner + equations.inputs.length }, () => []);
  for (let row = 0; row < reduced.rows; row++) for (const column of columnsOf(row)) rowsOf[column]!.push(row);
  const fromInput = reachable(rowsOf[inner + input]!.filter(isInner), node => rowsOf[node]!.filter(isInner));
  const toOutput = reachable(columnsOf(inner + output).filter(isInner), node => columnsOf(node).filter(isInner));
  const first = equations.states.length;
  return equations.differentiated.filter((_, k) => fromInput.has(first + k) && toOutput.has(first + k));
}

function reachable(start: readonly number[], next: (node: number) => readonly number[]): ReadonlySet<number> {
  const found = new Set(start);
  for (const node of found) for (const other of next(node)) found.add(other);
  return found;
}
