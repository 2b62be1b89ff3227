/** What messages, the screen and screen readers call a block. */

import type { Block, BlockKind } from './types.ts';

/** The trade's word for each kind, as in the middle of a sentence. */
export const KIND_WORDS: Readonly<Record<BlockKind, string>> = {
  input: 'input',
  output: 'output',
  gain: 'gain',
  summer: 'summing point',
  integrator: 'integrator',
  'transfer-function': 'transfer function',
  'state-model': 'state model',
  delay: 'dead time',
  differentiator: 'differentiator',
  limiter: 'limiter',
  group: 'group',
};

/** The signal or state name that is shown and exported: the block's name, its id where it has none. */
export function displayName(block: Block): string {
  return block.name ?? block.id;
}

/**
 * Kind and name, as in the middle of a sentence: `gain K_p`, `summing point e`, `integrator q`; only the name where it says
 * the kind already (`gain2`). A block without name and id is called by what is in it: `gain 3.5`.
 */
export function blockTitle(block: Block): string {
  const word = KIND_WORDS[block.kind];
  const name = displayName(block);
  if (name === '') return contentTitle(block, word);
  return name.startsWith(word) && /^\d*$/.test(name.slice(word.length)) ? name : `${word} ${name}`;
}

function contentTitle(block: Block, word: string): string {
  switch (block.kind) {
    case 'gain':
      return `${word} ${block.gain}`;
    case 'summer':
      return `${word} ${block.signs}`;
    case 'transfer-function':
      return `${word} (${block.numerator})/(${block.denominator})`;
    case 'delay':
      return `${word} ${block.time}`;
    default:
      return word;
  }
}

/** `blockTitle` at the beginning of a sentence: `Gain K_p`. */
export function blockTitleAtStart(block: Block): string {
  const title = blockTitle(block);
  return title.charAt(0).toUpperCase() + title.slice(1);
}
