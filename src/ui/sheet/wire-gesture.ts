/**
 * What a hand draws from a wire: a branch from anywhere on it, which starts at the same output, or one of its ends, which goes
 * to another port. Both are handed on to the port's own handle, which draws. A press that does not move stays a click.
 */

import type { PointerEvent as ReactPointerEvent } from 'react';
import type { Point } from '../../diagram/index.ts';
import { actions } from '../store/index.ts';
import { piecesOf } from './bend-wire.ts';
import { placeOf } from './pointer.ts';

/** Pixels that a press may move and still be a click. */
const CLICK_SLACK = 5;

/** A press this near a wire's arrowhead takes that end, sheet units. */
const HEAD_REACH = 28;

/** Where a branch leaves its wire. */
export interface BranchStart {
  readonly at: Point;
  /** Of the piece that it leaves. */
  readonly isHorizontal: boolean;
}

type WireGesture =
  | { readonly kind: 'branch'; readonly start: BranchStart }
  | { readonly kind: 'end'; readonly wire: string };

/** The ends of a wire on the sheet: its key, block ids and handles. */
export interface WireEnds {
  readonly wire: string;
  readonly source: HandlePlace;
  readonly target: HandlePlace;
}

interface HandlePlace {
  readonly block: string;
  readonly handle: string;
}

let current: WireGesture | null = null;

/** What is being drawn; null when a wire is drawn from a port. */
export function wireGesture(): WireGesture | null {
  return current;
}

/** Forgets it once the wire is let go. */
export function endWireGesture(): void {
  current = null;
}

/** Watches a press on a wire: moved, it takes the arrowhead's end where it began there, else it draws a branch. */
export function watchWire(press: ReactPointerEvent, ends: WireEnds, points: readonly Point[]): void {
  const place = placeOf(press.clientX, press.clientY);
  const [x, y] = points.at(-1) ?? place;
  if (Math.hypot(place[0] - x, place[1] - y) <= HEAD_REACH) return watchEnd(press, ends, 'target');
  const start = nearestOn(points, place);
  if (start !== null) whenMoved(press, { kind: 'branch', start }, ends.source);
}

/** Watches a press on the grip at one end of a wire: moved, it draws from the other end. */
export function watchEnd(press: ReactPointerEvent, ends: WireEnds, end: 'source' | 'target'): void {
  whenMoved(press, { kind: 'end', wire: ends.wire }, end === 'target' ? ends.source : ends.target);
}

function whenMoved(press: ReactPointerEvent, gesture: WireGesture, from: HandlePlace): void {
  if (press.button !== 0 || press.shiftKey || !press.isPrimary) return;
  const { clientX, clientY, pointerType } = press;
  const onMove = (event: PointerEvent) => {
    if (Math.hypot(event.clientX - clientX, event.clientY - clientY) <= CLICK_SLACK) return;
    stop();
    current = gesture;
    if (pressHandle(from, pointerType, event)) return;
    current = null;
    actions.notify('The block at the other end of this wire is out of view. Zoom out until it is seen.', 'refused');
  };
  const stop = () => {
    window.removeEventListener('pointermove', onMove);
    window.removeEventListener('pointerup', stop);
    window.removeEventListener('pointercancel', stop);
  };
  window.addEventListener('pointermove', onMove);
  window.addEventListener('pointerup', stop);
  window.addEventListener('pointercancel', stop);
}

function pressHandle({ block, handle }: HandlePlace, pointerType: string, { clientX, clientY }: PointerEvent): boolean {
  const node = `.react-flow__node[data-id="${CSS.escape(block)}"]`;
  const target = document.querySelector(`${node} [data-handleid="${CSS.escape(handle)}"]`);
  if (target === null) return false;
  if (pointerType === 'touch') {
    const touch = new Touch({ identifier: 0, target, clientX, clientY });
    target.dispatchEvent(new TouchEvent('touchstart', { touches: [touch], changedTouches: [touch], bubbles: true }));
  } else {
    target.dispatchEvent(new MouseEvent('mousedown', { clientX, clientY, button: 0, bubbles: true }));
  }
  return true;
}

/** The point of a route nearest to a place, and which way the route runs there; null for a route without a length. */
export function nearestOn(points: readonly Point[], [x, y]: Point): BranchStart | null {
  let nearest: BranchStart | null = null;
  let least = Number.POSITIVE_INFINITY;
  for (const { index, isHorizontal } of piecesOf(points)) {
    const [[x0, y0], [x1, y1]] = [points[index] ?? [0, 0], points[index + 1] ?? [0, 0]];
    const at: Point = [clamped(x, x0, x1), clamped(y, y0, y1)];
    const away = Math.hypot(at[0] - x, at[1] - y);
    if (away >= least) continue;
    nearest = { at, isHorizontal };
    least = away;
  }
  return nearest;
}

function clamped(value: number, a: number, b: number): number {
  return Math.min(Math.max(value, Math.min(a, b)), Math.max(a, b));
}
