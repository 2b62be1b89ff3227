import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { deriveModel, type ModelMemory, newModelMemory } from '../../../src/compile/index.ts';
import { type Block, type Diagram, editDiagram } from '../../../src/diagram/index.ts';
import { anyDiagram, anyWish, editOf } from '../../arbitraries/diagrams.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

const FIELDS = ['auto', 'double'] as const;

/** What a change does to a drawing; `which` picks the block, parameter or wire. */
interface Change {
  readonly kind: 'parameter' | 'gain' | 'wire';
  readonly which: number;
  readonly value: string;
}

/** Values at which rows lose entries, loops lose their solution and quantities stop being rational are among them. */
const anyChange: fc.Arbitrary<Change> = fc.record({
  kind: fc.constantFrom<Change['kind']>('parameter', 'parameter', 'parameter', 'gain', 'gain', 'wire'),
  which: fc.nat({ max: 1000 }),
  value: fc.constantFrom('0', '1', '-1', '0.7', '-1/2', '3', '17/9', 'sqrt(2)', '1e-3', '1/0'),
});

function changed(diagram: Diagram, { kind, which, value }: Change): Diagram {
  const at = <T>(list: readonly T[]) => (list.length === 0 ? -1 : which % list.length);
  switch (kind) {
    case 'parameter':
      return {
        ...diagram,
        parameters: diagram.parameters.with(at(diagram.parameters), { name: 'ab'.charAt(which % 2), value }),
      };
    case 'gain': {
      const gains = diagram.blocks.flatMap((block, place) => (block.kind === 'gain' ? [{ block, place }] : []));
      const chosen = gains[at(gains)];
      if (chosen === undefined) return diagram;
      const block: Block = { ...chosen.block, gain: value === '1/0' ? 'a + b' : value };
      return { ...diagram, blocks: diagram.blocks.with(chosen.place, block) };
    }
    case 'wire':
      return { ...diagram, wires: diagram.wires.filter((_, place) => place !== at(diagram.wires)) };
    default:
      return kind satisfies never;
  }
}

/** Derives with and without the memory and compares answer and effort; says whether there is a model. */
function compared(diagram: Diagram, memory: ModelMemory, field: (typeof FIELDS)[number]): boolean {
  const fresh = newModelMemory();
  const expected = deriveModel(diagram, { field, memory: fresh });
  expect(deriveModel(diagram, { field, memory })).toStrictEqual(expected);
  if (field === 'auto' && expected.ok) expect(memory.account.effort.spent).toBe(fresh.account.effort.spent);
  return expected.ok;
}

describe('a drawing derived again after a change', () => {
  test.each(FIELDS)('has to the last bit the answer of one derived afresh, and the same effort: %s', field => {
    let models = 0;
    const runs = fc.tuple(
      randomDrawings({ blocks: 14, depth: 1, differentiates: true }),
      fc.array(anyChange, { minLength: 1, maxLength: 8 }),
    );
    fc.assert(
      fc.property(runs, ([start, changes]) => {
        const memory = newModelMemory();
        let diagram = start;
        compared(diagram, memory, field);
        for (const change of changes) {
          diagram = changed(diagram, change);
          if (compared(diagram, memory, field)) models += 1;
        }
      }),
      { seed: SEED, numRuns: 400 },
    );
    expect(models).toBeGreaterThan(300);
  });

  test('so has any drawing after any edits', () => {
    fc.assert(
      fc.property(anyDiagram, fc.array(anyWish, { minLength: 1, maxLength: 6 }), (start, wishes) => {
        const memory = newModelMemory();
        let diagram = start;
        compared(diagram, memory, 'auto');
        for (const wish of wishes) {
          const edited = editDiagram(diagram, editOf(wish, diagram));
          if (edited.ok) diagram = edited.value;
          compared(diagram, memory, 'auto');
        }
      }),
      { seed: SEED, numRuns: 200 },
    );
  });
});
