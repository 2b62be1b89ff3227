/**
 * Brings polynomials to common variables before they are added, multiplied or divided. Each polynomial lists only the
 * variables that occur in it, which keeps terms short in a drawing of many parameters.
 */

import { degreesOf, type SymbolicPolynomial } from './polynomial.ts';

/** Terms over variables that are listed elsewhere; some of them may not occur. */
export interface AlignedTerms {
  readonly exponents: readonly number[];
  readonly coefficients: readonly bigint[];
}

/** Two ascending lists of names merged into one. */
export function unionOfVariables(a: readonly string[], b: readonly string[]): readonly string[] {
  if (a === b || b.length === 0) return a;
  if (a.length === 0) return b;
  const union: string[] = [];
  let i = 0;
  let j = 0;
  while (i < a.length || j < b.length) {
    const left = a[i];
    const right = b[j];
    if (left === right) {
      union.push(left!);
      i++;
      j++;
    } else if (right === undefined || (left !== undefined && left < right)) {
      union.push(left!);
      i++;
    } else {
      union.push(right);
      j++;
    }
  }
  // The longer list is the union itself where it holds the other: then nothing needs to be moved.
  if (union.length === a.length) return a;
  return union.length === b.length ? b : union;
}

/** The terms of p over `variables`, an ascending list that holds those of p; the order of terms stays. */
export function alignTo(p: SymbolicPolynomial, variables: readonly string[]): AlignedTerms {
  const from = p.variables.length;
  const to = variables.length;
  if (from === to) return p;
  const columns = new Array<number>(from);
  for (let v = 0, column = 0; v < from; v++, column++) {
    while (variables[column] !== p.variables[v]) column++;
    columns[v] = column;
  }
  const terms = p.coefficients.length;
  const exponents = new Array<number>(terms * to).fill(0);
  for (let t = 0; t < terms; t++) {
    for (let v = 0; v < from; v++) exponents[t * to + columns[v]!] = p.exponents[t * from + v]!;
  }
  return { exponents, coefficients: p.coefficients };
}

/** Positive where term i of a comes before term j of b, both over n variables; zero for like terms. */
export function compareTerms(a: readonly number[], i: number, b: readonly number[], j: number, n: number): number {
  for (let v = 0, k = i * n, l = j * n; v < n; v++, k++, l++) {
    const difference = a[k]! - b[l]!;
    if (difference !== 0) return difference;
  }
  return 0;
}

/** Highest exponents in p of `variables`, an ascending list that holds those of p; zero for those that do not occur. */
export function degreesOver(p: SymbolicPolynomial, variables: readonly string[]): number[] {
  const own = degreesOf(p);
  if (own.length === variables.length) return own;
  const degrees = new Array<number>(variables.length).fill(0);
  for (let v = 0, column = 0; v < own.length; v++, column++) {
    while (variables[column] !== p.variables[v]) column++;
    degrees[column] = own[v]!;
  }
  return degrees;
}
