/**
 * One algebraic loop solved in symbols: fraction-free elimination as far as pivots are single terms, minors for the core
 * that is left, and a common divisor sought only once, at the end.
 */

import { knownQuotient } from './divide.ts';
import type { Effort } from './effort.ts';
import { choosePivot, type Elimination, eliminateAt, quotientOfProducts, startElimination } from './elimination.ts';
import { commonDivisor, commonDivisorOfAll } from './gcd.ts';
import { type CramerDeterminants, cramerDeterminants } from './minors.ts';
import { multiplyPolynomials } from './multiply.ts';
import { isOnePolynomial, isZeroPolynomial, ONE_POLYNOMIAL, type SymbolicPolynomial } from './polynomial.ts';
import { functionsOver, type RationalFunction } from './rational-function.ts';

/** The solution of a square system and the determinant that its entries have below them before cancelling. */
export interface SymbolicSolution {
  /** n × m, in lowest terms. */
  readonly values: readonly (readonly RationalFunction[])[];
  /**
   * The determinant, up to sign, of the system with each row freed of denominators and of common factors: 1 + K1*K2*K3
   * for a ring of three blocks. Its factors make the denominators of `values`; printing takes it as a known factor.
   */
  readonly determinant: SymbolicPolynomial;
}

/**
 * The most unknowns that are left to minors; their number doubles with each. Of six it is below that of the products of an
 * elimination that divides, beyond it systems of few parameters fare better by Bareiss.
 */
const LARGEST_CORE = 6;

/**
 * Solves matrix · X = rightSides, n × n and n × m, over rational functions.
 *
 * Bareiss (Math. Comp. 22, 1968) while a pivot of one term is left, which needs no division by sums; for the rest
 * Cramer's determinants by minors (Gentleman & Johnson, ACM Trans. Math. Software 2, 1976), or Bareiss on to the end where
 * more than six unknowns are left.
 *
 * @returns null where the determinant is identically zero. Throws `EffortSpent` as all symbolic work does.
 */
export function solveSymbolic(
  matrix: readonly (readonly RationalFunction[])[],
  rightSides: readonly (readonly RationalFunction[])[],
  effort: Effort,
): SymbolicSolution | null {
  const width = rightSides[0]?.length ?? 0;
  const elimination = startElimination(matrix.map((row, i) => clearedRow([...row, ...(rightSides[i] ?? [])], effort)));
  const core = solveCore(elimination, effort);
  if (core === null) return null;
  const numerators = withEliminated(elimination, core, width, effort);
  const functions = functionsOver(core.determinant, numerators.flat(), effort);
  const values = matrix.map((_, j) => functions.slice(j * width, (j + 1) * width));
  return { values, determinant: core.determinant };
}

/** A row of polynomials without a common divisor, proportional to the given one. */
function clearedRow(row: readonly RationalFunction[], effort: Effort): SymbolicPolynomial[] {
  let multiple = ONE_POLYNOMIAL;
  for (const { denominator } of row) {
    if (isOnePolynomial(denominator)) continue;
    const common = commonDivisor(multiple, denominator, effort);
    multiple = multiplyPolynomials(multiple, knownQuotient(denominator, common, effort), effort);
  }
  const cleared = row.map(({ numerator, denominator }) =>
    isZeroPolynomial(numerator)
      ? numerator
      : multiplyPolynomials(numerator, knownQuotient(multiple, denominator, effort), effort),
  );
  const content = commonDivisorOfAll(
    cleared.filter(entry => !isZeroPolynomial(entry)),
    effort,
  );
  return isZeroPolynomial(content) ? cleared : cleared.map(entry => knownQuotient(entry, content, effort));
}

/**
 * Eliminates until a core is left or nothing is; then the determinant of the whole and the numerators of what is left, in
 * the order of the elimination. Null where the determinant vanishes.
 */
function solveCore(elimination: Elimination, effort: Effort): CramerDeterminants | null {
  const n = elimination.order.length;
  while (elimination.step < n) {
    const pivot = choosePivot(elimination);
    if (pivot === null) return null;
    const isCore = pivot.terms > 1 && n - elimination.step <= LARGEST_CORE;
    // A core stands over the last pivot, to be divided out of its determinants: cheap where that is one term.
    if (isCore && elimination.pivot.coefficients.length === 1) return coreByMinors(elimination, effort);
    eliminateAt(elimination, pivot, effort);
  }
  return { determinant: elimination.pivot, numerators: [] };
}

/** What the minors of the rows not yet used say about the whole system (Sylvester's identity, row by row). */
function coreByMinors({ rows, order, bases, step, pivot }: Elimination, effort: Effort): CramerDeterminants | null {
  const left = rows.slice(step);
  const core = cramerDeterminants(
    left.map(row => order.slice(step).map(j => row[j]!)),
    left.map(row => row.slice(order.length)),
    effort,
  );
  if (isZeroPolynomial(core.determinant)) return null;
  const base = bases.slice(step).reduce((product, factor) => multiplyPolynomials(product, factor, effort));
  const ofWhole = (minor: SymbolicPolynomial) =>
    quotientOfProducts([{ left: minor, right: pivot, isNegative: false }], base, effort);
  return { determinant: ofWhole(core.determinant), numerators: core.numerators.map(row => row.map(ofWhole)) };
}

/** The numerators of all unknowns, in their own order: those of the core, and the eliminated ones from the last upwards. */
function withEliminated(
  { rows, order, step }: Elimination,
  core: CramerDeterminants,
  width: number,
  effort: Effort,
): SymbolicPolynomial[][] {
  const n = order.length;
  const numerators = order.map((): SymbolicPolynomial[] => []);
  core.numerators.forEach((row, k) => {
    numerators[order[step + k]!] = [...row];
  });
  for (let k = step - 1; k >= 0; k--) {
    const row = rows[k]!;
    const later = order.slice(k + 1).filter(j => !isZeroPolynomial(row[j]!));
    numerators[order[k]!] = Array.from({ length: width }, (_, m) => {
      const products = [
        { left: core.determinant, right: row[n + m]!, isNegative: false },
        ...later.map(j => ({ left: row[j]!, right: numerators[j]![m]!, isNegative: true })),
      ];
      return quotientOfProducts(products, row[order[k]!]!, effort);
    });
  }
  return numerators;
}
