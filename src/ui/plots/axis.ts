/** Ticks of a linear axis: where they stand and what is written at them. */

import { scaleLinear } from 'd3-scale';
import { MINUS, raised } from '../figures/index.ts';

/** A value of the axis and what is written at it. */
export interface Tick {
  readonly value: number;
  readonly text: string;
}

/** What stands along one side of a frame. */
export interface Axis {
  /** Ascending, all inside the domain. */
  readonly ticks: readonly Tick[];
  /** Power of ten that every tick's text is to be multiplied by, a multiple of three; null where it is none. */
  readonly exponent: number | null;
}

/** Powers of ten of the largest tick between which ticks are written out: 0.001 to 99,999. */
const LEAST_POWER = -3;
const LARGEST_POWER = 4;

/** About `count` ticks at 1, 2 or 5 times a power of ten over `low` … `high`, low < high. */
export function axisOver(low: number, high: number, count: number): Axis {
  const values = scaleLinear().domain([low, high]).ticks(count);
  const largest = Math.max(...values.map(Math.abs));
  const power = largest > 0 ? Math.floor(Math.log10(largest)) : 0;
  const isPlain = power >= LEAST_POWER && power <= LARGEST_POWER;
  const exponent = isPlain ? null : 3 * Math.floor(power / 3);
  const step = (values[1] ?? 1) - (values[0] ?? 0);
  const decimals = Math.max(0, (exponent ?? 0) - Math.floor(Math.log10(step) + STEP_SLACK));
  return { ticks: values.map(value => ({ value, text: tickText(value, exponent ?? 0, decimals) })), exponent };
}

/** The difference of two ticks may fall short of a power of ten by rounding; a thousandth of a decade cannot mislead. */
const STEP_SLACK = 1e-3;

function tickText(value: number, exponent: number, decimals: number): string {
  const text = Math.abs(value / 10 ** exponent).toFixed(decimals);
  if (Number(text) === 0) return '0';
  return value < 0 ? MINUS + text : text;
}

/** ` / s`, what stands after the name of an axis; with its power of ten ` / 10⁻⁶ N`; empty where there is neither. */
export function axisMeasure(unit: string | null, exponent: number | null): string {
  const scale = exponent === null ? '' : `10${raised(exponent)}`;
  const measure = [scale, unit ?? ''].filter(part => part !== '').join(' ');
  return measure === '' ? '' : ` / ${measure}`;
}

/** `low` … `high` widened to the ticks around them, so that a small change of the data leaves the frame where it is. */
export function steadyDomain(low: number, high: number, count: number): readonly [number, number] {
  // A constant needs some room around it; half its size, or one where it is zero.
  const room = low === high ? Math.abs(low) / 2 || 1 : 0;
  const [from, to] = scaleLinear()
    .domain([low - room, high + room])
    .nice(count)
    .domain();
  return [from ?? low, to ?? high];
}
