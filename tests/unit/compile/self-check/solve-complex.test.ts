import { expect, test } from 'vitest';
import { type ComplexSystem, SystemWriter } from '../../../../src/compile/self-check/complex-system.ts';
import { factorComplex } from '../../../../src/compile/self-check/factor-complex.ts';
import { solveRefined } from '../../../../src/compile/self-check/solve-complex.ts';

function systemOf(entries: readonly (readonly (readonly [re: number, im: number])[])[]): ComplexSystem {
  const writer = new SystemWriter();
  for (const row of entries) {
    row.forEach(([re, im], column) => {
      if (re !== 0 || im !== 0) writer.add(column, re, im);
    });
    writer.endRow();
  }
  return writer.finish();
}

function solve(system: ComplexSystem, re: readonly number[], im: readonly number[]) {
  const factors = factorComplex(system);
  if (factors === null) return null;
  const solution = solveRefined(system, factors, { re: Float64Array.from(re), im: Float64Array.from(im) });
  return { re: [...solution.re], im: [...solution.im] };
}

test('a complex system of two unknowns is solved: x + i y = 1, i x + 2 y = i', () => {
  // Subtracting i times the first: (2 + 1) y = 0, so y = 0 and x = 1.
  const solution = solve(
    systemOf([
      [
        [1, 0],
        [0, 1],
      ],
      [
        [0, 1],
        [2, 0],
      ],
    ]),
    [1, 0],
    [0, 1],
  );
  expect(solution?.re[0]).toBeCloseTo(1, 15);
  expect(solution?.im[0]).toBeCloseTo(0, 15);
  expect(Math.hypot(solution?.re[1] ?? NaN, solution?.im[1] ?? NaN)).toBeLessThan(1e-15);
});

test('an unknown that no path leads to from the right-hand side is exactly zero', () => {
  const solution = solve(
    systemOf([
      [
        [1, 0],
        [0, 0],
      ],
      [
        [1e9, 0.1],
        [3, 0.7],
      ],
    ]),
    [0, 1],
    [0, 0],
  );
  expect([solution?.re[0], solution?.im[0]]).toEqual([0, 0]);
});

test('a singular system has no factors', () => {
  const one = [1, 0] as const;
  expect(
    factorComplex(
      systemOf([
        [one, one],
        [one, one],
      ]),
    ),
  ).toBeNull();
  expect(factorComplex(systemOf([[[0, 0]]]))).toBeNull();
});

test('refinement leaves a residual of rounding size in every row, also of tiny unknowns', () => {
  const n = 30;
  const system = systemOf(
    Array.from({ length: n }, (_, i) =>
      Array.from({ length: n }, (_, j): [number, number] => {
        if (i === j) return [1, 0];
        return (i + 3 * j) % 5 === 0 ? [10 ** ((j % 7) - 3) * Math.cos(i + j), Math.sin(i * j)] : [0, 0];
      }),
    ),
  );
  const right = Array.from({ length: n }, (_, i) => (i === 0 ? 1 : 0));
  const solution = solve(system, right, new Array(n).fill(0));
  for (let i = 0; i < n; i++) {
    let [sumRe, sumIm, size] = [-(right[i] ?? NaN), 0, Math.abs(right[i] ?? NaN)];
    for (let k = system.start[i] ?? 0; k < (system.start[i + 1] ?? 0); k++) {
      const j = system.column[k] ?? -1;
      const [xRe, xIm] = [solution?.re[j] ?? NaN, solution?.im[j] ?? NaN];
      const [aRe, aIm] = [system.re[k] ?? NaN, system.im[k] ?? NaN];
      sumRe += aRe * xRe - aIm * xIm;
      sumIm += aRe * xIm + aIm * xRe;
      size += Math.hypot(aRe, aIm) * Math.hypot(xRe, xIm);
    }
    expect(Math.hypot(sumRe, sumIm)).toBeLessThanOrEqual(64 * Number.EPSILON * size);
  }
});
