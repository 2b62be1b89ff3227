/**
 * Routes wires one after the other on one grid. Each finds the cheapest way from its net's tree to its port, then its own nodes are
 * taken, so later wires of other nets keep off them. Where the near surroundings hold no way the window is widened, and where there is none at
 * all the wire becomes a plain elbow.
 */

import { blockRectangle, type Rectangle, type SheetGeometry } from '../geometry/index.ts';
import type { Point, Sheet } from '../types.ts';
import { lineFrom } from './grid-lines.ts';
import { branchings, NetTree } from './net-trees.ts';
import { type Axis, type Beginning, cheapestWay, type Searcher, searcher } from './path-search.ts';
import { simplified } from './polyline.ts';
import { BLOCKED, LABEL, NEAR, nodeAt, nodesAlong, occupy, pointAt, type SheetGrid, sheetGrid } from './sheet-grid.ts';
import { isHorizontal, outward, type PortEnd, type Route } from './types.ts';
import type { EndedWire } from './wire-ends.ts';

/** How far around its ends a wire's way is sought, in turn. */
const WINDOWS = [120, 500, Number.POSITIVE_INFINITY] as const;

/** How far a wire leads straight out of a port and straight into one. */
const STUB = 10;

/** Prices of a branch close to a port, under a name, and close to a frame. */
const BRANCH_PRICES = { atPort: 16, underLabel: 24, near: 4 } as const;
const CLOSE_TO_PORT = 20;

export interface SheetRouter {
  readonly space: Searcher;
  readonly trees: Map<number, NetTree>;
}

/** A router for a sheet; null where the sheet is too large for a grid, which leaves elbows. */
export function sheetRouter(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: readonly Route[],
): SheetRouter | null {
  const blocks: Rectangle[] = [];
  const labels: Rectangle[] = [];
  for (const block of sheet.blocks) {
    const placed = geometry.get(block.id);
    if (placed === undefined) continue;
    const [x, y] = block.at ?? [0, 0];
    blocks.push(blockRectangle(block, placed));
    for (const { area } of placed.labels) {
      labels.push({ left: x + area.left, right: x + area.right, top: y + area.top, bottom: y + area.bottom });
    }
  }
  const fixed = wires.flatMap(({ from, to, wire }): Point[] => [[from.x, from.y], [to.x, to.y], ...(wire.via ?? [])]);
  const points = [...fixed, ...kept.flat()];
  const grid = sheetGrid(blocks, labels, { xs: points.map(([x]) => x), ys: points.map(([, y]) => y) });
  if (grid === null) return null;
  const router: SheetRouter = { space: searcher(grid), trees: new Map() };
  for (const wire of wires) reserve(grid, wire);
  return router;
}

/** Keeps the way straight out of each port free for its own net. */
function reserve(grid: SheetGrid, { from, to, net }: EndedWire): void {
  for (const end of [from, to]) {
    const node = stubNode(grid, end);
    if (node < 0) continue;
    const owners = isHorizontal(end.side) ? grid.horizontalNet : grid.verticalNet;
    if (owners[node] === 0) owners[node] = net;
  }
}

/** Where the straight piece at a port ends; −1 where the port lies on no line. */
function stubNode(grid: SheetGrid, end: PortEnd): number {
  const [x, y] = outward(end.side);
  const port = nodeAt(grid, [end.x, end.y]);
  if (port < 0) return -1;
  const lines = x !== 0 ? grid.xs : grid.ys;
  const start = x !== 0 ? end.x : end.y;
  const sign = x + y;
  const ahead = lineFrom(lines, start + sign * STUB);
  const index = sign > 0 || lines[ahead] === start + sign * STUB ? ahead : ahead - 1;
  if (index < 0 || index >= lines.length) return -1;
  const column = port % grid.columns;
  const row = (port - column) / grid.columns;
  return x !== 0 ? row * grid.columns + index : index * grid.columns + column;
}

/** Takes a route that stays as it is into the grid. */
export function keepRoute({ space, trees }: SheetRouter, { net }: EndedWire, route: Route): void {
  const nodes = nodesAlong(space.grid, route);
  occupy(space.grid, nodes, net);
  treeOf(trees, net).add(nodes);
}

function treeOf(trees: Map<number, NetTree>, net: number): NetTree {
  const tree = trees.get(net) ?? new NetTree();
  trees.set(net, tree);
  return tree;
}

/** Routes a wire and takes its nodes; null where no way was found. */
export function routeWire(router: SheetRouter, wire: EndedWire): Route | null {
  const { grid } = router.space;
  const tree = treeOf(router.trees, wire.net);
  const from = nodeAt(grid, [wire.from.x, wire.from.y]);
  const to = nodeAt(grid, [wire.to.x, wire.to.y]);
  const way = straightWay(grid, wire, tree) ?? wayThrough(router, wire, tree);
  if (way === null) return null;
  const before = tree.isEmpty ? nodesBetween(grid, from, way[0] ?? from) : [];
  const whole = [...before, ...way, ...nodesBetween(grid, to, way.at(-1) ?? to).toReversed()];
  occupy(grid, whole, wire.net);
  tree.add(whole);
  return simplified(tree.wayTo(to).map(node => pointAt(grid, node)));
}

