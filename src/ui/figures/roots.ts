/**
 * Poles and zeros as they are written: a conjugate pair once, with the figures of the motion that it stands for. Times are
 * in seconds, frequencies in rad/s.
 */

import { dampingRatio, naturalFrequency, timeConstant } from '../../analysis/index.ts';
import { figureOf, rightDigits } from './figure.ts';
import { figureText, formatNumber, MINUS } from './format.ts';

/** A pole or a zero; both of a conjugate pair are listed. */
export interface Root {
  readonly re: number;
  readonly im: number;
  readonly multiplicity: number;
  /** By how much the value may be off; 0 or absent where every digit of the doubles is right. */
  readonly error?: number;
}

/** A real root, or a conjugate pair with im > 0. */
export interface RootRow extends Root {
  readonly isPair: boolean;
}

/** Significant digits of a real root, and of either part of a complex one, which stand side by side. */
const REAL_DIGITS = 6;
const PAIR_DIGITS = 4;

/** Digits of damping ratio, natural frequency and time constant. */
const MOTION_DIGITS = 3;

/** `roots` with each conjugate pair as one row, in the order of the first of the two. */
export function rootRows(roots: readonly Root[]): readonly RootRow[] {
  return roots.filter(({ im }) => im >= 0).map(root => ({ ...root, isPair: root.im > 0 }));
}

/** `−0.3543 ± 0.5861j`, `−3.18056`; no more digits than are right. */
export function rootText({ re, im, isPair, error = 0 }: RootRow): string {
  if (!isPair) return partText(re, error, REAL_DIGITS);
  const imaginary = `${partText(im, error, PAIR_DIGITS)}j`;
  return re === 0 ? `± ${imaginary}` : `${partText(re, error, PAIR_DIGITS)} ± ${imaginary}`;
}

/** One root by itself: `−0.3543 − 0.5861j`, to `most` digits where that is less than usual. */
export function singleRootText({ re, im, error = 0 }: Root, most: number = REAL_DIGITS): string {
  if (im === 0) return partText(re, error, most);
  const digits = Math.min(most, PAIR_DIGITS);
  const imaginary = `${partText(Math.abs(im), error, digits)}j`;
  const isBelow = im < 0;
  if (re === 0) return isBelow ? MINUS + imaginary : imaginary;
  return `${partText(re, error, digits)} ${isBelow ? MINUS : '+'} ${imaginary}`;
}

function partText(value: number, error: number, most: number): string {
  const right = value === 0 ? most : rightDigits(value, error, most);
  // Not even the first digit is known: of the size of its error.
  return right === 0 ? '≈0' : figureText(figureOf(value, right));
}

/** What a pole says about its part of the motion, as text. */
export interface Motion {
  /** Damping ratio ζ, negative where the motion grows; null for a real pole. */
  readonly damping: string | null;
  /** Natural frequency ω₀, rad/s; null for a real pole. */
  readonly frequency: string | null;
  /** Time constant τ, s; `grows` to the right of the axis, `∞` on it. */
  readonly timeConstant: string;
}

/** The motion of one pole in words and figures. */
export function motionOf(pole: Root): Motion {
  const isComplex = pole.im !== 0;
  const damping = isComplex ? dampingRatio(pole) : null;
  const time = timeConstant(pole);
  return {
    damping: damping === null ? null : formatNumber(damping, MOTION_DIGITS),
    frequency: isComplex ? formatNumber(naturalFrequency(pole), MOTION_DIGITS) : null,
    timeConstant: time === null ? withoutDecay(pole.re) : formatNumber(time, MOTION_DIGITS),
  };
}

function withoutDecay(re: number): string {
  return re > 0 ? 'grows' : '∞';
}
