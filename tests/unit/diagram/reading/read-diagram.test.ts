import { describe, expect, test } from 'vitest';
import { type Block, emptyDiagram, MAXIMUM_BYTES, readDiagram } from '../../../../src/diagram/index.ts';
import { problemsOf, valueOf } from '../../results.ts';

const file = (fields: object) => JSON.stringify({ format: 'poleward-diagram', version: 1, ...fields });
const sheet = (blocks: readonly unknown[], wires: readonly unknown[] = []) => file({ blocks, wires });
const messages = (text: string) => problemsOf(readDiagram(text));
const blocksNamed = (text: string) => {
  const result = readDiagram(text);
  return result.ok ? [] : result.problems.map(({ blocks }) => blocks);
};

describe('a file is read', () => {
  test('with nothing in it but an empty list of blocks', () => {
    expect(readDiagram(sheet([]))).toEqual({ ok: true, value: emptyDiagram() });
    expect(valueOf(readDiagram(file({ blocks: [] })))).toEqual(emptyDiagram());
  });

  test('with a byte order mark in front', () => {
    expect(readDiagram(`\uFEFF${sheet([])}`).ok).toBe(true);
  });

  test('with every field of every kind', () => {
    const blocks: readonly Block[] = [
      { id: 'u', kind: 'input', unit: 'N', at: [0, -20.5], name: 'force', mirrored: true, note: 'n' },
      { id: 'y', kind: 'output', unit: 'm' },
      { id: 'g', kind: 'gain', gain: 'k' },
      { id: 'a', kind: 'summer', signs: '+-+-+-+-+-+-+-+-' },
      { id: 'x', kind: 'integrator', initial: '1', unit: 'm' },
      { id: 'G', kind: 'transfer-function', numerator: '1', denominator: 's + 1' },
      { id: 'M', kind: 'state-model', A: [['1']], B: [['1', '2']], C: [['1']], D: [['0', '0']], initial: ['1'] },
      { id: 'd', kind: 'delay', time: '0.1', order: 10 },
      { id: 'D', kind: 'differentiator' },
      { id: 'l', kind: 'limiter', lower: '-1', upper: '1' },
      { id: 'S', kind: 'group', sheet: { blocks: [{ id: 'u', kind: 'input' }], wires: [] } },
    ];
    const wires = [{ from: ['u', 0], to: ['S', 0], name: 'f', via: [[1, 2]] }];
    const parameters = [{ name: 'k', value: '1', unit: 'm', tolerance: '10 %', note: 'n' }];
    const head = { title: 't', notes: 'n', revision: '2', date: 'd', author: 'a' };
    expect(valueOf(readDiagram(file({ ...head, parameters, blocks, wires })))).toEqual({
      format: 'poleward-diagram',
      version: 1,
      ...head,
      parameters,
      blocks,
      wires,
    });
  });

  test('with JSON numbers as their shortest decimals', () => {
    const blocks = [
      { id: 'g', kind: 'gain', gain: 0.1 },
      { id: 'h', kind: 'gain', gain: -1e21 },
      { id: 'M', kind: 'state-model', A: [[1]], B: [[-2.5]], C: [['c']], D: [[0]] },
    ];
    const parameters = [{ name: 'c', value: 1e-7, tolerance: 0.5 }];
    expect(valueOf(readDiagram(file({ parameters, blocks })))).toMatchObject({
      parameters: [{ value: '1e-7', tolerance: '0.5' }],
      blocks: [{ gain: '0.1' }, { gain: '-1e+21' }, { A: [['1']], B: [['-2.5']] }],
    });
  });

  test('without the fields that the format does not have', () => {
    const text = `{"format":"poleward-diagram","version":1,"extra":{"deep":[1]},"__proto__":{"polluted":1},
      "blocks":[{"id":"g","kind":"gain","gain":"1","numerator":"s","__proto__":{"polluted":1},"constructor":2}],
      "wires":[],"parameters":[{"name":"k","value":"1","color":"red"}]}`;
    const diagram = valueOf(readDiagram(text));
    expect(diagram.blocks).toEqual([{ id: 'g', kind: 'gain', gain: '1' }]);
    expect(diagram.parameters).toEqual([{ name: 'k', value: '1' }]);
    expect(Object.keys(diagram)).not.toContain('extra');
    expect(Object.getPrototypeOf(diagram.blocks[0])).toBe(Object.prototype);
    expect('polluted' in {}).toBe(false);
  });

  test('without the optional fields that say nothing', () => {
    const blank = { name: '', note: '', mirrored: false };
    const blocks = [
      { id: 'u', kind: 'input', unit: '', ...blank },
      { id: 'y', kind: 'output' },
    ];
    const wires = [{ from: ['u', 0], to: ['y', 0], name: '', via: [] }];
    expect(valueOf(readDiagram(file({ title: '', notes: '', blocks, wires })))).toEqual({
      ...emptyDiagram(),
      blocks: [
        { id: 'u', kind: 'input' },
        { id: 'y', kind: 'output' },
      ],
      wires: [{ from: ['u', 0], to: ['y', 0] }],
    });
  });

  test('with ids and names that every object has', () => {
    const ids = ['constructor', 'toString', 'hasOwnProperty', 'valueOf'];
    const blocks = ids.map(id => ({ id, kind: 'integrator', name: id === 'valueOf' ? '__proto__' : id }));
    const wires = ids.map(id => ({ from: [id, 0], to: [id, 0] }));
    const parameters = ids.map(name => ({ name, value: '1' }));
    const read = valueOf(readDiagram(file({ blocks, wires, parameters })));
    expect(read.blocks.map(({ id, name }) => [id, name])).toEqual(blocks.map(({ id, name }) => [id, name]));
  });

  test('with expressions that mean nothing yet', () => {
    expect(readDiagram(sheet([{ id: 'g', kind: 'gain', gain: '2 k' }])).ok).toBe(true);
  });
});

