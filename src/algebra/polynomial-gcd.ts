/**
 * Greatest common divisors of polynomials over the rationals. Images modulo primes come first: one prime that keeps both
 * leading coefficients and gives degree 0 proves that there is no common factor. Otherwise images are put together by the
 * Chinese remainder theorem until the candidate divides both, which proves it (Brown 1971, J. ACM 18).
 */

import { greatestCommonDivisor } from './integer.ts';
import { exactQuotient, type IntegerPolynomial, monicOf, primitiveOf, primitivePart } from './integer-polynomial.ts';
import {
  combineResidues,
  imageModulo,
  type Lift,
  type ModularPolynomial,
  modularGcd,
  primeAt,
  reduce,
  residue,
  symmetric,
} from './modular/index.ts';
import type { Polynomial } from './polynomial.ts';

/** Monic gcd of p and q; the zero polynomial where both are zero. */
export function greatestCommonDivisorOfPolynomials(p: Polynomial, q: Polynomial): Polynomial {
  return monicOf(integerGcd(primitiveOf(p), primitiveOf(q)));
}

/** Primitive gcd of two primitive polynomials. */
export function integerGcd(f: IntegerPolynomial, g: IntegerPolynomial): IntegerPolynomial {
  if (f.length === 0) return g;
  if (g.length === 0) return f;
  if (f.length === 1 || g.length === 1) return [1n];
  const leading = greatestCommonDivisor(f[0]!, g[0]!);
  let lift: Lift | null = null;
  for (let i = 0; ; i++) {
    const p = primeAt(i);
    const image = probe(f, g, p);
    if (image === null) continue;
    if (image.length === 1) return [1n];
    if (lift !== null && image.length > lift.residues.length) continue;
    // The gcd's image is monic; the true one is scaled to the leading coefficient `leading`, which its own one divides.
    const scaled = image.map(c => reduce(c * residue(leading, p), p, 1 / p));
    const previous: Lift | null = lift !== null && lift.residues.length === image.length ? lift : null;
    lift = combineResidues(previous, scaled, p);
    if (previous === null || !isUnchanged(previous, lift)) continue;
    const candidate = primitivePart(symmetric(lift));
    if (exactQuotient(f, candidate) !== null && exactQuotient(g, candidate) !== null) return candidate;
  }
}

/** Monic gcd modulo p, or null where p divides a leading coefficient and so says nothing. */
function probe(f: IntegerPolynomial, g: IntegerPolynomial, p: number): ModularPolynomial | null {
  const left = imageModulo(f, p);
  const right = imageModulo(g, p);
  return left.length < f.length || right.length < g.length ? null : modularGcd(left, right, p);
}

function isUnchanged(before: Lift, after: Lift): boolean {
  const old = symmetric(before);
  return symmetric(after).every((coefficient, i) => coefficient === old[i]);
}
