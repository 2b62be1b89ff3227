/**
 * The column of each block: a wire leads at least one column to the right, those on the way back excepted, which run
 * the other way under the way forward. Longest paths first, then every block moves to where its wires are shortest.
 */

import type { DepthFirst } from './depth-first.ts';
import type { Graph } from './graph.ts';

/** `right` stands right of `left`. */
interface Constraint {
  readonly left: number;
  readonly right: number;
}

/** Columns by block, from 0. Longest-path layering (Sugiyama, Tagawa & Toda 1981), linear in blocks and wires. */
export function layers(graph: Graph, search: DepthFirst, isBack: readonly boolean[]): Int32Array {
  const constraints = constraintsOf(graph, search, isBack);
  const count = graph.blocks.length;
  const after: Constraint[][] = Array.from({ length: count }, () => []);
  const before: Constraint[][] = Array.from({ length: count }, () => []);
  for (const constraint of constraints) {
    after[constraint.left]?.push(constraint);
    before[constraint.right]?.push(constraint);
  }
  const order = topologicalOrder(count, after, before);
  const column = new Int32Array(count);
  for (const block of order) {
    for (const { left } of before[block] ?? []) column[block] = Math.max(column[block]!, column[left]! + 1);
  }
  shorten(graph, order, { column, after, before });
  spreadWaysBack(graph, search, isBack, column);
  return column;
}

/** Wires on a way back count the other way round; the wire that enters a way back leaves it free where to begin. */
function constraintsOf(graph: Graph, { leadsBack }: DepthFirst, isBack: readonly boolean[]): Constraint[] {
  return graph.edges.flatMap(({ from, to }, number): Constraint[] => {
    if (isBack[from]) return isBack[to] && leadsBack[number] ? [] : [{ left: to, right: from }];
    return isBack[to] || leadsBack[number] ? [] : [{ left: from, right: to }];
  });
}

/**
 * Blocks so that every constraint leads forward (Kahn 1962). They have no cycle, as only wires that lead back close
 * one.
 */
function topologicalOrder(count: number, after: readonly Constraint[][], before: readonly Constraint[][]): number[] {
  const open = before.map(list => list.length);
  const order = Array.from({ length: count }, (_, block) => block).filter(block => open[block] === 0);
  for (let next = 0; next < order.length; next += 1) {
    for (const { right } of after[order[next]!] ?? []) {
      open[right]! -= 1;
      if (open[right] === 0) order.push(right);
    }
  }
  if (order.length < count) throw new Error('the columns of an arrangement have a cycle');
  return order;
}

interface Layering {
  readonly column: Int32Array;
  readonly after: readonly Constraint[][];
  readonly before: readonly Constraint[][];
}

/** From the right: an input, or a block with more wires ahead than behind, moves up to what it feeds. */
function shorten(graph: Graph, order: readonly number[], { column, after, before }: Layering): void {
  for (const block of order.toReversed()) {
    const ahead = after[block] ?? [];
    if (ahead.length === 0) continue;
    const isInput = graph.blocks[block]?.kind === 'input';
    if (!isInput && ahead.length <= (before[block]?.length ?? 0)) continue;
    column[block] = Math.min(...ahead.map(({ right }) => column[right]! - 1));
  }
}

/**
 * Blocks on a way back move to the middle between where it ends and where it begins, those near its beginning first.
 */
function spreadWaysBack(
  graph: Graph,
  { found, foundOver }: DepthFirst,
  isBack: readonly boolean[],
  column: Int32Array,
): void {
  const blocks = graph.blocks.map((_, block) => block).filter(block => isBack[block]);
  for (const block of blocks.sort((a, b) => found[a]! - found[b]!)) {
    const source = graph.edges[foundOver[block]!]?.from;
    if (source === undefined) continue;
    const last = column[source]! - (isBack[source] ? 1 : 0);
    if (last > column[block]!) column[block] = Math.floor((column[block]! + last) / 2);
  }
}
