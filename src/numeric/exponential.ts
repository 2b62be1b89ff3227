/**
 * The matrix exponential as F = e^M − I, which keeps the relative accuracy of slow modes that e^M itself loses in the last
 * digits beside 1: the kernel of every time response.
 *
 * Padé approximants and their limits by Higham 2005, SIAM J. Matrix Anal. Appl. 26(4), doi:10.1137/04061101X; scaling by
 * norms of powers by Al-Mohy & Higham 2009, SIAM J. Matrix Anal. Appl. 31(3), doi:10.1137/09074721X. Departs from both:
 * the approximant is taken as (V − U)⁻¹ 2U and squared by F ← F F + 2F, both exact identities for e^M − I.
 */

import { type DenseMatrix, multiplyMatrices, oneNorm, zeroMatrix } from './dense-matrix.ts';
import { luFactors, luSolve } from './lu.ts';

/** Largest norms at which the [m/m] approximant has backward error within 2⁻⁵³: Higham 2005, Table 2.3. */
const LIMITS = [
  { degree: 3, norm: 1.495585217958292e-2 },
  { degree: 5, norm: 2.53939833006323e-1 },
  { degree: 7, norm: 9.504178996162932e-1 },
  { degree: 9, norm: 2.097847961257068 },
] as const;

/** The same for degree 13 with norms of powers: Al-Mohy & Higham 2009, section 5 (4.25, below the 5.37 of Table 2.3). */
const LIMIT_13 = 4.25;

type Degree = 3 | 5 | 7 | 9 | 13;

/**
 * e^(M / 2ᵏ) − I for k = squarings, squarings − 1, …, 0, the coarsest last.
 */
export interface ExponentialChain {
  readonly levels: readonly DenseMatrix[];
}

/** e^M − I for a square finite M. O(n³), some 6 products, a solution and one product a squaring. */
export function exponentialMinusIdentity(M: DenseMatrix): DenseMatrix {
  const { levels } = exponentialChain(M, 0);
  return levels[levels.length - 1]!;
}

/**
 * e^M − I with everything that its squarings went through, at least `fewestSquarings` of them: the transition matrices of
 * the steps 1, 1/2, 1/4, … of one interval for the price of one. An entry that overflows comes out as it does in doubles.
 */
export function exponentialChain(M: DenseMatrix, fewestSquarings: number): ExponentialChain {
  const norm = oneNorm(M);
  if (!Number.isFinite(norm)) throw new RangeError('the exponential of a matrix that is not finite');
  const lowered = norm > 1 ? Math.ceil(Math.log2(norm)) : 0;
  const unit = evenPowers(scaled(M, 2 ** -lowered)); // norms at most 1, so that no power overflows
  const squarings = Math.max(squaringsFor(unit, lowered), fewestSquarings);
  const base = scaledPowers(unit, lowered - squarings);
  let F = padeMinusIdentity(base, smallDegree(base));
  const levels = [F];
  for (let k = 0; k < squarings; k++) {
    F = squareStep(F);
    levels.push(F);
  }
  return { levels };
}

interface EvenPowers {
  readonly first: DenseMatrix;
  readonly second: DenseMatrix;
  readonly fourth: DenseMatrix;
  readonly sixth: DenseMatrix;
}

function evenPowers(first: DenseMatrix): EvenPowers {
  const second = multiplyMatrices(first, first);
  const fourth = multiplyMatrices(second, second);
  return { first, second, fourth, sixth: multiplyMatrices(second, fourth) };
}

/** The powers of 2^exponent M. */
function scaledPowers({ first, second, fourth, sixth }: EvenPowers, exponent: number): EvenPowers {
  return {
    first: scaled(first, 2 ** exponent),
    second: scaled(second, 4 ** exponent),
    fourth: scaled(fourth, 16 ** exponent),
    sixth: scaled(sixth, 64 ** exponent),
  };
}

/**
 * Upper bounds of max(‖M^2p‖^(1/2p), ‖M^(2p+2)‖^(1/(2p+2))) for p = 2, 3, 4 from the powers at hand; the 8th and 10th
 * power are bounded by products of lower ones where the paper estimates them.
 */
function powerNorms(powers: EvenPowers): { readonly low: number; readonly middle: number; readonly high: number } {
  const [two, four, six] = [oneNorm(powers.second), oneNorm(powers.fourth), oneNorm(powers.sixth)];
  const d4 = four ** (1 / 4);
  const d6 = six ** (1 / 6);
  const d8 = Math.min(four ** (1 / 4), (two * six) ** (1 / 8));
  const d10 = (four * six) ** (1 / 10);
  return { low: Math.max(d4, d6), middle: Math.max(d6, d8), high: Math.max(d8, d10) };
}

/** The lowest degree whose limit the matrix meets without scaling, 13 where none does. */
function smallDegree(powers: EvenPowers): Degree {
  const { low, middle } = powerNorms(powers);
  for (const { degree, norm } of LIMITS) {
    const bound = degree <= 5 ? low : middle;
    if (bound <= norm && extraSquarings(powers.first, degree) === 0) return degree;
  }
  return 13;
}

