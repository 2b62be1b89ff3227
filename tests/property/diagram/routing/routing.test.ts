import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { blockRectangle, type Rectangle, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import { type Route, type Routes, rerouteMoved, routeWires } from '../../../../src/diagram/routing/index.ts';
import type { Block, Point, Sheet } from '../../../../src/diagram/types.ts';
import { placedSheet } from '../../../arbitraries/placed-sheets.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const RUNS = { seed: SEED, numRuns: 100 };

interface Piece extends Rectangle {
  readonly net: string;
}

function piecesOf(route: Route, net: string): readonly Piece[] {
  return route.slice(1).map(([x1, y1], index) => {
    const [x0, y0] = route[index] ?? [x1, y1];
    return { net, left: Math.min(x0, x1), right: Math.max(x0, x1), top: Math.min(y0, y1), bottom: Math.max(y0, y1) };
  });
}

function allPieces(sheet: Sheet, { wires }: Routes): readonly Piece[] {
  return sheet.wires.flatMap(({ from }, index) => piecesOf(wires[index]?.points ?? [], from.join()));
}

function expectOrthogonalBetweenPorts(sheet: Sheet, routes: Routes): void {
  const geometry = sheetGeometry(sheet);
  const places = new Map(sheet.blocks.map(({ id, at }) => [id, at ?? [0, 0]]));
  const end = (id: string, place: { readonly x: number; readonly y: number } | undefined): Point => {
    const [x, y] = places.get(id) ?? [0, 0];
    return [x + (place?.x ?? 0), y + (place?.y ?? 0)];
  };
  sheet.wires.forEach(({ from, to }, index) => {
    const points = routes.wires[index]?.points ?? [];
    expect(points[0]).toEqual(end(from[0], geometry.get(from[0])?.outputs[from[1]]));
    expect(points.at(-1)).toEqual(end(to[0], geometry.get(to[0])?.inputs[to[1]]));
    for (const { left, right, top, bottom } of piecesOf(points, ''))
      expect(left === right || top === bottom).toBe(true);
  });
}

function expectClearOfBlocks(sheet: Sheet, routes: Routes): void {
  const geometry = sheetGeometry(sheet);
  const frame = (block: Block): Rectangle => {
    const placed = geometry.get(block.id);
    if (placed === undefined) throw new Error(`no geometry for ${block.id}`);
    return blockRectangle(block, placed);
  };
  for (const block of sheet.blocks) {
    const { left, right, top, bottom } = frame(block);
    for (const piece of allPieces(sheet, routes)) {
      const inside = piece.left < right && piece.right > left && piece.top < bottom && piece.bottom > top;
      expect(inside, `a wire of ${piece.net} runs through ${block.id}`).toBe(false);
    }
  }
}

function expectNetsApart(sheet: Sheet, routes: Routes): void {
  const pieces = allPieces(sheet, routes);
  pieces.forEach((a, index) => {
    for (const b of pieces.slice(index + 1)) {
      if (a.net === b.net) continue;
      const level = a.top === a.bottom && b.top === b.bottom && a.top === b.top;
      const upright = a.left === a.right && b.left === b.right && a.left === b.left;
      const overlapping =
        (level && a.left <= b.right && b.left <= a.right) || (upright && a.top <= b.bottom && b.top <= a.bottom);
      expect(overlapping, `wires of ${a.net} and ${b.net} run on one line`).toBe(false);
    }
  });
}

/** Nodes of degree three or more in the union of a net's pieces are what dots have to mark. */
function expectDotsWhereWiresPart(sheet: Sheet, routes: Routes): void {
  const dots = new Set(routes.dots.map(point => point.join()));
  const nets = new Map<string, Set<string>>();
  for (const { net, left, right, top, bottom } of allPieces(sheet, routes)) {
    const units = nets.get(net) ?? new Set<string>();
    nets.set(net, units);
    for (let x = left; x < right; x += 1) units.add(`${x},${top},h`);
    for (let y = top; y < bottom; y += 1) units.add(`${left},${y},v`);
  }
  const parting = new Set<string>();
  for (const units of nets.values()) {
    const degrees = new Map<string, number>();
    for (const unit of units) {
      const [x = 0, y = 0] = unit.split(',').map(Number);
      const ends = unit.endsWith('h') ? [`${x},${y}`, `${x + 1},${y}`] : [`${x},${y}`, `${x},${y + 1}`];
      for (const end of ends) degrees.set(end, (degrees.get(end) ?? 0) + 1);
    }
    for (const [point, degree] of degrees) if (degree > 2) parting.add(point);
  }
  expect(dots).toEqual(parting);
}

describe('routes of a whole sheet', { timeout: 60_000 }, () => {
  test('join their ports with level and upright pieces, clear of every block, and none is forced', () => {
    fc.assert(
      fc.property(placedSheet(9), sheet => {
        const routes = routeWires(sheet);
        expect(routes.wires.filter(({ forced }) => forced)).toEqual([]);
        expectOrthogonalBetweenPorts(sheet, routes);
        expectClearOfBlocks(sheet, routes);
      }),
      RUNS,
    );
  });

  test('never run on one line with a wire of another output', () => {
    fc.assert(
      fc.property(placedSheet(9), sheet => expectNetsApart(sheet, routeWires(sheet))),
      RUNS,
    );
  });

  test('have a dot exactly where wires of one output part', () => {
    fc.assert(
      fc.property(placedSheet(7), sheet => expectDotsWhereWiresPart(sheet, routeWires(sheet))),
      RUNS,
    );
  });

  test('are the same for the same sheet', () => {
    fc.assert(
      fc.property(placedSheet(9), sheet => {
        expect(routeWires(structuredClone(sheet))).toEqual(routeWires(sheet));
      }),
      RUNS,
    );
  });
});

describe('routes after a move', { timeout: 60_000 }, () => {
  const move = fc.tuple(placedSheet(9), fc.nat(), fc.integer({ min: -1, max: 3 }), fc.integer({ min: -1, max: 3 }));

  function moved(sheet: Sheet, which: number, dx: number, dy: number): Sheet {
    const index = which % sheet.blocks.length;
    const blocks = sheet.blocks.map((block, each): Block => {
      const [x, y] = block.at ?? [0, 0];
      return each === index ? { ...block, at: [x + 20 * dx, y + 20 * dy] } : block;
    });
    return { blocks, wires: sheet.wires };
  }

  test('join their ports, clear of every block and of one another', () => {
    fc.assert(
      fc.property(move, ([sheet, which, dx, dy]) => {
        const after = moved(sheet, which, dx, dy);
        const routes = rerouteMoved(routeWires(sheet), sheet, after);
        expect(routes.wires.filter(({ forced }) => forced)).toEqual([]);
        expectOrthogonalBetweenPorts(after, routes);
        expectClearOfBlocks(after, routes);
        expectNetsApart(after, routes);
      }),
      RUNS,
    );
  });

  test('stay the same objects where nothing was touched', () => {
    fc.assert(
      fc.property(placedSheet(9), sheet => {
        const routes = routeWires(sheet);
        const again = rerouteMoved(routes, sheet, { ...sheet });
        expect(again.wires.every((wire, index) => wire === routes.wires[index])).toBe(true);
        expect(again.dots).toEqual(routes.dots);
      }),
      RUNS,
    );
  });
});
