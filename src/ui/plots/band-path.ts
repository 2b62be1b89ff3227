/** Path data of the band between two curves over the same axis. */

import { area } from 'd3-shape';

/** Between which values a curve runs over the tolerances of the parameters: `along` in the axis's unit, ascending. */
export interface Band {
  readonly along: ArrayLike<number>;
  readonly low: ArrayLike<number>;
  readonly high: ArrayLike<number>;
}

/** SVG path data of the band, broken where an end of it is not finite. */
export function bandPath(
  { along, low, high }: Band,
  x: (along: number) => number,
  y: (value: number) => number,
): string {
  const finite = (index: number) =>
    Number.isFinite(low[index] ?? Number.NaN) && Number.isFinite(high[index] ?? Number.NaN);
  const path = area<number>()
    .x(index => x(along[index] ?? 0))
    .y0(index => y(low[index] ?? 0))
    .y1(index => y(high[index] ?? 0))
    .defined(finite)
    .digits(1);
  return path(Array.from({ length: along.length }, (_, index) => index)) ?? '';
}
