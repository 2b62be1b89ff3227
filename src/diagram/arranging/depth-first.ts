/**
 * Which wires lead back: a depth-first search from the inputs (Tarjan 1972) follows the signal, and a wire to a block
 * that is still being followed closes a loop. Without these wires the graph has no cycle.
 */

import type { Graph } from './graph.ts';

export interface DepthFirst {
  /** By edge: whether it closes a loop. */
  readonly leadsBack: readonly boolean[];
  /** By block: the edge over which it was found; −1 for a start. */
  readonly foundOver: Int32Array;
  /** By block: its place in the order in which blocks were found. */
  readonly found: Int32Array;
}

/** Starts with the inputs, then blocks that nothing feeds, then whatever is left, each in document order. */
export function depthFirst(graph: Graph): DepthFirst {
  const count = graph.blocks.length;
  const numbers = Array.from({ length: count }, (_, number) => number);
  const isInput = (number: number): boolean => graph.blocks[number]?.kind === 'input';
  const isFed = (number: number): boolean => (graph.entering[number]?.length ?? 0) > 0;
  const starts = [
    ...numbers.filter(isInput),
    ...numbers.filter(number => !isInput(number) && !isFed(number)),
    ...numbers.filter(isFed),
  ];
  const search: Search = {
    graph,
    leadsBack: graph.edges.map(() => false),
    foundOver: new Int32Array(count).fill(-1),
    found: new Int32Array(count).fill(-1),
    isFollowed: new Uint8Array(count),
    count: 0,
  };
  for (const start of starts) if (search.found[start] === -1) follow(search, start);
  return search;
}

interface Search {
  readonly graph: Graph;
  readonly leadsBack: boolean[];
  readonly foundOver: Int32Array;
  readonly found: Int32Array;
  readonly isFollowed: Uint8Array;
  count: number;
}

/** With a stack of its own, since a chain of blocks may be longer than the call stack is deep. */
function follow(search: Search, start: number): void {
  const { graph, leadsBack, foundOver, found, isFollowed } = search;
  const path = [{ block: start, next: 0 }];
  found[start] = search.count++;
  isFollowed[start] = 1;
  for (let top = path.at(-1); top !== undefined; top = path.at(-1)) {
    const edgeNumber = graph.leaving[top.block]?.[top.next];
    const edge = edgeNumber === undefined ? undefined : graph.edges[edgeNumber];
    if (edgeNumber === undefined || edge === undefined) {
      isFollowed[top.block] = 0;
      path.pop();
      continue;
    }
    top.next += 1;
    if (found[edge.to] === -1) {
      found[edge.to] = search.count++;
      foundOver[edge.to] = edgeNumber;
      isFollowed[edge.to] = 1;
      path.push({ block: edge.to, next: 0 });
    } else if (isFollowed[edge.to] === 1) leadsBack[edgeNumber] = true;
  }
}
