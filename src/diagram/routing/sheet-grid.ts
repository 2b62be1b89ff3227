/**
 * The sheet as the router sees it: at each crossing of two lines what stands there and which net runs through,
 * horizontally and vertically. Blocks and labels are marked once; nets are added as they are routed.
 */

import type { Rectangle } from '../geometry/index.ts';
import type { Point } from '../types.ts';
import { type AxisNeeds, gridLines, lineAt, lineFrom } from './grid-lines.ts';
import type { Route } from './types.ts';

/** What stands at a node, in its lowest two bits, the dearer the higher; 0 is free paper. */
export const STANDING = 3;
export const NEAR = 1;
export const TIGHT = 2;
export const BLOCKED = 3;

/**
 * Further bits: a label stands there; a level or an upright wire runs close by in parallel; a port's straight piece
 * ends there.
 */
export const LABEL = 4;
export const LEVEL_CROWD = 8;
export const UPRIGHT_CROWD = 16;
export const STUB_END = 32;

/**
 * Clearances around a block's frame: closer than the first a wire only goes where it must, closer than the second it
 * rather not.
 */
const TIGHT_CLEARANCE = 10;
const NEAR_CLEARANCE = 30;

/** Room between a label and a wire. */
const LABEL_CLEARANCE = 3;

/** Parallel lines closer than this crowd each other. */
const CROWDED = 15;

export interface SheetGrid {
  /** Vertical lines' x, horizontal lines' y, ascending. Node (column, row) has index row · columns + column. */
  readonly xs: Float64Array;
  readonly ys: Float64Array;
  readonly columns: number;
  readonly surroundings: Uint8Array;
  /**
   * Number of the net, from 1, whose wire runs through the node horizontally (vertically), bends there or ends there; 0
   * for none.
   */
  readonly horizontalNet: Int32Array;
  readonly verticalNet: Int32Array;
}

/** A grid with blocks and labels marked and no wires; null where the sheet is too large for one. */
export function sheetGrid(
  blocks: readonly Rectangle[],
  labels: readonly Rectangle[],
  fixed: { readonly xs: readonly number[]; readonly ys: readonly number[] },
): SheetGrid | null {
  const horizontal: AxisNeeds = { extents: blocks.map(({ left, right }) => [left, right]), fixed: fixed.xs };
  const vertical: AxisNeeds = { extents: blocks.map(({ top, bottom }) => [top, bottom]), fixed: fixed.ys };
  const lines = gridLines(horizontal, vertical);
  if (lines === null) return null;
  const { xs, ys } = lines;
  const nodes = xs.length * ys.length;
  const grid: SheetGrid = {
    xs,
    ys,
    columns: xs.length,
    surroundings: new Uint8Array(nodes),
    horizontalNet: new Int32Array(nodes),
    verticalNet: new Int32Array(nodes),
  };
  for (const block of blocks) {
    raise(grid, grown(block, NEAR_CLEARANCE), false, NEAR);
    raise(grid, grown(block, TIGHT_CLEARANCE), false, TIGHT);
  }
  for (const block of blocks) raise(grid, block, true, BLOCKED);
  for (const label of labels) markLabel(grid, grown(label, LABEL_CLEARANCE));
  return grid;
}

function grown({ left, top, right, bottom }: Rectangle, by: number): Rectangle {
  return { left: left - by, top: top - by, right: right + by, bottom: bottom + by };
}

/** First and last line index within a range, its ends counted where `closed`. */
function linesWithin(lines: Float64Array, low: number, high: number, closed: boolean): readonly [number, number] {
  let first = lineFrom(lines, low);
  if (!closed && lines[first] === low) first += 1;
  let last = lineFrom(lines, high);
  if (!(closed && lines[last] === high)) last -= 1;
  return [first, last];
}

function raise(grid: SheetGrid, area: Rectangle, closed: boolean, level: number): void {
  const [left, right] = linesWithin(grid.xs, area.left, area.right, closed);
  const [top, bottom] = linesWithin(grid.ys, area.top, area.bottom, closed);
  for (let row = top; row <= bottom; row += 1) {
    const start = row * grid.columns;
    for (let node = start + left; node <= start + right; node += 1) {
      if (grid.surroundings[node]! < level) grid.surroundings[node] = level;
    }
  }
}

