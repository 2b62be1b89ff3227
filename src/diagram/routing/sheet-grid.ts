/**
 * The sheet as the router sees it: at each crossing of two lines what stands there and which net runs through, horizontally and
 * vertically. Blocks and labels are marked once; nets are added as they are routed.
 */

import type { Rectangle } from '../geometry/index.ts';
import type { Point } from '../types.ts';
import { type AxisNeeds, gridLines, lineAt, lineFrom } from './grid-lines.ts';
import type { Route } from './types.ts';

/** What stands at a node, the dearer the higher; a label adds `LABEL`. */
export const FREE = 0;
export const NEAR = 1;
export const TIGHT = 2;
export const BLOCKED = 3;
export const LABEL = 4;

/** Clearances around a block's frame: closer than the first a wire only goes where it must, closer than the second it rather not. */
const TIGHT_CLEARANCE = 10;
const NEAR_CLEARANCE = 30;

/** Room between a label and a wire. */
const LABEL_CLEARANCE = 4;

/** Parallel lines closer than this crowd each other. */
const CROWDED = 15;

export interface SheetGrid {
  /** Vertical lines' x, horizontal lines' y, ascending. Node (column, row) has index row · columns + column. */
  readonly xs: Float64Array;
  readonly ys: Float64Array;
  readonly columns: number;
  readonly surroundings: Uint8Array;
  /** Number of the net, from 1, whose wire runs through the node horizontally (vertically), bends there or ends there; 0 for none. */
  readonly horizontalNet: Int32Array;
  readonly verticalNet: Int32Array;
  /** 1 where a wire runs close by in parallel. */
  readonly horizontalCrowd: Uint8Array;
  readonly verticalCrowd: Uint8Array;
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
    horizontalCrowd: new Uint8Array(nodes),
    verticalCrowd: new Uint8Array(nodes),
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

/**
 * Every node that a route passes, from its first point; empty where a point of it lies on no line. The route is orthogonal.
 */
export function nodesAlong(grid: SheetGrid, route: Route): readonly number[] {
  const nodes: number[] = [];
  for (let index = 1; index < route.length; index += 1) {
    const from = nodeAt(grid, route[index - 1] ?? [0, 0]);
    const to = nodeAt(grid, route[index] ?? [0, 0]);
    if (from < 0 || to < 0) return [];
    if (from === to) continue;
    const sameRow = Math.floor(from / grid.columns) === Math.floor(to / grid.columns);
    const step = (sameRow ? 1 : grid.columns) * (to > from ? 1 : -1);
    if (nodes.length === 0) nodes.push(from);
    for (let node = from + step; node !== to + step; node += step) nodes.push(node);
  }
  return nodes;
}

/** Gives the lines under a route to a net and marks the lines beside it as crowded. Points that lie on no line end the marking. */
export function occupy(grid: SheetGrid, route: Route, net: number): void {
  for (let index = 1; index < route.length; index += 1) {
    const from = nodeAt(grid, route[index - 1]!);
    const to = nodeAt(grid, route[index]!);
    if (from < 0 || to < 0) return;
    const first = Math.min(from, to);
    const last = Math.max(from, to);
    if (last - first < grid.columns) occupyPiece(grid, first, last, 1, net);
    else occupyPiece(grid, first, last, grid.columns, net);
  }
}

/** One straight piece from node `first` to node `last` in steps of 1 along a row, of `columns` along a column. */
function occupyPiece(grid: SheetGrid, first: number, last: number, step: number, net: number): void {
  const isHorizontal = step === 1;
  const owners = isHorizontal ? grid.horizontalNet : grid.verticalNet;
  for (let node = first; node <= last; node += step) if (owners[node] === 0) owners[node] = net;
  const lines = isHorizontal ? grid.ys : grid.xs;
  const marks = isHorizontal ? grid.horizontalCrowd : grid.verticalCrowd;
  const aside = isHorizontal ? grid.columns : 1;
  const own = isHorizontal ? Math.floor(first / grid.columns) : first % grid.columns;
  for (const direction of [-1, 1]) {
    let line = own + direction;
    while (line >= 0 && line < lines.length && Math.abs(lines[line]! - lines[own]!) < CROWDED) {
      const shift = (line - own) * aside;
      for (let node = first; node <= last; node += step) marks[node + shift] = 1;
      line += direction;
    }
  }
}
