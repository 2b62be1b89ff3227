/** Polynomials as lists of coefficients over any arithmetic: for symbols, and for numbers that are partly irrational. */

import { ok, type Result } from '../problem/index.ts';
import type { BinaryNode, BinaryOperator } from './expression.ts';
import type { PolynomialArithmetic } from './polynomial-reading.ts';

/** The coefficients' arithmetic. */
export interface CoefficientArithmetic<T> extends Pick<PolynomialArithmetic<T, never>, 'node' | 'exponent'> {
  readonly zero: T;
  readonly one: T;
  /** a ∘ b for two coefficients; `node` is where it is needed. */
  combine(operator: BinaryOperator, node: BinaryNode, a: T, b: T): Result<T>;
  negate(a: T): T;
  /** Whether it is zero beyond doubt; its products are not taken, so that s does not spread what is irrational. */
  isZero(a: T): boolean;
}

/** Polynomials as coefficients in descending powers, zeros in front kept, never empty. */
export function coefficientLists<T>(on: CoefficientArithmetic<T>): PolynomialArithmetic<T, readonly T[]> {
  return {
    one: [on.one],
    variable: [on.one, on.zero],
    constant: value => [value],
    degree: a => a.length - 1,
    add: (node, a, b) => add(node, a, b, on),
    multiply: (node, a, b) => multiply(node, a, b, on),
    divide: (node, a, by) => each(a, value => on.combine('/', node, value, by)),
    negate: a => a.map(on.negate),
    node: on.node,
    exponent: on.exponent,
  };
}

function each<T>(coefficients: readonly T[], change: (a: T, i: number) => Result<T>): Result<readonly T[]> {
  const changed: T[] = [];
  for (const [i, coefficient] of coefficients.entries()) {
    const result = change(coefficient, i);
    if (!result.ok) return result;
    changed.push(result.value);
  }
  return ok(changed);
}

function add<T>(node: BinaryNode, a: readonly T[], b: readonly T[], on: CoefficientArithmetic<T>) {
  const [long, short] = a.length >= b.length ? [a, b] : [b, a];
  const shift = long.length - short.length;
  return each(long, (x, i) => {
    const y = i < shift ? undefined : short[i - shift];
    return y === undefined ? ok(x) : on.combine('+', node, x, y);
  });
}

function multiply<T>(
  node: BinaryNode,
  a: readonly T[],
  b: readonly T[],
  on: CoefficientArithmetic<T>,
): Result<readonly T[]> {
  const product = Array.from({ length: a.length + b.length - 1 }, () => on.zero);
  for (const [i, x] of a.entries()) {
    if (on.isZero(x)) continue;
    for (const [j, y] of b.entries()) {
      if (on.isZero(y)) continue;
      const term = on.combine('*', node, x, y);
      if (!term.ok) return term;
      const sum = on.combine('+', node, product[i + j] ?? on.zero, term.value);
      if (!sum.ok) return sum;
      product[i + j] = sum.value;
    }
  }
  return ok(product);
}
