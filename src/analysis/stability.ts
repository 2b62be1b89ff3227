/**
 * Stability of the state-space model in the sense of the model file: `stable` where all poles lie in the open left half
 * plane, `marginal` where none lies to the right and those on the axis are semisimple, else `unstable`. Decided exactly
 * where the model's size allows.
 */

import {
  addRationals,
  greatestCommonDivisorOfPolynomials,
  multiplyByMatrix,
  type Polynomial,
  type Rational,
  rankOf,
  reflectPolynomial,
  squareFreeFactors,
  ZERO,
} from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { balance, type DenseMatrix, eigenvalues, irreducibleBlocks, oneNorm, submatrix } from '../numeric/index.ts';
import { denseOf } from './channel-system.ts';
import { characteristicOf, type Effort, type ExactModel, exactModel, remembered } from './exact-model.ts';
import { exactPoles } from './poles.ts';

export interface Stability {
  /** `undecided` only where poles in doubles did not converge or lie too near the axis and each other to tell. */
  readonly verdict: 'stable' | 'marginal' | 'unstable' | 'undecided';
  /** Whether the verdict is a proof in exact arithmetic; else it rests on computed poles. */
  readonly proved: boolean;
  /** Whether what is proved holds for the doubles that stand in for irrational values. */
  readonly standsIn: boolean;
}

/** The model's stability; exact up to 32 states, up to 128 with `high` effort. A model without states is stable. */
export function stability(model: StateSpace, effort: Effort = 'ordinary'): Stability {
  const exact = exactModel(model, effort);
  const verdict = exact === null ? null : exactVerdict(exact);
  if (exact !== null && verdict !== null) return { verdict, proved: true, standsIn: exact.standsIn };
  return { verdict: floatingVerdict(denseOf(model.numeric.A)), proved: false, standsIn: false };
}

type Verdict = 'stable' | 'marginal' | 'unstable';

const verdicts = new WeakMap<ExactModel, { readonly verdict: Verdict | null }>();

/** The verdict by the signs of certified real parts; null where the poles could not be separated. */
function exactVerdict(exact: ExactModel): Verdict | null {
  return remembered(verdicts, exact, () => {
    const poles = exactPoles(exact);
    if (poles === null) return { verdict: null };
    if (poles.some(({ re }) => re > 0)) return { verdict: 'unstable' as const };
    const onAxis = poles.filter(({ re }) => re === 0);
    if (onAxis.length === 0) return { verdict: 'stable' as const };
    const isSimple = onAxis.every(({ multiplicity }) => multiplicity === 1);
    return { verdict: isSimple || isSemisimple(exact) ? ('marginal' as const) : ('unstable' as const) };
  }).verdict;
}

/**
 * Whether each pole on the imaginary axis, no pole being to its right, has as many independent eigenvectors as its
 * multiplicity k: the square-free factor f of those with that multiplicity has to leave f(A) with a kernel of dimension
 * k deg f. Exact.
 */
function isSemisimple(exact: ExactModel): boolean {
  const { A } = exact.matrices;
  const characteristic = characteristicOf(exact);
  // The roots whose mirror image −z is a root too: with none to the right, those on the axis.
  const onAxis = greatestCommonDivisorOfPolynomials(characteristic, reflectPolynomial(characteristic));
  return squareFreeFactors(onAxis).every(({ factor, multiplicity }) => {
    if (multiplicity === 1) return true;
    const kernel = multiplicity * (factor.length - 1);
    return rankOf(polynomialOfMatrix(factor, A)) === A.rows - kernel;
  });
}

/** Columns of f(A), by Horner's rule on each unit vector. */
function polynomialOfMatrix(f: Polynomial, A: ExactModel['matrices']['A']): Rational[][] {
  return Array.from({ length: A.rows }, (_, j) => {
    let column = new Array<Rational>(A.rows).fill(ZERO);
    for (const coefficient of f) {
      column = multiplyByMatrix(A, column);
      column[j] = addRationals(column[j] ?? ZERO, coefficient);
    }
    return column;
  });
}

interface BlockPole {
  readonly re: number;
  readonly im: number;
  /** Distance from the axis within which the pole counts as on it. */
  readonly tolerance: number;
}

/**
 * The verdict by eigenvalues in doubles: a real part within 8 n ε ‖A‖₁ of its irreducible, balanced block counts as zero (the
 * backward error of the QR iteration), a block of one state has none. Poles on the axis nearer to each other than the square
 * root of that, relative to the block, may be defective: `undecided`.
 */
function floatingVerdict(A: DenseMatrix): Stability['verdict'] {
  const onAxis: BlockPole[] = [];
  let isUnstable = false;
  for (const block of irreducibleBlocks(A)) {
    const found = blockPoles(submatrix(A, block, block));
    if (found === null) return 'undecided';
    for (const pole of found) {
      if (pole.re > pole.tolerance) isUnstable = true;
      else if (pole.re >= -pole.tolerance) onAxis.push(pole);
    }
  }
  if (isUnstable) return 'unstable';
  if (onAxis.length === 0) return 'stable';
  return onAxis.some((a, i) => onAxis.some((b, j) => j > i && areNear(a, b))) ? 'undecided' : 'marginal';
}

function blockPoles(block: DenseMatrix): readonly BlockPole[] | null {
  if (block.rows === 1) return [{ re: block.data[0] ?? 0, im: 0, tolerance: 0 }];
  const values = eigenvalues(block);
  if (values === null) return null;
  const tolerance = 8 * block.rows * Number.EPSILON * oneNorm(balance(block).A);
  return Array.from(values.re, (re, i) => ({ re, im: values.im[i] ?? 0, tolerance }));
}

function areNear(a: BlockPole, b: BlockPole): boolean {
  const size = Math.max(a.tolerance, b.tolerance) / Number.EPSILON;
  return Math.abs(a.im - b.im) <= Math.sqrt(Number.EPSILON) * size;
}
