/** Values of rational functions over any field: numbers, or other rational functions put in for parameters. */

import type { Field } from '../field.ts';
import type { SymbolicPolynomial } from './polynomial.ts';
import type { RationalFunction } from './rational-function.ts';
import type { SymbolicField } from './symbolic-field.ts';

/**
 * The value of f where each of its variables is given one.
 *
 * @returns null where the denominator vanishes. Over the symbolic field this is substitution; there it may throw
 * `EffortSpent`.
 */
export function evaluateAt<T>(f: RationalFunction, field: Field<T>, lookup: (name: string) => T): T | null {
  const denominator = evaluatePolynomialOver(f.denominator, field, lookup);
  if (field.isZero(denominator)) return null;
  return field.divide(evaluatePolynomialOver(f.numerator, field, lookup), denominator);
}

/** f with rational functions in place of some variables, the others left as they are; null where the denominator vanishes. */
export function substitute(
  f: RationalFunction,
  replacements: ReadonlyMap<string, RationalFunction>,
  field: SymbolicField,
): RationalFunction | null {
  return evaluateAt(f, field, name => replacements.get(name) ?? field.variable(name));
}

/** The value of a polynomial, its terms summed in their order; every power is computed once. */
function evaluatePolynomialOver<T>(p: SymbolicPolynomial, field: Field<T>, lookup: (name: string) => T): T {
  const n = p.variables.length;
  const values = p.variables.map(lookup);
  const powers = values.map(() => new Map<number, T>());
  let sum = field.zero;
  p.coefficients.forEach((coefficient, t) => {
    let term = field.fromRational({ n: coefficient, d: 1n });
    for (let v = 0; v < n; v++) {
      const exponent = p.exponents[t * n + v]!;
      if (exponent === 0) continue;
      const known = powers[v]!.get(exponent);
      const factor = known ?? powerOver(values[v]!, exponent, field);
      if (known === undefined) powers[v]!.set(exponent, factor);
      term = field.multiply(term, factor);
    }
    sum = field.add(sum, term);
  });
  return sum;
}

/** value to a positive whole power, by repeated squaring. */
function powerOver<T>(value: T, exponent: number, field: Field<T>): T {
  let result: T | null = null;
  let square = value;
  for (let rest = exponent; rest > 0; rest = Math.floor(rest / 2)) {
    if (rest % 2 === 1) result = result === null ? square : field.multiply(result, square);
    if (rest > 1) square = field.multiply(square, square);
  }
  return result ?? field.one;
}
