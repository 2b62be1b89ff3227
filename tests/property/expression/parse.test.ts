import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import {
  inlineMath,
  namesIn,
  parseExpression,
  print,
  renameIn,
  toLatex,
  toMathML,
} from '../../../src/expression/index.ts';
import { anyExpression, NAMES, tokenText } from '../../arbitraries/expressions.ts';
import { SEED } from '../../arbitraries/rationals.ts';

vi.setConfig({ testTimeout: 60_000 }); // many small runs, on a machine that may be busy

/** One line, one sentence or more, no control characters. */
const MESSAGE = /^[^\p{Cc}]+[.?]$/u;

describe('parsing', () => {
  test('what was printed gives the tree back', () => {
    fc.assert(
      fc.property(anyExpression, expression => {
        expect(parseExpression(print(expression))).toEqual({ ok: true, value: expression });
      }),
      { seed: SEED, numRuns: 1000 },
    );
  });

  test('never throws, and every refusal is a message for the screen', () => {
    fc.assert(
      fc.property(fc.oneof(tokenText, fc.string({ unit: 'binary', maxLength: 40 })), text => {
        const result = parseExpression(text);
        for (const { code, message, blocks } of result.ok ? [] : result.problems) {
          expect(code).toBe('bad-expression');
          expect(message).toMatch(MESSAGE);
          expect(blocks).toEqual([]);
        }
      }),
      { seed: SEED, numRuns: 3000 },
    );
  });

  test('what is accepted is accepted again as printed, with the same tree', () => {
    fc.assert(
      fc.property(tokenText, text => {
        const result = parseExpression(text);
        if (result.ok) expect(parseExpression(print(result.value))).toEqual(result);
      }),
      { seed: SEED, numRuns: 3000 },
    );
  });

  test('spaces between tokens change nothing', () => {
    fc.assert(
      fc.property(anyExpression, expression => {
        const spaced = print(expression).replace(/([-+*/^(),])/g, ' $1\t');
        // A sign may belong to the exponent of a literal; then the space has cut that literal in two.
        fc.pre(!/\d[eE] [-+]/.test(spaced));
        expect(parseExpression(spaced)).toEqual({ ok: true, value: expression });
      }),
      { seed: SEED, numRuns: 500 },
    );
  });
});

test('renaming to a new name and back gives the text back, and moves every mention', () => {
  fc.assert(
    fc.property(anyExpression, fc.constantFrom(...NAMES), (expression, name) => {
      const text = print(expression);
      const renamed = renameIn(text, name, 'fresh_1');
      expect(renameIn(renamed, 'fresh_1', name)).toBe(text);
      const parsed = parseExpression(renamed);
      const expected = namesIn(expression).map(used => (used === name ? 'fresh_1' : used));
      expect(parsed.ok ? namesIn(parsed.value) : []).toEqual(expected);
    }),
    { seed: SEED, numRuns: 500 },
  );
});

describe('notation', () => {
  test('never throws and lets no mark-up through', () => {
    fc.assert(
      fc.property(fc.oneof(tokenText, fc.string({ unit: 'binary' }), anyExpression.map(print)), text => {
        const tags = toMathML(text).match(/<\/?([a-z]+)/g) ?? [];
        const known = ['mrow', 'mi', 'mn', 'mo', 'msup', 'msub', 'mfrac', 'msqrt', 'mtext'];
        expect(tags.map(tag => tag.replace(/^<\/?/, '')).filter(tag => !known.includes(tag))).toEqual([]);
        // Every { of LaTeX is closed, whatever the text holds.
        const braces = toLatex(text).replace(/\\[{}]/g, '');
        expect(braces.split('{').length).toBe(braces.split('}').length);
        expect(inlineMath(text).every(span => typeof span.text === 'string')).toBe(true);
      }),
      { seed: SEED, numRuns: 1000 },
    );
  });

  test('is well-formed MathML: every element is closed in its place', () => {
    fc.assert(
      fc.property(anyExpression, expression => {
        const open: string[] = [];
        for (const [, slash, tag = ''] of toMathML(print(expression)).matchAll(/<(\/?)([a-z]+)[^>]*>/g)) {
          if (slash === '') open.push(tag);
          else expect(open.pop()).toBe(tag);
        }
        expect(open).toEqual([]);
      }),
      { seed: SEED, numRuns: 500 },
    );
  });
});
