/** Which parameters a drawing uses, which of its parameters nothing uses, and which names it uses that are none. */

import { type Block, type Diagram, quantityFields, type Sheet } from '../../diagram/index.ts';
import { namesIn, parameterNameFault, parseExpression } from '../../expression/index.ts';

export interface ParameterUse {
  /** Parameters that no block and no other parameter uses. */
  readonly unused: ReadonlySet<string>;
  /** Names that are used and not defined, in order of appearance. */
  readonly missing: readonly string[];
}

const known = new WeakMap<Diagram, ParameterUse>();

/** Texts that do not parse use nothing. Linear the first time, nothing when asked again. */
export function parameterUse(diagram: Diagram): ParameterUse {
  const before = known.get(diagram);
  if (before !== undefined) return before;
  const used = new Set<string>();
  for (const { name, value, tolerance } of diagram.parameters) {
    for (const found of [...namesOf(value), ...namesOf(tolerance ?? '')]) if (found !== name) used.add(found);
  }
  addNamesOf(diagram, used);
  const defined = new Set(diagram.parameters.map(({ name }) => name));
  const use = {
    unused: new Set([...defined].filter(name => !used.has(name))),
    missing: [...used].filter(name => !defined.has(name) && parameterNameFault(name) === null),
  };
  known.set(diagram, use);
  return use;
}

/** Recursion is as deep as groups are: at most 32. */
function addNamesOf({ blocks }: Sheet, used: Set<string>): void {
  for (const block of blocks) {
    if (block.kind === 'group') addNamesOf(block.sheet, used);
    else for (const name of blockNames(block)) used.add(name);
  }
}

const namesByBlock = new WeakMap<Block, readonly string[]>();

function blockNames(block: Block): readonly string[] {
  const before = namesByBlock.get(block);
  if (before !== undefined) return before;
  const names = quantityFields(block).flatMap(({ text }) => namesOf(text));
  namesByBlock.set(block, names);
  return names;
}

function namesOf(text: string): readonly string[] {
  if (!/[A-Za-z]/.test(text)) return [];
  const parsed = parseExpression(text);
  return parsed.ok ? namesIn(parsed.value) : [];
}
