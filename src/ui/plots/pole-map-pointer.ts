/** What of a pole map is pointed at, by pointer or keyboard. A conjugate pair is one stop. */

import { type MapFrame, toPlane } from './pole-map-frame.ts';
import { nearestMark, type PlacedRoot } from './pole-map-marks.ts';
import { pointWords, rootWords } from './pole-map-words.ts';

/** A stop of the keyboard, or a point of the map in its pixels. */
export type MapPointer =
  | { readonly kind: 'root'; readonly stop: number }
  | { readonly kind: 'point'; readonly x: number; readonly y: number };

/** Pixels around a mark that count as on it. */
const CATCH = 12;

/** The marks the keyboard goes through: real roots and the upper one of each pair. */
export function steps(placed: readonly PlacedRoot[]): readonly PlacedRoot[] {
  return placed.filter(({ root }) => root.im >= 0);
}

/** What the pointer at (x, y) is at; null outside the frame. */
export function pointerAt(
  frame: MapFrame,
  stops: readonly PlacedRoot[],
  placed: readonly PlacedRoot[],
  x: number,
  y: number,
): MapPointer | null {
  if (x < frame.left || x > frame.right || y < frame.top || y > frame.bottom) return null;
  const mark = nearestMark(placed, x, y, CATCH);
  const stop =
    mark === null ? -1 : stops.findIndex(({ root, kind }) => kind === mark.kind && isSamePair(root, mark.root));
  return stop >= 0 ? { kind: 'root', stop } : { kind: 'point', x, y };
}

/** Where `key` leads among `count` stops; null where it does not move. */
export function pointerAfter(key: string, pointer: MapPointer | null, count: number): MapPointer | null {
  const from = pointer?.kind === 'root' ? pointer.stop : -1;
  const to = stopAfter(key, from, count);
  return to === null || count === 0 ? null : { kind: 'root', stop: to };
}

function stopAfter(key: string, from: number, count: number): number | null {
  switch (key) {
    case 'ArrowRight':
    case 'ArrowDown':
      return Math.min(count - 1, from + 1);
    case 'ArrowLeft':
    case 'ArrowUp':
      return Math.max(0, from - 1);
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}

/** The marks to ring: both of a pair. */
export function rootsPointedAt(
  pointer: MapPointer,
  placed: readonly PlacedRoot[],
  stops: readonly PlacedRoot[],
): readonly PlacedRoot[] {
  const stop = pointer.kind === 'root' ? stops[pointer.stop] : undefined;
  if (stop === undefined) return [];
  return placed.filter(({ root, kind }) => kind === stop.kind && isSamePair(root, stop.root));
}

/** The read-out. */
export function pointerWords(pointer: MapPointer, frame: MapFrame, stops: readonly PlacedRoot[]): string {
  if (pointer.kind === 'point') {
    const { re, im } = toPlane(frame, pointer.x, pointer.y);
    return pointWords(re, im);
  }
  const stop = stops[pointer.stop];
  return stop === undefined ? '' : rootWords(stop);
}

function isSamePair(a: PlacedRoot['root'], b: PlacedRoot['root']): boolean {
  return a.re === b.re && Math.abs(a.im) === Math.abs(b.im);
}
