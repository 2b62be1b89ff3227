import { describe, expect, test } from 'vitest';
import { type Diagram, editDiagram, emptyDiagram, type Wire } from '../../../../src/diagram/index.ts';
import { lastWiredPort, withSign, withSignTurned } from '../../../../src/ui/commands/signs.ts';
import { canStandInWire, isWired, pullOutEdits, spliceEdits } from '../../../../src/ui/commands/splice.ts';
import { longestMiddle, wireUnder } from '../../../../src/ui/commands/wire-under.ts';

const drawing: Diagram = {
  ...emptyDiagram(),
  blocks: [
    { id: 'u', kind: 'input', at: [0, 0] },
    { id: 'K', kind: 'gain', gain: '2', at: [100, 0] },
    { id: 'x', kind: 'integrator', at: [200, 0] },
    { id: 'y', kind: 'output', at: [300, 0] },
    { id: 'free', kind: 'gain', gain: '3', at: [100, 100] },
  ],
  wires: [
    { from: ['u', 0], to: ['K', 0], name: 'r' },
    { from: ['K', 0], to: ['x', 0] },
    { from: ['x', 0], to: ['y', 0] },
  ],
};

function edited(start: Diagram, edits: ReturnType<typeof spliceEdits>): Diagram {
  return edits.reduce((diagram, edit) => {
    const done = editDiagram(diagram, edit);
    if (!done.ok) throw new Error(done.problems[0]?.message);
    return done.value;
  }, start);
}

const ends = ({ wires }: Diagram) => wires.map(({ from, to }) => `${from.join(':')} ${to.join(':')}`).sort();

describe('a block in a wire', () => {
  test('takes the wire at its input, sends it on from its output, and the name stays in front', () => {
    const wire = drawing.wires[0];
    if (wire === undefined) throw new Error('the drawing has wires');
    const spliced = edited(drawing, spliceEdits(wire, 'free'));
    expect(ends(spliced)).toEqual(['K:0 x:0', 'free:0 K:0', 'u:0 free:0', 'x:0 y:0']);
    expect(spliced.wires.find(({ to }) => to[0] === 'free')?.name).toBe('r');
  });

  test('has to have an input and an output', () => {
    expect(drawing.blocks.map(canStandInWire)).toEqual([false, true, true, false, true]);
  });

  test('is wired where any wire ends at it', () => {
    expect(drawing.blocks.map(({ id }) => isWired(drawing, id))).toEqual([true, true, true, true, false]);
  });

  test('leaves a wire that closes behind it when it is pulled out', () => {
    expect(ends(edited(drawing, pullOutEdits(drawing, 'K')))).toEqual(['u:0 x:0', 'x:0 y:0']);
  });

  test('leaves nothing behind where nothing fed it', () => {
    expect(ends(edited(drawing, pullOutEdits(drawing, 'u')))).toEqual(['K:0 x:0', 'x:0 y:0']);
  });

  test('with a wire to itself is not fed by itself once it is out', () => {
    const wires: Wire[] = [
      { from: ['sum', 0], to: ['sum', 0] },
      { from: ['u', 0], to: ['sum', 1] },
      { from: ['sum', 0], to: ['y', 0] },
    ];
    const looped: Diagram = {
      ...drawing,
      blocks: [...drawing.blocks, { id: 'sum', kind: 'summer', signs: '++', at: [0, 200] }],
      wires,
    };
    expect(ends(edited(looped, pullOutEdits(looped, 'sum')))).toEqual(['u:0 y:0']);
  });
});

describe('the wire under a point', () => {
  const routes = {
    wires: [
      {
        points: [
          [0, 0],
          [100, 0],
        ] as const,
        forced: false,
      },
      {
        points: [
          [100, 0],
          [150, 0],
          [150, 40],
          [200, 40],
        ] as const,
        forced: false,
      },
      {
        points: [
          [200, 0],
          [300, 0],
        ] as const,
        forced: false,
      },
    ],
    dots: [],
  };

  test('is the nearest one within reach', () => {
    expect(wireUnder(drawing, routes, [152, 20], 10)?.to).toEqual(['x', 0]);
    expect(wireUnder(drawing, routes, [50, 8], 10)?.to).toEqual(['K', 0]);
  });

  test('is none beyond reach', () => {
    expect(wireUnder(drawing, routes, [50, 12], 10)).toBeNull();
  });

  test('has its longest piece where a block fits best', () => {
    expect(
      longestMiddle([
        [0, 0],
        [30, 0],
        [30, 100],
        [60, 100],
      ]),
    ).toEqual([30, 50]);
    expect(longestMiddle([])).toBeNull();
  });
});

describe('the signs of a summing point', () => {
  test('change at one port only', () => {
    expect(withSign('++-', 1, '-')).toBe('+--');
    expect(withSign('++-', 3, '-')).toBe('++-');
    expect(withSignTurned('+-', 1)).toBe('++');
    expect(withSignTurned('+-', 0)).toBe('--');
  });

  test('the port wired last is that of the last wire in the document, else the last port', () => {
    const summer = { id: 'sum', kind: 'summer', signs: '+++' } as const;
    const wires: Wire[] = [
      { from: ['u', 0], to: ['sum', 2] },
      { from: ['x', 0], to: ['sum', 0] },
    ];
    expect(lastWiredPort({ blocks: [], wires }, summer)).toBe(0);
    expect(lastWiredPort({ blocks: [], wires: [] }, summer)).toBe(2);
  });
});
