/** Names that a written value uses and nobody has defined: they come in as parameters with value 1, in the same step. */

import type { Edit } from '../../diagram/index.ts';
import { namesIn, parseExpression } from '../../expression/index.ts';
import { store } from '../store/index.ts';

/** Those of the names that are no parameters yet, each once. */
export function unknownParameters(names: readonly string[]): readonly string[] {
  const known = new Set(store.getState().document.diagram.parameters.map(({ name }) => name));
  return [...new Set(names)].filter(name => !known.has(name));
}

export function newParameter(name: string): Edit {
  return { kind: 'addParameter', parameter: { name, value: '1' } };
}

const QUANTITIES: ReadonlySet<string> = new Set([
  'gain',
  'initial',
  'numerator',
  'denominator',
  'time',
  'lower',
  'upper',
]);

/** The edits behind those that add the parameters their texts name. */
export function withNewParameters(edits: readonly Edit[]): readonly Edit[] {
  const names = edits.flatMap(edit => {
    if (edit.kind !== 'setField' || !QUANTITIES.has(edit.field)) return [];
    const parsed = parseExpression(edit.value);
    return parsed.ok ? namesIn(parsed.value) : [];
  });
  return [...unknownParameters(names.filter(name => name !== 's')).map(newParameter), ...edits];
}
