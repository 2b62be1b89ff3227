/** The gains of branches as rational functions of the parameters, read block by block as a trace needs them. */

import type { RationalFunction, SymbolicField } from '../../algebra/symbolic/index.ts';
import { type Contribution, contributionOf } from '../kinds/index.ts';
import { symbolicReader } from '../symbolic/index.ts';
import type { Branch } from './action-graph.ts';
import type { TracedDrawing } from './traced-drawing.ts';

/** The symbolic gain of each branch that is asked for; may throw `EffortSpent`. */
export function symbolicGains(
  { drawing, scope }: TracedDrawing,
  field: SymbolicField,
): (branch: Branch) => RationalFunction {
  const reader = symbolicReader(field, scope, new Map());
  const known = new Map<number, Contribution<RationalFunction>>();
  const lawOf = (b: number): Contribution<RationalFunction> => {
    const before = known.get(b);
    if (before !== undefined) return before;
    const law = contributionOf(drawing.blocks[b]!.block, reader);
    if (!law.ok) throw new Error('a block that the numbers read is refused in symbols');
    known.set(b, law.value);
    return law.value;
  };
  return ({ block, coefficient: { from, row, column } }) => {
    if (from === 'unit') return field.one;
    const law = lawOf(block);
    const gain = from === 'derivatives' ? law.derivatives[column] : law[from][row]?.[column];
    if (gain === undefined) throw new Error('a law has another shape in symbols than in numbers');
    return gain;
  };
}
