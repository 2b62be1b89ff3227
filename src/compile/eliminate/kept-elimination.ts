/**
 * What of one elimination may serve the next: the rows of the signals, the loops' factorisations, the rows that came out, and
 * what each cost. Equations with other places, as a new wire or a gain that becomes zero makes them, start afresh.
 */

import { changedRows, type Equations, hasSamePlaces, RowStore } from '../equations/index.ts';
import type { LoopSolver } from '../loops/index.ts';
import type { Arithmetic } from '../quantities/index.ts';

/** What is written down while eliminating. */
export interface EliminationRecord<T> {
  /** Signals over the knowns; rows that are out of date stay in it until there are too many. */
  readonly resolved: RowStore<T>;
  /** For each signal its row in `resolved`. */
  readonly rowOf: Int32Array;
  /** The loops by component. */
  readonly examinations: Map<number, Counted<Examination<T>>>;
  /** For each component what giving its signals their rows cost. */
  readonly costs: Float64Array;
  /** The same for each equation behind the signals. */
  readonly rowCosts: Float64Array;
}

/** A loop's solver, null where it is singular, and how near it is to that. */
export interface Examination<T> {
  readonly solver: LoopSolver<T> | null;
  readonly distance: number | null;
}

export interface KeptElimination<T> extends EliminationRecord<T> {
  readonly equations: Equations<T>;
  readonly reduced: RowStore<T>;
}

/** A record of nothing yet. */
export function newRecord<T>(
  arithmetic: Arithmetic<T>,
  signals: number,
  components: number,
  equations: number,
): EliminationRecord<T> {
  return {
    resolved: new RowStore(arithmetic, signals, 4 * signals + 16),
    rowOf: new Int32Array(signals).fill(-1),
    examinations: new Map(),
    costs: new Float64Array(components),
    rowCosts: new Float64Array(equations),
  };
}

/** How many rows may be written for each signal before it is better to start afresh. */
const MOST_ROWS_A_SIGNAL = 8;

/** Whether an elimination of `equations` may start from a kept one. */
export function mayStartFrom<T>(kept: KeptElimination<T>, equations: Equations<T>): boolean {
  const { arithmetic, signals, known, rows } = equations;
  const isOfSameSize = kept.equations.signals === signals && kept.equations.known === known;
  const isSameArithmetic = kept.equations.arithmetic === arithmetic;
  const isTidy = kept.resolved.rows <= MOST_ROWS_A_SIGNAL * (signals + 1);
  return isSameArithmetic && isOfSameSize && isTidy && hasSamePlaces(kept.equations.rows, rows);
}

/** What is no longer as it was. */
export interface Changes<T> {
  /** For each equation 1 where it has changed. */
  readonly equation: Uint8Array;
  /** For each signal 1 where its row over the knowns has changed; filled while eliminating. */
  readonly signal: Uint8Array;
  /** The rows that came out before. */
  readonly reduced: RowStore<T>;
}

/** The equations that differ; what they reach is found while eliminating. */
export function changesSince<T>(kept: KeptElimination<T>, { arithmetic, rows, signals }: Equations<T>): Changes<T> {
  return {
    equation: changedRows(arithmetic, kept.equations.rows, rows),
    signal: new Uint8Array(signals),
    reduced: kept.reduced,
  };
}

/** Whether one of these equations differs itself. */
export function hasChangedEquation<T>({ equation }: Changes<T>, equations: ArrayLike<number>): boolean {
  for (let i = 0; i < equations.length; i++) if (equation[equations[i]!] === 1) return true;
  return false;
}

/** Whether a change reaches one of these equations, by itself or through a signal in it. */
export function isReached<T>(
  changes: Changes<T>,
  { rows, known }: Equations<T>,
  equations: ArrayLike<number>,
): boolean {
  if (hasChangedEquation(changes, equations)) return true;
  for (let i = 0; i < equations.length; i++) {
    const equation = equations[i]!;
    for (let k = rows.start[equation]!; k < rows.start[equation + 1]!; k++) {
      const signal = rows.column[k]! - known;
      if (signal >= 0 && changes.signal[signal] === 1) return true;
    }
  }
  return false;
}

/** A value with what it cost; 0 where operations are not counted. */
interface Counted<V> {
  readonly value: V;
  readonly cost: number;
}

/** Operations counted until now; 0 where they are not counted. */
export function spentSoFar<T>({ meter }: Arithmetic<T>): number {
  return meter === undefined ? 0 : meter.spent;
}

/** Counts what something kept would cost again, so that the same drawing takes the same route either way. */
export function charged<T>({ meter }: Arithmetic<T>, cost: number): void {
  meter?.spend(cost);
}
