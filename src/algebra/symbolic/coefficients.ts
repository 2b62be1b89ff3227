/**
 * A polynomial as a polynomial in one variable, or in some, with polynomials in the others for coefficients, and back.
 * What divisors and remainder sequences work on.
 */

import { alignTo, compareTerms, unionOfVariables } from './alignment.ts';
import { isZeroPolynomial, type SymbolicPolynomial, withoutUnusedVariables, ZERO_POLYNOMIAL } from './polynomial.ts';

/** The nonzero coefficients of the powers of one variable, by exponent, highest exponent first. */
export function spreadIn(p: SymbolicPolynomial, name: string): Map<number, SymbolicPolynomial> {
  const column = p.variables.indexOf(name);
  if (column < 0) return new Map(isZeroPolynomial(p) ? [] : [[0, p]]);
  const n = p.variables.length;
  const positions = new Map<number, number[]>();
  for (let t = 0; t < p.coefficients.length; t++) {
    const exponent = p.exponents[t * n + column]!;
    const list = positions.get(exponent);
    if (list) list.push(t);
    else positions.set(exponent, [t]);
  }
  const others = p.variables.filter((_, v) => v !== column);
  const spread = new Map<number, SymbolicPolynomial>();
  for (const exponent of [...positions.keys()].sort((a, b) => b - a)) {
    spread.set(exponent, selectTerms(p, positions.get(exponent)!, others, [column]));
  }
  return spread;
}

/** The polynomials in the other variables that stand at the powers of `names`, in order of first appearance. */
export function coefficientsOver(p: SymbolicPolynomial, names: ReadonlySet<string>): SymbolicPolynomial[] {
  const n = p.variables.length;
  const columns = p.variables.flatMap((name, v) => (names.has(name) ? [v] : []));
  if (columns.length === 0) return [p];
  const groups = new Map<string, number[]>();
  for (let t = 0; t < p.coefficients.length; t++) {
    const powers = columns.map(column => p.exponents[t * n + column]).join(' ');
    const list = groups.get(powers);
    if (list) list.push(t);
    else groups.set(powers, [t]);
  }
  const others = p.variables.filter(name => !names.has(name));
  return [...groups.values()].map(terms => selectTerms(p, terms, others, columns));
}

/** The chosen terms without the columns left out, ascending; they keep their order since those columns agree in all. */
function selectTerms(
  p: SymbolicPolynomial,
  terms: readonly number[],
  others: readonly string[],
  leftOut: readonly number[],
): SymbolicPolynomial {
  const n = p.variables.length;
  const exponents: number[] = [];
  for (const t of terms) {
    for (let v = 0; v < n; v++) if (!leftOut.includes(v)) exponents.push(p.exponents[t * n + v]!);
  }
  return withoutUnusedVariables(
    others,
    exponents,
    terms.map(t => p.coefficients[t]!),
  );
}

/** Σ coefficient · name^exponent; the coefficients do not hold `name`. */
export function collectIn(parts: ReadonlyMap<number, SymbolicPolynomial>, name: string): SymbolicPolynomial {
  let variables: readonly string[] = [name];
  for (const part of parts.values()) variables = unionOfVariables(variables, part.variables);
  const n = variables.length;
  const column = variables.indexOf(name);
  const rows: { readonly exponents: number[]; readonly coefficient: bigint }[] = [];
  for (const [exponent, part] of parts) {
    const aligned = alignTo(part, variables);
    aligned.coefficients.forEach((coefficient, t) => {
      const exponents = aligned.exponents.slice(t * n, (t + 1) * n);
      exponents[column] = exponent;
      rows.push({ exponents, coefficient });
    });
  }
  if (rows.length === 0) return ZERO_POLYNOMIAL;
  rows.sort((a, b) => compareTerms(b.exponents, 0, a.exponents, 0, n));
  return withoutUnusedVariables(
    variables,
    rows.flatMap(row => row.exponents),
    rows.map(row => row.coefficient),
  );
}

/** The coefficients of the powers of one variable in descending order, none left out; empty for the zero polynomial. */
export function coefficientsIn(p: SymbolicPolynomial, name: string): SymbolicPolynomial[] {
  const spread = spreadIn(p, name);
  const degree = Math.max(-1, ...spread.keys());
  return Array.from({ length: degree + 1 }, (_, k) => spread.get(degree - k) ?? ZERO_POLYNOMIAL);
}
