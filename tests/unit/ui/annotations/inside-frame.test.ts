import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Annotation, type Diagram, editDiagram, emptyDiagram } from '../../../../src/diagram/index.ts';
import { frameAround, framesFollowing, insideFrame, withInside } from '../../../../src/ui/annotations/inside-frame.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const FRAME: Annotation = { id: 'f', kind: 'frame', at: [0, 0], size: [200, 100], text: 'loop' };
const TEXT: Annotation = { id: 't', kind: 'text', at: [20, 60], size: [60, 20], text: 'in' };
const OUTSIDE: Annotation = { id: 'o', kind: 'text', at: [190, 60], size: [60, 20], text: 'out' };

const drawing: Diagram = {
  ...emptyDiagram(),
  blocks: [
    { id: 'a', kind: 'gain', gain: '2', at: [100, 60] },
    { id: 'b', kind: 'gain', gain: '3', at: [200, 60] },
    { id: 'c', kind: 'gain', gain: '4', at: [600, 60] },
  ],
  annotations: [FRAME, TEXT, OUTSIDE],
};

const after = (diagram: Diagram, edits: ReturnType<typeof framesFollowing>): Diagram =>
  edits.reduce((before, edit) => {
    const result = editDiagram(before, edit);
    if (!result.ok) throw new Error(result.problems[0]?.message);
    return result.value;
  }, diagram);

describe('a frame', () => {
  test('holds what lies wholly inside it, and nothing that its line crosses', () => {
    expect(insideFrame(drawing, FRAME)).toEqual({ blocks: new Set(['a']), annotations: new Set(['t']) });
    expect(insideFrame(drawing, TEXT)).toEqual({ blocks: new Set(), annotations: new Set() });
  });

  test('of the same place and size as another holds it not, so that two never hold each other', () => {
    const twin = { ...FRAME, id: 'g' };
    const both = { ...drawing, annotations: [FRAME, twin] };
    expect(insideFrame(both, FRAME).annotations.size).toBe(0);
    expect(withInside(both, new Set(['f']))).toEqual({ blocks: new Set(['a']), annotations: new Set(['f']) });
  });

  test('made around blocks holds them, whatever they are and wherever they stand', () => {
    const place = fc.tuple(fc.integer({ min: -900, max: 900 }), fc.integer({ min: -900, max: 900 }));
    fc.assert(
      fc.property(fc.array(place, { minLength: 1, maxLength: 8 }), fc.boolean(), (places, isState) => {
        const blocks = places.map((at, i) =>
          isState
            ? ({ id: `x${i}`, kind: 'integrator', at } as const)
            : ({ id: `x${i}`, kind: 'gain', gain: 'a/(b + 1)', at } as const),
        );
        const sheet = { blocks, wires: [] };
        const ids = new Set(blocks.map(({ id }) => id));
        const around = frameAround(sheet, ids);
        if (around === null) throw new Error('no frame');
        expect(insideFrame(sheet, { id: 'f', kind: 'frame', text: '', ...around }).blocks).toEqual(ids);
        expect([...around.at, ...around.size].map(value => Math.abs(value % 20))).toEqual([0, 0, 0, 0]);
      }),
      { seed: SEED, numRuns: 200 },
    );
    expect(frameAround(drawing, new Set())).toBeNull();
  });

  test('goes to its blocks when they are arranged and brings its texts; others stay', () => {
    const places = new Map([['a', [1000, 500] as const]]);
    const moved = after(drawing, [{ kind: 'placeBlocks', places: [...places] }, ...framesFollowing(drawing, places)]);
    const [frame, text, outside] = moved.annotations ?? [];
    if (frame === undefined) throw new Error('no frame');
    expect(insideFrame(moved, frame).blocks).toEqual(new Set(['a']));
    expect(outside).toBe(OUTSIDE);
    expect([(text?.at[0] ?? 0) - 20, (text?.at[1] ?? 0) - 60]).toEqual([...frame.at]);
    expect(framesFollowing(drawing, new Map([['c', [0, 900] as const]]))).toEqual([]);
  });
});
