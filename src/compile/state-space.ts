/**
 * The one currency after compile: ẋ = A x + B u, y = C x + D u with names, exact where the drawing is, and how it was
 * obtained. Plain data; it crosses the worker as it stands.
 */

import type { Rational, SparseMatrix } from '../algebra/index.ts';
import type { Warning } from '../problem/index.ts';

/** A n × n, B n × m, C p × n, D p × m over one field. */
export interface SystemMatrices<T> {
  readonly A: SparseMatrix<T>;
  readonly B: SparseMatrix<T>;
  readonly C: SparseMatrix<T>;
  readonly D: SparseMatrix<T>;
}

/** A state, input or output. */
export interface SignalName {
  /** As shown and exported: `omega`, `drive.winding.current`, `plant_2`. */
  readonly name: string;
  /** The block it belongs to, `outer.inner.id` inside groups. */
  readonly block: string;
  readonly unit?: string;
}

export interface StateSpace {
  readonly title: string;
  readonly states: readonly SignalName[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  /** The nearest doubles of `rational` where that is there. */
  readonly numeric: SystemMatrices<number>;
  /**
   * The same over the rationals; null where the drawing was derived in doubles. Where `irrational` is not empty, each such
   * quantity stands in as the exact value of its double, and these entries are exact only for those stand-ins.
   */
  readonly rational: SystemMatrices<Rational> | null;
  /** What is irrational (parameter names and block ids with their expression), in document order; empty where all is exact. */
  readonly irrational: readonly string[];
  /** n long; zero unless the integrators say otherwise. */
  readonly initialState: readonly number[];
  /** States shifted by an input (z = x − b·u), see format.md; names. */
  readonly shiftedStates: readonly string[];
}

/** One strongly connected component of the algebraic part: its blocks in document order, as `outer.inner.id`. */
export interface AlgebraicLoop {
  readonly blocks: readonly string[];
}

/** The result against the drawing's raw equations by a route that shares no code with the elimination. */
export interface SelfCheck {
  /** Largest relative difference seen, 1 where the drawing has no answer to compare with; NaN never. */
  readonly error: number;
  /** What `error` may at most be for the check to have passed, scaled with the size and conditioning. */
  readonly limit: number;
  readonly passed: boolean;
  /**
   * Complex frequencies at which the two were compared; 0 where there was nothing to compare: no input or no output, and no
   * state or states that differentiation may have shifted.
   */
  readonly frequencies: number;
  /** Random vectors of states and inputs that were compared in place of frequencies, where the drawing is large for those. */
  readonly vectors: number;
}

/** The model before its check. */
export interface UncheckedDerivation {
  readonly model: StateSpace;
  readonly loops: readonly AlgebraicLoop[];
  readonly warnings: readonly Warning[];
  /** The field the elimination ran over. */
  readonly route: 'rational' | 'double';
}

/** What compile hands on. */
export interface Derivation extends UncheckedDerivation {
  readonly selfCheck: SelfCheck;
}
