/**
 * A transfer function in symbols: C (s I − A)⁻¹ B + D over the rational functions of the parameters and of s, in lowest terms. Of the
 * states only those on a way from the input to the output take part.
 */

import { entryAt, type SparseMatrix } from '../algebra/index.ts';
import {
  coefficientsIn,
  createSymbolicField,
  type EffortOutcome,
  type RationalFunction,
  type SymbolicField,
  type SymbolicPolynomial,
  solveSymbolic,
  withinEffort,
} from '../algebra/symbolic/index.ts';
import type { SymbolicModel } from '../compile/index.ts';

/** Coefficients in descending powers of s, polynomials in the parameters; the zero function is nothing over one. */
export interface SymbolicTransfer {
  readonly numerator: readonly SymbolicPolynomial[];
  readonly denominator: readonly SymbolicPolynomial[];
}

/** No parameter is called so (format.md, Expressions). */
const S = 's';

/** The transfer function of a channel by positions, or the limit of effort at which it was given up. */
export function symbolicTransfer(
  { matrices: { A, B, C, D } }: SymbolicModel,
  { input, output }: { readonly input: number; readonly output: number },
): EffortOutcome<SymbolicTransfer> {
  const field = createSymbolicField();
  return withinEffort(() => {
    const states = statesBetween(A, B, C, input, output);
    const matrix = states.map(i => states.map(j => resolventEntry(field, entryAt(A, i, j, field.zero), i === j)));
    const sides = states.map(i => [entryAt(B, i, input, field.zero)]);
    // s I − A has the determinant of a characteristic polynomial, which is never zero.
    const values = states.length === 0 ? [] : (solveSymbolic(matrix, sides, field.effort)?.values ?? []);
    const sum = states.reduce(
      (total, j, k) =>
        field.add(total, field.multiply(entryAt(C, output, j, field.zero), values[k]?.[0] ?? field.zero)),
      entryAt(D, output, input, field.zero),
    );
    return { numerator: coefficientsIn(sum.numerator, S), denominator: coefficientsIn(sum.denominator, S) };
  });
}

function resolventEntry(field: SymbolicField, a: RationalFunction, isDiagonal: boolean): RationalFunction {
  return isDiagonal ? field.subtract(field.variable(S), a) : field.negate(a);
}

type Entries = SparseMatrix<RationalFunction>;

/** States that the input reaches and that reach the output, ascending. */
function statesBetween(A: Entries, B: Entries, C: Entries, input: number, output: number): readonly number[] {
  const feeds: number[][] = Array.from({ length: A.rows }, () => []);
  const isFedBy: number[][] = Array.from({ length: A.rows }, () => []);
  const inputFeeds: number[] = [];
  for (let i = 0; i < A.rows; i++) {
    for (const j of columnsOf(A, i)) {
      feeds[j]?.push(i);
      isFedBy[i]?.push(j);
    }
    if (columnsOf(B, i).includes(input)) inputFeeds.push(i);
  }
  const reached = closure(inputFeeds, feeds);
  const reaching = closure(columnsOf(C, output), isFedBy);
  return [...reached].filter(i => reaching.has(i)).sort((a, b) => a - b);
}

function columnsOf({ rowStart, column }: Entries, row: number): readonly number[] {
  const found: number[] = [];
  for (let k = rowStart[row] ?? 0; k < (rowStart[row + 1] ?? 0); k++) found.push(column[k] ?? 0);
  return found;
}

function closure(start: readonly number[], next: readonly (readonly number[])[]): ReadonlySet<number> {
  const found = new Set(start);
  const open = [...start];
  for (let i = open.pop(); i !== undefined; i = open.pop()) {
    for (const j of next[i] ?? []) {
      if (found.has(j)) continue;
      found.add(j);
      open.push(j);
    }
  }
  return found;
}
