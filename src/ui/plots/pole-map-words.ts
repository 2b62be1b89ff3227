/** What a pole map says in words: its summary, and the read-out of a root or of a point of the plane. */

import { dampingRatio, naturalFrequency } from '../../analysis/index.ts';
import { formatPadded, MINUS, motionOf, type Root, singleRootText } from '../figures/index.ts';
import type { PlacedRoot } from './pole-map-marks.ts';

/**
 * `4 poles, 1 zero; 1 beyond the frame`. Multiple roots count as often as they are.
 *
 * @param hasZeros false where the zeros were not computed.
 */
export function mapSummary(placed: readonly PlacedRoot[], hasZeros: boolean): string {
  const poles = placed.filter(({ kind }) => kind === 'pole');
  const zeros = placed.filter(({ kind }) => kind === 'zero');
  const beyond = placed.filter(({ isBeyond }) => isBeyond);
  const sizes = `${counted(poles, 'pole')}, ${hasZeros ? counted(zeros, 'zero') : 'zeros not computed'}`;
  return beyond.length === 0 ? sizes : `${sizes}; ${order(beyond)} beyond the frame`;
}

function counted(roots: readonly PlacedRoot[], thing: string): string {
  const number = order(roots);
  if (number === 1) return `1 ${thing}`;
  return `${number === 0 ? 'no' : number} ${thing}s`;
}

function order(roots: readonly PlacedRoot[]): number {
  return roots.reduce((sum, { root }) => sum + root.multiplicity, 0);
}

/** `pole −0.3543 + 0.5861j · ζ 0.517 · ω₀ 0.685 rad/s`. */
export function rootWords({ root, kind }: PlacedRoot): string {
  const times = root.multiplicity > 1 ? [`multiplicity ${root.multiplicity}`] : [];
  const motion = kind === 'pole' ? motionWords(root) : [];
  return [`${kind} ${singleRootText(root)}`, ...times, ...motion].join(' · ');
}

function motionWords(root: Root): readonly string[] {
  const { damping, frequency, timeConstant } = motionOf(root);
  if (damping === null || frequency === null) return [`τ ${timeConstant} s`];
  return [`ζ ${damping}`, `ω₀ ${frequency} rad/s`];
}

/** Digits of a point under the pointer: no more than the screen resolves. */
const POINT_DIGITS = 3;

/** `−1.20 + 3.40j · ζ 0.333 · ω₀ 3.61 rad/s`, of a point in the plane; always as many digits, so that nothing jumps. */
export function pointWords(re: number, im: number): string {
  const padded = (value: number) => formatPadded(value, POINT_DIGITS);
  const place = `${padded(re)} ${im < 0 ? MINUS : '+'} ${padded(Math.abs(im))}j`;
  const damping = dampingRatio({ re, im });
  if (damping === null) return place;
  return `${place} · ζ ${padded(damping)} · ω₀ ${padded(naturalFrequency({ re, im }))} rad/s`;
}
