/** Where the wires of one output part: the filled dots that tell a branch from two lines that only cross. */

import type { Point } from '../types.ts';
import type { Route, WireRoute } from './types.ts';
import type { EndedWire } from './wire-ends.ts';

/**
 * Branching points of all nets, each once, nets in the order of their first wire. Two routes from one port part at the end of what
 * they have in common from there.
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

function netDots(routes: readonly Route[]): readonly Point[] {
  const dots = new Map<string, Point>();
  routes.forEach((route, index) => {
    let farthest: Parting | null = null;
    for (const earlier of routes.slice(0, index)) {
      const here = parting(earlier, route);
      if (farthest === null || here.length > farthest.length) farthest = here;
    }
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
