/**
 * Expressions made ready for the field of rational functions: whatever is no rational function of the parameters becomes
 * one name, its own text, so that a formula keeps it as it was written.
 */

import { type Expression, evaluateExpression, fold, namesIn, print } from '../../expression/index.ts';

/**
 * The expression with each call of a function and each power to other than a whole number in the place of one name: `sqrt(k)`,
 * `(a^n)`. Those with an exact value, `sqrt(4)`, stay.
 */
export function withOpaqueAtoms(expression: Expression): Expression {
  return fold<Expression>(expression, (node, [first, second]) => {
    switch (node.kind) {
      case 'number':
      case 'name':
        return node;
      case 'unary':
        return { ...node, operand: first ?? node.operand };
      case 'call':
        return exactValue(node) === null ? atom(print(node)) : node;
      case 'binary': {
        if (node.operator !== '^') return { ...node, left: first ?? node.left, right: second ?? node.right };
        if (exactValue(node.right)?.d === 1n) return { ...node, left: first ?? node.left };
        return exactValue(node) === null ? atom(`(${print(node)})`) : node;
      }
      default:
        return node satisfies never;
    }
  });
}

function atom(name: string): Expression {
  return { kind: 'name', name };
}

/** The exact value of a part without parameters; null where it has none. */
function exactValue(node: Expression) {
  if (namesIn(node).length > 0) return null;
  const value = evaluateExpression(node, new Map());
  return value.ok ? value.value.exact : null;
}
