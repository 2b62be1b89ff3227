import { describe, expect, test } from 'vitest';
import { type Block, type Diagram, type Edit, editDiagram, freshId, freshName } from '../../../../src/diagram/index.ts';
import { DRAWING, GROUP } from './small-drawing.ts';
import { changesNothing, edited, refusals } from './try-edit.ts';

const ids = (diagram: Diagram) => diagram.blocks.map(({ id }) => id);
const blockOf = (diagram: Diagram, id: string) => diagram.blocks.find(block => block.id === id);
const ends = (diagram: Diagram) => diagram.wires.map(({ from, to }) => `${from.join(':')} ${to.join(':')}`);

describe('adding a block', () => {
  const block: Block = { id: 'z', kind: 'integrator', at: [0, 100] };

  test('puts it last and leaves the rest itself', () => {
    const after = edited(DRAWING, { kind: 'addBlock', block });
    expect(ids(after)).toEqual([...ids(DRAWING), 'z']);
    expect(blockOf(after, 'z')).toEqual(block);
    const direct = editDiagram(DRAWING, { kind: 'addBlock', block });
    expect(direct.ok && direct.value.wires).toBe(DRAWING.wires);
    expect(direct.ok && direct.value.blocks[0]).toBe(DRAWING.blocks[0]);
  });

  test('on a group’s sheet gives the group its port', () => {
    const after = edited(DRAWING, { kind: 'addBlock', at: ['S'], block: { id: 'c', kind: 'input' } });
    const group = blockOf(after, 'S');
    expect(group?.kind === 'group' && group.sheet.blocks.at(-1)).toEqual({ id: 'c', kind: 'input' });
    expect(ends(after)).toEqual(ends(DRAWING));
  });

  test('is refused where its id, its name or a field is no good', () => {
    expect(refusals(DRAWING, { kind: 'addBlock', block: { id: 'x', kind: 'differentiator' } })).toEqual([
      'duplicate-id: Differentiator x: the sheet has a block with the id x. Choose another id.',
    ]);
    expect(refusals(DRAWING, { kind: 'addBlock', block: { ...block, name: 'x' } })).toEqual([
      'duplicate-name: Two states have the name x: integrator x (x) and integrator x (z). Rename one.',
    ]);
    expect(refusals(DRAWING, { kind: 'addBlock', block: { ...block, at: [1e9, 0] } })).toEqual([
      'bad-value: Integrator z: "at" is not [x, y]: two numbers within ±1000000.',
    ]);
    expect(refusals(DRAWING, { kind: 'addBlock', block: { ...block, id: '2z' } })).toEqual([
      'bad-value: Integrator 2z: "id" is not an id: a letter, then letters, digits and underscores.',
    ]);
  });

  test('is refused beyond 20,000 blocks and beyond 32 groups', () => {
    const many = Array.from({ length: 19_995 }, (_, i): Block => ({ id: `d${i}`, kind: 'differentiator' }));
    const full: Diagram = { ...DRAWING, blocks: [...many, ...DRAWING.blocks.slice(0, 5)] };
    expect(refusals(full, { kind: 'addBlock', block })).toEqual([
      'too-large: A drawing has at most 20000 blocks. Remove some first.',
    ]);
    const nest = (depth: number): Block => ({
      id: 'n',
      kind: 'group',
      sheet: { blocks: depth > 1 ? [nest(depth - 1)] : [], wires: [] },
    });
    expect(edited(DRAWING, { kind: 'addBlock', at: ['S'], block: nest(31) }).blocks).toHaveLength(6);
    expect(refusals(DRAWING, { kind: 'addBlock', at: ['S'], block: nest(32) })).toEqual([
      'too-large: Groups go 32 deep at most. Put it on a sheet further up.',
    ]);
  });

  test('is refused on a sheet that is gone', () => {
    expect(refusals(DRAWING, { kind: 'addBlock', at: ['S', 'T'], block })).toEqual([
      'missing-block: There is no group T here any more. Go up a sheet.',
    ]);
    expect(refusals(DRAWING, { kind: 'addBlock', at: ['K'], block })).toEqual([
      'missing-block: There is no group K here any more. Go up a sheet.',
    ]);
  });
});

