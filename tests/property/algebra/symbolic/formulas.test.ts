import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  createSymbolicField,
  formulaC,
  formulaLatex,
  formulaMathML,
  formulaOf,
  formulaPython,
  formulaText,
} from '../../../../src/algebra/symbolic/index.ts';
import { SEED } from '../../../arbitraries/rationals.ts';
import { anyFunction, functionOf, NAMES } from '../../../arbitraries/symbolic.ts';

const runs = { seed: SEED, numRuns: 60 };
const declared = fc.shuffledSubarray([...NAMES]);
const small = fc.oneof(
  anyFunction,
  // Numbers that turn into decimals, and squares and shared factors worth finding.
  fc
    .tuple(
      fc.constantFrom('0.05', '1e-12', '2200', '1/3', '-7/8'),
      fc.constantFrom('J', '(1 + 0.1*K1)^2', '1/(1 + 0.05*b)'),
    )
    .map(([number, rest]) => functionOf(`${number}*${rest}`)),
  fc.tuple(anyFunction, anyFunction).map(([f, g]) => {
    const field = createSymbolicField();
    return field.multiply(field.multiply(f, f), g);
  }),
);

describe('formulas read back', () => {
  test('the text of a formula is the same function, in any order of declaration', () => {
    fc.assert(
      fc.property(small, declared, (f, names) => {
        expect(functionOf(formulaText(formulaOf(f, { declared: names })))).toEqual(f);
      }),
      runs,
    );
  });

  test('the text of what is read back is the same text', () => {
    fc.assert(
      fc.property(small, f => {
        const text = formulaText(formulaOf(f));
        expect(formulaText(formulaOf(functionOf(text)))).toBe(text);
      }),
      runs,
    );
  });

  test('the Python expression is the same function once its powers are spelled ^', () => {
    fc.assert(
      fc.property(small, f => {
        expect(functionOf(formulaPython(formulaOf(f)).replaceAll('**', '^'))).toEqual(f);
      }),
      runs,
    );
  });

  test('the C expression is the same function once its calls of pow are spelled ^', () => {
    const asPower = (text: string): string => {
      const start = text.indexOf('pow(');
      if (start < 0) return text;
      const comma = text.indexOf(', ', start);
      const end = text.indexOf('.0)', comma);
      const base = text.slice(start + 'pow('.length, comma);
      return asPower(`${text.slice(0, start)}(${base})^${text.slice(comma + 2, end)}${text.slice(end + 3)}`);
    };
    fc.assert(
      fc.property(small, f => {
        const text = formulaC(formulaOf(f));
        expect(functionOf(asPower(text))).toEqual(f);
        // Every number outside a name is a double.
        for (const number of text.match(/(?<![\w.])\d[\w.]*(?:-\d+)?/g) ?? []) expect(number).toMatch(/[.e]/);
      }),
      runs,
    );
  });

  test('LaTeX balances its braces and brackets, MathML its elements', () => {
    fc.assert(
      fc.property(small, f => {
        const latex = formulaLatex(formulaOf(f));
        expect(latex.split('{')).toHaveLength(latex.split('}').length);
        expect(latex.split('\\left(')).toHaveLength(latex.split('\\right)').length);
        const open: string[] = [];
        for (const [, slash, name] of formulaMathML(formulaOf(f)).matchAll(/<(\/?)(\w+)>/g)) {
          if (slash === '') open.push(name ?? '');
          else expect(open.pop()).toBe(name);
        }
        expect(open).toEqual([]);
      }),
      runs,
    );
  });
});
