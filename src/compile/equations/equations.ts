/**
 * The drawing as linear equations, one row each. Knowns are what a derivation leaves on the right-hand side: the states,
 * the derivatives of differentiated signals, and the external inputs.
 */

import type { Arithmetic } from '../quantities/index.ts';
import type { SignalName } from '../state-space.ts';
import type { RowStore } from './row-store.ts';

/** An integrator's output, or a state of another block's realization. */
export interface ModelState extends SignalName {
  readonly initial: number;
}

/** A signal v of which the drawing uses the derivative w = v̇. */
export interface DifferentiatedSignal extends SignalName {
  /** How many states stand before it in document order. */
  readonly statesBefore: number;
}

/**
 * Columns: the states, then the derivatives w, then the inputs (together the `known` first columns), then the signals.
 * Rows: each signal; each state's derivative; each differentiated signal; each output. Row s of a signal says
 * y_s = Σ of its entries.
 */
export interface Equations<T> {
  readonly arithmetic: Arithmetic<T>;
  readonly states: readonly ModelState[];
  readonly differentiated: readonly DifferentiatedSignal[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  readonly signals: number;
  readonly known: number;
  readonly rows: RowStore<T>;
}
