/**
 * The derivation over one field, from a flat drawing to matrices: laws, equations, loops, elimination. What compile runs
 * with numbers and the symbolic view with rational functions.
 */

import type { Result, Warning } from '../problem/index.ts';
import { type ReducedModel, reduceDerivatives } from './derivatives/index.ts';
import { type Elimination, eliminate, type KeptElimination, mayStartFrom, type SolvedLoop } from './eliminate/index.ts';
import { cutMatrix, type Equations, type ModelState, type RowStore, writeEquations } from './equations/index.ts';
import { blockOfSignals, type FlatDrawing } from './flatten/index.ts';
import { readContributions } from './kinds/index.ts';
import { loopWithoutSolution, nearlySingularLoop, orderSignals, pathsOf, type SignalOrder } from './loops/index.ts';
import { nameProblems } from './names.ts';
import type { IrrationalBlock, QuantityReader } from './quantities/index.ts';
import type { AlgebraicLoop, SignalName, SystemMatrices } from './state-space.ts';

/** A model over one field with how it came about. */
export interface DerivedModel<T> {
  readonly states: readonly ModelState[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  readonly matrices: SystemMatrices<T>;
  readonly shiftedStates: readonly string[];
  readonly loops: readonly AlgebraicLoop[];
  /** `order-lowered` and `nearly-singular-loop`. */
  readonly warnings: readonly Warning[];
  readonly irrational: readonly IrrationalBlock[];
}

/**
 * A loop is warned of where a relative change of its gains below this leaves it without solution: half the digits of a
 * double, so that figures computed from the model keep no more than the other half.
 */
const NEARLY_SINGULAR = 2 ** -26;

/** What one derivation leaves for the next over the same arithmetic. */
export interface DerivationMemory<T> {
  order: SignalOrder | null;
  kept: KeptElimination<T> | null;
}

/** A memory without a derivation. */
export function emptyMemory<T>(): DerivationMemory<T> {
  return { order: null, kept: null };
}

/**
 * Derives a drawing's model. Every stage reports all its problems, then the next is not entered.
 *
 * @param memory  Of the derivation before: what has not changed since is not eliminated again. The result is the same without.
 */
export function derive<T>(
  drawing: FlatDrawing,
  reader: QuantityReader<T> & { takeIrrational?(): readonly string[] },
  memory: DerivationMemory<T> = emptyMemory(),
): Result<DerivedModel<T>> {
  const readings = readContributions(drawing.blocks, reader);
  if (!readings.ok) return readings;
  const { contributions, warnings, irrational } = readings.value;
  const equations = writeEquations(reader.arithmetic, drawing, contributions);
  const { loops, reduced } = eliminated(equations, memory);
  const located = locateLoops(drawing, loops);
  const refusals = located
    .filter(({ loop }) => loop.isSingular)
    .map(({ blocks }) => loopWithoutSolution(drawing, blocks));
  if (reduced === null) return { ok: false, problems: refusals };
  const model = withoutDerivatives(drawing, equations, reduced);
  if (!model.ok) return model;
  const { states, rows, shiftedStates } = model.value;
  const { inputs, outputs } = equations;
  const misnamed = nameProblems({ states, inputs, outputs });
  if (misnamed.length > 0) return { ok: false, problems: misnamed };
  return {
    ok: true,
    value: {
      states,
      inputs,
      outputs,
      matrices: cutMatrices(rows, states.length, inputs.length, outputs.length),
      shiftedStates,
      loops: located.map(({ blocks }) => ({ blocks: pathsOf(drawing, blocks) })),
      warnings: [...warnings, ...nearlySingular(drawing, located)],
      irrational,
    },
  };
}

/** Eliminates the signals, from what the memory holds where it fits, and leaves there what the next may start from. */
function eliminated<T>(equations: Equations<T>, memory: DerivationMemory<T>): Elimination<T> {
  const former = memory.kept !== null && mayStartFrom(memory.kept, equations) ? memory.kept : null;
  const order = former === null || memory.order === null ? orderSignals(equations) : memory.order;
  // Where the effort ends half way, what is kept is half done: it is taken out first.
  memory.kept = null;
  const measureLoops = equations.arithmetic.field.name !== 'symbolic';
  const elimination = eliminate(equations, order, { measureLoops, former });
  memory.order = order;
  memory.kept = elimination.kept;
  return elimination;
}

/** The rows as they are where nothing is differentiated. */
function withoutDerivatives<T>(
  drawing: FlatDrawing,
  equations: Equations<T>,
  rows: RowStore<T>,
): Result<ReducedModel<T>> {
  if (equations.differentiated.length > 0) return reduceDerivatives(drawing, equations, rows);
  return { ok: true, value: { states: equations.states, rows, shiftedStates: [] } };
}

interface LocatedLoop {
  readonly loop: SolvedLoop;
  /** Its blocks by their indices, in document order, each once. */
  readonly blocks: readonly number[];
}

function locateLoops(drawing: FlatDrawing, loops: readonly SolvedLoop[]): LocatedLoop[] {
  if (loops.length === 0) return [];
  const owner = blockOfSignals(drawing);
  return loops.map(loop => ({ loop, blocks: [...new Set(Array.from(loop.signals, signal => owner[signal]!))] }));
}

function nearlySingular(drawing: FlatDrawing, loops: readonly LocatedLoop[]): Warning[] {
  return loops.flatMap(({ loop: { distance }, blocks }) =>
    distance !== null && distance < NEARLY_SINGULAR ? [nearlySingularLoop(drawing, blocks, distance)] : [],
  );
}

/** A, B, C and D out of n rows of state derivatives and p of outputs, over n states and m inputs. */
function cutMatrices<T>(rows: RowStore<T>, n: number, m: number, p: number): SystemMatrices<T> {
  const derivatives = Int32Array.from({ length: n }, (_, i) => i);
  const outputs = Int32Array.from({ length: p }, (_, i) => n + i);
  return {
    A: cutMatrix(rows, derivatives, 0, n),
    B: cutMatrix(rows, derivatives, n, n + m),
    C: cutMatrix(rows, outputs, 0, n),
    D: cutMatrix(rows, outputs, n, n + m),
  };
}
