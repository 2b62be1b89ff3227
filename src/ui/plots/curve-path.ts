/**
 * Path data of a sampled curve. More samples than the screen has columns are thinned to the first, least, greatest and last
 * of each column, which draws the same pixels (Jugel, Jerzak, Hackenbroich and Markl 2014, M4, PVLDB 7(10)).
 */

import { line } from 'd3-shape';

/** Samples of one curve, equally many times and values, times ascending. */
export interface Samples {
  /** Seconds. */
  readonly time: ArrayLike<number>;
  readonly values: ArrayLike<number>;
}

/** Samples a column may hold before it is thinned: no more than four are ever kept. */
const KEPT_A_COLUMN = 4;

/**
 * SVG path data of `samples`, broken where a value is not finite.
 *
 * @param x pixels of a time, growing with it.
 * @param y pixels of a value.
 * @param columns width of the plot in pixels.
 */
export function curvePath(
  samples: Samples,
  x: (time: number) => number,
  y: (value: number) => number,
  columns: number,
): string {
  const { time, values } = samples;
  const count = Math.min(time.length, values.length);
  const kept = count > KEPT_A_COLUMN * columns ? thinned(samples, count, x) : everyIndex(count);
  const path = line<number>()
    .x(index => x(time[index] ?? 0))
    .y(index => y(values[index] ?? 0))
    .defined(index => Number.isFinite(values[index] ?? Number.NaN))
    .digits(1);
  return path(kept) ?? '';
}

function everyIndex(count: number): number[] {
  return Array.from({ length: count }, (_, index) => index);
}

/** Indices of the first, least, greatest and last sample of each column, ascending. */
function thinned({ time, values }: Samples, count: number, x: (time: number) => number): number[] {
  const kept: number[] = [];
  let first = 0;
  while (first < count) {
    const column = Math.floor(x(time[first] ?? 0));
    let [least, greatest, last] = [first, first, first];
    while (last + 1 < count && Math.floor(x(time[last + 1] ?? 0)) === column) {
      last += 1;
      if (at(values, last) < at(values, least)) least = last;
      if (at(values, last) > at(values, greatest)) greatest = last;
    }
    const [earlier, later] = least < greatest ? [least, greatest] : [greatest, least];
    for (const index of [first, earlier, later, last]) if (kept.at(-1) !== index) kept.push(index);
    first = last + 1;
  }
  return kept;
}

function at(values: ArrayLike<number>, index: number): number {
  return values[index] ?? Number.NaN;
}

/** Index of the sample nearest to `moment`; −1 where there is none. O(log n). */
export function nearestSample(time: ArrayLike<number>, moment: number): number {
  let low = 0;
  let high = time.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (at(time, middle) <= moment) low = middle;
    else high = middle;
  }
  return high >= 0 && Math.abs(at(time, high) - moment) < Math.abs(at(time, low) - moment) ? high : high < 0 ? -1 : low;
}
