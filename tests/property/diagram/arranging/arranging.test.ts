import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { placeUnplaced } from '../../../../src/diagram/arranging/index.ts';
import { blockRectangle, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import type { Block, Sheet } from '../../../../src/diagram/types.ts';
import { placedSheet } from '../../../arbitraries/placed-sheets.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const RUNS = { seed: SEED, numRuns: 100 };

const unplacedSheet = placedSheet(14).map(({ blocks, wires }): Sheet => ({ blocks: blocks.map(withoutPlace), wires }));

function withoutPlace({ at: _, mirrored: __, ...block }: Block): Block {
  return block;
}

describe('an arranged drawing', { timeout: 60_000 }, () => {
  test('has every block on the grid and none on another', () => {
    fc.assert(
      fc.property(unplacedSheet, sheet => {
        const placed = placeUnplaced(sheet);
        const geometry = sheetGeometry(placed);
        const frames = placed.blocks.flatMap(block => {
          const own = geometry.get(block.id);
          expect(block.at?.every(coordinate => coordinate % 20 === 0)).toBe(true);
          return own === undefined ? [] : [blockRectangle(block, own, 10)];
        });
        frames.forEach((a, index) => {
          for (const b of frames.slice(index + 1)) {
            expect(a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom).toBe(false);
          }
        });
      }),
      RUNS,
    );
  });

  test('is the same for the same drawing', () => {
    fc.assert(
      fc.property(unplacedSheet, sheet => {
        expect(placeUnplaced(structuredClone(sheet))).toEqual(placeUnplaced(sheet));
      }),
      RUNS,
    );
  });
});
