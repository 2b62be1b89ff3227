/**
 * The one place that knows mathjs. Its parser is given two kinds of node of ours in place of its own twenty, which bring
 * evaluation, printing and types that nothing here uses and weigh twice as much as the parser. A text that would need
 * another kind never gets here: it holds placeholder names and operators only.
 */

import { createParse } from 'mathjs/number';

/** The kinds of node that such a text leads to, with the fields by which mathjs knows them. */
export type ParsedNode = SymbolNode | OperatorNode;

/** What mathjs asks of a node before it trusts its other marks. */
class BaseNode {
  get isNode(): true {
    return true;
  }
}

export class SymbolNode extends BaseNode {
  readonly type = 'symbol';
  readonly isSymbolNode = true;
  readonly name: string;
  constructor(name: string) {
    super();
    this.name = name;
  }
}

export class OperatorNode extends BaseNode {
  readonly type = 'operator';
  readonly isOperatorNode = true;
  readonly op: string;
  readonly fn: string;
  readonly args: readonly ParsedNode[];
  constructor(op: string, fn: string, args: readonly ParsedNode[]) {
    super();
    this.op = op;
    this.fn = fn;
    this.args = args;
  }
}

/** In place of every kind that such a text cannot lead to. */
class Unexpected {
  constructor() {
    throw new Error('the parser met what it was not to be given');
  }
}

/** mathjs chooses among implementations by the arguments' types and converts between types; here it is all one text. */
const onlyText = Object.assign(
  <T>(_name: string, implementations: { readonly string: T }): T => implementations.string,
  { addConversion: () => undefined },
);

/** The tree of placeholder names and operators. Recurses once for each minus sign or power that waits for another. */
export const parseTree: (text: string) => ParsedNode = createParse({
  typed: onlyText,
  numeric: () => new Unexpected(),
  config: { number: 'number' },
  SymbolNode,
  OperatorNode,
  AccessorNode: Unexpected,
  ArrayNode: Unexpected,
  AssignmentNode: Unexpected,
  BlockNode: Unexpected,
  ConditionalNode: Unexpected,
  ConstantNode: Unexpected,
  FunctionAssignmentNode: Unexpected,
  FunctionNode: Unexpected,
  IndexNode: Unexpected,
  ObjectNode: Unexpected,
  ParenthesisNode: Unexpected,
  RangeNode: Unexpected,
  RelationalNode: Unexpected,
});
