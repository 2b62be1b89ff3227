/**
 * The exact characteristic polynomial of a rational matrix: strongly connected components first, then images modulo as many
 * primes as a rigorous bound on the coefficients asks for, put together at the end. Roots, transfer functions and every
 * exact verdict on stability stand on it.
 */

import { integersFromResidues } from './chinese-remainder.ts';
import { characteristicByHessenberg, characteristicByRecurrence } from './modular-characteristic.ts';
import { multiplyPolynomials, type Polynomial } from './polynomial.ts';
import { primeAt, reduce, residue } from './primes.ts';
import {
  addRationals,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  rational,
  subtractRationals,
  ZERO,
} from './rational.ts';
import { coefficientBits, rowsModulo, type ScaledRows, scaledRows } from './scaled-rows.ts';
import { entryAt, type SparseMatrix } from './sparse-matrix.ts';
import { principalSubmatrix, strongComponents } from './strong-components.ts';

/** Up to this size Hessenberg's form modulo p takes less time than the recurrence (measured on three entries a row). */
const SMALL = 5;

/** det(sI − A), monic, for the n × n matrix A; 1 where n = 0. */
export function characteristicPolynomial(A: SparseMatrix<Rational>): Polynomial {
  return characteristicFactors(A).reduce(multiplyPolynomials, [ONE]);
}

/**
 * The monic characteristic polynomials of A's strongly connected components, in an order in which a component comes after
 * those it depends on. Their product is det(sI − A); their roots are found faster than those of the product.
 */
export function characteristicFactors(A: SparseMatrix<Rational>): Polynomial[] {
  return strongComponents(A).map(indices => connectedCharacteristic(principalSubmatrix(A, indices)));
}

/** det(sI − A) of one component. */
function connectedCharacteristic(A: SparseMatrix<Rational>): Polynomial {
  const at = (i: number, j: number): Rational => entryAt(A, i, j, ZERO);
  if (A.rows === 1) return [ONE, negateRational(at(0, 0))];
  if (A.rows === 2) {
    const trace = addRationals(at(0, 0), at(1, 1));
    const diagonal = multiplyRationals(at(0, 0), at(1, 1));
    return [ONE, negateRational(trace), subtractRationals(diagonal, multiplyRationals(at(0, 1), at(1, 0)))];
  }
  return characteristicByPrimes(scaledRows(A));
}

function characteristicByPrimes(A: ScaledRows): Polynomial {
  const scale = A.denominators.reduce((product, d) => product * d, 1n);
  const images: Float64Array[] = [];
  const primes: number[] = [];
  // One bit for the sign, one for the rounding of the logarithms.
  let missingBits = coefficientBits(A, A.rows) + 2;
  let isRecurrenceShort = A.rows <= SMALL;
  for (let i = 0; missingBits > 0; i++) {
    const p = primeAt(i);
    const image = rowsModulo(A, p);
    if (image === null) continue;
    const recurrence = isRecurrenceShort ? null : characteristicByRecurrence(image, p);
    // About one prime in a million fails without a cause in A; where it is the first one, the rest only takes longer.
    if (recurrence === null && images.length === 0) isRecurrenceShort = true;
    images.push(scaledBy(recurrence ?? characteristicByHessenberg(image, p), residue(scale, p), p));
    primes.push(p);
    missingBits -= Math.log2(p);
  }
  return integersFromResidues(images, primes).map(coefficient => rational(coefficient, scale));
}

function scaledBy(coefficients: Float64Array, factor: number, p: number): Float64Array {
  return coefficients.map(c => reduce(c * factor, p, 1 / p));
}