/** Nodes on a line from one node to another, the first included and the last not. */
function nodesBetween(grid: SheetGrid, from: number, to: number): readonly number[] {
  return from === to ? [] : nodesAlong(grid, [pointAt(grid, from), pointAt(grid, to)]).slice(0, -1);
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
  const isFree = nodes.every((node, index) => {
    const atPort = index === 0 || index === nodes.length - 1;
    return (owners[node] === 0 || owners[node] === net) && (atPort || (grid.surroundings[node]! & 3) !== BLOCKED);
  });
  return isFree ? nodes : null;
}

/** The cheapest way from the net's tree through the wire's own bend points to where its port is entered. */
function wayThrough(router: SheetRouter, wire: EndedWire, tree: NetTree): readonly number[] | null {
  const { grid } = router.space;
  const source = stubNode(grid, wire.from);
  const target = stubNode(grid, wire.to);
  if (source < 0 || target < 0) return null;
  const stops = [...(wire.wire.via ?? []).map(point => nodeAt(grid, point)), target];
  const own = new Set(tree.nodes);
  let way: readonly number[] = [];
  let beginnings = tree.isEmpty
    ? [{ node: source, axis: axisOf(wire.from), cost: 0 }]
    : branchings(tree, node => branchPrice(grid, wire, node));
  for (const [index, stop] of stops.entries()) {
    const goalAxis = index === stops.length - 1 ? axisOf(wire.to) : null;
    const piece = wayInWindows(router, wire, { beginnings, goal: stop, goalAxis, own });
    if (piece === null) return null;
    for (const node of piece) own.add(node);
    way = [...way, ...(way.length > 0 ? piece.slice(1) : piece)];
    beginnings = [{ node: stop, axis: arrivalAxis(way, axisOf(wire.from)), cost: 0 }];
  }
  return way;
}

const axisOf = (end: PortEnd): Axis => (isHorizontal(end.side) ? 'horizontal' : 'vertical');

function arrivalAxis(way: readonly number[], otherwise: Axis): Axis {
  const last = way.at(-1);
  const before = way.at(-2);
  if (last === undefined || before === undefined) return otherwise;
  return Math.abs(last - before) === 1 ? 'horizontal' : 'vertical';
}

/** What it costs to branch at a node; infinite where a dot would stand on a port's stub or on a crossing. */
function branchPrice(grid: SheetGrid, { from, to, net }: EndedWire, node: number): number {
  const owners = [grid.horizontalNet[node]!, grid.verticalNet[node]!];
  if (owners.some(owner => owner !== 0 && owner !== net)) return Number.POSITIVE_INFINITY;
  const [x, y] = pointAt(grid, node);
  let price = 0;
  for (const end of [from, to]) {
    const distance = Math.abs(x - end.x) + Math.abs(y - end.y);
    if (distance < STUB) return Number.POSITIVE_INFINITY;
    if (distance < CLOSE_TO_PORT) price += BRANCH_PRICES.atPort;
  }
  const there = grid.surroundings[node]!;
  if (there & LABEL) price += BRANCH_PRICES.underLabel;
  if ((there & 3) >= NEAR) price += BRANCH_PRICES.near;
  return price;
}

interface Piece {
  readonly beginnings: readonly Beginning[];
  readonly goal: number;
  readonly goalAxis: Axis | null;
  readonly own: ReadonlySet<number>;
}

function wayInWindows(router: SheetRouter, { from, to, net }: EndedWire, piece: Piece): readonly number[] | null {
  const { grid } = router.space;
  const { beginnings, goal, goalAxis, own } = piece;
  const [goalX, goalY] = pointAt(grid, goal);
  const [x, y] = [from.x, from.y];
  const leadsOn = from.side === 'right' && to.side === 'left' && to.x > from.x;
  const middle = leadsOn ? (from.x + to.x) / 2 : null;
  for (const margin of WINDOWS) {
    const window = {
      left: lineFrom(grid.xs, Math.min(x, goalX) - margin),
      right: Math.min(grid.xs.length, lineFrom(grid.xs, Math.max(x, goalX) + margin)) - 1,
      top: lineFrom(grid.ys, Math.min(y, goalY) - margin),
      bottom: Math.min(grid.ys.length, lineFrom(grid.ys, Math.max(y, goalY) + margin)) - 1,
    };
    const way = cheapestWay(router.space, { beginnings, goal, goalAxis, net, own, window, middle });
    if (way !== null) return way;
  }
  return null;
}
