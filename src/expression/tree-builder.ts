/**
 * Tokens to the tree. The parser gets only what grammar.ts has passed, one pair of parentheses at a time from the inside out, with
 * everything that is no operator replaced by a placeholder: its own reading of literals, its reserved words, its implied
 * products and its recursion never come into play. What is taken from it is the order of operations.
 */

import { parseRational } from '../algebra/index.ts';
import type { BinaryOperator, Expression } from './expression.ts';
import { type FunctionName, isFunctionName } from './functions.ts';
import { type ParsedNode, parseTree } from './parse-tree.ts';
import type { Token } from './tokens.ts';

/** A literal beyond what can be kept exactly. */
export interface Unreadable {
  readonly kind: 'unreadable';
  readonly text: string;
}

/** What stands between two parentheses, or in the whole text. */
interface Level {
  /** The function whose arguments these are, null for plain parentheses. */
  readonly call: FunctionName | null;
  /** The arguments that a comma has closed. */
  readonly arguments: Expression[];
  /** Operators and, between them, places in `operands`. */
  readonly pieces: string[];
  readonly operands: Expression[];
}

const newLevel = (call: FunctionName | null): Level => ({ call, arguments: [], pieces: [], operands: [] });

/** The tree of tokens that form an expression; the first literal that cannot be kept, where there is one. Linear. */
export function buildTree(tokens: readonly Token[]): Expression | Unreadable {
  const levels = [newLevel(null)];
  let called: FunctionName | null = null;
  for (const token of tokens) {
    const level = levels.at(-1);
    if (level === undefined) throw new Error('the grammar let a parenthesis through');
    if (token.kind === 'number') {
      const value = parseRational(token.text);
      if (value === null) return { kind: 'unreadable', text: token.text };
      addOperand(level, { kind: 'number', text: token.text, value });
    } else if (token.kind === 'name') {
      if (isFunctionName(token.text)) called = token.text;
      else addOperand(level, { kind: 'name', name: token.text });
    } else if (token.kind === 'operator') level.pieces.push(token.text);
    else if (token.kind === '(') {
      levels.push(newLevel(called));
      called = null;
    } else if (token.kind === ',') closeArgument(level);
    else {
      levels.pop();
      addOperand(levels.at(-1) ?? newLevel(null), closed(level));
    }
  }
  return treeOf(levels[0] ?? newLevel(null));
}

function addOperand(level: Level, operand: Expression): void {
  level.pieces.push(`x${level.operands.length}`);
  level.operands.push(operand);
}

function closeArgument(level: Level): void {
  level.arguments.push(treeOf(level));
  level.pieces.length = 0;
  level.operands.length = 0;
}

/** What a closing parenthesis makes of its level. */
function closed(level: Level): Expression {
  if (level.call === null) return treeOf(level);
  closeArgument(level);
  return { kind: 'call', function: level.call, arguments: level.arguments };
}

/** The tree of a level: operators between operands, no parentheses. */
function treeOf({ pieces, operands }: Level): Expression {
  const [only] = operands;
  if (pieces.length === 1 && only !== undefined) return only;
  return translate(parseTree(pieces.join('')), operands);
}

/** The parsed tree in our own nodes, each made after its parts; an explicit stack, as long sums are deep. */
function translate(root: ParsedNode, operands: readonly Expression[]): Expression {
  const open = [root];
  const order: ParsedNode[] = [];
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    order.push(node);
    if (node.type === 'operator') open.push(...node.args);
  }
  const made: Expression[] = [];
  for (const node of order.reverse()) {
    const count = node.type === 'operator' ? node.args.length : 0;
    made.push(translateNode(node, made.splice(made.length - count, count), operands));
  }
  const [expression] = made;
  if (expression === undefined) throw new Error('the parser returned no tree');
  return expression;
}

const OPERATORS: readonly string[] = ['+', '-', '*', '/', '^'] satisfies readonly BinaryOperator[];
const isBinaryOperator = (op: string): op is BinaryOperator => OPERATORS.includes(op);

function translateNode(node: ParsedNode, parts: readonly Expression[], operands: readonly Expression[]): Expression {
  const [first, second] = parts;
  if (node.type === 'symbol') {
    const operand = operands[Number(node.name.slice(1))];
    if (operand !== undefined) return operand;
  } else if (first !== undefined && second === undefined && node.op === '-') {
    return { kind: 'unary', operator: '-', operand: first };
  } else if (first !== undefined && second !== undefined && isBinaryOperator(node.op)) {
    return { kind: 'binary', operator: node.op, left: first, right: second };
  }
  throw new Error(`the parser returned an unexpected ${node.type}`);
}
