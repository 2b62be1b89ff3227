/** Texts and frames on a sheet: added, written, moved, sized, removed; read and written; refused with a reason. */

import { describe, expect, test } from 'vitest';
import {
  type Annotation,
  type Diagram,
  isSameModel,
  minifyDiagram,
  readDiagram,
  writeDiagram,
} from '../../../../src/diagram/index.ts';
import { problemsOf, valueOf } from '../../results.ts';
import { DRAWING } from './small-drawing.ts';
import { changesNothing, edited, refusals } from './try-edit.ts';

const NOTE: Annotation = { id: 'note', kind: 'text', at: [0, 100], size: [200, 40], text: 'from the data sheet' };
const FRAME: Annotation = { id: 'loop', kind: 'frame', at: [80, -60], size: [260, 120], text: 'speed loop' };
const noted: Diagram = edited(DRAWING, { kind: 'addAnnotations', annotations: [NOTE, FRAME] });

describe('an annotation', () => {
  test('is added on top and leaves the model as it was', () => {
    expect(noted.annotations).toEqual([NOTE, FRAME]);
    expect(noted.blocks).toBe(DRAWING.blocks);
    expect(isSameModel(DRAWING, noted)).toBe(true);
    expect(changesNothing(noted, { kind: 'addAnnotations', annotations: [] })).toBe(true);
  });

  test('gets an id of its own and the place it is copied to', () => {
    const copied = edited(noted, { kind: 'addAnnotations', annotations: [NOTE, NOTE], dx: 40, dy: -20 });
    expect(copied.annotations?.slice(2)).toEqual([
      { ...NOTE, id: 'note2', at: [40, 80] },
      { ...NOTE, id: 'note3', at: [40, 80] },
    ]);
  });

  test('is moved, written and sized, the others staying what they are', () => {
    const moved = edited(noted, { kind: 'moveAnnotations', ids: ['loop'], dx: 20, dy: 40 });
    expect(moved.annotations).toEqual([NOTE, { ...FRAME, at: [100, -20] }]);
    expect(moved.annotations?.[0]).toBe(noted.annotations?.[0]);
    const written = edited(noted, { kind: 'setAnnotation', id: 'note', text: 'two\nlines', size: [60, 40] });
    expect(written.annotations?.[0]).toEqual({ ...NOTE, text: 'two\nlines', size: [60, 40] });
    const placed = edited(noted, { kind: 'setAnnotation', id: 'note', place: [5, 5] });
    expect(placed.annotations?.[0]).toEqual({ ...NOTE, at: [5, 5] });
    expect(changesNothing(noted, { kind: 'moveAnnotations', ids: ['loop'], dx: 0, dy: 0 })).toBe(true);
    expect(changesNothing(noted, { kind: 'setAnnotation', id: 'note', text: NOTE.text, size: NOTE.size })).toBe(true);
  });

  test('is removed, and the field with the last of them', () => {
    expect(edited(noted, { kind: 'removeAnnotations', ids: ['note'] }).annotations).toEqual([FRAME]);
    expect(edited(noted, { kind: 'removeAnnotations', ids: ['note', 'loop'] })).not.toHaveProperty('annotations');
    expect(changesNothing(noted, { kind: 'removeAnnotations', ids: [] })).toBe(true);
  });

  test('stands on a sheet inside a group as well', () => {
    const inside = edited(DRAWING, { kind: 'addAnnotations', at: ['S'], annotations: [NOTE] });
    const group = inside.blocks.find(({ id }) => id === 'S');
    expect(group?.kind === 'group' ? group.sheet.annotations : null).toEqual([NOTE]);
    const bare = edited(inside, { kind: 'removeAnnotations', at: ['S'], ids: ['note'] });
    expect(bare).toEqual(DRAWING);
  });

  test('stays while blocks and wires of its sheet change', () => {
    expect(edited(noted, { kind: 'removeBlocks', ids: ['K'] }).annotations).toBe(noted.annotations);
    expect(edited(noted, { kind: 'disconnect', to: ['K', 0] }).annotations).toBe(noted.annotations);
  });
});

