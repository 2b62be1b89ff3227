/**
 * Over one piece of time in one mode: the states at its nodes, exactly for inputs that are polynomials there. The polynomials ride along
 * as states of their own that are shifted in time, so that one exponential serves every piece of the same length.
 */

import {
  balanceSystem,
  type DenseMatrix,
  exponentialMinusIdentity,
  multiplyVector,
  zeroMatrix,
} from '../../numeric/index.ts';
import type { ModeSystem } from './mode-system.ts';
import { DEGREE, derivativeOfCoefficients, NODES, valueAtStart } from './piece-polynomials.ts';

export interface PiecePropagator {
  /** s. */
  readonly length: number;
  /**
   * The states at the nodes, NODES × n, from those at the start and the Legendre coefficients of each input, one input after the
   * other.
   */
  statesAtNodes(start: Float64Array, coefficients: readonly Float64Array[]): Float64Array;
}

/** Prepares pieces of `length` seconds. O((n + m NODES)³), once. */
export function piecePropagator({ A, B, C }: ModeSystem, length: number): PiecePropagator {
  const n = A.rows;
  const m = B.columns;
  const balanced = balanceSystem(A, B, C);
  const size = n + m * NODES;
  const step = length / DEGREE;
  const M = zeroMatrix(size, size);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) M.data[i * size + j] = balanced.A.data[i * n + j]! * step;
    for (let k = 0; k < m; k++) {
      const b = balanced.B.data[i * m + k]! * step;
      for (let j = 0; j < NODES; j++) M.data[i * size + n + k * NODES + j] = b * valueAtStart(j);
    }
  }
  placeShifts(M, n, m);
  const F = exponentialMinusIdentity(M);
  return { length, statesAtNodes: (start, coefficients) => nodesFrom(F, balanced.scale, start, coefficients) };
}

/** One step is 2 / DEGREE of the polynomials' own time of −1 to 1. */
function placeShifts(M: DenseMatrix, n: number, m: number): void {
  const shift = derivativeOfCoefficients();
  for (let k = 0; k < m; k++) {
    const first = n + k * NODES;
    for (let i = 0; i < NODES; i++) {
      for (let j = 0; j < NODES; j++)
        M.data[(first + i) * M.columns + first + j] = (shift[i * NODES + j]! * 2) / DEGREE;
    }
  }
}

function nodesFrom(
  F: DenseMatrix,
  scale: Float64Array,
  start: Float64Array,
  coefficients: readonly Float64Array[],
): Float64Array {
  const n = start.length;
  const z = new Float64Array(F.rows);
  for (let i = 0; i < n; i++) z[i] = start[i]! / scale[i]!;
  coefficients.forEach((values, k) => {
    z.set(values, n + k * NODES);
  });
  const states = new Float64Array(NODES * n);
  states.set(start);
  const change = new Float64Array(F.rows);
  for (let node = 1; node < NODES; node++) {
    multiplyVector(F, z, change);
    for (let i = 0; i < z.length; i++) z[i]! += change[i]!;
    for (let i = 0; i < n; i++) states[node * n + i] = z[i]! * scale[i]!;
  }
  return states;
}
