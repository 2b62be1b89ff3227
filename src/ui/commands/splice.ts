/** The edits that put a block into a wire and take one out of its wires. */

import { type Block, type Edit, type PortReference, portCounts, type Sheet, type Wire } from '../../diagram/index.ts';

/** Whether a block can stand in a wire: it has an input and an output. */
export function canStandInWire(block: Block): boolean {
  const { inputs, outputs } = portCounts(block);
  return inputs > 0 && outputs > 0;
}

/** Whether any wire starts or ends at the block. */
export function isWired({ wires }: Sheet, id: string): boolean {
  return wires.some(({ from, to }) => from[0] === id || to[0] === id);
}

/** Leads a wire through the first input and output of a block on the sheet; its name stays on the part before the block. */
export function spliceEdits(wire: Wire, id: string): readonly Edit[] {
  const before: Edit = { kind: 'connect', from: wire.from, to: [id, 0] };
  return [
    { kind: 'disconnect', to: wire.to },
    wire.name === undefined ? before : { ...before, name: wire.name },
    { kind: 'connect', from: [id, 0], to: wire.to },
  ];
}

/**
 * Takes a block out of its wires: what fed the lowest of its wired inputs then feeds what it fed. No edits where no wire is
 * at the block.
 */
export function pullOutEdits({ wires }: Sheet, id: string): readonly Edit[] {
  const into = wires.filter(({ to }) => to[0] === id).sort((a, b) => a.to[1] - b.to[1]);
  const onwards = wires.filter(({ from, to }) => from[0] === id && to[0] !== id);
  const edits: Edit[] = [...into, ...onwards].map(({ to }) => ({ kind: 'disconnect', to }));
  const source: PortReference | undefined = into.find(({ from }) => from[0] !== id)?.from;
  if (source === undefined) return edits;
  return [...edits, ...onwards.map((wire): Edit => ({ kind: 'connect', from: source, to: wire.to }))];
}
