/** The room that a block takes with its labels, from its centre. */

import { type BlockGeometry, type Rectangle, sheetGeometry } from '../geometry/index.ts';
import type { Block } from '../types.ts';

/**
 * Geometry of a block by itself, as nothing of its surroundings is known yet, and the rectangle of its frame and
 * labels.
 */
export interface Extent {
  readonly geometry: BlockGeometry;
  readonly area: Rectangle;
}

/** The extent of one block, signs at the ports left out: they lie along its wires. */
export function blockExtent(block: Block): Extent {
  const geometry = sheetGeometry({ blocks: [block], wires: [] }).get(block.id);
  if (geometry === undefined) throw new Error(`no geometry for ${block.id}`);
  const { width, height } = geometry.box;
  const area = { left: -width / 2, right: width / 2, top: -height / 2, bottom: height / 2 };
  for (const { text, area: label } of geometry.labels) {
    if (text.role === 'sign') continue;
    area.left = Math.min(area.left, label.left);
    area.right = Math.max(area.right, label.right);
    area.top = Math.min(area.top, label.top);
    area.bottom = Math.max(area.bottom, label.bottom);
  }
  return { geometry, area };
}
