/** What lies behind the marks of a pole map: frame, axes, lines of equal damping ratio, circles of equal frequency. */

import { element, type Markup } from '../figures/index.ts';
import { line, round, text } from './drawing.ts';
import type { Palette } from './palette.ts';
import type { MapFrame } from './pole-map-frame.ts';

/** Damping ratios of the lines. */
const DAMPING_RATIOS = [0.2, 0.4, 0.6, 0.8] as const;

/** The grid and the axes, clipped to the frame. */
export function gridMarks(frame: MapFrame, palette: Palette): readonly Markup[] {
  const { left, right, top, bottom, originX, originY } = frame;
  const box = { x: left, y: top, width: right - left, height: bottom - top };
  // An inner svg clips what it holds and, unlike a clip path, needs no id of its own in the page.
  const clipped = element(
    'svg',
    { ...box, viewBox: `${left} ${top} ${box.width} ${box.height}`, overflow: 'hidden' },
    ...circles(frame, palette),
    ...DAMPING_RATIOS.flatMap(ratio => dampingLines(frame, ratio, palette)),
    line(left, originY, right, originY, palette.soft),
    line(originX, top, originX, bottom, palette.soft, 1.4),
  );
  const border = element('rect', { ...box, fill: 'none', stroke: palette.line });
  return [clipped, border, ...dampingNames(frame, palette)];
}

/** Through the ticks of the real axis, and on at the same distance to the far corner of the frame. */
function circles(frame: MapFrame, palette: Palette): readonly Markup[] {
  const [first, second] = frame.realAxis.ticks;
  if (first === undefined || second === undefined) return [];
  const step = second.value - first.value;
  const { originX, originY, scale } = frame;
  const corner = Math.hypot(Math.max(originX - frame.left, frame.right - originX), originY - frame.top) / scale;
  return Array.from({ length: Math.floor(corner / step) }, (_, k) =>
    element('circle', {
      cx: round(originX),
      cy: round(originY),
      r: round((k + 1) * step * scale),
      fill: 'none',
      stroke: palette.line,
      'stroke-width': 0.7,
    }),
  );
}

/** Both rays from the origin on which ζ has one value: cos of the angle to the negative real axis. */
function dampingLines(frame: MapFrame, ratio: number, palette: Palette): readonly Markup[] {
  const { originX, originY } = frame;
  const far = frame.width + frame.height;
  const [dx, dy] = [far * ratio, far * Math.sqrt(1 - ratio * ratio)];
  return [1, -1].map(side => line(originX, originY, originX - dx, originY - side * dy, palette.line, 0.7));
}

/** Pixels that a name takes, and where the names begin beside that of the imaginary axis. */
const NAME_WIDTH = 30;
const NAMES_FROM = 96;

/** `ζ 0.8` and on, where the upper rays meet the upper border; those that have no room are left out. */
function dampingNames(frame: MapFrame, palette: Palette): readonly Markup[] {
  const { originX, originY, top } = frame;
  const style = { anchor: 'middle', fill: palette.soft, family: palette.math, size: 12 } as const;
  const names: Markup[] = [];
  let free = NAMES_FROM;
  for (const ratio of DAMPING_RATIOS.toReversed()) {
    const x = originX - ((originY - top) * ratio) / Math.sqrt(1 - ratio * ratio);
    if (x < free) continue;
    names.push(text(x, top - 5, names.length === 0 ? `ζ ${ratio}` : String(ratio), style));
    free = x + NAME_WIDTH;
  }
  return names;
}
