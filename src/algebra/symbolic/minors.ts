/**
 * Determinants of a few columns by minors: each minor of the first k columns is kept under the set of its rows and used for
 * all that grow from it. Nothing is divided, so no sum is longer than it ends; for polynomial entries and few columns that
 * costs less than any elimination (Gentleman & Johnson, ACM Trans. Math. Software 2, 1976).
 */

import type { Effort } from './effort.ts';
import { type SignedProduct, sumOfProducts } from './multiply.ts';
import { isZeroPolynomial, ONE_POLYNOMIAL, type SymbolicPolynomial, ZERO_POLYNOMIAL } from './polynomial.ts';

/** Nonzero minors of some columns, by the set of their rows as bits. */
type Minors = ReadonlyMap<number, SymbolicPolynomial>;

/** The determinant of a square core and, for each right side and unknown, the one with that column replaced. */
export interface CramerDeterminants {
  readonly determinant: SymbolicPolynomial;
  /** By unknown, then by right side. */
  readonly numerators: readonly (readonly SymbolicPolynomial[])[];
}

/**
 * Cramer's determinants of c equations in c unknowns.
 *
 * @param core        c × c, c at most 30.
 * @param rightSides  c × m.
 * About c · m · 2ᶜ products of an entry with a minor.
 */
export function cramerDeterminants(
  core: readonly (readonly SymbolicPolynomial[])[],
  rightSides: readonly (readonly SymbolicPolynomial[])[],
  effort: Effort,
): CramerDeterminants {
  const columns = core.map((_, j) => core.map(row => row[j]!));
  const sides = (rightSides[0] ?? []).map((_, m) => rightSides.map(row => row[m]!));
  const numerators: SymbolicPolynomial[][] = [];
  let minors: Minors = new Map([[0, ONE_POLYNOMIAL]]);
  for (let j = 0; j < columns.length; j++) {
    const rest = columns.slice(j + 1);
    numerators.push(
      sides
        .map(side => [side, ...rest].reduce((grown, column) => extended(grown, column, effort), minors))
        .map(onlyMinor),
    );
    minors = extended(minors, columns[j]!, effort);
  }
  return { determinant: onlyMinor(minors), numerators };
}

/** The minors of one column more, by Laplace's expansion along it. */
function extended(minors: Minors, column: readonly SymbolicPolynomial[], effort: Effort): Minors {
  const products = new Map<number, SignedProduct[]>();
  for (const [rows, minor] of minors) {
    for (let r = 0; r < column.length; r++) {
      if ((rows >> r) & 1 || isZeroPolynomial(column[r]!)) continue;
      const isNegative = bitsAbove(rows, r) % 2 === 1;
      const product = { left: column[r]!, right: minor, isNegative };
      const list = products.get(rows | (1 << r));
      if (list) list.push(product);
      else products.set(rows | (1 << r), [product]);
    }
  }
  const grown = new Map<number, SymbolicPolynomial>();
  for (const [rows, list] of products) {
    const minor = sumOfProducts(list, effort);
    if (!isZeroPolynomial(minor)) grown.set(rows, minor);
  }
  return grown;
}

/** How many of a set of rows come after row r: the exchanges that bring it to its place. */
function bitsAbove(rows: number, r: number): number {
  let count = 0;
  for (let rest = rows >> (r + 1); rest > 0; rest >>= 1) count += rest & 1;
  return count;
}

function onlyMinor(minors: Minors): SymbolicPolynomial {
  const [minor] = minors.values();
  return minor ?? ZERO_POLYNOMIAL;
}
