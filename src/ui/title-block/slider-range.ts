/**
 * Where a parameter's slider goes and which value stands at each of its places. Without a typed range it covers a decade
 * with the value in its middle; for zero and negative values it lies symmetric about zero. Values are short decimals: as
 * many digits as tell one place from the next.
 */

import { evaluateQuantity } from '../../expression/index.ts';

export interface SliderRange {
  readonly low: number;
  readonly high: number;
}

/** Places of a slider, 0 to this. A quarter of a pixel on the screen; one step of an arrow key. */
export const PLACES = 400;

/** Half a decade. */
const HALF = Math.sqrt(10);

/** From this ratio on, a range of positive values is divided in equal ratios. */
const RATIO = 5;

/** The number that a value is as written; null for an expression, which has no slider. */
export function plainNumber(written: string): number | null {
  const text = written.trim();
  if (!/^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/.test(text)) return null;
  const value = Number(text);
  return Number.isFinite(value) ? value : null;
}

/** The range that is typed, or null where there is none or it is no range. */
export function typedRange(range: readonly [string, string] | undefined): SliderRange | null {
  if (range === undefined) return null;
  const [low, high] = range.map(numberOf);
  return low === undefined || high === undefined || !(low < high) ? null : { low, high };
}

/** Why two texts are no range, ready for the screen; null where they are one. */
export function rangeFault(low: string, high: string): string | null {
  const [from, to] = [numberOf(low), numberOf(high)];
  if (from === undefined || to === undefined) {
    return `"${from === undefined ? low : high}" is no number. Write one, such as 0.2.`;
  }
  return from < to ? null : 'The range ends before it begins. Write the smaller end first.';
}

function numberOf(text: string): number | undefined {
  const value = evaluateQuantity(text, new Map());
  return value.ok && Number.isFinite(value.value.double) ? value.value.double : undefined;
}

/** A decade with the value in its middle, ends of two digits; symmetric about zero for zero and negative values. */
export function rangeAround(value: number): SliderRange {
  if (value === 0) return { low: -1, high: 1 };
  const high = twoDigits(Math.abs(value) * HALF);
  return { low: value > 0 ? twoDigits(value / HALF) : -high, high };
}

const twoDigits = (value: number) => Number(value.toPrecision(2));

/** The place next to a value, an end where it lies outside. */
export function placeOf(value: number, range: SliderRange): number {
  const { low, high } = range;
  const share = isRatio(range) ? Math.log(value / low) / Math.log(high / low) : (value - low) / (high - low);
  // A value that is not positive has no logarithm and lies below such a range.
  const within = Number.isNaN(share) ? 0 : Math.min(1, Math.max(0, share));
  return Math.round(within * PLACES);
}

/** The value at a place as exact text. */
export function textAt(place: number, range: SliderRange): string {
  const { low, high } = range;
  if (place <= 0) return String(low);
  if (place >= PLACES) return String(high);
  const share = place / PLACES;
  const value = isRatio(range) ? low * (high / low) ** share : low + (high - low) * share;
  const step = isRatio(range) ? (value * Math.log(high / low)) / PLACES : (high - low) / PLACES;
  return shortest(value, step);
}

function isRatio({ low, high }: SliderRange): boolean {
  return low > 0 && high >= RATIO * low;
}

/** The value on the coarsest power of ten that still tells it from its neighbours a step away. */
function shortest(value: number, step: number): string {
  const unit = Math.floor(Math.log10(step));
  if (Math.abs(value) < 10 ** unit / 2) return '0';
  const digits = Math.floor(Math.log10(Math.abs(value))) - unit + 1;
  return String(Number(value.toPrecision(Math.min(17, Math.max(1, digits)))));
}
