/** The other way round: which entries of the system matrix a block or a wire takes part in. */

import { type Branch, reachedFrom } from './action-graph.ts';
import { columnNode, rowNode } from './entry-nodes.ts';
import type { EntryPlace } from './trace.ts';
import type { TracedDrawing } from './traced-drawing.ts';
import type { WireEnd } from './traced-parts.ts';

/** A block, or the wire that ends at a port; a group stands for all that is in it. */
export type DrawingPart = { readonly block: string } | { readonly wire: WireEnd };

/**
 * Entries, row by row, on whose ways from column to row the part lies, paths and loops alike; zero ones too, where products
 * cancel. Linear in the drawing for each row and column.
 */
export function entriesOn(traced: TracedDrawing, part: DrawingPart): readonly EntryPlace[] {
  const { graph, model } = traced;
  const [n, m, p] = [model.states.length, model.inputs.length, model.outputs.length];
  const columns = new Map(places(n + m, column => columnNode(traced, column)));
  const rows = new Map(places(n + p, row => rowNode(traced, row)));
  const found = new Map<string, EntryPlace>();
  // Together only those that begin and end at the same nodes: a block of several ports is several ways.
  for (const [from, ends] of grouped(graph.branches.filter(branch => isPart(traced, branch, part)))) {
    const before = reachedFrom(graph, [from], 'backwards');
    const after = reachedFrom(graph, ends, 'forwards');
    const sinks = [...after].flatMap(node => rows.get(node) ?? []);
    for (const node of before) {
      const column = columns.get(node);
      if (column === undefined) continue;
      for (const row of sinks) found.set(`${row} ${column}`, { row, column });
    }
  }
  return [...found.values()].sort((a, b) => a.row - b.row || a.column - b.column);
}

function places(count: number, nodeOf: (place: number) => number): (readonly [number, number])[] {
  return Array.from({ length: count }, (_, place) => [nodeOf(place), place] as const).filter(([node]) => node >= 0);
}

function grouped(branches: readonly Branch[]): ReadonlyMap<number, readonly number[]> {
  const ends = new Map<number, number[]>();
  for (const { from, to } of branches) {
    const known = ends.get(from) ?? [];
    known.push(to);
    ends.set(from, known);
  }
  return ends;
}

function isPart({ drawing, parts }: TracedDrawing, { block, port }: Branch, part: DrawingPart): boolean {
  if ('block' in part) {
    const { path } = drawing.blocks[block]!;
    return path === part.block || path.startsWith(`${part.block}.`);
  }
  if (port === null) return false;
  const end = parts.wireInto(port);
  return end.block === part.wire.block && end.port === part.wire.port && end.sheet === part.wire.sheet;
}
