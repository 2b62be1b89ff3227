/** Finding blocks by name, kind, value or parameter: what is written is looked for in what the sheet shows of a block. */

import {
  type Block,
  blockTitle,
  displayName,
  type QuantityField,
  quantityFields,
  type Sheet,
} from '../../diagram/index.ts';
import { namesOfBlock } from './clipboard-text.ts';

export interface Found {
  readonly block: Block;
  /** What of the block holds the text, as shown beside its title; empty where the title does. */
  readonly because: string;
}

/**
 * Blocks that hold the text, best first: a name that is the text, then a parameter that is, a name that begins with it, any other;
 * document order among equals. None for a blank text.
 *
 * @param values  numeric value of a block's quantity as shown, by id, where it is known.
 */
export function findBlocks(sheet: Sheet, text: string, values: ReadonlyMap<string, string>): readonly Found[] {
  const wanted = text.trim().toLowerCase();
  if (wanted === '') return [];
  return sheet.blocks
    .flatMap((block, order) => {
      const match = matchOf(block, wanted, values.get(block.id));
      return match === null ? [] : [{ block, order, ...match }];
    })
    .sort((a, b) => a.rank - b.rank || a.order - b.order)
    .map(({ block, because }) => ({ block, because }));
}

interface Match {
  readonly rank: number;
  readonly because: string;
}

function matchOf(block: Block, wanted: string, value: string | undefined): Match | null {
  const name = displayName(block).toLowerCase();
  if (name === wanted) return { rank: 0, because: '' };
  const parameter = namesOfBlock(block).find(used => used.toLowerCase() === wanted);
  const field = quantityFields(block).find(({ text }) => text.toLowerCase().includes(wanted));
  if (parameter !== undefined) return { rank: 1, because: field === undefined ? parameter : written(field) };
  if (name.startsWith(wanted)) return { rank: 2, because: '' };
  if (blockTitle(block).toLowerCase().includes(wanted)) return { rank: 3, because: '' };
  if (field !== undefined) return { rank: 3, because: written(field) };
  if (value?.replaceAll('−', '-').toLowerCase().includes(wanted) === true)
    return { rank: 4, because: `value ${value}` };
  if (block.note?.toLowerCase().includes(wanted) === true) return { rank: 5, because: block.note };
  return null;
}

const written = ({ field, text }: QuantityField): string => `${field} ${text}`;
