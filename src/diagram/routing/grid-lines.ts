/**
 * The lines on which wires may run: multiples of 10 around every block, and the lines of ports, bend points and routes
 * that stay, wherever those lie. Where nothing stands there are no lines, so empty paper costs nothing.
 */

import { HALF_GRID } from '../geometry/index.ts';

/** How far around a block lines are laid, in steps: the first that keeps the grid within `MOST_NODES` is taken. */
const REACHES = [80, 30] as const;

/** Most crossings of lines that are searched, at 35 bytes each. */
const MOST_NODES = 3_000_000;

/** A lattice line gives way to a port's line that is closer than this. */
const TOO_CLOSE = 6;

/** What lines are laid for along one axis: extents of blocks, and coordinates that must have a line. */
export interface AxisNeeds {
  readonly extents: readonly (readonly [low: number, high: number])[];
  readonly fixed: readonly number[];
}

/** Coordinates of the vertical and horizontal lines, ascending; null where there would be too many of them. */
export function gridLines(
  horizontal: AxisNeeds,
  vertical: AxisNeeds,
): { readonly xs: Float64Array; readonly ys: Float64Array } | null {
  for (const reach of REACHES) {
    const xs = axisLines(horizontal, reach);
    const ys = axisLines(vertical, reach);
    if (xs.length * ys.length <= MOST_NODES) return { xs, ys };
  }
  return null;
}

function axisLines({ extents, fixed }: AxisNeeds, reach: number): Float64Array {
  const lines: number[] = latticeAround(extents, reach);
  const own = [...new Set(fixed)].sort((a, b) => a - b);
  return merged(lines, own);
}

/** Ascending multiples of the lattice within `reach` of an extent. */
function latticeAround(extents: AxisNeeds['extents'], reach: number): number[] {
  const lines: number[] = [];
  let next = Number.NEGATIVE_INFINITY;
  for (const [low, high] of extents.toSorted((a, b) => a[0] - b[0])) {
    const last = Math.ceil((high + reach) / HALF_GRID);
    next = Math.max(next, Math.floor((low - reach) / HALF_GRID));
    for (; next <= last; next += 1) lines.push(next * HALF_GRID);
  }
  return lines;
}

/** Both, ascending, without the lattice lines that are too close to a line of the sheet's own. */
function merged(lattice: readonly number[], own: readonly number[]): Float64Array {
  const lines: number[] = [];
  let at = 0;
  for (const line of lattice) {
    while (at < own.length && own[at]! < line) lines.push(own[at++]!);
    const after = own[at] ?? Number.POSITIVE_INFINITY;
    const before = own[at - 1] ?? Number.NEGATIVE_INFINITY;
    const crowded = (value: number): boolean =>
      Math.abs(value - line) < TOO_CLOSE && !Number.isInteger(value / HALF_GRID);
    if (after !== line && !crowded(after) && !crowded(before)) lines.push(line);
  }
  return Float64Array.from([...lines, ...own.slice(at)]);
}

/** Index of the first line at or above `value`; the number of lines where there is none. */
export function lineFrom(lines: Float64Array, value: number): number {
  let low = 0;
  let high = lines.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (lines[middle]! < value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Index of the line at exactly `value`; −1 where there is none. */
export function lineAt(lines: Float64Array, value: number): number {
  const index = lineFrom(lines, value);
  return index < lines.length && lines[index] === value ? index : -1;
}

/** Index of the next line beyond `value` in the direction of `step`, 1 or −1; out of range where there is none. */
export function lineAfter(lines: Float64Array, value: number, step: number): number {
  const index = lineFrom(lines, value);
  if (step < 0) return index - 1;
  return lines[index] === value ? index + 1 : index;
}
