import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { rationalField } from '../../../../src/algebra/fields.ts';
import type { Rational } from '../../../../src/algebra/rational.ts';
import {
  createSymbolicField,
  evaluateAt,
  type RationalFunction,
  substitute,
} from '../../../../src/algebra/symbolic/index.ts';
import { SEED, shortRational } from '../../../arbitraries/rationals.ts';
import { anyFunction, NAMES, nonzeroFunction } from '../../../arbitraries/symbolic.ts';

const runs = { seed: SEED, numRuns: 60 };
const field = createSymbolicField({ maximumOperations: Number.POSITIVE_INFINITY });

/** A value for each name. */
const values: fc.Arbitrary<ReadonlyMap<string, Rational>> = fc
  .tuple(...NAMES.map(() => shortRational))
  .map(list => new Map(NAMES.map((name, k) => [name, list[k] ?? rationalField.one])));

const valueAt = (f: RationalFunction, point: ReadonlyMap<string, Rational>) =>
  evaluateAt(f, rationalField, name => point.get(name) ?? rationalField.zero);

describe('rational functions are a field', () => {
  test('sum and product commute', () => {
    fc.assert(
      fc.property(anyFunction, anyFunction, (f, g) => {
        expect(field.add(f, g)).toEqual(field.add(g, f));
        expect(field.multiply(f, g)).toEqual(field.multiply(g, f));
      }),
      runs,
    );
  });

  test('sum and product associate, and the product distributes', () => {
    fc.assert(
      fc.property(anyFunction, anyFunction, anyFunction, (f, g, h) => {
        expect(field.add(field.add(f, g), h)).toEqual(field.add(f, field.add(g, h)));
        expect(field.multiply(field.multiply(f, g), h)).toEqual(field.multiply(f, field.multiply(g, h)));
        expect(field.multiply(f, field.add(g, h))).toEqual(field.add(field.multiply(f, g), field.multiply(f, h)));
      }),
      { ...runs, numRuns: 40 },
    );
  });

  test('zero, one, negatives and inverses', () => {
    fc.assert(
      fc.property(nonzeroFunction, anyFunction, (f, g) => {
        expect(field.add(g, field.zero)).toEqual(g);
        expect(field.multiply(g, field.one)).toEqual(g);
        expect(field.subtract(g, g)).toEqual(field.zero);
        expect(field.add(g, field.negate(g))).toEqual(field.zero);
        expect(field.divide(field.multiply(f, g), f)).toEqual(g);
        expect(field.multiply(f, field.power(f, -1))).toEqual(field.one);
      }),
      runs,
    );
  });

  test('two functions are equal exactly where their difference is zero', () => {
    fc.assert(
      fc.property(anyFunction, anyFunction, (f, g) => {
        expect(field.equals(f, g)).toBe(field.isZero(field.subtract(f, g)));
      }),
      runs,
    );
  });

  test('evaluation turns the operations into those of the rationals', () => {
    fc.assert(
      fc.property(anyFunction, anyFunction, values, (f, g, point) => {
        const [a, b] = [valueAt(f, point), valueAt(g, point)];
        fc.pre(a !== null && b !== null);
        expect(valueAt(field.add(f, g), point)).toEqual(rationalField.add(a, b));
        expect(valueAt(field.multiply(f, g), point)).toEqual(rationalField.multiply(a, b));
        if (!rationalField.isZero(b)) expect(valueAt(field.divide(f, g), point)).toEqual(rationalField.divide(a, b));
      }),
      { ...runs, numRuns: 100 },
    );
  });

  test('substitution and evaluation meet: f at g(point) is f with g put in, at the point', () => {
    fc.assert(
      fc.property(anyFunction, anyFunction, values, (f, g, point) => {
        const inner = valueAt(g, point);
        fc.pre(inner !== null);
        const direct = valueAt(f, new Map([...point, ['J', inner]]));
        const replaced = substitute(f, new Map([['J', g]]), field);
        fc.pre(direct !== null && replaced !== null && valueAt(replaced, point) !== null);
        expect(replaced === null ? null : valueAt(replaced, point)).toEqual(direct);
      }),
      runs,
    );
  });
});
