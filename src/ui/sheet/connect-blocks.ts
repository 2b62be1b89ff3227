/** Wiring two blocks, by mouse or by key, with what was done said. */

import { type Edit, type PortReference, portCounts } from '../../diagram/index.ts';
import { actions, store } from '../store/index.ts';
import { shownTitle } from './block-sentence.ts';

/**
 * Wires an output port to an input port; where the input port is null, to the block's first open one. A summing point
 * whose ports are all taken grows one.
 */
export function connectBlocks(from: PortReference, to: readonly [block: string, port: number | null]): boolean {
  const { blocks, wires } = store.getState().document.diagram;
  const source = blocks.find(({ id }) => id === from[0]);
  const target = blocks.find(({ id }) => id === to[0]);
  if (source === undefined || target === undefined) return false;
  if (portCounts(source).outputs === 0) return refuse(`${shownTitle(source)} has no output to wire from.`);
  const inputs = portCounts(target).inputs;
  if (inputs === 0) return refuse(`${shownTitle(target)} has no input to wire to.`);
  const taken = new Set(wires.filter(wire => wire.to[0] === target.id).map(wire => wire.to[1]));
  const open = Array.from({ length: inputs }, (_, port) => port).find(port => !taken.has(port));
  const port = to[1] !== null && !taken.has(to[1]) ? to[1] : open;
  const said = `Wired ${shownTitle(source)} to ${shownTitle(target)}.`;
  const edits: Edit[] = [];
  if (port === undefined && target.kind === 'summer' && target.signs.length < 16) {
    edits.push({ kind: 'setField', id: target.id, field: 'signs', value: `${target.signs}+` });
  }
  edits.push({ kind: 'connect', from, to: [target.id, port ?? to[1] ?? inputs] });
  return actions.editTogether(edits, said).length === 0;
}

function refuse(message: string): false {
  actions.notify(message, 'refused');
  return false;
}
