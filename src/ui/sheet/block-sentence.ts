/** A block as a sentence for the screen reader: "gain K_p, 0.5, from summing point e to integrator q". */

import { type Block, blockTitle, type Sheet } from '../../diagram/index.ts';

/** Kind and name as the sheet shows them: a gain without a name of its own goes by what is written in it. */
export function shownTitle(block: Block): string {
  return block.kind === 'gain' && block.name === undefined ? `gain ${block.gain}` : blockTitle(block);
}

/** Neighbours by block id, made once for a sheet. */
interface Neighbours {
  readonly from: ReadonlyMap<string, readonly string[]>;
  readonly to: ReadonlyMap<string, readonly string[]>;
}

const known = new WeakMap<Sheet, Neighbours>();

export function blockSentence(block: Block, sheet: Sheet): string {
  const { from, to } = neighboursOf(sheet);
  const parts = [shownTitle(block)];
  const sources = from.get(block.id);
  const targets = to.get(block.id);
  if (sources !== undefined) parts.push(`from ${sources.join(' and ')}`);
  if (targets !== undefined) parts.push(`to ${targets.join(' and ')}`);
  if (sources === undefined && targets === undefined) parts.push('not connected');
  return parts.join(', ');
}

function neighboursOf(sheet: Sheet): Neighbours {
  const before = known.get(sheet);
  if (before !== undefined) return before;
  const titles = new Map(sheet.blocks.map(block => [block.id, shownTitle(block)]));
  const from = new Map<string, string[]>();
  const to = new Map<string, string[]>();
  for (const wire of sheet.wires) {
    listUnder(from, wire.to[0]).push(titles.get(wire.from[0]) ?? wire.from[0]);
    listUnder(to, wire.from[0]).push(titles.get(wire.to[0]) ?? wire.to[0]);
  }
  const neighbours = { from, to };
  known.set(sheet, neighbours);
  return neighbours;
}

function listUnder(map: Map<string, string[]>, key: string): string[] {
  const list = map.get(key) ?? [];
  map.set(key, list);
  return list;
}
