import { describe, expect, test } from 'vitest';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { DRAWING } from './small-drawing.ts';
import { changesNothing, edited, refusals } from './try-edit.ts';

const ends = (diagram: Diagram) => diagram.wires.map(({ from, to }) => `${from.join(':')} ${to.join(':')}`);

describe('connecting', () => {
  test('adds a wire to a free input port', () => {
    const open = edited(DRAWING, { kind: 'disconnect', to: ['y', 0] });
    const after = edited(open, { kind: 'connect', from: ['x', 0], to: ['y', 0], name: ' out ', via: [[1, 2]] });
    expect(after.wires.at(-1)).toEqual({ from: ['x', 0], to: ['y', 0], name: 'out', via: [[1, 2]] });
  });

  test('to a port that is taken is refused, or replaces where that is asked for', () => {
    expect(refusals(DRAWING, { kind: 'connect', from: ['u', 0], to: ['e', 1] })).toEqual([
      'port-taken: A wire leads to input 1 of summing point e already. Remove it first or join another port.',
    ]);
    const after = edited(DRAWING, { kind: 'connect', from: ['u', 0], to: ['e', 1], replace: true });
    expect(ends(after)[3]).toBe('u:0 e:1');
    expect(after.wires).toHaveLength(7);
  });

  test('what is connected already is no change', () => {
    expect(changesNothing(DRAWING, { kind: 'connect', from: ['e', 0], to: ['K', 0] })).toBe(true);
    expect(changesNothing(DRAWING, { kind: 'connect', from: ['K', 0], to: ['x', 0], replace: true })).toBe(true);
    expect(refusals(DRAWING, { kind: 'connect', from: ['K', 0], to: ['x', 0], name: 'v' })[0]).toMatch(/^port-taken: /);
  });

  test('a port that is not there is refused', () => {
    const free = edited(DRAWING, { kind: 'disconnect', to: ['y', 0] });
    expect(refusals(free, { kind: 'connect', from: ['y', 0], to: ['y', 0] })).toEqual([
      'missing-port: Output y has no output. Join another port.',
    ]);
    expect(refusals(free, { kind: 'connect', from: ['x', 1], to: ['y', 0] })).toEqual([
      'missing-port: Integrator x has no output 1. Join another port.',
    ]);
    expect(refusals(free, { kind: 'connect', from: ['x', 0], to: ['e', 2] })).toEqual([
      'missing-port: Summing point e has no input 2. Join another port.',
    ]);
    expect(refusals(free, { kind: 'connect', from: ['x', 0], to: ['e', -1] })).toEqual([
      'missing-port: Summing point e has no input -1. Join another port.',
    ]);
    expect(refusals(free, { kind: 'connect', from: ['z', 0], to: ['y', 0] })).toEqual([
      'missing-block: There is no block z on this sheet. Choose one that is there.',
    ]);
    expect(refusals(free, { kind: 'connect', from: ['x', 0], to: ['y', 0], via: [[1e9, 0]] })).toEqual([
      'bad-value: The sheet ends 1000000 units from its middle. Move it less far.',
    ]);
  });

  test('leads to a group’s port by number', () => {
    const open = edited(DRAWING, { kind: 'disconnect', to: ['S', 1] });
    expect(ends(edited(open, { kind: 'connect', from: ['K', 0], to: ['S', 1] })).at(-1)).toBe('K:0 S:1');
  });
});

describe('disconnecting', () => {
  test('removes the wire', () => {
    const after = edited(DRAWING, { kind: 'disconnect', to: ['e', 1] });
    expect(ends(after)).toEqual(ends(DRAWING).filter(wire => wire !== 'x:0 e:1'));
  });

  test('what no wire leads to is refused', () => {
    expect(refusals(DRAWING, { kind: 'disconnect', to: ['e', 7] })).toEqual([
      'missing-port: No wire leads to input 7 of e. Choose one that is there.',
    ]);
  });
});

