/**
 * Blocks and the wires that pass between them column by column, in the order from top to bottom. A wire over several
 * columns stands in each of them as a passage, so that it gets room like a block.
 */

import type { DepthFirst } from './depth-first.ts';
import type { Graph } from './graph.ts';

/** A block or the passage of a wire. */
export interface Item {
  /** Number of the block; −1 for a passage. */
  readonly block: number;
  readonly column: number;
  /**
   * Positive on a way back, which lies below the way forward, the deeper the longer; negative for what comes in from
   * above.
   */
  readonly depth: number;
  /** Where it stands at first: the order in which the search found it. */
  readonly rank: number;
}

/** A piece of wire between neighbouring columns, `left` and `right` being item numbers. */
export interface Link {
  readonly left: number;
  readonly right: number;
  readonly edge: number;
}

export interface Rows {
  readonly items: readonly Item[];
  readonly links: readonly Link[];
  /** Item numbers by column, from top to bottom. */
  readonly columns: readonly (readonly number[])[];
}

/** More passages than this are left out, the longest wires' first: they would cost more than they show. */
const MOST_PASSAGES = 30_000;

/** The items of an arrangement in the order in which the search found them. */
export function initialRows(graph: Graph, search: DepthFirst, isBack: readonly boolean[], column: Int32Array): Rows {
  const items: Item[] = graph.blocks.map((_, block) => ({
    block,
    column: column[block]!,
    depth: isBack[block] ? 1 : comesFromAbove(graph, block) ? -1 : 0,
    rank: search.found[block]!,
  }));
  const links: Link[] = [];
  const spans = graph.edges.map(({ from, to }, edge) => ({ edge, span: Math.abs(column[from]! - column[to]!) }));
  let passages = 0;
  for (const { edge, span } of spans.toSorted((a, b) => a.span - b.span || a.edge - b.edge)) {
    const ends = graph.edges[edge];
    if (ends === undefined || span === 0 || passages + span > MOST_PASSAGES) continue;
    passages += span - 1;
    const { from, to } = ends;
    const leadsBack = column[to]! < column[from]!;
    const [left, right] = leadsBack ? [to, from] : [from, to];
    let last = left;
    for (let at = column[left]! + 1; at < column[right]!; at += 1) {
      const depth = leadsBack ? 1 + span : 0;
      items.push({ block: -1, column: at, depth, rank: search.found[from]! });
      links.push({ left: last, right: items.length - 1, edge });
      last = items.length - 1;
    }
    links.push({ left: last, right, edge });
  }
  return { items, links, columns: inColumns(items) };
}

/** A disturbance: an input that enters the side of a summing point and nothing else. */
function comesFromAbove(graph: Graph, block: number): boolean {
  const leaving = graph.leaving[block] ?? [];
  const only = leaving.length === 1 ? graph.edges[leaving[0] ?? -1] : undefined;
  if (graph.blocks[block]?.kind !== 'input' || only === undefined) return false;
  return graph.blocks[only.to]?.kind === 'summer' && only.toPort > 0;
}

function inColumns(items: readonly Item[]): readonly (readonly number[])[] {
  const columns: number[][] = [];
  items.forEach(({ column }, number) => {
    while (columns.length <= column) columns.push([]);
    columns[column]?.push(number);
  });
  const compare = (a: number, b: number): number => {
    const [first, second] = [items[a]!, items[b]!];
    return Math.sign(first.depth) - Math.sign(second.depth) || first.rank - second.rank || first.depth - second.depth;
  };
  return columns.map(column => column.sort((a, b) => compare(a, b) || a - b));
}