describe('text is refused', () => {
  test('that is no JSON', () => {
    for (const text of ['', 'hello', '{"format":', '[1,', '\uFEFF\uFEFF{}']) {
      expect(messages(text)).toEqual([
        'not-a-diagram: The text is not JSON, so it holds no diagram. Open a *.poleward.json file.',
      ]);
    }
  });

  test('that is JSON of something else', () => {
    for (const text of ['null', '1', '[]', '{}', '"poleward-diagram"', '{"format":"other","version":1}']) {
      expect(messages(text)).toEqual([
        'not-a-diagram: This is no Poleward diagram: its "format" is not "poleward-diagram". Open a *.poleward.json file.',
      ]);
    }
  });

  test('that has the format only by inheritance', () => {
    const text = '{"__proto__":{"format":"poleward-diagram","version":1,"blocks":[]}}';
    expect(messages(text)[0]).toMatch(/^not-a-diagram: /);
  });

  test('that is a model file', () => {
    expect(messages('{"format":"poleward-model","version":1}')).toEqual([
      'not-a-diagram: This is a model file, not a drawing. Open the *.poleward.json file it was made from.',
    ]);
  });

  test.each([
    ['2', 'version "2"'],
    ['"1"', 'version "1"'],
    ['null', 'no version'],
    ['[1]', 'no version'],
  ])('of version %s', (version, found) => {
    expect(messages(`{"format":"poleward-diagram","version":${version},"blocks":[]}`)).toEqual([
      `wrong-version: The diagram has ${found}, this program reads version 1. Open it with a newer program.`,
    ]);
  });

  test('of more than 4 MiB, counted in bytes', () => {
    const padded = (letter: string, bytes: number) => {
      const [head, tail] = ['{"format":"poleward-diagram","version":1,"blocks":[],"notes":"', '"}'];
      const width = new TextEncoder().encode(letter).length;
      const room = bytes - head.length - tail.length;
      return head + letter.repeat(Math.floor(room / width)) + 'a'.repeat(room % width) + tail;
    };
    for (const letter of ['a', 'é', '√', '😀']) {
      const text = padded(letter, MAXIMUM_BYTES);
      expect(new TextEncoder().encode(text).length).toBe(MAXIMUM_BYTES);
      expect(readDiagram(text).ok).toBe(true);
      expect(messages(`${text} `)).toEqual([
        'too-large: The diagram is larger than 4 MiB. Split it into several drawings.',
      ]);
    }
  });

  test('nested so deep that a parser would run out of stack', () => {
    const expected = ['too-large: The text is nested more than 128 deep. Groups go 32 deep, so this is no diagram.'];
    expect(messages('['.repeat(1_000_000))).toEqual(expected);
    expect(messages(`${'{"a":'.repeat(200_000)}1${'}'.repeat(200_000)}`)).toEqual(expected);
    expect(messages(`{"format":"poleward-diagram","version":1,"x":${'['.repeat(128)}${']'.repeat(128)}}`)).toEqual(
      expected,
    );
    expect(readDiagram(file({ blocks: [], x: JSON.parse(`${'['.repeat(127)}${']'.repeat(127)}`) })).ok).toBe(true);
  });

  test('but brackets inside a string are no nesting', () => {
    expect(readDiagram(file({ blocks: [], notes: `\\"${'['.repeat(500)}\\` })).ok).toBe(true);
  });

  const groups = (depth: number): object =>
    depth === 0 ? { blocks: [], wires: [] } : { blocks: [{ id: 'g', kind: 'group', sheet: groups(depth - 1) }] };

  test('with groups more than 32 deep', () => {
    expect(readDiagram(file(groups(32))).ok).toBe(true);
    const path = Array(33).fill('g').join('.');
    expect(messages(file(groups(33)))).toEqual([
      `too-large: Group ${path}: it stands inside 32 other groups, which is as deep as they go. Open up one of them.`,
    ]);
  });

  test('with more than 20,000 blocks, those in groups counted', () => {
    const many = (count: number) => Array.from({ length: count }, (_, i) => ({ id: `g${i}`, kind: 'differentiator' }));
    const inGroup = (count: number) => [{ id: 'S', kind: 'group', sheet: { blocks: many(10_000) } }, ...many(count)];
    expect(readDiagram(sheet(inGroup(9_999))).ok).toBe(true);
    expect(messages(sheet(inGroup(10_000)))).toEqual(['too-large: The diagram has more than 20000 blocks. Split it.']);
    expect(messages(sheet(many(20_001)))).toEqual(['too-large: The diagram has more than 20000 blocks. Split it.']);
  });

  test('with more than 5,000 parameters', () => {
    const parameters = Array.from({ length: 5001 }, (_, i) => ({ name: `p${i}`, value: '1' }));
    expect(readDiagram(file({ blocks: [], parameters: parameters.slice(1) })).ok).toBe(true);
    expect(messages(file({ blocks: [], parameters }))).toEqual([
      'too-large: The diagram has 5001 parameters, 5000 at most are read.',
    ]);
  });
});

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
    expect(blocksNamed(sheet([{ id: 'S', kind: 'group', name: 'drive', sheet: inner }]))).toEqual([['S.K']]);
  });
});

