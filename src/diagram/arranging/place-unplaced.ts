/**
 * Places for blocks that have none: what a drawing gets when it is opened. Blocks that have a place stay where they
 * are.
 */

import { GRID, type Rectangle, sheetBounds } from '../geometry/index.ts';
import type { Block, Sheet } from '../types.ts';
import { arranged, type Place } from './arrange.ts';

/** Where the first drawing's upper left corner comes to lie, and the paper under what stands already. */
const ORIGIN = 2 * GRID;
const UNDERNEATH = 3 * GRID;

/**
 * The sheet with a place for every block, groups' sheets included; the same object where none was missing. Unplaced
 * blocks are arranged among themselves, under those that have a place. A block on a way back is mirrored unless its
 * file says which way it runs.
 */
export function placeUnplaced<T extends Sheet>(sheet: T): T {
  const inside = sheet.blocks.map(withPlacedSheet);
  const isSame = inside.every((block, index) => block === sheet.blocks[index]);
  const blocks = isSame ? sheet.blocks : inside;
  const missing = blocks.filter(({ at }) => at === undefined);
  if (missing.length === 0) return isSame ? sheet : { ...sheet, blocks };
  const standing = sheetBounds({ blocks: blocks.filter(({ at }) => at !== undefined), wires: [] });
  const left = standing === null ? ORIGIN : Math.floor(standing.left / GRID) * GRID;
  const top = standing === null ? ORIGIN : Math.ceil(standing.bottom / GRID) * GRID + UNDERNEATH;
  const places = new Map(
    arranged({ blocks, wires: sheet.wires }, new Set(missing.map(({ id }) => id))).map(place => [place.id, place]),
  );
  return { ...sheet, blocks: blocks.map(block => placedAt(block, places.get(block.id), left, top)) };
}

function withPlacedSheet(block: Block): Block {
  if (block.kind !== 'group') return block;
  const sheet = placeUnplaced(block.sheet);
  return sheet === block.sheet ? block : { ...block, sheet };
}

function placedAt(block: Block, place: Place | undefined, left: number, top: number): Block {
  if (place === undefined) return block;
  const at = [place.at[0] + left, place.at[1] + top] as const;
  return place.mirrored && block.mirrored === undefined ? { ...block, at, mirrored: true } : { ...block, at };
}

/**
 * New places for a selection of placed blocks, arranged where it stands: its upper left corner stays, unless it would
 * then cover a block that is not selected, in which case it moves down. All blocks of the sheet where nothing is
 * selected.
 */
export function arrangeBlocks(sheet: Sheet, selection: ReadonlySet<string>): readonly Place[] {
  const ids = selection.size === 0 ? new Set(sheet.blocks.map(({ id }) => id)) : selection;
  const chosen = sheet.blocks.filter(({ id }) => ids.has(id));
  const others = sheet.blocks.filter(({ id }) => !ids.has(id));
  const corner = sheetBounds({ blocks: chosen, wires: [] }) ?? { left: ORIGIN, top: ORIGIN };
  const left = Math.floor(corner.left / GRID) * GRID;
  let top = Math.floor(corner.top / GRID) * GRID;
  const places = arranged(sheet, ids);
  const taken = others.flatMap(block => sheetBounds({ blocks: [block], wires: [] }) ?? []);
  const own = placedBounds(chosen, places);
  while (taken.some(area => covers(own, left, top, area))) top += GRID;
  return places.map(place => ({ ...place, at: [place.at[0] + left, place.at[1] + top] }));
}

function placedBounds(blocks: readonly Block[], places: readonly Place[]): Rectangle {
  const at = new Map(places.map(place => [place.id, place.at]));
  const placed = blocks.map(block => ({ ...block, at: at.get(block.id) ?? ([0, 0] as const) }));
  return sheetBounds({ blocks: placed, wires: [] }) ?? { left: 0, top: 0, right: 0, bottom: 0 };
}

function covers(own: Rectangle, x: number, y: number, area: Rectangle): boolean {
  const apartX = own.right + x + GRID <= area.left || own.left + x - GRID >= area.right;
  const apartY = own.bottom + y + GRID <= area.top || own.top + y - GRID >= area.bottom;
  return !apartX && !apartY;
}
