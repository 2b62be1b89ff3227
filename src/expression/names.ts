/** Names in expressions: which are legal, which an expression uses, and a parameter's new name in a text. */

import type { Expression } from './expression.ts';
import { inOrder } from './fold.ts';
import { CONSTANTS, isFunctionName, LAPLACE_VARIABLE } from './functions.ts';

const NAME = /^[A-Za-z][A-Za-z0-9_]*$/;

/** Characters of a parameter's name. */
const LONGEST_NAME = 200;

/** Why a text cannot be a parameter's name, as a sentence; null where it can. */
export function parameterNameFault(name: string): string | null {
  if (!NAME.test(name)) {
    return 'A parameter’s name begins with a letter and has letters, digits and underscores only.';
  }
  if (name.length > LONGEST_NAME) return `A parameter’s name has at most ${LONGEST_NAME} characters.`;
  if (name === LAPLACE_VARIABLE) return 's is the Laplace variable. Choose another name.';
  if (CONSTANTS.has(name)) return `${name} is a constant. Choose another name.`;
  return isFunctionName(name) ? `${name} is a function. Choose another name.` : null;
}

/** The parameters that an expression uses, each once, in order of appearance; `s`, `pi` and `e` are not among them. */
export function namesIn(expression: Expression): readonly string[] {
  const found = new Set<string>();
  for (const node of inOrder(expression)) {
    if (node.kind === 'name' && node.name !== LAPLACE_VARIABLE && !CONSTANTS.has(node.name)) found.add(node.name);
  }
  return [...found];
}

/** Whether the Laplace variable appears. */
export function hasLaplaceVariable(expression: Expression): boolean {
  return inOrder(expression).some(node => node.kind === 'name' && node.name === LAPLACE_VARIABLE);
}

/** Numbers first, so that the `e5` of `2e5` is not taken for a name. */
const NUMBER_OR_NAME = /(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?|[A-Za-z][A-Za-z0-9_]*/g;

/** The text with parameter `from` called `to`, otherwise as typed; also in a text that does not parse. */
export function renameIn(text: string, from: string, to: string): string {
  return text.replace(NUMBER_OR_NAME, piece => (piece === from ? to : piece));
}
