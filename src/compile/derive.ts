/**
 * The derivation over one field, from a flat drawing to matrices: laws, equations, loops, elimination. What compile runs
 * with numbers and the symbolic view with rational functions.
 */

import { type Problem, problem, type Result, type Warning } from '../problem/index.ts';
import { eliminate, type SolvedLoop } from './eliminate/index.ts';
import { cutMatrix, type Equations, type ModelState, type RowStore, writeEquations } from './equations/index.ts';
import { blockOfSignals, type FlatDrawing } from './flatten/index.ts';
import { readContributions } from './kinds/index.ts';
import { loopWithoutSolution, nearlySingularLoop, orderSignals, pathsOf } from './loops/index.ts';
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

/** Derives a drawing's model. Every stage reports all its problems, then the next is not entered. */
export function derive<T>(
  drawing: FlatDrawing,
  reader: QuantityReader<T> & { takeIrrational?(): readonly string[] },
): Result<DerivedModel<T>> {
  const readings = readContributions(drawing.blocks, reader);
  if (!readings.ok) return readings;
  const { contributions, warnings, irrational } = readings.value;
  const equations = writeEquations(reader.arithmetic, drawing, contributions);
  const misnamed = nameProblems(equations);
  if (misnamed.length > 0) return { ok: false, problems: misnamed };
  const measureLoops = reader.arithmetic.field.name !== 'symbolic';
  const { loops, reduced } = eliminate(equations, orderSignals(equations), { measureLoops });
  const located = locateLoops(drawing, loops);
  const refusals = located
    .filter(({ loop }) => loop.isSingular)
    .map(({ blocks }) => loopWithoutSolution(drawing, blocks));
  if (reduced === null) return { ok: false, problems: refusals };
  if (equations.differentiated.length > 0) return { ok: false, problems: equations.differentiated.map(notReduced) };
  return {
    ok: true,
    value: {
      states: equations.states,
      inputs: equations.inputs,
      outputs: equations.outputs,
      matrices: cutMatrices(equations, reduced),
      shiftedStates: [],
      loops: located.map(({ blocks }) => ({ blocks: pathsOf(drawing, blocks) })),
      warnings: [...warnings, ...nearlySingular(drawing, located)],
      irrational,
    },
  };
}

function notReduced({ name, block }: SignalName): Problem {
  const message = `Block ${name} differentiates its input, which derivation does not reduce. Put a lag in its place.`;
  return problem('not-supported', message, { blocks: [block] });
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

/** A, B, C and D out of the rows of state derivatives and outputs. */
function cutMatrices<T>({ states, outputs, known }: Equations<T>, reduced: RowStore<T>): SystemMatrices<T> {
  const n = states.length;
  const derivatives = Int32Array.from({ length: n }, (_, i) => i);
  const outputRows = Int32Array.from({ length: outputs.length }, (_, i) => reduced.rows - outputs.length + i);
  return {
    A: cutMatrix(reduced, derivatives, 0, n),
    B: cutMatrix(reduced, derivatives, n, known),
    C: cutMatrix(reduced, outputRows, 0, n),
    D: cutMatrix(reduced, outputRows, n, known),
  };
}
