/** The linear rest of a drawing without its dead times and limiters, as a model whose last inputs and outputs are theirs. */

import type { SparseMatrix } from '../../algebra/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import { derive } from '../derive.ts';
import { flatten } from '../flatten/index.ts';
import { numericMatrices } from '../numeric-matrices.ts';
import { doubleArithmetic, numericReader } from '../quantities/index.ts';
import type { SignalName, SystemMatrices } from '../state-space.ts';
import { openDrawing } from './open-drawing.ts';

/** A dead time that was taken out. */
export interface OpenedDelay {
  readonly name: string;
  readonly path: string;
  /** s, positive. */
  readonly seconds: number;
}

/** A limiter that was taken out. */
export interface OpenedLimiter {
  readonly name: string;
  readonly path: string;
  readonly lower: number;
  readonly upper: number;
}

/**
 * A, B, C, D in doubles. Columns of B and D: the drawing's inputs, then the outputs of the dead times, then those of the limiters.
 * Rows of C and D: the drawing's outputs, then what feeds the dead times, then what feeds the limiters.
 */
export interface OpenedModel {
  readonly matrices: SystemMatrices<number>;
  readonly states: readonly SignalName[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  readonly initialState: readonly number[];
  readonly delays: readonly OpenedDelay[];
  readonly limiters: readonly OpenedLimiter[];
}

/**
 * The opened model, or why there is none: besides the problems of `compile`, a drawing in which something differentiates what a dead
 * time or a limiter puts out.
 */
export function openedModel(diagram: Diagram): Result<OpenedModel> {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters;
  const number = (text: string) => {
    const value = evaluateQuantity(text, parameters.value);
    return value.ok ? value.value.double : Number.NaN;
  };
  // A dead time of zero is a wire, and a block whose fields have no value is refused as compile refuses it.
  const flat = flatten(diagram);
  const { drawing, opened, inputOf } = openDrawing(flat, block =>
    block.kind === 'delay' ? number(block.time) > 0 : number(block.lower) <= number(block.upper),
  );
  const derived = derive(drawing, numericReader(doubleArithmetic, parameters.value));
  if (!derived.ok) return derived;
  const { states, inputs, outputs, matrices } = derived.value;
  const kindOf = (k: number) => opened[k]?.block.kind;
  const columns = [
    ...inputs.flatMap((_, j) => (inputOf[j] === -1 ? [j] : [])),
    ...inputs.flatMap((_, j) => (kindOf(inputOf[j] ?? -1) === 'delay' ? [j] : [])),
    ...inputs.flatMap((_, j) => (kindOf(inputOf[j] ?? -1) === 'limiter' ? [j] : [])),
  ];
  const own = outputs.length - opened.length;
  const rows = [
    ...Array.from({ length: own }, (_, i) => i),
    ...opened.flatMap(({ block }, k) => (block.kind === 'delay' ? [own + k] : [])),
    ...opened.flatMap(({ block }, k) => (block.kind === 'limiter' ? [own + k] : [])),
  ];
  const { A, B, C, D } = numericMatrices(matrices, value => value);
  return ok({
    matrices: { A, B: inColumns(B, columns), C: inRows(C, rows), D: inColumns(inRows(D, rows), columns) },
    states: states.map(({ initial: _, ...name }) => name),
    initialState: states.map(({ initial }) => initial),
    inputs: columns.flatMap(j => (inputOf[j] === -1 ? [inputs[j]!] : [])),
    outputs: outputs.slice(0, own),
    delays: opened.flatMap(({ block, name, path }) =>
      block.kind === 'delay' ? [{ name, path, seconds: number(block.time) }] : [],
    ),
    limiters: opened.flatMap(({ block, name, path }) =>
      block.kind === 'limiter' ? [{ name, path, lower: number(block.lower), upper: number(block.upper) }] : [],
    ),
  });
}

/** The rows in another order. */
function inRows(
  { columns, rowStart, column, values }: SparseMatrix<number>,
  order: readonly number[],
): SparseMatrix<number> {
  const spans = order.map(i => [rowStart[i] ?? 0, rowStart[i + 1] ?? 0] as const);
  const starts = new Int32Array(order.length + 1);
  spans.forEach(([from, to], i) => {
    starts[i + 1] = (starts[i] ?? 0) + to - from;
  });
  const places = spans.flatMap(([from, to]) => Array.from({ length: to - from }, (_, k) => from + k));
  return {
    rows: order.length,
    columns,
    rowStart: starts,
    column: Int32Array.from(places, k => column[k] ?? 0),
    values: Float64Array.from(places, k => values[k] ?? 0),
  };
}

/** The columns in another order; within a row they stay ascending. */
function inColumns(matrix: SparseMatrix<number>, order: readonly number[]): SparseMatrix<number> {
  const placeOf = new Map(order.map((from, to) => [from, to]));
  const column = new Int32Array(matrix.values.length);
  const values = new Float64Array(matrix.values.length);
  for (let i = 0; i < matrix.rows; i++) {
    const from = matrix.rowStart[i] ?? 0;
    const entries = Array.from({ length: (matrix.rowStart[i + 1] ?? 0) - from }, (_, k) => ({
      column: placeOf.get(matrix.column[from + k] ?? 0) ?? 0,
      value: matrix.values[from + k] ?? 0,
    })).sort((a, b) => a.column - b.column);
    entries.forEach((entry, k) => {
      column[from + k] = entry.column;
      values[from + k] = entry.value;
    });
  }
  return { ...matrix, columns: order.length, column, values };
}
