/**
 * Routes one wire: the cheapest way from its net's tree to its port. Where the near surroundings hold no way the window
 * is widened. What is routed is taken into the grid, so later wires of other nets keep off it.
 */

import { lineFrom } from './grid-lines.ts';
import { branchings, type NetTree } from './net-trees.ts';
import { type Axis, type Beginning, cheapestWay } from './path-search.ts';
import { simplified } from './polyline.ts';
import { BLOCKED, LABEL, NEAR, nodeAt, nodesAlong, occupy, pointAt, type SheetGrid, STANDING } from './sheet-grid.ts';
import { type SheetRouter, treeOf } from './sheet-router.ts';
import { SHORT_STUB, stubNodes } from './stubs.ts';
import { isHorizontal, outward, type PortEnd, type Route } from './types.ts';
import type { EndedWire } from './wire-ends.ts';

/** How far around its ends a wire's way is sought, in turn. */
const WINDOWS = [120, 500, Number.POSITIVE_INFINITY] as const;

/**
 * Prices of a branch for each unit that it is closer to a port than `FROM_PORT`, under a name, and close to a frame.
 */
const BRANCH_PRICES = { eachUnit: 0.4, underLabel: 24, near: 4 } as const;
const FROM_PORT = 40;

/**
 * How a way is sought once a wire's patience is used up: the remaining length counts three times, as what it will cross
 * may cost.
 */
const HASTE = 3;
const LAST_PATIENCE = 60_000;

/** Routes a wire and takes its nodes; null where no way was found. */
export function routeWire(router: SheetRouter, wire: EndedWire): Route | null {
  const { grid } = router.space;
  const { from, to, net } = wire;
  const tree = treeOf(router, net);
  const way = straightWay(grid, wire, tree) ?? wayThrough(router, wire, tree);
  if (way === null) return null;
  tree.add(way);
  const points = tree.wayTo(way.at(-1) ?? -1).map(node => pointAt(grid, node));
  const route = simplified([[from.x, from.y], ...points, [to.x, to.y]]);
  occupy(grid, route, net);
  return route;
}

/** The straight line from port to port, where the net has no tree yet and nothing is in the way. */
function straightWay(grid: SheetGrid, { from, to, wire, net }: EndedWire, tree: NetTree): readonly number[] | null {
  const [x, y] = outward(from.side);
  const [backX, backY] = outward(to.side);
  const facing = x === -backX && y === -backY && (to.x - from.x) * x + (to.y - from.y) * y > 0;
  const aligned = x !== 0 ? from.y === to.y : from.x === to.x;
  if (!tree.isEmpty || (wire.via?.length ?? 0) > 0 || !facing || !aligned) return null;
  const nodes = nodesAlong(grid, [
    [from.x, from.y],
    [to.x, to.y],
  ]);
  const owners = x !== 0 ? grid.horizontalNet : grid.verticalNet;
  const isAtPort = (node: number): boolean => {
    const [nodeX, nodeY] = pointAt(grid, node);
    return [from, to].some(end => end.x === nodeX && end.y === nodeY);
  };
  const isFree = nodes.every(node => {
    if (owners[node] !== 0 && owners[node] !== net) return false;
    return (grid.surroundings[node]! & STANDING) !== BLOCKED || isAtPort(node);
  });
  return isFree ? nodes : null;
}

