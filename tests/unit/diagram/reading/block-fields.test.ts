/**
 * Each field of each kind, left out and of the wrong type: the exact refusal. The expected sentences follow from the
 * table of fields in the description of the file, one pattern for every kind. shape.test.ts has the finer limits.
 */

import { describe, expect, test } from 'vitest';
import { readDiagram } from '../../../../src/diagram/index.ts';
import { messages, sheet } from './files.ts';

const QUANTITY = 'a quantity: text or a finite number';
const ROWS = 'rows of quantities: [[...], ...]';
const ROW = 'a row of quantities: [...]';
const MATRICES = { A: [['1']], B: [['1']], C: [['1']], D: [['0']] };

/** The title as messages say it, the whole block without its id, required fields and optional ones with what they are. */
const KINDS: readonly (readonly [
  string,
  object,
  Readonly<Record<string, string>>,
  Readonly<Record<string, string>>,
])[] = [
  ['Input', { kind: 'input' }, {}, { unit: 'text' }],
  ['Output', { kind: 'output' }, {}, { unit: 'text' }],
  ['Gain', { kind: 'gain', gain: '1' }, { gain: QUANTITY }, {}],
  ['Integrator', { kind: 'integrator' }, {}, { initial: QUANTITY, unit: 'text' }],
  [
    'Transfer function',
    { kind: 'transfer-function', numerator: '1', denominator: 's + 1' },
    { numerator: QUANTITY, denominator: QUANTITY },
    {},
  ],
  ['State model', { kind: 'state-model', ...MATRICES }, { A: ROWS, B: ROWS, C: ROWS, D: ROWS }, { initial: ROW }],
  ['Dead time', { kind: 'delay', time: '1' }, { time: QUANTITY }, {}],
  ['Limiter', { kind: 'limiter', lower: '-1', upper: '1' }, { lower: QUANTITY, upper: QUANTITY }, {}],
  ['Differentiator', { kind: 'differentiator' }, {}, { name: 'text', note: 'text', mirrored: 'true or false' }],
];

describe.each(KINDS)('%s', (title, block, required, optional) => {
  const whole = { id: 'b', ...block };

  test('whole, it is read', () => {
    expect(readDiagram(sheet([whole])).ok).toBe(true);
  });

  test('a required field left out is named', () => {
    for (const field of Object.keys(required)) {
      const without = Object.fromEntries(Object.entries(whole).filter(([key]) => key !== field));
      expect(messages(sheet([without]))).toEqual([`bad-value: ${title} b: "${field}" is missing.`]);
    }
  });

  test('a field of the wrong type is named with what it has to be', () => {
    for (const [field, what] of Object.entries({ ...required, ...optional })) {
      for (const wrong of [null, {}]) {
        expect(messages(sheet([{ ...whole, [field]: wrong }]))).toEqual([
          `bad-value: ${title} b: "${field}" is not ${what}.`,
        ]);
      }
    }
  });
});

test('an entry of a state model that is no quantity is refused by its matrix', () => {
  for (const field of ['A', 'B', 'C', 'D']) {
    expect(messages(sheet([{ id: 'b', kind: 'state-model', ...MATRICES, [field]: [[true]] }]))).toEqual([
      `bad-value: State model b: "${field}" is not ${QUANTITY}.`,
    ]);
  }
  expect(messages(sheet([{ id: 'b', kind: 'state-model', ...MATRICES, initial: [null] }]))).toEqual([
    `bad-value: State model b: "initial" is not ${QUANTITY}.`,
  ]);
});
