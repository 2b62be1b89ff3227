/**
 * The two fields of numbers that an elimination may run over: exact rationals, the default truth, and doubles for drawings
 * too large for it.
 */

import type { Field } from './field.ts';
import { bitLength } from './integer.ts';
import {
  addRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  subtractRationals,
  ZERO,
} from './rational.ts';
import { toDouble } from './rational-double.ts';

/** Exact rationals; of two pivots the one with fewer bits is the better. */
export const rationalField: Field<Rational> = {
  name: 'rational',
  zero: ZERO,
  one: ONE,
  add: addRationals,
  subtract: subtractRationals,
  multiply: multiplyRationals,
  divide: divideRationals,
  negate: negateRational,
  isZero: a => a.n === 0n,
  equals: (a, b) => a.n === b.n && a.d === b.d,
  fromRational: value => value,
  isBetterPivot: (a, b) => bitLength(a.n) + bitLength(a.d) < bitLength(b.n) + bitLength(b.d),
};

/** Doubles; zero and equality are exact comparisons, of two pivots the larger is the better. */
export const doubleField: Field<number> = {
  name: 'double',
  zero: 0,
  one: 1,
  add: (a, b) => a + b,
  subtract: (a, b) => a - b,
  multiply: (a, b) => a * b,
  divide: (a, b) => a / b,
  negate: a => -a,
  isZero: a => a === 0,
  equals: (a, b) => a === b,
  fromRational: toDouble,
  isBetterPivot: (a, b) => Math.abs(a) > Math.abs(b),
};
