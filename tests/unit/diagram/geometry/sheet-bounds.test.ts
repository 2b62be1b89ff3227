import { describe, expect, test } from 'vitest';
import { blockRectangle, sheetBounds, sheetGeometry, snap } from '../../../../src/diagram/geometry/index.ts';
import type { Sheet } from '../../../../src/diagram/types.ts';

describe('snapping', () => {
  test.each([
    [
      [0, 0],
      [0, 0],
    ],
    [
      [9.9, 10],
      [0, 20],
    ],
    [
      [-9.9, -10],
      [0, 0],
    ],
    [
      [-10.1, 133],
      [-20, 140],
    ],
  ] as const)('takes %j to the grid point %j', (from, to) => {
    expect(snap(from)).toEqual(to);
  });
});

describe('the bounds of a sheet', () => {
  test('do not exist where nothing stands on it', () => {
    expect(sheetBounds({ blocks: [], wires: [] })).toBeNull();
  });

  test('hold frames, names and bend points', () => {
    const sheet: Sheet = {
      blocks: [
        { id: 'k', kind: 'gain', gain: '2', at: [100, 100] },
        { id: 'torque', kind: 'output', at: [300, 100] },
      ],
      wires: [{ from: ['k', 0], to: ['torque', 0], via: [[200, 400]] }],
    };
    const bounds = sheetBounds(sheet);
    expect(bounds).toMatchObject({ left: 70, top: 80, bottom: 400 });
    expect(bounds?.right).toBeGreaterThan(330);
  });
});

test('a block’s rectangle is its frame around its centre, with a margin on request', () => {
  const block = { id: 'k', kind: 'gain', gain: '2', at: [100, 60] } as const;
  const geometry = sheetGeometry({ blocks: [block], wires: [] }).get('k');
  if (geometry === undefined) throw new Error('no geometry');
  expect(blockRectangle(block, geometry)).toEqual({ left: 70, right: 130, top: 40, bottom: 80 });
  expect(blockRectangle(block, geometry, 10)).toEqual({ left: 60, right: 140, top: 30, bottom: 90 });
});
