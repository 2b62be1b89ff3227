import { describe, expect, test } from 'vitest';
import type { StepMetrics } from '../../../../src/analysis/index.ts';
import { markupText } from '../../../../src/ui/figures/index.ts';
import { FILE, type StepContent, stepDrawing, stepSummary, svgFile } from '../../../../src/ui/plots/index.ts';
import { peakText } from '../../../../src/ui/plots/step-content.ts';
import { stepFrame, stepSize } from '../../../../src/ui/plots/step-frame.ts';
import { momentAfter, readOutLines, readOutMarks } from '../../../../src/ui/plots/step-read-out.ts';

const nothing: StepMetrics = {
  input: 'r',
  output: 'F',
  finalValue: null,
  overshootPercent: null,
  peak: null,
  peakTime: null,
  riseTime10to90: null,
  settlingTime2percent: null,
  status: 'computed',
  route: 'certified',
};
const winch: StepMetrics = {
  ...nothing,
  finalValue: 1,
  overshootPercent: 23.31,
  peak: 1.2331,
  peakTime: 4.049,
  riseTime10to90: 1.7523,
  settlingTime2percent: 10.43,
};
const curve = { label: 'linear', time: [0, 4, 14], values: [0, 1.2331, 1] };
const content: StepContent = { input: 'r', output: 'F', outputUnit: 'N', curves: [curve], metrics: winch };
const size = { width: 560, height: 210 };

describe('the sentence under a step response', () => {
  test('names rise, overshoot, settling and final value', () => {
    expect(stepSummary(winch)).toBe('rise 1.75 s · overshoot 23.3 % · within 2 % after 10.4 s · final 1.000');
  });

  test('says that there is no overshoot', () => {
    expect(stepSummary({ ...winch, overshootPercent: 0, peak: null, peakTime: null })).toContain('· no overshoot ·');
  });

  test('says that a response does not settle', () => {
    expect(stepSummary(nothing)).toBe('does not settle');
  });

  test('tells figures that were not computed from those that do not exist', () => {
    expect(stepSummary({ ...nothing, status: 'not-computed' })).toBe('figures not computed');
    expect(stepSummary(null)).toBe('figures not computed');
  });

  test('leaves out what does not exist for a final value of zero', () => {
    expect(stepSummary({ ...nothing, finalValue: 0 })).toBe('final 0');
  });
});

describe('the mark of the peak', () => {
  test('says by how much and when', () => {
    expect(peakText(winch)).toBe('peak +23.3 % at 4.05 s');
  });

  test('is left out without an overshoot', () => {
    expect(peakText({ ...winch, overshootPercent: 0, peak: null, peakTime: null })).toBeNull();
    expect(markupText(stepDrawing({ ...content, metrics: nothing }, size, FILE).marks[0] ?? '')).not.toContain('peak');
  });

  test('stays inside the plot at either end of it', () => {
    for (const peakTime of [0.1, 4, 13.9]) {
      const { marks } = stepDrawing({ ...content, metrics: { ...winch, peakTime } }, size, FILE);
      const label = marks.find(mark => mark.tag === 'text' && markupText(mark).includes('peak'));
      const [x, isEnd] = [Number(label?.attributes['x']), label?.attributes['text-anchor'] === 'end'];
      expect(isEnd ? x - 150 : x).toBeGreaterThan(0);
      expect(isEnd ? x : x + 150).toBeLessThan(size.width);
    }
  });
});

