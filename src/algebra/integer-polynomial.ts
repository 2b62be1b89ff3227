/**
 * Polynomials over the whole numbers, descending powers, no leading zero, zero is empty: what gcds, square-free factors and
 * roots are computed on. Rational polynomials enter as their primitive part, since a constant factor moves no root.
 */

import { absolute, greatestCommonDivisor } from './integer.ts';
import { overOneDenominator, type Polynomial } from './polynomial.ts';
import { rational } from './rational.ts';

export type IntegerPolynomial = readonly bigint[];

/** The whole-number multiple of p without a common factor, leading coefficient positive. */
export function primitiveOf(p: Polynomial): IntegerPolynomial {
  return primitivePart(overOneDenominator(p).numerators);
}

/** f divided by the gcd of its coefficients, leading coefficient made positive. */
export function primitivePart(f: IntegerPolynomial): IntegerPolynomial {
  const [leading] = f;
  if (leading === undefined) return f;
  let content = absolute(leading);
  for (let i = f.length - 1; i > 0 && content !== 1n; i--)
    content = greatestCommonDivisor(content, absolute(f[i] ?? 0n));
  if (leading < 0n) content = -content;
  return content === 1n ? f : f.map(coefficient => coefficient / content);
}

/** f over its leading coefficient. */
export function monicOf(f: IntegerPolynomial): Polynomial {
  const [leading] = f;
  if (leading === undefined) return [];
  return f.map(coefficient => rational(coefficient, leading));
}

/** df/ds. */
export function integerDerivative(f: IntegerPolynomial): IntegerPolynomial {
  const degree = f.length - 1;
  return f.slice(0, -1).map((coefficient, i) => coefficient * BigInt(degree - i));
}

/** f / g where g divides f over the whole numbers, else null; g is not zero. */
export function exactQuotient(f: IntegerPolynomial, g: IntegerPolynomial): IntegerPolynomial | null {
  const [leading] = g;
  if (leading === undefined) throw new RangeError('a division of a polynomial by zero');
  const steps = f.length - g.length + 1;
  if (steps <= 0) return f.length === 0 ? [] : null;
  if (!dividesEnds(f, g)) return null;
  const rest = [...f];
  const quotient: bigint[] = [];
  for (let i = 0; i < steps; i++) {
    const head = rest[i] ?? 0n;
    const factor = head / leading;
    if (factor * leading !== head) return null;
    quotient.push(factor);
    if (factor === 0n) continue;
    for (let j = 1; j < g.length; j++) rest[i + j] = (rest[i + j] ?? 0n) - factor * (g[j] ?? 0n);
  }
  return rest.slice(steps).every(coefficient => coefficient === 0n) ? quotient : null;
}

/** What a divisor must meet at once: its last coefficient divides that of f. */
function dividesEnds(f: IntegerPolynomial, g: IntegerPolynomial): boolean {
  const last = g[g.length - 1] ?? 0n;
  return last === 0n || (f[f.length - 1] ?? 0n) % last === 0n;
}