describe('an annotation is refused', () => {
  test('where it is not on the sheet', () => {
    const gone = ['bad-value: There is no annotation lost on this sheet. Choose one that is there.'];
    expect(refusals(noted, { kind: 'removeAnnotations', ids: ['lost'] })).toEqual(gone);
    expect(refusals(noted, { kind: 'moveAnnotations', ids: ['note', 'lost'], dx: 1, dy: 1 })).toEqual(gone);
    expect(refusals(noted, { kind: 'setAnnotation', id: 'lost', text: '' })).toEqual(gone);
  });

  test('beyond the paper, and at a size that is none', () => {
    expect(refusals(noted, { kind: 'moveAnnotations', ids: ['note'], dx: 2e6, dy: 0 })).toEqual([
      'bad-value: The sheet ends 1000000 units from its middle. Move it less far.',
    ]);
    expect(refusals(noted, { kind: 'setAnnotation', id: 'loop', size: [19, 40] })).toEqual([
      'bad-value: Frame speed loop: "size" is not [width, height]: two numbers from 20 to 2000000.',
    ]);
    expect(edited(noted, { kind: 'setAnnotation', id: 'loop', size: [20, 20] }).annotations?.[1]?.size).toEqual([
      20, 20,
    ]);
  });

  test('with too long a text, and as one too many', () => {
    const text = 'x'.repeat(10_001);
    expect(refusals(noted, { kind: 'setAnnotation', id: 'note', text })[0]).toMatch(
      /^bad-value: Text x+…?: "text" is not text of at most 10000 characters\.$/,
    );
    const many = Array.from({ length: 1_999 }, (_, i) => ({ ...NOTE, id: `n${i}` }));
    expect(refusals(noted, { kind: 'addAnnotations', annotations: many })).toEqual([
      'too-large: A sheet has at most 2000 annotations. Remove some first.',
    ]);
  });
});

describe('annotations in a file', () => {
  test('are written after the wires, one a line, and read back', () => {
    expect(writeDiagram(noted)).toContain(`  "annotations": [
    { "id": "note", "kind": "text", "at": [0, 100], "size": [200, 40], "text": "from the data sheet" },
    { "id": "loop", "kind": "frame", "at": [80, -60], "size": [260, 120], "text": "speed loop" }
  ]`);
    for (const text of [writeDiagram(noted), minifyDiagram(noted)]) expect(valueOf(readDiagram(text))).toEqual(noted);
  });

  test('may leave the text out, and an empty list is as good as none', () => {
    const { text: _, ...blank } = FRAME;
    expect(valueOf(read([blank])).annotations).toEqual([{ ...FRAME, text: '' }]);
    expect(valueOf(read([]))).toEqual(DRAWING);
  });

  test('are refused by place, with what is wrong', () => {
    const where = 'bad-value: The diagram, the annotation at place 1';
    expect(problemsOf(read({}))).toEqual(['bad-value: The diagram: "annotations" is not a list.']);
    expect(problemsOf(read([{ ...NOTE, kind: 'cloud' }]))).toEqual([`${where}: "kind" is not "text" or "frame".`]);
    expect(problemsOf(read([{ ...NOTE, at: [0] }]))).toEqual([
      `${where}: "at" is not [x, y]: two numbers within ±1000000.`,
    ]);
    expect(problemsOf(read([{ ...NOTE, size: [0, 40] }]))).toEqual([
      `${where}: "size" is not [width, height]: two numbers from 20 to 2000000.`,
    ]);
    expect(problemsOf(read([{ ...NOTE, text: 4 }]))).toEqual([
      `${where}: "text" is not text of at most 10000 characters.`,
    ]);
    expect(problemsOf(read([{ ...NOTE, id: '4' }]))).toEqual([
      `${where}: "id" is not an id: a letter, then letters, digits and underscores.`,
    ]);
    expect(problemsOf(read([NOTE, NOTE]))).toEqual([
      'duplicate-id: The diagram, the annotation at place 2: another one has the id note. Give it one of its own.',
    ]);
    const many = Array.from({ length: 2_001 }, (_, i) => ({ ...NOTE, id: `n${i}` }));
    expect(problemsOf(read(many))).toEqual(['too-large: The diagram has 2001 annotations, 2000 at most are read.']);
  });
});

const read = (annotations: unknown) => readDiagram(JSON.stringify({ ...DRAWING, annotations }));
