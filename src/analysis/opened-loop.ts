/**
 * The drawing with one wire opened: what the wire fed is fed by a new input, what fed it is read by a new output, and every
 * other loop stays closed. The drawing's own inputs are zero there and its outputs are not asked for.
 */

import type { Block, Diagram, PortReference, Wire } from '../diagram/index.ts';

/** The opened drawing, its one input and one output being those of the cut; null where no wire ends at `to`. */
export function openedDiagram(diagram: Diagram, to: PortReference): Diagram | null {
  const cut = diagram.wires.find(wire => wire.to[0] === to[0] && wire.to[1] === to[1]);
  if (cut === undefined) return null;
  const isExternal = ({ kind }: Block) => kind === 'input' || kind === 'output';
  const external = new Set(diagram.blocks.filter(isExternal).map(({ id }) => id));
  const taken = new Set(diagram.blocks.flatMap(({ id, name }) => [id, name ?? id]));
  const put = unused('cut_in', taken);
  const read = unused('cut_out', taken);
  const ends: readonly Wire[] = [
    { from: cut.from, to: [read, 0] },
    { from: [put, 0], to: cut.to },
  ];
  return {
    ...diagram,
    blocks: [
      { kind: 'input', id: put },
      ...diagram.blocks.filter(block => !isExternal(block)),
      { kind: 'output', id: read },
    ],
    wires: [...diagram.wires.filter(wire => wire !== cut), ...ends].filter(
      ({ from, to: end }) => !external.has(from[0]) && !external.has(end[0]),
    ),
  };
}

function unused(name: string, taken: ReadonlySet<string>): string {
  let free = name;
  for (let k = 2; taken.has(free); k++) free = `${name}${k}`;
  return free;
}
