/** Generators of polynomials over the rationals with short coefficients. */

import fc from 'fast-check';
import { type Polynomial, polynomial } from '../../src/algebra/index.ts';
import { shortRational } from './rationals.ts';

/** Of degree up to `degree`, zero among them. */
export function polynomialOf(degree: number): fc.Arbitrary<Polynomial> {
  return fc.array(shortRational, { maxLength: degree + 1 }).map(polynomial);
}

export function nonzeroPolynomialOf(degree: number): fc.Arbitrary<Polynomial> {
  return polynomialOf(degree).filter(p => p.length > 0);
}
