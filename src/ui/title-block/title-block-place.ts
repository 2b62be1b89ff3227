/**
 * Where the title block stands so that it hides no block: where it is while that is free, else the first free corner of the
 * sheet (lower right, lower left, upper right), else folded to its title row.
 */

import type { Rectangle } from '../../diagram/geometry/index.ts';

export type Corner = 'lower-right' | 'lower-left' | 'upper-right';

export interface TitleBlockPlace {
  readonly corner: Corner;
  readonly isFolded: boolean;
}

export interface Size {
  readonly width: number;
  readonly height: number;
}

const CORNERS: readonly Corner[] = ['lower-right', 'lower-left', 'upper-right'];

/**
 * @param current  where it stands now.
 * @param sizes    its size unfolded and folded, pixels; `open` is null where the user has folded it.
 * @param area     the sheet above the write-a-block line without its margins, in the pixels of `boxes`.
 * @param boxes    the blocks as they are on the screen.
 */
export function titleBlockPlace(
  current: Corner,
  sizes: { readonly open: Size | null; readonly folded: Size },
  area: Rectangle,
  boxes: readonly Rectangle[],
): TitleBlockPlace {
  const free = (size: Size) =>
    [current, ...CORNERS].find(corner => !boxes.some(box => overlap(box, at(corner, size, area))));
  const open = sizes.open === null ? undefined : free(sizes.open);
  if (open !== undefined) return { corner: open, isFolded: false };
  return { corner: free(sizes.folded) ?? current, isFolded: true };
}

function at(corner: Corner, { width, height }: Size, area: Rectangle): Rectangle {
  const left = corner === 'lower-left' ? area.left : area.right - width;
  const top = corner === 'upper-right' ? area.top : area.bottom - height;
  return { left, right: left + width, top, bottom: top + height };
}

function overlap(a: Rectangle, b: Rectangle): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}
