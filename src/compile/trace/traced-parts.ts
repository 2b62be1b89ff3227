/** Blocks and wires of a walk as the drawing has them, with groups around them. */

import { portCounts } from '../../diagram/index.ts';
import { type FlatBlock, type FlatDrawing, titleOf } from '../flatten/index.ts';
import type { Branch } from './action-graph.ts';
import type { TracedStep } from './trace.ts';

/** The wire that ends at an input port: the sheet it is on by the ids of the groups around, '' for the top sheet, and the port. */
export interface WireEnd {
  /** `outer.inner`. */
  readonly sheet: string;
  readonly block: string;
  readonly port: number;
}

/** What a walk over a flat drawing is in the words and parts of the drawing with its groups. */
export interface DrawingParts {
  /** The wire into a port of the flat drawing that some wire feeds. */
  wireInto(port: number): WireEnd;
  /** The block as a step of a path: a gain by what is written in it. */
  stepOf(block: number): TracedStep;
}

/** The parts of one drawing. */
export function drawingParts(drawing: FlatDrawing): DrawingParts {
  const owners = ownersOfPorts(drawing);
  const groupPorts = groupInputs(drawing);
  return {
    wireInto: port => {
      const b = owners[port]!;
      const { path, block } = drawing.blocks[b]!;
      const around = aroundOf(path);
      const groupPort = groupPorts.get(b);
      if (groupPort !== undefined) return { sheet: aroundOf(around), block: lastOf(around), port: groupPort };
      return { sheet: around, block: block.id, port: port - drawing.inputStart[b]! };
    },
    stepOf: b => stepFrom(drawing.blocks[b]!),
  };
}

/** The blocks of some branches by index and the ports they enter by, in the order of the branches, each block once in a row. */
export function partsOfWalk(branches: readonly Branch[]): { readonly blocks: number[]; readonly ports: number[] } {
  const blocks: number[] = [];
  const ports: number[] = [];
  for (const { block, port } of branches) {
    if (port !== null) ports.push(port);
    if (blocks.at(-1) !== block) blocks.push(block);
  }
  return { blocks, ports };
}

function stepFrom(flat: FlatBlock): TracedStep {
  const { block, name } = flat;
  if (block.kind === 'gain' && block.name === undefined) return { word: '', math: block.gain };
  if (block.kind === 'summer' && block.name === undefined) return { word: 'summing point', math: '' };
  const title = titleOf(flat);
  if (name === '' || !title.endsWith(` ${name}`)) return { word: title, math: '' };
  return { word: title.slice(0, -name.length - 1), math: name };
}

function ownersOfPorts({ blocks, inputStart }: FlatDrawing): Int32Array {
  const owners = new Int32Array(inputStart[blocks.length] ?? 0);
  for (let b = 0; b < blocks.length; b++) owners.fill(b, inputStart[b], inputStart[b + 1]);
  return owners;
}

/** For each input block inside a group which port of the group it is: they count in the order of the blocks, as portCounts does. */
function groupInputs({ blocks }: FlatDrawing): ReadonlyMap<number, number> {
  const ports = new Map<number, number>();
  const counted = new Map<string, number>();
  blocks.forEach(({ block, path, role }, b) => {
    if (role !== 'boundary' || block.kind !== 'input') return;
    const around = aroundOf(path);
    const port = counted.get(around) ?? 0;
    counted.set(around, port + portCounts(block).outputs);
    ports.set(b, port);
  });
  return ports;
}

/** Path of the group around a block, '' on the top sheet; ids hold no dot. */
function aroundOf(path: string): string {
  return path.slice(0, Math.max(0, path.lastIndexOf('.')));
}

function lastOf(path: string): string {
  return path.slice(path.lastIndexOf('.') + 1);
}
