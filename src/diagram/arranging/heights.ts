/**
 * The height of each item: wires run straight where they can. In every column the items of greatest priority take the
 * height of what they are joined to, the others give way (the priority method of Sugiyama, Tagawa & Toda 1981).
 * Passages and long chains come first.
 */

import { GRID } from '../geometry/index.ts';
import type { Extent } from './extents.ts';
import type { Graph } from './graph.ts';
import type { Item, Link, Rows } from './rows.ts';

/** Paper between blocks, and between a wire that passes and what is next to it. */
const BETWEEN_BLOCKS = 2 * GRID;
const BESIDE_PASSAGE = GRID;

const SWEEPS = 6;

/** Height of each item's centre, a multiple of the grid, the highest at 0. */
export function heights(graph: Graph, rows: Rows, extents: readonly Extent[]): Float64Array {
  const { items, columns } = rows;
  const y = new Float64Array(items.length);
  const offsets = columns.map(column => stackedOffsets(column, items, extents));
  columns.forEach((column, index) => {
    column.forEach((item, place) => {
      y[item] = offsets[index]![place]!;
    });
  });
  const joints = jointsOf(graph, rows, extents);
  const priority = priorities(graph, rows, joints);
  for (let sweep = 0; sweep < SWEEPS; sweep += 1) {
    const fromLeft = sweep % 2 === 0;
    const order = columns.map((_, index) => (fromLeft ? index : columns.length - 1 - index));
    for (const index of order) {
      placeColumn(columns[index]!, offsets[index]!, y, priority, item => {
        const beside = fromLeft ? joints.left[item]! : joints.right[item]!;
        return wantedHeight(beside.length > 0 ? beside : [], y) ?? y[item]!;
      });
    }
  }
  const highest = y.reduce((least, value) => Math.min(least, value), Number.POSITIVE_INFINITY);
  return y.map(value => value - highest);
}

/** Least heights of a column's items when they are stacked from 0, multiples of the grid. */
function stackedOffsets(column: readonly number[], items: readonly Item[], extents: readonly Extent[]): Float64Array {
  const offsets = new Float64Array(column.length);
  for (let place = 1; place < column.length; place += 1) {
    const above = items[column[place - 1]!]!;
    const below = items[column[place]!]!;
    const bothBlocks = above.block >= 0 && below.block >= 0;
    const bottom = above.block >= 0 ? extents[above.block]!.area.bottom : 0;
    const top = below.block >= 0 ? -extents[below.block]!.area.top : 0;
    const apart = bottom + top + (bothBlocks ? BETWEEN_BLOCKS : BESIDE_PASSAGE);
    offsets[place] = offsets[place - 1]! + Math.ceil(apart / GRID) * GRID;
  }
  return offsets;
}

/**
 * What an item's height is taken from: another item, and how much lower its own centre lies when the wire between is
 * straight.
 */
interface Joint {
  readonly item: number;
  readonly lower: number;
  readonly weight: number;
}

interface Joints {
  readonly left: readonly Joint[][];
  readonly right: readonly Joint[][];
}

/**
 * Weights of a straight wire: along a passage, on the way forward into a front port, into the side of a summing point.
 */
const WEIGHTS = { passage: 3, forward: 2, back: 0.5, aside: 0.1 } as const;

function jointsOf(graph: Graph, { items, links }: Rows, extents: readonly Extent[]): Joints {
  const left: Joint[][] = items.map(() => []);
  const right: Joint[][] = items.map(() => []);
  for (const link of links) {
    const { rise, weight } = jointOf(graph, items, extents, link);
    left[link.right]?.push({ item: link.left, lower: rise, weight });
    right[link.left]?.push({ item: link.right, lower: -rise, weight });
  }
  return { left, right };
}

