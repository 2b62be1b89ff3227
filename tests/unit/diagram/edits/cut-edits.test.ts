/** Cuts: set, taken out, kept on their wires, written and read back, refused where no wire is. */

import { describe, expect, test } from 'vitest';
import {
  type Diagram,
  type Edit,
  editDiagram,
  minifyDiagram,
  readDiagram,
  startingDrawing,
  writeDiagram,
} from '../../../../src/diagram/index.ts';

function edited(diagram: Diagram, ...edits: readonly Edit[]): Diagram {
  return edits.reduce((before, edit) => {
    const outcome = editDiagram(before, edit);
    if (!outcome.ok) throw new Error(outcome.problems[0]?.message);
    return outcome.value;
  }, diagram);
}

const drawing = startingDrawing();
const [first, second] = drawing.wires;
if (first === undefined || second === undefined) throw new Error('a drawing without wires');
const cut = edited(drawing, { kind: 'addCut', to: first.to });

describe('a cut', () => {
  test('is set once and taken out again', () => {
    expect(cut.cuts).toEqual([{ to: first.to }]);
    expect(edited(cut, { kind: 'addCut', to: first.to })).toBe(cut);
    expect(edited(cut, { kind: 'removeCut', to: first.to })).not.toHaveProperty('cuts');
    expect(edited(drawing, { kind: 'removeCut', to: first.to })).toBe(drawing);
  });

  test('goes with its wire, and with the blocks at it', () => {
    expect(edited(cut, { kind: 'disconnect', to: first.to })).not.toHaveProperty('cuts');
    expect(edited(cut, { kind: 'removeBlocks', ids: [first.to[0]] })).not.toHaveProperty('cuts');
    expect(edited(cut, { kind: 'disconnect', to: second.to }).cuts).toBe(cut.cuts);
  });

  test('follows the end of its wire', () => {
    const free = edited(cut, { kind: 'disconnect', to: second.to });
    const moved = edited(free, { kind: 'moveWireEnd', to: first.to, newFrom: first.from, newTo: second.to });
    expect(moved.cuts).toEqual([{ to: second.to }]);
  });

  test('is written and read back, with its name', () => {
    const named: Diagram = { ...cut, cuts: [{ to: first.to, name: 'speed loop' }] };
    for (const text of [writeDiagram(named), minifyDiagram(named)]) {
      expect(readDiagram(text)).toEqual({ ok: true, value: named });
    }
  });

  test('needs a wire', () => {
    const outcome = editDiagram(drawing, { kind: 'addCut', to: [first.to[0], 9] });
    expect(outcome).toMatchObject({
      problems: [{ message: `No wire leads to input 9 of ${first.to[0]}. Choose one that is there.` }],
    });
    const read = (cuts: unknown) => readDiagram(JSON.stringify({ ...drawing, cuts }));
    const where = `input ${first.to[1]} of ${first.to[0]}`;
    expect(read([{ to: ['nowhere', 0] }])).toMatchObject({
      problems: [{ message: 'The cut at place 1: no wire leads to input 0 of nowhere. Put it on a wire.' }],
    });
    expect(read([{ to: first.to }, { to: first.to }])).toMatchObject({
      problems: [{ message: `The cut at place 2: the wire to ${where} has a cut already. Keep one of them.` }],
    });
    expect(read({})).toMatchObject({ problems: [{ message: 'The diagram: "cuts" is not a list.' }] });
  });
});
