/**
 * Where each column stands: wide enough for its blocks and labels, apart enough for the wires that change height
 * between.
 */

import { GRID, HALF_GRID } from '../geometry/index.ts';
import type { Extent } from './extents.ts';
import type { Rows } from './rows.ts';

/** Least paper between the blocks of two columns, and the most that wires make of it. */
const LEAST_GAP = 3 * GRID;
const MOST_GAP = 15 * GRID;

/** x of each column's centres, multiples of the grid, the first at 0. */
export function columnPlaces(
  { items, links, columns }: Rows,
  extents: readonly Extent[],
  y: Float64Array,
): readonly number[] {
  const bends = columns.map(() => new Set<number>());
  for (const { left, right, edge } of links) {
    if (y[left] !== y[right]) bends[items[left]!.column]?.add(edge);
  }
  const areas = columns.map(column => column.flatMap(item => extents[items[item]!.block]?.area ?? []));
  const places = [0];
  for (let column = 1; column < columns.length; column += 1) {
    const before = Math.max(0, ...areas[column - 1]!.map(({ right }) => right));
    const after = Math.max(0, ...areas[column]!.map(({ left }) => -left));
    const gap = Math.min(MOST_GAP, LEAST_GAP + HALF_GRID * Math.max(0, bends[column - 1]!.size - 2));
    places.push(places[column - 1]! + Math.ceil((before + gap + after) / GRID) * GRID);
  }
  return places;
}
