/** What derived parameters stand for: those whose value uses others, as rational functions of the ones that are given. */

import type { RationalFunction, SymbolicField } from '../../algebra/symbolic/index.ts';
import type { Parameter } from '../../diagram/index.ts';
import { type Expression, evaluateIn, namesIn, parseExpression } from '../../expression/index.ts';
import { withOpaqueAtoms } from './opaque-atoms.ts';

/**
 * The function of each derived parameter that is one; a parameter with a number for its value, and one whose value is irrational
 * as a whole, stays a symbol of its own. The parameters have values, so there is no cycle among them.
 */
export function expandedParameters(
  parameters: readonly Parameter[],
  field: SymbolicField,
): ReadonlyMap<string, RationalFunction> {
  const expanded = new Map<string, RationalFunction>();
  const open = new Map<string, Expression>();
  for (const { name, value } of parameters) {
    const parsed = parseExpression(value);
    if (parsed.ok && namesIn(parsed.value).length > 0) open.set(name, withOpaqueAtoms(parsed.value));
  }
  const variable = (name: string) => expanded.get(name) ?? field.variable(name);
  // In passes, since what a parameter uses may be listed after it.
  for (let hasMore = true; hasMore; ) {
    hasMore = false;
    for (const [name, expression] of open) {
      if (namesIn(expression).some(used => open.has(used))) continue;
      open.delete(name);
      hasMore = true;
      const value = evaluateIn(expression, field, variable);
      if (value !== null) expanded.set(name, value);
    }
  }
  return expanded;
}
