/**
 * Tokens to the tree. The parser gets only what grammar.ts has passed, with every number and name replaced by a
 * placeholder, so that its own reading of literals, its reserved words and its implied products never come into play; what
 * is taken from it is the order of operations. Its types stay in here.
 */

import { parseRational, type Rational } from '../algebra/index.ts';
import type { BinaryOperator, Expression } from './expression.ts';
import { isFunctionName } from './functions.ts';
import { type ParsedNode, parseTree } from './parse-tree.ts';
import type { Token } from './tokens.ts';

/** The tree of tokens that form an expression; the first literal that is beyond what can be kept exactly, where one is. */
export function buildTree(
  tokens: readonly Token[],
): Expression | { readonly kind: 'unreadable'; readonly text: string } {
  const literals = new Map<Token, Rational>();
  for (const token of tokens) {
    if (token.kind !== 'number') continue;
    const value = parseRational(token.text);
    if (value === null) return { kind: 'unreadable', text: token.text };
    literals.set(token, value);
  }
  const canonical = tokens.map((token, i) => (token.kind === 'number' || token.kind === 'name' ? `x${i}` : token.text));
  const root = parseTree(canonical.join(''));
  return translate(root, placeholder => {
    const token = tokens[Number(placeholder.slice(1))];
    if (token === undefined) throw new Error(`no token stands behind ${placeholder}`);
    const value = literals.get(token);
    return value === undefined ? { kind: 'name', name: token.text } : { kind: 'number', text: token.text, value };
  });
}

type Leaf = (placeholder: string) => Extract<Expression, { kind: 'number' | 'name' }>;

/** The parsed tree in our own nodes, each made after its parts; an explicit stack, as long sums are deep. */
function translate(root: ParsedNode, leaf: Leaf): Expression {
  const open = [root];
  const order: Inner[] = [];
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    if (node.type === 'parenthesis') open.push(node.content);
    else {
      order.push(node);
      open.push(...partsOf(node));
    }
  }
  const made: Expression[] = [];
  for (const node of order.reverse()) {
    const count = partsOf(node).length;
    made.push(translateNode(node, made.splice(made.length - count, count), leaf));
  }
  const [expression] = made;
  if (expression === undefined) throw new Error('the parser returned no tree');
  return expression;
}

const OPERATORS: readonly string[] = ['+', '-', '*', '/', '^'] satisfies readonly BinaryOperator[];
const isBinaryOperator = (op: string): op is BinaryOperator => OPERATORS.includes(op);

type Inner = Exclude<ParsedNode, { type: 'parenthesis' }>;

function partsOf(node: Inner): readonly ParsedNode[] {
  return node.type === 'symbol' ? [] : node.args;
}

function translateNode(node: Inner, parts: readonly Expression[], leaf: Leaf): Expression {
  const [first, second] = parts;
  switch (node.type) {
    case 'symbol':
      return leaf(node.name);
    case 'function': {
      const called = leaf(node.fn.name);
      if (called.kind === 'name' && isFunctionName(called.name)) {
        return { kind: 'call', function: called.name, arguments: parts };
      }
      break;
    }
    case 'operator':
      if (first === undefined) break;
      if (second === undefined && node.op === '-') return { kind: 'unary', operator: '-', operand: first };
      if (second !== undefined && isBinaryOperator(node.op)) {
        return { kind: 'binary', operator: node.op, left: first, right: second };
      }
      break;
    default:
      node satisfies never;
  }
  throw new Error(`the parser returned an unexpected ${node.type}`);
}
