import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  compareRationals,
  multiplyRationals,
  parseRational,
  type Rational,
  rational,
  rationalFromDouble,
  subtractRationals,
  ZERO,
} from '../../../../src/algebra/index.ts';
import { type Figure, figureOf, formatPadded } from '../../../../src/ui/figures/index.ts';
import { anyRational, SEED } from '../../../arbitraries/rationals.ts';

const options = { seed: SEED, numRuns: 500 };
const digits = fc.integer({ min: 1, max: 17 });

/** What a figure says, and half of what its last digit stands for. */
function meaning({ isNegative, mantissa, exponent }: Figure): { value: Rational; half: Rational } {
  const scale = powerOfTen(exponent ?? 0);
  const magnitude = multiplyRationals(parseRational(mantissa) ?? ZERO, scale);
  const decimals = mantissa.includes('.') ? mantissa.length - mantissa.indexOf('.') - 1 : 0;
  const half = multiplyRationals(multiplyRationals(powerOfTen(-decimals), scale), rational(1n, 2n));
  return { value: isNegative ? subtractRationals(ZERO, magnitude) : magnitude, half };
}

function powerOfTen(power: number): Rational {
  return power < 0 ? rational(1n, 10n ** BigInt(-power)) : rational(10n ** BigInt(power));
}

function magnitude(value: Rational): Rational {
  return value.n < 0n ? subtractRationals(ZERO, value) : value;
}

test('a figure is off by at most half of its last digit, and exact where it says so', () => {
  fc.assert(
    fc.property(anyRational, digits, (value, significant) => {
      const figure = figureOf(value, significant);
      const { value: shown, half } = meaning(figure);
      const error = magnitude(subtractRationals(shown, value));
      expect(error.n === 0n).toBe(!figure.isRounded);
      expect(compareRationals(error, half)).toBeLessThanOrEqual(0);
    }),
    options,
  );
});

test('a rounded figure has exactly as many significant digits as asked for', () => {
  fc.assert(
    fc.property(anyRational, digits, (value, significant) => {
      const figure = figureOf(value, significant);
      const count = figure.mantissa.replace('.', '').replace(/^0+/, '').length;
      if (figure.isRounded) expect(count).toBe(significant);
      else expect(figure.mantissa).not.toMatch(/\..*0$/);
    }),
    options,
  );
});

test('a double and the rational that it is have the same digits', () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), digits, (value, significant) => {
      expect(formatPadded(rationalFromDouble(value), significant)).toBe(formatPadded(value, significant));
    }),
    options,
  );
});
