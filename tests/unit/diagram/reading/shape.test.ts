import { describe, expect, test } from 'vitest';
import { readDiagram } from '../../../../src/diagram/index.ts';
import { file, messages, sheet } from './files.ts';

describe('fields of the wrong shape are refused by block and field', () => {
  const KINDS =
    'input, output, gain, summer, integrator, transfer-function, state-model, delay, differentiator, limiter, group';
  test.each<readonly [object, string]>([
    [{ id: 'K', kind: 'gain' }, 'bad-value: Gain K: "gain" is missing.'],
    [{ id: 'K', kind: 'gain', gain: null }, 'bad-value: Gain K: "gain" is not a quantity: text or a finite number.'],
    [{ id: 'K', kind: 'gain', gain: ['1'] }, 'bad-value: Gain K: "gain" is not a quantity: text or a finite number.'],
    [
      { id: 'K', kind: 'gain', gain: '1', at: [1] },
      'bad-value: Gain K: "at" is not [x, y]: two numbers within ±1000000.',
    ],
    [
      { id: 'K', kind: 'gain', gain: '1', at: [1, 2, 3] },
      'bad-value: Gain K: "at" is not [x, y]: two numbers within ±1000000.',
    ],
    [
      { id: 'K', kind: 'gain', gain: '1', at: [1, 1e7] },
      'bad-value: Gain K: "at" is not [x, y]: two numbers within ±1000000.',
    ],
    [
      { id: 'K', kind: 'gain', gain: '1', at: 'left' },
      'bad-value: Gain K: "at" is not [x, y]: two numbers within ±1000000.',
    ],
    [{ id: 'K', kind: 'gain', gain: '1', name: 3 }, 'bad-value: Gain K: "name" is not text.'],
    [{ id: 'K', kind: 'gain', gain: '1', name: 'a\nb' }, 'bad-value: Gain K: "name" is not a name on one line.'],
    [
      { id: 'K', kind: 'gain', gain: '1', name: 'a'.repeat(201) },
      'bad-value: Gain K: "name" is not a name of at most 200 characters.',
    ],
    [{ id: 'K', kind: 'gain', gain: '1', mirrored: 1 }, 'bad-value: Gain K: "mirrored" is not true or false.'],
    [{ id: 'K', kind: 'gain', gain: '1', note: {} }, 'bad-value: Gain K: "note" is not text.'],
    [{ id: 'u', kind: 'input', unit: 1 }, 'bad-value: Input u: "unit" is not text.'],
    [{ id: 'e', kind: 'summer' }, 'bad-value: Summing point e: "signs" is missing.'],
    [
      { id: 'e', kind: 'summer', signs: '' },
      'bad-value: Summing point e: "signs" is not a string of 16 + and - at most, one at least.',
    ],
    [
      { id: 'e', kind: 'summer', signs: '+*' },
      'bad-value: Summing point e: "signs" is not a string of 16 + and - at most, one at least.',
    ],
    [
      { id: 'e', kind: 'summer', signs: '+'.repeat(17) },
      'bad-value: Summing point e: "signs" is not a string of 16 + and - at most, one at least.',
    ],
    [
      { id: 'x', kind: 'integrator', initial: true },
      'bad-value: Integrator x: "initial" is not a quantity: text or a finite number.',
    ],
    [
      { id: 'G', kind: 'transfer-function', numerator: '1' },
      'bad-value: Transfer function G: "denominator" is missing.',
    ],
    [
      { id: 'd', kind: 'delay', time: '1', order: 0 },
      'bad-value: Dead time d: "order" is not a whole number from 1 to 10.',
    ],
    [
      { id: 'd', kind: 'delay', time: '1', order: 11 },
      'bad-value: Dead time d: "order" is not a whole number from 1 to 10.',
    ],
    [
      { id: 'd', kind: 'delay', time: '1', order: 1.5 },
      'bad-value: Dead time d: "order" is not a whole number from 1 to 10.',
    ],
    [
      { id: 'd', kind: 'delay', time: '1', order: '2' },
      'bad-value: Dead time d: "order" is not a whole number from 1 to 10.',
    ],
    [{ id: 'l', kind: 'limiter', lower: '0' }, 'bad-value: Limiter l: "upper" is missing.'],
    [{ id: 'S', kind: 'group' }, 'bad-value: Group S: "sheet" is not { "blocks": [...], "wires": [...] }.'],
    [{ id: 'S', kind: 'group', sheet: [] }, 'bad-value: Group S: "sheet" is not { "blocks": [...], "wires": [...] }.'],
    [{ id: 'S', kind: 'group', sheet: {} }, 'bad-value: Group S: "blocks" is not a list.'],
    [
      { id: 'S', kind: 'group', name: 'drive', sheet: { blocks: [{ id: 'K', kind: 'gain' }] } },
      'bad-value: Gain drive.K: "gain" is missing.',
    ],
    [
      { id: 'S', kind: 'group', sheet: { blocks: [{ kind: 'gain', gain: '1' }] } },
      'bad-value: Group S, the gain at place 1: "id" is missing.',
    ],
    [{ kind: 'gain', gain: '1' }, 'bad-value: The diagram, the gain at place 1: "id" is missing.'],
    [
      { id: '1a', kind: 'gain', gain: '1' },
      'bad-value: The diagram, the gain at place 1: "id" is not an id: a letter, then letters, digits and underscores.',
    ],
    [{ id: 5, kind: 'gain', gain: '1' }, 'bad-value: The diagram, the gain at place 1: "id" is not text.'],
    [{ id: 'K' }, `unknown-kind: Block K: it has no kind. Kinds are ${KINDS}.`],
    [{ id: 'K', kind: 'pump' }, `unknown-kind: Block K: "pump" is no kind of block. Kinds are ${KINDS}.`],
    [{ id: 'K', kind: 'toString' }, `unknown-kind: Block K: "toString" is no kind of block. Kinds are ${KINDS}.`],
    [{ kind: 7 }, `unknown-kind: The diagram, the block at place 1: "7" is no kind of block. Kinds are ${KINDS}.`],
  ])('%j', (block, message) => {
    expect(messages(sheet([block]))).toEqual([message]);
  });

  test('a block that is no object', () => {
    for (const block of [null, 1, 'gain', []]) {
      expect(messages(sheet([block]))).toEqual([
        `unknown-kind: The diagram, the block at place 1: it has no kind. Kinds are ${KINDS}.`,
      ]);
    }
  });

  test('a number that JSON reads as infinite', () => {
    expect(messages(file({ blocks: [] }).replace('[]', '[{"id":"K","kind":"gain","gain":1e999}]'))).toEqual([
      'bad-value: Gain K: "gain" is not a quantity: text or a finite number.',
    ]);
  });

  const SIZES = 'The matrices of n states, m inputs and p outputs are A n × n, B n × m, C p × n and D p × m.';
  const model = (A: unknown, B: unknown, C: unknown, D: unknown, initial?: unknown) =>
    sheet([{ id: 'M', kind: 'state-model', A, B, C, D, ...(initial === undefined ? {} : { initial }) }]);

  test('matrices that do not belong together', () => {
    expect(messages(model([['1', '2']], [['1']], [['1']], [['0']]))).toEqual([
      `bad-value: State model M: "A" has 2 entries in row 1 where the others ask for 1. ${SIZES}`,
    ]);
    expect(messages(model([['1']], [['1'], ['2']], [['1']], [['0']]))).toEqual([
      `bad-value: State model M: "B" has 2 rows where the others ask for 1. ${SIZES}`,
    ]);
    expect(messages(model([['1']], [['1']], [['1']], [['0'], ['0']]))).toEqual([
      `bad-value: State model M: "C" has 1 row where the others ask for 2. ${SIZES}`,
    ]);
    expect(messages(model([['1']], [['1']], [['1']], [['0', '0']]))).toEqual([
      `bad-value: State model M: "D" has 2 entries in row 1 where the others ask for 1. ${SIZES}`,
    ]);
    expect(messages(model([['1']], [['1']], [['1']], [['0']], ['1', '2']))).toEqual([
      'bad-value: State model M: "initial" has 2 values, the model has 1 state.',
    ]);
    expect(messages(model([['1']], '1', [['1']], [['0']]))).toEqual([
      'bad-value: State model M: "B" is not rows of quantities: [[...], ...].',
    ]);
    expect(messages(model([1], [['1']], [['1']], [['0']]))).toEqual([
      'bad-value: State model M: "A" is not a row of quantities: [...].',
    ]);
  });

  test('but a model without states, or with one side only, is none of them', () => {
    expect(readDiagram(model([], [], [[], []], [['1'], ['2']])).ok).toBe(true);
    expect(readDiagram(model([['1']], [[]], [], [])).ok).toBe(true);
    expect(readDiagram(model([['1']], [['1', '2']], [], [])).ok).toBe(true);
  });

  test('the parts of the document itself', () => {
    expect(messages(file({}))).toEqual(['bad-value: The diagram: "blocks" is not a list.']);
    expect(messages(file({ blocks: {} }))).toEqual(['bad-value: The diagram: "blocks" is not a list.']);
    expect(messages(file({ blocks: [], wires: {} }))).toEqual(['bad-value: The diagram: "wires" is not a list.']);
    expect(messages(file({ blocks: [], parameters: {} }))).toEqual([
      'bad-value: The diagram: "parameters" is not a list.',
    ]);
    expect(messages(file({ title: 1, notes: [], blocks: [] }))).toEqual([
      'bad-value: The diagram: "title" is not text.',
      'bad-value: The diagram: "notes" is not text.',
    ]);
  });

  test('parameters', () => {
    const parameters = [
      { name: 'k' },
      { value: '1' },
      'k',
      { name: 'm', value: {} },
      { name: 'a\nb', value: null },
      { name: 'j', value: '1', tolerance: [] },
    ];
    expect(messages(file({ blocks: [], parameters }))).toEqual([
      'bad-value: Parameter k: "value" is missing.',
      'bad-value: The parameter at place 2: "name" is missing.',
      'bad-value: The parameter at place 3: it is not an object: { ... }.',
      'bad-value: Parameter m: "value" is not a quantity: text or a finite number.',
      'bad-value: Parameter a b: "value" is not a quantity: text or a finite number.',
      'bad-value: Parameter j: "tolerance" is not an amount, such as "10 %" or "0.2".',
    ]);
  });

  test('wires', () => {
    const port = '["block id", port], ports counted from 0';
    const wires = [{}, { from: ['a', 0] }, { from: ['a', -1], to: ['a', 0] }, { from: ['a', 0.5], to: ['a', 0] }, 5];
    expect(messages(sheet([], [...wires, { from: ['a', 0], to: ['b', 0], via: [[1]] }]))).toEqual([
      'bad-value: The diagram, the wire at place 1: "from" is missing.',
      'bad-value: The diagram, the wire at place 2: "to" is missing.',
      `bad-value: The diagram, the wire at place 3: "from" is not ${port}.`,
      `bad-value: The diagram, the wire at place 4: "from" is not ${port}.`,
      'bad-value: The diagram, the wire at place 5: it is not an object: { ... }.',
      'bad-value: The diagram, the wire at place 6: "via" is not [x, y]: two numbers within ±1000000.',
    ]);
  });

  test('all of them at once, a hundred at most', () => {
    expect(
      messages(
        sheet([
          { id: 'a', kind: 'gain' },
          { id: 'b', kind: 'summer' },
        ]),
      ),
    ).toHaveLength(2);
    expect(messages(sheet(Array(500).fill({ id: 'a', kind: 'gain' })))).toHaveLength(100);
  });

  test('with the path of the block for the screen', () => {
    const inner = { blocks: [{ id: 'K', kind: 'gain' }], wires: [] };
    const result = readDiagram(sheet([{ id: 'S', kind: 'group', name: 'drive', sheet: inner }]));
    expect(result.ok ? [] : result.problems.map(({ blocks }) => blocks)).toEqual([['S.K']]);
  });
});
