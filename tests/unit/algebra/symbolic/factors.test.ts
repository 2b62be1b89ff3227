import { describe, expect, test } from 'vitest';
import { Effort } from '../../../../src/algebra/symbolic/effort.ts';
import { contentFactors, factorsOf } from '../../../../src/algebra/symbolic/factors.ts';
import { polynomialOf } from '../../../arbitraries/symbolic.ts';

/** The polynomial factors of a text as [factor, multiplicity] pairs, in the order found. */
function polynomialsOf(text: string, known: string[] = []): unknown[] {
  const { polynomials } = factorsOf(polynomialOf(text), known.map(polynomialOf), new Effort());
  return polynomials.map(({ polynomial, multiplicity }) => [polynomial, multiplicity]);
}

const expected = (...factors: [string, number][]) =>
  expect.arrayContaining(factors.map(([text, multiplicity]) => [polynomialOf(text), multiplicity]));

describe('factors for print', () => {
  test('number, sign and parameters come out first', () => {
    expect(contentFactors(polynomialOf('-6*a^2*b + 9*a*b*c'))).toEqual({
      // Of two terms of one degree the first by name carries the sign: 2*a - 3*c.
      sign: -1,
      integer: 3n,
      monomial: [
        { name: 'a', exponent: 1 },
        { name: 'b', exponent: 1 },
      ],
      polynomials: [{ polynomial: polynomialOf('2*a - 3*c'), multiplicity: 1 }],
    });
  });

  test.each<[string, [string, number][]]>([
    [
      '(1 + a*b)*(1 + c*d)',
      [
        ['1 + a*b', 1],
        ['1 + c*d', 1],
      ],
    ],
    [
      '(1 + a)^3*(1 + b)',
      [
        ['1 + a', 3],
        ['1 + b', 1],
      ],
    ],
    [
      '(a^2 + b^2)^2*(a^2 + 2*b^2)',
      [
        ['a^2 + b^2', 2],
        ['a^2 + 2*b^2', 1],
      ],
    ],
    [
      '(a + b)*(a + c)*(b + c)',
      [
        ['a + b', 1],
        ['a + c', 1],
        ['b + c', 1],
      ],
    ],
  ])('%s falls apart', (text, factors) => {
    const found = polynomialsOf(text);
    expect(found).toHaveLength(factors.length);
    expect(found).toEqual(expected(...factors));
  });

  test('a difference of squares stays whole unless a factor is known', () => {
    expect(polynomialsOf('a^2 - b^2')).toEqual([[polynomialOf('a^2 - b^2'), 1]]);
    expect(polynomialsOf('a^2 - b^2', ['5*(b - a)*c'])).toEqual(expected(['a - b', 1], ['a + b', 1]));
  });

  test('a number has no polynomial factors', () => {
    expect(factorsOf(polynomialOf('-12'), [], new Effort())).toEqual({
      sign: -1,
      integer: 12n,
      monomial: [],
      polynomials: [],
    });
  });
});
