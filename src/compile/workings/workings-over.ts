/**
 * The lines of a derivation over one field: equations as they are read off the drawing, loops with their solutions,
 * substitutions, the result. The same passes as derive's, with what they came to kept.
 */

import { reduceDerivatives } from '../derivatives/index.ts';
import { eliminate } from '../eliminate/index.ts';
import { type Equations, type RowStore, writeEquations } from '../equations/index.ts';
import { type FlatDrawing, signalCount, titleAtStart } from '../flatten/index.ts';
import { readContributions } from '../kinds/index.ts';
import { orderSignals, type SignalOrder } from '../loops/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { type ColumnNames, columnNames } from './signal-names.ts';

/** One product of a line's right side. */
export interface WorkingTerm<T> {
  readonly coefficient: T;
  /** A state, an input, a rate (the derivative of a differentiated signal) or a signal. */
  readonly of: string;
}

/** left = Σ terms, or d left/dt = Σ terms. */
export interface WorkingLine<T> {
  readonly left: string;
  readonly isDerivative: boolean;
  readonly terms: readonly WorkingTerm<T>[];
}

export interface WorkingSection<T> {
  readonly kind: 'drawing' | 'loop' | 'solution' | 'substitution' | 'differentiation' | 'result';
  readonly lines: readonly WorkingLine<T>[];
  /** Whole sentences about the lines: dead times, differentiations, shifted states. */
  readonly remarks: readonly string[];
}

/** Signals up to which workings are written: beyond it nobody checks them by hand. */
export const MOST_SIGNALS = 200;

/** The sections in the order of the derivation; null where the drawing has no model or more than `MOST_SIGNALS` signals. */
export function workingsOver<T>(drawing: FlatDrawing, reader: QuantityReader<T>): readonly WorkingSection<T>[] | null {
  if (signalCount(drawing) > MOST_SIGNALS) return null;
  const readings = readContributions(drawing.blocks, reader);
  if (!readings.ok) return null;
  const equations = writeEquations(reader.arithmetic, drawing, readings.value.contributions);
  const order = orderSignals(equations);
  const { reduced, kept } = eliminate(equations, order, { measureLoops: false });
  if (reduced === null || kept === null) return null;
  const names = columnNames(drawing, equations);
  const solved: Solved<T> = { equations, order, names, resolved: kept.resolved, rowOf: kept.rowOf };
  const result = resultOf(drawing, solved, reduced);
  if (result === null) return null;
  const differentiates = equations.differentiated.length > 0;
  return [
    section('drawing', asDrawn(solved), [...deadTimes(drawing, equations), ...rates(equations)]),
    ...loopSections(solved),
    section('substitution', substitutions(solved)),
    ...(differentiates ? [section('differentiation', behindSignals(solved, reduced, 0))] : []),
    result,
  ].filter(({ kind, lines }) => lines.length > 0 || kind === 'result');
}

interface Solved<T> {
  readonly equations: Equations<T>;
  readonly order: SignalOrder;
  readonly names: ColumnNames;
  /** Signals over the knowns, and each signal's row there. */
  readonly resolved: RowStore<T>;
  readonly rowOf: Int32Array;
}

function section<T>(
  kind: WorkingSection<T>['kind'],
  lines: readonly WorkingLine<T>[],
  remarks: readonly string[] = [],
): WorkingSection<T> {
  return { kind, lines, remarks };
}

function termsOf<T>(rows: RowStore<T>, row: number, names: readonly string[]): WorkingTerm<T>[] {
  const places = Array.from({ length: rows.start[row + 1]! - rows.start[row]! }, (_, i) => rows.start[row]! + i);
  places.sort((a, b) => rows.column[a]! - rows.column[b]!);
  return places.map(k => ({ coefficient: rows.values[k]!, of: names[rows.column[k]!]! }));
}

/** The signals of needed components, of loops or of the others, that have lines of their own. */
function signalsOf<T>({ order, names }: Solved<T>, inLoops: boolean): number[][] {
  const { components, isLoop, isNeeded } = order;
  const found: number[][] = [];
  for (let c = 0; c < components.count; c++) {
    if (isNeeded[c] !== 1 || (isLoop[c] === 1) !== inLoops) continue;
    const members = Array.from(components.member.subarray(components.start[c], components.start[c + 1]));
    const own = members.filter(signal => names.hasLine[signal]);
    if (own.length > 0) found.push(own);
  }
  return found;
}

