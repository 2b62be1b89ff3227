/** Where blocks go when they are aligned or spread: pure arithmetic on their frames. */

import type { Rectangle } from '../../diagram/geometry/index.ts';
import type { Point } from '../../diagram/index.ts';

/** A block's frame on the sheet. */
export interface Frame {
  readonly id: string;
  readonly rectangle: Rectangle;
}

/** `row` gives all centres one height, `column` puts all centres under one another. */
export type Alignment = 'left' | 'right' | 'top' | 'bottom' | 'row' | 'column';

export type Direction = 'across' | 'down';

type Places = readonly (readonly [id: string, at: Point])[];

/** New centres, in the order of the frames. The outermost edge counts; of centres, the middle of the outermost two. */
export function alignedPlaces(frames: readonly Frame[], alignment: Alignment): Places {
  const all = frames.map(({ rectangle }) => rectangle);
  const left = Math.min(...all.map(frame => frame.left));
  const right = Math.max(...all.map(frame => frame.right));
  const top = Math.min(...all.map(frame => frame.top));
  const bottom = Math.max(...all.map(frame => frame.bottom));
  const centres = all.map(centreOf);
  const x = middleOf(centres.map(centre => centre[0]));
  const y = middleOf(centres.map(centre => centre[1]));
  return frames.map(({ id, rectangle }) => {
    const at = centreOf(rectangle);
    const [halfWidth, halfHeight] = [at[0] - rectangle.left, at[1] - rectangle.top];
    switch (alignment) {
      case 'left':
        return [id, [left + halfWidth, at[1]]];
      case 'right':
        return [id, [right - halfWidth, at[1]]];
      case 'top':
        return [id, [at[0], top + halfHeight]];
      case 'bottom':
        return [id, [at[0], bottom - halfHeight]];
      case 'row':
        return [id, [at[0], y]];
      case 'column':
        return [id, [x, at[1]]];
      default:
        return alignment satisfies never;
    }
  });
}

/**
 * New centres with equal gaps between neighbours, in the order of the frames; the first and the last stay. Where the frames
 * are longer than the room between the two, the centres get equal distances.
 */
export function spreadPlaces(frames: readonly Frame[], direction: Direction): Places {
  const axis = direction === 'across' ? 0 : 1;
  const spans = frames
    .map(({ id, rectangle }) => ({ id, at: centreOf(rectangle), length: lengthOf(rectangle, axis) }))
    .sort((a, b) => a.at[axis] - b.at[axis] || (a.id < b.id ? -1 : 1));
  const [first, last] = [spans[0], spans.at(-1)];
  if (first === undefined || last === undefined || spans.length < 3) return frames.map(unmoved);
  const reach = last.at[axis] - first.at[axis];
  const inside = spans.slice(1, -1).reduce((sum, { length }) => sum + length, 0);
  const gap = (reach - inside - (first.length + last.length) / 2) / (spans.length - 1);
  const places = new Map<string, Point>();
  let edge = first.at[axis] + first.length / 2;
  for (const [index, { id, at, length }] of spans.entries()) {
    const evenly = first.at[axis] + (reach * index) / (spans.length - 1);
    const isEnd = index === 0 || index === spans.length - 1;
    const place = isEnd ? at[axis] : gap < 0 ? evenly : edge + gap + length / 2;
    places.set(id, axis === 0 ? [place, at[1]] : [at[0], place]);
    if (index > 0) edge += gap + length;
  }
  return frames.map(frame => [frame.id, places.get(frame.id) ?? centreOf(frame.rectangle)]);
}

const unmoved = ({ id, rectangle }: Frame): readonly [string, Point] => [id, centreOf(rectangle)];

const middleOf = (values: readonly number[]): number => (Math.min(...values) + Math.max(...values)) / 2;

function centreOf({ left, right, top, bottom }: Rectangle): Point {
  return [(left + right) / 2, (top + bottom) / 2];
}

function lengthOf({ left, right, top, bottom }: Rectangle, axis: 0 | 1): number {
  return axis === 0 ? right - left : bottom - top;
}
