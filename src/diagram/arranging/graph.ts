/** The blocks that are arranged as a graph: numbers in place of ids, each wire between two of them an edge. */

import type { Block, Sheet } from '../types.ts';

export interface Edge {
  readonly from: number;
  readonly to: number;
  readonly fromPort: number;
  readonly toPort: number;
}

/** Blocks by number, in document order; edges in the order of the wires. A block's wire to itself is left out. */
export interface Graph {
  readonly blocks: readonly Block[];
  readonly edges: readonly Edge[];
  /** Numbers of the edges that leave and enter each block. */
  readonly leaving: readonly (readonly number[])[];
  readonly entering: readonly (readonly number[])[];
}

/** The graph of the blocks with these ids, with the wires between them. */
export function graphOf(sheet: Sheet, ids: ReadonlySet<string>): Graph {
  const blocks = sheet.blocks.filter(({ id }) => ids.has(id));
  const numbers = new Map(blocks.map(({ id }, number) => [id, number]));
  const edges: Edge[] = [];
  const leaving: number[][] = blocks.map(() => []);
  const entering: number[][] = blocks.map(() => []);
  for (const wire of sheet.wires) {
    const from = numbers.get(wire.from[0]);
    const to = numbers.get(wire.to[0]);
    if (from === undefined || to === undefined || from === to) continue;
    leaving[from]?.push(edges.length);
    entering[to]?.push(edges.length);
    edges.push({ from, to, fromPort: wire.from[1], toPort: wire.to[1] });
  }
  return { blocks, edges, leaving, entering };
}

/** Numbers of the blocks that hang together, each part ascending, parts by their first block. */
export function connectedParts(graph: Graph): readonly (readonly number[])[] {
  const part = new Int32Array(graph.blocks.length).fill(-1);
  const parts: number[][] = [];
  graph.blocks.forEach((_, first) => {
    if (part[first] !== -1) return;
    const waiting = [first];
    part[first] = parts.length;
    const members: number[] = [];
    for (let block = waiting.pop(); block !== undefined; block = waiting.pop()) {
      members.push(block);
      const edges = [...(graph.leaving[block] ?? []), ...(graph.entering[block] ?? [])];
      for (const { from, to } of edges.flatMap(edge => graph.edges[edge] ?? [])) {
        for (const next of [from, to]) {
          if (part[next] !== -1) continue;
          part[next] = parts.length;
          waiting.push(next);
        }
      }
    }
    parts.push(members.sort((a, b) => a - b));
  });
  return parts;
}
