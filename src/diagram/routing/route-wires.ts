/**
 * All wires of a sheet as orthogonal routes: around blocks, wires of one output on a common trunk, wires of different
 * outputs never on one line. After a move only what the move touches is routed again.
 */

import { blockRectangle, type Rectangle, type SheetGeometry, sheetGeometry } from '../geometry/index.ts';
import type { Point, Sheet } from '../types.ts';
import { branchingPoints } from './branching-points.ts';
import { elbowRoute } from './elbow-route.ts';
import { simplified } from './polyline.ts';
import { EVERYWHERE, regionAround, touches } from './region.ts';
import { routeWire } from './route-wire.ts';
import { sheetRouter } from './sheet-router.ts';
import { stubArea } from './stubs.ts';
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
 * Routes again what an edit touches: wires at blocks that moved or changed, new wires, wires whose ports have turned or whose bend points were taken out,
 * and wires that a changed block now stands on. All other routes stay the same objects.
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
  const changed = new Set(sheet.blocks.filter(block => !former.has(block)).map(({ id }) => id));
  const wires = endedWires(sheet, geometry);
  const obstacles = obstaclesOf(sheet, geometry, wires, changed);
  const formerRoutes = new Map(before.wires.map((wire, index) => [wireKey(wire), previous.wires[index]]));
  const formerVia = new Map(before.wires.map(wire => [wireKey(wire), wire.via]));
  const kept = new Map<number, WireRoute>();
  for (const { index, from, to, wire, net } of wires) {
    const route = formerRoutes.get(wireKey(wire));
    if (route === undefined || changed.has(wire.from[0]) || changed.has(wire.to[0])) continue;
    if (wire.via === undefined && formerVia.get(wireKey(wire)) !== undefined) continue;
    if (!joins(route.points, from, to) || (wire.via ?? []).some(point => !passes(route.points, point))) continue;
    const isInTheWay = (obstacle: Obstacle): boolean => obstacle.net !== net && touches(route.points, obstacle.area);
    if (!obstacles.some(isInTheWay)) kept.set(index, route);
  }
  return complete(sheet, geometry, wires, kept);
}

/** What a route that is to stay must not touch; `net` is the net that may, 0 for none. */
interface Obstacle {
  readonly area: Rectangle;
  readonly net: number;
}

/** The frames of changed blocks and the straight pieces at their wired ports. */
function obstaclesOf(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  changed: ReadonlySet<string>,
): readonly Obstacle[] {
  const frames = sheet.blocks.flatMap((block): Obstacle[] => {
    const placed = changed.has(block.id) ? geometry.get(block.id) : undefined;
    return placed === undefined ? [] : [{ area: blockRectangle(block, placed), net: 0 }];
  });
  const stubs = wires.flatMap(({ wire, from, to, net }): Obstacle[] => [
    ...(changed.has(wire.from[0]) ? [{ area: stubArea(from), net }] : []),
    ...(changed.has(wire.to[0]) ? [{ area: stubArea(to), net }] : []),
  ]);
  return [...frames, ...stubs];
}

const NO_ROUTE: WireRoute = { points: [], forced: false };

/**
 * How often wires that found no way are put in front and everything is routed again, and on how large a sheet still.
 */
const RETRIES = 3;
const MOST_RETRIED_WIRES = 600;

function complete(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: ReadonlyMap<number, WireRoute>,
): Routes {
  const open = routingOrder(wires.filter(({ index }) => !kept.has(index)));
  const forcedAmong = (routes: ReadonlyMap<number, WireRoute>): readonly EndedWire[] =>
    open.filter(({ index }) => routes.get(index)?.forced === true);
  let found = routed(sheet, geometry, wires, kept, open);
  const first = new Set(forcedAmong(found));
  const isWorthwhile = kept.size === 0 && open.length <= MOST_RETRIED_WIRES;
  for (let retry = 0; isWorthwhile && first.size > 0 && retry < RETRIES; retry += 1) {
    const again = routed(sheet, geometry, wires, kept, [...first, ...open.filter(wire => !first.has(wire))]);
    const forced = forcedAmong(again);
    if (forced.length < forcedAmong(found).length) found = again;
    if (forced.length === 0) break;
    for (const wire of forced) first.add(wire);
  }
  const all = sheet.wires.map((_, index) => kept.get(index) ?? found.get(index) ?? NO_ROUTE);
  return { wires: all, dots: branchingPoints(wires, all) };
}

/** Routes of the wires `open`, found in their order, by place among the sheet's wires. */
function routed(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: ReadonlyMap<number, WireRoute>,
  open: readonly EndedWire[],
): ReadonlyMap<number, WireRoute> {
  const nets = new Set(open.map(({ net }) => net));
  const staying = wires.flatMap(({ index, net }) => {
    const route = kept.get(index);
    return route === undefined || route.forced ? [] : [{ net, route: route.points }];
  });
  const trunks = staying.filter(({ net }) => nets.has(net)).map(({ route }) => route);
  const ends = open.flatMap(({ from, to }) => [from, to]);
  const regions = kept.size === 0 ? [EVERYWHERE] : [regionAround(ends, trunks), EVERYWHERE];
  const found = new Map<number, WireRoute>();
  for (const region of open.length === 0 ? [] : regions) {
    const router = sheetRouter(sheet, geometry, wires, staying, { region, open: nets });
    for (const wire of open) {
      const points = router === null ? null : routeWire(router, wire);
      found.set(wire.index, points === null ? { points: plainRoute(wire), forced: true } : { points, forced: false });
    }
    if (open.every(({ index }) => found.get(index)?.forced === false)) break;
  }
  return found;
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

function passes(route: Route, [x, y]: Point): boolean {
  return touches(route, { left: x, top: y, right: x, bottom: y });
}
