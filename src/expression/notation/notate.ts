/**
 * The walk that all notations share: where parentheses go and how a product is written. What a piece looks like is the
 * writer's business: spans on a line, LaTeX or MathML.
 */

import type { CallNode, Expression } from '../expression.ts';
import { fold } from '../fold.ts';
import { LEVEL, type Level, OPERATOR_LEVELS } from '../print.ts';
import { isOneLetter, namePart } from './name-parts.ts';

/** What an end of a piece looks like to its neighbour in a product. */
type Edge = 'digit' | 'word' | 'other';

interface Piece<T> {
  readonly content: T;
  readonly level: Level;
  readonly first: Edge;
  readonly last: Edge;
  /** Of a negative: what stands behind its sign, so that a stacked quotient can take the sign in front. */
  readonly unsigned?: T;
  /** Of a quotient on the line: followed by a factor it needs parentheses to be read right. */
  readonly isQuotient?: true;
}

/** A literal taken apart: `4.2e3` is 4.2 · 10³; `power` null where there is none, `mantissa` null where it is 1. */
export interface Literal {
  readonly mantissa: string | null;
  readonly power: string | null;
}

export interface Writer<T> {
  literal(literal: Literal): T;
  name(name: string): T;
  negative(operand: T): T;
  sum(left: T, operator: '+' | '-', right: T): T;
  /** `isDotted`: the factors would run into each other without a sign. */
  product(left: T, right: T, isDotted: boolean): T;
  quotient(above: T, below: T): T;
  power(base: T, exponent: T): T;
  call(node: CallNode, values: readonly T[], isAtom: readonly boolean[]): T;
  parentheses(inside: T): T;
  /** Whether a quotient is stacked: its parts then need no parentheses. */
  readonly isStacked: boolean;
}

/** The expression as the writer writes it, with no parentheses but the needed ones. */
export function notate<T>(expression: Expression, writer: Writer<T>): T {
  return fold<Piece<T>>(expression, (node, parts) => notateNode(node, parts, writer)).content;
}

function notateNode<T>(node: Expression, parts: readonly Piece<T>[], writer: Writer<T>): Piece<T> {
  const [first, second] = parts;
  switch (node.kind) {
    case 'number':
      return literalPiece(node.text, writer);
    case 'name': {
      const edge = isOneLetter(namePart(node.name).base) ? 'other' : 'word';
      return { content: writer.name(node.name), level: LEVEL.atom, first: edge, last: edge };
    }
    case 'unary':
      if (first === undefined) break;
      return negativePiece(first, writer);
    case 'binary':
      if (first === undefined || second === undefined) break;
      return node.operator === '^' || node.operator === '/'
        ? raisedOrStacked(node.operator, first, second, writer)
        : inLine(node.operator, first, second, writer);
    case 'call': {
      const atoms = parts.map(({ level }) => level === LEVEL.atom);
      const content = writer.call(
        node,
        parts.map(part => part.content),
        atoms,
      );
      // A root without its bar overhead must not run into an exponent.
      const level = node.function === 'sqrt' && !writer.isStacked ? LEVEL.sign : LEVEL.atom;
      return { content, level, first: node.function === 'abs' ? 'other' : 'word', last: 'other' };
    }
    default:
      node satisfies never;
  }
  throw new Error('a node without its part');
}

function negativePiece<T>(operand: Piece<T>, writer: Writer<T>): Piece<T> {
  const unsigned = inside(operand, LEVEL.sign, writer);
  return { content: writer.negative(unsigned), level: LEVEL.sign, first: 'other', last: operand.last, unsigned };
}

function inside<T>(piece: Piece<T>, least: Level, writer: Writer<T>): T {
  return piece.level < least ? writer.parentheses(piece.content) : piece.content;
}

function inLine<T>(operator: '+' | '-' | '*', left: Piece<T>, right: Piece<T>, writer: Writer<T>): Piece<T> {
  const needs = OPERATOR_LEVELS[operator];
  const content = onTheRight(right, needs.right, writer);
  const isUnclear = operator === '*' && left.isQuotient === true;
  const before = isUnclear ? writer.parentheses(left.content) : inside(left, needs.left, writer);
  const edges = { first: left.first, last: right.last };
  if (operator !== '*') return { content: writer.sum(before, operator, content), level: needs.makes, ...edges };
  const isDotted = right.first === 'digit' || right.first === 'word' || left.last === 'word';
  return { content: writer.product(before, content, isDotted), level: needs.makes, ...edges };
}

/** What stands right of an operator: a negative gets parentheses, as on paper: a (−b), a − (−b), a/(−b). */
function onTheRight<T>(piece: Piece<T>, least: Level, writer: Writer<T>): T {
  return piece.unsigned === undefined ? inside(piece, least, writer) : writer.parentheses(piece.content);
}

function raisedOrStacked<T>(operator: '^' | '/', left: Piece<T>, right: Piece<T>, writer: Writer<T>): Piece<T> {
  const needs = OPERATOR_LEVELS[operator];
  if (operator === '^') {
    const content = writer.power(inside(left, needs.left, writer), right.content);
    return { content, level: needs.makes, first: left.first, last: 'other' };
  }
  if (writer.isStacked) {
    const quotient = writer.quotient(left.unsigned ?? left.content, right.content);
    const piece: Piece<T> = { content: quotient, level: LEVEL.power, first: 'other', last: 'other' };
    return left.unsigned === undefined ? piece : negativePiece(piece, writer);
  }
  const content = writer.quotient(inside(left, needs.left, writer), onTheRight(right, needs.right, writer));
  return { content, level: needs.makes, first: left.first, last: right.last, isQuotient: true };
}

function literalPiece<T>(text: string, writer: Writer<T>): Piece<T> {
  const [digits = '', exponent] = text.split(/[eE]/);
  const mantissa = digits.replace(/^\./, '0.').replace(/\.$/, '');
  const power = exponent === undefined ? null : exponent.replace(/^\+/, '').replace(/^(-?)0+(?=\d)/, '$1');
  const literal: Literal = { mantissa: power !== null && mantissa === '1' ? null : mantissa, power };
  const level = power === null ? LEVEL.atom : literal.mantissa === null ? LEVEL.power : LEVEL.product;
  return { content: writer.literal(literal), level, first: 'digit', last: 'other' };
}
