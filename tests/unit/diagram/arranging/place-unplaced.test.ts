import { describe, expect, test } from 'vitest';
import { arrangeBlocks, placeUnplaced } from '../../../../src/diagram/arranging/index.ts';
import type { Block, GroupBlock, Point, Sheet, Wire } from '../../../../src/diagram/types.ts';

const wire = (from: string, to: string, port = 0): Wire => ({ from: [from, 0], to: [to, port] });
const gain = (id: string): Block => ({ id, kind: 'gain', gain: '2' });
const sum: Block = { id: 'e', kind: 'summer', signs: '+-' };
const input: Block = { id: 'r', kind: 'input' };
const output: Block = { id: 'y', kind: 'output' };
const integrator: Block = { id: 'x', kind: 'integrator' };

/** A loop: r → e → k → x → y, and back over h. */
const loop: Sheet = {
  blocks: [output, gain('h'), integrator, gain('k'), sum, input],
  wires: [wire('r', 'e'), wire('e', 'k'), wire('k', 'x'), wire('x', 'y'), wire('x', 'h'), wire('h', 'e', 1)],
};

function places(sheet: Sheet): ReadonlyMap<string, Point> {
  return new Map(sheet.blocks.map(({ id, at }) => [id, at ?? [Number.NaN, Number.NaN]]));
}

describe('a drawing without places', () => {
  const placed = placeUnplaced(loop);
  const at = places(placed);

  test('reads from left to right on one line', () => {
    const path = ['r', 'e', 'k', 'x', 'y'].map(id => at.get(id) ?? [Number.NaN, Number.NaN]);
    expect(new Set(path.map(([, y]) => y)).size).toBe(1);
    const xs = path.map(([x]) => x);
    expect(xs.toSorted((a, b) => a - b)).toEqual(xs);
    expect(new Set(xs).size).toBe(5);
  });

  test('has what leads back underneath and mirrored', () => {
    expect(at.get('h')?.[1]).toBeGreaterThan(at.get('k')?.[1] ?? Number.NaN);
    expect(at.get('h')?.[0]).toBeGreaterThan(at.get('e')?.[0] ?? Number.NaN);
    expect(placed.blocks.filter(({ mirrored }) => mirrored).map(({ id }) => id)).toEqual(['h']);
  });

  test('keeps a direction that its file gives', () => {
    const blocks = loop.blocks.map(block => (block.id === 'h' ? { ...block, mirrored: false } : block));
    expect(placeUnplaced({ ...loop, blocks }).blocks.find(({ id }) => id === 'h')?.mirrored).toBe(false);
  });

  test('keeps the order of its blocks and everything else in it', () => {
    const bare = placed.blocks.map(({ at: _, mirrored: __, ...block }) => block);
    expect(bare).toEqual(loop.blocks);
    expect(placed.wires).toBe(loop.wires);
  });

  test('has a disturbance above the path that it enters', () => {
    const disturbed: Sheet = {
      blocks: [input, { ...sum, signs: '+-+' }, integrator, output, { id: 'v', kind: 'input' }],
      wires: [wire('r', 'e'), wire('e', 'x'), wire('x', 'y'), wire('x', 'e', 1), wire('v', 'e', 2)],
    };
    const found = places(placeUnplaced(disturbed));
    expect(found.get('v')?.[1]).toBeLessThan(found.get('e')?.[1] ?? Number.NaN);
  });
});

describe('a drawing with places', () => {
  test('is given back as it is', () => {
    const placed = placeUnplaced(loop);
    expect(placeUnplaced(placed)).toBe(placed);
  });

  test('keeps them, and what has none comes underneath', () => {
    const standing: Block = { ...gain('k'), at: [333, 77] };
    const placed = placeUnplaced({ ...loop, blocks: loop.blocks.map(block => (block.id === 'k' ? standing : block)) });
    expect(placed.blocks.find(({ id }) => id === 'k')).toBe(standing);
    for (const { id, at } of placed.blocks) if (id !== 'k') expect(at?.[1]).toBeGreaterThan(97);
  });

  test('has its groups placed inside', () => {
    const group: GroupBlock = { id: 'g', kind: 'group', at: [100, 100], sheet: loop };
    const placed = placeUnplaced({ blocks: [group], wires: [] });
    const inner = placed.blocks[0];
    expect(inner?.kind === 'group' && inner.sheet.blocks.every(({ at }) => at !== undefined)).toBe(true);
  });
});

describe('arranging a selection', () => {
  const placed = placeUnplaced(loop);

  test('leaves a drawing alone that is arranged already', () => {
    const again = new Map(arrangeBlocks(placed, new Set()).map(({ id, at }) => [id, at]));
    expect(again).toEqual(places(placed));
  });

  test('gives places to the selected blocks only, off all others', () => {
    const ids = new Set(['k', 'x']);
    const found = arrangeBlocks(placed, ids);
    expect(found.map(({ id }) => id)).toEqual(['x', 'k']);
    expect(found.every(({ at: [x, y] }) => x % 20 === 0 && y % 20 === 0)).toBe(true);
  });
});

test('an empty sheet stays the same', () => {
  const empty: Sheet = { blocks: [], wires: [] };
  expect(placeUnplaced(empty)).toBe(empty);
  expect(arrangeBlocks(empty, new Set())).toEqual([]);
});
