/**
 * Turns a flat drawing and the contributions of its blocks into equations. Stands after `flatten` and the laws of the
 * kinds, before the loops are looked for.
 */

import { type FlatBlock, type FlatDrawing, signalCount } from '../flatten/index.ts';
import type { Contribution } from '../kinds/index.ts';
import type { Arithmetic } from '../quantities/index.ts';
import type { SignalName } from '../state-space.ts';
import type { DifferentiatedSignal, Equations, ModelState } from './equations.ts';
import { RowAccumulator } from './row-accumulator.ts';
import { RowStore } from './row-store.ts';

/** Where a block's own states, derivatives and input begin among the columns. */
interface Columns {
  readonly state: Int32Array;
  readonly derivative: Int32Array;
  readonly input: Int32Array;
}

/**
 * One equation for every signal, state derivative, differentiated signal and output, in document order.
 *
 * @param contributions  One for each block of the drawing; null for external inputs and outputs.
 */
export function writeEquations<T>(
  arithmetic: Arithmetic<T>,
  drawing: FlatDrawing,
  contributions: readonly (Contribution<T> | null)[],
): Equations<T> {
  const names = collectNames(drawing.blocks, contributions);
  const signals = signalCount(drawing);
  const known = names.states.length + names.differentiated.length + names.inputs.length;
  const rows = new RowStore(arithmetic, signals + known + names.outputs.length, 2 * (signals + known) + 16);
  const columns = placeColumns(drawing.blocks, contributions, names);
  const writer: Writer<T> = { drawing, columns, known, row: new RowAccumulator(arithmetic, known + signals), rows };
  contributions.forEach((contribution, b) => {
    writeSignals(writer, b, contribution, arithmetic.field.one);
  });
  contributions.forEach((contribution, b) => {
    if (contribution !== null) writeStateDerivatives(writer, b, contribution);
  });
  contributions.forEach((contribution, b) => {
    if (contribution !== null) writeDifferentiated(writer, b, contribution, arithmetic.field.one);
  });
  drawing.blocks.forEach((flat, b) => {
    if (isExternal(flat, 'output')) writeOutput(writer, b, arithmetic.field.one);
  });
  return { arithmetic, ...names, signals, known, rows };
}

interface Writer<T> {
  readonly drawing: FlatDrawing;
  readonly columns: Columns;
  readonly known: number;
  readonly row: RowAccumulator<T>;
  readonly rows: RowStore<T>;
}

function isExternal({ block, role }: FlatBlock, kind: 'input' | 'output'): boolean {
  return role === 'external' && block.kind === kind;
}

type Names = Pick<Equations<unknown>, 'states' | 'differentiated' | 'inputs' | 'outputs'>;

function collectNames<T>(blocks: readonly FlatBlock[], contributions: readonly (Contribution<T> | null)[]): Names {
  const states: ModelState[] = [];
  const differentiated: DifferentiatedSignal[] = [];
  const inputs: SignalName[] = [];
  const outputs: SignalName[] = [];
  blocks.forEach((flat, b) => {
    const contribution = contributions[b];
    if (isExternal(flat, 'input')) inputs.push(externalName(flat));
    if (isExternal(flat, 'output')) outputs.push(externalName(flat));
    if (contribution === null || contribution === undefined) return;
    for (const { suffix, ...state } of contribution.states) {
      states.push({ name: flat.name + suffix, block: flat.path, ...state });
    }
    for (const suffix of contribution.derivativeSuffixes) {
      differentiated.push({ name: flat.name + suffix, block: flat.path, statesBefore: states.length });
    }
  });
  return { states, differentiated, inputs, outputs };
}

function externalName({ block, name, path }: FlatBlock): SignalName {
  const unit = block.kind === 'input' || block.kind === 'output' ? block.unit : undefined;
  return unit === undefined ? { name, block: path } : { name, block: path, unit };
}

function placeColumns<T>(
  blocks: readonly FlatBlock[],
  contributions: readonly (Contribution<T> | null)[],
  { states, differentiated }: Names,
): Columns {
  const columns: Columns = {
    state: new Int32Array(blocks.length),
    derivative: new Int32Array(blocks.length),
    input: new Int32Array(blocks.length),
  };
  let state = 0;
  let derivative = states.length;
  let input = states.length + differentiated.length;
  blocks.forEach((flat, b) => {
    columns.state[b] = state;
    columns.derivative[b] = derivative;
    columns.input[b] = input;
    state += contributions[b]?.states.length ?? 0;
    derivative += contributions[b]?.derivatives.length ?? 0;
    if (isExternal(flat, 'input')) input += 1;
  });
  return columns;
}

function writeSignals<T>(writer: Writer<T>, b: number, contribution: Contribution<T> | null, one: T): void {
  const { drawing, columns, row, rows } = writer;
  if (contribution === null) {
    if (drawing.signalStart[b] === drawing.signalStart[b + 1]) return;
    row.add(columns.input[b]!, one);
    row.finishRow(rows);
    return;
  }
  contribution.D.forEach((fromInputs, output) => {
    addTerms(row, columns.state[b]!, contribution.C[output]);
    addInputs(writer, b, fromInputs);
    addTerms(row, columns.derivative[b]!, contribution.derivatives);
    row.finishRow(rows);
  });
}

function writeStateDerivatives<T>(writer: Writer<T>, b: number, { states, A, B }: Contribution<T>): void {
  for (let i = 0; i < states.length; i++) {
    addTerms(writer.row, writer.columns.state[b]!, A[i]);
    addInputs(writer, b, B[i]);
    writer.row.finishRow(writer.rows);
  }
}

/** The first differentiation is of the block's input, each further one of the derivative before it. */
function writeDifferentiated<T>(writer: Writer<T>, b: number, { derivatives }: Contribution<T>, one: T): void {
  for (let k = 0; k < derivatives.length; k++) {
    if (k === 0) addInputs(writer, b, [one]);
    else writer.row.add(writer.columns.derivative[b]! + k - 1, one);
    writer.row.finishRow(writer.rows);
  }
}

function writeOutput<T>(writer: Writer<T>, b: number, one: T): void {
  addInputs(writer, b, [one]);
  writer.row.finishRow(writer.rows);
}

function addTerms<T>(row: RowAccumulator<T>, first: number, coefficients: readonly T[] | undefined): void {
  if (coefficients === undefined) return;
  for (let j = 0; j < coefficients.length; j++) row.add(first + j, coefficients[j]!);
}

/** Terms in the signals at the block's input ports; an open port adds nothing. */
function addInputs<T>({ drawing, known, row }: Writer<T>, b: number, coefficients: readonly T[] | undefined): void {
  if (coefficients === undefined) return;
  const firstPort = drawing.inputStart[b]!;
  for (let port = 0; port < coefficients.length; port++) {
    const signal = drawing.source[firstPort + port]!;
    if (signal >= 0) row.add(known + signal, coefficients[port]!);
  }
}
