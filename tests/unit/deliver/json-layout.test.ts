/** The laying out changes where lines break and nothing else. */

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { layOutJson } from '../../../src/deliver/json-layout.ts';

test('a matrix has a row a line, and what is short stays together', () => {
  const value = {
    title: 'Tank',
    A: [
      [-0.5, 1],
      [0, 1e-7],
    ],
    empty: { A: [], B: {} },
    poles: [{ re: -1, im: 0 }],
    long: [{ message: 'x'.repeat(60) }, { message: 'y'.repeat(60) }],
  };
  expect(layOutJson(value)).toBe(`{
  "title": "Tank",
  "A": [[-0.5, 1], [0, 1e-7]],
  "empty": { "A": [], "B": {} },
  "poles": [{ "re": -1, "im": 0 }],
  "long": [
    { "message": "${'x'.repeat(60)}" },
    { "message": "${'y'.repeat(60)}" }
  ]
}
`);
});

test('a row of a matrix is never broken, however long', () => {
  const row = Array.from({ length: 100 }, (_, i) => i / 8);
  const lines = layOutJson({ A: [row, row] }).split('\n');
  expect(lines.filter(line => line.includes('12.375'))).toHaveLength(2);
});

test('what is laid out is what was given, key by key in order', () => {
  const plain = fc.jsonValue().filter(value => typeof value === 'object' && value !== null);
  fc.assert(
    fc.property(plain, value => {
      expect(JSON.stringify(JSON.parse(layOutJson(value as object)))).toBe(JSON.stringify(value));
    }),
    { seed: 8259 },
  );
});
