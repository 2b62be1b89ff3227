/** The ends of a sheet's wires, its nets, and the order in which they are routed. */

import type { PortPlace, SheetGeometry } from '../geometry/index.ts';
import type { Block, Sheet, Wire } from '../types.ts';
import { outward, type PortEnd } from './types.ts';

/** A wire with both ends on the sheet. */
export interface EndedWire {
  /** Place among the sheet's wires. */
  readonly index: number;
  readonly wire: Wire;
  readonly from: PortEnd;
  readonly to: PortEnd;
  /** Number of its net, from 1: all wires of one output port. */
  readonly net: number;
}

/** Every wire whose blocks and ports exist, in document order. */
export function endedWires(sheet: Sheet, geometry: SheetGeometry): readonly EndedWire[] {
  const blocks = new Map(sheet.blocks.map(block => [block.id, block]));
  const nets = new Map<string, number>();
  const ended: EndedWire[] = [];
  for (const [index, wire] of sheet.wires.entries()) {
    const from = portEnd(blocks.get(wire.from[0]), geometry.get(wire.from[0])?.outputs[wire.from[1]]);
    const to = portEnd(blocks.get(wire.to[0]), geometry.get(wire.to[0])?.inputs[wire.to[1]]);
    if (from === null || to === null) continue;
    const source = `${wire.from[0]}:${wire.from[1]}`;
    const net = nets.get(source) ?? nets.size + 1;
    nets.set(source, net);
    ended.push({ index, wire, from, to, net });
  }
  return ended;
}

function portEnd(block: Block | undefined, place: PortPlace | undefined): PortEnd | null {
  if (block === undefined || place === undefined) return null;
  const [x, y] = block.at ?? [0, 0];
  return { x: x + place.x, y: y + place.y, side: place.side };
}

/** What a bend is worth in length when the wires are put in order. */
const BEND = 40;

/**
 * The order of routing: bend points that the user has set first, then straight wires, then from short to long, so that
 * the long way round goes outside. Equal ones in document order.
 */
export function routingOrder(wires: readonly EndedWire[]): readonly EndedWire[] {
  const ranked = wires.map(wire => ({ wire, rank: rank(wire) }));
  ranked.sort((a, b) => a.rank - b.rank || a.wire.index - b.wire.index);
  return ranked.map(({ wire }) => wire);
}

function rank({ wire, from, to }: EndedWire): number {
  if ((wire.via?.length ?? 0) > 0) return -1;
  const dx = to.x - from.x;
  const dy = to.y - from.y;
  const [x, y] = outward(from.side);
  const [backX, backY] = outward(to.side);
  const ahead = dx * x + dy * y > 0;
  const arrives = -(dx * backX + dy * backY) > 0;
  if (ahead && arrives && (dx === 0 || dy === 0)) return 0;
  return Math.abs(dx) + Math.abs(dy) + (ahead ? BEND : 2 * BEND) + (arrives ? 0 : 2 * BEND);
}
