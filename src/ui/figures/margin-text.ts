/** Margins and frequencies in words, to the digits that are read. */

import type { Margins } from '../../analysis/index.ts';
import { formatNumber } from './format.ts';

const DIGITS = 3;

/** `0.702 rad/s`. */
export function frequencyText(omega: number): string {
  return `${formatNumber(omega, DIGITS)} rad/s`;
}

/** `48.3°`. */
export function degreesText(degrees: number): string {
  return `${formatNumber(degrees, DIGITS)}°`;
}

/** `phase margin 48.3° at 0.702 rad/s`, or that there is none. */
export function phaseMarginText({ phaseMargin }: Pick<Margins, 'phaseMargin'>): string {
  if (phaseMargin === null) return 'no phase margin: |L| is nowhere 1';
  return `phase margin ${degreesText(phaseMargin.phaseMargin)} at ${frequencyText(phaseMargin.omega)}`;
}
