/**
 * Exact polynomials on the imaginary axis: p(jω) = even(x) + jω odd(x) with x = ω². Magnitudes and the real and imaginary parts
 * of a quotient become polynomials in x, whose positive roots are crossovers.
 */

import {
  addPolynomials,
  multiplyPolynomials,
  negateRational,
  ONE,
  type Polynomial,
  polynomial,
  subtractPolynomials,
  ZERO,
} from '../algebra/index.ts';
import { rootsOf } from './poles.ts';

interface AxisParts {
  readonly even: Polynomial;
  readonly odd: Polynomial;
}

const X: Polynomial = [ONE, ZERO];

function axisParts(p: Polynomial): AxisParts {
  const degree = p.length - 1;
  const take = (parity: number) =>
    polynomial(
      p.flatMap((coefficient, i) => {
        const power = degree - i;
        if (power % 2 !== parity) return [];
        return [((power - parity) / 2) % 2 === 0 ? coefficient : negateRational(coefficient)];
      }),
    );
  return { even: take(0), odd: take(1) };
}

/** |p(jω)|² in x = ω². */
export function squaredMagnitude(p: Polynomial): Polynomial {
  const { even, odd } = axisParts(p);
  return addPolynomials(multiplyPolynomials(even, even), multiplyPolynomials(X, multiplyPolynomials(odd, odd)));
}

/** Im(N(jω) conj D(jω)) / ω in x = ω²; its sign is that of the imaginary part of N/D at ω > 0. */
export function imaginaryPart(numerator: Polynomial, denominator: Polynomial): Polynomial {
  const [n, d] = [axisParts(numerator), axisParts(denominator)];
  return subtractPolynomials(multiplyPolynomials(n.odd, d.even), multiplyPolynomials(n.even, d.odd));
}

/** The ω > 0 at which a polynomial in x = ω² is zero, ascending, each once; null where its roots could not be separated. */
export function positiveFrequencies(inSquare: Polynomial): readonly number[] | null {
  const roots = rootsOf(inSquare);
  if (roots === null) return null;
  return roots
    .filter(({ re, im }) => im === 0 && re > 0)
    .map(({ re }) => Math.sqrt(re))
    .reverse();
}
