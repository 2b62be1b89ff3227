/**
 * Fewer crossings: each column in turn is sorted by where its neighbours stand (barycentres; Sugiyama, Tagawa & Toda
 * 1981).
 */

import type { Item, Rows } from './rows.ts';

const SWEEPS = 8;

/**
 * How far below its neighbours' middle a way back is sorted (above, what comes from there), and how much more for each
 * column of it.
 */
const BELOW = 0.5;
const BELOW_EACH_COLUMN = 0.02;

/** The same items with the orders, among those that the sweeps pass through, that cross the least. */
export function withFewerCrossings(rows: Rows): Rows {
  const neighbours = neighboursOf(rows);
  const columns = rows.columns.map(column => column.slice());
  const place = new Float64Array(rows.items.length);
  for (const column of columns) setPlaces(place, column);
  let best = columns.map(column => column.slice());
  let least = crossings(rows, place);
  for (let sweep = 0; sweep < SWEEPS && least > 0; sweep += 1) {
    const side = sweep % 2 === 0 ? neighbours.left : neighbours.right;
    const order = sweep % 2 === 0 ? columns : columns.toReversed();
    for (const column of order) {
      sortByNeighbours(rows.items, column, side, place);
      setPlaces(place, column);
    }
    const count = crossings(rows, place);
    if (count >= least) continue;
    least = count;
    best = columns.map(column => column.slice());
  }
  return { ...rows, columns: best };
}

function setPlaces(place: Float64Array, column: readonly number[]): void {
  column.forEach((item, index) => {
    place[item] = index;
  });
}

function neighboursOf({ items, links }: Rows): {
  readonly left: readonly number[][];
  readonly right: readonly number[][];
} {
  const left: number[][] = items.map(() => []);
  const right: number[][] = items.map(() => []);
  for (const link of links) {
    left[link.right]?.push(link.left);
    right[link.left]?.push(link.right);
  }
  return { left, right };
}

/** Stable, so that items without neighbours on that side stay among those around them. */
function sortByNeighbours(
  items: readonly Item[],
  column: number[],
  side: readonly (readonly number[])[],
  place: Float64Array,
): void {
  const key = new Map(
    column.map(item => {
      const beside = side[item] ?? [];
      const depth = items[item]?.depth ?? 0;
      const below = Math.sign(depth) * (BELOW + BELOW_EACH_COLUMN * Math.abs(depth));
      if (beside.length === 0) return [item, place[item]!];
      return [item, beside.reduce((sum, other) => sum + place[other]!, 0) / beside.length + below];
    }),
  );
  column.sort((a, b) => key.get(a)! - key.get(b)! || place[a]! - place[b]!);
}

/**
 * Pairs of links that cross between neighbouring columns: inversions, counted in a Fenwick tree (Barth, Mutzel & Jünger
 * 2004).
 */
function crossings({ links, items, columns }: Rows, place: Float64Array): number {
  const byColumn: (typeof links)[number][][] = columns.map(() => []);
  for (const link of links) byColumn[items[link.left]?.column ?? 0]?.push(link);
  let total = 0;
  byColumn.forEach((list, column) => {
    const size = columns[column + 1]?.length ?? 0;
    const tree = new Int32Array(size + 1);
    list.sort((a, b) => place[a.left]! - place[b.left]! || place[a.right]! - place[b.right]!);
    list.forEach(({ right }, passed) => {
      let notAbove = 0;
      for (let at = place[right]! + 1; at > 0; at -= at & -at) notAbove += tree[at]!;
      total += passed - notAbove;
      for (let at = place[right]! + 1; at <= size; at += at & -at) tree[at]! += 1;
    });
  });
  return total;
}
