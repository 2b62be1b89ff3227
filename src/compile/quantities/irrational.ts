/** Which quantities of a drawing are irrational, so that the matrices hold their doubles. */

import type { Parameter } from '../../diagram/index.ts';
import { namesIn, parseExpression, type Scope } from '../../expression/index.ts';

/** A block in whose fields an irrational value was read. */
export interface IrrationalBlock {
  readonly path: string;
  /** The block as the beginning of a sentence: `Gain K_p`. */
  readonly title: string;
  /** The texts of those fields. */
  readonly texts: readonly string[];
}

export interface IrrationalFinding {
  /** `g = (sqrt(5)-1)/2` for a parameter, `amp: sqrt(2)` for a field of a block. */
  readonly name: string;
  /** Paths of the blocks that use it, in document order. */
  readonly blocks: readonly string[];
  readonly message: string;
}

const STANDS_IN = 'is irrational. The matrices hold its nearest double, and there are no exact ones.';

/**
 * The irrational parameters that the blocks use, directly or through other parameters, in document order, then the blocks
 * that are irrational by a text of their own.
 */
export function irrationalFindings(
  parameters: readonly Parameter[],
  scope: Scope,
  blocks: readonly IrrationalBlock[],
): IrrationalFinding[] {
  if (blocks.length === 0) return [];
  const used = new Map<string, string[]>();
  const own: IrrationalFinding[] = [];
  for (const { path, title, texts } of blocks) {
    for (const text of new Set(texts)) {
      const names = irrationalNames(text, parameters, scope);
      for (const name of names) used.set(name, [...new Set([...(used.get(name) ?? []), path])]);
      if (names.size === 0) {
        own.push({ name: `${path}: ${text}`, blocks: [path], message: `${title}: ${text} ${STANDS_IN}` });
      }
    }
  }
  const shared = parameters.flatMap(({ name, value }) => {
    const users = used.get(name);
    if (users === undefined) return [];
    return [{ name: `${name} = ${value}`, blocks: users, message: `Parameter ${name}: ${value} ${STANDS_IN}` }];
  });
  return [...shared, ...own];
}

/** Irrational parameters in a text and in the values of those, without recursion. */
function irrationalNames(text: string, parameters: readonly Parameter[], scope: Scope): ReadonlySet<string> {
  const found = new Set<string>();
  const waiting = [text];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    const parsed = parseExpression(next);
    if (!parsed.ok) continue;
    for (const name of namesIn(parsed.value)) {
      if (found.has(name) || scope.get(name)?.exact !== null) continue;
      found.add(name);
      waiting.push(parameters.find(parameter => parameter.name === name)?.value ?? '');
    }
  }
  return found;
}
