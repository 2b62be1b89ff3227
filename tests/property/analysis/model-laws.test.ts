import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { evaluatePolynomialAt, type Rational, toDouble } from '../../../src/algebra/index.ts';
import {
  frequencyResponse,
  hiddenModes,
  isControllable,
  isObservable,
  poles,
  stability,
  stepMetrics,
  stepResponse,
  stepValuesAt,
  transferFunction,
  zeros,
} from '../../../src/analysis/index.ts';
import type { StateSpace } from '../../../src/compile/index.ts';
import { type ComplexMatrix, solveComplex } from '../../../src/numeric/index.ts';
import { SEED } from '../../arbitraries/rationals.ts';
import { inDoubles, type Rows, rationalModel } from '../../unit/analysis/rational-model.ts';

const RUNS = { seed: SEED, numRuns: 60 };

/** Decimals of two figures, often zero. */
const entry = fc.oneof(
  { weight: 1, arbitrary: fc.constant('0') },
  { weight: 1, arbitrary: fc.integer({ min: -40, max: 40 }).map(x => `${x / 10}`) },
);

const rows = (n: number, m: number): fc.Arbitrary<Rows> =>
  fc.array(fc.array(entry, { minLength: m, maxLength: m }), { minLength: n, maxLength: n });

/** Models of 1 to 7 states, 1 or 2 inputs and outputs. */
const anyModel: fc.Arbitrary<StateSpace> = fc
  .tuple(fc.integer({ min: 1, max: 7 }), fc.integer({ min: 1, max: 2 }), fc.integer({ min: 1, max: 2 }))
  .chain(([n, m, p]) => fc.tuple(rows(n, n), rows(n, m), rows(p, n), rows(p, m)))
  .map(([A, B, C, D]) => rationalModel(A, B, C, D));

/** Models whose A is a random one shifted left of the axis by its largest row sum, so that every pole decays (Gershgorin). */
const stableModel: fc.Arbitrary<StateSpace> = fc
  .integer({ min: 1, max: 6 })
  .chain(n => fc.tuple(rows(n, n), rows(n, 1), rows(1, n), rows(1, 1)))
  .map(([A, B, C, D]) => {
    const shift = Math.max(...A.map(row => row.reduce<number>((sum, x) => sum + Math.abs(Number(x)), 0)));
    const left = A.map((row, i) => row.map((x, j) => (i === j ? `${(Number(x) - shift - 1).toFixed(1)}` : x)));
    return rationalModel(left, B, C, D);
  });

/** Entries of these models are at most 4, their systems of equations at s and jω rounded to this and well conditioned. */
const ROUNDING = 1e-12;

const count = (roots: readonly { readonly multiplicity: number }[]) =>
  roots.reduce((sum, { multiplicity }) => sum + multiplicity, 0);

/** C (sI − A)⁻¹ B + D of one channel by a direct solution at s = re + j·im. */
function direct({ numeric: { A, B, C, D } }: StateSpace, output: number, input: number, re: number, im: number) {
  const n = A.rows;
  const at = (M: typeof A, i: number, j: number) => {
    for (let k = M.rowStart[i] ?? 0; k < (M.rowStart[i + 1] ?? 0); k++) if (M.column[k] === j) return M.values[k] ?? 0;
    return 0;
  };
  const left: ComplexMatrix = { rows: n, columns: n, re: new Float64Array(n * n), im: new Float64Array(n * n) };
  const right: ComplexMatrix = { rows: n, columns: 1, re: new Float64Array(n), im: new Float64Array(n) };
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) left.re[i * n + j] = (i === j ? re : 0) - at(A, i, j);
    left.im[i * n + i] = im;
    right.re[i] = at(B, i, input);
  }
  const x = solveComplex(left, right);
  if (x === null) return null;
  let [sumRe, sumIm, size] = [at(D, output, input), 0, Math.abs(at(D, output, input))];
  for (let j = 0; j < n; j++) {
    const c = at(C, output, j);
    sumRe += c * (x.re[j] ?? 0);
    sumIm += c * (x.im[j] ?? 0);
    size += Math.abs(c) * Math.hypot(x.re[j] ?? 0, x.im[j] ?? 0);
  }
  return { re: sumRe, im: sumIm, size };
}

