/** Which parameters the table shows, in which order. */

import type { Parameter } from '../../diagram/index.ts';

export type ParameterOrder = 'declared' | 'name';

/** Names of those whose name, unit or note contains the text, small or capital; by name in the order of code points. */
export function shownParameters(
  parameters: readonly Parameter[],
  order: ParameterOrder,
  filter: string,
): readonly string[] {
  const wanted = filter.trim().toLowerCase();
  const names = parameters
    .filter(({ name, unit = '', note = '' }) => [name, unit, note].some(text => text.toLowerCase().includes(wanted)))
    .map(({ name }) => name);
  return order === 'declared' ? names : names.toSorted(byName);
}

/** Small and capital letters side by side, ties by code point. */
function byName(a: string, b: string): number {
  const [x, y] = [a.toLowerCase(), b.toLowerCase()];
  if (x !== y) return x < y ? -1 : 1;
  return a < b ? -1 : Number(a > b);
}
