import { describe, expect, test } from 'vitest';
import { type Diagram, type Edit, editDiagram, emptyDiagram, type Requirement } from '../../../../src/diagram/index.ts';

const OVERSHOOT: Requirement = { kind: 'overshoot', input: 'r', output: 'y', most: '2*K' };
const STABLE: Requirement = { kind: 'stable' };

function edited(diagram: Diagram, ...edits: readonly Edit[]): Diagram {
  return edits.reduce((now, edit) => {
    const changed = editDiagram(now, edit);
    if (!changed.ok) throw new Error(changed.problems[0]?.message);
    return changed.value;
  }, diagram);
}

const start = edited(
  emptyDiagram(),
  { kind: 'addBlock', block: { kind: 'input', id: 'in1', name: 'r' } },
  { kind: 'addBlock', block: { kind: 'output', id: 'out1', name: 'y' } },
  { kind: 'addParameter', parameter: { name: 'K', value: '10' } },
  { kind: 'addRequirement', requirement: OVERSHOOT },
);

describe('edits of requirements', () => {
  test('one is added at the end, or at a place', () => {
    expect(edited(start, { kind: 'addRequirement', requirement: STABLE }).requirements).toEqual([OVERSHOOT, STABLE]);
    expect(edited(start, { kind: 'addRequirement', requirement: STABLE, index: 0 }).requirements).toEqual([
      STABLE,
      OVERSHOOT,
    ]);
  });

  test('one takes the place of another', () => {
    expect(edited(start, { kind: 'setRequirement', index: 0, requirement: STABLE }).requirements).toEqual([STABLE]);
  });

  test('the same one again changes nothing', () => {
    expect(edited(start, { kind: 'setRequirement', index: 0, requirement: { ...OVERSHOOT } })).toBe(start);
  });

  test('when the last one goes, so does the list', () => {
    const without = edited(start, { kind: 'removeRequirement', index: 0 });
    expect(Object.hasOwn(without, 'requirements')).toBe(false);
  });

  test('it goes along when its output or its parameter is renamed', () => {
    const renamed = edited(
      start,
      { kind: 'renameBlock', id: 'out1', name: 'speed' },
      { kind: 'renameParameter', from: 'K', to: 'K_p' },
    );
    expect(renamed.requirements).toEqual([{ kind: 'overshoot', input: 'r', output: 'speed', most: '2*K_p' }]);
  });

  test.each<[Edit, string]>([
    [{ kind: 'removeRequirement', index: 1 }, 'There is no such requirement any more. Choose one that is there.'],
    [
      { kind: 'setRequirement', index: 3, requirement: STABLE },
      'There is no such requirement any more. Choose one that is there.',
    ],
    [
      { kind: 'addRequirement', requirement: { kind: 'overshoot', input: 'r', output: 'y' } },
      'The requirement: "most" is missing, the bound of the overshoot.',
    ],
  ])('%j is refused', (edit, message) => {
    const changed = editDiagram(start, edit);
    expect(!changed.ok && changed.problems[0]?.message).toBe(message);
  });
});
