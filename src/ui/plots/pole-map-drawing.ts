/**
 * The pole map as a drawing: × for poles, ○ for zeros, faint lines of equal damping ratio and circles of equal natural
 * frequency behind them.
 */

import { element, formatNumber, type Markup, type Root, singleRootText } from '../figures/index.ts';
import { axisMeasure } from './axis.ts';
import { type Drawing, line, round, type Size, text, tickStyle } from './drawing.ts';
import type { Palette } from './palette.ts';
import { type MapFrame, type MapView, mapFrame } from './pole-map-frame.ts';
import { gridMarks } from './pole-map-grid.ts';
import { type BorderGroup, borderGroups, type PlacedRoot, placeRoots } from './pole-map-marks.ts';
import { mapSummary } from './pole-map-words.ts';

/**
 * The drawing of `poles` and `zeros` (both of each pair; null zeros were not computed) at `size`, in the inks of `palette`.
 */
export function poleMapDrawing(
  poles: readonly Root[],
  knownZeros: readonly Root[] | null,
  view: MapView,
  size: Size,
  palette: Palette,
): Drawing {
  const zeros = knownZeros ?? [];
  const frame = mapFrame(poles, zeros, view, size);
  const placed = placeRoots(frame, poles, zeros);
  return {
    ...size,
    title: 'poles and zeros in the s-plane',
    description: mapSummary(placed, knownZeros !== null),
    paper: palette.paper,
    marks: [
      ...gridMarks(frame, palette),
      ...axisNames(frame, palette),
      // What is at the border may write over the grid, never over a mark at its true place.
      ...borderGroups(placed).flatMap(group => borderMarks(group, frame, palette)),
      ...placed.filter(({ isBeyond }) => !isBeyond).flatMap(mark => rootMarks(mark, palette)),
    ],
  };
}

function axisNames(frame: MapFrame, palette: Palette): readonly Markup[] {
  const style = { fill: palette.soft, family: palette.face };
  const imaginary = `Im${axisMeasure('s⁻¹', frame.imaginaryAxis.exponent)}`;
  const real = `Re${axisMeasure('s⁻¹', frame.realAxis.exponent)}`;
  return [
    text(4, 15, imaginary, style),
    text(frame.right, frame.bottom + 30, real, { ...style, anchor: 'end' }),
    ...frame.realAxis.ticks.map(tick =>
      text(frame.originX + tick.value * frame.scale, frame.bottom + 15, tick.text, tickStyle(palette, 'middle')),
    ),
    ...frame.imaginaryAxis.ticks.map(tick =>
      text(frame.left - 6, frame.originY - tick.value * frame.scale + 4, tick.text, tickStyle(palette, 'end')),
    ),
  ];
}

/** Half the size of a mark, CSS pixels. */
const HALF = 4.5;

function rootMarks({ root, kind, x, y }: PlacedRoot, palette: Palette): readonly Markup[] {
  const ink = kind === 'pole' && root.re > 0 ? palette.wrong : palette.ink;
  const mark = kind === 'pole' ? cross(x, y, ink) : ring(x, y, ink);
  if (root.multiplicity === 1) return [mark];
  const style = { fill: ink, family: palette.figures, halo: palette.paper };
  return [mark, text(x + HALF + 2, y - HALF, String(root.multiplicity), style)];
}

function cross(x: number, y: number, ink: string): Markup {
  const [left, right, top, bottom] = [x - HALF, x + HALF, y - HALF, y + HALF].map(round);
  return element('path', {
    d: `M${left},${top}L${right},${bottom}M${left},${bottom}L${right},${top}`,
    stroke: ink,
    'stroke-width': 2,
    fill: 'none',
  });
}

function ring(x: number, y: number, ink: string): Markup {
  return element('circle', { cx: round(x), cy: round(y), r: HALF, fill: 'none', stroke: ink, 'stroke-width': 1.6 });
}

/** Roots beyond the frame: their mark at the border, an arrow outwards, their value. The lower one of a pair has no value. */
function borderMarks(group: BorderGroup, frame: MapFrame, palette: Palette): readonly Markup[] {
  const { kind, x, y, roots } = group;
  const ink = kind === 'pole' && roots.some(({ re }) => re > 0) ? palette.wrong : palette.soft;
  const mark = kind === 'pole' ? cross(x, y, ink) : ring(x, y, ink);
  const marks = [mark, arrow(x, y, frame, ink)];
  if (roots.every(({ im }) => im < 0)) return marks;
  const isRight = x > (frame.left + frame.right) / 2;
  const anchor = isRight ? 'end' : 'start';
  const style = { anchor, fill: ink, family: palette.figures, halo: palette.paper } as const;
  // Beside a mark on the upper border, below or above one at the sides, where the axis runs.
  const isOnTop = y < frame.top + 2 * HALF + 2;
  const inward = isOnTop ? HALF + 7 : -HALF;
  const lower = isOnTop ? 4 : kind === 'pole' ? 19 : -10;
  return [...marks, text(x + (isRight ? -inward : inward), y + lower, groupText(roots), style)];
}

/** A small arrowhead on the border, away from the origin. */
function arrow(x: number, y: number, frame: MapFrame, ink: string): Markup {
  const [dx, dy] = [x - frame.originX, y - frame.originY];
  const size = Math.hypot(dx, dy) || 1;
  const [ux, uy] = [dx / size, dy / size];
  const tip = [x + 9 * ux, y + 9 * uy];
  const ends = [1, -1].map(side => [x + 5.5 * ux - 3 * side * uy, y + 5.5 * uy + 3 * side * ux]);
  const points = [ends[0], tip, ends[1]].map(point => (point ?? []).map(round).join(','));
  return element('polyline', { points: points.join(' '), fill: 'none', stroke: ink });
}

/** Digits of a value at the border. */
const BORDER_DIGITS = 3;

function groupText(roots: readonly Root[]): string {
  const upper = roots.filter(({ im }) => im >= 0);
  const [first] = upper;
  const last = upper.at(-1);
  if (first === undefined || last === undefined) return '';
  const number = upper.reduce((sum, { multiplicity }) => sum + multiplicity, 0);
  const values = upper.length === 1 ? valueText(first) : `${valueText(first)} … ${valueText(last)}`;
  return number === 1 ? values : `${values} (${number})`;
}

function valueText(root: Root): string {
  return root.im === 0 ? formatNumber(root.re, BORDER_DIGITS) : singleRootText(root, BORDER_DIGITS);
}

/** A ring around the marks that are pointed at. */
export function pointedMarks(marks: readonly PlacedRoot[], palette: Palette): readonly Markup[] {
  return marks.map(({ x, y }) =>
    element('circle', { cx: round(x), cy: round(y), r: 10, fill: 'none', stroke: palette.curve, 'stroke-width': 2 }),
  );
}

/** A fine cross hair at the pointer. */
export function crossHair(frame: MapFrame, x: number, y: number, palette: Palette): readonly Markup[] {
  return [
    line(frame.left, y, frame.right, y, palette.soft, 0.5),
    line(x, frame.top, x, frame.bottom, palette.soft, 0.5),
  ];
}
