/**
 * The determinant of a square system matrix, whose roots are the invariant zeros where it is not zero: the short way for as
 * many inputs as outputs. Where the determinant vanishes, or the model is not square, the reduction of invariant-zeros.ts
 * takes over.
 */

import { characteristicPolynomial } from './characteristic-polynomial.ts';
import {
  denominatorProduct,
  integersFromResidues,
  inverseModulo,
  markovParameters,
  numeratorModulo,
  primeAt,
  reduce,
  residue,
  rowBits,
  rowsModulo,
  scaledRows,
} from './modular/index.ts';
import { monic, overOneDenominator, type Polynomial, polynomial } from './polynomial.ts';
import { type Rational, rationalOver } from './rational.ts';
import type { SparseMatrix } from './sparse-matrix.ts';

/** Primes modulo which a determinant that is not zero may vanish before the longer way is taken. */
const PATIENCE = 2;

/**
 * det [sI − A, −B; C, D], monic, for the system matrix [A, B; C, D] with n states and as many inputs as outputs; null where it
 * vanishes, or seems to modulo the first primes. det(sI − A) det G(s) at n + 1 points modulo each prime, as many primes as
 * Hadamard's bound asks for. O(n² m² + n m³) for each prime and m inputs.
 */
export function squareSystemDeterminant(system: SparseMatrix<Rational>, A: SparseMatrix<Rational>): Polynomial | null {
  const n = A.rows;
  const rows = scaledRows(system);
  const { scale, base } = denominatorProduct(rows);
  const { numerators, denominator } = overOneDenominator(characteristicPolynomial(A));
  const images: Float64Array[] = [];
  const primes: number[] = [];
  // One bit for the sign, one for the rounding of the logarithms.
  let missingBits = rowBits(rows, n).reduce((sum, bits) => sum + bits, 2);
  let isZero = true;
  for (let i = 0; missingBits > 0; i++) {
    const p = primeAt(i);
    const image = rowsModulo(rows, p);
    if (image === null) continue;
    const factor = inverseModulo(residue(denominator, p), p);
    const characteristic = Float64Array.from(numerators, x => reduce(residue(x, p) * factor, p, 1 / p));
    const inputs = Array.from({ length: system.rows - n }, (_, j) => markovParameters(image, n, j, p));
    const entries = inputs.map(outputs => outputs.map(h => numeratorModulo(characteristic, h, 1, p)));
    const coefficients = interpolatedDeterminant(entries, characteristic, residue(scale, p), p);
    if (coefficients.some(x => x !== 0)) isZero = false;
    if (isZero && images.length + 1 >= PATIENCE) return null;
    images.push(coefficients);
    primes.push(p);
    missingBits -= Math.log2(p);
  }
  const determinant = polynomial(integersFromResidues(images, primes).map(x => rationalOver(x, scale, base)));
  return determinant.length === 0 ? null : monic(determinant);
}

/** scale · det N(s) / f(s)^(m − 1) modulo p, a polynomial of degree n at most, from its values at n + 1 points. */
function interpolatedDeterminant(
  N: readonly (readonly Float64Array[])[],
  f: Float64Array,
  scale: number,
  p: number,
): Float64Array {
  const inverse = 1 / p;
  const points: number[] = [];
  const values: number[] = [];
  for (let s = 0; points.length < f.length; s++) {
    const denominator = valueAt(f, s, p);
    if (denominator === 0) continue;
    const over = inverseModulo(denominator, p);
    // N / f entry by entry, so that the determinant is that of G and f comes in once.
    const G = N.map(column => Float64Array.from(column, entry => reduce(valueAt(entry, s, p) * over, p, inverse)));
    const determinant = reduce(determinantModulo(G, p) * denominator, p, inverse);
    points.push(s);
    values.push(reduce(determinant * scale, p, inverse));
  }
  return interpolated(points, values, p);
}

function valueAt(f: Float64Array, s: number, p: number): number {
  const inverse = 1 / p;
  let value = 0;
  for (let i = 0; i < f.length; i++) value = reduce(value * s + f[i]!, p, inverse);
  return value;
}

/** Determinant modulo p by elimination; overwrites G. */
function determinantModulo(G: Float64Array[], p: number): number {
  const inverse = 1 / p;
  let determinant = 1;
  for (let j = 0; j < G.length; j++) {
    const at = G.findIndex((row, i) => i >= j && row[j] !== 0);
    if (at < 0) return 0;
    const pivot = G[at]!;
    if (at !== j) {
      G[at] = G[j]!;
      G[j] = pivot;
      determinant = p - determinant;
    }
    determinant = reduce(determinant * pivot[j]!, p, inverse);
    const over = inverseModulo(pivot[j]!, p);
    for (let i = j + 1; i < G.length; i++) {
      const row = G[i]!;
      const factor = p - reduce(row[j]! * over, p, inverse);
      for (let k = j; k < G.length; k++) row[k] = reduce(row[k]! + factor * pivot[k]!, p, inverse);
    }
  }
  return determinant;
}

/** The polynomial of degree below the number of points with these values, descending powers (Newton's divided differences). */
function interpolated(points: readonly number[], values: readonly number[], p: number): Float64Array {
  const inverse = 1 / p;
  const size = points.length;
  const differences = Float64Array.from(values);
  const inverses = inversesUpTo(points[size - 1]! - points[0]!, p);
  for (let order = 1; order < size; order++) {
    for (let i = size - 1; i >= order; i--) {
      const step = inverses[points[i]! - points[i - order]!]!;
      differences[i] = reduce((differences[i]! - differences[i - 1]!) * step, p, inverse);
    }
  }
  // Horner on the Newton form, ascending powers while it grows.
  const ascending = new Float64Array(size);
  for (let i = size - 1; i >= 0; i--) {
    for (let k = size - 1; k > 0; k--) {
      ascending[k] = reduce(ascending[k - 1]! - points[i]! * ascending[k]!, p, inverse);
    }
    ascending[0] = reduce(differences[i]! - points[i]! * ascending[0]!, p, inverse);
  }
  return ascending.reverse();
}

/** 1/k modulo p for k = 1 … count < p, entry 0 unused: p = qk + r makes 1/k = −q/r. */
function inversesUpTo(count: number, p: number): Float64Array {
  const inverses = new Float64Array(count + 1);
  for (let k = 1; k <= count; k++) {
    inverses[k] = k === 1 ? 1 : reduce(-Math.floor(p / k) * inverses[p % k]!, p, 1 / p);
  }
  return inverses;
}