describe('poles', () => {
  test('are as many as states, in conjugate pairs, and add up to the trace', () => {
    fc.assert(
      fc.property(anyModel, model => {
        const found = poles(model).poles;
        expect(count(found)).toBe(model.states.length);
        for (const { re, im, multiplicity } of found) {
          if (im === 0) continue;
          expect(found).toContainEqual({ re, im: -im, multiplicity });
        }
        const sum = found.reduce((total, { re, multiplicity }) => total + re * multiplicity, 0);
        const size = found.reduce((total, { re, multiplicity }) => total + Math.abs(re) * multiplicity, 0);
        const { A } = model.numeric;
        let trace = 0;
        for (let i = 0; i < A.rows; i++) {
          for (let k = A.rowStart[i] ?? 0; k < (A.rowStart[i + 1] ?? 0); k++) {
            if (A.column[k] === i) trace += A.values[k] ?? 0;
          }
        }
        expect(Math.abs(sum - trace)).toBeLessThanOrEqual(16 * A.rows * Number.EPSILON * (size + Math.abs(trace) + 1));
      }),
      RUNS,
    );
  });

  test('decide stability: to the right unstable, all to the left stable', () => {
    fc.assert(
      fc.property(anyModel, model => {
        const found = poles(model).poles;
        const { verdict, proved } = stability(model);
        expect(proved).toBe(true);
        if (found.some(({ re }) => re > 0)) expect(verdict).toBe('unstable');
        else if (found.every(({ re }) => re < 0)) expect(verdict).toBe('stable');
        else expect(['marginal', 'unstable']).toContain(verdict);
      }),
      RUNS,
    );
  });
});

describe('transfer functions', () => {
  test('are C (sI − A)⁻¹ B + D at real s and at jω', () => {
    fc.assert(
      fc.property(anyModel, fc.integer({ min: 1, max: 900 }), (model, tenths) => {
        const [output, input] = [model.outputs.length - 1, model.inputs.length - 1];
        const fraction = transferFunction(model, output, input);
        if (fraction.route !== 'certified') throw new Error(fraction.reason);
        const s: Rational = { n: BigInt(tenths) * 10n + 1003n, d: 1000n }; // right of the numerators' decimals
        const denominator = toDouble(evaluatePolynomialAt(fraction.exact.denominator, s));
        const real = direct(model, output, input, toDouble(s), 0);
        if (real !== null && denominator !== 0) {
          const value = toDouble(evaluatePolynomialAt(fraction.exact.numerator, s)) / denominator;
          expect(Math.abs(value - real.re)).toBeLessThanOrEqual(1e-9 * real.size + ROUNDING);
        }
        const omega = tenths / 100 + 0.003;
        const imaginary = direct(model, output, input, 0, omega);
        const { re, im } = frequencyResponse(model, { input, output }, [omega]);
        if (imaginary === null) return;
        const distance = Math.hypot((re[0] ?? NaN) - imaginary.re, (im[0] ?? NaN) - imaginary.im);
        expect(distance).toBeLessThanOrEqual(1e-9 * imaginary.size + ROUNDING);
      }),
      RUNS,
    );
  });

  test('have a denominator of as many poles as are not hidden, with one input and one output', () => {
    fc.assert(
      fc.property(
        anyModel.filter(({ inputs, outputs }) => inputs.length === 1 && outputs.length === 1),
        model => {
          const fraction = transferFunction(model, 0, 0);
          if (fraction.route !== 'certified') throw new Error(fraction.reason);
          const hidden = count(hiddenModes(model) ?? []);
          expect(fraction.denominator.length - 1).toBe(model.states.length - hidden);
          const isMinimal = isControllable(model).holds === true && isObservable(model).holds === true;
          expect(hidden === 0).toBe(isMinimal);
          // Every hidden pole is an invariant zero too, unless the channel is zero and the determinant vanishes.
          if (fraction.numerator.some(x => x !== 0)) {
            expect(count(zeros(model).zeros)).toBe(fraction.numerator.length - 1 + hidden);
          }
        },
      ),
      RUNS,
    );
  });
});

