import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { editDiagram, startingDrawing } from '../../../src/diagram/index.ts';
import { changeSince, withChange } from '../../../src/worker/diagram-change.ts';
import { anyDiagram, anyWish, editOf } from '../../arbitraries/diagrams.ts';
import { SEED } from '../../arbitraries/rationals.ts';

const winch = startingDrawing();

describe('a drawing sent as a change', () => {
  test('is the drawing again, whatever was edited', () => {
    fc.assert(
      fc.property(anyDiagram, fc.array(anyWish, { maxLength: 8 }), (start, wishes) => {
        let here = start;
        let there = withChange(null, structuredClone(changeSince(null, here)));
        expect(there).toEqual(here);
        for (const wish of wishes) {
          const edited = editDiagram(here, editOf(wish, here));
          const next = edited.ok ? edited.value : here;
          there = withChange(there, structuredClone(changeSince(here, next)));
          here = next;
          expect(there).toEqual(here);
        }
      }),
      { seed: SEED, numRuns: 200 },
    );
  });

  test('leaves blocks and wires at home where a parameter changed', () => {
    const moved = { ...winch, parameters: winch.parameters.slice(1) };
    const change = changeSince(winch, moved);
    expect(change.blocks).toBeNull();
    expect(change.wires).toBeNull();
    const there = withChange(winch, structuredClone(change));
    expect(there.blocks).toBe(winch.blocks);
    expect(there.wires).toBe(winch.wires);
  });

  test('takes one changed block along and no other', () => {
    const [first] = winch.blocks;
    if (first === undefined) throw new Error('the drawing has blocks');
    const block = { ...first, note: 'changed' };
    const change = changeSince(winch, { ...winch, blocks: winch.blocks.with(0, block) });
    expect(change.blocks).toEqual({ some: [[0, block]] });
  });

  test('cannot be taken before any drawing', () => {
    const change = changeSince(winch, winch);
    expect(() => withChange(null, change)).toThrow('a change came before any drawing');
  });
});
