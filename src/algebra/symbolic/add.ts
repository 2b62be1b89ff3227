/** Sums and differences of polynomials: one merge of two sorted lists of terms. */

import { type AlignedTerms, alignTo, compareTerms, unionOfVariables } from './alignment.ts';
import { isZeroPolynomial, negatePolynomial, type SymbolicPolynomial, withoutUnusedVariables } from './polynomial.ts';

/** a + b. Linear in the terms. */
export function addPolynomials(a: SymbolicPolynomial, b: SymbolicPolynomial): SymbolicPolynomial {
  if (isZeroPolynomial(a)) return b;
  if (isZeroPolynomial(b)) return a;
  return merge(a, b, false);
}

/** a − b. Linear in the terms. */
export function subtractPolynomials(a: SymbolicPolynomial, b: SymbolicPolynomial): SymbolicPolynomial {
  if (isZeroPolynomial(a)) return negatePolynomial(b);
  if (isZeroPolynomial(b)) return a;
  return merge(a, b, true);
}

function merge(a: SymbolicPolynomial, b: SymbolicPolynomial, subtracts: boolean): SymbolicPolynomial {
  const variables = unionOfVariables(a.variables, b.variables);
  const n = variables.length;
  const left = alignTo(a, variables);
  const right = alignTo(b, variables);
  const exponents: number[] = [];
  const coefficients: bigint[] = [];
  const keep = (terms: AlignedTerms, t: number, coefficient: bigint) => {
    for (let k = t * n; k < (t + 1) * n; k++) exponents.push(terms.exponents[k]!);
    coefficients.push(coefficient);
  };
  let i = 0;
  let j = 0;
  while (i < left.coefficients.length || j < right.coefficients.length) {
    const order = orderAt(left, i, right, j, n);
    if (order > 0) {
      keep(left, i, left.coefficients[i]!);
    } else {
      const coefficient = subtracts ? -right.coefficients[j]! : right.coefficients[j]!;
      const sum = order === 0 ? left.coefficients[i]! + coefficient : coefficient;
      if (sum !== 0n) keep(right, j, sum);
    }
    if (order >= 0) i++;
    if (order <= 0) j++;
  }
  return withoutUnusedVariables(variables, exponents, coefficients);
}

/** As `compareTerms`, where a list that has run out comes last. */
function orderAt(left: AlignedTerms, i: number, right: AlignedTerms, j: number, n: number): number {
  if (i >= left.coefficients.length) return -1;
  if (j >= right.coefficients.length) return 1;
  return compareTerms(left.exponents, i, right.exponents, j, n);
}
