/** Derivations written out by hand, so that the formats are tested without the derivation itself. */

import { fromRows, parseRational, type Rational, toDouble, ZERO } from '../../../src/algebra/index.ts';
import type { Derivation, SystemMatrices } from '../../../src/compile/index.ts';
import motor from '../../reference/cases/dc-motor-symbolic.json';

type Fractions = readonly (readonly string[])[];

export interface HandModel {
  readonly title?: string;
  readonly states: readonly string[];
  readonly inputs: readonly string[];
  readonly outputs: readonly string[];
  readonly A: Fractions;
  readonly B: Fractions;
  readonly C: Fractions;
  readonly D: Fractions;
  readonly initialState?: readonly number[];
  readonly irrational?: readonly string[];
}

/** The derivation with that model, no loops, no warnings and a check that passed. */
export function derivationOf(model: HandModel): Derivation {
  const named = (names: readonly string[]) => names.map(name => ({ name, block: name }));
  const { states, inputs, outputs } = model;
  const exact: SystemMatrices<Rational> = {
    A: sparse(model.A, states.length),
    B: sparse(model.B, inputs.length),
    C: sparse(model.C, states.length),
    D: sparse(model.D, inputs.length),
  };
  const numeric = (rows: Fractions, columns: number) =>
    fromRows(
      rows.map(row => row.map(text => toDouble(rationalOf(text)))),
      columns,
      value => value === 0,
    );
  return {
    model: {
      title: model.title ?? 'Hand model',
      states: named(states),
      inputs: named(inputs),
      outputs: named(outputs),
      numeric: {
        A: numeric(model.A, states.length),
        B: numeric(model.B, inputs.length),
        C: numeric(model.C, states.length),
        D: numeric(model.D, inputs.length),
      },
      rational: exact,
      irrational: model.irrational ?? [],
      initialState: model.initialState ?? states.map(() => 0),
      shiftedStates: [],
    },
    loops: [],
    warnings: [],
    selfCheck: { error: 0, limit: 1e-12, passed: true, frequencies: 3, vectors: 1 },
    route: 'rational',
  };
}

function rationalOf(text: string): Rational {
  const value = parseRational(text);
  if (value === null) throw new Error(`${text} is no fraction`);
  return value;
}

function sparse(rows: Fractions, columns: number) {
  return fromRows(
    rows.map(row => row.map(rationalOf)),
    columns,
    value => value.n === ZERO.n,
  );
}

/** The permanent-magnet motor of the reference cases: matrices worked out there by exact arithmetic, outside the program. */
export const MOTOR: HandModel = {
  title: motor.diagram.title,
  states: motor.expect.states,
  inputs: motor.expect.inputs,
  outputs: motor.expect.outputs,
  ...motor.expect.exact,
  initialState: [0, 12.5, 0],
};

/** The same matrices as numbers, from the same case. */
export const MOTOR_NUMBERS = { A: motor.expect.A, B: motor.expect.B, C: motor.expect.C, D: motor.expect.D };

/** A drawing without a block. */
export const EMPTY: HandModel = { title: '', states: [], inputs: [], outputs: [], A: [], B: [], C: [], D: [] };

/** One input straight to one output, five sixteenths; no state. */
export const STATIC: HandModel = {
  states: [],
  inputs: ['u'],
  outputs: ['y'],
  A: [],
  B: [],
  C: [[]],
  D: [['5/16']],
};
