/** How many wires a block can take and give (format.md, Blocks). */

import type { Block } from './types.ts';

/** Numbers of input and output ports of a block; a group's are its sheet's inputs and outputs. */
export function portCounts(block: Block): { readonly inputs: number; readonly outputs: number } {
  switch (block.kind) {
    case 'input':
      return { inputs: 0, outputs: 1 };
    case 'output':
      return { inputs: 1, outputs: 0 };
    case 'summer':
      return { inputs: block.signs.length, outputs: 1 };
    case 'state-model':
      return {
        inputs: Math.max(block.B[0]?.length ?? 0, block.D[0]?.length ?? 0),
        outputs: Math.max(block.C.length, block.D.length),
      };
    case 'group': {
      const count = (kind: Block['kind']): number => block.sheet.blocks.filter(inner => inner.kind === kind).length;
      return { inputs: count('input'), outputs: count('output') };
    }
    default:
      return { inputs: 1, outputs: 1 };
  }
}
