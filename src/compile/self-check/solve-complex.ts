/** Right-hand sides through the factors of a sparse complex system, refined until rounding is all that is left. */

import { type ComplexSystem, type ComplexVector, reachedUnknowns, subtractProduct } from './complex-system.ts';
import type { ComplexFactors } from './elimination-steps.ts';

/** Most steps of refinement; each gains about as many digits as elimination kept, so two or three do where any do. */
const MOST_STEPS = 6;

/** Largest relative change of an entry that counts as rounding: a few units in the last place. */
const ROUNDING = 8 * Number.EPSILON;

/**
 * Solves for one right-hand side and refines until the solution answers to a system whose every entry differs by rounding
 * only. Elimination alone promises that for the largest entries; signals of a drawing differ by many orders of magnitude
 * (Oettli & Prager 1964, Numer. Math. 6; Skeel 1980, Math. Comp. 35; Arioli, Demmel & Duff 1989, SIAM J. Matrix Anal.
 * Appl. 10).
 *
 * @param system  What was factored.
 */
export function solveRefined(system: ComplexSystem, factors: ComplexFactors, right: ComplexVector): ComplexVector {
  const isReached = reachedUnknowns(factors.columns, right);
  const solution = solveOnce(factors, right, isReached);
  let before = Number.POSITIVE_INFINITY;
  for (let step = 0; step < MOST_STEPS; step++) {
    const left = { re: right.re.slice(), im: right.im.slice() };
    const error = subtractProduct(system, solution, left);
    if (error <= ROUNDING || error > before / 2) break;
    before = error;
    const correction = solveOnce(factors, left, isReached);
    for (let i = 0; i < system.size; i++) {
      solution.re[i]! += correction.re[i]!;
      solution.im[i]! += correction.im[i]!;
    }
  }
  return solution;
}

/** The solution by the factors, zero for unknowns that are not reached. */
function solveOnce(factors: ComplexFactors, right: ComplexVector, isReached: Uint8Array): ComplexVector {
  const re = right.re.slice();
  const im = right.im.slice();
  forwards(factors, re, im);
  const x = { re: new Float64Array(re.length), im: new Float64Array(re.length) };
  backwards(factors, re, im, x, isReached);
  return x;
}

function forwards(factors: ComplexFactors, re: Float64Array, im: Float64Array): void {
  const { row, targetStart, target, factorRe, factorIm } = factors;
  for (let step = 0; step < row.length; step++) {
    const bRe = re[row[step]!]!;
    const bIm = im[row[step]!]!;
    if (bRe === 0 && bIm === 0) continue;
    for (let k = targetStart[step]!; k < targetStart[step + 1]!; k++) {
      re[target[k]!]! -= factorRe[k]! * bRe - factorIm[k]! * bIm;
      im[target[k]!]! -= factorRe[k]! * bIm + factorIm[k]! * bRe;
    }
  }
}

function backwards(
  factors: ComplexFactors,
  re: Float64Array,
  im: Float64Array,
  x: ComplexVector,
  isReached: Uint8Array,
): void {
  const { row, column, pivotRe, pivotIm, restStart, rest, restRe, restIm } = factors;
  for (let step = row.length - 1; step >= 0; step--) {
    if (isReached[column[step]!] === 0) continue;
    let sumRe = re[row[step]!]!;
    let sumIm = im[row[step]!]!;
    for (let k = restStart[step]!; k < restStart[step + 1]!; k++) {
      const xRe = x.re[rest[k]!]!;
      const xIm = x.im[rest[k]!]!;
      sumRe -= restRe[k]! * xRe - restIm[k]! * xIm;
      sumIm -= restRe[k]! * xIm + restIm[k]! * xRe;
    }
    const pRe = pivotRe[step]!;
    const pIm = pivotIm[step]!;
    const size = pRe * pRe + pIm * pIm;
    x.re[column[step]!] = (sumRe * pRe + sumIm * pIm) / size;
    x.im[column[step]!] = (sumIm * pRe - sumRe * pIm) / size;
  }
}
