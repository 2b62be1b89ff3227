/**
 * Exact numbers: rationals, polynomials, matrices over a field, certified roots. Rational functions of the parameters are in
 * symbolic/, which has its own list.
 */

export { characteristicFactors, characteristicPolynomial } from './characteristic-polynomial.ts';
export type { Field } from './field.ts';
export { doubleField, rationalField } from './fields.ts';
export type { EchelonBasis } from './invariant-subspace.ts';
export { invariantSubspace, multiplyByMatrix } from './invariant-subspace.ts';
export { invariantZeroPolynomial } from './invariant-zeros.ts';
export type { Polynomial } from './polynomial.ts';
export {
  addPolynomials,
  derivative,
  dividePolynomials,
  evaluatePolynomialAt,
  monic,
  multiplyPolynomials,
  polynomial,
  productOfPolynomials,
  reflectPolynomial,
  scalePolynomial,
  subtractPolynomials,
} from './polynomial.ts';
export { greatestCommonDivisorOfPolynomials } from './polynomial-gcd.ts';
export { rankOf } from './rank.ts';
export type { Rational } from './rational.ts';
export {
  addRationals,
  compareRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  ONE,
  rational,
  subtractRationals,
  ZERO,
} from './rational.ts';
export { rationalFromDouble, toDouble } from './rational-double.ts';
export { parseRational, toFraction } from './rational-text.ts';
export type { CertifiedRoot } from './roots/index.ts';
export { certifiedRoots, findCertifiedRoots } from './roots/index.ts';
export { reduceRows } from './row-reduction.ts';
export type { SparseMatrix } from './sparse-matrix.ts';
export { entryAt, fromRows, toRows } from './sparse-matrix.ts';
export type { SquareFreeFactor } from './square-free.ts';
export { squareFreeFactors } from './square-free.ts';
export { transferNumerators } from './transfer-numerators.ts';
