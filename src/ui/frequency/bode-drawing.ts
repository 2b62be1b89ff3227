/** Magnitude and phase over frequency as a drawing, with the margins where they are read, and what follows the pointer. */

import { element, formatNumber, frequencyText, type Markup } from '../figures/index.ts';
import {
  bandPath,
  curvePath,
  type Drawing,
  line,
  nearestSample,
  type Palette,
  round,
  type Size,
  TEXT_SIZE,
  text,
  tickStyle,
} from '../plots/index.ts';
import type { BodeContent, MarginMark } from './bode-content.ts';
import { type BodeFrame, type BodePart, bodeFrame } from './bode-frame.ts';

/** The drawing of `content` at `size`, in the inks of `palette`. */
export function bodeDrawing(content: BodeContent, size: Size, palette: Palette): Drawing {
  const frame = bodeFrame(content, size);
  const { omega, magnitude, phase } = content.curve;
  return {
    ...size,
    title: content.title,
    description: content.summary,
    paper: palette.paper,
    marks: [
      ...grid(frame, frame.magnitude, palette),
      ...grid(frame, frame.phase, palette),
      ...axisTexts(frame, palette),
      ...envelopeBand(content, frame, palette),
      curve(frame, frame.magnitude, { time: omega, values: magnitude }, palette),
      curve(frame, frame.phase, { time: omega, values: phase }, palette),
      ...content.marks.flatMap(mark => marginMarks(frame, mark, palette)),
    ],
  };
}

function grid({ left, right, x, decades, between }: BodeFrame, part: BodePart, palette: Palette): readonly Markup[] {
  const { top, bottom, ticks, y } = part;
  return [
    ...between.map(omega => line(x(omega), top, x(omega), bottom, palette.line, 0.3)),
    ...decades.map(({ value }) => line(x(value), top, x(value), bottom, palette.line, 0.6)),
    ...ticks.flatMap(({ value, text: label }) => [
      line(left, y(value), right, y(value), palette.line, value === 0 ? 1.4 : 0.6),
      text(left - 7, y(value) + 4, label, tickStyle(palette, 'end')),
    ]),
  ];
}

function axisTexts({ left, right, x, decades, magnitude, phase }: BodeFrame, palette: Palette): readonly Markup[] {
  const style = { fill: palette.soft, family: palette.face };
  return [
    text(left, magnitude.top - 10, 'magnitude / dB', style),
    text(left, phase.top - 10, 'phase / °', style),
    ...decades.map(({ value, text: label }) => text(x(value), phase.bottom + 15, label, tickStyle(palette, 'middle'))),
    text(right, phase.bottom + 31, 'ω / rad/s', { ...style, anchor: 'end' }),
  ];
}

type Values = Parameters<typeof curvePath>[0];

function curve({ x, left, right }: BodeFrame, { y, top, bottom }: BodePart, values: Values, palette: Palette): Markup {
  const inside = (value: number) => Math.max(top, Math.min(bottom, y(value)));
  return element('path', {
    d: curvePath(values, x, inside, right - left),
    fill: 'none',
    stroke: palette.curve,
    'stroke-width': 1.8,
    'stroke-linejoin': 'round',
  });
}

/** Where the magnitude runs over the tolerances of the parameters. */
function envelopeBand(
  { envelope }: BodeContent,
  { x, left, right, magnitude: { y, top, bottom } }: BodeFrame,
  palette: Palette,
): readonly Markup[] {
  if (envelope === undefined) return [];
  const across = (omega: number) => Math.max(left, Math.min(right, x(omega)));
  const d = bandPath(envelope, across, value => Math.max(top, Math.min(bottom, y(value))));
  return [
    element('path', { d, fill: palette.curve, 'fill-opacity': 0.16, stroke: palette.curve, 'stroke-width': 0.5 }),
  ];
}

/** Pixels that the text of a margin needs at its right. */
const LABEL = 110;

function marginMarks(
  frame: BodeFrame,
  { kind, omega, from, to, label }: MarginMark,
  palette: Palette,
): readonly Markup[] {
  const { y } = kind === 'gain' ? frame.magnitude : frame.phase;
  const x = frame.x(omega);
  const isLeft = x + LABEL > frame.right;
  const style = {
    anchor: isLeft ? 'end' : 'start',
    fill: palette.cut,
    family: palette.figures,
    halo: palette.paper,
  } as const;
  return [
    line(x, y(from), x, y(to), palette.cut, 2),
    element('circle', { cx: round(x), cy: round(y(from)), r: 3, fill: palette.cut }),
    text(x + (isLeft ? -7 : 7), y(to) + (y(to) > y(from) ? 14 : -6), label, style),
  ];
}

/** Frequency, magnitude and phase at the sample nearest to `omega`, each as text. */
export function readOutLines({ curve: { omega, magnitude, phase } }: BodeContent, at: number): readonly string[] {
  const k = nearestSample(omega, at);
  const shown = (value: number | undefined, unit: string) =>
    value === undefined || !Number.isFinite(value) ? '—' : `${formatNumber(value, 4)}${unit}`;
  return [frequencyText(omega[k] ?? at), shown(magnitude[k], ' dB'), shown(phase[k], '°')];
}

/** Pixels: a line of the flag, its inner margin, and a character of the mono face at TEXT_SIZE. */
const LINE_HEIGHT = 15;
const INSET = 6;
const CHARACTER = 7.2;

/** Marks of the read-out at `at` rad/s, over the drawing. */
export function readOutMarks(content: BodeContent, frame: BodeFrame, at: number, palette: Palette): readonly Markup[] {
  const { omega, magnitude, phase } = content.curve;
  const k = nearestSample(omega, at);
  const x = frame.x(omega[k] ?? at);
  const lines = readOutLines(content, at);
  const width = 2 * INSET + CHARACTER * Math.max(...lines.map(words => words.length));
  const height = 2 * INSET + LINE_HEIGHT * lines.length - (LINE_HEIGHT - TEXT_SIZE);
  const left = x + 8 + width > frame.right ? x - 8 - width : x + 8;
  const top = frame.magnitude.bottom - 6 - height;
  const dot = (part: BodePart, value: number | undefined) =>
    value === undefined || !Number.isFinite(value)
      ? []
      : [
          element('circle', {
            cx: round(x),
            cy: round(part.y(value)),
            r: 3.5,
            fill: palette.curve,
            stroke: palette.paper,
          }),
        ];
  const box = { x: round(Math.max(2, left)), y: round(top), width: round(width), height };
  return [
    line(x, frame.magnitude.top, x, frame.phase.bottom, palette.ink),
    ...dot(frame.magnitude, magnitude[k]),
    ...dot(frame.phase, phase[k]),
    element('rect', { ...box, fill: palette.paper, 'fill-opacity': 0.94, stroke: palette.ink }),
    ...lines.map((words, index) =>
      text(box.x + INSET, top + INSET + TEXT_SIZE - 2 + index * LINE_HEIGHT, words, {
        fill: palette.ink,
        family: palette.figures,
      }),
    ),
  ];
}