function markLabel(grid: SheetGrid, area: Rectangle): void {
  const [left, right] = linesWithin(grid.xs, area.left, area.right, true);
  const [top, bottom] = linesWithin(grid.ys, area.top, area.bottom, true);
  for (let row = top; row <= bottom; row += 1) {
    const start = row * grid.columns;
    for (let node = start + left; node <= start + right; node += 1) grid.surroundings[node]! |= LABEL;
  }
}

/** The node at a point of the sheet; −1 where no two lines cross there. */
export function nodeAt(grid: SheetGrid, [x, y]: Point): number {
  const column = lineAt(grid.xs, x);
  const row = lineAt(grid.ys, y);
  return column < 0 || row < 0 ? -1 : row * grid.columns + column;
}

/** The place of a node on the sheet. */
export function pointAt(grid: SheetGrid, node: number): Point {
  return [grid.xs[node % grid.columns]!, grid.ys[Math.floor(node / grid.columns)]!];
}

/** The nodes on a straight piece: the first, the last, and the step from one to the next. */
interface Stretch {
  readonly first: number;
  readonly last: number;
  /** 1 along a row, the number of columns along a column. */
  readonly step: number;
}

/** The nodes from one point to another on a level or upright line of the grid; null where there are none. */
function stretch(grid: SheetGrid, [x0, y0]: Point, [x1, y1]: Point): Stretch | null {
  const isLevel = y0 === y1;
  const lane = isLevel ? lineAt(grid.ys, y0) : lineAt(grid.xs, x0);
  const lines = isLevel ? grid.xs : grid.ys;
  const [from, to] = isLevel ? [Math.min(x0, x1), Math.max(x0, x1)] : [Math.min(y0, y1), Math.max(y0, y1)];
  const [low, high] = linesWithin(lines, from, to, true);
  if (lane < 0 || low > high) return null;
  if (isLevel) return { first: lane * grid.columns + low, last: lane * grid.columns + high, step: 1 };
  return { first: low * grid.columns + lane, last: high * grid.columns + lane, step: grid.columns };
}

/** Every node that a route passes, in its direction; the ports at its ends need be none. The route is orthogonal. */
export function nodesAlong(grid: SheetGrid, route: Route): readonly number[] {
  const nodes: number[] = [];
  for (let index = 1; index < route.length; index += 1) {
    const [from, to] = [route[index - 1]!, route[index]!];
    const piece = stretch(grid, from, to);
    if (piece === null) continue;
    const count = (piece.last - piece.first) / piece.step;
    const isForwards = to[0] > from[0] || to[1] > from[1];
    for (let passed = 0; passed <= count; passed += 1) {
      const node = isForwards ? piece.first + passed * piece.step : piece.last - passed * piece.step;
      if (node !== nodes.at(-1)) nodes.push(node);
    }
  }
  return nodes;
}

/** Gives the lines under a route to a net and marks the lines beside it as crowded. */
export function occupy(grid: SheetGrid, route: Route, net: number): void {
  for (let index = 1; index < route.length; index += 1) {
    const piece = stretch(grid, route[index - 1]!, route[index]!);
    if (piece !== null) occupyPiece(grid, piece, net);
  }
}

/** Gives nodes on one line to a net. */
export function occupyNodes(grid: SheetGrid, nodes: readonly number[], isLevel: boolean, net: number): void {
  const owners = isLevel ? grid.horizontalNet : grid.verticalNet;
  for (const node of nodes) if (owners[node] === 0) owners[node] = net;
}

function occupyPiece(grid: SheetGrid, { first, last, step }: Stretch, net: number): void {
  const isLevel = step === 1;
  const owners = isLevel ? grid.horizontalNet : grid.verticalNet;
  for (let node = first; node <= last; node += step) if (owners[node] === 0) owners[node] = net;
  const lines = isLevel ? grid.ys : grid.xs;
  const crowd = isLevel ? LEVEL_CROWD : UPRIGHT_CROWD;
  const aside = isLevel ? grid.columns : 1;
  const own = isLevel ? Math.floor(first / grid.columns) : first % grid.columns;
  for (const direction of [-1, 1]) {
    let line = own + direction;
    while (line >= 0 && line < lines.length && Math.abs(lines[line]! - lines[own]!) < CROWDED) {
      const shift = (line - own) * aside;
      for (let node = first; node <= last; node += step) grid.surroundings[node + shift]! |= crowd;
      line += direction;
    }
  }
}
