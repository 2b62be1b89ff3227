/** The decimal digits of a number, rounded once. The only arithmetic behind the figures on the screen. */

import type { Rational } from '../../algebra/index.ts';

/** Exact, or a double that stands for the shortest decimal that rounds to it. */
export type Real = number | Rational;

/** ± d₁.d₂d₃… × 10^power. */
export interface RoundedDigits {
  readonly isNegative: boolean;
  /** As many as asked for; all zeros for zero. */
  readonly digits: string;
  /** Power of ten of the first digit, 0 for zero. */
  readonly power: number;
  readonly isRounded: boolean;
}

/** The first `count` digits of a finite `value`, halves away from zero; exact rationals are rounded exactly. */
export function roundedDigits(value: Real, count: number): RoundedDigits {
  return typeof value === 'number' ? digitsOfDouble(value, count) : digitsOfRational(value, count);
}

function digitsOfDouble(value: number, count: number): RoundedDigits {
  // ECMA-262, Number.prototype.toExponential: the nearest, the larger of two equally near.
  const text = Math.abs(value).toExponential(count - 1);
  const at = text.indexOf('e');
  return {
    isNegative: value < 0,
    digits: text.slice(0, at).replace('.', ''),
    power: Number(text.slice(at + 1)),
    isRounded: Number(text) !== Math.abs(value),
  };
}

function digitsOfRational({ n, d }: Rational, count: number): RoundedDigits {
  if (n === 0n) return { isNegative: false, digits: '0'.repeat(count), power: 0, isRounded: false };
  const isNegative = n < 0n;
  const magnitude = isNegative ? -n : n;
  let power = firstPower(magnitude, d);
  const shift = count - 1 - power;
  const numerator = shift > 0 ? magnitude * 10n ** BigInt(shift) : magnitude;
  const denominator = shift < 0 ? d * 10n ** BigInt(-shift) : d;
  const rest = numerator % denominator;
  let digits = (numerator / denominator + (2n * rest >= denominator ? 1n : 0n)).toString();
  if (digits.length > count) {
    // 9.99… went up to 10.
    digits = digits.slice(0, count);
    power += 1;
  }
  return { isNegative, digits, power, isRounded: rest !== 0n };
}

/** The power p with 10^p ≤ n / d < 10^(p + 1); both positive. */
function firstPower(n: bigint, d: bigint): number {
  const guess = n.toString().length - d.toString().length;
  const isBelow = guess >= 0 ? n < d * 10n ** BigInt(guess) : n * 10n ** BigInt(-guess) < d;
  return isBelow ? guess - 1 : guess;
}
