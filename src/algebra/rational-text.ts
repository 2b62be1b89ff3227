/**
 * Rationals from and to text. A decimal is read from its digits, never guessed from a JavaScript number: `0.1` is one tenth.
 * What a text may cost is bounded here.
 */

import { ONE, type Rational, rational, ZERO } from './rational.ts';

/**
 * Largest power of ten that is read. A finite double ends at 1.8e308 and its last subnormal digit stands near 1e-324, so
 * ±400 leaves room for what cancels on the way and keeps a short text from filling the memory.
 */
const LARGEST_EXPONENT = 400;

/** Digits in front of and behind the point that are read; the exponent comes on top. */
const MOST_DIGITS = 10_000;

const DECIMAL = /^([+-]?)(\d*)(?:\.(\d*))?(?:[eE]([+-]?\d+))?$/;
const FRACTION = /^([+-]?\d+)\/(\d+)$/;

/**
 * The rational that a decimal (`0.1`, `-12.50`, `.5`), a number in scientific notation (`1e-3`) or a fraction of whole
 * numbers (`-5/16`) says, exactly.
 *
 * @returns null where the text is none of these, the fraction's denominator is zero, the exponent is beyond ±400 or there
 * are more than 10,000 digits. Spaces are not allowed.
 */
export function parseRational(text: string): Rational | null {
  if (text.length > MOST_DIGITS) return null;
  const fraction = FRACTION.exec(text);
  if (fraction !== null) {
    const denominator = BigInt(fraction[2] ?? '0');
    return denominator === 0n ? null : rational(BigInt((fraction[1] ?? '').replace('+', '')), denominator);
  }
  const decimal = DECIMAL.exec(text);
  return decimal === null
    ? null
    : fromDigits(decimal[1] === '-', decimal[2] ?? '', decimal[3] ?? '', decimal[4] ?? '0');
}

function fromDigits(negative: boolean, whole: string, decimals: string, exponent: string): Rational | null {
  if (whole === '' && decimals === '') return null;
  const power = Number(exponent);
  if (Math.abs(power) > LARGEST_EXPONENT) return null;
  const digits = BigInt(whole + decimals);
  if (digits === 0n) return ZERO;
  if (digits === 1n && decimals === '' && power === 0 && !negative) return ONE;
  const signed = negative ? -digits : digits;
  const shift = power - decimals.length;
  return shift >= 0 ? rational(signed * 10n ** BigInt(shift)) : rational(signed, 10n ** BigInt(-shift));
}

/** `-5/16`, or `3` where the denominator is one. */
export function toFraction(value: Rational): string {
  return value.d === 1n ? value.n.toString() : `${value.n}/${value.d}`;
}
