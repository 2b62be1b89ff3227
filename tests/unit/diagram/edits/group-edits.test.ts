import { describe, expect, test } from 'vitest';
import { type Block, type Diagram, type Edit, editDiagram } from '../../../../src/diagram/index.ts';
import { draw, gain, group, input, integrator, output, sheet, sum } from '../../../arbitraries/draw.ts';

const placed = (block: Block, x: number, y: number): Block => ({ ...block, at: [x, y] });

/** r → e → k → x → y with x fed back; k and x are folded. */
const loop = draw(
  [
    placed(input('r'), 0, 100),
    placed(sum('e', '+-'), 100, 100),
    placed(gain('k', '2'), 200, 100),
    placed(integrator('x'), 300, 100),
    placed(output('y'), 400, 100),
  ],
  ['r -> e', 'e -> k', 'k -> x', 'x -> y', 'x -> e:1'],
);

function edited(diagram: Diagram, edit: Edit): Diagram {
  const result = editDiagram(diagram, edit);
  if (!result.ok) throw new Error(result.problems[0]?.message);
  return result.value;
}

function refusal(diagram: Diagram, edit: Edit): string {
  const result = editDiagram(diagram, edit);
  return result.ok ? '' : (result.problems[0]?.message ?? '');
}

const folded = edited(loop, { kind: 'foldBlocks', ids: ['k', 'x'], name: 'plant' });

describe('folding', () => {
  test('puts a group where the blocks stood, one port for each signal that crosses its border', () => {
    expect(folded.blocks.map(({ id, kind }) => `${id} ${kind}`)).toEqual([
      'r input',
      'e summer',
      'plant group',
      'y output',
    ]);
    expect(folded.blocks[2]?.at).toEqual([260, 100]);
    expect(folded.wires.map(({ from, to }) => `${from.join(':')} ${to.join(':')}`)).toEqual([
      'r:0 e:0',
      'e:0 plant:0',
      'plant:0 y:0',
      'plant:0 e:1',
    ]);
  });

  test('gives the group’s sheet terminals with the names of the signals', () => {
    const inner = folded.blocks[2];
    if (inner?.kind !== 'group') throw new Error('no group');
    expect(inner.sheet.blocks.map(({ id, kind, name }) => [id, kind, name])).toEqual([
      ['e', 'input', undefined],
      ['k', 'gain', undefined],
      ['x', 'integrator', undefined],
      ['x2', 'output', 'x'],
    ]);
  });

  test('of inputs and outputs, of nothing, and of what is not there is refused', () => {
    expect(refusal(loop, { kind: 'foldBlocks', ids: ['r', 'k'] })).toBe(
      'Input r: inputs and outputs of a sheet stay outside a group. Leave it out.',
    );
    expect(refusal(loop, { kind: 'foldBlocks', ids: [] })).toBe(
      'Choose the blocks that are to be folded into a group.',
    );
    expect(refusal(loop, { kind: 'foldBlocks', ids: ['q'] })).toBe(
      'There is no block q on this sheet. Choose one that is there.',
    );
  });
});

describe('unfolding', () => {
  test('gives the blocks and wires back, where the group stands', () => {
    const back = edited(folded, { kind: 'unfoldGroup', id: 'plant' });
    expect(back.blocks.map(({ id, at }) => [id, at])).toEqual(
      loop.blocks.map(({ id, at }) => [id, at === undefined ? at : id === 'k' || id === 'x' ? [at[0], at[1]] : at]),
    );
    const ends = (diagram: Diagram) => diagram.wires.map(({ from, to }) => `${from} ${to}`).sort();
    expect(ends(back)).toEqual(ends(loop));
  });

  test('keeps the group’s prefix where the name is taken outside', () => {
    const drawing = draw([integrator('x'), group('g', sheet([integrator('x')], []))], []);
    const back = edited(drawing, { kind: 'unfoldGroup', id: 'g' });
    expect(back.blocks.map(({ id, name }) => [id, name])).toEqual([
      ['x', undefined],
      ['x2', 'g.x'],
    ]);
  });

  test('of what is no group, and of one that feeds itself straight through, is refused', () => {
    expect(refusal(loop, { kind: 'unfoldGroup', id: 'k' })).toBe('Gain k is no group. Only a group can be unfolded.');
    const through = sheet([input('a'), output('b')], ['a -> b']);
    expect(refusal(draw([group('g', through)], ['g -> g']), { kind: 'unfoldGroup', id: 'g' })).toBe(
      'Group g: a signal goes straight through it and back into it, which no wire can do. Break that loop first.',
    );
  });
});
