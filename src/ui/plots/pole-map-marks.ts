/** Where each pole and zero lies on the map: at its place, or at the border in its direction where it is beyond the frame. */

import type { Root } from '../figures/index.ts';
import { type MapFrame, toPixels } from './pole-map-frame.ts';

/** A root and the pixels of its mark. */
export interface PlacedRoot {
  readonly root: Root;
  readonly kind: 'pole' | 'zero';
  readonly x: number;
  readonly y: number;
  readonly isBeyond: boolean;
}

/** Roots beyond the frame that fall on one place of the border and are written as one. */
export interface BorderGroup {
  readonly kind: 'pole' | 'zero';
  readonly x: number;
  readonly y: number;
  /** Nearest to the origin first. */
  readonly roots: readonly Root[];
}

/** Pixels between the border and a mark on it. */
const BORDER_INSET = 9;

/** Pixels within which marks on the border are one. */
const SAME_PLACE = 26;

/** All poles, then all zeros, in the order given. */
export function placeRoots(frame: MapFrame, poles: readonly Root[], zeros: readonly Root[]): readonly PlacedRoot[] {
  return [...poles.map(root => place(frame, root, 'pole')), ...zeros.map(root => place(frame, root, 'zero'))];
}

function place(frame: MapFrame, root: Root, kind: PlacedRoot['kind']): PlacedRoot {
  const [x, y] = toPixels(frame, root.re, root.im);
  const isInside =
    x >= frame.left + BORDER_INSET &&
    x <= frame.right - BORDER_INSET &&
    y >= frame.top + BORDER_INSET &&
    y <= frame.bottom - BORDER_INSET;
  if (isInside) return { root, kind, x, y, isBeyond: false };
  const [borderX, borderY] = onBorder(frame, x - frame.originX, y - frame.originY);
  return { root, kind, x: borderX, y: borderY, isBeyond: true };
}

/** Where the ray from the origin along (dx, dy), in pixels, meets the inset border. */
function onBorder(frame: MapFrame, dx: number, dy: number): readonly [number, number] {
  const { originX, originY } = frame;
  const roomX = dx < 0 ? originX - frame.left - BORDER_INSET : frame.right - BORDER_INSET - originX;
  const roomY = dy < 0 ? originY - frame.top - BORDER_INSET : frame.bottom - BORDER_INSET - originY;
  const part = Math.min(dx === 0 ? Infinity : roomX / Math.abs(dx), dy === 0 ? Infinity : roomY / Math.abs(dy));
  return [originX + dx * part, originY + dy * part];
}

/** The roots beyond the frame by their place on its border, in the order of the first of each. */
export function borderGroups(placed: readonly PlacedRoot[]): readonly BorderGroup[] {
  const groups: { kind: PlacedRoot['kind']; x: number; y: number; roots: Root[] }[] = [];
  for (const { root, kind, x, y, isBeyond } of placed) {
    if (!isBeyond) continue;
    const same = groups.find(group => group.kind === kind && Math.hypot(group.x - x, group.y - y) < SAME_PLACE);
    if (same === undefined) groups.push({ kind, x, y, roots: [root] });
    else same.roots.push(root);
  }
  return groups.map(group => ({ ...group, roots: group.roots.toSorted((a, b) => distance(a) - distance(b)) }));
}

function distance({ re, im }: Root): number {
  return Math.hypot(re, im);
}

/** The mark nearest to (x, y) within `most` pixels; null where there is none. */
export function nearestMark(placed: readonly PlacedRoot[], x: number, y: number, most: number): PlacedRoot | null {
  let best: PlacedRoot | null = null;
  let least = most;
  for (const mark of placed) {
    const away = Math.hypot(mark.x - x, mark.y - y);
    if (away <= least) [best, least] = [mark, away];
  }
  return best;
}
