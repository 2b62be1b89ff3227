/** Correct digits of ours and of numpy's on the models whose truth stands in tests/reference/accuracy, as a table. */

import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { frequencyResponse, poles, stepResponse } from '../../src/analysis/index.ts';
import { type Rows, rationalModel } from '../unit/analysis/rational-model.ts';
import { asDoubles, reference } from './numeric-reference.ts';

const COUNTED = { input: 0, output: 0 } as const;

interface HardModel {
  readonly name: string;
  readonly A: Rows;
  readonly B: Rows;
  readonly C: Rows;
  readonly D: Rows;
  readonly poles: readonly { readonly re: number; readonly im: number; readonly multiplicity: number }[];
  readonly step: {
    readonly horizon: number;
    readonly points: number;
    readonly every: number;
    readonly y: readonly number[];
    readonly peak: number;
  };
  readonly frequency: readonly (readonly [number, number, number])[];
}

/** Decimal digits of a relative error, 17 for none. */
const digits = (error: number): string => (error === 0 ? '17.0' : Math.max(0, -Math.log10(error)).toFixed(1));

/** The largest distance of a true pole, counted with multiplicity, to the nearest unused found one, relative to its magnitude. */
function poleError(truth: HardModel['poles'], found: readonly (readonly [number, number])[]): number {
  const left = [...found];
  let worst = 0;
  for (const { re, im, multiplicity } of truth) {
    for (let copy = 0; copy < multiplicity; copy++) {
      const distances = left.map(([x, y]) => Math.hypot(x - re, y - im));
      const least = Math.min(...distances);
      left.splice(distances.indexOf(least), 1);
      const size = Math.hypot(re, im);
      worst = Math.max(worst, size === 0 ? least : least / size);
    }
  }
  return worst;
}

const largest = (values: readonly number[]): number => values.reduce((a, b) => Math.max(a, b), 0);

/** A row for each model. */
export function digitsTable(): string {
  const file = join(process.cwd(), 'tests', 'reference', 'accuracy', 'models.json');
  const hard = JSON.parse(readFileSync(file, 'utf8')) as readonly HardModel[]; // our own fixture
  const models = hard.map(({ A, B, C, D }) => rationalModel(A, B, C, D));
  const inputs = hard.map(({ step, frequency }, i) => {
    const times = Array.from({ length: step.points }, (_, k) => (step.horizon * k) / (step.points - 1));
    const model = models[i];
    if (model === undefined) throw new Error('a model is missing');
    return asDoubles(
      model,
      times,
      frequency.map(([w]) => w),
    );
  });
  const theirs = reference(inputs).models;
  const rows = hard.map(({ name, poles: truth, step, frequency }, i) => {
    const model = models[i];
    const their = theirs[i];
    if (model === undefined || their === undefined) throw new Error('a model is missing');
    const stepError = (y: ArrayLike<number>) =>
      largest(step.y.map((value, k) => Math.abs((y[k * step.every] ?? Number.NaN) - value))) / step.peak;
    const frequencyError = (at: (k: number) => readonly [number, number]) =>
      largest(frequency.map(([, re, im], k) => Math.hypot(at(k)[0] - re, at(k)[1] - im) / Math.hypot(re, im)));
    const found = poles(model).poles.flatMap(({ re, im, multiplicity }) =>
      Array.from({ length: multiplicity }, () => [re, im] as const),
    );
    const response = stepResponse(model, { input: 0, outputs: [0], horizon: step.horizon, points: step.points });
    const ours = frequencyResponse(
      model,
      COUNTED,
      frequency.map(([w]) => w),
    );
    const cells = [
      name,
      digits(poleError(truth, found)),
      digits(poleError(truth, their.poles)),
      response.status === 'computed' ? digits(stepError(response.y[0] ?? [])) : 'none',
      digits(stepError(their.y)),
      digits(frequencyError(k => [ours.re[k] ?? Number.NaN, ours.im[k] ?? Number.NaN])),
      digits(frequencyError(k => their.h[k] ?? [Number.NaN, Number.NaN])),
    ];
    return `| ${cells.join(' | ')} |`;
  });
  return [
    '| correct digits: model | poles | numpy | step / peak | lsim | frequency | batched solve |',
    '| :- | -: | -: | -: | -: | -: | -: |',
    ...rows,
  ].join('\n');
}
