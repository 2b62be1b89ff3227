/**
 * Polynomials in the Laplace variable over any kind of coefficient: what both the numbers and the symbols need to read
 * `"(s + 2)*(s + 5)"`. The degree is the one written: a coefficient that comes out as zero keeps its place.
 */

import { fail, ok, type Problem, problem, type Result } from '../problem/index.ts';
import type { BinaryNode, BinaryOperator, Expression } from './expression.ts';
import { foldUntil } from './fold.ts';
import { LAPLACE_VARIABLE } from './functions.ts';
import { print } from './print.ts';
import { quote } from './wording.ts';

/** Highest degree of a polynomial (format.md). */
export const HIGHEST_DEGREE = 200;

/** The coefficients' arithmetic. */
export interface CoefficientArithmetic<T> {
  readonly zero: T;
  readonly one: T;
  /** The value of a node without `s` from those of its parts. */
  node(node: Expression, parts: readonly T[]): Result<T>;
  /** a ∘ b for two coefficients; `node` is where it is needed. */
  combine(operator: BinaryOperator, node: BinaryNode, a: T, b: T): Result<T>;
  negate(a: T): T;
  /** The whole number that the exponent of `node` is, null where it is none. */
  exponent(node: BinaryNode, value: T): number | null;
}

/** Coefficients in descending powers, never empty; a part without `s` has one and `hasS` false. */
interface Part<T> {
  readonly hasS: boolean;
  readonly coefficients: readonly T[];
}

/** The coefficients as written, in descending powers, zeros in front kept; at least one. */
export function readPolynomial<T>(root: Expression, arithmetic: CoefficientArithmetic<T>): Result<readonly T[]> {
  const result = foldUntil<Part<T>>(root, (node, parts) => readNode(node, parts, arithmetic));
  return result.ok ? ok(result.value.coefficients) : result;
}

function readNode<T>(node: Expression, parts: readonly Part<T>[], on: CoefficientArithmetic<T>): Result<Part<T>> {
  if (node.kind === 'name' && node.name === LAPLACE_VARIABLE) {
    return ok({ hasS: true, coefficients: [on.one, on.zero] });
  }
  if (parts.every(part => !part.hasS)) {
    const values = parts.map(part => part.coefficients[0] ?? on.zero);
    const value = on.node(node, values);
    return value.ok ? ok({ hasS: false, coefficients: [value.value] }) : value;
  }
  const [left, right] = parts;
  if (node.kind === 'unary' && left !== undefined) {
    return ok({ hasS: true, coefficients: left.coefficients.map(on.negate) });
  }
  if (node.kind === 'binary' && left !== undefined && right !== undefined) {
    const coefficients = combineParts(node, left, right, on);
    return coefficients.ok ? ok({ hasS: true, coefficients: coefficients.value }) : coefficients;
  }
  return fail(notPolynomial(node, 's stands inside a function there.'));
}

function combineParts<T>(
  node: BinaryNode,
  left: Part<T>,
  right: Part<T>,
  on: CoefficientArithmetic<T>,
): Result<readonly T[]> {
  switch (node.operator) {
    case '+':
    case '-':
      return addPolynomials(node, left.coefficients, right.coefficients, on);
    case '*':
      return multiplyPolynomials(node, left.coefficients, right.coefficients, on);
    case '/':
      if (right.hasS) return fail(notPolynomial(node, 's stands in a denominator there.'));
      return eachCoefficient(left.coefficients, a => on.combine('/', node, a, right.coefficients[0] ?? on.one));
    case '^':
      return raisePolynomial(node, left, right, on);
    default:
      return node.operator satisfies never;
  }
}

function eachCoefficient<T>(coefficients: readonly T[], change: (a: T, i: number) => Result<T>): Result<readonly T[]> {
  const changed: T[] = [];
  for (const [i, coefficient] of coefficients.entries()) {
    const result = change(coefficient, i);
    if (!result.ok) return result;
    changed.push(result.value);
  }
  return ok(changed);
}

function addPolynomials<T>(node: BinaryNode, a: readonly T[], b: readonly T[], on: CoefficientArithmetic<T>) {
  const length = Math.max(a.length, b.length);
  const places = Array.from({ length }, () => on.zero);
  return eachCoefficient(places, (zero, i) => {
    const [x, y] = [a[i - length + a.length], b[i - length + b.length]];
    if (y === undefined) return ok(x ?? zero);
    if (x === undefined) return ok(node.operator === '-' ? on.negate(y) : y);
    return on.combine(node.operator, node, x, y);
  });
}

function multiplyPolynomials<T>(
  node: BinaryNode,
  a: readonly T[],
  b: readonly T[],
  on: CoefficientArithmetic<T>,
): Result<readonly T[]> {
  const degree = a.length + b.length - 2;
  if (degree > HIGHEST_DEGREE) return fail(degreeTooHigh(node));
  const product = Array.from({ length: degree + 1 }, () => on.zero);
  for (const [i, x] of a.entries()) {
    for (const [j, y] of b.entries()) {
      const term = on.combine('*', node, x, y);
      if (!term.ok) return term;
      const sum = on.combine('+', node, product[i + j] ?? on.zero, term.value);
      if (!sum.ok) return sum;
      product[i + j] = sum.value;
    }
  }
  return ok(product);
}

function raisePolynomial<T>(
  node: BinaryNode,
  base: Part<T>,
  exponent: Part<T>,
  on: CoefficientArithmetic<T>,
): Result<readonly T[]> {
  const power = exponent.hasS ? null : on.exponent(node, exponent.coefficients[0] ?? on.zero);
  if (power === null) return fail(notPolynomial(node, 'An exponent of s is a whole number from 0 to 200.'));
  if (power < 0) return fail(notPolynomial(node, 's has a negative power there.'));
  if ((base.coefficients.length - 1) * power > HIGHEST_DEGREE) return fail(degreeTooHigh(node));
  let result: readonly T[] = [on.one];
  for (let i = 0; i < power; i++) {
    const product = multiplyPolynomials(node, result, base.coefficients, on);
    if (!product.ok) return product;
    result = product.value;
  }
  return ok(result);
}

function notPolynomial(node: Expression, why: string): Problem {
  const message = `${quote(print(node))} is not a polynomial in s. ${why}`;
  return problem('bad-expression', message);
}

function degreeTooHigh(node: Expression): Problem {
  const message = `${quote(print(node))} has a degree above ${HIGHEST_DEGREE} in s. Split it over several blocks.`;
  return problem('bad-expression', message);
}
