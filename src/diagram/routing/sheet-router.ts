/**
 * What the wires of a sheet are routed on: one grid, with what stays as it is already in it, and the trees that the
 * nets grow.
 */

import { blockRectangle, type Rectangle, type SheetGeometry } from '../geometry/index.ts';
import type { Sheet } from '../types.ts';
import { NetTree } from './net-trees.ts';
import { type Searcher, searcher } from './path-search.ts';
import { clipped, holds, overlap } from './region.ts';
import { nodesAlong, occupy, sheetGrid } from './sheet-grid.ts';
import { reserveStub } from './stubs.ts';
import { isHorizontal, type PortEnd, type Route } from './types.ts';
import type { EndedWire } from './wire-ends.ts';

/** Steps that all wires together may take to find their cheapest ways: some 0.2 s. */
const STEPS = 500_000;
const MOST_PATIENCE = 20_000;

export interface KeptRoute {
  readonly net: number;
  readonly route: Route;
}

export interface SheetRouter {
  /** Steps that a wire may take to find its cheapest way. */
  readonly patience: number;
  readonly space: Searcher;
  readonly trees: Map<number, NetTree>;
  /** Routes that stay, by net. */
  readonly kept: ReadonlyMap<number, readonly Route[]>;
  /** Every port of a net. */
  readonly ends: ReadonlyMap<number, readonly PortEnd[]>;
}

/**
 * A router for the part of a sheet within `region`; null where there is too much for a grid, which leaves elbows.
 *
 * @param kept  routes that stay, with the number of their net.
 * @param open  nets of which a wire is to be routed; the region holds all of their kept routes.
 */
export function sheetRouter(
  sheet: Sheet,
  geometry: SheetGeometry,
  wires: readonly EndedWire[],
  kept: readonly KeptRoute[],
  { region, open }: { readonly region: Rectangle; readonly open: ReadonlySet<number> },
): SheetRouter | null {
  const { blocks, labels } = standingWithin(sheet, geometry, region);
  const near = wires.filter(({ from, to }) => holds(region, [from.x, from.y]) || holds(region, [to.x, to.y]));
  const whole = kept.filter(({ net }) => open.has(net));
  const pieces = kept.flatMap(({ net, route }) => clipped(route, region).map(piece => ({ net, route: piece })));
  const grid = sheetGrid(blocks, labels, linesNeeded(near, open, [...whole, ...pieces]));
  if (grid === null) return null;
  for (const { from, to, net } of near) {
    reserveStub(grid, from, net);
    reserveStub(grid, to, net);
  }
  for (const { net, route } of pieces) occupy(grid, route, net);
  const patience = Math.min(MOST_PATIENCE, Math.ceil(STEPS / Math.max(1, wires.length)));
  const keptByNet = new Map<number, Route[]>();
  for (const { net, route } of whole) keptByNet.set(net, [...(keptByNet.get(net) ?? []), route]);
  return { patience, space: searcher(grid), trees: new Map(), kept: keptByNet, ends: netEnds(wires) };
}

/**
 * Every port needs the line that leads out of it, every route the lines it runs on, every bend point of the user's
 * both.
 */
function linesNeeded(wires: readonly EndedWire[], open: ReadonlySet<number>, routes: readonly KeptRoute[]) {
  const xs: number[] = [];
  const ys: number[] = [];
  for (const { from, to, wire, net } of wires) {
    for (const end of [from, to]) {
      if (isHorizontal(end.side)) ys.push(end.y);
      else xs.push(end.x);
    }
    for (const [x, y] of open.has(net) ? (wire.via ?? []) : []) {
      xs.push(x);
      ys.push(y);
    }
  }
  for (const { route } of routes) {
    for (let index = 1; index < route.length; index += 1) {
      const [x0, y0] = route[index - 1]!;
      if (x0 === route[index]![0]) xs.push(x0);
      else ys.push(y0);
    }
  }
  return { xs, ys };
}

function standingWithin(sheet: Sheet, geometry: SheetGeometry, region: Rectangle) {
  const blocks: Rectangle[] = [];
  const labels: Rectangle[] = [];
  for (const block of sheet.blocks) {
    const placed = geometry.get(block.id);
    if (placed === undefined) continue;
    const [x, y] = block.at ?? [0, 0];
    const frame = blockRectangle(block, placed);
    if (overlap(frame, region)) blocks.push(frame);
    for (const { area } of placed.labels) {
      const label = { left: x + area.left, right: x + area.right, top: y + area.top, bottom: y + area.bottom };
      if (overlap(label, region)) labels.push(label);
    }
  }
  return { blocks, labels };
}

function netEnds(wires: readonly EndedWire[]): ReadonlyMap<number, readonly PortEnd[]> {
  const ends = new Map<number, PortEnd[]>();
  for (const { from, to, net } of wires) {
    const list = ends.get(net);
    if (list === undefined) ends.set(net, [from, to]);
    else list.push(to);
  }
  return ends;
}

/** The tree of a net; that of a net whose wires stay is made when one more is to join it. */
export function treeOf({ space, trees, kept }: SheetRouter, net: number): NetTree {
  const known = trees.get(net);
  if (known !== undefined) return known;
  const tree = new NetTree();
  for (const route of kept.get(net) ?? []) tree.add(nodesAlong(space.grid, route));
  trees.set(net, tree);
  return tree;
}
