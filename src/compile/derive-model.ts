/**
 * Diagram to matrices, pass by pass: flatten, equations, loops, eliminate. Pure. What compile does before it checks, for who
 * waits for the matrices and can wait for the check.
 */

import type { Rational } from '../algebra/index.ts';
import { Effort, withinEffort } from '../algebra/symbolic/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { evaluateParameters, type Scope } from '../expression/index.ts';
import type { Result, Warning } from '../problem/index.ts';
import { type DerivationMemory, type DerivedModel, derive, emptyMemory } from './derive.ts';
import { type FlatDrawing, flatten, openPortWarnings } from './flatten/index.ts';
import { numericMatrices, overflowProblems } from './numeric-matrices.ts';
import {
  type Account,
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

/** What a derivation leaves for the next one of nearly the same drawing; whoever derives again and again keeps one. */
export interface ModelMemory {
  /** The last drawing opened, and what it came to. */
  drawing: { readonly blocks: Diagram['blocks']; readonly wires: Diagram['wires']; readonly flat: FlatDrawing } | null;
  readonly account: Account;
  readonly metered: NumericArithmetic<Rational>;
  readonly exact: DerivationMemory<Rational>;
  readonly doubles: DerivationMemory<number>;
}

/** A memory without anything in it: the first derivation with it is one like any other. */
export function newModelMemory(): ModelMemory {
  const account = { effort: new Effort({ maximumOperations: EXACT_EFFORT }) };
  const metered = meteredRationals(account);
  return { drawing: null, account, metered, exact: emptyMemory(), doubles: emptyMemory() };
}

export interface DeriveOptions extends CompileOptions {
  /** From the derivations before: what a change does not reach is not derived again. The result is the same without. */
  readonly memory?: ModelMemory;
}

/**
 * The state-space model of a diagram that `readDiagram` or an edit made, or every problem of the first stage that has one:
 * parameters, fields of blocks, names, algebraic loops, derivatives of inputs. An empty sheet gives empty matrices.
 */
export function deriveModel(
  diagram: Diagram,
  { field = 'auto', memory = newModelMemory() }: DeriveOptions = {},
): Result<UncheckedDerivation> {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters;
  const task: Task = { diagram, drawing: flattened(diagram, memory), scope: parameters.value, memory };
  switch (field) {
    case 'rational':
      return deriveRationals(task, rationalArithmetic, emptyMemory());
    case 'double':
      return deriveDoubles(task);
    case 'auto': {
      memory.account.effort = new Effort({ maximumOperations: EXACT_EFFORT });
      const exact = withinEffort(() => deriveRationals(task, memory.metered, memory.exact));
      return exact.finished ? exact.value : deriveDoubles(task);
    }
    default:
      return field satisfies never;
  }
}

function flattened(diagram: Diagram, memory: ModelMemory): FlatDrawing {
  const { blocks, wires } = diagram;
  const { drawing } = memory;
  const flat = drawing?.blocks === blocks && drawing.wires === wires ? drawing.flat : flatten(diagram);
  memory.drawing = { blocks, wires, flat };
  return flat;
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
  readonly memory: ModelMemory;
}

function deriveRationals(
  task: Task,
  arithmetic: NumericArithmetic<Rational>,
  memory: DerivationMemory<Rational>,
): Result<UncheckedDerivation> {
  const derived = derive(task.drawing, numericReader(arithmetic, task.scope), memory);
  if (!derived.ok) return derived;
  return finish(task, derived.value, derived.value.matrices, arithmetic, 'rational');
}

function deriveDoubles(task: Task): Result<UncheckedDerivation> {
  const derived = derive(task.drawing, numericReader(doubleArithmetic, task.scope), task.memory.doubles);
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
