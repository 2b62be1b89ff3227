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
  /** a + b, and zero where so little is left of both that it can only be rounding. */
  sum(a: T, b: T): T;
  /** A buffer of zeros. */
  allocate(length: number): Numbers<T>;
  /** The nearest double. */
  toDouble(value: T): number;
  /**
   * What a pivot is weighed by: the absolute value where rounding makes a small pivot dangerous, 1 where every nonzero
   * element is as good as another.
   */
  magnitude(value: T): number;
  /** Where operations are counted: whoever keeps an earlier result counts what it would cost again. */
  readonly meter?: Meter;
  /**
   * A way of its own to solve an n × n system for several right-hand sides, all row-major, where elimination in field
   * operations is not the best; null where the system is singular.
   */
  solveDense?(matrix: Numbers<T>, rightSides: Numbers<T>, n: number, width: number): Numbers<T> | null;
}

/** What operations have cost. */
export interface Meter {
  readonly spent: number;
  spend(operations: number): void;
}

/** An arithmetic whose elements are made from the values of expressions. */
export interface NumericArithmetic<T> extends Arithmetic<T> {
  /** Exact where the value is; an irrational one is taken as what its double says. */
  fromValue(value: Value): T;
}

/** Exact rationals. */
export const rationalArithmetic: NumericArithmetic<Rational> = {
  field: rationalField,
  sum: rationalField.add,
  allocate: length => new Array<Rational>(length).fill(ZERO),
  toDouble,
  magnitude: () => 1,
  fromValue: ({ exact, double }) => exact ?? rationalFromDouble(double),
};

/**
 * A sum of doubles this small against its terms is their rounding: 0.1 · 3 − 0.3 is to be zero. A few units in the last
 * place, as terms are products of rounded numbers.
 */
const CANCELLED = 16 * Number.EPSILON;

/** Doubles. */
export const doubleArithmetic: NumericArithmetic<number> = {
  field: doubleField,
  sum: (a, b) => {
    const sum = a + b;
    return Math.abs(sum) <= CANCELLED * Math.abs(a) ? 0 : sum;
  },
  allocate: length => new Float64Array(length),
  toDouble: value => value,
  magnitude: Math.abs,
  fromValue: ({ double }) => double,
};
