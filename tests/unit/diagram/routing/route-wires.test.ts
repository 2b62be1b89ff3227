import { describe, expect, test } from 'vitest';
import { ownParts, type Route, rerouteMoved, routeWires } from '../../../../src/diagram/routing/index.ts';
import type { Block, Sheet, Wire } from '../../../../src/diagram/types.ts';

const wire = (from: string, to: string, port = 0): Wire => ({ from: [from, 0], to: [to, port] });
const gain = (id: string, x: number, y: number, mirrored = false): Block => ({
  id,
  kind: 'gain',
  gain: '2',
  at: [x, y],
  mirrored,
});
const sum = (id: string, x: number, y: number, signs = '+-'): Block => ({ id, kind: 'summer', signs, at: [x, y] });

function routesOf(sheet: Sheet): readonly Route[] {
  return routeWires(sheet).wires.map(({ points }) => points);
}

/** Whether two routes have a piece on one line with a point in common. */
function runOnOneLine(a: Route, b: Route): boolean {
  const pieces = (route: Route) => route.slice(1).map((to, index) => [route[index] ?? to, to] as const);
  const meet = (low: number, high: number, otherLow: number, otherHigh: number): boolean =>
    Math.max(Math.min(low, high), Math.min(otherLow, otherHigh)) <=
    Math.min(Math.max(low, high), Math.max(otherLow, otherHigh));
  return pieces(a).some(([from, to]) =>
    pieces(b).some(([otherFrom, otherTo]) =>
      [0, 1].some(axis => {
        const along = 1 - axis;
        const lines = [from[axis], to[axis], otherFrom[axis], otherTo[axis]];
        const onOneLine = lines.every(line => line === lines[0]);
        return onOneLine && meet(from[along] ?? 0, to[along] ?? 0, otherFrom[along] ?? 0, otherTo[along] ?? 0);
      }),
    ),
  );
}

describe('a wire', () => {
  test('between two blocks of one height is one straight line', () => {
    const sheet = { blocks: [gain('a', 100, 100), gain('b', 300, 100)], wires: [wire('a', 'b')] };
    expect(routesOf(sheet)).toEqual([
      [
        [130, 100],
        [270, 100],
      ],
    ]);
  });

  test('to a block further down changes height half way', () => {
    const sheet = { blocks: [gain('a', 100, 100), gain('b', 300, 200)], wires: [wire('a', 'b')] };
    expect(routesOf(sheet)).toEqual([
      [
        [130, 100],
        [200, 100],
        [200, 200],
        [270, 200],
      ],
    ]);
  });

  test('runs around a block in between', () => {
    const blocks = [gain('a', 100, 100), gain('b', 500, 100), gain('between', 300, 100)];
    const [route = []] = routesOf({ blocks, wires: [wire('a', 'b')] });
    expect(route.length).toBeGreaterThan(2);
    const heights = route.map(([, y]) => y);
    expect(Math.max(...heights) >= 130 || Math.min(...heights) <= 70).toBe(true);
  });

  test('from a block to itself leads around it', () => {
    const [route = []] = routesOf({ blocks: [gain('a', 100, 100)], wires: [wire('a', 'a')] });
    expect(route[0]).toEqual([130, 100]);
    expect(route.at(-1)).toEqual([70, 100]);
    expect(Math.max(...route.map(([x]) => x))).toBeGreaterThanOrEqual(146);
    expect(Math.min(...route.map(([x]) => x))).toBeLessThanOrEqual(54);
  });

  test('of a mirrored block leaves to the left and enters from the right', () => {
    const blocks = [gain('a', 300, 100, true), gain('b', 100, 100, true)];
    expect(routesOf({ blocks, wires: [wire('a', 'b')] })).toEqual([
      [
        [270, 100],
        [130, 100],
      ],
    ]);
  });

  test('passes its own bend points in their order', () => {
    const via: Wire = {
      ...wire('a', 'b'),
      via: [
        [200, 300],
        [400, 300],
      ],
    };
    const [route = []] = routesOf({ blocks: [gain('a', 100, 100), gain('b', 500, 100)], wires: [via] });
    const places = route.map(point => point.join());
    expect(places.indexOf('200,300')).toBeGreaterThan(0);
    expect(places.indexOf('400,300')).toBeGreaterThan(places.indexOf('200,300'));
  });

  test('to a block that is not there has no points', () => {
    const sheet = { blocks: [gain('a', 100, 100)], wires: [wire('a', 'missing'), wire('missing', 'a')] };
    expect(routeWires(sheet).wires).toEqual([
      { points: [], forced: false },
      { points: [], forced: false },
    ]);
  });

  test('to a port that another block covers is a plain elbow and says so', () => {
    const sheet = {
      blocks: [gain('a', 100, 100), gain('b', 400, 200), gain('cover', 370, 200)],
      wires: [wire('a', 'b')],
    };
    const [route] = routeWires(sheet).wires;
    expect(route?.forced).toBe(true);
    expect(route?.points[0]).toEqual([130, 100]);
    expect(route?.points.at(-1)).toEqual([370, 200]);
  });

  test('reaches a block a million units away', () => {
    const sheet = { blocks: [gain('a', 0, 0), gain('b', 1_000_000, -1_000_000)], wires: [wire('a', 'b')] };
    const { wires } = routeWires(sheet);
    expect(wires[0]?.forced).toBe(false);
    expect(wires[0]?.points.at(-1)).toEqual([999_970, -1_000_000]);
  });

  test('joins blocks that stand off the grid', () => {
    const sheet = { blocks: [gain('a', 101.5, 97.25), gain('b', 333, 211)], wires: [wire('a', 'b')] };
    const [route = []] = routesOf(sheet);
    expect(route[0]).toEqual([131.5, 97.25]);
    expect(route.at(-1)).toEqual([303, 211]);
    expect(route).toHaveLength(4);
  });
});

