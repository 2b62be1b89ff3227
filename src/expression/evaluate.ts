/** Tree to value: exact fractions wherever the language keeps them, doubles from the first irrational on. */

import { fail, ok, type Problem, problem, type Result } from '../problem/index.ts';
import { callFunction, combineQuantities, fromValue, negate, type Quantity, toValue } from './arithmetic.ts';
import type { Expression, Value } from './expression.ts';
import { foldUntil } from './fold.ts';
import { CONSTANTS } from './functions.ts';
import { hasLaplaceVariable, namesIn } from './names.ts';
import { parseExpression } from './parse.ts';
import { print } from './print.ts';
import { nearestName } from './spelling.ts';
import { quote, word } from './wording.ts';

/** The values of the parameters by name. */
export type Scope = ReadonlyMap<string, Value>;

/**
 * The value of an expression for the parameters of `scope`; `double` may come out infinite or NaN, as a parameter that no
 * block uses may. Refused: names that are no parameters, the Laplace variable, a division by zero, and fractions beyond
 * 8192 binary digits.
 */
export function evaluateExpression(expression: Expression, scope: Scope): Result<Value> {
  const quantity = evaluate(expression, scope);
  return quantity.ok ? ok(toValue(quantity.value)) : quantity;
}

/** The value of the text of a block's field: as `evaluateExpression`, and refused where it fits no finite double. */
export function evaluateQuantity(text: string, scope: Scope): Result<Value> {
  const parsed = parseExpression(text);
  if (!parsed.ok) return parsed;
  const result = evaluateExpression(parsed.value, scope);
  if (!result.ok) return result;
  const fault = finiteFault(text, result.value);
  return fault === null ? result : fail(fault);
}

/** The problem of a value that a block cannot use, null where it is finite. */
export function finiteFault(text: string, { double }: Value): Problem | null {
  if (Number.isFinite(double)) return null;
  const fault = Number.isNaN(double)
    ? 'has no real value. Change a value in it.'
    : 'is too large: it fits no finite double. Choose other units.';
  return problem('bad-expression', `${quote(text)} ${fault}`);
}

/** As `evaluateExpression`, before rounding. */
export function evaluate(expression: Expression, scope: Scope): Result<Quantity> {
  const unknown = unknownNames(expression, scope);
  if (unknown !== null) return unknown;
  if (hasLaplaceVariable(expression)) return fail(laplaceVariable(expression));
  return foldUntil<Quantity>(expression, (node, parts) => evaluateNode(node, parts, scope));
}

function laplaceVariable(expression: Expression): Problem {
  const advice = 'Use a transfer function block for what depends on s.';
  return problem('bad-expression', `${quote(print(expression))} contains the Laplace variable s. ${advice}`);
}

/** One problem for each name that is no parameter; null where all are. */
export function unknownNames(expression: Expression, scope: { has(name: string): boolean; keys(): Iterable<string> }) {
  const problems = namesIn(expression)
    .filter(name => !scope.has(name))
    .map(name => unknownParameter(expression, name, scope.keys()));
  const [first, ...others] = problems;
  return first === undefined ? null : fail(first, ...others);
}

function unknownParameter(expression: Expression, name: string, known: Iterable<string>): Problem {
  const nearest = nearestName(name, known);
  const shown = word(name);
  const advice = nearest === null ? `Add ${shown} to the parameters.` : `Did you mean ${word(nearest)}?`;
  const text = print(expression);
  const message =
    text === name ? `${shown} is not a parameter.` : `${quote(text)} uses ${shown}, which is not a parameter.`;
  return problem('unknown-parameter', `${message} ${advice}`);
}

/** A node's value from those of its parts. */
export function evaluateNode(node: Expression, parts: readonly Quantity[], scope: Scope): Result<Quantity> {
  const [first, second] = parts;
  switch (node.kind) {
    case 'number':
      return ok(node.value);
    case 'name':
      return ok(lookUp(node.name, scope));
    case 'unary':
      return ok(negate(first ?? Number.NaN));
    case 'binary':
      return combineQuantities(node.operator, node, first ?? Number.NaN, second ?? Number.NaN);
    case 'call':
      return ok(callFunction(node, parts));
    default:
      return node satisfies never;
  }
}

function lookUp(name: string, scope: Scope): Quantity {
  const value = scope.get(name);
  if (value !== undefined) return fromValue(value);
  const constant = CONSTANTS.get(name);
  if (constant === undefined) throw new Error(`${name} was not checked before evaluation`);
  return constant;
}
