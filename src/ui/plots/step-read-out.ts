/** The read-out of a step plot: a line at a moment, a dot on each curve there, and the values in a flag beside it. */

import { element, type Markup } from '../figures/index.ts';
import { nearestSample } from './curve-path.ts';
import { line, round, TEXT_SIZE, text } from './drawing.ts';
import type { Palette } from './palette.ts';
import { momentText, type StepContent, valueText } from './step-content.ts';
import type { StepFrame } from './step-frame.ts';

/** The moment and the values of all curves there, each as text. */
export function readOutLines(content: StepContent, time: number): readonly string[] {
  const values = content.curves.map(curve => valueText(content, curve, valueAt(curve, time)));
  return [momentText(time), ...values];
}

function valueAt({ time, values }: StepContent['curves'][number], moment: number): number | undefined {
  return values[nearestSample(time, moment)];
}

/** Pixels: a line of the flag, its inner margin, and a character of the mono face at TEXT_SIZE. */
const LINE_HEIGHT = 15;
const INSET = 6;
const CHARACTER = 7.2;

/** Marks of the read-out at `time`, over the drawing. */
export function readOutMarks(
  content: StepContent,
  frame: StepFrame,
  time: number,
  palette: Palette,
): readonly Markup[] {
  const x = frame.x(time);
  const dots = content.curves.flatMap((curve, index) => {
    const value = valueAt(curve, time);
    if (value === undefined || !Number.isFinite(value)) return [];
    const fill = index === 0 ? palette.curve : palette.soft;
    return [element('circle', { cx: round(x), cy: round(frame.y(value)), r: 3.5, fill, stroke: palette.paper })];
  });
  return [line(x, frame.top, x, frame.bottom, palette.ink), ...dots, ...flag(content, frame, time, palette)];
}

function flag(content: StepContent, frame: StepFrame, time: number, palette: Palette): readonly Markup[] {
  const lines = readOutLines(content, time);
  const width = 2 * INSET + CHARACTER * Math.max(...lines.map(content => content.length));
  const height = 2 * INSET + LINE_HEIGHT * lines.length - (LINE_HEIGHT - TEXT_SIZE);
  const at = frame.x(time);
  const x = at + 8 + width > frame.right ? at - 8 - width : at + 8;
  // Where a response rarely is once it has moved: near zero, on the side that it moves away from.
  const isDown = (content.metrics?.finalValue ?? 0) < 0;
  const y = isDown ? frame.top + 6 : frame.bottom - 6 - height;
  const box = { x: round(Math.max(2, x)), y: round(y), width: round(width), height };
  const style = { fill: palette.ink, family: palette.figures };
  return [
    element('rect', { ...box, fill: palette.paper, 'fill-opacity': 0.94, stroke: palette.ink }),
    ...lines.map((words, index) => text(box.x + INSET, y + INSET + TEXT_SIZE - 2 + index * LINE_HEIGHT, words, style)),
  ];
}

/** The time that `key` leads to from `time` within 0 … `horizon`: arrows a hundredth, Page keys a tenth; null for others. */
export function momentAfter(key: string, time: number, horizon: number): number | null {
  const within = (moment: number) => Math.max(0, Math.min(horizon, moment));
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return within(time + horizon / 100);
    case 'ArrowLeft':
    case 'ArrowDown':
      return within(time - horizon / 100);
    case 'PageUp':
      return within(time + horizon / 10);
    case 'PageDown':
      return within(time - horizon / 10);
    case 'Home':
      return 0;
    case 'End':
      return horizon;
    default:
      return null;
  }
}
