/**
 * Diagram to matrices, pass by pass: flatten, equations, loops, eliminate. Pure. What compile does before it checks, for who
 * waits for the matrices and can wait for the check.
 */

import type { Rational } from '../algebra/index.ts';
import { Effort, withinEffort } from '../algebra/symbolic/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { evaluateParameters, type Scope } from '../expression/index.ts';
import type { Result, Warning } from '../problem/index.ts';
import { type DerivedModel, derive } from './derive.ts';
import { type FlatDrawing, flatten, openPortWarnings } from './flatten/index.ts';
import { numericMatrices, overflowProblems } from './numeric-matrices.ts';
import {
  doubleArithmetic,
  type IrrationalFinding,
  irrationalFindings,
  meteredRationals,
  type NumericArithmetic,
  numericReader,
  rationalArithmetic,
} from './quantities/index.ts';
import type { StateSpace, SystemMatrices, UncheckedDerivation } from './state-space.ts';
import { inDocumentOrder } from './warning-order.ts';

/** Which field the elimination runs over. */
export interface CompileOptions {
  /** `auto`, the default: rationals where they take less than about a second, doubles beyond. */
  readonly field?: 'rational' | 'double' | 'auto';
}

/**
 * The state-space model of a diagram that `readDiagram` or an edit made, or every problem of the first stage that has one:
 * parameters, fields of blocks, names, algebraic loops, derivatives of inputs. An empty sheet gives empty matrices.
 */
export function deriveModel(diagram: Diagram, { field = 'auto' }: CompileOptions = {}): Result<UncheckedDerivation> {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters;
  const drawing = flatten(diagram);
  const task: Task = { diagram, drawing, scope: parameters.value };
  switch (field) {
    case 'rational':
      return deriveRationals(task, rationalArithmetic);
    case 'double':
      return deriveDoubles(task);
    case 'auto': {
      const effort = new Effort({ maximumOperations: EXACT_EFFORT });
      const exact = withinEffort(() => deriveRationals(task, meteredRationals(effort)));
      return exact.finished ? exact.value : deriveDoubles(task);
    }
    default:
      return field satisfies never;
  }
}

/**
 * What an exact derivation may cost before doubles take over, in products of 64-bit words. Drawings of 5,000 blocks with
 * entries of 500 digits and rings of 200 gains of 16 digits come near it, at half a second to a second.
 */
const EXACT_EFFORT = 20_000_000;

interface Task {
  readonly diagram: Diagram;
  readonly drawing: FlatDrawing;
  readonly scope: Scope;
}

function deriveRationals(task: Task, arithmetic: NumericArithmetic<Rational>): Result<UncheckedDerivation> {
  const derived = derive(task.drawing, numericReader(arithmetic, task.scope));
  if (!derived.ok) return derived;
  return finish(task, derived.value, derived.value.matrices, arithmetic, 'rational');
}

function deriveDoubles(task: Task): Result<UncheckedDerivation> {
  const derived = derive(task.drawing, numericReader(doubleArithmetic, task.scope));
  return derived.ok ? finish(task, derived.value, null, doubleArithmetic, 'double') : derived;
}

function finish<T>(
  task: Task,
  derived: DerivedModel<T>,
  rational: SystemMatrices<Rational> | null,
  arithmetic: NumericArithmetic<T>,
  route: UncheckedDerivation['route'],
): Result<UncheckedDerivation> {
  const numeric = numericMatrices(derived.matrices, arithmetic.toDouble);
  const overflow = overflowProblems(numeric, derived);
  if (overflow.length > 0) return { ok: false, problems: overflow };
  const irrational = irrationalFindings(task.diagram.parameters, task.scope, derived.irrational);
  const model: StateSpace = {
    title: task.diagram.title,
    states: derived.states.map(({ initial: _, ...name }) => name),
    inputs: derived.inputs,
    outputs: derived.outputs,
    numeric,
    rational,
    irrational: irrational.map(({ name }) => name),
    initialState: derived.states.map(({ initial }) => initial),
    shiftedStates: derived.shiftedStates,
  };
  const warnings = [...openPortWarnings(task.drawing), ...irrational.map(irrationalWarning), ...derived.warnings];
  return {
    ok: true,
    value: {
      model,
      loops: derived.loops,
      warnings: inDocumentOrder(task.drawing, warnings),
      route,
    },
  };
}

function irrationalWarning({ blocks, message }: IrrationalFinding): Warning {
  return { code: 'irrational-value', blocks, message };
}
