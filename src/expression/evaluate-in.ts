/**
 * Evaluation over a field that is passed in: the symbolic view asks for rational functions of the parameters. Where an
 * expression leaves the field (a function of a parameter, an exponent that is one) there is no answer, and the caller
 * keeps the quantity as a symbol of its own.
 */

import type { Field } from '../algebra/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import { coefficientLists } from './coefficient-lists.ts';
import { evaluateExpression } from './evaluate.ts';
import type { BinaryNode, BinaryOperator, Expression } from './expression.ts';
import { foldUntil, inOrder } from './fold.ts';
import { hasLaplaceVariable } from './names.ts';
import { HIGHEST_DEGREE, readPolynomial } from './polynomial-reading.ts';

/** What stands for a name in the field, `pi` and `e` included; null where nothing does. */
export type Lookup<T> = (name: string) => T | null;

/** Carries no message: whoever sees it turns it into null. */
const OUTSIDE_THE_FIELD = fail(problem('bad-expression', 'No rational function of the parameters.'));

/**
 * The element that an expression is; null where a name has none, a function of a name, an exponent that is no whole number
 * within ±200 or a division by zero stops it. Parts without names are taken exactly, so `sqrt(4)` and `2^-300` are numbers.
 */
export function evaluateIn<T>(expression: Expression, field: Field<T>, lookup: Lookup<T>): T | null {
  if (hasLaplaceVariable(expression)) return null;
  const result = foldUntil<T>(expression, (node, parts) => nodeIn(node, parts, field, lookup));
  return result.ok ? result.value : null;
}

/** The coefficients of a polynomial in s as written, in descending powers, zeros in front kept; null as in `evaluateIn`. */
export function evaluatePolynomialIn<T>(
  expression: Expression,
  field: Field<T>,
  lookup: Lookup<T>,
): readonly T[] | null {
  const arithmetic = coefficientLists<T>({
    zero: field.zero,
    one: field.one,
    node: (node, parts) => nodeIn(node, parts, field, lookup),
    combine: (operator, node, a, b) => combineIn(operator, node, a, b, field),
    negate: a => field.negate(a),
    isZero: a => field.isZero(a),
    exponent: node => wholeExponent(node),
  });
  const result = readPolynomial(expression, arithmetic);
  return result.ok ? result.value : null;
}

function nodeIn<T>(node: Expression, parts: readonly T[], field: Field<T>, lookup: Lookup<T>): Result<T> {
  const [first, second] = parts;
  switch (node.kind) {
    case 'number':
      return ok(field.fromRational(node.value));
    case 'name': {
      const element = lookup(node.name);
      return element === null ? OUTSIDE_THE_FIELD : ok(element);
    }
    case 'unary':
      return first === undefined ? OUTSIDE_THE_FIELD : ok(field.negate(first));
    case 'binary':
      return first === undefined || second === undefined
        ? OUTSIDE_THE_FIELD
        : combineIn(node.operator, node, first, second, field);
    case 'call':
      return constantIn(node, field);
    default:
      return node satisfies never;
  }
}

function combineIn<T>(operator: BinaryOperator, node: BinaryNode, a: T, b: T, field: Field<T>): Result<T> {
  switch (operator) {
    case '+':
      return ok(field.add(a, b));
    case '-':
      return ok(field.subtract(a, b));
    case '*':
      return ok(field.multiply(a, b));
    case '/':
      return field.isZero(b) ? OUTSIDE_THE_FIELD : ok(field.divide(a, b));
    case '^':
      return isConstant(node) ? constantIn(node, field) : powerIn(a, wholeExponent(node), field);
    default:
      return operator satisfies never;
  }
}

/** A part without names by its exact value. */
function constantIn<T>(node: Expression, field: Field<T>): Result<T> {
  if (!isConstant(node)) return OUTSIDE_THE_FIELD;
  const value = evaluateExpression(node, new Map());
  return value.ok && value.value.exact !== null ? ok(field.fromRational(value.value.exact)) : OUTSIDE_THE_FIELD;
}

/** Whether no name appears; `pi` and `e` are names here, as the field has its own element for them. */
function isConstant(node: Expression): boolean {
  return inOrder(node).every(({ kind }) => kind !== 'name');
}

/** The exponent of a power where it is a whole number within ±200 without names. */
function wholeExponent(node: BinaryNode): number | null {
  const value = isConstant(node.right) ? evaluateExpression(node.right, new Map()) : null;
  if (value === null || !value.ok || value.value.exact === null || value.value.exact.d !== 1n) return null;
  return Math.abs(value.value.double) <= HIGHEST_DEGREE ? value.value.double : null;
}

function powerIn<T>(base: T, exponent: number | null, field: Field<T>): Result<T> {
  if (exponent === null || (exponent < 0 && field.isZero(base))) return OUTSIDE_THE_FIELD;
  let power = field.one;
  let square = base;
  for (let left = Math.abs(exponent); left > 0; left = Math.floor(left / 2)) {
    if (left % 2 === 1) power = field.multiply(power, square);
    if (left > 1) square = field.multiply(square, square);
  }
  return ok(exponent < 0 ? field.divide(field.one, power) : power);
}
