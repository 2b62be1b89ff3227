/**
 * Fraction-free elimination on polynomials (Bareiss, Math. Comp. 22, 1968), step by step. Every entry is a minor of the
 * system, which keeps terms as few as the answer needs. The solver decides how far it goes.
 */

import { knownQuotientOfSum } from './divide.ts';
import type { Effort } from './effort.ts';
import type { SignedProduct } from './multiply.ts';
import { isZeroPolynomial, ONE_POLYNOMIAL, type SymbolicPolynomial, ZERO_POLYNOMIAL } from './polynomial.ts';

/** A system on its way to triangular form; the lists are exchanged and refilled in place. */
export interface Elimination {
  /** The equations, right sides at their ends. */
  readonly rows: SymbolicPolynomial[][];
  /** The unknown of each step; those not yet eliminated at the end. */
  readonly order: number[];
  /** The pivot that each row's entries stand over: what the next change of the row is divided by. */
  readonly bases: SymbolicPolynomial[];
  /** Steps done. */
  step: number;
  /** The last pivot, one before the first step; ± the determinant after the last. */
  pivot: SymbolicPolynomial;
}

/** An elimination before its first step; one row of coefficients and right sides for each unknown. */
export function startElimination(rows: readonly SymbolicPolynomial[][]): Elimination {
  return {
    rows: [...rows],
    order: rows.map((_, j) => j),
    bases: rows.map(() => ONE_POLYNOMIAL),
    step: 0,
    pivot: ONE_POLYNOMIAL,
  };
}

/** Row and position in `order` of a pivot, and how many terms it has. */
export interface PivotPlace {
  readonly row: number;
  readonly position: number;
  readonly terms: number;
}

/**
 * The pivot for the next step: of the entries left the one of fewest terms, then of fewest other entries in its row and
 * column (Markowitz 1957), then the first; null where all that is left is zero.
 */
export function choosePivot({ rows, order, step }: Elimination): PivotPlace | null {
  const n = order.length;
  const inRow = new Array<number>(n).fill(0);
  const inColumn = new Array<number>(n).fill(0);
  for (let i = step; i < n; i++) {
    for (let j = step; j < n; j++) {
      if (isZeroPolynomial(rows[i]![order[j]!]!)) continue;
      inRow[i] = inRow[i]! + 1;
      inColumn[j] = inColumn[j]! + 1;
    }
  }
  let best: PivotPlace | null = null;
  let fewestOthers = Number.POSITIVE_INFINITY;
  for (let i = step; i < n; i++) {
    for (let j = step; j < n; j++) {
      const terms = rows[i]![order[j]!]!.coefficients.length;
      const others = (inRow[i]! - 1) * (inColumn[j]! - 1);
      if (terms === 0) continue;
      if (best !== null && (terms > best.terms || (terms === best.terms && others >= fewestOthers))) continue;
      best = { row: i, position: j, terms };
      fewestOthers = others;
    }
  }
  return best;
}

/**
 * Eliminates one unknown from the rows not yet used.
 *
 * Departs from Bareiss: a row without an entry in the pivot's column is left as it is, and remembers the pivot that its
 * entries stand over; the next step that changes it divides by that one. The skipped factors telescope.
 */
export function eliminateAt(elimination: Elimination, place: PivotPlace, effort: Effort): void {
  const { rows, order, bases, step } = elimination;
  exchange(rows, step, place.row);
  exchange(bases, step, place.row);
  exchange(order, step, place.position);
  const pivotRow = broughtUp(rows[step]!, bases[step]!, elimination.pivot, effort);
  const column = order[step]!;
  const pivot = pivotRow[column]!;
  for (let i = step + 1; i < rows.length; i++) {
    if (isZeroPolynomial(rows[i]![column]!)) continue;
    rows[i] = reducedRow(rows[i]!, pivotRow, column, bases[i]!, effort);
    bases[i] = pivot;
  }
  elimination.pivot = pivot;
  elimination.step = step + 1;
}

/** (Σ ± left · right) / divisor, products with zero left out; the quotient is known to be exact. */
export function quotientOfProducts(
  products: readonly SignedProduct[],
  divisor: SymbolicPolynomial,
  effort: Effort,
): SymbolicPolynomial {
  const nonzero = products.filter(({ left, right }) => !isZeroPolynomial(left) && !isZeroPolynomial(right));
  return nonzero.length === 0 ? ZERO_POLYNOMIAL : knownQuotientOfSum(nonzero, divisor, effort);
}

/** A row that stands over `base`, brought to stand over `pivot`. */
function broughtUp(
  row: readonly SymbolicPolynomial[],
  base: SymbolicPolynomial,
  pivot: SymbolicPolynomial,
  effort: Effort,
): readonly SymbolicPolynomial[] {
  if (base === pivot) return row;
  return row.map(entry => quotientOfProducts([{ left: entry, right: pivot, isNegative: false }], base, effort));
}

/** One step of Bareiss for a row that stands over `base`. */
function reducedRow(
  row: readonly SymbolicPolynomial[],
  pivotRow: readonly SymbolicPolynomial[],
  column: number,
  base: SymbolicPolynomial,
  effort: Effort,
): SymbolicPolynomial[] {
  const pivot = pivotRow[column]!;
  const factor = row[column]!;
  return row.map((entry, j) => {
    const products = [
      { left: pivot, right: entry, isNegative: false },
      { left: factor, right: pivotRow[j]!, isNegative: true },
    ];
    return quotientOfProducts(products, base, effort);
  });
}

function exchange<T>(list: T[], i: number, j: number): void {
  const held = list[i]!;
  list[i] = list[j]!;
  list[j] = held;
}
