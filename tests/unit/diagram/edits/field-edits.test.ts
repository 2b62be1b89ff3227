import { describe, expect, test } from 'vitest';
import { type Block, type Diagram, type Edit, emptyDiagram } from '../../../../src/diagram/index.ts';
import { changesNothing, edited, refusals } from './try-edit.ts';

const BLOCKS: readonly Block[] = [
  { id: 'u', kind: 'input' },
  { id: 'K', kind: 'gain', gain: '2' },
  { id: 'e', kind: 'summer', signs: '+--' },
  { id: 'x', kind: 'integrator', initial: '1' },
  { id: 'G', kind: 'transfer-function', numerator: '1', denominator: 's' },
  { id: 'd', kind: 'delay', time: '1' },
  { id: 'l', kind: 'limiter', lower: '-1', upper: '1' },
  {
    id: 'M',
    kind: 'state-model',
    A: [['1']],
    B: [['1', '1']],
    C: [['1'], ['1']],
    D: [
      ['0', '0'],
      ['0', '0'],
    ],
  },
];
const DRAWING: Diagram = {
  ...emptyDiagram(),
  blocks: BLOCKS,
  wires: [
    { from: ['u', 0], to: ['e', 0] },
    { from: ['u', 0], to: ['e', 2] },
    { from: ['u', 0], to: ['M', 0] },
    { from: ['u', 0], to: ['M', 1] },
    { from: ['M', 1], to: ['e', 1] },
  ],
};
const set = (id: string, field: string, value: string): Edit => ({ kind: 'setField', id, field, value });
const blockOf = (diagram: Diagram, id: string) => diagram.blocks.find(block => block.id === id);

describe('setting a field', () => {
  test.each<readonly [string, string, string, object]>([
    ['u', 'unit', 'N', { unit: 'N' }],
    ['K', 'gain', ' 3*k ', { gain: '3*k' }],
    ['K', 'gain', '', { gain: '' }],
    ['K', 'note', 'from the data sheet', { note: 'from the data sheet' }],
    ['x', 'initial', '2', { initial: '2' }],
    ['G', 'numerator', 's + 1', { numerator: 's + 1' }],
    ['G', 'denominator', 's^2', { denominator: 's^2' }],
    ['d', 'time', '0.1', { time: '0.1' }],
    ['d', 'order', '5', { order: 5 }],
    ['l', 'lower', '-2', { lower: '-2' }],
    ['l', 'upper', '2', { upper: '2' }],
  ])('%s: %s to "%s"', (id, field, value, expected) => {
    const after = edited(DRAWING, set(id, field, value));
    expect(blockOf(after, id)).toEqual({ ...blockOf(DRAWING, id), ...expected });
    expect(after.wires).toEqual(DRAWING.wires);
    expect(changesNothing(after, set(id, field, value))).toBe(true);
  });

  test('blank takes an optional one away', () => {
    expect(blockOf(edited(DRAWING, set('x', 'initial', ' ')), 'x')).toEqual({ id: 'x', kind: 'integrator' });
    expect(changesNothing(DRAWING, set('d', 'order', ''))).toBe(true);
    const five = edited(DRAWING, set('d', 'order', '5'));
    expect(edited(five, set('d', 'order', ''))).toEqual(DRAWING);
  });

  test('to fewer signs cuts the wires at the ports that are gone', () => {
    const after = edited(DRAWING, set('e', 'signs', '-+'));
    expect(blockOf(after, 'e')).toMatchObject({ signs: '-+' });
    expect(after.wires.map(({ to }) => to.join())).toEqual(['e,0', 'M,0', 'M,1', 'e,1']);
  });

  test.each([
    ['e', 'signs', '+*', 'bad-value: Summing point e: "signs" is not a string of 16 + and - at most, one at least.'],
    ['e', 'signs', '', 'bad-value: Summing point e: "signs" is not a string of 16 + and - at most, one at least.'],
    ['d', 'order', '0', 'bad-value: Dead time d: "order" is not a whole number from 1 to 10.'],
    ['d', 'order', '11', 'bad-value: Dead time d: "order" is not a whole number from 1 to 10.'],
    ['d', 'order', 'two', 'bad-value: Dead time d: "order" is not a whole number from 1 to 10.'],
    ['K', 'initial', '1', 'bad-value: Gain K has no field "initial".'],
    ['K', 'kind', 'input', 'bad-value: Gain K has no field "kind".'],
    ['K', 'id', 'L', 'bad-value: Gain K has no field "id".'],
    ['K', 'constructor', '1', 'bad-value: Gain K has no field "constructor".'],
    ['z', 'gain', '1', 'missing-block: There is no block z on this sheet. Choose one that is there.'],
  ])('%s: %s to "%s" is refused', (id, field, value, message) => {
    expect(refusals(DRAWING, set(id, field, value))).toEqual([message]);
  });

  test('to an order that brings a name twice is refused', () => {
    const two = edited(DRAWING, { kind: 'addBlock', block: { id: 'd_3', kind: 'integrator' } });
    expect(refusals(two, set('d', 'order', '3'))).toEqual([
      'duplicate-name: Two states have the name d_3: dead time d (d) and integrator d_3 (d_3). Rename one.',
    ]);
  });
});

describe('setting matrices', () => {
  test('cuts the wires at inputs and outputs that are gone', () => {
    const matrices = {
      A: [
        ['1', '0'],
        ['0', '1'],
      ],
      B: [['1'], ['1']],
      C: [['1', '0']],
      D: [['0']],
      initial: ['0', '1'],
    };
    const after = edited(DRAWING, { kind: 'setMatrices', id: 'M', ...matrices });
    expect(blockOf(after, 'M')).toEqual({ id: 'M', kind: 'state-model', ...matrices });
    expect(after.wires.map(({ to }) => to.join())).toEqual(['e,0', 'e,2', 'M,0']);
  });

  test('to what they are is no change', () => {
    const same = {
      A: [['1']],
      B: [['1', '1']],
      C: [['1'], ['1']],
      D: [
        ['0', '0'],
        ['0', '0'],
      ],
    };
    expect(changesNothing(DRAWING, { kind: 'setMatrices', id: 'M', ...same })).toBe(true);
    expect(changesNothing(DRAWING, { kind: 'setMatrices', id: 'M', ...same, initial: ['0'] })).toBe(false);
  });

  test('that do not belong together is refused', () => {
    expect(refusals(DRAWING, { kind: 'setMatrices', id: 'M', A: [['1']], B: [], C: [], D: [] })[0]).toMatch(
      /^bad-value: State model M: "B" has 0 rows where the others ask for 1\./,
    );
    expect(refusals(DRAWING, { kind: 'setMatrices', id: 'K', A: [], B: [], C: [], D: [] })).toEqual([
      'bad-value: Gain K has no matrices.',
    ]);
  });
});
