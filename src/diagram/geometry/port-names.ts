/**
 * The names at a group's ports: those of the inputs and outputs of its own sheet, in block order, as format.md has it.
 */

import { nameSpans, type Span } from '../../expression/index.ts';
import type { Block, GroupBlock } from '../types.ts';
import { cutToWidth, TYPE } from './content.ts';

const WIDEST = 70;

interface PortNames {
  readonly inputs: readonly (readonly Span[])[];
  readonly outputs: readonly (readonly Span[])[];
}

/** What stands beside each port of a group, inside its frame. */
export function portNames(group: GroupBlock): PortNames {
  const named = (kind: Block['kind']): (readonly Span[])[] =>
    group.sheet.blocks
      .filter(block => block.kind === kind)
      .map(block => cutToWidth(nameSpans(block.name ?? block.id), TYPE.port, WIDEST, 'math'));
  return { inputs: named('input'), outputs: named('output') };
}
