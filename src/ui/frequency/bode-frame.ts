/** Where frequencies, magnitudes and phases lie in a plot of a given size: magnitude above, phase below, one axis of frequency. */

import { scaleLinear, scaleLog } from 'd3-scale';
import { MINUS, raised } from '../figures/index.ts';
import type { Size, Tick } from '../plots/index.ts';
import type { BodeContent } from './bode-content.ts';

/** One of the two frames. */
export interface BodePart {
  readonly top: number;
  readonly bottom: number;
  readonly ticks: readonly Tick[];
  readonly y: (value: number) => number;
}

export interface BodeFrame extends Size {
  readonly left: number;
  readonly right: number;
  readonly decades: readonly Tick[];
  /** 2 to 9 times each decade, where there is room. */
  readonly between: readonly number[];
  readonly magnitude: BodePart;
  readonly phase: BodePart;
  readonly x: (omega: number) => number;
  readonly omegaAt: (x: number) => number;
}

/** CSS pixels: above each frame, below the last, and at the sides. */
const TOP = 30;
const BOTTOM = 36;
const LEFT = 48;
const RIGHT = 16;

/** Decades above which their parts are not drawn, and pixels that a decade's text needs. */
const MOST_DECADES = 6;
const DECADE_TEXT = 40;

/** Most of a magnitude's range that is drawn, dB: below, a curve is zero to the eye. */
const DEEPEST = 240;

/** Height for a width. */
export function bodeSize(width: number): Size {
  return { width, height: Math.round(Math.max(300, Math.min(420, width * 0.62))) };
}

export function bodeFrame({ curve, marks }: BodeContent, { width, height }: Size): BodeFrame {
  const low = curve.omega[0] ?? 0.1;
  const high = curve.omega[curve.omega.length - 1] ?? 10;
  const right = width - RIGHT;
  const x = scaleLog().domain([low, high]).range([LEFT, right]);
  const tall = (height - 2 * TOP - BOTTOM) / 2;
  const [least, greatest] = range(curve.magnitude, marks.length > 0 ? [0] : []);
  const marked = marks.filter(({ kind }) => kind === 'phase').map(({ to }) => to);
  const powers = Array.from({ length: 800 }, (_, k) => k - 400).filter(
    k => 10 ** k >= low * 0.999 && 10 ** k <= high * 1.001,
  );
  const every = Math.max(1, Math.ceil((powers.length * DECADE_TEXT) / (right - LEFT)));
  return {
    width,
    height,
    left: LEFT,
    right,
    decades: powers.map((power, k) => ({ value: 10 ** power, text: k % every === 0 ? decadeText(power) : '' })),
    between: powers.length > MOST_DECADES + 1 ? [] : powers.slice(0, -1).flatMap(partsOfDecade),
    magnitude: part(TOP, TOP + tall, Math.max(least, greatest - DEEPEST), greatest, [10, 20, 40, 60, 100]),
    phase: part(2 * TOP + tall, 2 * TOP + 2 * tall, ...range(curve.phase, marked), [15, 30, 45, 90, 180, 360]),
    x: omega => x(omega),
    omegaAt: at => Math.max(low, Math.min(high, x.invert(at))),
  };
}

function partsOfDecade(power: number): readonly number[] {
  return [2, 3, 4, 5, 6, 7, 8, 9].map(factor => factor * 10 ** power);
}

function decadeText(power: number): string {
  return power >= -3 && power <= 4 ? String(Number(`1e${power}`)) : `10${raised(power)}`;
}

function range(values: Float64Array, more: readonly number[]): [low: number, high: number] {
  const finite = [...values, ...more].filter(Number.isFinite);
  if (finite.length === 0) return [-1, 1];
  return finite.reduce<[number, number]>(([a, b], v) => [Math.min(a, v), Math.max(b, v)], [Infinity, -Infinity]);
}

/** Values apart by one of the steps that leaves six ticks or fewer, or by a round number of the largest. */
function part(top: number, bottom: number, low: number, high: number, steps: readonly number[]): BodePart {
  const largest = steps[steps.length - 1] ?? 1;
  const wide = largest * Math.ceil((high - low) / (5 * largest));
  const step = steps.find(candidate => (high - low) / candidate <= 5) ?? wide;
  const from = step * Math.floor(low / step + SLACK);
  const to = Math.max(step * Math.ceil(high / step - SLACK), from + step);
  const y = scaleLinear().domain([from, to]).range([bottom, top]);
  const count = Math.round((to - from) / step);
  const ticks = Array.from({ length: count + 1 }, (_, k) => from + k * step).map(value => ({
    value,
    text: value < 0 ? `${MINUS}${-value}` : String(value),
  }));
  return { top, bottom, ticks, y: value => y(value) };
}

/** A value may miss a tick by rounding; a millionth of a step cannot be seen. */
const SLACK = 1e-6;
