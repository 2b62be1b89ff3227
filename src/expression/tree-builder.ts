/**
 * The one place that knows mathjs. It gets only what grammar.ts has passed, with every number and name replaced by a
 * placeholder, so that its own reading of literals, its reserved words and its implied products never come into play; what
 * is taken from it is the order of operations. Its types stay in here.
 */

import { create, parseDependencies } from 'mathjs/number';
import { parseRational, type Rational } from '../algebra/index.ts';
import type { BinaryOperator, Expression } from './expression.ts';
import { isFunctionName } from './functions.ts';
import type { Token } from './tokens.ts';

/** The parser alone: 43 kB compressed, where all of mathjs is 188 kB. */
const { parse } = create({ ...parseDependencies }, {});

/** The kinds of node that a checked text leads to. */
interface ParsedNode {
  readonly type: string;
  readonly name?: string;
  readonly op?: string;
  readonly content?: ParsedNode;
  readonly fn?: { readonly name: string };
  readonly args?: readonly ParsedNode[];
}

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
  const root = parse(canonical.join('')) as ParsedNode;
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
  const order: ParsedNode[] = [];
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    if (node.content === undefined) order.push(node);
    open.push(...(node.content === undefined ? (node.args ?? []) : [node.content]));
  }
  const made: Expression[] = [];
  for (const node of order.reverse()) {
    const count = node.args?.length ?? 0;
    made.push(translateNode(node, made.splice(made.length - count, count), leaf));
  }
  const [expression] = made;
  if (expression === undefined) throw new Error('the parser returned no tree');
  return expression;
}

const OPERATORS: readonly string[] = ['+', '-', '*', '/', '^'] satisfies readonly BinaryOperator[];
const isBinaryOperator = (op: string): op is BinaryOperator => OPERATORS.includes(op);

function translateNode(node: ParsedNode, parts: readonly Expression[], leaf: Leaf): Expression {
  const [first, second] = parts;
  if (node.type === 'SymbolNode' && node.name !== undefined) return leaf(node.name);
  if (node.type === 'FunctionNode' && node.fn !== undefined) {
    const { kind, ...named } = leaf(node.fn.name);
    const name = kind === 'name' && 'name' in named ? named.name : '';
    if (isFunctionName(name)) return { kind: 'call', function: name, arguments: parts };
  }
  if (node.type === 'OperatorNode' && node.op !== undefined && first !== undefined) {
    if (second === undefined && node.op === '-') return { kind: 'unary', operator: '-', operand: first };
    if (second !== undefined && isBinaryOperator(node.op)) {
      return { kind: 'binary', operator: node.op, left: first, right: second };
    }
  }
  throw new Error(`the parser returned an unexpected ${node.type}`);
}
