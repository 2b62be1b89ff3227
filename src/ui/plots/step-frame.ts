/** Where times and values lie in a step plot of a given size. */

import { type Axis, axisOver, steadyDomain } from './axis.ts';
import type { Size } from './drawing.ts';
import { peakOf, type StepContent } from './step-content.ts';

/** Sides of the frame in CSS pixels from the upper left corner, and how times and values lie in it. */
export interface StepFrame extends Size {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly horizon: number;
  readonly timeAxis: Axis;
  readonly valueAxis: Axis;
  /** Pixels from the left of a time, from the top of a value, and back. */
  readonly x: (time: number) => number;
  readonly y: (value: number) => number;
  readonly timeAt: (x: number) => number;
}

/** Room for the axis name and for the ticks and axis name below, CSS pixels. */
const TOP = 26;
const BOTTOM = 36;
const RIGHT = 16;

/** Width of one figure of the tick texts at TEXT_SIZE in the mono face, and the gap to the axis. */
const FIGURE_WIDTH = 7;
const TICK_GAP = 10;

/** Height for a width: the sheet's proportion, between a strip that still reads and a third of a page. */
export function stepSize(width: number): Size {
  return { width, height: Math.round(Math.max(170, Math.min(260, width * 0.37))) };
}

/** The frame: time from 0 to the last sample, values from the least to the largest with zero and the final value. */
export function stepFrame(content: StepContent, { width, height }: Size): StepFrame {
  const horizon = lastMoment(content);
  const bottom = height - BOTTOM;
  const [low, high] = valueRange(content);
  const steps = Math.max(2, Math.round((bottom - TOP) / 40));
  const [from, to] = steadyDomain(low, high, steps);
  const valueAxis = axisOver(from, to, steps);
  const left = TICK_GAP + FIGURE_WIDTH * Math.max(3, ...valueAxis.ticks.map(tick => tick.text.length));
  const right = width - RIGHT;
  const timeAxis = axisOver(0, horizon, Math.max(2, Math.round((right - left) / 62)));
  return {
    width,
    height,
    left,
    right,
    top: TOP,
    bottom,
    horizon,
    timeAxis,
    valueAxis,
    x: time => left + (time / horizon) * (right - left),
    y: value => bottom - ((value - from) / (to - from)) * (bottom - TOP),
    timeAt: x => Math.max(0, Math.min(horizon, ((x - left) / (right - left)) * horizon)),
  };
}

/** The time of the last sample, s; 1 where there is none. */
function lastMoment({ curves }: StepContent): number {
  const last = curves.map(({ time }) => time[time.length - 1] ?? 0);
  return Math.max(0, ...last) || 1;
}

/** Part of the range that is left free over a peak, for its mark. */
const PEAK_ROOM = 0.08;

function valueRange(content: StepContent): readonly [number, number] {
  const { metrics, curves, envelope } = content;
  let low = Math.min(0, metrics?.finalValue ?? 0);
  let high = Math.max(0, metrics?.finalValue ?? 0);
  const bands = envelope === undefined ? [] : [{ values: envelope.low }, { values: envelope.high }];
  for (const { values } of [...curves, ...bands]) {
    for (let index = 0; index < values.length; index++) {
      const value = values[index] ?? Number.NaN;
      if (!Number.isFinite(value)) continue;
      if (value < low) low = value;
      if (value > high) high = value;
    }
  }
  const peak = peakOf(metrics);
  const room = peak === null ? 0 : PEAK_ROOM * (high - low);
  return peak !== null && peak.value < 0 ? [low - room, high] : [low, high + room];
}
