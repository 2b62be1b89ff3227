import { describe, expect, test } from 'vitest';
import { type Rectangle, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import type { Point, Sheet } from '../../../../src/diagram/index.ts';
import { routeWires } from '../../../../src/diagram/routing/index.ts';
import { alignmentLines } from '../../../../src/ui/sheet/alignment-lines.ts';
import { heldRoutes } from '../../../../src/ui/sheet/held-routes.ts';

const at = (x: number, y: number, width: number, height: number): Rectangle => ({
  left: x - width / 2,
  right: x + width / 2,
  top: y - height / 2,
  bottom: y + height / 2,
});

describe('alignment lines', () => {
  test('join the centres of blocks that stand in one row', () => {
    expect(alignmentLines(at(0, 0, 20, 20), [at(100, 0, 40, 40)], 500)).toEqual([
      { axis: 'y', at: 0, from: -10, to: 120 },
    ]);
  });

  test('join edges where the centres do not agree', () => {
    // Both left edges are at −10.
    expect(alignmentLines(at(0, 0, 20, 20), [at(20, 100, 60, 40)], 500)).toEqual([
      { axis: 'x', at: -10, from: -10, to: 120 },
    ]);
  });

  test('lead to the nearest of the neighbours in line', () => {
    const lines = alignmentLines(at(0, 0, 20, 20), [at(300, 0, 20, 20), at(100, 0, 20, 20)], 500);
    expect(lines).toContainEqual({ axis: 'y', at: 0, from: -10, to: 110 });
  });

  test('are not drawn to blocks out of line or out of reach', () => {
    expect(alignmentLines(at(0, 0, 20, 20), [at(100, 3, 20, 30)], 500)).toEqual([]);
    expect(alignmentLines(at(0, 0, 20, 20), [at(900, 0, 20, 20)], 500)).toEqual([]);
  });
});

describe('routes while much is dragged', () => {
  const sheet: Sheet = {
    blocks: [
      { id: 'u', kind: 'input', at: [0, 0] },
      { id: 'a', kind: 'gain', gain: '1', at: [120, 0] },
      { id: 'b', kind: 'gain', gain: '2', at: [240, 0] },
      { id: 'x', kind: 'integrator', at: [400, 0] },
      { id: 'y', kind: 'output', at: [520, 0] },
    ],
    wires: [
      { from: ['u', 0], to: ['a', 0] },
      { from: ['a', 0], to: ['b', 0] },
      { from: ['b', 0], to: ['x', 0] },
      { from: ['x', 0], to: ['y', 0] },
    ],
  };
  const former = { sheet, geometry: sheetGeometry(sheet), routes: routeWires(sheet) };
  const held = new Map<string, Point>([
    ['a', [160, 60]],
    ['b', [280, 60]],
  ]);
  const moved: Sheet = {
    ...sheet,
    blocks: sheet.blocks.map(block => ({ ...block, at: held.get(block.id) ?? block.at ?? [0, 0] })),
  };
  const routes = heldRoutes(former, { sheet: moved, geometry: sheetGeometry(moved) }, held);

  test('wires that the drag does not touch keep their routes', () => {
    expect(routes.wires[3]).toBe(former.routes.wires[3]);
  });

  test('wires between dragged blocks move along with them', () => {
    const before = former.routes.wires[1]?.points ?? [];
    expect(routes.wires[1]?.points).toEqual(before.map(([x, y]) => [x + 40, y + 60]));
  });

  test('wires to the rest start and end at their ports, at right angles', () => {
    for (const [index, wire] of [routes.wires[0], routes.wires[2]].entries()) {
      const points = wire?.points ?? [];
      const full = routeWires(moved).wires[index * 2]?.points ?? [];
      expect(points[0]).toEqual(full[0]);
      expect(points.at(-1)).toEqual(full.at(-1));
      expect(points.slice(1).every(([x, y], k) => x === points[k]?.[0] || y === points[k]?.[1])).toBe(true);
    }
  });
});
