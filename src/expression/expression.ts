/**
 * The tree of one expression of format.md: what the parser builds and every reader of expressions walks. Immutable; a
 * literal keeps its digits beside its exact value, so nothing is lost between the text and the tree.
 */

import type { Rational } from '../algebra/index.ts';
import type { FunctionName } from './functions.ts';

export interface NumberNode {
  readonly kind: 'number';
  /** As typed: `4.2e3`. Never signed; a minus is a node of its own. */
  readonly text: string;
  readonly value: Rational;
}
export interface NameNode {
  readonly kind: 'name';
  readonly name: string;
}
export interface UnaryNode {
  readonly kind: 'unary';
  readonly operator: '-';
  readonly operand: Expression;
}
export interface BinaryNode {
  readonly kind: 'binary';
  readonly operator: BinaryOperator;
  readonly left: Expression;
  readonly right: Expression;
}
export interface CallNode {
  readonly kind: 'call';
  readonly function: FunctionName;
  /** As many as the function takes, at least one. */
  readonly arguments: readonly Expression[];
}

export type BinaryOperator = '+' | '-' | '*' | '/' | '^';
export type Expression = NumberNode | NameNode | UnaryNode | BinaryNode | CallNode;

/**
 * A number with what is known about it: `exact` as a fraction, null where it is irrational or only known as a double;
 * `double` the nearest double of `exact`, or the computed one. `double` may be infinite or NaN inside the parameters; what
 * a block uses is finite.
 */
export interface Value {
  readonly exact: Rational | null;
  readonly double: number;
}
