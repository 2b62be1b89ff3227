/** Figures as text: numbers, fractions and units with the real minus sign and raised exponents. */

import type { Rational } from '../../algebra/index.ts';
import { type Figure, figureOf } from './figure.ts';
import type { Real } from './rounded-digits.ts';

/** U+2212; a hyphen is no minus. */
export const MINUS = '−';

const RAISED: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};
const LEVEL: Readonly<Record<string, string>> = Object.fromEntries(
  Object.entries(RAISED).map(([level, raised]) => [raised, level === '-' ? MINUS : level]),
);

/** `−12.3×10⁻⁶`: a whole number raised. */
export function raised(value: number): string {
  return String(value).replace(/[-\d]/g, character => RAISED[character] ?? character);
}

/** `−0.3543`, `1.2×10⁻⁶`. */
export function figureText(figure: Figure): string {
  const sign = figure.isNegative ? MINUS : '';
  return figure.exponent === null ? sign + figure.mantissa : `${sign}${figure.mantissa}×10${raised(figure.exponent)}`;
}

/** `value` to `significant` digits as figureOf rounds it, as text. */
export function formatNumber(value: Real, significant?: number): string {
  return figureText(figureOf(value, significant));
}

/** `value` with exactly `significant` digits, trailing zeros kept: `1.000`. */
export function formatPadded(value: Real, significant: number): string {
  return figureText(figureOf(value, significant, 'kept'));
}

/** `−5/16`, or `3` where the denominator is one. */
export function formatFraction({ n, d }: Rational): string {
  const magnitude = n < 0n ? `${MINUS}${-n}` : `${n}`;
  return d === 1n ? magnitude : `${magnitude}/${d}`;
}

/** A unit as printed: `kg*m^2` is `kg·m²`, `s^-1` is `s⁻¹`. */
export function formatUnit(unit: string): string {
  return unit.replace(/\^\(?(-?\d+)\)?/g, (_, power: string) => raised(Number(power))).replaceAll('*', '·');
}

/** A stretch of text at one height. */
export interface TextRun {
  readonly text: string;
  readonly isRaised: boolean;
}

/**
 * `text` cut where it goes up and down, raised characters as plain ones (`⁻⁶` is `−6`, raised): text faces rarely hold all
 * raised digits in one style.
 */
export function raisedRuns(text: string): readonly TextRun[] {
  const runs: TextRun[] = [];
  for (const character of text) {
    const level = LEVEL[character];
    const last = runs.at(-1);
    const isRaised = level !== undefined;
    const shown = level ?? character;
    if (last?.isRaised === isRaised) runs[runs.length - 1] = { text: last.text + shown, isRaised };
    else runs.push({ text: shown, isRaised });
  }
  return runs;
}