function jointOf(graph: Graph, items: readonly Item[], extents: readonly Extent[], { left, right, edge }: Link) {
  const ends = graph.edges[edge]!;
  const [first, second] = [items[left]!.block, items[right]!.block];
  const height = (block: number): number => {
    if (block < 0) return 0;
    const { inputs, outputs } = extents[block]!.geometry;
    return (block === ends.from ? outputs[ends.fromPort]?.y : inputs[ends.toPort]?.y) ?? 0;
  };
  const goesBack = items[left]!.depth > 0 || items[right]!.depth > 0;
  const side = extents[ends.to]!.geometry.inputs[ends.toPort]?.side;
  const isAside = [first, second].includes(ends.to) && (side === 'top' || side === 'bottom');
  const bothPassages = first < 0 && second < 0;
  const forward = bothPassages ? WEIGHTS.passage : WEIGHTS.forward;
  return {
    rise: isAside ? 0 : height(first) - height(second),
    weight: isAside ? WEIGHTS.aside : goesBack ? WEIGHTS.back : forward,
  };
}

/** The weighted median of the heights that would make a wire straight; null where there is none. */
function wantedHeight(beside: readonly Joint[], y: Float64Array): number | null {
  const wanted = beside.map(({ item, lower, weight }) => ({ height: y[item]! + lower, weight }));
  wanted.sort((a, b) => a.height - b.height);
  const half = wanted.reduce((sum, { weight }) => sum + weight, 0) / 2;
  let passed = 0;
  for (const { height, weight } of wanted) {
    passed += weight;
    if (passed >= half) return height;
  }
  return null;
}

/** Long chains of front ports first, so that the main path is the straightest. */
function priorities(graph: Graph, { items }: Rows, joints: Joints): Float64Array {
  const strongest = (list: readonly Joint[]): Joint | undefined =>
    list.reduce<Joint | undefined>(
      (best, joint) => (best === undefined || joint.weight > best.weight ? joint : best),
      undefined,
    );
  const chain = new Float64Array(items.length).fill(1);
  const order = items.map((_, item) => item).sort((a, b) => items[a]!.column - items[b]!.column || a - b);
  for (const item of order) {
    const from = strongest(joints.left[item]!);
    if (from !== undefined && from.weight >= WEIGHTS.forward) chain[item] = chain[from.item]! + 1;
  }
  for (const item of order.toReversed()) {
    const to = strongest(joints.right[item]!);
    if (to !== undefined && to.weight >= WEIGHTS.forward) chain[item] = Math.max(chain[item]!, chain[to.item]!);
  }
  return chain.map((length, item) => {
    const { block, depth } = items[item]!;
    if (depth !== 0) return 0;
    return block < 0 ? length + graph.blocks.length : length;
  });
}

/**
 * Places a column's items: the greatest priority takes what it wants, each further one what those above and below it
 * leave.
 *
 * @param offsets  the items' heights when they are stacked; differences of heights are never less than theirs.
 */
function placeColumn(
  column: readonly number[],
  offsets: Float64Array,
  y: Float64Array,
  priority: Float64Array,
  wanted: (item: number) => number,
): void {
  const order = column.map((_, place) => place).sort((a, b) => priority[column[b]!]! - priority[column[a]!]! || a - b);
  const slack = new Float64Array(column.length).fill(Number.NaN);
  for (const place of order) {
    let least = Number.NEGATIVE_INFINITY;
    let most = Number.POSITIVE_INFINITY;
    for (let above = place - 1; above >= 0; above -= 1) {
      if (Number.isNaN(slack[above]!)) continue;
      least = slack[above]!;
      break;
    }
    for (let below = place + 1; below < column.length; below += 1) {
      if (Number.isNaN(slack[below]!)) continue;
      most = slack[below]!;
      break;
    }
    const own = Math.round((wanted(column[place]!) - offsets[place]!) / GRID) * GRID;
    slack[place] = Math.min(most, Math.max(least, own));
  }
  column.forEach((item, place) => {
    y[item] = slack[place]! + offsets[place]!;
  });
}
