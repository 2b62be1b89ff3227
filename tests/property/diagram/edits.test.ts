import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import {
  type Block,
  type Diagram,
  editDiagram,
  isSameModel,
  minifyDiagram,
  quantityFields,
  readDiagram,
  type Sheet,
  writeDiagram,
} from '../../../src/diagram/index.ts';
import { evaluateParameters, evaluatePolynomial, evaluateQuantity } from '../../../src/expression/index.ts';
import { anyDiagram, anyWish, editOf, frozen } from '../../arbitraries/diagrams.ts';
import { SEED } from '../../arbitraries/rationals.ts';

vi.setConfig({ testTimeout: 60_000 }); // many small runs, on a machine that may be busy

describe('edits', () => {
  test('in any sequence keep the drawing one that a file can hold, and never touch the former one', () => {
    const done = { made: 0, refused: 0 };
    fc.assert(
      fc.property(anyDiagram, fc.array(anyWish, { minLength: 1, maxLength: 12 }), (start, wishes) => {
        let diagram = frozen(start);
        for (const wish of wishes) {
          const edit = frozen(editOf(wish, diagram));
          const result = editDiagram(diagram, edit);
          if (!result.ok) {
            done.refused += 1;
            expect(result.problems.length).toBeGreaterThan(0);
            for (const { message } of result.problems) expect(message).toMatch(/^[^\p{Cc}]+[.?]$/u);
            continue;
          }
          done.made += 1;
          expect(readDiagram(writeDiagram(result.value))).toEqual({ ok: true, value: result.value });
          diagram = frozen(result.value);
        }
      }),
      { seed: SEED, numRuns: 400 },
    );
    // Both ways out are met often enough for this to mean something.
    expect(Math.min(done.made, done.refused)).toBeGreaterThan(500);
  });

  test('that change nothing return the very same drawing, and those that change something another text', () => {
    fc.assert(
      fc.property(anyDiagram, anyWish, (diagram, wish) => {
        const result = editDiagram(diagram, editOf(wish, diagram));
        if (result.ok) expect(result.value === diagram).toBe(writeDiagram(result.value) === writeDiagram(diagram));
      }),
      { seed: SEED, numRuns: 1000 },
    );
  });

  test('share what they did not change: only the edited blocks are new objects', () => {
    fc.assert(
      fc.property(anyDiagram, anyWish, (diagram, wish) => {
        fc.pre(wish.kind !== 'addBlocks');
        const result = editDiagram(diagram, editOf(wish, diagram));
        if (!result.ok) return;
        const before = new Map(diagram.blocks.map(block => [JSON.stringify(block), block]));
        for (const block of result.value.blocks) {
          const same = before.get(JSON.stringify(block));
          if (same !== undefined) expect(block).toBe(same);
        }
      }),
      { seed: SEED, numRuns: 500 },
    );
  });

  test('that move, place or mirror blocks leave the model alone', () => {
    fc.assert(
      fc.property(anyDiagram, anyWish, (diagram, wish) => {
        fc.pre(['moveBlocks', 'placeBlocks', 'mirrorBlocks', 'setVia', 'nameWire'].includes(wish.kind));
        const result = editDiagram(diagram, editOf(wish, diagram));
        if (result.ok) expect(isSameModel(diagram, result.value)).toBe(true);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('mirroring twice and moving there and back give the drawing back', () => {
    fc.assert(
      fc.property(anyDiagram, fc.integer({ min: -9, max: 9 }), (diagram, dx) => {
        const ids = diagram.blocks.map(({ id }) => id);
        const steps = [
          { kind: 'mirrorBlocks', ids },
          { kind: 'moveBlocks', ids, dx, dy: 20 },
          { kind: 'mirrorBlocks', ids },
          { kind: 'moveBlocks', ids, dx: -dx, dy: -20 },
        ] as const;
        let after: Diagram = diagram;
        for (const step of steps) {
          const result = editDiagram(after, step);
          if (result.ok) after = result.value;
        }
        expect(after).toEqual(diagram);
      }),
      { seed: SEED, numRuns: 200 },
    );
  });
});

/** The values of all expressions of a drawing, in document order. */
function values(diagram: Diagram): unknown[] {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) throw new Error('the generated parameters have values');
  const ofBlock = (block: Block): unknown[] =>
    quantityFields(block).map(({ text, isPolynomial }) => {
      const result = isPolynomial
        ? evaluatePolynomial(text, parameters.value)
        : evaluateQuantity(text, parameters.value);
      return result.ok ? result.value : 'refused';
    });
  const ofSheet = (sheet: Sheet): unknown[] =>
    sheet.blocks.flatMap(block => (block.kind === 'group' ? ofSheet(block.sheet) : ofBlock(block)));
  return [...parameters.value.values(), ...ofSheet(diagram)];
}

test('renaming a parameter leaves every value alone', () => {
  fc.assert(
    fc.property(anyDiagram, fc.constantFrom('a', 'b', 'K_p', 'omega'), (diagram, from) => {
      const renamed = editDiagram(diagram, { kind: 'renameParameter', from, to: 'fresh_name' });
      expect(renamed.ok && values(renamed.value)).toEqual(values(diagram));
    }),
    { seed: SEED, numRuns: 200 },
  );
});

describe('saving and loading', () => {
  test('give the drawing back, written for people or for a link', () => {
    fc.assert(
      fc.property(anyDiagram, diagram => {
        expect(readDiagram(writeDiagram(diagram))).toEqual({ ok: true, value: diagram });
        expect(readDiagram(minifyDiagram(diagram))).toEqual({ ok: true, value: diagram });
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('write the same bytes for the same drawing, however its fields were made', () => {
    fc.assert(
      fc.property(anyDiagram, diagram => {
        const reversed = JSON.parse(JSON.stringify(diagram), (_, value) =>
          typeof value === 'object' && value !== null && !Array.isArray(value)
            ? Object.fromEntries(Object.entries(value).reverse())
            : value,
        );
        expect(writeDiagram(reversed)).toBe(writeDiagram(diagram));
      }),
      { seed: SEED, numRuns: 100 },
    );
  });
});
