import { describe, expect, test } from 'vitest';
import { createSymbolicField, rationalFunction } from '../../../../src/algebra/symbolic/index.ts';
import { functionOf, polynomialOf } from '../../../arbitraries/symbolic.ts';

describe('rational functions', () => {
  test('common factors go, integers included', () => {
    const f = functionOf('(6*x^2 - 6)/(4*x - 4)');
    expect(f.numerator).toEqual(polynomialOf('3*x + 3'));
    expect(f.denominator).toEqual(polynomialOf('2'));
  });

  test('the denominator has a positive term of lowest degree in front', () => {
    expect(functionOf('K/(K - 1)').denominator).toEqual(polynomialOf('1 - K'));
    expect(functionOf('K/(K - 1)').numerator).toEqual(polynomialOf('-K'));
    expect(functionOf('1/(R2 - R1)').denominator).toEqual(polynomialOf('R1 - R2'));
    expect(functionOf('1/(-3)').denominator).toEqual(polynomialOf('3'));
  });

  test('equal functions are equal records however they came about', () => {
    expect(functionOf('(a^2 - b^2)/(a - b)')).toEqual(functionOf('a + b'));
    expect(functionOf('1/a + 1/b')).toEqual(functionOf('(a + b)/(a*b)'));
    expect(functionOf('x/x')).toEqual(functionOf('1'));
    expect(functionOf('x - x')).toEqual(functionOf('0'));
  });

  test('the sum of 1/((x + k)(x + k + 1)) telescopes', () => {
    const terms = Array.from({ length: 6 }, (_, k) => `1/((x + ${k})*(x + ${k + 1}))`);
    expect(functionOf(terms.join(' + '))).toEqual(functionOf('6/(x*(x + 6))'));
  });

  test("Lagrange's interpolation of 1 and of x² at three symbolic points is exact", () => {
    const weights = ['1/((a - b)*(a - c))', '1/((b - a)*(b - c))', '1/((c - a)*(c - b))'];
    expect(functionOf(weights.join(' + '))).toEqual(functionOf('0'));
    const squares = ['a', 'b', 'c'].map((name, k) => `${name}^2*${weights[k]}`);
    expect(functionOf(squares.join(' + '))).toEqual(functionOf('1'));
  });

  test("Black's closed-loop gain has no common factor left (Bell Syst. Tech. J. 13, 1934)", () => {
    const closed = functionOf('G/(1 + G*beta)');
    expect(closed.numerator).toEqual(polynomialOf('G'));
    expect(closed.denominator).toEqual(polynomialOf('1 + G*beta'));
    expect(functionOf('1/beta - 1/(beta*(1 + G*beta))')).toEqual(closed);
  });

  test('a sum over a common denominator cancels what it can', () => {
    expect(functionOf('a/(a + b) + b/(a + b)')).toEqual(functionOf('1'));
    expect(functionOf('1/(a*b) + 1/(a*c)')).toEqual(functionOf('(b + c)/(a*b*c)'));
    expect(functionOf('1/(2*a) + 1/(2*a)')).toEqual(functionOf('1/a'));
  });

  test('powers of either sign', () => {
    const field = createSymbolicField();
    const f = functionOf('(a - 1)/(b - 1)');
    expect(field.power(f, -3)).toEqual(functionOf('((b - 1)/(a - 1))^3'));
    expect(field.power(f, 0)).toEqual(field.one);
    expect(field.power(field.zero, 0)).toEqual(field.one);
  });

  test('of two pivots the shorter is the better, then the one of lower degree', () => {
    const field = createSymbolicField();
    expect(field.isBetterPivot(functionOf('K'), functionOf('K + 1'))).toBe(true);
    expect(field.isBetterPivot(functionOf('1'), functionOf('K'))).toBe(true);
    expect(field.isBetterPivot(functionOf('K'), functionOf('J'))).toBe(false);
  });

  test('division by zero is a bug that throws', () => {
    const field = createSymbolicField();
    expect(() => field.divide(field.one, field.zero)).toThrow('divided by zero');
    expect(() => rationalFunction(polynomialOf('a'), polynomialOf('0'), field.effort)).toThrow('denominator zero');
  });
});