describe('parts that do not fit together are refused', () => {
  const integrator = (id: string, name?: string) => ({
    id,
    kind: 'integrator',
    ...(name === undefined ? {} : { name }),
  });
  const group = (id: string, blocks: readonly unknown[], wires: readonly unknown[] = [], name?: string) => ({
    id,
    kind: 'group',
    ...(name === undefined ? {} : { name }),
    sheet: { blocks, wires },
  });
  const wire = (from: string, output: number, to: string, input: number) => ({ from: [from, output], to: [to, input] });

  test('an id twice on a sheet', () => {
    expect(messages(sheet([integrator('x'), { id: 'x', kind: 'differentiator' }]))).toEqual([
      'duplicate-id: More than one block on the sheet has the id x. Give each an id of its own.',
    ]);
    expect(messages(sheet([group('S', [integrator('x'), integrator('x'), integrator('x')])]))).toEqual([
      'duplicate-id: More than one block in group S has the id x. Give each an id of its own.',
    ]);
  });

  test('but one id on two sheets is no clash', () => {
    expect(readDiagram(sheet([integrator('x'), group('S', [integrator('x')])])).ok).toBe(true);
  });

  test('two states of one name', () => {
    const result = readDiagram(sheet([integrator('a', 'x'), integrator('x')]));
    expect(problemsOf(result)).toEqual([
      'duplicate-name: Two states have the name x: integrator x (a) and integrator x (x). Rename one.',
    ]);
    expect(result.ok ? [] : result.problems[0]?.blocks).toEqual(['a', 'x']);
  });

  test('two states of one name by way of groups', () => {
    const blocks = [group('S', [integrator('x')], [], 'g'), group('T', [integrator('x')], [], 'g')];
    expect(messages(sheet(blocks))).toEqual([
      'duplicate-name: Two states have the name g.x: integrator g.x (S.x) and integrator g.x (T.x). Rename one.',
    ]);
    expect(messages(sheet([integrator('a', 'g.x'), group('g', [integrator('x')])]))).toEqual([
      'duplicate-name: Two states have the name g.x: integrator g.x (a) and integrator g.x (g.x). Rename one.',
    ]);
  });

  test('a state with the name of one of a state model’s or a dead time’s', () => {
    const model = { id: 'M', kind: 'state-model', A: [['1']], B: [['1']], C: [['1']], D: [['0']] };
    expect(messages(sheet([integrator('M_1'), model]))).toEqual([
      'duplicate-name: Two states have the name M_1: integrator M_1 (M_1) and state model M (M). Rename one.',
    ]);
    const delay = { id: 'd', kind: 'delay', time: '1' };
    expect(messages(sheet([delay, integrator('d_2')]))).toEqual([
      'duplicate-name: Two states have the name d_2: dead time d (d) and integrator d_2 (d_2). Rename one.',
    ]);
    expect(readDiagram(sheet([delay, integrator('d_3')])).ok).toBe(true);
  });

  test('two inputs or two outputs of one name', () => {
    const io = (kind: string) => [
      { id: 'a', kind, name: 'z' },
      { id: 'z', kind },
    ];
    expect(messages(sheet(io('input')))).toEqual([
      'duplicate-name: Two inputs have the name z: input z (a) and input z (z). Rename one.',
    ]);
    expect(messages(sheet(io('output')))).toEqual([
      'duplicate-name: Two outputs have the name z: output z (a) and output z (z). Rename one.',
    ]);
    expect(messages(sheet([group('S', io('input'))]))).toEqual([
      'duplicate-name: Two inputs have the name S.z: input S.z (S.a) and input S.z (S.z). Rename one.',
    ]);
  });

  test('but a state, an input and an output may share one', () => {
    const blocks = [
      { id: 'a', kind: 'input', name: 'z' },
      { id: 'b', kind: 'output', name: 'z' },
      { id: 'c', kind: 'integrator', name: 'z' },
      { id: 'd', kind: 'gain', gain: '1', name: 'z' },
    ];
    expect(readDiagram(sheet(blocks)).ok).toBe(true);
  });

  test('parameters of one name, or of a name that is none', () => {
    const parameters = ['k', 's', '2x', 'k', '', 'sin', 'k', 'pi'].map(name => ({ name, value: '1' }));
    const illegal = 'A parameter’s name begins with a letter and has letters, digits and underscores only.';
    const result = readDiagram(file({ blocks: [], parameters }));
    expect(problemsOf(result)).toEqual([
      'bad-value: Parameter s: s is the Laplace variable. Choose another name.',
      `bad-value: Parameter 2x: ${illegal}`,
      'duplicate-name: Parameter k: it is defined more than once. Keep one of the definitions.',
      `bad-value: Parameter without a name: ${illegal}`,
      'bad-value: Parameter sin: sin is a function. Choose another name.',
      'bad-value: Parameter pi: pi is a constant. Choose another name.',
    ]);
    expect(result.ok ? [] : result.problems[2]?.parameter).toBe('k');
  });

  test('a wire to or from a block that is not there', () => {
    const result = readDiagram(sheet([integrator('x')], [wire('y', 0, 'x', 0), wire('x', 0, 'a\tb', 1)]));
    expect(problemsOf(result)).toEqual([
      'missing-block: The wire from y (output 0) to x (input 0): there is no block y on the sheet. Correct the id.',
      'missing-block: The wire from x (output 0) to a b (input 1): there is no block a b on the sheet. Correct the id.',
    ]);
    expect(messages(sheet([integrator('x'), group('S', [], [wire('x', 0, 'x', 0)])]))).toEqual([
      'missing-block: The wire from x (output 0) to x (input 0): there is no block x in group S. Correct the id.',
      'missing-block: The wire from x (output 0) to x (input 0): there is no block x in group S. Correct the id.',
    ]);
  });

  test('a wire to or from a port that is not there', () => {
    const blocks = [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '+-' },
      { id: 'y', kind: 'output' },
      group('S', [{ id: 'u', kind: 'input' }]),
    ];
    const wires = [
      wire('u', 1, 'e', 0),
      wire('e', 0, 'e', 2),
      wire('y', 0, 'y', 0),
      wire('e', 0, 'u', 0),
      wire('S', 0, 'S', 1),
    ];
    const result = readDiagram(sheet(blocks, wires));
    expect(problemsOf(result)).toEqual([
      'missing-port: The wire from u (output 1) to e (input 0): Input u has one output, number 0. Join another port.',
      'missing-port: The wire from e (output 0) to e (input 2): Summing point e has 2 inputs, numbers 0 to 1. Join another port.',
      'missing-port: The wire from y (output 0) to y (input 0): Output y has no output. Join another port.',
      'missing-port: The wire from e (output 0) to u (input 0): Input u has no input. Join another port.',
      'missing-port: The wire from S (output 0) to S (input 1): Group S has no output. Join another port.',
      'missing-port: The wire from S (output 0) to S (input 1): Group S has one input, number 0. Join another port.',
    ]);
    expect(result.ok ? [] : result.problems[0]?.blocks).toEqual(['u']);
  });

  test('two wires to one input port', () => {
    const blocks = [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '++' },
    ];
    expect(messages(sheet(blocks, [wire('u', 0, 'e', 1), wire('u', 0, 'e', 0), wire('u', 0, 'e', 1)]))).toEqual([
      'port-taken: Summing point e: more than one wire leads to its input 1. Keep one of them.',
    ]);
  });

  test('all of them at once', () => {
    expect(
      messages(sheet([integrator('x'), integrator('x')], [wire('x', 0, 'z', 0), wire('x', 5, 'x', 0)])),
    ).toHaveLength(3);
  });
});
