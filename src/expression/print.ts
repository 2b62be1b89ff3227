/** Tree to text in the language of format.md, with no parentheses but the needed ones: parsing it gives the tree back. */

import type { BinaryOperator, Expression } from './expression.ts';
import { fold } from './fold.ts';

/** How tightly a piece holds together, from a sum to what never needs parentheses. */
export const LEVEL = { sum: 0, product: 1, sign: 2, power: 3, atom: 4 } as const;
export type Level = (typeof LEVEL)[keyof typeof LEVEL];

/** What each operator makes and the levels its two sides need at the least; `^` groups to the right and holds signs there. */
export const OPERATOR_LEVELS: Readonly<Record<BinaryOperator, { makes: Level; left: Level; right: Level }>> = {
  '+': { makes: LEVEL.sum, left: LEVEL.sum, right: LEVEL.product },
  '-': { makes: LEVEL.sum, left: LEVEL.sum, right: LEVEL.product },
  '*': { makes: LEVEL.product, left: LEVEL.product, right: LEVEL.sign },
  '/': { makes: LEVEL.product, left: LEVEL.product, right: LEVEL.sign },
  '^': { makes: LEVEL.power, left: LEVEL.atom, right: LEVEL.sign },
};

interface Piece {
  readonly text: string;
  readonly level: Level;
}

/** The expression as one would type it: `a + b`, `a*b`, `2^-n`. Parsing the text gives an equal tree. */
export function print(expression: Expression): string {
  return fold<Piece>(expression, printNode).text;
}

function printNode(node: Expression, parts: readonly Piece[]): Piece {
  switch (node.kind) {
    case 'number':
      return { text: node.text, level: LEVEL.atom };
    case 'name':
      return { text: node.name, level: LEVEL.atom };
    case 'unary':
      return { text: `-${inside(parts[0], LEVEL.sign)}`, level: LEVEL.sign };
    case 'binary': {
      const { makes, left, right } = OPERATOR_LEVELS[node.operator];
      const operator = makes === LEVEL.sum ? ` ${node.operator} ` : node.operator;
      return { text: inside(parts[0], left) + operator + inside(parts[1], right), level: makes };
    }
    case 'call':
      return { text: `${node.function}(${parts.map(part => part.text).join(', ')})`, level: LEVEL.atom };
    default:
      return node satisfies never;
  }
}

function inside(piece: Piece | undefined, least: Level): string {
  if (piece === undefined) throw new Error('a node without its part');
  return piece.level < least ? `(${piece.text})` : piece.text;
}
