/**
 * The one way to walk an expression. A sum of 5,000 terms is a tree 5,000 deep, so nothing here recurses.
 */

import { ok, type Result } from '../problem/index.ts';
import type { Expression } from './expression.ts';

/** The parts of a node, left to right; none for a number or a name. */
export function partsOf(node: Expression): readonly Expression[] {
  switch (node.kind) {
    case 'number':
    case 'name':
      return [];
    case 'unary':
      return [node.operand];
    case 'binary':
      return [node.left, node.right];
    case 'call':
      return node.arguments;
    default:
      return node satisfies never;
  }
}

/** All nodes, each after its parts, left to right. */
export function inOrder(root: Expression): Expression[] {
  const open = [root];
  const reversed: Expression[] = [];
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    reversed.push(node);
    open.push(...partsOf(node));
  }
  return reversed.reverse();
}

/** The value of the root, where `combine` makes a node's value from those of its parts. Linear in the nodes. */
export function fold<T>(root: Expression, combine: (node: Expression, parts: readonly T[]) => T): T {
  const result = foldUntil<T>(root, (node, parts) => ok(combine(node, parts)));
  if (!result.ok) throw new Error('a fold that cannot fail failed');
  return result.value;
}

/** As `fold`; the first node that fails ends it. */
export function foldUntil<T>(
  root: Expression,
  combine: (node: Expression, parts: readonly T[]) => Result<T>,
): Result<T> {
  const values: T[] = [];
  for (const node of inOrder(root)) {
    const count = partsOf(node).length;
    const parts = count === 0 ? [] : values.splice(values.length - count, count);
    const result = combine(node, parts);
    if (!result.ok) return result;
    values.push(result.value);
  }
  const [value] = values;
  if (value === undefined) throw new Error('an expression without a node');
  return ok(value);
}
