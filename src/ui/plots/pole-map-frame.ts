/**
 * The part of the s-plane that a pole map shows. What decides how the model moves are the poles nearest the imaginary axis,
 * and in a stiff model all others would press these into one point. So:
 *
 * - `dominant`: the rightmost pole that is not at the origin sets the scale; the frame takes in every pole and zero within
 *   REACH times its distance from the origin. What lies farther is marked at the border, in its direction, with its value.
 * - `all`: the frame takes in everything.
 *
 * Both axes have one scale, so that lines of equal damping and circles of equal frequency are true. Extents are rounded up
 * to Renard numbers, so that a small change moves a pole and not the frame.
 */

import type { Root } from '../figures/index.ts';
import { type Axis, axisOver } from './axis.ts';
import type { Size } from './drawing.ts';

/** How much of the plane is wanted. */
export type MapView = 'dominant' | 'all';

/** Sides of the frame in CSS pixels from the upper left corner, and how the plane lies in it. */
export interface MapFrame extends Size {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** Pixels for one 1/s. */
  readonly scale: number;
  /** Where the origin lies. */
  readonly originX: number;
  readonly originY: number;
  readonly realAxis: Axis;
  readonly imaginaryAxis: Axis;
}

/** How far beyond the dominant pole the frame goes: at 250 pixels of width a pole at 1/8 is 30 pixels from the axis. */
const REACH = 8;

/**
 * What counts as at the origin, relative to the largest root: 2⁻⁴⁰ is thousands of times n·2⁻⁵³, what floating-point
 * eigenvalues of an integrator may come out as for n in the hundreds, and far below a pixel.
 */
const AT_ORIGIN = 2 ** -40;

/** 1/s; for anything smaller the pixels for 1/s would leave the range of doubles (2¹⁰²⁴), with room for the ticks. */
const LEAST_REACH = 2 ** -960;

/** Distance from the origin that the frame has to take in, 1/s; 1 where every root is at the origin. */
export function mapReach(poles: readonly Root[], zeros: readonly Root[], view: MapView): number {
  const largest = Math.max(0, ...[...poles, ...zeros].map(distance));
  if (largest < LEAST_REACH) return 1;
  const away = [...poles, ...zeros].filter(root => distance(root) > AT_ORIGIN * largest);
  if (view === 'all') return largest;
  const candidates = poles.filter(root => distance(root) > AT_ORIGIN * largest);
  const limit = REACH * Math.min(...dominantOf(candidates.length > 0 ? candidates : away).map(distance));
  return Math.max(...away.map(distance).filter(size => size <= limit));
}

/** The roots with the greatest real part. */
function dominantOf(roots: readonly Root[]): readonly Root[] {
  const rightmost = Math.max(...roots.map(({ re }) => re));
  return roots.filter(({ re }) => re === rightmost);
}

function distance({ re, im }: Root): number {
  return Math.hypot(re, im);
}

/** Renard series R10 of preferred numbers (ISO 3). */
const RENARD = [1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8, 10] as const;

/** The least Renard number that is not below a positive `value`. */
export function roundedUp(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value));
  return decade * (RENARD.find(number => number * decade >= value) ?? 10);
}

/** Room for ticks and axis names, and for a mark on the edge, CSS pixels. */
const LEAST_LEFT = 30;
const FIGURE_WIDTH = 7;
const TICK_GAP = 10;
const RIGHT = 10;
const TOP = 26;
const BOTTOM = 36;
const MARK_ROOM = 14;

/** Least parts of the reach that the frame shows to either side of the imaginary axis and above the real one. */
const LEAST_SIDE = 0.12;
const LEAST_HALF_HEIGHT = 0.35;

/** Height for a width. */
export function mapSize(width: number): Size {
  return { width, height: Math.round(Math.max(190, Math.min(340, width * 0.72))) };
}

/** What the frame has to take in, 1/s: all positive. */
interface Extents {
  readonly toLeft: number;
  readonly toRight: number;
  readonly up: number;
}

/** The frame of `view` at `size`. */
export function mapFrame(poles: readonly Root[], zeros: readonly Root[], view: MapView, size: Size): MapFrame {
  const reach = mapReach(poles, zeros, view);
  const inside = [...poles, ...zeros].filter(root => distance(root) <= reach);
  const extent = (least: number, distances: readonly number[]) => roundedUp(Math.max(reach * least, ...distances));
  const extents: Extents = {
    toLeft: extent(
      LEAST_SIDE,
      inside.map(({ re }) => -re),
    ),
    toRight: extent(
      LEAST_SIDE,
      inside.map(({ re }) => re),
    ),
    up: extent(
      LEAST_HALF_HEIGHT,
      inside.map(({ im }) => Math.abs(im)),
    ),
  };
  const rough = frameBeside(LEAST_LEFT, extents, size);
  const longest = Math.max(...rough.imaginaryAxis.ticks.map(tick => tick.text.length));
  return frameBeside(Math.max(LEAST_LEFT, TICK_GAP + FIGURE_WIDTH * longest), extents, size);
}

function frameBeside(left: number, { toLeft, toRight, up }: Extents, { width, height }: Size): MapFrame {
  const [right, top, bottom] = [width - RIGHT, TOP, height - BOTTOM];
  const [across, tall] = [right - left - 2 * MARK_ROOM, bottom - top - 2 * MARK_ROOM];
  const scale = Math.min(across / (toLeft + toRight), tall / (2 * up));
  // What room is left over goes to both sides in proportion.
  const originX = left + MARK_ROOM + (across * toLeft) / (toLeft + toRight);
  const originY = (top + bottom) / 2;
  const columns = Math.max(2, Math.round((right - left) / 55));
  const rows = Math.max(2, Math.round((bottom - top) / 36));
  return {
    ...{ width, height, left, right, top, bottom, scale, originX, originY },
    realAxis: axisOver((left - originX) / scale, (right - originX) / scale, columns),
    imaginaryAxis: axisOver((originY - bottom) / scale, (originY - top) / scale, rows),
  };
}

/** Pixels of the point `re + im j`. */
export function toPixels(frame: MapFrame, re: number, im: number): readonly [x: number, y: number] {
  return [frame.originX + re * frame.scale, frame.originY - im * frame.scale];
}

/** The point under pixel (x, y), 1/s. */
export function toPlane(frame: MapFrame, x: number, y: number): { readonly re: number; readonly im: number } {
  return { re: (x - frame.originX) / frame.scale, im: (frame.originY - y) / frame.scale };
}
