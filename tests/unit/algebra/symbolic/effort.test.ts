import { describe, expect, test } from 'vitest';
import {
  createSymbolicField,
  Effort,
  EffortSpent,
  solveSymbolic,
  withinEffort,
} from '../../../../src/algebra/symbolic/index.ts';
import { powerOfPolynomial } from '../../../../src/algebra/symbolic/multiply.ts';
import { functionOf, polynomialOf } from '../../../arbitraries/symbolic.ts';

describe('the stated effort', () => {
  test('a polynomial of more terms than allowed stops the work', () => {
    const effort = new Effort({ maximumTerms: 100 });
    const outcome = withinEffort(() => powerOfPolynomial(polynomialOf('1 + a + b + c + d'), 8, effort));
    expect(outcome).toEqual({ finished: false, limit: 'terms' });
  });

  test('as many terms as allowed do not', () => {
    // Monomials of degree at most 3 in 2 variables: C(5, 2).
    const cube = (maximumTerms: number) => () =>
      powerOfPolynomial(polynomialOf('1 + a + b'), 3, new Effort({ maximumTerms }));
    expect(withinEffort(cube(10)).finished).toBe(true);
    expect(withinEffort(cube(9))).toEqual({ finished: false, limit: 'terms' });
  });

  test('operations are counted, and a spent effort stays spent', () => {
    const field = createSymbolicField({ maximumOperations: 1000 });
    const sum = functionOf('1 + a + b + c + d + e1');
    const outcome = withinEffort(() => field.power(sum, 30));
    expect(outcome).toEqual({ finished: false, limit: 'operations' });
    expect(field.effort.spent).toBeGreaterThan(1000);
    expect(withinEffort(() => field.multiply(sum, sum))).toEqual({ finished: false, limit: 'operations' });
  });

  test('long numbers count by their length', () => {
    const field = createSymbolicField();
    let square = functionOf('10');
    const outcome = withinEffort(() => {
      while (true) square = field.multiply(square, square);
    });
    expect(outcome).toEqual({ finished: false, limit: 'operations' });
  });

  test('a full system with every entry its own parameter stops instead of hanging', () => {
    const n = 7;
    const field = createSymbolicField();
    const matrix = Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j) => field.variable(`a${i}_${j}`)),
    );
    const rightSides = matrix.map((_, i) => [field.variable(`b${i}`)]);
    expect(withinEffort(() => solveSymbolic(matrix, rightSides, field.effort)).finished).toBe(false);
  });

  test('the same work stops at the same count', () => {
    const spentBy = () => {
      const effort = new Effort({ maximumOperations: 5000 });
      withinEffort(() => powerOfPolynomial(polynomialOf('1 + a + b + c'), 40, effort));
      return effort.spent;
    };
    expect(spentBy()).toBe(spentBy());
  });

  test('the value of finished work comes back and other exceptions pass', () => {
    expect(withinEffort(() => 7)).toEqual({ finished: true, value: 7 });
    const bug = () => {
      throw new RangeError('a bug');
    };
    expect(() => withinEffort(bug)).toThrow('a bug');
    expect(new EffortSpent('terms').limit).toBe('terms');
  });
});
