/**
 * Square-free factors: the roots of a polynomial sorted by multiplicity, without knowing the roots. Certified roots stand on
 * it, so that multiplicities are exact.
 */

import {
  exactQuotient,
  type IntegerPolynomial,
  integerDerivative,
  monicOf,
  primitiveOf,
  primitivePart,
} from './integer-polynomial.ts';
import type { Polynomial } from './polynomial.ts';
import { integerGcd } from './polynomial-gcd.ts';

/** A factor without multiple roots and the multiplicity with which its roots occur. */
export interface SquareFreeFactor<P> {
  readonly factor: P;
  readonly multiplicity: number;
}

/**
 * The monic, pairwise coprime, square-free factors of p that are not constant, by ascending multiplicity: p is their product
 * with these powers and its leading coefficient. Empty for a constant and for zero (Yun 1976, SYMSAC).
 */
export function squareFreeFactors(p: Polynomial): SquareFreeFactor<Polynomial>[] {
  return integerSquareFreeFactors(primitiveOf(p)).map(({ factor, multiplicity }) => ({
    factor: monicOf(factor),
    multiplicity,
  }));
}

/** The same for a primitive polynomial, with primitive factors. */
export function integerSquareFreeFactors(f: IntegerPolynomial): SquareFreeFactor<IntegerPolynomial>[] {
  if (f.length < 2) return [];
  const slope = integerDerivative(f);
  const common = integerGcd(f, primitivePart(slope));
  if (common.length === 1) return [{ factor: f, multiplicity: 1 }];
  const factors: SquareFreeFactor<IntegerPolynomial>[] = [];
  let left = divided(f, common);
  let right = difference(divided(slope, common), integerDerivative(left));
  for (let multiplicity = 1; left.length > 1; multiplicity++) {
    const factor = integerGcd(left, primitivePart(right));
    if (factor.length > 1) factors.push({ factor, multiplicity });
    left = divided(left, factor);
    right = difference(divided(right, factor), integerDerivative(left));
  }
  return factors;
}

function divided(f: IntegerPolynomial, g: IntegerPolynomial): IntegerPolynomial {
  const quotient = exactQuotient(f, g);
  if (quotient === null) throw new Error('a gcd that does not divide');
  return quotient;
}

/** f − g, leading zeros dropped. */
function difference(f: IntegerPolynomial, g: IntegerPolynomial): IntegerPolynomial {
  const length = Math.max(f.length, g.length);
  const all = Array.from({ length }, (_, i) => (f[i - length + f.length] ?? 0n) - (g[i - length + g.length] ?? 0n));
  const first = all.findIndex(coefficient => coefficient !== 0n);
  return first < 0 ? [] : all.slice(first);
}

/**
 * The same product of square-free factors with powers, as pairwise coprime factors: what two factors have in common becomes
 * a factor of its own with the sum of their multiplicities.
 */
export function coprimeFactors(
  factors: readonly SquareFreeFactor<IntegerPolynomial>[],
): SquareFreeFactor<IntegerPolynomial>[] {
  return mergedEqual(factors).reduce<SquareFreeFactor<IntegerPolynomial>[]>((base, next) => {
    let rest = next.factor;
    const refined = base.flatMap(kept => {
      const common = areDistinctLines(kept.factor, rest) ? [1n] : integerGcd(kept.factor, rest);
      if (common.length === 1) return [kept];
      rest = divided(rest, common);
      const shared = { factor: common, multiplicity: kept.multiplicity + next.multiplicity };
      const own = divided(kept.factor, common);
      return own.length > 1 ? [{ factor: own, multiplicity: kept.multiplicity }, shared] : [shared];
    });
    return rest.length > 1 ? [...refined, { factor: rest, multiplicity: next.multiplicity }] : refined;
  }, []);
}

/** Equal factors put together, in the order of their first appearance. */
function mergedEqual(factors: readonly SquareFreeFactor<IntegerPolynomial>[]): SquareFreeFactor<IntegerPolynomial>[] {
  const merged = new Map<string, SquareFreeFactor<IntegerPolynomial>>();
  for (const { factor, multiplicity } of factors) {
    const key = factor.join(' ');
    merged.set(key, { factor, multiplicity: multiplicity + (merged.get(key)?.multiplicity ?? 0) });
  }
  return [...merged.values()];
}

/** Whether both are of degree one; equal ones are no longer there. */
function areDistinctLines(f: IntegerPolynomial, g: IntegerPolynomial): boolean {
  return f.length === 2 && g.length === 2;
}
