/** The order in which sums and products are written down. */

import type { WrittenPower, WrittenSum, WrittenTerm } from './formula.ts';
import { type SymbolicPolynomial, totalDegree } from './polynomial.ts';

/** Compares two names by their order on paper. */
export type NameOrder = (a: string, b: string) => number;

/**
 * Parameters as they are declared; before them, as constants stand, what is not declared (`pi`, `sqrt(2)`), by code unit.
 */
export function declaredOrder(declared: readonly string[]): NameOrder {
  const rank = new Map(declared.map((name, position) => [name, position]));
  return (a, b) => {
    const difference = (rank.get(a) ?? -1) - (rank.get(b) ?? -1);
    return difference !== 0 ? difference : a < b ? -1 : a > b ? 1 : 0;
  };
}

/** Powers in the order of their names. */
export function orderedPowers(powers: readonly WrittenPower[], order: NameOrder): WrittenPower[] {
  return [...powers].sort((a, b) => order(a.name, b.name));
}

/**
 * The terms of p as they are written: by total degree, lowest first, so that a constant leads (`1 + K1*K2`); among equals
 * those with more of the first parameter first. Where the first would be negative, the first positive term moves to the
 * front (`K - 1`), if there is one.
 */
export function writtenTerms(p: SymbolicPolynomial, order: NameOrder): WrittenSum {
  const n = p.variables.length;
  const columns = p.variables.map((_, v) => v).sort((u, v) => order(p.variables[u]!, p.variables[v]!));
  const terms = p.coefficients.map((coefficient, t) => ({ t, coefficient, degree: totalDegree(p, t) }));
  terms.sort((a, b) => {
    if (a.degree !== b.degree) return a.degree - b.degree;
    for (const v of columns) {
      const difference = p.exponents[b.t * n + v]! - p.exponents[a.t * n + v]!;
      if (difference !== 0) return difference;
    }
    return 0;
  });
  const written = terms.map(({ t, coefficient }): WrittenTerm => {
    const powers = columns.flatMap(v => {
      const exponent = p.exponents[t * n + v]!;
      return exponent === 0 ? [] : [{ name: p.variables[v]!, exponent }];
    });
    const integer = coefficient < 0n ? -coefficient : coefficient;
    return { sign: coefficient < 0n ? -1 : 1, number: { integer, decimals: 0 }, powers };
  });
  return withPositiveFront(written);
}

/** The first positive term moved to the front. */
function withPositiveFront(terms: WrittenSum): WrittenSum {
  const at = terms.findIndex(({ sign }) => sign > 0);
  return at <= 0 ? terms : [terms[at]!, ...terms.slice(0, at), ...terms.slice(at + 1)];
}

/** −(the sum), its front made positive again. */
export function negatedTerms(terms: WrittenSum): WrittenSum {
  return withPositiveFront(terms.map(term => ({ ...term, sign: term.sign > 0 ? -1 : 1 })));
}
