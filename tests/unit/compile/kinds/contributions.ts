/** The contribution of one block, read with given parameters, in fractions as text. */

import { type Rational, toFraction } from '../../../../src/algebra/index.ts';
import type { SimpleBlock } from '../../../../src/compile/flatten/index.ts';
import { contributionOf } from '../../../../src/compile/kinds/index.ts';
import { numericReader, rationalArithmetic } from '../../../../src/compile/quantities/index.ts';
import { evaluateParameters } from '../../../../src/expression/index.ts';
import { ok, type Result } from '../../../../src/problem/index.ts';
import { valueOf } from '../../results.ts';

/** A, B, C, D and the factors of the input's derivatives as fractions; the states' suffixes and initial values. */
export function contribution(block: SimpleBlock, parameters: Readonly<Record<string, string>> = {}) {
  const scope = valueOf(evaluateParameters(Object.entries(parameters).map(([name, value]) => ({ name, value }))));
  const result = contributionOf(block, numericReader(rationalArithmetic, scope));
  if (!result.ok) return result;
  const { states, A, B, C, D, derivatives, derivativeSuffixes, lowered } = result.value;
  const text = (rows: readonly (readonly Rational[])[]) => rows.map(row => row.map(toFraction));
  return ok({
    states: states.map(({ suffix }) => suffix),
    initial: states.map(({ initial }) => initial),
    A: text(A),
    B: text(B),
    C: text(C),
    D: text(D),
    derivatives: derivatives.map(toFraction),
    derivativeSuffixes,
    lowered,
  }) satisfies Result<unknown>;
}
