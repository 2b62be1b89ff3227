/**
 * How near a solvable loop is to having no solution. Measured in what an engineer can change, the gains, so that the units
 * of the signals play no part.
 */

import { RowStore } from '../equations/index.ts';
import { doubleArithmetic, type Numbers } from '../quantities/index.ts';
import { factorLoop, type LoopFactors } from './factor-loop.ts';
import type { LoopSystem } from './loop-system.ts';
import { solveFactored } from './solve-factored.ts';

/**
 * The relative change of the loop's coefficients M, each at its worst, that to first order brings det(I − M) to zero:
 * 1 / Σ |M_ij| |((I − M)⁻¹)_ji|, by Jacobi's formula d det = det · tr((I − M)⁻¹ d(I − M)). About |1 − g| / n for a ring of
 * n blocks with gain g once around; 0 where elimination in doubles meets no pivot. Scaling a signal leaves it as it is.
 * O(n²) operations for each entry of a row up to `LARGEST_INVERSE` signals, an estimate at the cost of eliminating beyond.
 */
export function relativeDistanceToSingular(system: LoopSystem<number>): number {
  const factors = factorLoop(doubleArithmetic, system.matrix);
  if (factors === null) return 0;
  const sensitivity =
    factors.size <= LARGEST_INVERSE ? sensitivityByInverse(system, factors) : estimatedSensitivity(system, factors);
  return Number.isFinite(sensitivity) ? 1 / sensitivity : 0;
}

/** Largest loop whose inverse is written out: half a megabyte. */
const LARGEST_INVERSE = 256;

/** Σ |M_ij| |((I − M)⁻¹)_ji|. */
function sensitivityByInverse({ gains }: LoopSystem<number>, factors: LoopFactors<number>): number {
  const n = factors.size;
  const inverse = solveFactored(doubleArithmetic, factors, identity(n), n);
  let sensitivity = 0;
  for (let i = 0; i < n; i++) {
    for (let k = gains.start[i]!; k < gains.start[i + 1]!; k++) {
      sensitivity += Math.abs(gains.values[k]! * inverse[gains.column[k]! * n + i]!);
    }
  }
  return sensitivity;
}

/** Half the digits of a double: large against its rounding, small against 1. */
const RELATIVE_STEP = 2 ** -26;

/**
 * The same to its order of magnitude: how much log |det| changes when each gain changes by its own fraction of
 * `RELATIVE_STEP`, the fractions spread over ±1 by multiples of the golden section (Weyl 1916).
 */
function estimatedSensitivity({ gains, matrix }: LoopSystem<number>, factors: LoopFactors<number>): number {
  const changed = new RowStore(doubleArithmetic, matrix.rows, matrix.length + gains.length);
  const golden = (Math.sqrt(5) - 1) / 2;
  for (let i = 0; i < matrix.rows; i++) {
    const row = new Map<number, number>();
    for (let k = matrix.start[i]!; k < matrix.start[i + 1]!; k++) row.set(matrix.column[k]!, matrix.values[k]!);
    for (let k = gains.start[i]!; k < gains.start[i + 1]!; k++) {
      const change = RELATIVE_STEP * (2 * (((k + 1) * golden) % 1) - 1);
      row.set(gains.column[k]!, (row.get(gains.column[k]!) ?? 0) - change * gains.values[k]!);
    }
    for (const [column, value] of row) changed.push(column, value);
    changed.endRow();
  }
  const other = factorLoop(doubleArithmetic, changed);
  if (other === null) return Number.POSITIVE_INFINITY;
  return Math.abs(logDeterminant(other) - logDeterminant(factors)) / RELATIVE_STEP;
}

/** log |det|. */
function logDeterminant({ pivots }: LoopFactors<number>): number {
  return pivots.reduce((sum, { value }) => sum + Math.log(Math.abs(value)), 0);
}

function identity(n: number): Numbers<number> {
  const matrix = doubleArithmetic.allocate(n * n);
  for (let i = 0; i < n; i++) matrix[i * n + i] = 1;
  return matrix;
}

/** The system with every element rounded to the nearest double. */
export function inDoubles<T>(system: LoopSystem<T>, toDouble: (value: T) => number): LoopSystem<number> {
  return { gains: roundRows(system.gains, toDouble), matrix: roundRows(system.matrix, toDouble) };
}

function roundRows<T>(rows: RowStore<T>, toDouble: (value: T) => number): RowStore<number> {
  const rounded = new RowStore(doubleArithmetic, rows.rows, rows.length);
  for (let i = 0; i < rows.rows; i++) {
    for (let k = rows.start[i]!; k < rows.start[i + 1]!; k++) rounded.push(rows.column[k]!, toDouble(rows.values[k]!));
    rounded.endRow();
  }
  return rounded;
}
