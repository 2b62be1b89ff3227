/** Drawings in few words, for tests: blocks as records, wires as `from -> to` with `:port` where it is not the first. */

import type { Block, Diagram, Parameter, PortReference, Sheet, Wire } from '../../src/diagram/index.ts';

/** A sheet: its blocks, and wires such as `u -> sum:1`. */
export function sheet(blocks: readonly Block[], wires: readonly string[]): Sheet {
  return { blocks, wires: wires.map(wireOf) };
}

/** A drawing with parameters given as `{ k: '2' }`. */
export function draw(
  blocks: readonly Block[],
  wires: readonly string[],
  parameters: Readonly<Record<string, string>> = {},
): Diagram {
  return {
    format: 'poleward-diagram',
    version: 1,
    title: 'A drawing',
    parameters: Object.entries(parameters).map(([name, value]): Parameter => ({ name, value })),
    ...sheet(blocks, wires),
  };
}

function wireOf(text: string): Wire {
  const [from = '', to = ''] = text.split(' -> ');
  return { from: portOf(from), to: portOf(to) };
}

function portOf(text: string): PortReference {
  const [block = '', port = '0'] = text.split(':');
  return [block, Number(port)];
}

/** An input block. */
export const input = (id: string): Block => ({ id, kind: 'input' });
/** An output block. */
export const output = (id: string): Block => ({ id, kind: 'output' });
/** A gain. */
export const gain = (id: string, value: string): Block => ({ id, kind: 'gain', gain: value });
/** A summing point. */
export const sum = (id: string, signs: string): Block => ({ id, kind: 'summer', signs });
/** An integrator. */
export const integrator = (id: string): Block => ({ id, kind: 'integrator' });
/** A differentiator. */
export const differentiator = (id: string): Block => ({ id, kind: 'differentiator' });
/** A transfer function. */
export const quotient = (id: string, numerator: string, denominator: string): Block => ({
  id,
  kind: 'transfer-function',
  numerator,
  denominator,
});
/** A group. */
export const group = (id: string, inner: Sheet): Block => ({ id, kind: 'group', sheet: inner });
