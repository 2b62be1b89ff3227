import { describe, expect, test } from 'vitest';
import { stability } from '../../../src/analysis/index.ts';
import { companionModel, type Rows, rationalModel } from './rational-model.ts';

const free = (A: Rows) => rationalModel(A, [], []);

/** A block diagonal matrix of the given matrices. */
function blocks(...parts: readonly Rows[]): Rows {
  const n = parts.reduce((sum, part) => sum + part.length, 0);
  const rows: (string | number)[][] = [];
  let offset = 0;
  for (const part of parts) {
    for (const row of part) {
      rows.push([...new Array<number>(offset).fill(0), ...row, ...new Array<number>(n - offset - row.length).fill(0)]);
    }
    offset += part.length;
  }
  return rows;
}

const OSCILLATOR: Rows = [
  [0, 1],
  [-2, 0],
];

describe('stability by exact arithmetic', () => {
  test('a lag is stable, its mirror image unstable, both proved', () => {
    expect(stability(free([[-1]]))).toEqual({ verdict: 'stable', proved: true, standsIn: false });
    expect(stability(free([[1]]))).toEqual({ verdict: 'unstable', proved: true, standsIn: false });
  });

  test('nothing that moves is stable', () => {
    expect(stability(free([])).verdict).toBe('stable');
  });

  test('one integrator is marginal, so are two that do not feed each other', () => {
    expect(stability(free([[0]])).verdict).toBe('marginal');
    expect(stability(free(blocks([[0]], [[0]]))).verdict).toBe('marginal');
  });

  test('an integrator that feeds another is unstable: its ramp grows', () => {
    expect(
      stability(
        free([
          [0, 0],
          [1, 0],
        ]),
      ).verdict,
    ).toBe('unstable');
  });

  test('three integrators, two of them in a row, are unstable', () => {
    expect(
      stability(
        free([
          [0, 0, 0],
          [1, 0, 0],
          [0, 0, 0],
        ]),
      ).verdict,
    ).toBe('unstable');
  });

  test('two equal oscillators side by side are marginal, one driving the other is unstable', () => {
    const apart = blocks(OSCILLATOR, OSCILLATOR);
    const driven = apart.map((row, i) => row.map((entry, j) => (i === 3 && j === 0 ? 1 : entry)));
    expect(stability(free(apart)).verdict).toBe('marginal');
    expect(stability(free(driven)).verdict).toBe('unstable');
  });

  test('a repeated pole to the left does not count against a simple one on the axis', () => {
    const lagsInRow: Rows = [
      [-1, 0],
      [1, -1],
    ];
    expect(stability(free(blocks([[0]], lagsInRow))).verdict).toBe('marginal');
    expect(stability(free(blocks(OSCILLATOR, lagsInRow, OSCILLATOR))).verdict).toBe('marginal');
  });

  test('poles ±1 are unstable, though the even and the odd part share them', () => {
    expect(stability(companionModel([1], [1, 0, -1])).verdict).toBe('unstable');
  });

  test('a damping of 10⁻⁴⁰ either way is told apart', () => {
    const damped = (b: string): Rows => [
      [0, 1],
      [-1, b],
    ];
    expect(stability(free(damped('-1e-40'))).verdict).toBe('stable');
    expect(stability(free(damped('1e-40'))).verdict).toBe('unstable');
    expect(stability(free(damped('0'))).verdict).toBe('marginal');
  });

  test('the limit of a loop gain is found exactly: s³ + 3 s² + 2 s + K at K = 6', () => {
    // Routh 1877: stable for 0 < K < 6.
    const loop = (K: string) =>
      rationalModel(
        [
          [0, 1, 0],
          [0, 0, 1],
          [`-${K}`, -2, -3],
        ],
        [[0], [0], [1]],
        [[1, 0, 0]],
      );
    expect(stability(loop('5.9999999999999999')).verdict).toBe('stable');
    expect(stability(loop('6')).verdict).toBe('marginal');
    expect(stability(loop('6.0000000000000001')).verdict).toBe('unstable');
  });
});

describe('stability of models too large for exact arithmetic', () => {
  const many = (value: number) => Array.from({ length: 40 }, (): Rows => [[value]]);

  test('rests on computed poles and says so', () => {
    expect(stability(free(blocks(...many(-1))))).toEqual({ verdict: 'stable', proved: false, standsIn: false });
    expect(stability(free(blocks(...many(-1), [[1e-9]])))).toMatchObject({ verdict: 'unstable', proved: false });
  });

  test('one integrator among lags is marginal, two are left undecided until there is time for a proof', () => {
    expect(stability(free(blocks(...many(-1), [[0]]))).verdict).toBe('marginal');
    const two = free(blocks(...many(-1), [[0]], [[0]]));
    expect(stability(two).verdict).toBe('undecided');
    expect(stability(two, 'high')).toMatchObject({ verdict: 'marginal', proved: true });
  });

  test('an undamped oscillator among lags is marginal', () => {
    expect(stability(free(blocks(...many(-1), OSCILLATOR))).verdict).toBe('marginal');
  });
});