/** Squarings that bring 2^lowered times the matrix within the limit of degree 13. */
function squaringsFor(powers: EvenPowers, lowered: number): number {
  const { middle, high } = powerNorms(powers);
  const bound = Math.min(middle, high);
  const squarings = bound === 0 ? 0 : Math.max(0, Math.ceil(Math.log2(bound / LIMIT_13) + lowered));
  return squarings + extraSquarings(scaled(powers.first, 2 ** (lowered - squarings)), 13);
}

/**
 * The ℓ of Al-Mohy & Higham 2009, (5.1): squarings needed for the first neglected term, |c| ‖ |M|^(2m+1) ‖ against 2⁻⁵³ ‖M‖,
 * with |c| = 1 / ((2m over m) (2m + 1)!).
 */
function extraSquarings(M: DenseMatrix, degree: number): number {
  const norm = oneNorm(M);
  if (norm === 0) return 0;
  const alpha = (neglectedCoefficient(degree) * absolutePowerNorm(M, 2 * degree + 1)) / norm;
  if (alpha === 0) return 0;
  return Math.max(0, Math.ceil(Math.log2((2 * alpha) / Number.EPSILON) / (2 * degree)));
}

function neglectedCoefficient(m: number): number {
  let coefficient = 1;
  for (let k = 1; k <= m; k++) coefficient *= k / (m + k); // 1 / (2m over m)
  for (let k = 2; k <= 2 * m + 1; k++) coefficient /= k;
  return coefficient;
}

/** ‖ |M|^power ‖₁ by products of a row of ones with |M|. O(n² power). */
function absolutePowerNorm({ rows: n, data }: DenseMatrix, power: number): number {
  let row = new Float64Array(n).fill(1);
  for (let k = 0; k < power; k++) {
    const next = new Float64Array(n);
    for (let i = 0; i < n; i++) for (let j = 0; j < n; j++) next[j]! += row[i]! * Math.abs(data[i * n + j]!);
    row = next;
  }
  return row.reduce((largest, sum) => Math.max(largest, sum), 0);
}

/** Numerator coefficients b₀ … b_m of the [m/m] approximant, those of b_m = 1: Higham 2005, (2.2). */
function padeCoefficients(m: number): readonly number[] {
  const coefficients = [1];
  for (let k = m; k > 0; k--) coefficients.unshift((coefficients[0]! * k * (2 * m - k + 1)) / (m - k + 1));
  return coefficients;
}

/** r(M) − I = (V − U)⁻¹ 2U with U odd and V even in M. */
function padeMinusIdentity({ first, second, fourth, sixth }: EvenPowers, degree: Degree): DenseMatrix {
  const b = padeCoefficients(degree);
  const powers = [second, fourth, sixth];
  if (degree === 9) powers.push(multiplyMatrices(fourth, fourth));
  const terms = powers.slice(0, degree === 13 ? 3 : (degree - 1) / 2);
  let odd = weightedSum(first.rows, b[1]!, terms, k => b[2 * k + 3]!);
  let V = weightedSum(first.rows, b[0]!, terms, k => b[2 * k + 2]!);
  if (degree === 13) {
    odd = combined(
      odd,
      1,
      multiplyMatrices(
        sixth,
        weightedSum(first.rows, 0, terms, k => b[2 * k + 9]!),
      ),
    );
    V = combined(
      V,
      1,
      multiplyMatrices(
        sixth,
        weightedSum(first.rows, 0, terms, k => b[2 * k + 8]!),
      ),
    );
  }
  const U = multiplyMatrices(first, odd);
  const factors = luFactors(combined(V, -1, U));
  if (factors === null) throw new RangeError('the denominator of a Padé approximant within its limit is singular');
  return luSolve(factors, scaled(U, 2));
}

/** constant · I + Σ weight(k) · terms[k]. */
function weightedSum(
  n: number,
  constant: number,
  terms: readonly DenseMatrix[],
  weight: (k: number) => number,
): DenseMatrix {
  const result = zeroMatrix(n, n);
  for (let i = 0; i < n; i++) result.data[i * n + i] = constant;
  terms.forEach((term, k) => {
    const factor = weight(k);
    for (let i = 0; i < n * n; i++) result.data[i]! += factor * term.data[i]!;
  });
  return result;
}

/** F F + 2F, which is e^(2M) − I for F = e^M − I. */
function squareStep(F: DenseMatrix): DenseMatrix {
  const square = multiplyMatrices(F, F);
  for (let i = 0; i < square.data.length; i++) square.data[i]! += 2 * F.data[i]!;
  return square;
}

function scaled({ rows, columns, data }: DenseMatrix, factor: number): DenseMatrix {
  return { rows, columns, data: factor === 1 ? data : data.map(entry => entry * factor) };
}

/** A + factor · B. */
function combined(A: DenseMatrix, factor: number, B: DenseMatrix): DenseMatrix {
  return { rows: A.rows, columns: A.columns, data: A.data.map((entry, i) => entry + factor * B.data[i]!) };
}
