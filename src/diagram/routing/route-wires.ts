/**
 * All wires of a sheet as orthogonal routes: around blocks, wires of one output on a common trunk, wires of different outputs never on
 * one line. After a move only what the move touches is routed again.
 */

import { blockRectangle, type Rectangle, type SheetGeometry, sheetGeometry } from '../geometry/index.ts';
import type { Point, Sheet } from '../types.ts';
import { branchingPoints } from './branching-points.ts';
import { elbowRoute } from './elbow-route.ts';
import { simplified } from './polyline.ts';
import { keepRoute, routeWire, sheetRouter } from './sheet-router.ts';
import { type PortEnd, type Route, type Routes, type WireRoute, wireKey } from './types.ts';
import { type EndedWire, endedWires, routingOrder } from './wire-ends.ts';

/**
 * Routes every wire of a sheet. The same sheet gives the same routes.
 *
 * @param geometry  that of the sheet, where it is at hand.
 */
export function routeWires(sheet: Sheet, geometry: SheetGeometry = sheetGeometry(sheet)): Routes {
  return complete(sheet, geometry, endedWires(sheet, geometry), new Map());
}

/**
 * Routes again what an edit touches: wires at blocks that moved or changed, new wires, wires whose ports have turned, and wires that a
 * changed block now stands on. All other routes stay the same objects.
 *
 * @param previous  the routes of the sheet `before`.
 */
export function rerouteMoved(
  previous: Routes,
  before: Sheet,
  sheet: Sheet,
  geometry: SheetGeometry = sheetGeometry(sheet),
): Routes {
  const former = new Set(before.blocks);
  const changed = sheet.blocks.filter(block => !former.has(block));
  const changedIds = new Set(changed.map(({ id }) => id));
  const obstacles = changed.flatMap(block => {
    const placed = geometry.get(block.id);
    return placed === undefined ? [] : [blockRectangle(block, placed)];
  });
  const formerRoutes = new Map(before.wires.map((wire, index) => [wireKey(wire), previous.wires[index]]));
  const wires = endedWires(sheet, geometry);
  const kept = new Map<number, WireRoute>();
  for (const { index, from, to, wire } of wires) {
    const route = formerRoutes.get(wireKey(wire));
    if (route === undefined || route.forced) continue;
    if (changedIds.has(wire.from[0]) || changedIds.has(wire.to[0])) continue;
    if (!joins(route.points, from, to) || (wire.via ?? []).some(point => !passes(route.points, point))) continue;
    if (!obstacles.some(obstacle => runsInto(route.points, obstacle))) kept.set(index, route);
  }
  return complete(sheet, geometry, wires, kept);
}

const NO_ROUTE: WireRoute = { points: [], forced: false };

function complete(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: ReadonlyMap<number, WireRoute>,
): Routes {
  const keptPoints = [...kept.values()].map(({ points }) => points);
  const router = sheetRouter(sheet, geometry, wires, keptPoints);
  const found: WireRoute[] = sheet.wires.map((_, index) => kept.get(index) ?? NO_ROUTE);
  for (const wire of wires) {
    const route = kept.get(wire.index);
    if (router !== null && route !== undefined) keepRoute(router, wire, route.points);
  }
  for (const wire of routingOrder(wires.filter(({ index }) => !kept.has(index)))) {
    const points = router === null ? null : routeWire(router, wire);
    found[wire.index] = points === null ? { points: plainRoute(wire), forced: true } : { points, forced: false };
  }
  const points = found.map(route => route.points);
  return { wires: found, dots: branchingPoints(wires, points) };
}

/** Elbows through the wire's own bend points, whatever stands there. */
function plainRoute({ from, to, wire }: EndedWire): Route {
  const via = wire.via ?? [];
  if (via.length === 0) return elbowRoute(from, to);
  const points: Point[] = [[from.x, from.y]];
  for (const [x, y] of [...via, [to.x, to.y] as const]) {
    const last = points.at(-1) ?? [x, y];
    points.push([x, last[1]], [x, y]);
  }
  return simplified(points);
}

function joins(route: Route, from: PortEnd, to: PortEnd): boolean {
  const first = route[0];
  const last = route.at(-1);
  return first?.[0] === from.x && first[1] === from.y && last?.[0] === to.x && last[1] === to.y;
}

function pieces(route: Route): readonly Rectangle[] {
  return route.slice(1).map(([x1, y1], index) => {
    const [x0, y0] = route[index] ?? [x1, y1];
    return { left: Math.min(x0, x1), right: Math.max(x0, x1), top: Math.min(y0, y1), bottom: Math.max(y0, y1) };
  });
}

function passes(route: Route, [x, y]: Point): boolean {
  return pieces(route).some(({ left, right, top, bottom }) => left <= x && x <= right && top <= y && y <= bottom);
}

function runsInto(route: Route, obstacle: Rectangle): boolean {
  return pieces(route).some(
    ({ left, right, top, bottom }) =>
      left <= obstacle.right && right >= obstacle.left && top <= obstacle.bottom && bottom >= obstacle.top,
  );
}
