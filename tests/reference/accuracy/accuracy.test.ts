/**
 * Digits on ordinary-looking models that are hard for doubles. Poles, zeros, step and frequency responses of `models.json` are
 * those of the decimals and fractions as written, computed with mpmath 1.3 at 120 to 160 digits and rounded once: roots of
 * the square-free factors of exact polynomials, exponentials by the series after scaling, responses as ratios of polynomials.
 */

import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { toRows } from '../../../src/algebra/index.ts';
import { frequencyResponse, poles, type Root, stepResponse, stepValuesAt, zeros } from '../../../src/analysis/index.ts';
import { balanceSystem, denseFromRows, hessenbergSystem, responseOf } from '../../../src/numeric/index.ts';
import { type Rows, rationalModel } from '../../unit/analysis/rational-model.ts';

interface HardModel {
  readonly name: string;
  readonly A: Rows;
  readonly B: Rows;
  readonly C: Rows;
  readonly D: Rows;
  readonly poles: readonly Root[];
  readonly zeros: readonly Root[];
  /** `points` equally spaced times from 0 to `horizon` s, of which every `every`-th is given. */
  readonly step: {
    readonly horizon: number;
    readonly points: number;
    readonly every: number;
    readonly y: readonly number[];
    readonly peak: number;
  };
  /** rad/s, real part, imaginary part. */
  readonly frequency: readonly (readonly [number, number, number])[];
}

const MODELS = JSON.parse(readFileSync(new URL('./models.json', import.meta.url), 'utf8')) as readonly HardModel[];

/** 13 digits of the peak. */
const STEP_ERROR = 1e-13;

/** 12 digits: from exact factors of the response itself, deep in the roll-off too; from matrices in doubles of its peak. */
const FREQUENCY_ERROR = 1e-12;

describe.each(MODELS)('$name', ({ A, B, C, D, poles: truePoles, zeros: trueZeros, step, frequency }) => {
  const model = rationalModel(A, B, C, D);

  test('every pole is the nearest double, with its multiplicity', () => {
    expect(poles(model)).toEqual({ route: 'certified', poles: truePoles, standsIn: false });
  });

  test('every zero is the nearest double, with its multiplicity', () => {
    expect(zeros(model)).toEqual({ route: 'certified', zeros: trueZeros, standsIn: false });
  });

  test('the step response has 13 digits of its peak', () => {
    const { horizon, points } = step;
    const response = stepResponse(model, { input: 0, outputs: [0], horizon, points });
    if (response.status !== 'computed') throw new Error(response.reason);
    const errors = step.y.map((y, k) => Math.abs((response.y[0]?.[k * step.every] ?? NaN) - y));
    expect(Math.max(...errors) / step.peak).toBeLessThan(STEP_ERROR);
  });

  test('read at single times it has them too', () => {
    const times = step.y.map((_, k) => (step.horizon * k * step.every) / (step.points - 1));
    const values = stepValuesAt(model, { input: 0, output: 0 }, times);
    const errors = step.y.map((y, k) => Math.abs((values?.[k] ?? NaN) - y));
    expect(Math.max(...errors) / step.peak).toBeLessThan(STEP_ERROR);
  });

  test('the frequency response from exact factors has 12 digits', () => {
    const found = frequencyResponse(
      model,
      { input: 0, output: 0 },
      frequency.map(([w]) => w),
    );
    expect(found.route).toBe('certified');
    frequency.forEach(([w, re, im], k) => {
      const error = Math.hypot((found.re[k] ?? NaN) - re, (found.im[k] ?? NaN) - im) / Math.hypot(re, im);
      expect(error, `at ${w} rad/s`).toBeLessThan(FREQUENCY_ERROR);
    });
  });

  test('that from the balanced Hessenberg form has 12 digits of its peak', () => {
    const dense = (key: 'A' | 'B' | 'C' | 'D') => {
      const matrix = model.numeric[key];
      return denseFromRows(toRows(matrix, 0), matrix.columns);
    };
    const balanced = balanceSystem(dense('A'), dense('B'), dense('C'));
    const respond = responseOf({ ...hessenbergSystem(balanced.A, balanced.B, balanced.C), D: dense('D') });
    const peak = Math.max(...frequency.map(([, re, im]) => Math.hypot(re, im)));
    for (const [w, re, im] of frequency) {
      const found = respond(0, w);
      const error = Math.hypot((found?.re[0] ?? NaN) - re, (found?.im[0] ?? NaN) - im) / peak;
      expect(error, `at ${w} rad/s`).toBeLessThan(FREQUENCY_ERROR);
    }
  });
});
