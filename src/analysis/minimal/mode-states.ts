/** Which states take part in a hidden mode: those that move in it where no output shows it, or that it lies in where no input reaches it. */

import {
  addRationals,
  entryAt,
  fromRows,
  multiplyByMatrix,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  rational,
  type SparseMatrix,
  toDouble,
  ZERO,
} from '../../algebra/index.ts';
import type { ExactModel } from '../exact-model.ts';
import { distinguishable, type HiddenMode, reachable } from '../structure.ts';
import { combinationOf, complementOf, kernelOf, type RationalRows } from './rational-rows.ts';

export interface ModeStates {
  /** Positions, ascending. */
  readonly states: readonly number[];
  /**
   * Whether they are this mode's alone: where the mode or the two of a pair are no roots of a factor with short rational
   * coefficients, the states are those of all such modes together.
   */
  readonly isOwn: boolean;
}

/**
 * The states with a part in some generalized eigenvector of the mode: right ones within what the outputs do not show, left ones
 * within what the inputs do not reach. Exact.
 */
export function modeStates(exact: ExactModel, mode: HiddenMode): ModeStates {
  const { A } = exact.matrices;
  const n = A.rows;
  const factor = factorOf(mode);
  const sides: [SparseMatrix<Rational>, RationalRows][] = [];
  const isNeither = !mode.isUncontrollable && !mode.isUnobservable;
  if (mode.isUncontrollable || isNeither) sides.push([transposedSparse(A), complementOf(reachable(exact), n)]);
  if (mode.isUnobservable || isNeither) sides.push([A, complementOf(distinguishable(exact), n)]);
  const states = new Set<number>();
  let isOwn = true;
  for (const [M, basis] of sides) {
    const own = factor === null ? [] : annihilatedBy(M, basis, factor, mode.multiplicity);
    if (own.length === 0) isOwn = false;
    for (const vector of own.length === 0 ? basis : own) {
      vector.forEach((entry, i) => {
        if (entry.n !== 0n) states.add(i);
      });
    }
  }
  return { states: [...states].sort((a, b) => a - b), isOwn };
}

/** s − λ or s² − 2 Re λ s + |λ|², descending; null where the mode's parts are no short fractions. */
function factorOf({ re, im }: HiddenMode): readonly Rational[] | null {
  const middle = shortFraction(im === 0 ? re : 2 * re);
  if (middle === null) return null;
  if (im === 0) return [ONE, negateRational(middle)];
  const last = shortFraction(re * re + im * im);
  return last === null ? null : [ONE, negateRational(middle), last];
}

/** Denominators that are tried: those of quantities typed by hand. */
const LONGEST_DENOMINATOR = 1_000_000;

/**
 * The fraction of least denominator within a few units in the last place of the double, by continued fractions (Khinchin 1964,
 * Continued Fractions, § 6); null beyond the denominators tried. Whether it is the root is tested exactly by who asks.
 */
function shortFraction(value: number): Rational | null {
  let [n0, d0, n1, d1] = [0n, 1n, 1n, 0n];
  let rest = value;
  for (let i = 0; i < 40; i++) {
    const whole = BigInt(Math.floor(rest));
    [n0, n1] = [n1, whole * n1 + n0];
    [d0, d1] = [d1, whole * d1 + d0];
    if (d1 > BigInt(LONGEST_DENOMINATOR)) return null;
    const found = rational(n1, d1);
    if (Math.abs(toDouble(found) - value) <= 4 * Number.EPSILON * Math.abs(value)) return found;
    rest = 1 / (rest - Math.floor(rest));
    if (!Number.isFinite(rest)) return null;
  }
  return null;
}

/** The vectors of the span that q(M)ᵐ takes to zero. */
function annihilatedBy(
  M: SparseMatrix<Rational>,
  basis: RationalRows,
  q: readonly Rational[],
  multiplicity: number,
): Rational[][] {
  const n = M.rows;
  const images = basis.map(vector => {
    let image: readonly Rational[] = vector;
    for (let k = 0; k < multiplicity; k++) image = polynomialTimes(M, q, image);
    return image;
  });
  const byRow = Array.from({ length: n }, (_, i) => images.map(image => image[i]!));
  return kernelOf(byRow, basis.length).map(factors => combinationOf(factors, basis, n));
}

/** q(M) v by Horner's rule. */
function polynomialTimes(M: SparseMatrix<Rational>, q: readonly Rational[], v: readonly Rational[]): Rational[] {
  let sum: Rational[] = v.map(() => ZERO);
  for (const coefficient of q) {
    const moved = multiplyByMatrix(M, sum);
    sum = moved.map((entry, i) => addRationals(entry, multiplyRationals(coefficient, v[i]!)));
  }
  return sum;
}

function transposedSparse(matrix: SparseMatrix<Rational>): SparseMatrix<Rational> {
  const rows = Array.from({ length: matrix.columns }, (_, j) =>
    Array.from({ length: matrix.rows }, (_, i) => entryAt(matrix, i, j, ZERO)),
  );
  return fromRows(rows, matrix.rows, ({ n }) => n === 0n);
}
