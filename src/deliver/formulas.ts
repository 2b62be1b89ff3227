/** The entries in symbols of the parameters, where formulas of a length that somebody can read exist. */

import { toRows } from '../algebra/index.ts';
import {
  createSymbolicField,
  Effort,
  type Formula,
  formulaOf,
  type RationalFunction,
} from '../algebra/symbolic/index.ts';
import { deriveSymbolic, type SignalName } from '../compile/index.ts';
import type { Derived } from './format.ts';
import { type MatrixRows, mapMatrices } from './matrix-rows.ts';

/**
 * The formulas of A, B, C and D, row by row; null where the symbolic derivation was given up for its length, where its states
 * are not those of the numeric one, or where the drawing was too large to be derived exactly.
 */
export function formulaRows({ diagram, derivation }: Derived): MatrixRows<Formula> | null {
  if (derivation.route === 'double') return null;
  const outcome = deriveSymbolic(diagram);
  if (!outcome.ok || !outcome.value.finished) return null;
  const { matrices, states } = outcome.value.value;
  if (namesOf(states) !== namesOf(derivation.model.states)) return null;
  const declared = diagram.parameters.map(({ name }) => name);
  const effort = new Effort();
  const { zero } = createSymbolicField();
  const formulas = (rows: RationalFunction[][]) => rows.map(row => row.map(f => formulaOf(f, { declared, effort })));
  return mapMatrices(matrices, matrix => formulas(toRows(matrix, zero)));
}

function namesOf(signals: readonly SignalName[]): string {
  return JSON.stringify(signals.map(({ name }) => name));
}