describe('pasting blocks', () => {
  test('gives copies fresh ids and names, moved, with the wires between them only', () => {
    const blocks = DRAWING.blocks.filter(({ id }) => ['K', 'x', 'S'].includes(id));
    const after = edited(DRAWING, { kind: 'addBlocks', blocks, wires: DRAWING.wires, dx: 20, dy: 40 });
    expect(after.blocks.slice(6)).toEqual([
      { id: 'K2', kind: 'gain', gain: 'k', at: [220, 40] },
      { id: 'x2', kind: 'integrator', at: [320, 40] },
      { ...GROUP, id: 'S2', name: 'drive2', at: [420, 40] },
    ]);
    expect(after.wires.slice(7)).toEqual([
      { from: ['K2', 0], to: ['x2', 0], via: [[270, 50]] },
      { from: ['x2', 0], to: ['S2', 0] },
    ]);
  });

  test('twice counts on', () => {
    const paste: Edit = { kind: 'addBlocks', blocks: DRAWING.blocks.slice(3, 4), wires: [] };
    expect(ids(edited(edited(DRAWING, paste), paste)).slice(6)).toEqual(['x2', 'x3']);
  });

  test('keeps clear of names as well as ids', () => {
    const named = edited(DRAWING, { kind: 'addBlock', block: { id: 'q', kind: 'integrator', name: 'x2' } });
    const after = edited(named, { kind: 'addBlocks', blocks: DRAWING.blocks.slice(3, 4), wires: [] });
    expect(ids(after).at(-1)).toBe('x3');
  });

  test('of nothing is no change', () => {
    expect(changesNothing(DRAWING, { kind: 'addBlocks', blocks: [], wires: [] })).toBe(true);
  });

  test('off the sheet is refused', () => {
    const blocks = DRAWING.blocks.slice(2, 4);
    expect(refusals(DRAWING, { kind: 'addBlocks', blocks, wires: [], dx: 1e6 })[0]).toMatch(
      /^bad-value: Gain K2: "at"/,
    );
    const bent = { from: ['K', 0], to: ['x', 0], via: [[0, 1e6]] } as const;
    expect(refusals(DRAWING, { kind: 'addBlocks', blocks, wires: [bent], dy: 20 })).toEqual([
      'bad-value: The sheet ends 1000000 units from its middle. Move it less far.',
    ]);
  });
});

describe('moving blocks', () => {
  test('moves them and the bends between them', () => {
    const after = edited(DRAWING, { kind: 'moveBlocks', ids: ['K', 'x'], dx: 20, dy: -40 });
    expect(blockOf(after, 'K')?.at).toEqual([220, -40]);
    expect(blockOf(after, 'x')?.at).toEqual([320, -40]);
    expect(after.wires[2]?.via).toEqual([[270, -30]]);
    expect(blockOf(after, 'u')?.at).toEqual([0, 0]);
  });

  test('leaves a bend where only one end moves', () => {
    const after = edited(DRAWING, { kind: 'moveBlocks', ids: ['K'], dx: 20, dy: 0 });
    expect(after.wires[2]?.via).toEqual([[250, 10]]);
  });

  test('keeps the identity of what stays', () => {
    const result = editDiagram(DRAWING, { kind: 'moveBlocks', ids: ['u'], dx: 20, dy: 0 });
    expect(result.ok && result.value.wires).toBe(DRAWING.wires);
    expect(result.ok && result.value.blocks[1]).toBe(DRAWING.blocks[1]);
    expect(result.ok && result.value.parameters).toBe(DRAWING.parameters);
  });

  test('by nothing is no change', () => {
    expect(changesNothing(DRAWING, { kind: 'moveBlocks', ids: ['K'], dx: 0, dy: 0 })).toBe(true);
  });

  test('leaves a block that has no place without one', () => {
    const placeless = edited(DRAWING, { kind: 'addBlock', block: { id: 'z', kind: 'integrator' } });
    expect(changesNothing(placeless, { kind: 'moveBlocks', ids: ['z'], dx: 20, dy: 0 })).toBe(true);
  });

  test('off the sheet, or to no place, is refused', () => {
    const message = 'bad-value: The sheet ends 1000000 units from its middle. Move it less far.';
    expect(refusals(DRAWING, { kind: 'moveBlocks', ids: ['K'], dx: 1e6, dy: 0 })).toEqual([message]);
    expect(refusals(DRAWING, { kind: 'moveBlocks', ids: ['K'], dx: Number.NaN, dy: 0 })).toEqual([message]);
    expect(refusals(DRAWING, { kind: 'moveBlocks', ids: ['z'], dx: 20, dy: 0 })).toEqual([
      'missing-block: There is no block z on this sheet. Choose one that is there.',
    ]);
  });
});

