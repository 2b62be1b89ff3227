import { describe, expect, test } from 'vitest';
import { Effort } from '../../../../src/algebra/symbolic/effort.ts';
import { multiplyPolynomials } from '../../../../src/algebra/symbolic/multiply.ts';
import { divisorDegreeBounds, isProvenIrreducible } from '../../../../src/algebra/symbolic/probe.ts';
import { polynomialOf } from '../../../arbitraries/symbolic.ts';

const bounds = (a: string, b: string, variables: string[]) =>
  divisorDegreeBounds(polynomialOf(a), variables, new Effort())(polynomialOf(b));

describe('degree bounds of a common divisor', () => {
  test('are its degrees where there is one', () => {
    expect(bounds('(x^2 + y)*(x + z)', '(x^2 + y)*(y + z)', ['x', 'y', 'z'])).toEqual([2, 1, 0]);
  });

  test('are all zero for coprime polynomials', () => {
    expect(bounds('1 + x*y', '1 + x + y', ['x', 'y'])).toEqual([0, 0]);
    expect(bounds('1 + x', '1 + y', ['x', 'y'])).toEqual([0, 0]);
  });

  test('stay at the lower degree where every leading coefficient vanishes modulo the prime', () => {
    expect(bounds('67108859*x + 1', '67108859*x^2 + 1', ['x'])).toEqual([1]);
  });

  test('one polynomial serves for several others', () => {
    const against = divisorDegreeBounds(polynomialOf('(1 + a)*(1 + b)'), ['a', 'b', 'c'], new Effort());
    expect(against(polynomialOf('1 + a'))).toEqual([1, 0, 0]);
    expect(against(polynomialOf('(1 + b)*c'))).toEqual([0, 1, 0]);
    expect(against(polynomialOf('c + 2'))).toEqual([0, 0, 0]);
  });
});

describe('a proof of irreducibility', () => {
  test('succeeds for a loop determinant, of two loops that touch', () => {
    expect(isProvenIrreducible(polynomialOf('1 - a*b - b*c + d'), new Effort())).toBe(true);
    expect(isProvenIrreducible(polynomialOf('1 + K1*K2*K3'), new Effort())).toBe(true);
    expect(isProvenIrreducible(polynomialOf('2 + K'), new Effort())).toBe(true);
  });

  test('never succeeds for a product of sums without a common variable', () => {
    const sums = ['1 + a', '2 - b*c', 'd + e1', '1 + f - 3*g + f*g', '5*h - 7*k*l + k'].map(polynomialOf);
    for (const left of sums) {
      for (const right of sums) {
        if (left === right) continue;
        expect(isProvenIrreducible(multiplyPolynomials(left, right, new Effort()), new Effort())).toBe(false);
      }
    }
  });
});
