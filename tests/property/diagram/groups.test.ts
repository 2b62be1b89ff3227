/**
 * Laws of groups: folding blocks and unfolding a group leave every transfer function as it was, compared exactly; a group unfolded after
 * it was folded is the drawing again up to ids and order; and the order of ports changes numbers only.
 */

import fc from 'fast-check';
import { expect, test, vi } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { allTransferFunctions } from '../../../src/analysis/index.ts';
import { compile } from '../../../src/compile/index.ts';
import { type Diagram, editDiagram, readDiagram, writeDiagram } from '../../../src/diagram/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

vi.setConfig({ testTimeout: 120_000 }); // many small derivations, on a machine that may be busy

/** Every channel by its names as exact text; the codes of the problems where there is no model. */
function behaviour(diagram: Diagram): unknown {
  const derived = compile(diagram, { field: 'rational' });
  if (!derived.ok) return [...new Set(derived.problems.map(({ code }) => code))];
  return allTransferFunctions(derived.value.model, 'high').map(found => {
    if (found.route === 'not-computed') return found;
    const text = (p: typeof found.exact.numerator) => p.map(toFraction).join(' ');
    return `${found.input} ${found.output} ${text(found.exact.numerator)} / ${text(found.exact.denominator)}`;
  });
}

/** A drawing and some of its blocks that are no inputs or outputs. */
const chosen = fc
  .tuple(randomDrawings({ blocks: 8, depth: 2 }), fc.array(fc.boolean(), { minLength: 12, maxLength: 12 }))
  .map(([diagram, picks]) => {
    const inner = diagram.blocks.filter(({ kind }) => kind !== 'input' && kind !== 'output');
    return { diagram, ids: inner.filter((_, i) => picks[i] === true).map(({ id }) => id) };
  })
  .filter(({ ids }) => ids.length > 0);

function edited(diagram: Diagram, edit: Parameters<typeof editDiagram>[1]): Diagram {
  const result = editDiagram(diagram, edit);
  if (!result.ok) throw new Error(result.problems[0]?.message);
  expect(readDiagram(writeDiagram(result.value))).toEqual({ ok: true, value: result.value });
  return result.value;
}

test('folding leaves every transfer function as it was, and so does unfolding again', () => {
  let withModel = 0;
  fc.assert(
    fc.property(chosen, ({ diagram, ids }) => {
      const before = behaviour(diagram);
      if (Array.isArray(before) && before.some(each => String(each).includes('/'))) withModel += 1;
      const folded = edited(diagram, { kind: 'foldBlocks', ids });
      expect(behaviour(folded)).toEqual(before);
      const group = folded.blocks.find(({ id }) => !diagram.blocks.some(block => block.id === id));
      const unfolded = edited(folded, { kind: 'unfoldGroup', id: group?.id ?? '' });
      expect(behaviour(unfolded)).toEqual(before);
      expect(unfolded.blocks.map(({ kind }) => kind).sort()).toEqual(diagram.blocks.map(({ kind }) => kind).sort());
      expect(unfolded.wires).toHaveLength(diagram.wires.length);
    }),
    { seed: SEED, numRuns: 150 },
  );
  expect(withModel).toBeGreaterThan(30);
});

test('unfolding any group of a drawing leaves every transfer function as it was', () => {
  let unfoldings = 0;
  fc.assert(
    fc.property(randomDrawings({ blocks: 8, depth: 2 }), diagram => {
      const before = behaviour(diagram);
      for (const { id, kind } of diagram.blocks) {
        if (kind !== 'group') continue;
        const result = editDiagram(diagram, { kind: 'unfoldGroup', id });
        if (!result.ok) {
          expect(result.problems[0]?.message).toMatch(/goes straight through it and back into it/);
          expect(before).toEqual(['loop-without-solution']);
          continue;
        }
        unfoldings += 1;
        expect(behaviour(edited(diagram, { kind: 'unfoldGroup', id }))).toEqual(before);
      }
    }),
    { seed: SEED, numRuns: 200 },
  );
  expect(unfoldings).toBeGreaterThan(50);
});
