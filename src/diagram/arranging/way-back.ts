/** The blocks on the way back of a loop, which a drawing has underneath the way forward and mirrored. */

import type { BlockKind } from '../types.ts';
import type { DepthFirst } from './depth-first.ts';
import type { Graph } from './graph.ts';

/**
 * Kinds that stand on a way back; summing points and integrators keep the direction of reading, terminals have no way
 * back.
 */
const MAY_LEAD_BACK: ReadonlySet<BlockKind> = new Set([
  'gain',
  'transfer-function',
  'delay',
  'differentiator',
  'limiter',
  'state-model',
  'group',
]);

/** By block: whether each of its wires closes a loop or leads to another such block. */
export function waysBack(graph: Graph, { leadsBack }: DepthFirst): readonly boolean[] {
  const isBack = graph.blocks.map(() => false);
  const waiting = graph.blocks.map((_, number) => number);
  for (let block = waiting.pop(); block !== undefined; block = waiting.pop()) {
    const kind = graph.blocks[block]?.kind;
    const leaving = graph.leaving[block] ?? [];
    if (isBack[block] || kind === undefined || !MAY_LEAD_BACK.has(kind) || leaving.length === 0) continue;
    if (!leaving.every(edge => leadsBack[edge] || isBack[graph.edges[edge]?.to ?? -1])) continue;
    isBack[block] = true;
    for (const edge of graph.entering[block] ?? []) waiting.push(graph.edges[edge]?.from ?? block);
  }
  return isBack;
}
