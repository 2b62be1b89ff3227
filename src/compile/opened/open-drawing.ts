/**
 * A flat drawing opened at its dead times and limiters: each of them becomes an input of the model, and what feeds it an output. What is
 * left is linear without approximation, and a simulation puts dead times and limits back exactly.
 */

import type { DelayBlock, LimiterBlock } from '../../diagram/index.ts';
import type { FlatBlock, FlatDrawing } from '../flatten/index.ts';

/** A block that was taken out, with the places of its output among the opened model's inputs and of its input among the outputs. */
export interface OpenedBlock {
  readonly block: DelayBlock | LimiterBlock;
  readonly path: string;
  readonly name: string;
}

export interface OpenedDrawing {
  readonly drawing: FlatDrawing;
  /** In document order: their outputs are the inputs, and their inputs the outputs, that come after the drawing's own. */
  readonly opened: readonly OpenedBlock[];
  /** For each input of the opened drawing the opened block whose output it is, −1 for one of the drawing's own. */
  readonly inputOf: readonly number[];
}

/** @param isOpened  which of the dead times and limiters are taken out. */
export function openDrawing(flat: FlatDrawing, isOpened: (block: DelayBlock | LimiterBlock) => boolean): OpenedDrawing {
  const opened: OpenedBlock[] = [];
  const inputOf: number[] = [];
  const blocks: FlatBlock[] = [];
  const sources: number[][] = [];
  const ends: { readonly flatBlock: FlatBlock; readonly source: number }[] = [];
  flat.blocks.forEach((flatBlock, b) => {
    const { block, path, name, role } = flatBlock;
    const source = Array.from(flat.source.subarray(flat.inputStart[b], flat.inputStart[b + 1]));
    if ((block.kind === 'delay' || block.kind === 'limiter') && isOpened(block)) {
      inputOf.push(opened.length);
      opened.push({ block, path, name });
      // A name that no block of the document can have.
      blocks.push({ block: { kind: 'input', id: block.id }, path, name: `out of ${name}`, role: 'external' });
      sources.push([]);
      const end = { block: { kind: 'output', id: block.id }, path, name: `into ${name}`, role: 'external' } as const;
      ends.push({ flatBlock: end, source: source[0] ?? -1 });
      return;
    }
    if (block.kind === 'input' && role === 'external') inputOf.push(-1);
    blocks.push(flatBlock);
    sources.push(source);
  });
  for (const { flatBlock, source } of ends) {
    blocks.push(flatBlock);
    sources.push([source]);
  }
  const signals = flat.signalStart[flat.blocks.length] ?? 0;
  const inputStart = new Int32Array(blocks.length + 1);
  sources.forEach((ports, b) => {
    inputStart[b + 1] = (inputStart[b] ?? 0) + ports.length;
  });
  // The opened blocks give one signal each, as before; the outputs at the end give none.
  const signalStart = Int32Array.from({ length: blocks.length + 1 }, (_, b) => flat.signalStart[b] ?? signals);
  return { drawing: { blocks, inputStart, signalStart, source: Int32Array.from(sources.flat()) }, opened, inputOf };
}
