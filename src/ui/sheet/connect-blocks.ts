/** Wiring two blocks, by mouse or by key, with what was done said. */

import { type Block, type Edit, type PortReference, portCounts, type Wire } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { actions, store } from '../store/index.ts';
import { shownTitle } from './block-sentence.ts';

/** A summing point has at most so many ports (format version 1). */
const MOST_SIGNS = 16;

/** A place that a wire leads to: a port, or any free one of the block where it is null. */
export type WireTarget = readonly [block: string, port: number | null];

/**
 * Wires an output port to an input port; where the input port is null, to the block's first open one. A summing point
 * whose ports are all taken grows one.
 */
export function connectBlocks(from: PortReference, to: WireTarget): boolean {
  const { blocks, wires } = store.getState().document.diagram;
  const source = blocks.find(({ id }) => id === from[0]);
  const target = blocks.find(({ id }) => id === to[0]);
  if (source === undefined || target === undefined) return false;
  if (portCounts(source).outputs === 0) return refuse(`${atStart(source)} has no output to wire from.`);
  if (portCounts(target).inputs === 0) return refuse(`${atStart(target)} has no input to wire to.`);
  const { port, grown } = landing(target, to[1], wires);
  const said = `Wired ${shownTitle(source)} to ${shownTitle(target)}.`;
  return actions.editTogether([...grown, { kind: 'connect', from, to: [target.id, port] }], said).length === 0;
}

/** Moves an end of a wire to other ports, as one step; a summing point grows a port where it has none free. */
export function moveWireEnd(wire: Wire, from: PortReference, to: WireTarget): boolean {
  const { blocks, wires } = store.getState().document.diagram;
  const source = blocks.find(({ id }) => id === from[0]);
  const target = blocks.find(({ id }) => id === to[0]);
  if (source === undefined || target === undefined) return false;
  if (portCounts(source).outputs === 0) return refuse(`${atStart(source)} has no output to wire from.`);
  if (portCounts(target).inputs === 0) return refuse(`${atStart(target)} has no input to wire to.`);
  const others = wires.filter(other => other !== wire);
  const { port, grown } = landing(target, to[1], others);
  const newTo: PortReference = [target.id, port];
  const said = `Moved the wire: it leads from ${shownTitle(source)} to ${shownTitle(target)}.`;
  if (actions.editTogether([...grown, { kind: 'moveWireEnd', to: wire.to, newFrom: from, newTo }], said).length > 0)
    return false;
  actions.select({ blocks: new Set(), wires: new Set([wireKey({ from, to: newTo })]) });
  return true;
}

/** The port that a wire to the target ends at, and the edit that makes it where a summing point has to grow. */
function landing(
  target: Block,
  wanted: number | null,
  wires: readonly Wire[],
): { readonly port: number; readonly grown: readonly Edit[] } {
  const inputs = portCounts(target).inputs;
  const taken = new Set(wires.filter(wire => wire.to[0] === target.id).map(wire => wire.to[1]));
  if (wanted !== null && !taken.has(wanted)) return { port: wanted, grown: [] };
  const open = Array.from({ length: inputs }, (_, port) => port).find(port => !taken.has(port));
  const mayMove = wanted === null || target.kind === 'summer';
  if (open !== undefined && mayMove) return { port: open, grown: [] };
  if (target.kind !== 'summer' || target.signs.length >= MOST_SIGNS) return { port: wanted ?? inputs - 1, grown: [] };
  return { port: inputs, grown: [{ kind: 'setField', id: target.id, field: 'signs', value: `${target.signs}+` }] };
}

function atStart(block: Block): string {
  const title = shownTitle(block);
  return title.charAt(0).toUpperCase() + title.slice(1);
}

function refuse(message: string): false {
  actions.notify(message, 'refused');
  return false;
}