describe('wires of one output', () => {
  const loop: Sheet = {
    blocks: [sum('e', 100, 100), gain('k', 240, 100), { id: 'y', kind: 'output', at: [400, 100] }],
    wires: [wire('e', 'k'), wire('k', 'y'), wire('k', 'e', 1)],
  };

  test('share a trunk and part at one dot', () => {
    const { dots } = routeWires(loop);
    expect(dots).toHaveLength(1);
    expect(dots[0]?.[1]).toBe(100);
    expect(dots[0]?.[0]).toBeGreaterThan(280);
    expect(dots[0]?.[0]).toBeLessThan(386);
  });

  test('are inked once: the branch from its dot, the trunk from the port', () => {
    const routes = routeWires(loop);
    const [, trunk = [], branch = []] = ownParts(loop, routes);
    expect(trunk[0]).toEqual([270, 100]);
    expect(branch[0]).toEqual(routes.dots[0]);
    expect(branch.at(-1)).toEqual([100, 114]);
  });

  test('have no dot where they only cross a wire of another output', () => {
    const blocks = [gain('a', 100, 200), gain('b', 500, 200), gain('c', 260, 60), gain('d', 380, 340)];
    const { dots, wires } = routeWires({ blocks, wires: [wire('a', 'b'), wire('c', 'd')] });
    expect(wires.every(({ forced }) => !forced)).toBe(true);
    expect(dots).toEqual([]);
  });
});

describe('after a move', () => {
  const before: Sheet = {
    blocks: [gain('a', 100, 100), gain('b', 300, 100), gain('c', 100, 300), gain('d', 500, 300)],
    wires: [wire('a', 'b'), wire('c', 'd')],
  };
  const withBlock = (block: Block): Sheet => ({
    blocks: before.blocks.map(old => (old.id === block.id ? block : old)),
    wires: before.wires,
  });

  test('the wires of the moved block follow and all others stay the same objects', () => {
    const routes = routeWires(before);
    const again = rerouteMoved(routes, before, withBlock(gain('b', 300, 160)));
    expect(again.wires[0]?.points.at(-1)).toEqual([270, 160]);
    expect(again.wires[1]).toBe(routes.wires[1]);
  });

  test('a wire that the block now stands on goes around it', () => {
    const again = rerouteMoved(routeWires(before), before, withBlock(gain('b', 300, 300)));
    expect(again.wires[1]?.forced).toBe(false);
    expect(again.wires[1]?.points.length).toBeGreaterThan(2);
  });

  test('a wire gives way that ran where a moved port is entered now', () => {
    const sheet: Sheet = {
      blocks: [gain('b0', 0, 20), gain('b1', 320, 40, true), { ...sum('b2', 560, 40), mirrored: true }],
      wires: [wire('b0', 'b0'), wire('b0', 'b1'), wire('b1', 'b2'), wire('b0', 'b2', 1)],
    };
    const after: Sheet = {
      blocks: sheet.blocks.map(block => (block.id === 'b1' ? gain('b1', 300, 20, true) : block)),
      wires: sheet.wires,
    };
    const { wires } = rerouteMoved(routeWires(sheet), sheet, after);
    expect(wires.every(({ forced }) => !forced)).toBe(true);
    const fromB1 = wires[2]?.points ?? [];
    for (const index of [0, 1, 3]) expect(runOnOneLine(fromB1, wires[index]?.points ?? [])).toBe(false);
  });

  test('a new wire is routed and a removed one is gone', () => {
    const after: Sheet = { blocks: before.blocks, wires: [wire('c', 'd'), wire('c', 'b')] };
    const routes = routeWires(before);
    const again = rerouteMoved(routes, before, after);
    expect(again.wires).toHaveLength(2);
    expect(again.wires[0]).toBe(routes.wires[1]);
    expect(again.wires[1]?.points.at(-1)).toEqual([270, 100]);
    expect(again.dots).toHaveLength(1);
  });
});
