/**
 * The realization of a rational function of s that format.md prescribes: controller companion form, and the derivatives of
 * the input where the numerator outranks the denominator.
 */

import type { Field } from '../../algebra/index.ts';
import type { ContributedState, Contribution } from './contribution.ts';

/**
 * y = N(s) / D(s) u with ẋ_i = x_{i+1}, the last row minus the coefficients of D, the input column 0 … 0 1, both divided by
 * the leading coefficient of D. Common factors stay.
 *
 * @param numerator    Descending powers of s, the first not zero; empty for zero.
 * @param denominator  The same, not empty; its degree is the number of states.
 */
export function companionForm<T>(field: Field<T>, numerator: readonly T[], denominator: readonly T[]): Contribution<T> {
  const monic = denominator.map(coefficient => field.divide(coefficient, denominator[0]!));
  const scaled = numerator.map(coefficient => field.divide(coefficient, denominator[0]!));
  const { quotient, remainder } = divide(field, scaled, monic);
  const n = monic.length - 1;
  const derivatives = quotient.slice(1);
  return {
    states: numberedStates(n),
    A: companionMatrix(field, monic),
    B: Array.from({ length: n }, (_, i) => [i === n - 1 ? field.one : field.zero]),
    C: [Array.from({ length: n }, (_, i) => remainder[i] ?? field.zero)],
    D: [[quotient[0] ?? field.zero]],
    derivatives,
    derivativeSuffixes: derivatives.map((_, k) => `_${n + k + 1}`),
    lowered: [],
  };
}

/** States `_1` … `_n`, at rest unless initial values are given. */
export function numberedStates(n: number, initial: readonly number[] = []): ContributedState[] {
  return Array.from({ length: n }, (_, i) => ({ suffix: `_${i + 1}`, initial: initial[i] ?? 0 }));
}

function companionMatrix<T>({ zero, one, negate }: Field<T>, monic: readonly T[]): T[][] {
  const n = monic.length - 1;
  return Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => {
      if (i === n - 1) return negate(monic[n - j]!);
      return j === i + 1 ? one : zero;
    }),
  );
}

/** Division by a monic polynomial; both results in ascending powers of s. */
function divide<T>(field: Field<T>, numerator: readonly T[], monic: readonly T[]) {
  const n = monic.length - 1;
  const remainder = [...numerator].reverse();
  const quotient: T[] = [];
  for (let power = numerator.length - 1 - n; power >= 0; power--) {
    const coefficient = remainder[power + n]!;
    quotient[power] = coefficient;
    for (let k = 0; k <= n; k++) {
      remainder[power + k] = field.subtract(remainder[power + k]!, field.multiply(coefficient, monic[n - k]!));
    }
  }
  return { quotient, remainder: remainder.slice(0, n) };
}
