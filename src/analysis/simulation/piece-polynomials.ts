/**
 * Signals as polynomials on short pieces of time: values at equally spaced nodes, the same in Legendre coefficients, the value in
 * between, and how far a polynomial of this degree is from the truth. Under the simulation.
 */

import { denseFromRows, luFactors, luSolve } from '../../numeric/index.ts';

/** Degree of the polynomials: at one radian a piece their error is 1e-15 of the signal, and equally spaced nodes still hold their digits. */
export const DEGREE = 10;
export const NODES = DEGREE + 1;

/** Pₙ(x) of Legendre by the three-term recurrence (Abramowitz & Stegun 1964, 22.7.10). */
function legendre(n: number, x: number): number {
  let [before, now] = [1, x];
  if (n === 0) return 1;
  for (let k = 1; k < n; k++) [before, now] = [now, ((2 * k + 1) * x * now - k * before) / (k + 1)];
  return now;
}

/** Node i lies at i / DEGREE of the piece, which is 2 i / DEGREE − 1 for the polynomials. */
const TO_COEFFICIENTS = coefficientMatrix();

function coefficientMatrix(): Float64Array {
  const rows = Array.from({ length: NODES }, (_, i) =>
    Array.from({ length: NODES }, (__, j) => legendre(j, (2 * i) / DEGREE - 1)),
  );
  const unit = Array.from({ length: NODES }, (_, i) => Array.from({ length: NODES }, (__, j) => (i === j ? 1 : 0)));
  const factors = luFactors(denseFromRows(rows, NODES));
  if (factors === null) throw new Error('Legendre polynomials at distinct nodes are independent');
  return luSolve(factors, denseFromRows(unit, NODES)).data;
}

/** Legendre coefficients, ascending degree, of the polynomial through NODES values. */
export function legendreCoefficients(values: ArrayLike<number>): Float64Array {
  const coefficients = new Float64Array(NODES);
  for (let j = 0; j < NODES; j++) {
    let sum = 0;
    for (let i = 0; i < NODES; i++) sum += TO_COEFFICIENTS[j * NODES + i]! * values[i]!;
    coefficients[j] = sum;
  }
  return coefficients;
}

/** The size of the last two coefficients: what is left out is smaller. */
export function tailOf(values: ArrayLike<number>): number {
  const coefficients = legendreCoefficients(values);
  return Math.max(Math.abs(coefficients[DEGREE]!), Math.abs(coefficients[DEGREE - 1]!));
}

/** Barycentric weights of equally spaced nodes, (−1)ⁱ C(DEGREE, i) (Berrut & Trefethen 2004, SIAM Review 46(3)). */
const WEIGHTS = weights();

function weights(): Float64Array {
  const found = new Float64Array(NODES);
  let binomial = 1;
  for (let i = 0; i < NODES; i++) {
    found[i] = i % 2 === 0 ? binomial : -binomial;
    binomial = (binomial * (DEGREE - i)) / (i + 1);
  }
  return found;
}

/** The value at `part` (0 to 1) of the piece, of the polynomial through NODES values from `offset` on. */
export function valueWithin(values: ArrayLike<number>, offset: number, part: number): number {
  const place = part * DEGREE;
  let above = 0;
  let below = 0;
  for (let i = 0; i < NODES; i++) {
    const distance = place - i;
    if (distance === 0) return values[offset + i]!;
    const weight = WEIGHTS[i]! / distance;
    above += weight * values[offset + i]!;
    below += weight;
  }
  return above / below;
}

/**
 * Derivative by the scaled time of −1 to 1 as it acts on Legendre coefficients: (c′)ₖ = (2k + 1) Σ cₙ over n = k + 1, k + 3, …
 * (Abramowitz & Stegun 1964, 22.8.5 summed). NODES × NODES, row-major, strictly upper.
 */
export function derivativeOfCoefficients(): Float64Array {
  const matrix = new Float64Array(NODES * NODES);
  for (let k = 0; k < NODES; k++) for (let n = k + 1; n < NODES; n += 2) matrix[k * NODES + n] = 2 * k + 1;
  return matrix;
}

/** Value at the start of the piece, from coefficients: Σ (−1)ʲ cⱼ. */
export function valueAtStart(j: number): number {
  return j % 2 === 0 ? 1 : -1;
}
