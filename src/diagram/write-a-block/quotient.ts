/**
 * A transfer function as it is written on paper, `K/(T*s + 1)*(s + 2)/s`, as one numerator over one denominator, both
 * without a division by s. Nothing is multiplied out or cancelled: what was written stays readable.
 */

import { type BinaryOperator, type Expression, hasLaplaceVariable } from '../../expression/index.ts';

export interface Quotient {
  readonly numerator: Expression;
  readonly denominator: Expression;
}

const ONE: Expression = { kind: 'number', text: '1', value: { n: 1n, d: 1n } };

/** The quotient, null where s stands in a function's argument or in an exponent. Nesting is bounded by the parser. */
export function quotientOf(expression: Expression): Quotient | null {
  if (!hasLaplaceVariable(expression)) return { numerator: expression, denominator: ONE };
  switch (expression.kind) {
    case 'number':
    case 'name':
      return { numerator: expression, denominator: ONE };
    case 'unary': {
      const operand = quotientOf(expression.operand);
      return operand && { ...operand, numerator: { ...expression, operand: operand.numerator } };
    }
    case 'binary':
      return combined(expression.operator, expression.left, expression.right);
    case 'call':
      return null;
    default:
      return expression satisfies never;
  }
}

function combined(operator: BinaryOperator, leftSide: Expression, rightSide: Expression): Quotient | null {
  if (operator === '^') return power(leftSide, rightSide);
  const left = quotientOf(leftSide);
  const right = quotientOf(rightSide);
  if (left === null || right === null) return null;
  switch (operator) {
    case '*':
      return {
        numerator: product(left.numerator, right.numerator),
        denominator: product(left.denominator, right.denominator),
      };
    case '/':
      return {
        numerator: product(left.numerator, right.denominator),
        denominator: product(left.denominator, right.numerator),
      };
    case '+':
    case '-':
      return {
        numerator: binary(
          operator,
          product(left.numerator, right.denominator),
          product(right.numerator, left.denominator),
        ),
        denominator: product(left.denominator, right.denominator),
      };
    default:
      return operator satisfies never;
  }
}

/** A whole power of either sign; null for an exponent with s in it or that is no whole number as written. */
function power(base: Expression, exponent: Expression): Quotient | null {
  const inverted = exponent.kind === 'unary';
  const size = inverted ? exponent.operand : exponent;
  const inner = quotientOf(base);
  if (inner === null || size.kind !== 'number' || size.value.d !== 1n) return null;
  const numerator = raised(inner.numerator, size);
  const denominator = raised(inner.denominator, size);
  return inverted ? { numerator: denominator, denominator: numerator } : { numerator, denominator };
}

function raised(base: Expression, exponent: Expression): Expression {
  return base === ONE ? ONE : binary('^', base, exponent);
}

function product(left: Expression, right: Expression): Expression {
  if (left === ONE) return right;
  return right === ONE ? left : binary('*', left, right);
}

function binary(operator: BinaryOperator, left: Expression, right: Expression): Expression {
  return { kind: 'binary', operator, left, right };
}
