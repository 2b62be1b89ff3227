/**
 * What the elimination asks of numbers. The same algorithm runs over exact rationals, doubles and rational functions of
 * the parameters; a field is passed in and holds no state.
 */

import type { Rational } from './rational.ts';

/** A field of elements `T`; every operation returns a new element and leaves its arguments alone. */
export interface Field<T> {
  readonly name: 'rational' | 'double' | 'symbolic';
  readonly zero: T;
  readonly one: T;
  add(a: T, b: T): T;
  subtract(a: T, b: T): T;
  multiply(a: T, b: T): T;
  /** `b` is not zero. */
  divide(a: T, b: T): T;
  negate(a: T): T;
  isZero(a: T): boolean;
  equals(a: T, b: T): boolean;
  fromRational(value: Rational): T;
  /**
   * Whether `a` is the better pivot of the two nonzero candidates: the larger for doubles, the shorter for exact elements.
   */
  isBetterPivot(a: T, b: T): boolean;
}
