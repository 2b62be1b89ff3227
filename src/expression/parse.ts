/**
 * Text to tree: tokens, grammar, tree. The limits of format.md hold before the tree is built, and text outside the
 * language never reaches the parser behind it.
 */

import { fail, ok, problem, type Result } from '../problem/index.ts';
import type { Expression } from './expression.ts';
import { checkGrammar } from './grammar.ts';
import { tokens } from './tokens.ts';
import { buildTree } from './tree-builder.ts';
import { word } from './wording.ts';

/** Texts remembered with their tree: the quantities of a large drawing, parsed anew at every edit otherwise. */
const MOST_REMEMBERED = 4096;
/** Longer texts are parsed each time, so that what is remembered stays below a few megabytes. */
const LONGEST_REMEMBERED = 200;
const remembered = new Map<string, Result<Expression>>();

/**
 * The expression that a text says, or why it is none, with what to write instead. At most 10,000 characters, nested at
 * most 250 deep. Linear in the text.
 */
export function parseExpression(text: string): Result<Expression> {
  const known = remembered.get(text);
  if (known !== undefined) return known;
  const result = parseAnew(text);
  if (text.length > LONGEST_REMEMBERED) return result;
  if (remembered.size >= MOST_REMEMBERED) remembered.clear();
  remembered.set(text, result);
  return result;
}

function parseAnew(text: string): Result<Expression> {
  const found = tokens(text);
  if (!found.ok) return found;
  const checked = checkGrammar(text, found.value);
  if (!checked.ok) return checked;
  const tree = buildTree(checked.value);
  if (tree.kind !== 'unreadable') return ok(tree);
  const message = `${word(tree.text)} is beyond what is kept exactly: exponents go from -400 to 400.`;
  return fail(problem('bad-expression', message));
}