describe('the frame', () => {
  test('holds zero, the final value and every finite value', () => {
    const wild = { ...content, curves: [{ ...curve, values: [-3, Number.POSITIVE_INFINITY, 8] }] };
    const frame = stepFrame(wild, size);
    for (const value of [0, 1, -3, 8]) {
      expect(frame.y(value)).toBeGreaterThanOrEqual(frame.top);
      expect(frame.y(value)).toBeLessThanOrEqual(frame.bottom);
    }
  });

  test('leaves room over the peak for its text', () => {
    const frame = stepFrame(content, size);
    expect(frame.y(1.2331) - frame.top).toBeGreaterThan(10);
  });

  test('goes from time to pixels and back', () => {
    const frame = stepFrame(content, size);
    expect(frame.timeAt(frame.x(4.05))).toBeCloseTo(4.05, 12);
    expect(frame.timeAt(-100)).toBe(0);
    expect(frame.timeAt(10_000)).toBe(14);
  });

  test('stands without any samples', () => {
    const frame = stepFrame({ ...content, curves: [], metrics: null }, size);
    expect([frame.horizon, frame.timeAxis.ticks.length > 1]).toEqual([1, true]);
  });

  test('grows with its width between two heights', () => {
    expect([100, 560, 3000].map(width => stepSize(width).height)).toEqual([170, 207, 260]);
  });
});

describe('the drawing', () => {
  test('says in a file what it shows and holds no variable of the page', () => {
    const file = svgFile(stepDrawing(content, size, FILE));
    expect(file).toContain('<title>step in r, response of F</title>');
    expect(file).toContain(`<desc>${stepSummary(winch)}</desc>`);
    expect(file).not.toContain('var(');
  });

  test('shades two percent to either side of the final value', () => {
    const tall = { ...content, metrics: { ...winch, finalValue: 1 }, curves: [{ ...curve, values: [0, 1.2, 1] }] };
    const frame = stepFrame(tall, { width: 560, height: 2000 });
    const band = stepDrawing(tall, { width: 560, height: 2000 }, FILE).marks.find(mark => mark.tag === 'rect');
    expect(Number(band?.attributes['y'])).toBeCloseTo(frame.y(1.02), 1);
    expect(Number(band?.attributes['height'])).toBeCloseTo(frame.y(0.98) - frame.y(1.02), 1);
  });

  test('names its curves where there are several', () => {
    const several = { ...content, curves: [curve, { ...curve, label: 'with clipping' }] };
    const words = (what: StepContent) => stepDrawing(what, size, FILE).marks.map(markupText).join('');
    expect(words(several)).toContain('with clipping');
    expect(words(content)).not.toContain('linear');
    expect(words(several)).toContain('stroke-dasharray="6 4"');
  });
});

describe('the read-out', () => {
  test('says the moment and the value of the nearest sample', () => {
    expect(readOutLines(content, 4.05)).toEqual(['t = 4.05 s', 'F = 1.233 N']);
  });

  test('names the curve where there are several, and where one has no value', () => {
    const several = { ...content, curves: [curve, { label: 'with clipping', time: [0], values: [Number.NaN] }] };
    expect(readOutLines(several, 0)).toEqual(['t = 0 s', 'linear = 0.000 N', 'with clipping: none']);
  });

  test('stays inside the plot at both ends', () => {
    const frame = stepFrame(content, size);
    for (const time of [0, 7, 14]) {
      const box = readOutMarks(content, frame, time, FILE).find(mark => mark.tag === 'rect')?.attributes;
      expect(Number(box?.['x'])).toBeGreaterThanOrEqual(0);
      expect(Number(box?.['x']) + Number(box?.['width'])).toBeLessThanOrEqual(size.width);
    }
  });

  test.each([
    ['ArrowRight', 7.14],
    ['ArrowLeft', 6.86],
    ['PageUp', 8.4],
    ['Home', 0],
    ['End', 14],
    ['Enter', null],
  ])('%s leads from the middle to %s', (key, time) => {
    const moment = momentAfter(key, 7, 14);
    if (time === null) expect(moment).toBeNull();
    else expect(moment).toBeCloseTo(time, 12);
  });

  test('never leaves the curve by keyboard', () => {
    expect(momentAfter('ArrowLeft', 0, 14)).toBe(0);
    expect(momentAfter('PageUp', 13.9, 14)).toBe(14);
  });
});
