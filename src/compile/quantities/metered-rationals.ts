/**
 * Exact rationals that count what they cost, so that a derivation can be given up for doubles. The count is of work, not of
 * time: the same drawing takes the same route everywhere.
 */

import { type Field, type Rational, rationalField } from '../../algebra/index.ts';
import type { Effort } from '../../algebra/symbolic/index.ts';
import { type Meter, type NumericArithmetic, rationalArithmetic } from './arithmetic.ts';

const WORD = 1n << 63n;

/** What an operation on short numbers costs in the products of words that long ones are counted by (measured: 10 to 30). */
const OPERATION = 15;

/** The effort that is being spent; another takes its place with each derivation. */
export interface Account {
  effort: Effort;
}

/** Exact rationals whose operations spend the account's effort; run what uses them in `withinEffort`. */
export function meteredRationals(account: Account): NumericArithmetic<Rational> {
  const metered =
    (operation: (a: Rational, b: Rational) => Rational) =>
    (a: Rational, b: Rational): Rational => {
      account.effort.spend(OPERATION + wordsOf(a) * wordsOf(b));
      return operation(a, b);
    };
  const field: Field<Rational> = {
    ...rationalField,
    add: metered(rationalField.add),
    subtract: metered(rationalField.subtract),
    multiply: metered(rationalField.multiply),
    divide: metered(rationalField.divide),
  };
  const meter: Meter = {
    get spent() {
      return account.effort.spent;
    },
    spend: operations => account.effort.spend(operations),
  };
  return { ...rationalArithmetic, field, sum: field.add, meter };
}

/** Length in 64-bit words, at least 1. */
function wordsOf({ n, d }: Rational): number {
  if (d < WORD && n < WORD && n > -WORD) return 1;
  return 1 + (bits(n < 0n ? -n : n) + bits(d)) / 64;
}

/** Bits, to within a few; beyond the doubles by the length of the number as text. */
function bits(x: bigint): number {
  const near = Number(x);
  if (Number.isFinite(near)) return Math.log2(near + 1);
  return 4 * x.toString(16).length;
}