describe('placing blocks', () => {
  test('puts them where they are told', () => {
    const after = edited(DRAWING, { kind: 'placeBlocks', places: [['K', [40, 60]]] });
    expect(blockOf(after, 'K')?.at).toEqual([40, 60]);
    expect(changesNothing(DRAWING, { kind: 'placeBlocks', places: [['K', [200, 0]]] })).toBe(true);
  });

  test('off the sheet is refused', () => {
    expect(refusals(DRAWING, { kind: 'placeBlocks', places: [['K', [0, Number.POSITIVE_INFINITY]]] })).toEqual([
      'bad-value: The sheet ends 1000000 units from its middle. Move it less far.',
    ]);
  });
});

describe('removing blocks', () => {
  test('takes their wires with them', () => {
    const after = edited(DRAWING, { kind: 'removeBlocks', ids: ['x', 'u'] });
    expect(ids(after)).toEqual(['e', 'K', 'y', 'S']);
    expect(ends(after)).toEqual(['e:0 K:0', 'S:0 y:0']);
  });

  test('of a group’s input shifts the wires of the ports behind it', () => {
    const after = edited(DRAWING, { kind: 'removeBlocks', at: ['S'], ids: ['a'] });
    expect(ends(after).slice(4)).toEqual(['u:0 S:0', 'S:0 y:0']);
  });

  test('of a group’s output takes the wire of the port', () => {
    const after = edited(DRAWING, { kind: 'removeBlocks', at: ['S'], ids: ['out'] });
    expect(ends(after).slice(4)).toEqual(['x:0 S:0', 'u:0 S:1']);
  });

  test('that are gone is refused, of none is no change', () => {
    expect(refusals(DRAWING, { kind: 'removeBlocks', ids: ['K', 'z'] })).toEqual([
      'missing-block: There is no block z on this sheet. Choose one that is there.',
    ]);
    expect(changesNothing(DRAWING, { kind: 'removeBlocks', ids: [] })).toBe(true);
  });

  test('and healing joins what fed them to what they fed', () => {
    expect(ends(edited(DRAWING, { kind: 'removeBlocksHealing', ids: ['K'] }))).toContain('e:0 x:0');
    const both = edited(DRAWING, { kind: 'removeBlocksHealing', ids: ['e', 'K'] });
    expect(ends(both)).toEqual(['u:0 x:0', 'x:0 S:0', 'u:0 S:1', 'S:0 y:0']);
  });

  test('and healing a whole loop leaves its outputs open', () => {
    const loop = edited(DRAWING, { kind: 'disconnect', to: ['e', 0] });
    const after = edited(loop, { kind: 'removeBlocksHealing', ids: ['e', 'K', 'x'] });
    expect(ends(after)).toEqual(['u:0 S:1', 'S:0 y:0']);
  });
});

