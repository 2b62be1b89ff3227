/**
 * A block as a list of shapes in its own coordinates. The sheet on the screen and the sheet in a file both draw from
 * this list, so they cannot differ.
 */

import type { Block, Sheet } from '../types.ts';
import { SUMMING_RADIUS, TERMINAL_RADIUS } from './block-box.ts';
import { blockContent } from './content.ts';
import type { BlockGeometry, Ink, Shape } from './types.ts';

/**
 * The shapes of a block, centre at (0, 0), in drawing order: frame, what stands in it, labels.
 *
 * @param value  the number behind the symbol, shown in small type under a gain, a dead time or a limiter that has a
 *               symbol; nothing is shown there where it is left out.
 */
export function blockDrawing(block: Block, geometry: BlockGeometry, value?: string): readonly Shape[] {
  return [...frame(block, geometry), ...blockContent(block).shapes, ...labels(geometry, value)];
}

function frame(block: Block, { outline, box }: BlockGeometry): readonly Shape[] {
  switch (outline) {
    case 'terminal':
      return [{ kind: 'circle', x: 0, y: 0, radius: TERMINAL_RADIUS, ink: 'line' }];
    case 'circle':
      return [{ kind: 'circle', x: 0, y: 0, radius: SUMMING_RADIUS, ink: 'line' }];
    case 'stadium':
    case 'rectangle': {
      const corner = outline === 'stadium' ? SUMMING_RADIUS : 0;
      const ink: Ink = holdsState(block) ? 'state' : 'line';
      return [{ kind: 'rectangle', x: -box.width / 2, y: -box.height / 2, ...box, corner, ink }];
    }
    default:
      return outline satisfies never;
  }
}

function labels(geometry: BlockGeometry, value: string | undefined): readonly Shape[] {
  return geometry.labels.flatMap(({ text }) => {
    if (text.role !== 'value') return [text];
    if (value === undefined || value === '') return [];
    return [{ ...text, spans: [{ text: value.replaceAll('-', '−'), italic: false, script: 'normal' as const }] }];
  });
}

/** Whether a block brings states of its own, which is what its heavier frame says. */
export function holdsState(block: Block): boolean {
  switch (block.kind) {
    case 'integrator':
    case 'delay':
      return true;
    case 'transfer-function':
      return /\bs\b/.test(block.denominator);
    case 'state-model':
      return block.A.length > 0;
    case 'group':
      return sheetHoldsState(block.sheet);
    case 'input':
    case 'output':
    case 'gain':
    case 'summer':
    case 'differentiator':
    case 'limiter':
      return false;
    default:
      return block satisfies never;
  }
}

function sheetHoldsState(sheet: Sheet): boolean {
  return sheet.blocks.some(holdsState);
}
