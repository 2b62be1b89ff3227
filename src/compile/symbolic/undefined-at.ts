/** Where general expressions have no value: the factors of their denominators that are zero at the values that the parameters have. */

import { type Rational, rationalField, type SparseMatrix } from '../../algebra/index.ts';
import {
  denominatorFactors,
  evaluateAt,
  formulaOf,
  formulaText,
  type RationalFunction,
} from '../../algebra/symbolic/index.ts';
import { evaluateQuantity, type Scope } from '../../expression/index.ts';
import type { SystemMatrices } from '../state-space.ts';

/** Each factor as text, `L` or `1 - K_1*K_2`, once, in the order in which the entries have them; none where every entry has a value. */
export function vanishingFactors(matrices: SystemMatrices<RationalFunction>, scope: Scope): readonly string[] {
  const found = new Set<string>();
  const seen = new Set<RationalFunction['denominator']>();
  for (const { values } of [
    matrices.A,
    matrices.B,
    matrices.C,
    matrices.D,
  ] as readonly SparseMatrix<RationalFunction>[]) {
    for (const entry of Array.from(values)) {
      if (seen.has(entry.denominator)) continue;
      seen.add(entry.denominator);
      for (const factor of denominatorFactors(entry)) {
        if (isZeroAt(factor, scope)) found.add(formulaText(formulaOf(factor)));
      }
    }
  }
  return [...found];
}

/** Decided exactly; a factor with an irrational part is not zero for all that is known. */
function isZeroAt(factor: RationalFunction, scope: Scope): boolean {
  let isExact = true;
  const valueOf = (name: string): Rational => {
    const value = evaluateQuantity(name, scope);
    const exact = value.ok ? value.value.exact : null;
    if (exact === null) isExact = false;
    return exact ?? rationalField.zero;
  };
  const value = evaluateAt(factor, rationalField, valueOf);
  return isExact && value !== null && rationalField.isZero(value);
}