describe('mirroring', () => {
  test('turns blocks round and back', () => {
    const once = edited(DRAWING, { kind: 'mirrorBlocks', ids: ['K', 'x'] });
    expect(blockOf(once, 'K')?.mirrored).toBe(true);
    expect(edited(once, { kind: 'mirrorBlocks', ids: ['K', 'x'] })).toEqual(DRAWING);
  });
});

describe('ordering', () => {
  test('moves a block in front of another, or last', () => {
    expect(ids(edited(DRAWING, { kind: 'reorderBlock', id: 'x', before: 'u' }))).toEqual([
      'x',
      'u',
      'e',
      'K',
      'y',
      'S',
    ]);
    expect(ids(edited(DRAWING, { kind: 'reorderBlock', id: 'u', before: null })).at(-1)).toBe('u');
    expect(changesNothing(DRAWING, { kind: 'reorderBlock', id: 'u', before: 'e' })).toBe(true);
    expect(changesNothing(DRAWING, { kind: 'reorderBlock', id: 'u', before: 'u' })).toBe(true);
  });

  test('of a group’s inputs swaps the wires of its ports', () => {
    const after = edited(DRAWING, { kind: 'reorderBlock', at: ['S'], id: 'b', before: 'a' });
    expect(ends(after).slice(4, 6)).toEqual(['x:0 S:1', 'u:0 S:0']);
  });

  test('in front of a block that is gone is refused', () => {
    expect(refusals(DRAWING, { kind: 'reorderBlock', id: 'u', before: 'z' })).toEqual([
      'missing-block: There is no block z on this sheet. Choose one that is there.',
    ]);
  });
});

describe('naming', () => {
  test('gives a name and takes it away', () => {
    const named = edited(DRAWING, { kind: 'renameBlock', id: 'x', name: ' omega ' });
    expect(blockOf(named, 'x')?.name).toBe('omega');
    for (const name of ['', 'x']) {
      expect(edited(named, { kind: 'renameBlock', id: 'x', name })).toEqual(DRAWING);
    }
    expect(changesNothing(DRAWING, { kind: 'renameBlock', id: 'x', name: 'x' })).toBe(true);
  });

  test('with a name that is taken, too long or on two lines is refused', () => {
    const two = edited(DRAWING, { kind: 'addBlock', block: { id: 'z', kind: 'integrator' } });
    expect(refusals(two, { kind: 'renameBlock', id: 'z', name: 'x' })).toEqual([
      'duplicate-name: Two states have the name x: integrator x (x) and integrator x (z). Rename one.',
    ]);
    expect(refusals(two, { kind: 'renameBlock', id: 'z', name: 'a'.repeat(201) })).toEqual([
      'bad-value: A name has at most 200 characters. Write a shorter one.',
    ]);
    expect(refusals(two, { kind: 'renameBlock', id: 'z', name: 'a\nb' })).toEqual([
      'bad-value: A name stands on one line. Take out the breaks.',
    ]);
  });
});

describe('fresh ids and names', () => {
  test.each([
    ['z', 'z'],
    ['x', 'x2'],
    ['K', 'K2'],
    ['my gain!', 'mygain'],
    ['2nd', 'nd'],
    ['ω', 'block'],
    ['', 'block'],
  ])('from %s comes the id %s', (stem, id) => {
    expect(freshId(DRAWING, stem)).toBe(id);
  });

  test('count on from the number in the stem', () => {
    const numbered = edited(DRAWING, { kind: 'addBlock', block: { id: 'v1', kind: 'integrator' } });
    expect(freshId(numbered, 'v1')).toBe('v2');
  });

  test('names are compared with what is shown', () => {
    expect(freshName(DRAWING, 'drive')).toBe('drive2');
    expect(freshName(DRAWING, 'S')).toBe('S');
  });
});