function signalLine<T>({ names, equations }: Solved<T>, signal: number, rows: RowStore<T>, row: number) {
  const left = names.names[equations.known + signal]!;
  return { left, isDerivative: false, terms: termsOf(rows, row, names.names) };
}

/** The rows behind the signals: state derivatives, differentiated signals, outputs; `from` is the first of them in `rows`. */
function behindSignals<T>({ equations, names }: Solved<T>, rows: RowStore<T>, from: number): WorkingLine<T>[] {
  const { states, differentiated, outputs } = equations;
  const lefts = [
    ...states.map(({ name }) => ({ left: name, isDerivative: true })),
    ...differentiated.map(({ name }) => ({ left: `${name}.in`, isDerivative: false })),
    ...outputs.map(({ name }) => ({ left: name, isDerivative: false })),
  ];
  return lefts.map((left, i) => ({ ...left, terms: termsOf(rows, from + i, names.names) }));
}

function asDrawn<T>(solved: Solved<T>): WorkingLine<T>[] {
  const { rows, signals } = solved.equations;
  const needed = [...signalsOf(solved, false), ...signalsOf(solved, true)].flat().sort((a, b) => a - b);
  return [...behindSignals(solved, rows, signals), ...needed.map(signal => signalLine(solved, signal, rows, signal))];
}

/** For each loop its own equations, then its signals over what is known. */
function loopSections<T>(solved: Solved<T>): WorkingSection<T>[] {
  const { equations, resolved, rowOf } = solved;
  return signalsOf(solved, true).flatMap(members => [
    section(
      'loop',
      members.map(signal => signalLine(solved, signal, equations.rows, signal)),
    ),
    section(
      'solution',
      members.map(signal => signalLine(solved, signal, resolved, rowOf[signal]!)),
    ),
  ]);
}

function substitutions<T>(solved: Solved<T>): WorkingLine<T>[] {
  return signalsOf(solved, false)
    .flat()
    .map(signal => signalLine(solved, signal, solved.resolved, solved.rowOf[signal]!));
}

function resultOf<T>(drawing: FlatDrawing, solved: Solved<T>, reduced: RowStore<T>): WorkingSection<T> | null {
  const { equations } = solved;
  if (equations.differentiated.length === 0) return section('result', behindSignals(solved, reduced, 0));
  const model = reduceDerivatives(drawing, equations, reduced);
  if (!model.ok) return null;
  const { states, rows, shiftedStates } = model.value;
  const names = [...states, ...equations.inputs].map(({ name }) => name);
  const lefts = [
    ...states.map(({ name }) => ({ left: name, isDerivative: true })),
    ...equations.outputs.map(({ name }) => ({ left: name, isDerivative: false })),
  ];
  const lines = lefts.map((left, i) => ({ ...left, terms: termsOf(rows, i, names) }));
  const shifted =
    shiftedStates.length === 0 ? [] : [`An input was taken from ${shiftedStates.join(', ')}: z = x - b*u.`];
  return section('result', lines, shifted);
}

/** What each dead time stands in by, in document order. */
function deadTimes<T>({ blocks }: FlatDrawing, { states }: Equations<T>): string[] {
  return blocks.flatMap(flat => {
    if (flat.block.kind !== 'delay') return [];
    const own = states.filter(({ block }) => block === flat.path);
    const title = `${titleAtStart(flat)} of ${flat.block.time} s`;
    if (own.length === 0) return [`${title} is zero and hands its input on.`];
    const names = own.map(({ name }) => name).join(', ');
    return [
      `${title} stands in by its Padé approximant of order ${own.length}, with the state${own.length === 1 ? '' : 's'} ${names}.`,
    ];
  });
}

function rates<T>({ differentiated }: Equations<T>): string[] {
  return differentiated.map(({ name }) => `${name}.rate is the time derivative of ${name}.in.`);
}
