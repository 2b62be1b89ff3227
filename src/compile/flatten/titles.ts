/** What messages call a block of a flat drawing. */

import { blockTitle } from '../../diagram/index.ts';
import type { FlatBlock } from './flat-drawing.ts';

/** The block's kind and full name, as in the middle of a sentence: `gain K_p`, `summing point drive.winding.diff`. */
export function titleOf({ block, name }: FlatBlock): string {
  return blockTitle({ ...block, name });
}

/** The same at the beginning of a sentence: `Gain K_p`. */
export function titleAtStart(block: FlatBlock): string {
  const title = titleOf(block);
  return title.charAt(0).toUpperCase() + title.slice(1);
}

/** Path or name of the group around a block, '' for a block on the top sheet. */
export function around(pathOrName: string, own: string): string {
  return pathOrName.slice(0, Math.max(0, pathOrName.length - own.length - 1));
}
