import { describe, expect, test } from 'vitest';
import { type Diagram, isSameModel, startingDrawing } from '../../../src/diagram/index.ts';

const START = startingDrawing();
const withBlock = (id: string, fields: object): Diagram => ({
  ...START,
  blocks: START.blocks.map(block => (block.id === id ? { ...block, ...fields } : block)),
});
const inGroup = (fields: object): Diagram => ({
  ...START,
  blocks: [
    ...START.blocks,
    { id: 'S', kind: 'group', sheet: { blocks: [{ id: 'x', kind: 'integrator', ...fields }], wires: [] } },
  ],
});

describe('two documents have the same model', () => {
  test.each<readonly [string, Diagram]>([
    ['a block was moved', withBlock('e', { at: [0, 0] })],
    ['a block was mirrored', withBlock('e', { mirrored: true })],
    ['a note was written', withBlock('e', { note: 'here' })],
    ['a wire was bent', { ...START, wires: START.wires.map(wire => ({ ...wire, via: [[1, 1]], name: 'w' })) }],
    ['the notes were changed', { ...START, notes: 'other', date: 'today' }],
    ['a parameter was explained', { ...START, parameters: START.parameters.map(p => ({ ...p, note: 'n' })) }],
    ['everything was copied', JSON.parse(JSON.stringify(START))],
  ])('where %s', (_, other) => {
    expect(isSameModel(START, other)).toBe(true);
  });

  test('where a block in a group was moved', () => {
    expect(isSameModel(inGroup({}), inGroup({ at: [1, 1] }))).toBe(true);
  });
});

describe('two documents have different models', () => {
  test.each<readonly [string, Diagram]>([
    ['the title was changed', { ...START, title: 'other' }],
    ['a gain was changed', withBlock('line', { gain: '2*k' })],
    ['a block was renamed', withBlock('omega', { name: 'w' })],
    ['a unit was changed', withBlock('omega', { unit: '1/s' })],
    ['a block is gone', { ...START, blocks: START.blocks.slice(1) }],
    ['the order of states was changed', { ...START, blocks: [...START.blocks].reverse() }],
    ['a wire is gone', { ...START, wires: START.wires.slice(1) }],
    [
      'a wire leads elsewhere',
      { ...START, wires: START.wires.map((w, i) => (i === 0 ? { ...w, to: ['e', 1] as const } : w)) },
    ],
    ['a value was changed', { ...START, parameters: START.parameters.map(p => ({ ...p, value: '1' })) }],
    ['a tolerance was given', { ...START, parameters: START.parameters.map(p => ({ ...p, tolerance: '1 %' })) }],
  ])('where %s', (_, other) => {
    expect(isSameModel(START, other)).toBe(false);
  });

  test('where a block in a group was changed', () => {
    expect(isSameModel(inGroup({}), inGroup({ initial: '1' }))).toBe(false);
  });
});
