/**
 * Poles, step and frequency responses beside numpy and scipy in one run: certified poles in units of numpy's eigenvalues of a
 * 200 × 200 matrix, the rest as ratios; and correct digits of both on the models whose truth stands in tests/reference/accuracy.
 */

import { spawnSync } from 'node:child_process';
import { frequencyResponse, poles, stepResponse } from '../../src/analysis/index.ts';
import type { StateSpace } from '../../src/compile/index.ts';
import { denseFromRows, eigenvalues } from '../../src/numeric/index.ts';
import { inDoubles, rationalModel } from '../unit/analysis/rational-model.ts';
import type { Benchmark } from './bench.ts';
import { digitsTable } from './correct-digits.ts';
import { asDoubles, reference } from './numeric-reference.ts';
import { randomSource } from './random-drawing.ts';

/** Within the limit for high effort; 64 states are above the one for ordinary effort. */
const CERTIFIED = [4, 8, 16, 32, 64];
const FLOATING = [10, 20, 50, 100, 200];
const POINTS = 1000;
const HORIZON = 10;
const OMEGA = Array.from({ length: POINTS }, (_, k) => 10 ** (-2 + (4 * k) / (POINTS - 1)));
const TIMES = Array.from({ length: POINTS }, (_, k) => (HORIZON * k) / (POINTS - 1));

/** Three entries a row, one decimal each, strongly connected by a ring; one input at the first state, the last state the output. */
function sparseModel(n: number): StateSpace {
  const random = randomSource(n);
  const A = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  for (const [i, row] of A.entries()) {
    row[i] = -2;
    const next = (i + 1) % n;
    row[next] = (1 + Math.floor(10 * random())) / 10;
    const other = Math.floor(random() * n);
    if (other !== i && other !== next) row[other] = (Math.floor(20 * random()) - 10) / 10;
  }
  return rationalModel(
    A,
    A.map((_, i) => [i === 0 ? 1 : 0]),
    [A.map((_, i) => (i === n - 1 ? 1 : 0))],
  );
}

/** Standard normal entries (Box & Muller 1958). */
function normalRows(n: number): number[][] {
  const random = randomSource(n);
  const normal = () => Math.sqrt(-2 * Math.log(random())) * Math.cos(2 * Math.PI * random());
  return Array.from({ length: n }, () => Array.from({ length: n }, normal));
}

/** The same model as an object of its own: answers are remembered by object, and a benchmark is to compute each time. */
const afresh = (model: StateSpace): StateSpace => ({ ...model });

function equalLags(n: number): StateSpace {
  const A = Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => (i === j ? -1 : j === i - 1 ? 1 : 0)),
  );
  return rationalModel(
    A,
    A.map((_, i) => [i === 0 ? 1 : 0]),
    [A.map((_, i) => (i === n - 1 ? 1 : 0))],
  );
}

/** Until the compiler has settled: eigenvalues of small matrices got faster for a quarter of a second. */
const WARM_UP_MS = 300;

function median(work: () => unknown, runs = 7): number {
  const warmUntil = performance.now() + WARM_UP_MS;
  do work();
  while (performance.now() < warmUntil);
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[runs >> 1] ?? Number.NaN;
}

const COUNTED = { input: 0, output: 0 } as const;

function ratioTable(): { readonly lines: readonly string[]; readonly header: string } {
  const sizes = [...new Set([...CERTIFIED, ...FLOATING])].sort((a, b) => a - b);
  const models = sizes.map(sparseModel);
  const { unit, models: theirs, numpy, kernel } = reference(models.map(model => asDoubles(model, TIMES, OMEGA)));
  const normal = reference(
    FLOATING.map(n => ({
      A: normalRows(n),
      b: normalRows(n)[0] ?? [],
      c: normalRows(n)[0] ?? [],
      times: TIMES,
      omega: OMEGA.slice(0, 2),
    })),
  );
  const certified = CERTIFIED.map(n => {
    const model = sparseModel(n);
    if (poles(afresh(model), 'high').route !== 'certified') return `| ${n} | not certified | |`;
    const ms = median(() => poles(afresh(model), 'high'));
    return `| ${n} | ${ms.toFixed(2)} | ${(ms / unit).toFixed(2)}x |`;
  });
  const floating = FLOATING.map((n, i) => {
    const A = denseFromRows(normalRows(n));
    const ms = median(() => eigenvalues(A));
    const numpyMs = normal.models[i]?.eigenvalues ?? Number.NaN;
    return `| ${n} | ${ms.toFixed(3)} | ${numpyMs.toFixed(3)} | ${(ms / numpyMs).toFixed(2)}x |`;
  });
  const responses = sizes.map((n, i) => {
    const model = inDoubles(models[i] ?? sparseModel(n));
    const request = { input: 0, outputs: [0], horizon: HORIZON, points: POINTS };
    const step = median(() => stepResponse(afresh(model), request));
    const frequency = median(() => frequencyResponse(afresh(model), COUNTED, OMEGA));
    const route = frequencyResponse(afresh(model), COUNTED, OMEGA).route;
    const their = theirs[i];
    const ratio = (ours: number, other = Number.NaN) =>
      `${ours.toFixed(2)} | ${other.toFixed(2)} | ${(ours / other).toFixed(2)}x`;
    return `| ${n} | ${ratio(step, their?.step)} | ${ratio(frequency, their?.frequency)} | ${route} |`;
  });
  const header = `numpy ${numpy}, ${kernel}, one thread; eigvals of a standard normal 200 x 200: ${unit.toFixed(1)} ms, the unit below.`;
  return {
    header,
    lines: [
      ['| certified poles, n | ms | in units |', '| -: | -: | -: |', ...certified].join('\n'),
      'Goals in units: 0.7 at n = 16, 2 at 32, 10 at 64.',
      ['| eigenvalues in doubles, n | ms | numpy ms | ratio |', '| -: | -: | -: | -: |', ...floating].join('\n'),
      'Goals: 1.5x to n = 20, 2.5x at 50 and 100, 4x at 200.',
      [
        '| n | step ms | lsim ms | ratio | frequency ms | batched solve ms | ratio | route |',
        '| -: | -: | -: | -: | -: | -: | -: | :- |',
        ...responses,
      ].join('\n'),
      'Goals: step 0.5x to n = 20, 1.5x at 50, 4x at 100, 6x at 200; frequency response 0.4x at each n.',
    ],
  };
}

function besideNumpy(): readonly string[] {
  if (spawnSync('python3', ['-c', 'import scipy.signal']).status !== 0) {
    return ['scipy is not installed (Debian: python3-scipy), so there is nothing to compare with.'];
  }
  const { header, lines } = ratioTable();
  return [header, ...lines, digitsTable()];
}

const benchmark: Benchmark = {
  title: 'Poles and responses',
  note: 'Certified poles of random models, three entries a row, nothing remembered. Degenerate: equal lags, one pole n times.',
  families: [
    {
      name: 'certified, random',
      sizes: CERTIFIED,
      prepare: size => {
        const model = sparseModel(size);
        return () => poles(afresh(model), 'high');
      },
    },
    {
      name: 'certified, equal lags',
      sizes: CERTIFIED,
      prepare: size => {
        const model = equalLags(size);
        return () => poles(afresh(model), 'high');
      },
    },
  ],
  remarks: besideNumpy,
};

export default benchmark;
