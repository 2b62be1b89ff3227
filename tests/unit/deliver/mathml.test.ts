/** The equations in MathML, read back element by element. */

import { describe, expect, test } from 'vitest';
import { derivationOf, EMPTY, MOTOR, STATIC } from './derivations.ts';
import { childrenOf, type Element, readXml, textOf } from './read-xml.ts';
import { textIn } from './written.ts';

/** Rows of a `mtable`, each cell as it reads. */
function cellsOf(table: Element): string[][] {
  return childrenOf(table, 'mtr').map(row => childrenOf(row, 'mtd').map(textOf));
}

/** Every matrix and vector of the equations, in order: the tables inside brackets. */
function matricesIn(element: Element): string[][][] {
  const found = element.children.flatMap(child => (typeof child === 'string' ? [] : matricesIn(child)));
  const [first] = element.children;
  const isBracketed = element.name === 'mrow' && typeof first === 'object' && textOf(first) === '[';
  return isBracketed ? [...childrenOf(element, 'mtable').map(cellsOf), ...found] : found;
}

describe('the equations in MathML', () => {
  test('hold x, A, x, B, u, y, C, x, D, u and the initial state in order', () => {
    const root = readXml(textIn('mathml', derivationOf(MOTOR), 'fractions'));
    expect(root.name).toBe('math');
    expect(root.attributes).toEqual({ xmlns: 'http://www.w3.org/1998/Math/MathML', display: 'block' });
    const x = [['i'], ['ω'], ['θ']];
    const u = [['volts'], ['load']];
    expect(matricesIn(root)).toEqual([
      x,
      [
        ['−400', '−50/3', '0'],
        ['200', '−2/5', '0'],
        ['0', '1', '0'],
      ],
      x,
      [
        ['1000/3', '0'],
        ['0', '−4000'],
        ['0', '0'],
      ],
      u,
      [['angle'], ['speed']],
      [
        ['0', '0', '1'],
        ['0', '1', '0'],
      ],
      x,
      [
        ['0', '0'],
        ['0', '0'],
      ],
      u,
      x,
      [['0'], ['12.5'], ['0']],
    ]);
  });

  test('carry title and caution in a comment that nothing can end early', () => {
    const text = textIn('mathml', derivationOf({ ...MOTOR, title: 'a --> <b> ---' }));
    expect(text.startsWith('<!-- a - -> <b> - - - Linear model, ')).toBe(true);
    expect(readXml(text).name).toBe('math');
  });

  test('keep a name from becoming mark-up', () => {
    const root = readXml(textIn('mathml', derivationOf({ ...STATIC, outputs: ['<b>&"'] })));
    expect(matricesIn(root)).toEqual([[['<b>&"']], [['5/16']], [['u']]]);
  });

  test('are an empty table for an empty sheet', () => {
    expect(matricesIn(readXml(textIn('mathml', derivationOf(EMPTY))))).toEqual([]);
  });
});
