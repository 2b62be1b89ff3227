/**
 * Where ports lie on a frame that stands alone. Summing points and terminals, which look at their wires, build on this.
 */

import { portCounts } from '../port-counts.ts';
import type { Block } from '../types.ts';
import { type Box, GRID, type PortPlace } from './types.ts';

/** Up to this many ports stand two squares apart, more of them one square. */
const ROOMY = 4;

/**
 * Heights of `count` ports on an upright side, from the top, relative to the centre. All are whole grid squares and
 * symmetrical about the centre; an even number of close ports leaves the middle free.
 *
 * @param roomy  two squares apart; one where false.
 */
export function portOffsets(count: number, roomy = count <= ROOMY): readonly number[] {
  const middle = (count - 1) / 2;
  return Array.from({ length: count }, (_, index) => {
    const step = index - middle;
    if (roomy) return step * 2 * GRID;
    return (count % 2 === 1 ? step : step + Math.sign(step) / 2) * GRID;
  });
}

/** The ports of a rectangle: inputs on the left, outputs on the right, the other way round where it is mirrored. */
export function rectanglePorts(
  block: Block,
  box: Box,
): { readonly inputs: readonly PortPlace[]; readonly outputs: readonly PortPlace[] } {
  const counts = portCounts(block);
  const side = (count: number, onLeft: boolean): PortPlace[] =>
    portOffsets(count).map(y => ({
      x: onLeft ? -box.width / 2 : box.width / 2,
      y,
      side: onLeft ? 'left' : 'right',
    }));
  const mirrored = block.mirrored === true;
  return { inputs: side(counts.inputs, !mirrored), outputs: side(counts.outputs, mirrored) };
}
