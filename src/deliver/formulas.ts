/** The entries in symbols of the parameters, where formulas of a length that somebody can read exist. */

import { toRows } from '../algebra/index.ts';
import {
  createSymbolicField,
  Effort,
  type Formula,
  formulaOf,
  type RationalFunction,
} from '../algebra/symbolic/index.ts';
import { deriveSymbolic, type SignalName, type SymbolicModel, type UncheckedDerivation } from '../compile/index.ts';
import type { Derived } from './format.ts';
import { type MatrixRows, mapMatrices } from './matrix-rows.ts';

/** The formulas of A, B, C and D, row by row, or why there are none. */
export interface Formulas {
  readonly rows: MatrixRows<Formula> | null;
  /** Why there are no rows, or where what they say fails: whole sentences, empty where there is nothing to say. */
  readonly note: string;
  /** Factors that general expressions divide by and that are zero at the values of the parameters. */
  readonly vanishing: readonly string[];
}

/** What formulas are made from; they do not wait for the check. */
interface Formulated extends Omit<Derived, 'derivation'> {
  readonly derivation: UncheckedDerivation;
}

/**
 * The formulas of the drawing; none where the symbolic derivation was given up for its length, where its states are not those of
 * the numeric one, or where the drawing was too large to be derived exactly.
 */
export function formulasOf({ diagram, derivation, expanded = false, minimal }: Formulated): Formulas {
  if (minimal !== undefined && minimal.change.length < minimal.of.length)
    return without('A minimal model is in numbers.');
  if (derivation.route === 'double') return without('The drawing is too large for formulas.');
  const outcome = deriveSymbolic(diagram, { expanded });
  if (!outcome.ok || !outcome.value.finished) return without('The formulas are too long to be of use.');
  const symbolic = outcome.value.value;
  const { matrices, states, vanishing } = symbolic;
  const note = vanishingNote(symbolic, derivation.model.states);
  if (namesOf(states) !== namesOf(derivation.model.states)) return { rows: null, note, vanishing };
  const declared = diagram.parameters.map(({ name }) => name);
  const effort = new Effort();
  const { zero } = createSymbolicField();
  const formulas = (rows: RationalFunction[][]) => rows.map(row => row.map(f => formulaOf(f, { declared, effort })));
  return { rows: mapMatrices(matrices, matrix => formulas(toRows(matrix, zero))), note, vanishing };
}

function without(note: string): Formulas {
  return { rows: null, note, vanishing: [] };
}

/** What the difference is between the general model and the one at the present values, which is never made by substitution. */
function vanishingNote({ states, vanishing }: SymbolicModel, present: readonly SignalName[]): string {
  const isSame = namesOf(states) === namesOf(present);
  if (vanishing.length === 0)
    return isSame ? '' : 'The general model has other states than the one at the present values.';
  const factors = vanishing.join(' and ');
  const are = vanishing.length === 1 ? 'is' : 'are';
  const change = isSame ? '' : ` In general the states are ${listOf(states)}; here they are ${listOf(present)}.`;
  return `The general expressions divide by ${factors}, which ${are} zero at the present values, so the numbers were derived on their own.${change}`;
}

function listOf(states: readonly SignalName[]): string {
  return states.length === 0 ? 'none' : states.map(({ name }) => name).join(', ');
}

function namesOf(signals: readonly SignalName[]): string {
  return JSON.stringify(signals.map(({ name }) => name));
}