describe('step responses', () => {
  test('of stable models end at G(0), the final value theorem', () => {
    fc.assert(
      fc.property(stableModel, model => {
        const metrics = stepMetrics(model, { input: 0, output: 0 });
        const fraction = transferFunction(model, 0, 0);
        if (fraction.route !== 'certified') throw new Error(fraction.reason);
        const last = (p: readonly number[]) => p[p.length - 1] ?? NaN;
        const gain = last(fraction.numerator) / last(fraction.denominator);
        expect(Math.abs((metrics.finalValue ?? NaN) - gain)).toBeLessThanOrEqual(4 * Number.EPSILON * Math.abs(gain));
        const slowest = Math.max(...poles(model).poles.map(({ re }) => -1 / re));
        const [late] = stepValuesAt(model, { input: 0, output: 0 }, [60 * slowest]) ?? [];
        const { D } = model.numeric;
        const size = Math.max(Math.abs(gain), Math.abs(D.values[0] ?? 0), 1);
        expect(Math.abs((late ?? NaN) - gain)).toBeLessThanOrEqual(1e-11 * size);
      }),
      RUNS,
    );
  });

  test('start at D and are the same from exact and from doubled matrices', () => {
    fc.assert(
      fc.property(stableModel, model => {
        const request = { input: 0, outputs: [0], points: 51, horizon: 3 };
        const exact = stepResponse(model, request);
        const doubled = stepResponse(inDoubles(model), request);
        if (exact.status !== 'computed' || doubled.status !== 'computed') throw new Error('not computed');
        const [a, b] = [exact.y[0] ?? [], doubled.y[0] ?? []];
        expect(a[0]).toBe(model.numeric.D.values[0] ?? 0);
        const size = Math.max(...Array.from(a, Math.abs), 1);
        a.forEach((y, k) => {
          expect(Math.abs(y - (b[k] ?? NaN))).toBeLessThanOrEqual(1e-12 * size);
        });
      }),
      RUNS,
    );
  });

  test('figures agree with the curve: the level at the rise and settling times, no sample above the peak', () => {
    fc.assert(
      fc.property(stableModel, model => {
        const channel = { input: 0, output: 0 };
        const { finalValue, peak, peakTime, settlingTime2percent, status } = stepMetrics(model, channel);
        expect(status).toBe('computed');
        if (finalValue === null || finalValue === 0) return;
        const response = stepResponse(model, { input: 0, outputs: [0], points: 2001 });
        if (response.status !== 'computed') throw new Error(response.reason);
        const size = Math.max(...Array.from(response.y[0] ?? [], Math.abs));
        const highest = Math.max(...Array.from(response.y[0] ?? [], y => y * Math.sign(finalValue)));
        if (peak !== null && peakTime !== null) {
          expect(Math.abs(peak)).toBeGreaterThanOrEqual(highest - 1e-13 * size);
          const [at] = stepValuesAt(model, channel, [peakTime]) ?? [];
          expect(Math.abs((at ?? NaN) - peak)).toBeLessThanOrEqual(1e-12 * size);
        } else expect(highest).toBeLessThanOrEqual(Math.abs(finalValue) + 1e-12 * size);
        const settled = settlingTime2percent ?? NaN;
        if (settled > 0) {
          const [at] = stepValuesAt(model, channel, [settled]) ?? [];
          const deviation = Math.abs((at ?? NaN) - finalValue) / Math.abs(finalValue);
          expect(Math.abs(deviation - 0.02) * Math.abs(finalValue)).toBeLessThanOrEqual(1e-11 * size);
        }
        response.t.forEach((t, k) => {
          const deviation = Math.abs((response.y[0]?.[k] ?? NaN) - finalValue);
          if (t > settled) expect(deviation).toBeLessThanOrEqual(0.02 * Math.abs(finalValue) + 1e-11 * size);
        });
      }),
      RUNS,
    );
  });
});
