import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, test, vi } from 'vitest';
import {
  addRationals,
  multiplyRationals,
  type Rational,
  rationalField,
  toDouble,
  toFraction,
  ZERO,
} from '../../../src/algebra/index.ts';
import {
  type Expression,
  evaluateExpression,
  evaluateIn,
  evaluateParameters,
  evaluatePolynomial,
  evaluatePolynomialIn,
  evaluateQuantity,
  parseExpression,
  print,
  renameIn,
  type Scope,
  type Value,
} from '../../../src/expression/index.ts';
import {
  anyExpression,
  arithmeticExpression,
  NAMES,
  polynomialText,
  tokenText,
} from '../../arbitraries/expressions.ts';
import { SEED, shortRational } from '../../arbitraries/rationals.ts';
import { valueOf } from '../../unit/results.ts';

vi.setConfig({ testTimeout: 60_000 }); // many small runs, on a machine that may be busy

const scopeOf = (values: readonly Rational[]): Scope =>
  new Map(NAMES.map((name, i) => [name, toValue(values[i] ?? ZERO)]));
const toValue = (exact: Rational): Value => ({ exact, double: toDouble(exact) });

const anyScope = fc.array(shortRational, { minLength: NAMES.length, maxLength: NAMES.length }).map(scopeOf);

/**
 * A general-purpose library's own parser and evaluator over its exact fractions: nothing of ours but the text goes in. `mod` is an
 * operator there, so that the name is spelt otherwise.
 */
const reference = create(all ?? {}, { number: 'Fraction' });

function referenceValue(expression: Expression, scope: Scope): string | null {
  const given = Object.fromEntries(
    [...scope].map(([name, { exact }]) => [
      name === 'mod' ? 'modulus' : name,
      reference.fraction(toFraction(exact ?? ZERO)),
    ]),
  );
  try {
    const value: unknown = reference.evaluate(renameIn(print(expression), 'mod', 'modulus'), given);
    return reference.typeOf(value) === 'Fraction' ? String(reference.format(value, { fraction: 'ratio' })) : null;
  } catch {
    return null;
  }
}

describe('evaluation', () => {
  test('agrees with a general-purpose library on + − · / and whole powers, digit for digit', () => {
    let compared = 0;
    fc.assert(
      fc.property(arithmeticExpression, anyScope, (expression, scope) => {
        const ours = evaluateExpression(expression, scope);
        const theirs = referenceValue(expression, scope);
        if (!ours.ok) {
          expect(ours.problems[0]?.code).toBe('division-by-zero');
          expect(theirs).toBeNull();
          return;
        }
        if (theirs === null) return; // their division by zero is not always where ours is: 0/0^0
        compared += 1;
        const exact = ours.value.exact ?? ZERO;
        expect(`${exact.n}/${exact.d}`).toBe(theirs);
      }),
      { seed: SEED, numRuns: 500 },
    );
    expect(compared).toBeGreaterThan(250);
  });

  test('gives the nearest double of what is exact', () => {
    fc.assert(
      fc.property(arithmeticExpression, anyScope, (expression, scope) => {
        const value = evaluateExpression(expression, scope);
        if (value.ok) expect(value.value.double).toBe(toDouble(value.value.exact ?? ZERO));
      }),
      { seed: SEED, numRuns: 200 },
    );
  });

  test('never throws, and is exact, finite or refused', () => {
    fc.assert(
      fc.property(fc.oneof(anyExpression.map(print), tokenText), anyScope, (text, scope) => {
        const value = evaluateQuantity(text, scope);
        if (value.ok) expect(Number.isFinite(value.value.double)).toBe(true);
        else for (const { message } of value.problems) expect(message).toMatch(/^[^\p{Cc}]+[.?]$/u);
        evaluatePolynomial(text, scope);
      }),
      { seed: SEED, numRuns: 2000 },
    );
  });

  test('over the field of fractions is the same', () => {
    fc.assert(
      fc.property(arithmeticExpression, anyScope, (expression, scope) => {
        const value = evaluateExpression(expression, scope);
        const element = evaluateIn(expression, rationalField, name => scope.get(name)?.exact ?? null);
        expect(element).toEqual(value.ok ? value.value.exact : null);
      }),
      { seed: SEED, numRuns: 500 },
    );
  });

  test('is left alone by renaming a parameter', () => {
    fc.assert(
      fc.property(anyExpression, anyScope, fc.constantFrom(...NAMES), (expression, scope, name) => {
        const text = print(expression);
        const renamedScope = new Map([...scope].map(([key, value]) => [key === name ? 'fresh' : key, value]));
        const [before, after] = [
          evaluateQuantity(text, scope),
          evaluateQuantity(renameIn(text, name, 'fresh'), renamedScope),
        ];
        expect(after.ok).toBe(before.ok);
        if (before.ok) expect(after).toEqual(before);
      }),
      { seed: SEED, numRuns: 500 },
    );
  });
});

describe('a polynomial', () => {
  const horner = (coefficients: readonly Rational[], x: Rational) =>
    coefficients.reduce((sum, c) => addRationals(multiplyRationals(sum, x), c), ZERO);

  test('has the value of its text at every point', () => {
    fc.assert(
      fc.property(polynomialText, shortRational, shortRational, (text, a, point) => {
        const scope = new Map([['a', toValue(a)]]);
        const coefficients = valueOf(evaluatePolynomial(text, scope)).map(({ exact }) => exact ?? ZERO);
        const atPoint = new Map([...scope, ['x', toValue(point)]]);
        const expected = valueOf(evaluateQuantity(renameIn(text, 's', 'x'), atPoint)).exact;
        expect(horner(coefficients, point)).toEqual(expected);
        expect(coefficients[0]).not.toEqual(ZERO);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('over the field of fractions is the same, with its written degree', () => {
    fc.assert(
      fc.property(polynomialText, shortRational, (text, a) => {
        const inField = evaluatePolynomialIn(valueOf(parseExpression(text)), rationalField, name =>
          name === 'a' ? a : null,
        );
        const values = valueOf(evaluatePolynomial(text, new Map([['a', toValue(a)]])));
        const leading = inField?.findIndex(({ n }) => n !== 0n) ?? 0;
        expect(leading < 0 ? [] : inField?.slice(leading)).toEqual(values.map(({ exact }) => exact));
      }),
      { seed: SEED, numRuns: 200 },
    );
  });
});

test('parameters have the same values in any order', () => {
  const chained = fc.array(fc.tuple(shortRational, fc.nat(), fc.nat()), { minLength: 1, maxLength: 12 }).map(recipe =>
    recipe.map(([constant, first, second], i) => {
      const uses = i === 0 ? [] : [`p${first % i}`, `p${second % i}`];
      return { name: `p${i}`, value: [`(${toFraction(constant)})`, ...uses].join(' + ') };
    }),
  );
  fc.assert(
    fc.property(chained, fc.infiniteStream(fc.nat()), (parameters, picks) => {
      const shuffled = [...parameters];
      for (let i = shuffled.length - 1; i > 0; i--) {
        const j = (picks.next().value ?? 0) % (i + 1);
        const [a, b] = [shuffled[i], shuffled[j]];
        if (a !== undefined && b !== undefined) [shuffled[i], shuffled[j]] = [b, a];
      }
      const [expected, found] = [valueOf(evaluateParameters(parameters)), valueOf(evaluateParameters(shuffled))];
      for (const [name, value] of expected) expect(found.get(name)).toEqual(value);
      expect([...found.keys()]).toEqual(shuffled.map(({ name }) => name));
    }),
    { seed: SEED, numRuns: 200 },
  );
});
