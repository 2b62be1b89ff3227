/**
 * Polynomials modulo a prime below 2²⁵, as doubles: images of exact polynomials, by which gcds are first probed and then
 * put together. Descending powers, no leading zero; zero is empty.
 */

import type { IntegerPolynomial } from '../integer-polynomial.ts';
import { inverseModulo, reduce, residue } from './primes.ts';

export type ModularPolynomial = Float64Array;

/** The image of f modulo p, leading zeros dropped. */
export function imageModulo(f: IntegerPolynomial, p: number): ModularPolynomial {
  return trimmed(Float64Array.from(f, coefficient => residue(coefficient, p)));
}

function trimmed(f: Float64Array): ModularPolynomial {
  let first = 0;
  while (first < f.length && f[first] === 0) first++;
  return first === 0 ? f : f.subarray(first);
}

/** Monic gcd of f and g modulo p, not both zero (Euclid). O(deg f · deg g). */
export function modularGcd(f: ModularPolynomial, g: ModularPolynomial, p: number): ModularPolynomial {
  let a: ModularPolynomial = f.length >= g.length ? f.slice() : g.slice();
  let b: ModularPolynomial = f.length >= g.length ? g.slice() : f.slice();
  while (b.length > 0) [a, b] = [b, remainderInPlace(a, makeMonic(b, p), p)];
  return makeMonic(a, p);
}

/** Divides f by its leading coefficient, in place. */
function makeMonic(f: Float64Array, p: number): Float64Array {
  const leading = f[0]!;
  if (leading === 1) return f;
  const factor = inverseModulo(leading, p);
  const inverse = 1 / p;
  for (let i = 0; i < f.length; i++) f[i] = reduce(f[i]! * factor, p, inverse);
  return f;
}

/** f mod g for monic g; overwrites f. */
function remainderInPlace(f: Float64Array, g: Float64Array, p: number): ModularPolynomial {
  const inverse = 1 / p;
  const steps = f.length - g.length + 1;
  for (let i = 0; i < steps; i++) {
    const head = f[i]!;
    if (head === 0) continue;
    const factor = p - head;
    for (let j = 1; j < g.length; j++) f[i + j] = reduce(f[i + j]! + factor * g[j]!, p, inverse);
  }
  return trimmed(f.subarray(Math.max(0, steps)));
}
