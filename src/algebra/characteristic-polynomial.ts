/**
 * The exact characteristic polynomial of a rational matrix: strongly connected components first, then images modulo as many
 * primes as a rigorous bound on the coefficients asks for, put together at the end. Roots, transfer functions and every
 * exact verdict on stability stand on it.
 */

import {
  characteristicByHessenberg,
  denominatorProduct,
  integersFromResidues,
  inverseModulo,
  type ModularRows,
  minimalByRecurrence,
  primeAt,
  reduce,
  residue,
  rowBits,
  rowsModulo,
  scaledRows,
} from './modular/index.ts';
import { type Polynomial, productOfPolynomials } from './polynomial.ts';
import {
  addRationals,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  rationalOver,
  subtractRationals,
  ZERO,
} from './rational.ts';
import { entryAt, type SparseMatrix } from './sparse-matrix.ts';
import { principalSubmatrix, strongComponents } from './strong-components.ts';
import { type RepeatedEigenvalue, repeatedEigenvalues } from './structural-rank.ts';

/** Up to this size Hessenberg's form modulo p takes less time than the recurrence (measured on three entries a row). */
const SMALL = 5;

/** det(sI − A), monic, for the n × n matrix A; 1 where n = 0. */
export function characteristicPolynomial(A: SparseMatrix<Rational>): Polynomial {
  return productOfPolynomials(characteristicFactors(A));
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
  return characteristicByPrimes(A);
}

function characteristicByPrimes(A: SparseMatrix<Rational>): Polynomial {
  const rows = scaledRows(A);
  const { scale, base } = denominatorProduct(rows);
  const repeated = rows.rows <= SMALL ? [] : repeatedEigenvalues(A);
  const images: Float64Array[] = [];
  const primes: number[] = [];
  // One bit for the sign, one for the rounding of the logarithms.
  let missingBits = rowBits(rows, rows.rows).reduce((sum, bits) => sum + bits, 2);
  let isRecurrenceShort = rows.rows <= SMALL;
  for (let i = 0; missingBits > 0; i++) {
    const p = primeAt(i);
    const image = rowsModulo(rows, p);
    if (image === null) continue;
    const fast = isRecurrenceShort ? null : characteristicByRecurrence(image, repeated, p);
    // About one prime in a million fails without a cause in A; where it is the first one, the rest only takes longer.
    if (fast === null && images.length === 0) isRecurrenceShort = true;
    images.push(scaledBy(fast ?? characteristicByHessenberg(image, p), residue(scale, p), p));
    primes.push(p);
    missingBits -= Math.log2(p);
  }
  return integersFromResidues(images, primes).map(coefficient => rationalOver(coefficient, scale, base));
}

/**
 * det(sI − A) modulo p by the recurrence, or null where that is too short to prove it. An eigenvalue with k independent
 * eigenvectors is a root of at least k − 1 invariant factors besides the minimal polynomial, which therefore has degree
 * n − Σ(k − 1) at most; a recurrence of this length is the minimal polynomial, and the rest is known.
 */
function characteristicByRecurrence(
  A: ModularRows,
  repeated: readonly RepeatedEigenvalue[],
  p: number,
): Float64Array | null {
  const rest = repeated.flatMap(({ value, nullity }) => {
    const root = reduce(residue(value.n, p) * inverseModulo(residue(value.d, p), p), p, 1 / p);
    return new Array<number>(nullity - 1).fill(root);
  });
  const minimal = minimalByRecurrence(A, p);
  return minimal.length + rest.length === A.rows + 1 ? rest.reduce((f, root) => timesRoot(f, root, p), minimal) : null;
}

/** f · (s − root) modulo p. */
function timesRoot(f: Float64Array, root: number, p: number): Float64Array {
  const minus = p - root;
  const product = new Float64Array(f.length + 1);
  for (let i = 0; i <= f.length; i++) product[i] = reduce((f[i] ?? 0) + minus * (f[i - 1] ?? 0), p, 1 / p);
  return product;
}

function scaledBy(coefficients: Float64Array, factor: number, p: number): Float64Array {
  return coefficients.map(c => reduce(c * factor, p, 1 / p));
}
