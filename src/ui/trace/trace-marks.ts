/** Which blocks and wires of the top sheet a trace lights, and as what. */

import type { Trace } from '../../compile/trace/index.ts';

export interface TraceMarkTable {
  /** By id: the row's and column's own block, one on a path, one on a loop alone. */
  readonly blocks: ReadonlyMap<string, 'end' | 'path' | 'loop'>;
  /** By `block:port` of the port it ends at. */
  readonly wires: ReadonlyMap<string, 'path' | 'loop'>;
}

/** The marks; a block inside a group marks the group. What could not be traced path by path is marked as path throughout. */
export function marksOf(trace: Trace): TraceMarkTable {
  const blocks = new Map<string, 'end' | 'path' | 'loop'>();
  const wires = new Map<string, 'path' | 'loop'>();
  const whole = { blocks: trace.blocks, wires: trace.wires };
  const [onPaths, onLoops] = trace.outcome === 'traced' ? [trace.paths, [whole]] : [[whole], []];
  for (const [walks, mark] of [
    [onLoops, 'loop'],
    [onPaths, 'path'],
  ] as const) {
    for (const walk of walks) {
      for (const path of walk.blocks) blocks.set(topOf(path), mark);
      for (const { sheet, block, port } of walk.wires) if (sheet === '') wires.set(`${block}:${port}`, mark);
    }
  }
  blocks.set(topOf(trace.from.block), 'end');
  blocks.set(topOf(trace.to.block), 'end');
  return { blocks, wires };
}

function topOf(path: string): string {
  return path.split('.', 1)[0] ?? path;
}
