/** The order in which warnings are told. */

import type { Warning } from '../problem/index.ts';
import type { FlatDrawing } from './flatten/index.ts';

/** Warnings by their first block in document order; those of one block in the order given. */
export function inDocumentOrder({ blocks }: FlatDrawing, warnings: readonly Warning[]): Warning[] {
  if (warnings.length < 2) return [...warnings];
  const places = new Map<string, number>();
  blocks.forEach(({ path }, b) => {
    for (let end = path.length; end > 0; end = path.lastIndexOf('.', end - 1)) {
      const part = path.slice(0, end); // a group stands where its first block does
      if (places.has(part)) break;
      places.set(part, b);
    }
  });
  const place = ({ blocks: [first] }: Warning) => places.get(first ?? '') ?? -1;
  return [...warnings].sort((a, b) => place(a) - place(b));
}