describe('moving a wire’s ends', () => {
  test('keeps its name and place in the order, not its bends', () => {
    const after = edited(DRAWING, { kind: 'moveWireEnd', to: ['e', 0], newFrom: ['K', 0], newTo: ['e', 0] });
    expect(after.wires[0]).toEqual({ from: ['K', 0], to: ['e', 0], name: 'set point' });
    const bent = edited(DRAWING, { kind: 'moveWireEnd', to: ['x', 0], newFrom: ['e', 0], newTo: ['x', 0] });
    expect(bent.wires[2]).toEqual({ from: ['e', 0], to: ['x', 0] });
  });

  test('to another input leaves the old one open', () => {
    const open = edited(DRAWING, { kind: 'disconnect', to: ['S', 1] });
    const after = edited(open, { kind: 'moveWireEnd', to: ['e', 1], newFrom: ['x', 0], newTo: ['S', 1] });
    expect(ends(after)).toContain('x:0 S:1');
    expect(ends(after)).not.toContain('x:0 e:1');
  });

  test('to where they are is no change', () => {
    expect(changesNothing(DRAWING, { kind: 'moveWireEnd', to: ['e', 1], newFrom: ['x', 0], newTo: ['e', 1] })).toBe(
      true,
    );
  });

  test('to a port that is taken is refused, or replaces where that is asked for', () => {
    const move = { kind: 'moveWireEnd', to: ['e', 0], newFrom: ['u', 0], newTo: ['e', 1] } as const;
    expect(refusals(DRAWING, move)).toEqual([
      'port-taken: A wire leads to input 1 of summing point e already. Remove it first or join another port.',
    ]);
    const after = edited(DRAWING, { ...move, replace: true });
    expect(after.wires[0]).toEqual({ from: ['u', 0], to: ['e', 1], name: 'set point' });
    expect(after.wires).toHaveLength(6);
  });

  test('to a port that is not there is refused', () => {
    expect(refusals(DRAWING, { kind: 'moveWireEnd', to: ['e', 0], newFrom: ['y', 0], newTo: ['e', 0] })).toEqual([
      'missing-port: Output y has no output. Join another port.',
    ]);
  });
});

describe('a wire’s bends and name', () => {
  test('are set and taken away', () => {
    const bent = edited(DRAWING, {
      kind: 'setVia',
      to: ['e', 1],
      via: [
        [10, 20],
        [10, 40],
      ],
    });
    expect(bent.wires[3]?.via).toEqual([
      [10, 20],
      [10, 40],
    ]);
    expect(edited(bent, { kind: 'setVia', to: ['e', 1], via: [] })).toEqual(DRAWING);
    const named = edited(DRAWING, { kind: 'nameWire', to: ['e', 1], name: 'feedback ' });
    expect(named.wires[3]?.name).toBe('feedback');
    expect(edited(named, { kind: 'nameWire', to: ['e', 1], name: '' })).toEqual(DRAWING);
  });

  test('as they are are no change', () => {
    expect(changesNothing(DRAWING, { kind: 'setVia', to: ['e', 1], via: [] })).toBe(true);
    expect(changesNothing(DRAWING, { kind: 'setVia', to: ['x', 0], via: [[250, 10]] })).toBe(true);
    expect(changesNothing(DRAWING, { kind: 'nameWire', to: ['e', 0], name: 'set point' })).toBe(true);
  });

  test('off the sheet or on two lines are refused', () => {
    expect(refusals(DRAWING, { kind: 'setVia', to: ['e', 1], via: [[Number.NaN, 0]] })).toEqual([
      'bad-value: The sheet ends 1000000 units from its middle. Move it less far.',
    ]);
    expect(refusals(DRAWING, { kind: 'nameWire', to: ['e', 1], name: 'a\nb' })).toEqual([
      'bad-value: A name stands on one line. Take out the breaks.',
    ]);
  });
});

describe('putting a block into a wire', () => {
  test('leads the wire through it', () => {
    const block = { id: 'F', kind: 'gain', gain: '2', at: [150, 0] } as const;
    const after = edited(DRAWING, { kind: 'insertOnWire', to: ['K', 0], block });
    expect(after.blocks.at(-1)).toEqual(block);
    expect(ends(after).slice(1, 3)).toEqual(['e:0 F:0', 'F:0 K:0']);
    expect(after.wires).toHaveLength(8);
  });

  test('keeps the signal’s name in front of it', () => {
    const block = { id: 'F', kind: 'summer', signs: '+-' } as const;
    const after = edited(DRAWING, { kind: 'insertOnWire', to: ['e', 0], block });
    expect(after.wires.slice(0, 2)).toEqual([
      { from: ['u', 0], to: ['F', 0], name: 'set point' },
      { from: ['F', 0], to: ['e', 0] },
    ]);
  });

  test('that the wire cannot go through is refused', () => {
    expect(refusals(DRAWING, { kind: 'insertOnWire', to: ['K', 0], block: { id: 'v', kind: 'input' } })).toEqual([
      'missing-port: The wire from e (output 0) to K (input 0): input v has no input. Place it beside the wire.',
    ]);
    expect(refusals(DRAWING, { kind: 'insertOnWire', to: ['K', 0], block: { id: 'z', kind: 'output' } })).toEqual([
      'missing-port: The wire from e (output 0) to K (input 0): output z has no output. Place it beside the wire.',
    ]);
    expect(
      refusals(DRAWING, { kind: 'insertOnWire', to: ['K', 0], block: { id: 'x', kind: 'gain', gain: '1' } }),
    ).toEqual(['duplicate-id: Gain x: the sheet has a block with the id x. Choose another id.']);
  });
});
