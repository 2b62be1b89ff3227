/** The system matrix and a transfer function in symbols of the parameters, as text and as MathML. */

import { formulaText } from '../../algebra/symbolic/index.ts';
import { symbolicTransfer } from '../../analysis/index.ts';
import { deriveSymbolic } from '../../compile/index.ts';
import { formulasOf, symbolMathml, type WrittenPolynomial, writtenPolynomial } from '../../deliver/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Channel } from '../protocol.ts';
import type { Subject, Topic } from './topic.ts';

export interface SymbolsQuestion {
  /** Whether derived parameters are written out. */
  readonly expanded: boolean;
  /** The channel whose transfer function is asked for; null for the matrices. */
  readonly channel: Channel | null;
}

/** One entry; `text` reads back as an expression. */
export interface SymbolEntry {
  readonly text: string;
  readonly mathml: string;
}

export interface Symbols {
  /** A and B over C and D, rows as the states then the outputs; null where there are no formulas or a channel is asked for. */
  readonly rows: readonly (readonly SymbolEntry[])[] | null;
  readonly transfer: { readonly numerator: WrittenPolynomial; readonly denominator: WrittenPolynomial } | null;
  /** Why something is not there, or where it fails; empty where there is nothing to say. */
  readonly note: string;
}

export type SymbolsTopic = Topic<SymbolsQuestion, Symbols>;

export function answer({ diagram, derivation }: Subject, { expanded, channel }: SymbolsQuestion): Result<Symbols> {
  if (channel !== null) return ok(transferOf({ diagram, derivation }, expanded, channel));
  const { rows, note } = formulasOf({ diagram, derivation, expanded });
  if (rows === null) return ok({ rows: null, transfer: null, note });
  const write = (matrix: typeof rows.A) =>
    matrix.map(row => row.map(formula => ({ text: formulaText(formula), mathml: symbolMathml(formula) })));
  const [A, B, C, D] = [write(rows.A), write(rows.B), write(rows.C), write(rows.D)];
  const states = A.map((row, i) => [...row, ...(B[i] ?? [])]);
  const outputs = D.map((row, i) => [...(C[i] ?? []), ...row]);
  return ok({ rows: [...states, ...outputs], transfer: null, note });
}

const TOO_LONG = 'The transfer function in symbols is too long to be of use.';

function transferOf({ diagram, derivation }: Subject, expanded: boolean, channel: Channel): Symbols {
  const without = { rows: null, transfer: null, note: TOO_LONG };
  if (derivation.route === 'double') return without;
  const derived = deriveSymbolic(diagram, { expanded });
  if (!derived.ok || !derived.value.finished) return without;
  const found = symbolicTransfer(derived.value.value, channel);
  if (!found.finished) return without;
  const declared = diagram.parameters.map(({ name }) => name);
  const { numerator, denominator } = found.value;
  return {
    rows: null,
    transfer: {
      numerator: writtenPolynomial(numerator, declared),
      denominator: writtenPolynomial(denominator, declared),
    },
    note: '',
  };
}
