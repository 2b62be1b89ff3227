/** The parts that are placed by their key, by a press or by dragging, in textbook notation. */

import type { WrittenBlock } from '../../diagram/write-a-block/index.ts';

export interface Part {
  readonly id: string;
  /** Read out and shown as a tip. */
  readonly label: string;
  /** What is written on it. */
  readonly symbol: string;
  /** The key that places it, upper case as shown. */
  readonly key: string;
  readonly block: WrittenBlock;
}

/** The media type of a part while it is dragged. */
export const PART_MIME = 'application/x-poleward-part';

export const PARTS: readonly Part[] = [
  { id: 'input', label: 'input', symbol: 'u →', key: 'U', block: { kind: 'input' } },
  { id: 'output', label: 'output', symbol: '→ y', key: 'Y', block: { kind: 'output' } },
  { id: 'gain', label: 'gain', symbol: 'K', key: 'G', block: { kind: 'gain', gain: '1' } },
  { id: 'summer', label: 'summing point', symbol: 'Σ', key: 'A', block: { kind: 'summer', signs: '+-' } },
  { id: 'integrator', label: 'integrator', symbol: '1/s', key: 'I', block: { kind: 'integrator' } },
  {
    id: 'transfer-function',
    label: 'transfer function',
    symbol: 'N/D',
    key: 'F',
    block: { kind: 'transfer-function', numerator: '1', denominator: 's + 1' },
  },
  { id: 'delay', label: 'dead time', symbol: 'e⁻ˢᵀ', key: 'D', block: { kind: 'delay', time: '1' } },
  { id: 'limiter', label: 'limiter', symbol: '−1..1', key: 'E', block: { kind: 'limiter', lower: '-1', upper: '1' } },
];

export function isPart(id: string): boolean {
  return PARTS.some(part => part.id === id);
}

/** The part with that id, or the one that a key places. */
export function partOf(idOrKey: string): Part | undefined {
  return PARTS.find(({ id, key }) => id === idOrKey || key === idOrKey.toUpperCase());
}
