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
import type { PortEnd, Route, Routes } from './types.ts';
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
 * Routes again what a move touches: wires at the blocks that moved, wires whose ports have turned or that are new, and wires
 * that a moved block now stands on. All other routes stay the same arrays.
 *
 * @param previous  the routes before the move.
 * @param moved     ids of the blocks that moved or changed.
 */
export function rerouteMoved(
  previous: Routes,
  sheet: Sheet,
  moved: ReadonlySet<string>,
  geometry: SheetGeometry = sheetGeometry(sheet),
): Routes {
  const wires = endedWires(sheet, geometry);
  const obstacles = sheet.blocks.flatMap(block => {
    const placed = moved.has(block.id) ? geometry.get(block.id) : undefined;
    return placed === undefined ? [] : [blockRectangle(block, placed)];
  });
  const forced = new Set(previous.forced);
  const kept = new Map<string, Route>();
  for (const { key, from, to, wire } of wires) {
    const route = previous.routes.get(key);
    if (route === undefined || forced.has(key)) continue;
    if (moved.has(wire.from[0]) || moved.has(wire.to[0])) continue;
    if (!joins(route, from, to) || (wire.via ?? []).some(point => !passes(route, point))) continue;
    if (!obstacles.some(obstacle => runsInto(route, obstacle))) kept.set(key, route);
  }
  return complete(sheet, geometry, wires, kept);
}

function complete(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: ReadonlyMap<string, Route>,
): Routes {
  const router = sheetRouter(sheet, geometry, wires, [...kept.values()]);
  const found = new Map(kept);
  const forced = new Set<string>();
  if (router !== null) {
    for (const wire of wires) {
      const route = kept.get(wire.key);
      if (route !== undefined) keepRoute(router, wire, route);
    }
  }
  for (const wire of routingOrder(wires.filter(({ key }) => !kept.has(key)))) {
    const route = router === null ? null : routeWire(router, wire);
    if (route === null) forced.add(wire.key);
    found.set(wire.key, route ?? plainRoute(wire));
  }
  const routes = new Map<string, Route>();
  for (const { key } of wires) {
    const route = found.get(key);
    if (route !== undefined) routes.set(key, route);
  }
  return { routes, dots: branchingPoints(wires, routes), forced: [...routes.keys()].filter(key => forced.has(key)) };
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
