/**
 * Routes while much is dragged: wires between dragged blocks move along, wires from them to the rest are plain elbows, all
 * others stay. Cheap enough for every frame; the full way is found when the hand lets go.
 */

import type { BlockGeometry, SheetGeometry } from '../../diagram/geometry/index.ts';
import type { Point, PortReference, Sheet } from '../../diagram/index.ts';
import { elbowRoute, type PortEnd, type Routes, type WireRoute } from '../../diagram/routing/index.ts';

interface Placed {
  readonly sheet: Sheet;
  readonly geometry: SheetGeometry;
}

/**
 * @param former  the sheet at the start of the drag, or as it was last fully routed: the same wires in the same order.
 * @param held    where the dragged blocks are now, by id.
 * @returns       routes without the dots of wires that the drag touches.
 */
export function heldRoutes(
  former: Placed & { readonly routes: Routes },
  now: Placed,
  held: ReadonlyMap<string, Point>,
): Routes {
  const shift = shiftOf(former.sheet, held);
  const blocks = new Map(now.sheet.blocks.map(block => [block.id, block.at ?? ([0, 0] as const)]));
  const end = ([id, port]: PortReference, side: 'inputs' | 'outputs'): PortEnd | null =>
    endAt(blocks.get(id), now.geometry.get(id), port, side);
  const touched: Point[][] = [];
  const wires = now.sheet.wires.map((wire, index): WireRoute => {
    const route = former.routes.wires[index] ?? { points: [], forced: false };
    const [fromHeld, toHeld] = [held.has(wire.from[0]), held.has(wire.to[0])];
    if (!fromHeld && !toHeld) return route;
    touched.push([...route.points]);
    if (fromHeld && toHeld) return { ...route, points: route.points.map(([x, y]) => [x + shift[0], y + shift[1]]) };
    const [from, to] = [end(wire.from, 'outputs'), end(wire.to, 'inputs')];
    return from === null || to === null ? route : { points: elbowRoute(from, to), forced: true };
  });
  const corners = new Set(touched.flatMap(points => points.map(String)));
  const dots = former.routes.dots.filter(
    dot => !corners.has(String(dot)) && !touched.some(points => runsThrough(points, dot)),
  );
  return { wires, dots };
}

/** By how much everything in hand has moved: all of it moves together. */
function shiftOf({ blocks }: Sheet, held: ReadonlyMap<string, Point>): Point {
  for (const { id, at } of blocks) {
    const now = held.get(id);
    if (now !== undefined && at !== undefined) return [now[0] - at[0], now[1] - at[1]];
  }
  return [0, 0];
}

function endAt(
  at: Point | undefined,
  geometry: BlockGeometry | undefined,
  port: number,
  side: 'inputs' | 'outputs',
): PortEnd | null {
  const place = geometry?.[side][port];
  return at === undefined || place === undefined ? null : { x: at[0] + place.x, y: at[1] + place.y, side: place.side };
}

function runsThrough(points: readonly Point[], [x, y]: Point): boolean {
  return points.some(([x0, y0], index) => {
    const next = points[index + 1];
    if (next === undefined) return false;
    const isBeside = x === x0 && x === next[0] && (y - y0) * (y - next[1]) <= 0;
    return isBeside || (y === y0 && y === next[1] && (x - x0) * (x - next[0]) <= 0);
  });
}