/** The cheapest way from the net's tree through the wire's own bend points to where its port is entered. */
function wayThrough(router: SheetRouter, wire: EndedWire, tree: NetTree): readonly number[] | null {
  const { grid } = router.space;
  const out = stubNodes(grid, wire.from);
  const into = stubNodes(grid, wire.to);
  const source = out.at(-1);
  const target = into.at(-1);
  if (source === undefined || target === undefined) return null;
  const stops = [...(wire.wire.via ?? []).map(point => nodeAt(grid, point)), target];
  const added = new Set([...out, ...into.slice(0, -1)]);
  const own = { has: (node: number) => tree.nodes.has(node) || added.has(node) };
  let way: readonly number[] = tree.isEmpty ? out : [];
  let beginnings = tree.isEmpty
    ? [{ node: source, axis: axisOf(wire.from), cost: 0 }]
    : branchings(tree, axisOf(wire.from), node => branchPrice(router, wire.net, tree, node));
  for (const [index, stop] of stops.entries()) {
    const goalAxis = index === stops.length - 1 ? axisOf(wire.to) : null;
    const piece = wayInWindows(router, wire, { beginnings, goal: stop, goalAxis, own });
    if (piece === null) return null;
    for (const node of piece) added.add(node);
    way = [...way, ...(way.length > 0 ? piece.slice(1) : piece)];
    beginnings = [{ node: stop, axis: arrivalAxis(way, axisOf(wire.from)), cost: 0 }];
  }
  return [...way, ...into.toReversed().slice(1)];
}

const axisOf = (end: PortEnd): Axis => (isHorizontal(end.side) ? 'horizontal' : 'vertical');

function arrivalAxis(way: readonly number[], otherwise: Axis): Axis {
  const last = way.at(-1);
  const before = way.at(-2);
  if (last === undefined || before === undefined) return otherwise;
  return Math.abs(last - before) === 1 ? 'horizontal' : 'vertical';
}

/** What it costs to branch at a node; infinite where a dot would stand on a port's stub or on a crossing. */
function branchPrice({ space, ends }: SheetRouter, net: number, tree: NetTree, node: number): number {
  const { grid } = space;
  const owners = [grid.horizontalNet[node]!, grid.verticalNet[node]!];
  if (owners.some(owner => owner !== 0 && owner !== net)) return Number.POSITIVE_INFINITY;
  const closest = tree.portDistance(node, () => {
    const [x, y] = pointAt(grid, node);
    let least = FROM_PORT;
    for (const end of ends.get(net) ?? []) least = Math.min(least, Math.abs(x - end.x) + Math.abs(y - end.y));
    return least;
  });
  if (closest < SHORT_STUB) return Number.POSITIVE_INFINITY;
  const there = grid.surroundings[node]!;
  let price = (FROM_PORT - closest) * BRANCH_PRICES.eachUnit;
  if (there & LABEL) price += BRANCH_PRICES.underLabel;
  if ((there & STANDING) >= NEAR) price += BRANCH_PRICES.near;
  return price;
}

interface Piece {
  readonly beginnings: readonly Beginning[];
  readonly goal: number;
  readonly goalAxis: Axis | null;
  readonly own: Pick<ReadonlySet<number>, 'has'>;
}

function wayInWindows(router: SheetRouter, { from, to, net }: EndedWire, piece: Piece): readonly number[] | null {
  const { space, patience } = router;
  const { xs, ys } = space.grid;
  const [goalX, goalY] = pointAt(space.grid, piece.goal);
  const leadsOn = from.side === 'right' && to.side === 'left' && to.x > from.x;
  const middle = leadsOn ? (from.x + to.x) / 2 : null;
  for (const margin of WINDOWS) {
    const window = {
      left: lineFrom(xs, Math.min(from.x, goalX) - margin),
      right: Math.min(xs.length, lineFrom(xs, Math.max(from.x, goalX) + margin)) - 1,
      top: lineFrom(ys, Math.min(from.y, goalY) - margin),
      bottom: Math.min(ys.length, lineFrom(ys, Math.max(from.y, goalY) + margin)) - 1,
    };
    const question = { ...piece, net, window, middle };
    let way = cheapestWay(space, { ...question, haste: 1, patience });
    if (way === 'given-up') way = cheapestWay(space, { ...question, haste: HASTE, patience: LAST_PATIENCE });
    if (way === 'given-up') return null;
    if (way !== 'none') return way;
  }
  return null;
}
