/**
 * The linear system that holds while every limiter stays as it is: inside its limits, where it hands its input through, or at one of
 * them, where it gives a constant. Limiters inside their limits may be in algebraic loops, which are solved here.
 */

import type { OpenedModel } from '../../compile/index.ts';
import { type DenseMatrix, denseFromRows, luFactors, luSolve, zeroMatrix } from '../../numeric/index.ts';
import { denseOf } from '../channel-system.ts';

/** Of one limiter: at its lower limit, inside, at its upper limit. */
export type ClipState = -1 | 0 | 1;

/**
 * x′ = A x + B r, w = C x + D r with r = [the stimulus, the dead times' outputs, 1]; rows of w: the outputs asked for, what feeds
 * the dead times, what feeds the limiters.
 */
export interface ModeSystem {
  readonly A: DenseMatrix;
  readonly B: DenseMatrix;
  readonly C: DenseMatrix;
  readonly D: DenseMatrix;
}

export interface SimulatedParts {
  readonly opened: OpenedModel;
  /** Position of the input that is driven; null: none is. */
  readonly input: number | null;
  /** Positions of the outputs that are asked for. */
  readonly outputs: readonly number[];
}

/** The system of a mode; null where the limiters inside their limits have an algebraic loop without a unique solution. */
export function modeSystem({ opened, input, outputs }: SimulatedParts, clips: readonly ClipState[]): ModeSystem | null {
  const A = denseOf(opened.matrices.A);
  const B = denseOf(opened.matrices.B);
  const C = denseOf(opened.matrices.C);
  const D = denseOf(opened.matrices.D);
  const [m, d, l] = [opened.inputs.length, opened.delays.length, opened.limiters.length];
  const p = opened.outputs.length;
  const rows = [...outputs, ...range(p, d + l)];
  const n = A.rows;
  const width = d + 2;
  // Columns of everything that is given: the stimulus, the dead times, and 1 times the limits that are in force.
  const given = (M: DenseMatrix, i: number): number[] => {
    const entry = (j: number) => M.data[i * M.columns + j]!;
    const limits = clips.reduce<number>((sum, clip, k) => sum + entry(m + d + k) * limitOf(opened, k, clip), 0);
    return [input === null ? 0 : entry(input), ...range(m, d).map(entry), limits];
  };
  const inside = clips.flatMap((clip, k) => (clip === 0 ? [k] : []));
  const solved = solveInside(inside, { C, D, given, row: k => p + d + k, column: k => m + d + k, n, width });
  if (solved === null) return null;
  const close = (M: DenseMatrix, direct: DenseMatrix, i: number) => {
    const states = Array.from({ length: n }, (_, j) => M.data[i * n + j]!);
    const inputs = given(direct, i);
    inside.forEach((k, q) => {
      const factor = direct.data[i * direct.columns + m + d + k]!;
      if (factor === 0) return;
      for (let j = 0; j < n; j++) states[j]! += factor * solved.data[q * (n + width) + j]!;
      for (let j = 0; j < width; j++) inputs[j]! += factor * solved.data[q * (n + width) + n + j]!;
    });
    return { states, inputs };
  };
  const dynamics = Array.from({ length: n }, (_, i) => close(A, B, i));
  const readings = rows.map(i => close(C, D, i));
  return {
    A: denseFromRows(
      dynamics.map(({ states }) => states),
      n,
    ),
    B: denseFromRows(
      dynamics.map(({ inputs }) => inputs),
      width,
    ),
    C: denseFromRows(
      readings.map(({ states }) => states),
      n,
    ),
    D: denseFromRows(
      readings.map(({ inputs }) => inputs),
      width,
    ),
  };
}

const range = (from: number, count: number) => Array.from({ length: count }, (_, k) => from + k);

function limitOf({ limiters }: OpenedModel, k: number, clip: ClipState): number {
  const limiter = limiters[k]!;
  return clip === 0 ? 0 : clip > 0 ? limiter.upper : limiter.lower;
}

interface Inside {
  readonly C: DenseMatrix;
  readonly D: DenseMatrix;
  readonly given: (M: DenseMatrix, i: number) => number[];
  readonly row: (limiter: number) => number;
  readonly column: (limiter: number) => number;
  readonly n: number;
  readonly width: number;
}

/** What the limiters inside their limits hand through, in terms of the states and of what is given: (I − D)⁻¹ [C, D]. */
function solveInside(inside: readonly number[], { C, D, given, row, column, n, width }: Inside): DenseMatrix | null {
  if (inside.length === 0) return zeroMatrix(0, n + width);
  const loop = inside.map(k => inside.map(q => (k === q ? 1 : 0) - D.data[row(k) * D.columns + column(q)]!));
  const factors = luFactors(denseFromRows(loop, inside.length));
  if (factors === null) return null;
  const sides = inside.map(k => [...Array.from({ length: n }, (_, j) => C.data[row(k) * n + j]!), ...given(D, row(k))]);
  return luSolve(factors, denseFromRows(sides, n + width));
}
