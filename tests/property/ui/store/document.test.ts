/** Undo and redo over random edits: back to the start, forward to the end, whatever was done. */

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type DocumentSlice, edited, redone, undone } from '../../../../src/ui/store/document.ts';
import { anyDiagram, anyWish, editOf } from '../../../arbitraries/diagrams.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const start = (diagram: DocumentSlice['diagram']): DocumentSlice => ({
  diagram,
  key: 'k',
  revision: 0,
  past: [],
  future: [],
});

describe('undo and redo', () => {
  test('undoing every edit gives the very document that was opened, redoing them the very last one', () => {
    fc.assert(
      fc.property(anyDiagram, fc.array(anyWish, { maxLength: 12 }), (diagram, wishes) => {
        let slice = start(diagram);
        for (const wish of wishes) {
          const outcome = edited(slice, editOf(wish, slice.diagram));
          if (outcome.ok) slice = outcome.slice;
        }
        const last = slice.diagram;
        const steps = slice.past.length;
        for (let step = 0; step < steps; step++) slice = undone(slice);
        expect(slice.diagram).toBe(diagram);
        expect(undone(slice)).toBe(slice);
        for (let step = 0; step < steps; step++) slice = redone(slice);
        expect(slice.diagram).toBe(last);
        expect(redone(slice)).toBe(slice);
      }),
      { seed: SEED },
    );
  });

  test('an edit after an undo takes the undone ones away, and a refused one changes nothing', () => {
    fc.assert(
      fc.property(anyDiagram, anyWish, anyWish, (diagram, first, second) => {
        const one = edited(start(diagram), editOf(first, diagram));
        if (!one.ok || one.slice.past.length === 0) return;
        const back = undone(one.slice);
        const two = edited(back, editOf(second, back.diagram));
        if (two.ok && two.slice !== back) expect(two.slice.future).toEqual([]);
        expect(back.future).toHaveLength(1);
      }),
      { seed: SEED },
    );
  });
});
