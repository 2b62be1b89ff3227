/** Where the wires of one output part: the filled dots that tell a branch from two lines that only cross. */

import type { Point, Sheet } from '../types.ts';
import type { Route, Routes, WireRoute } from './types.ts';
import type { EndedWire } from './wire-ends.ts';

/**
 * Branching points of all nets, each once, nets in the order of their first wire. Two routes from one port part at the
 * end of what they have in common from there.
 *
 * @param routes  by the wire's place among the sheet's wires.
 */
export function branchingPoints(wires: readonly EndedWire[], routes: readonly WireRoute[]): readonly Point[] {
  const nets = new Map<number, Route[]>();
  for (const { index, net } of wires) {
    const route = routes[index]?.points;
    if (route === undefined) continue;
    const list = nets.get(net);
    if (list === undefined) nets.set(net, [route]);
    else list.push(route);
  }
  return [...nets.values()].flatMap(netDots);
}

/**
 * What of each wire is not drawn with an earlier wire of the same output already: from where it parts to its input
 * port. Inked so, no line is drawn twice. In the order of the sheet's wires.
 */
export function ownParts(sheet: Sheet, { wires }: Routes): readonly Route[] {
  const drawn = new Map<string, Route[]>();
  return sheet.wires.map(({ from }, index) => {
    const route = wires[index]?.points ?? [];
    const net = `${from[0]}:${from[1]}`;
    const earlier = drawn.get(net) ?? [];
    const farthest = farthestParting(route, earlier);
    drawn.set(net, [...earlier, route]);
    return farthest === null ? route : routeFrom(route, farthest.length);
  });
}

/** What is left of a route beyond a length. */
function routeFrom(route: Route, length: number): Route {
  let passed = 0;
  for (let index = 1; index < route.length; index += 1) {
    const [x0, y0] = route[index - 1] ?? ORIGIN;
    const [x1, y1] = route[index] ?? ORIGIN;
    const piece = Math.abs(x1 - x0) + Math.abs(y1 - y0);
    if (passed + piece > length) {
      const along = length - passed;
      return [[x0 + Math.sign(x1 - x0) * along, y0 + Math.sign(y1 - y0) * along], ...route.slice(index)];
    }
    passed += piece;
  }
  return [];
}

function farthestParting(route: Route, earlier: readonly Route[]): Parting | null {
  let farthest: Parting | null = null;
  for (const other of earlier) {
    const here = parting(other, route);
    if (farthest === null || here.length > farthest.length) farthest = here;
  }
  return farthest;
}

function netDots(routes: readonly Route[]): readonly Point[] {
  const dots = new Map<string, Point>();
  routes.forEach((route, index) => {
    const farthest = farthestParting(route, routes.slice(0, index));
    if (farthest !== null) dots.set(farthest.point.join(), farthest.point);
  });
  return [...dots.values()];
}

interface Parting {
  readonly point: Point;
  /** How far along both routes it lies. */
  readonly length: number;
}

const ORIGIN: Point = [0, 0];

function parting(a: Route, b: Route): Parting {
  let point = a[0] ?? ORIGIN;
  let length = 0;
  for (let index = 1; index < Math.min(a.length, b.length); index += 1) {
    const [ax, ay] = a[index] ?? ORIGIN;
    const [bx, by] = b[index] ?? ORIGIN;
    const toA = [ax - point[0], ay - point[1]] as const;
    const toB = [bx - point[0], by - point[1]] as const;
    const sameWay = Math.sign(toA[0]) === Math.sign(toB[0]) && Math.sign(toA[1]) === Math.sign(toB[1]);
    if (!sameWay) break;
    const common = Math.min(Math.abs(toA[0] + toA[1]), Math.abs(toB[0] + toB[1]));
    point = [point[0] + Math.sign(toA[0]) * common, point[1] + Math.sign(toA[1]) * common];
    length += common;
    if (ax !== bx || ay !== by) break;
  }
  return { point, length };
}
