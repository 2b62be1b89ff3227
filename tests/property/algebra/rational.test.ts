import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addRationals,
  compareRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  ONE,
  parseRational,
  type Rational,
  rational,
  rationalFromDouble,
  subtractRationals,
  toDouble,
  toFraction,
  ZERO,
} from '../../../src/algebra/index.ts';
import { anyRational, nonzeroRational, SEED } from '../../arbitraries/rationals.ts';

const options = { seed: SEED, numRuns: 500 };

/** Euclid once more, so that lowest terms are not checked by the code that makes them. */
function isLowestTerms({ n, d }: Rational): boolean {
  let [a, b] = [n < 0n ? -n : n, d];
  while (b !== 0n) [a, b] = [b, a % b];
  return d > 0n && a === 1n;
}

describe('rational arithmetic', () => {
  test('sums, differences, products and quotients equal the textbook formulas and are in lowest terms', () => {
    fc.assert(
      fc.property(anyRational, nonzeroRational, (a, b) => {
        const cases: [Rational, bigint, bigint][] = [
          [addRationals(a, b), a.n * b.d + b.n * a.d, a.d * b.d],
          [subtractRationals(a, b), a.n * b.d - b.n * a.d, a.d * b.d],
          [multiplyRationals(a, b), a.n * b.n, a.d * b.d],
          [divideRationals(a, b), a.n * b.d, a.d * b.n],
        ];
        for (const [value, n, d] of cases) {
          expect(value.n * d).toBe(n * value.d);
          expect(isLowestTerms(value)).toBe(true);
        }
      }),
      options,
    );
  });

  test('the laws of a field hold', () => {
    fc.assert(
      fc.property(anyRational, anyRational, nonzeroRational, (a, b, c) => {
        expect(addRationals(a, addRationals(b, c))).toEqual(addRationals(addRationals(a, b), c));
        expect(multiplyRationals(c, addRationals(a, b))).toEqual(
          addRationals(multiplyRationals(c, a), multiplyRationals(c, b)),
        );
        expect(addRationals(a, negateRational(a))).toEqual(ZERO);
        expect(divideRationals(c, c)).toEqual(ONE);
        expect(multiplyRationals(divideRationals(a, c), c)).toEqual(a);
      }),
      options,
    );
  });

  test('comparison agrees with the sign of the difference', () => {
    fc.assert(
      fc.property(anyRational, anyRational, (a, b) => {
        const { n } = subtractRationals(a, b);
        expect(compareRationals(a, b)).toBe(n < 0n ? -1 : n > 0n ? 1 : 0);
      }),
      options,
    );
  });
});

describe('text', () => {
  test('a rational printed and read back is the same', () => {
    fc.assert(
      fc.property(anyRational, value => {
        expect(parseRational(toFraction(value))).toEqual(value);
      }),
      options,
    );
  });

  test('the nearest double of a decimal is the one that the language itself reads (ECMA-262, StringToNumber)', () => {
    const digits = fc.stringMatching(/^[0-9]{1,25}$/);
    fc.assert(
      fc.property(digits, digits, fc.integer({ min: -345, max: 310 }), (whole, decimals, exponent) => {
        const text = `${whole}.${decimals}e${exponent}`;
        const value = parseRational(text);
        expect(value === null ? null : toDouble(value)).toBe(Number(text));
      }),
      { ...options, numRuns: 3000 },
    );
  });
});

describe('doubles', () => {
  const finite = fc.double({ noNaN: true, noDefaultInfinity: true }).map(x => x + 0);

  test('the exact value of a double rounds back to it', () => {
    fc.assert(
      fc.property(finite, x => {
        const value = rationalFromDouble(x);
        expect(isLowestTerms(value)).toBe(true);
        expect(toDouble(value)).toBe(x === 0 ? 0 : x);
      }),
      { ...options, numRuns: 3000 },
    );
  });

  test('the midpoint of two neighbouring doubles goes to the even one and anything beside it to the nearer', () => {
    const bits = new DataView(new ArrayBuffer(8));
    const positive = fc.bigInt({ min: 0n, max: 0x7feffffffffffffen });
    const fromBits = (value: bigint): number => {
      bits.setBigUint64(0, value);
      return bits.getFloat64(0);
    };
    fc.assert(
      fc.property(positive, fc.integer({ min: 1, max: 2000 }), (lower, depth) => {
        const low = fromBits(lower);
        const high = fromBits(lower + 1n);
        const middle = divideRationals(addRationals(rationalFromDouble(low), rationalFromDouble(high)), rational(2n));
        const sliver = rational(1n, 2n ** BigInt(1080 + depth));
        expect(toDouble(middle)).toBe(lower % 2n === 0n ? low : high);
        expect(toDouble(addRationals(middle, sliver))).toBe(high);
        expect(toDouble(subtractRationals(middle, sliver))).toBe(low);
        expect(toDouble(negateRational(addRationals(middle, sliver)))).toBe(0 - high);
      }),
      { ...options, numRuns: 2000 },
    );
  });
});
