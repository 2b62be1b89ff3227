import { describe, expect, test } from 'vitest';
import { blockDrawing, holdsState, type Shape, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import type { Block } from '../../../../src/diagram/types.ts';

function drawn(block: Block, value?: string): readonly Shape[] {
  const geometry = sheetGeometry({ blocks: [block], wires: [] }).get(block.id);
  if (geometry === undefined) throw new Error('no geometry');
  return blockDrawing(block, geometry, value);
}

function texts(shapes: readonly Shape[]): readonly string[] {
  return shapes.flatMap(shape => (shape.kind === 'text' ? [shape.spans.map(({ text }) => text).join('')] : []));
}

const delay = (time: string): Block => ({ id: 'pipe', kind: 'delay', time });

describe('what a block is drawn of', () => {
  test('an integrator is 1 over s in a heavy frame, its state named over the wire that leaves', () => {
    const shapes = drawn({ id: 'q', kind: 'integrator' });
    expect(shapes[0]).toMatchObject({ kind: 'rectangle', ink: 'state' });
    expect(texts(shapes)).toEqual(['1', 's', 'q']);
  });

  test('a gain is its coefficient, with its number underneath where one is given', () => {
    const gain: Block = { id: 'k', kind: 'gain', gain: 'K_p' };
    expect(texts(drawn(gain))).toEqual(['Kp']);
    expect(texts(drawn(gain, '-0.5'))).toEqual(['Kp', '−0.5']);
  });

  test('a plain number has no second number underneath', () => {
    expect(texts(drawn({ id: 'k', kind: 'gain', gain: '2.5' }, '2.5'))).toEqual(['2.5']);
  });

  test('a summing point is a circle with its signs beside it', () => {
    const shapes = drawn({ id: 'e', kind: 'summer', signs: '+-' });
    expect(shapes[0]).toMatchObject({ kind: 'circle', radius: 14, ink: 'line' });
    expect(texts(shapes)).toEqual(['+', '−']);
  });

  test('a terminal is an open circle with name and unit', () => {
    const shapes = drawn({ id: 'r', kind: 'input', unit: 'N' });
    expect(shapes[0]).toMatchObject({ kind: 'circle', radius: 4 });
    expect(texts(shapes)).toEqual(['r', 'N']);
  });

  test.each([
    ['T', 'e−sT'],
    ['0.5', 'e−0.5s'],
    ['2*T', 'e−2\u2009Ts'],
    ['T_1 + T_2', 'e−s(T1 + T2)'],
  ])('a dead time of %s is the exponential %s', (time, expected) => {
    expect(texts(drawn(delay(time)))[0]).toBe(expected);
  });

  test('a transfer function over 1 has no fraction bar', () => {
    const over = (denominator: string): Block => ({
      id: 'g',
      kind: 'transfer-function',
      numerator: 's + 2',
      denominator,
    });
    expect(drawn(over('1')).filter(({ kind }) => kind === 'line')).toEqual([]);
    expect(drawn(over('s + 5')).filter(({ kind }) => kind === 'line')).toHaveLength(1);
  });

  test('a group is titled and names its ports', () => {
    const sheet = { blocks: [{ id: 'a', kind: 'input' } as const, { id: 'b', kind: 'output' } as const], wires: [] };
    expect(texts(drawn({ id: 'g', name: 'drive', kind: 'group', sheet }))).toEqual(['drive', 'a', 'b']);
  });
});

describe('a heavy frame', () => {
  test.each<[string, Block, boolean]>([
    [
      'a transfer function with s below',
      { id: 'g', kind: 'transfer-function', numerator: '1', denominator: 'tau*s + 1' },
      true,
    ],
    [
      'a transfer function with a parameter s1 below',
      { id: 'g', kind: 'transfer-function', numerator: 's', denominator: 's1' },
      false,
    ],
    ['a dead time', delay('T'), true],
    ['a differentiator', { id: 'd', kind: 'differentiator' }, false],
    ['a limiter', { id: 'l', kind: 'limiter', lower: '-1', upper: '1' }, false],
    [
      'a group around an integrator',
      { id: 'o', kind: 'group', sheet: { blocks: [{ id: 'x', kind: 'integrator' }], wires: [] } },
      true,
    ],
    [
      'a group around a gain',
      { id: 'o', kind: 'group', sheet: { blocks: [{ id: 'x', kind: 'gain', gain: '1' }], wires: [] } },
      false,
    ],
  ])('says whether %s holds a state', (_, block, expected) => {
    expect(holdsState(block)).toBe(expected);
  });
});
