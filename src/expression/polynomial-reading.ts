/**
 * Reads an expression as a polynomial in the Laplace variable: what may stand where, whichever way the coefficients are kept.
 * The degree is the one written: a coefficient that comes out as zero keeps its place.
 */

import { fail, ok, type Problem, problem, type Result } from '../problem/index.ts';
import type { BinaryNode, Expression } from './expression.ts';
import { foldUntil } from './fold.ts';
import { LAPLACE_VARIABLE } from './functions.ts';
import { print } from './print.ts';
import { quote } from './wording.ts';

/** Highest degree of a polynomial (format.md). */
export const HIGHEST_DEGREE = 200;

/** Polynomials `P` with coefficients `T`. Sums and products are those of `node`, which is named where they are refused. */
export interface PolynomialArithmetic<T, P> {
  readonly one: P;
  /** s itself. */
  readonly variable: P;
  constant(value: T): P;
  /** One less than the number of coefficients. */
  degree(a: P): number;
  add(node: BinaryNode, a: P, b: P): Result<P>;
  multiply(node: BinaryNode, a: P, b: P): Result<P>;
  divide(node: BinaryNode, a: P, by: T): Result<P>;
  negate(a: P): P;
  /** The value of a node without `s` from those of its parts. */
  node(node: Expression, parts: readonly T[]): Result<T>;
  /** The whole number that the exponent of `node` is, null where it is none. */
  exponent(node: BinaryNode, value: T): number | null;
}

/** Without `s` a value, with it a polynomial. */
type Part<T, P> = { readonly hasS: false; readonly value: T } | { readonly hasS: true; readonly polynomial: P };

/** The polynomial that an expression is. */
export function readPolynomial<T, P>(root: Expression, on: PolynomialArithmetic<T, P>): Result<P> {
  const result = foldUntil<Part<T, P>>(root, (node, parts) => readNode(node, parts, on));
  return result.ok ? ok(asPolynomial(result.value, on)) : result;
}

function asPolynomial<T, P>(part: Part<T, P>, on: PolynomialArithmetic<T, P>): P {
  return part.hasS ? part.polynomial : on.constant(part.value);
}

function readNode<T, P>(
  node: Expression,
  parts: readonly Part<T, P>[],
  on: PolynomialArithmetic<T, P>,
): Result<Part<T, P>> {
  if (node.kind === 'name' && node.name === LAPLACE_VARIABLE) return ok({ hasS: true, polynomial: on.variable });
  const values = parts.flatMap(part => (part.hasS ? [] : [part.value]));
  if (values.length === parts.length) {
    const value = on.node(node, values);
    return value.ok ? ok({ hasS: false, value: value.value }) : value;
  }
  const [left, right] = parts;
  if (node.kind === 'unary' && left !== undefined) {
    return ok({ hasS: true, polynomial: on.negate(asPolynomial(left, on)) });
  }
  if (node.kind === 'binary' && left !== undefined && right !== undefined) {
    const polynomial = combine(node, left, right, on);
    return polynomial.ok ? ok({ hasS: true, polynomial: polynomial.value }) : polynomial;
  }
  return fail(notPolynomial(node, 's stands inside a function there.'));
}

function combine<T, P>(
  node: BinaryNode,
  left: Part<T, P>,
  right: Part<T, P>,
  on: PolynomialArithmetic<T, P>,
): Result<P> {
  const [a, b] = [asPolynomial(left, on), asPolynomial(right, on)];
  switch (node.operator) {
    case '+':
      return on.add(node, a, b);
    case '-':
      return on.add(node, a, on.negate(b));
    case '*':
      if (on.degree(a) + on.degree(b) > HIGHEST_DEGREE) return fail(degreeTooHigh(node));
      return on.multiply(node, a, b);
    case '/':
      return right.hasS
        ? fail(notPolynomial(node, 's stands in a denominator there.'))
        : on.divide(node, a, right.value);
    case '^':
      return raise(node, a, right, on);
    default:
      return node.operator satisfies never;
  }
}

function raise<T, P>(node: BinaryNode, base: P, exponent: Part<T, P>, on: PolynomialArithmetic<T, P>): Result<P> {
  const power = exponent.hasS ? null : on.exponent(node, exponent.value);
  if (power === null) return fail(notPolynomial(node, 'An exponent of s is a whole number from 0 to 200.'));
  if (power < 0) return fail(notPolynomial(node, 's has a negative power there.'));
  if (on.degree(base) * power > HIGHEST_DEGREE) return fail(degreeTooHigh(node));
  let result = on.one;
  for (let i = 0; i < power; i++) {
    const product = on.multiply(node, result, base);
    if (!product.ok) return product;
    result = product.value;
  }
  return ok(result);
}

function notPolynomial(node: Expression, why: string): Problem {
  return problem('bad-expression', `${quote(print(node))} is not a polynomial in s. ${why}`);
}

function degreeTooHigh(node: Expression): Problem {
  const message = `${quote(print(node))} has a degree above ${HIGHEST_DEGREE} in s. Split it over several blocks.`;
  return problem('bad-expression', message);
}
