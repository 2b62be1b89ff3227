/**
 * A field together with what derivation needs besides the field laws: buffers that hold its elements, and the way from a
 * typed value in and to a double out.
 */

import {
  doubleField,
  type Field,
  type Rational,
  rationalField,
  rationalFromDouble,
  toDouble,
  ZERO,
} from '../../algebra/index.ts';
import type { Value } from '../../expression/index.ts';

/** A buffer of elements: a typed array for doubles, an array otherwise. */
export interface Numbers<T> {
  [index: number]: T;
  readonly length: number;
}

export interface Arithmetic<T> {
  readonly field: Field<T>;
  /** A buffer of zeros. */
  allocate(length: number): Numbers<T>;
  /** The nearest double. */
  toDouble(value: T): number;
  /**
   * What a pivot is weighed by: the absolute value where rounding makes a small pivot dangerous, 1 where every nonzero
   * element is as good as another.
   */
  magnitude(value: T): number;
  /**
   * A way of its own to solve an n × n system for several right-hand sides, all row-major, where elimination in field
   * operations is not the best; null where the system is singular.
   */
  solveDense?(matrix: Numbers<T>, rightSides: Numbers<T>, n: number, width: number): Numbers<T> | null;
}

/** An arithmetic whose elements are made from the values of expressions. */
export interface NumericArithmetic<T> extends Arithmetic<T> {
  /** Exact where the value is; an irrational one is taken as what its double says. */
  fromValue(value: Value): T;
}

/** Exact rationals. */
export const rationalArithmetic: NumericArithmetic<Rational> = {
  field: rationalField,
  allocate: length => new Array<Rational>(length).fill(ZERO),
  toDouble,
  magnitude: () => 1,
  fromValue: ({ exact, double }) => exact ?? rationalFromDouble(double),
};

/** Doubles. */
export const doubleArithmetic: NumericArithmetic<number> = {
  field: doubleField,
  allocate: length => new Float64Array(length),
  toDouble: value => value,
  magnitude: Math.abs,
  fromValue: ({ double }) => double,
};
