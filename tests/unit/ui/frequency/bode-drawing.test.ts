/** The plot over frequency as a drawing: its words, its marks, the file that is saved. */

import { expect, test } from 'vitest';
import { margins } from '../../../../src/analysis/index.ts';
import { cutContent } from '../../../../src/ui/frequency/bode-content.ts';
import { bodeDrawing, readOutLines } from '../../../../src/ui/frequency/bode-drawing.ts';
import { bodeFrame } from '../../../../src/ui/frequency/bode-frame.ts';
import { FILE, svgFile } from '../../../../src/ui/plots/index.ts';

/** L = 1 / (jω (1 + jω)²), whose phase crossover is 1 rad/s with |L| = 1/2. */
const omega = Float64Array.of(0.1, 0.5, 1, 10);
const square = omega.map(w => w * (1 + w * w));
const curve = {
  omega,
  magnitude: square.map(size => -20 * Math.log10(size)),
  phase: omega.map(w => -90 - (360 / Math.PI) * Math.atan(w)),
};
const found = margins({
  valueAt: w => (w === 0 ? null : [-2 / (1 + w * w) ** 2, -(1 - w * w) / (w * (1 + w * w) ** 2)]),
  exact: null,
  route: 'floating',
  deadTimes: [],
  features: [{ re: -1, im: 0, multiplicity: 2 }],
  openPoles: [],
  closedLoop: 'stable',
});
const content = cutContent('cut 1', { curve, margins: found, route: 'floating', closedLoop: 'stable' });
const size = { width: 500, height: 320 };

test('the gain margin of a loop without an exact fraction is found and said', () => {
  expect(found.gainMarginUp?.omega).toBeCloseTo(1, 12);
  expect(found.gainMarginUp?.gainMargin).toBeCloseTo(2, 12);
  expect(content.summary).toContain('gain margin ×2 (6.02 dB)');
});

test('the margin stands in the magnitude between the curve and 0 dB', () => {
  const [mark] = content.marks.filter(({ kind }) => kind === 'gain');
  expect(mark?.from).toBeCloseTo(-20 * Math.log10(2), 10);
  expect(mark?.to).toBe(0);
});

test('the frame spans whole ticks around both curves', () => {
  const { magnitude, phase, x, omegaAt } = bodeFrame(content, size);
  expect(magnitude.ticks.at(-1)?.value).toBeGreaterThanOrEqual(Math.max(...curve.magnitude));
  expect(phase.ticks[0]?.value).toBeLessThanOrEqual(Math.min(...curve.phase));
  expect(omegaAt(x(0.5))).toBeCloseTo(0.5, 12);
});

test('the read-out is that of the nearest sample', () => {
  expect(readOutLines(content, 0.9)).toEqual(['1 rad/s', '−6.021 dB', '−180°']);
});

test('the saved file stands by itself', () => {
  const file = svgFile(bodeDrawing(content, size, FILE));
  expect(file).toContain('<title>Loop transfer at cut 1</title>');
  expect(file).toContain('×2 (6.02 dB)');
  expect(file).not.toContain('var(');
});
