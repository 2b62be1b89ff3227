/**
 * The model file (`*.model.json`, version 1): what a derivation and its analyses say, as plain data in the order of the
 * format's description. Exact results are rounded here, once. Keys are never renamed: scripts outside the project read them.
 */

import { type Rational, toFraction } from '../algebra/index.ts';
import { formulaText } from '../algebra/symbolic/index.ts';
import {
  allTransferFunctions,
  hiddenModeWarnings,
  isControllable,
  isObservable,
  poles,
  type Root,
  type Stability,
  stability,
  type TransferFunction,
  zeros,
} from '../analysis/index.ts';
import type { Derivation, SelfCheck, SignalName, StateSpace } from '../compile/index.ts';
import type { Warning } from '../problem/index.ts';
import { exactRows, numericRows } from './entries.ts';
import type { Derived } from './format.ts';
import { type Formulas, formulasOf } from './formulas.ts';
import { layOutJson } from './json-layout.ts';
import { type MatrixRows, mapMatrices } from './matrix-rows.ts';

export interface ModelFile {
  readonly format: 'poleward-model';
  readonly version: 1;
  readonly title: string;
  readonly time: 'continuous';
  readonly states: readonly string[];
  readonly inputs: readonly string[];
  readonly outputs: readonly string[];
  /** Nearest doubles: A n × n, B n × m, C p × n, D p × m, row by row. */
  readonly A: readonly (readonly number[])[];
  readonly B: readonly (readonly number[])[];
  readonly C: readonly (readonly number[])[];
  readonly D: readonly (readonly number[])[];
  readonly initialState: readonly number[];
  /** Reduced fractions; null where some quantity is irrational or the model was derived in doubles. */
  readonly exact: MatrixRows<string> | null;
  /** In the parameters, as expressions; null where the formulas are too long to be of use. */
  readonly symbolic: MatrixRows<string> | null;
  /** Null where their iteration did not converge. */
  readonly poles: readonly Root[] | null;
  /** Null where the model has too many states for them to be computed. */
  readonly zeros: readonly Root[] | null;
  /** Output by output, its inputs in order; null where the model has too many states. */
  readonly transferFunctions: readonly TransferFunctionEntry[] | null;
  readonly stability: Stability['verdict'];
  /** Null where the model has too many states for a decision. */
  readonly controllable: boolean | null;
  readonly observable: boolean | null;
  readonly shiftedStates: readonly string[];
  /** Of a minimal model: the states of the drawing's, and the rows of the change of state z = `change` · x as fractions. */
  readonly minimal?: { readonly of: readonly string[]; readonly change: readonly (readonly string[])[] };
  readonly warnings: readonly Warning[];
  readonly selfCheck: SelfCheck;
}

/** Coefficients in descending powers of s, the denominator monic, common factors cancelled. */
export interface TransferFunctionEntry {
  readonly input: string;
  readonly output: string;
  readonly numerator: readonly number[];
  readonly denominator: readonly number[];
}

/** A file may take longer than an answer while drawing: exact answers up to 128 states. */
const EFFORT = 'high';

/** Everything worth knowing about the model: what the derivation met, then the poles that no transfer function shows. */
export function modelWarnings({ model, warnings }: Derivation): readonly Warning[] {
  return [...warnings, ...hiddenModeWarnings(model, EFFORT)];
}

/** The content of the model file. */
export function modelFile(derived: Derived): ModelFile {
  const { derivation } = derived;
  const { model, selfCheck } = derivation;
  const { title, states, inputs, outputs, initialState, shiftedStates } = model;
  const poleSet = poles(model, EFFORT);
  const zeroSet = zeros(model, EFFORT);
  const formulas = formulasOf(derived);
  return {
    format: 'poleward-model',
    version: 1,
    title,
    time: 'continuous',
    states: states.map(nameOf),
    inputs: inputs.map(nameOf),
    outputs: outputs.map(nameOf),
    ...numericRows(model),
    initialState,
    exact: exactFractions(model),
    symbolic: symbolicTexts(formulas),
    poles: poleSet.route === 'not-converged' ? null : poleSet.poles,
    zeros: zeroSet.route === 'certified' ? zeroSet.zeros : null,
    transferFunctions: transferFunctionEntries(allTransferFunctions(model, EFFORT)),
    stability: stability(model, EFFORT).verdict,
    controllable: isControllable(model, EFFORT).holds,
    observable: isObservable(model, EFFORT).holds,
    shiftedStates,
    ...minimalPart(derived),
    warnings: [...modelWarnings(derivation), ...undefinedExpressions(formulas)],
    selfCheck,
  };
}

/** The model file as text. */
export function writeModelFile(derived: Derived): string {
  return layOutJson(modelFile(derived));
}

const nameOf = ({ name }: SignalName) => name;

function minimalPart({ minimal }: Derived): Pick<ModelFile, 'minimal'> {
  if (minimal === undefined) return {};
  return { minimal: { of: minimal.of, change: minimal.change.map(row => row.map(toFraction)) } };
}

function exactFractions(model: StateSpace): MatrixRows<string> | null {
  const exact = exactRows(model);
  const fractions = (rows: readonly (readonly Rational[])[]) => rows.map(row => row.map(toFraction));
  return exact === null ? null : mapMatrices(exact, fractions);
}

function symbolicTexts({ rows }: Formulas): MatrixRows<string> | null {
  return rows === null ? null : mapMatrices(rows, matrix => matrix.map(row => row.map(formulaText)));
}

/** Said where the general expressions have no value at the values of the parameters. */
function undefinedExpressions({ vanishing, note }: Formulas): readonly Warning[] {
  return vanishing.length === 0 ? [] : [{ code: 'expression-undefined', blocks: [], message: note }];
}

function transferFunctionEntries(all: readonly TransferFunction[]): TransferFunctionEntry[] | null {
  const entries: TransferFunctionEntry[] = [];
  for (const each of all) {
    if (each.route === 'not-computed') return null;
    const { input, output, numerator, denominator } = each;
    entries.push({ input, output, numerator, denominator });
  }
  return entries;
}
