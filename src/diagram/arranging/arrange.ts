/**
 * Arranges blocks as a drawing is read: the signal from left to right, one column after the other, what leads back
 * mirrored underneath (Sugiyama, Tagawa & Toda 1981). Nothing overlaps, centres lie on the grid, and the same sheet
 * gives the same places.
 */

import { enclosing, GRID, type Rectangle } from '../geometry/index.ts';
import type { Block, Point, Sheet } from '../types.ts';
import { withFewerCrossings } from './crossings.ts';
import { depthFirst } from './depth-first.ts';
import { blockExtent } from './extents.ts';
import { connectedParts, type Graph, graphOf } from './graph.ts';
import { heights } from './heights.ts';
import { layers } from './layers.ts';
import { initialRows } from './rows.ts';
import { waysBack } from './way-back.ts';
import { columnPlaces } from './widths.ts';

/** Where a block goes and whether its signal then runs right to left. */
export interface Place {
  readonly id: string;
  readonly at: Point;
  readonly mirrored: boolean;
}

/** Paper between parts of a drawing that do not hang together. */
const BETWEEN_PARTS = 3 * GRID;

/** How wide a row of small parts becomes before the next begins, unless one is wider. */
const ROW_WIDTH = 60 * GRID;

/**
 * Places for the blocks with these ids, in document order, as they would stand by themselves: the upper left corner of
 * all, labels included, at the origin or up to a square beyond. Some 2,000 blocks take a second.
 */
export function arranged(sheet: Sheet, ids: ReadonlySet<string>): readonly Place[] {
  const graph = graphOf(sheet, ids);
  const parts = connectedParts(graph).map(members => arrangedPart(sheet, graph, members));
  const places = new Map<string, Place>();
  const width = Math.max(ROW_WIDTH, ...parts.map(({ area }) => area.right - area.left));
  let [x, y, bottom] = [0, 0, 0];
  for (const { placed, area } of parts) {
    const wide = onGrid(area.right - area.left);
    if (x > 0 && x + wide > width) [x, y] = [0, bottom + BETWEEN_PARTS];
    const shiftX = x - Math.floor(area.left / GRID) * GRID;
    const shiftY = y - Math.floor(area.top / GRID) * GRID;
    for (const place of placed) places.set(place.id, { ...place, at: [place.at[0] + shiftX, place.at[1] + shiftY] });
    x += wide + BETWEEN_PARTS;
    bottom = Math.max(bottom, y + onGrid(area.bottom - area.top));
  }
  return graph.blocks.flatMap(({ id }) => places.get(id) ?? []);
}

const onGrid = (length: number): number => Math.ceil(length / GRID) * GRID;

function arrangedPart(sheet: Sheet, whole: Graph, members: readonly number[]) {
  const graph = graphOf(sheet, new Set(members.flatMap(member => whole.blocks[member]?.id ?? [])));
  const search = depthFirst(graph);
  const isBack = waysBack(graph, search);
  const blocks = graph.blocks.map((block, number): Block => {
    const { at: _, ...rest } = block;
    return { ...rest, mirrored: isBack[number] === true };
  });
  const extents = blocks.map(blockExtent);
  const column = layers(graph, search, isBack);
  const rows = withFewerCrossings(initialRows(graph, search, isBack, column));
  const y = heights(graph, rows, extents);
  const x = columnPlaces(rows, extents, y);
  const areas: Rectangle[] = [];
  const placed = blocks.map(({ id, mirrored }, number): Place => {
    const at: Point = [x[column[number]!]!, y[number]!];
    const { left, top, right, bottom } = extents[number]!.area;
    areas.push({ left: at[0] + left, top: at[1] + top, right: at[0] + right, bottom: at[1] + bottom });
    return { id, at, mirrored: mirrored === true };
  });
  return { placed, area: enclosing(areas) ?? { left: 0, top: 0, right: 0, bottom: 0 } };
}
