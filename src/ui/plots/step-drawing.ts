/**
 * The step plot as a drawing: grid, band of ± 2 % around the final value, curves, the mark of the peak. Solid is the curve
 * that the figures are about; the others are dashed, with a legend over the frame.
 */

import { element, formatUnit, type Markup } from '../figures/index.ts';
import { axisMeasure } from './axis.ts';
import { bandPath } from './band-path.ts';
import { curvePath } from './curve-path.ts';
import { type Drawing, line, namedText, round, type Size, text, tickStyle } from './drawing.ts';
import type { Palette } from './palette.ts';
import { contentSummary, peakOf, peakText, type StepContent, stepTitle } from './step-content.ts';
import { type StepFrame, stepFrame } from './step-frame.ts';

/** Half the width of the band that the settling time is about (± 2 %). */
const BAND = 0.02;

/** The drawing of `content` at `size`, in the inks of `palette`. */
export function stepDrawing(content: StepContent, size: Size, palette: Palette): Drawing {
  const frame = stepFrame(content, size);
  return {
    ...size,
    title: stepTitle(content),
    description: contentSummary(content),
    paper: palette.paper,
    marks: [
      ...grid(frame, palette),
      ...finalBand(content, frame, palette),
      ...axisNames(content, frame, palette),
      ...envelopeBand(content, frame, palette),
      ...legend(content, frame, palette),
      ...curveMarks(content, frame, palette),
      ...peakMark(content, frame, palette),
    ],
  };
}

function grid(frame: StepFrame, palette: Palette): readonly Markup[] {
  const { left, right, top, bottom, x, y } = frame;
  const values = frame.valueAxis.ticks.flatMap(({ value, text: label }) => [
    line(left, y(value), right, y(value), palette.line, value === 0 ? 1 : 0.6),
    text(left - 7, y(value) + 4, label, tickStyle(palette, 'end')),
  ]);
  const times = frame.timeAxis.ticks.flatMap(({ value, text: label }) => [
    line(x(value), top, x(value), bottom, palette.line, 0.6),
    text(x(value), bottom + 15, label, tickStyle(palette, 'middle')),
  ]);
  return [...values, ...times];
}

function finalBand({ metrics }: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  const final = metrics?.finalValue ?? null;
  if (final === null) return [];
  const { left, right, y } = frame;
  // Never thinner than two pixels, so that it is seen in a tall range.
  const half = Math.max(1, Math.abs(y(final * (1 + BAND)) - y(final)));
  const place = { x: left, y: round(y(final) - half), width: right - left, height: round(2 * half) };
  return [element('rect', { ...place, fill: palette.line, 'fill-opacity': 0.6 })];
}

/** Where the response runs over the tolerances; what lies beyond the plot's last time is drawn on its edge. */
function envelopeBand({ envelope }: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  if (envelope === undefined) return [];
  const { x, y, right } = frame;
  const d = bandPath(envelope, time => Math.min(right, x(time)), y);
  return [
    element('path', { d, fill: palette.curve, 'fill-opacity': 0.16, stroke: palette.curve, 'stroke-width': 0.5 }),
  ];
}

function axisNames(content: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  const unit = content.outputUnit === undefined ? null : formatUnit(content.outputUnit);
  const style = { fill: palette.soft, family: palette.face };
  const value = axisMeasure(unit, frame.valueAxis.exponent);
  const time = axisMeasure('s', frame.timeAxis.exponent);
  return [
    namedText(4, 16, content.output, value, style, palette.math),
    namedText(frame.right, frame.bottom + 31, 't', time, { ...style, anchor: 'end' }, palette.math),
  ];
}

const DASHES = ['', '6 4', '2 3', '9 3 2 3'] as const;

/** How the curve at `index` is drawn. */
function strokeOf(index: number, palette: Palette): Readonly<Record<string, string | number>> {
  const dashes = DASHES[index % DASHES.length] ?? '';
  return {
    fill: 'none',
    stroke: index === 0 ? palette.curve : palette.soft,
    'stroke-width': index === 0 ? 1.8 : 1.4,
    ...(dashes === '' ? {} : { 'stroke-dasharray': dashes }),
  };
}

function curveMarks({ curves }: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  const { x, y, left, right } = frame;
  // Painted back to front, the curve that matters last.
  return curves
    .map((curve, index) =>
      element('path', {
        d: curvePath(curve, x, y, right - left),
        'stroke-linejoin': 'round',
        ...strokeOf(index, palette),
      }),
    )
    .reverse();
}

/** Pixels: a character of the face at TEXT_SIZE, the sample of a line, and the gaps around it. */
const CHARACTER = 6.6;
const SAMPLE = 22;
const GAP = 6;

/** Which curve is which, over the frame from the right; nothing for a single curve. */
function legend({ curves }: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  if (curves.length < 2) return [];
  let right = frame.right;
  return curves
    .map((curve, index) => ({ curve, index }))
    .toReversed()
    .flatMap(({ curve, index }) => {
      const from = right - CHARACTER * curve.label.length;
      right = from - SAMPLE - 3 * GAP;
      const path = element('path', { d: `M${round(from - GAP - SAMPLE)},11h${SAMPLE}`, ...strokeOf(index, palette) });
      return [path, text(from, 15, curve.label, { fill: palette.soft, family: palette.face })];
    });
}

/** Width of the peak's text at TEXT_SIZE, generously. */
const PEAK_TEXT_WIDTH = 150;

function peakMark(content: StepContent, frame: StepFrame, palette: Palette): readonly Markup[] {
  const peak = peakOf(content.metrics);
  const label = peakText(content.metrics);
  if (peak === null || label === null || peak.time > frame.horizon) return [];
  const { x, y, right } = frame;
  const [px, py] = [x(peak.time), y(peak.value)];
  const isLeft = px + PEAK_TEXT_WIDTH > right;
  const dash = line(px, py, px, y(0), palette.curve);
  return [
    { ...dash, attributes: { ...dash.attributes, 'stroke-dasharray': '3 3' } },
    element('circle', { cx: round(px), cy: round(py), r: 3, fill: palette.curve }),
    text(px + (isLeft ? -7 : 7), py + (peak.value < 0 ? 14 : -5), label, {
      anchor: isLeft ? 'end' : 'start',
      fill: palette.ink,
      family: palette.face,
      halo: palette.paper,
    }),
  ];
}
