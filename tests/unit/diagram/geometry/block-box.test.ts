import { describe, expect, test } from 'vitest';
import { blockBox, blockOutline, textWidth } from '../../../../src/diagram/geometry/index.ts';
import type { Block, GroupBlock } from '../../../../src/diagram/types.ts';
import { inlineMath } from '../../../../src/expression/index.ts';

const gain = (text: string): Block => ({ id: 'k', kind: 'gain', gain: text });
const ones = (rows: number, columns: number): string[][] =>
  Array.from({ length: rows }, () => Array.from({ length: columns }, () => '1'));
const stateModel = (inputs: number, outputs: number): Block => ({
  id: 'm',
  kind: 'state-model',
  A: ones(1, 1),
  B: ones(1, inputs),
  C: ones(outputs, 1),
  D: ones(outputs, inputs),
});

describe('the size of a block', () => {
  test('is three squares by two for a short coefficient', () => {
    expect(blockBox(gain('2'))).toEqual({ width: 60, height: 40 });
  });

  test('is two squares by two for an integrator', () => {
    expect(blockBox({ id: 'x', kind: 'integrator' })).toEqual({ width: 40, height: 40 });
  });

  test.each(['2', '1/J', 'A_3/(A_1*T_3)', '(M + m)*g/(M*l)', '-12753576', '2 k'])('holds the coefficient %s', text => {
    const { width } = blockBox(gain(text));
    expect(width % 20).toBe(0);
    expect(width).toBeGreaterThan(Math.min(textWidth(inlineMath(text), 17, 'math'), 120));
  });

  test('ends where a coefficient is cut', () => {
    const long = Array.from({ length: 60 }, (_, index) => `k_${index}`).join(' + ');
    expect(blockBox(gain(long)).width).toBe(200);
  });

  test('grows upwards and downwards with a state model that has many ports', () => {
    expect(blockBox(stateModel(1, 1)).height).toBe(60);
    expect(blockBox(stateModel(4, 1)).height).toBe(140);
    expect(blockBox(stateModel(2, 9)).height).toBe(180);
  });

  test('leaves a group room for its title and the names of its ports', () => {
    const inner: Block[] = [
      { id: 'command', kind: 'input' },
      { id: 'load', kind: 'input' },
      { id: 'speed', kind: 'output' },
    ];
    const group: GroupBlock = { id: 'drive', kind: 'group', sheet: { blocks: inner, wires: [] } };
    const { width, height } = blockBox(group);
    expect(height).toBe(100);
    expect(width % 20).toBe(0);
    expect(width).toBeGreaterThanOrEqual(100);
    expect(blockBox({ ...group, name: 'a much longer title of a group' }).width).toBeGreaterThan(width);
  });
});

describe('the outline of a summing point', () => {
  test.each([1, 2, 3])('is a circle for %i inputs', inputs => {
    const block: Block = { id: 'e', kind: 'summer', signs: '+'.repeat(inputs) };
    expect(blockOutline(block)).toBe('circle');
    expect(blockBox(block)).toEqual({ width: 28, height: 28 });
  });

  test.each([
    [4, 108],
    [5, 108],
    [16, 348],
  ])('is upright for %i inputs, tall enough for one to a square', (inputs, height) => {
    const block: Block = { id: 'e', kind: 'summer', signs: '-'.repeat(inputs) };
    expect(blockOutline(block)).toBe('stadium');
    expect(blockBox(block)).toEqual({ width: 28, height });
  });
});
