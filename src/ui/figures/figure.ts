/**
 * A number as the screen writes it: rounded once, to a stated count of significant digits, from the exact value where
 * there is one. Nothing here knows a locale; the same value gives the same text everywhere.
 */

import { type Real, roundedDigits } from './rounded-digits.ts';

/** A number taken apart: −12.3 × 10⁻⁶ is { isNegative, mantissa: '12.3', exponent: −6 }. */
export interface Figure {
  readonly isNegative: boolean;
  /** Digits with at most one decimal point, or `∞`. */
  readonly mantissa: string;
  /** A multiple of three, or null where the number is written out. */
  readonly exponent: number | null;
  /** Whether digits were lost; the trailing zeros of a rounded number are kept, those of an exact one dropped. */
  readonly isRounded: boolean;
}

/** As many digits as a measured quantity ever carries in a drawing, and few enough for a table. */
export const USUAL_DIGITS = 6;

/** Powers of ten of the first digit between which a number is written out: 0.0001 to 999,999. */
const LEAST_WRITTEN_OUT = -4;
const LARGEST_WRITTEN_OUT = 5;

/**
 * `value` to `significant` digits (1 to 17), halves away from zero. Beyond 0.0001 … 999,999 the exponent is a multiple of
 * three; a rounded number never shows a digit that was not computed, so 123,456 to two digits is 0.12 × 10⁶.
 *
 * @param zeros `kept` fills up to `significant` digits even where the value is exact (a column of equal precision).
 */
export function figureOf(
  value: Real,
  significant: number = USUAL_DIGITS,
  zeros: 'where-rounded' | 'kept' = 'where-rounded',
): Figure {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    if (Number.isNaN(value)) throw new RangeError('a figure of no number');
    return { isNegative: value < 0, mantissa: '∞', exponent: null, isRounded: false };
  }
  const { isNegative, digits, power, isRounded } = roundedDigits(value, significant);
  const keepsZeros = isRounded || zeros === 'kept';
  const shown = keepsZeros ? digits : digits.replace(/0+$/, '') || '0';
  const exponent = exponentFor(power, shown.length, keepsZeros);
  return { isNegative, mantissa: placePoint(shown, power - (exponent ?? 0)), exponent, isRounded };
}

/** The exponent to write beside `count` digits whose first stands for 10^power; null where the number is written out. */
function exponentFor(power: number, count: number, isBare: boolean): number | null {
  const fits = isBare ? power < count : true;
  if (power >= LEAST_WRITTEN_OUT && power <= LARGEST_WRITTEN_OUT && fits) return null;
  const exponent = 3 * Math.floor(power / 3);
  return isBare && power - exponent >= count ? exponent + 3 : exponent;
}

/** `digits` with the first one standing for 10^power. */
function placePoint(digits: string, power: number): string {
  if (power < 0) return `0.${'0'.repeat(-power - 1)}${digits}`;
  const whole = digits.slice(0, power + 1).padEnd(power + 1, '0');
  const decimals = digits.slice(power + 1);
  return decimals === '' ? whole : `${whole}.${decimals}`;
}

/** How many digits of `value` are right when it is off by at most `error`: 0 where not even the first is. */
export function rightDigits(value: number, error: number, most: number = 17): number {
  if (error <= 0) return most;
  if (value === 0 || error >= Math.abs(value)) return 0;
  // The last digit stands for 10^(power + 1 − count); the error may reach half of that.
  const power = Math.floor(Math.log10(Math.abs(value)));
  return Math.max(0, Math.min(most, Math.floor(power + 1 - Math.log10(2 * error))));
}
