import { describe, expect, test } from 'vitest';
import { readDiagram, writeDiagram } from '../../../../src/diagram/index.ts';

const drawing = (requirements: unknown) =>
  JSON.stringify({ format: 'poleward-diagram', version: 1, title: '', blocks: [], wires: [], requirements });

/** The one message that a list of requirements is refused with. */
function refusal(...requirements: readonly unknown[]): string {
  const read = readDiagram(drawing(requirements));
  if (read.ok) throw new Error('it was read');
  expect(read.problems).toHaveLength(1);
  expect(read.problems[0]?.code).toBe('bad-value');
  return read.problems[0]?.message ?? '';
}

describe('requirements in a diagram file', () => {
  test('each kind is read with its fields and written back as it was', () => {
    const requirements = [
      { kind: 'stable', tolerances: true },
      { kind: 'damping', least: '0.5' },
      { kind: 'overshoot', input: 'r', output: 'y', most: '25', note: 'with the customer' },
      { kind: 'bandwidth', input: 'r', output: 'y', least: '2*pi*5' },
      { kind: 'magnitude', input: 'd', output: 'y', band: ['1', '100'], most: '-20' },
      { kind: 'phase-margin', cut: 'cut 1', least: '45' },
    ];
    const read = readDiagram(drawing(requirements));
    expect(read.ok && read.value.requirements).toEqual(requirements);
    if (!read.ok) return;
    expect(readDiagram(writeDiagram(read.value))).toEqual(read);
  });

  test('a JSON number is the quantity of its shortest decimal, and what says nothing is left out', () => {
    const read = readDiagram(drawing([{ kind: 'damping', least: 0.5, tolerances: false, note: '' }]));
    expect(read.ok && read.value.requirements).toEqual([{ kind: 'damping', least: '0.5' }]);
  });

  test('a drawing that requires nothing has no list', () => {
    const read = readDiagram(drawing([]));
    expect(read.ok && Object.hasOwn(read.value, 'requirements')).toBe(false);
  });

  test('a list that is none is refused', () => {
    const read = readDiagram(drawing({ kind: 'stable' }));
    expect(!read.ok && read.problems[0]?.message).toBe('The diagram: "requirements" is not a list.');
  });

  test.each([
    [
      { kind: 'rise' },
      'The requirement at place 1: "rise" is no kind of requirement. Kinds are stable, damping, overshoot, rise-time, ' +
        'settling-time, steady-error, bandwidth, magnitude, gain-margin, phase-margin, delay-margin, modulus-margin, disk-margin.',
    ],
    [{ most: '1' }, 'The requirement at place 1: "kind" is missing.'],
    [
      { kind: 'overshoot', input: 'r', most: '1' },
      'The requirement at place 1: "output" is missing, and the overshoot has one.',
    ],
    [
      { kind: 'phase-margin', least: '45' },
      'The requirement at place 1: "cut" is missing, and the phase margin has one.',
    ],
    [
      { kind: 'magnitude', input: 'r', output: 'y', most: '1' },
      'The requirement at place 1: "band" is missing, and the largest magnitude has one.',
    ],
    [
      { kind: 'overshoot', input: 'r', output: 'y' },
      'The requirement at place 1: "most" is missing, the bound of the overshoot.',
    ],
    [
      { kind: 'overshoot', input: 'r', output: 'y', least: '1' },
      'The requirement at place 1: "least" does not bound the overshoot. Write "most".',
    ],
    [
      { kind: 'bandwidth', input: 'r', output: 'y', least: '1', most: '2' },
      'The requirement at place 1: "most" and "least" are both there. Make two requirements of it.',
    ],
    [{ kind: 'stable', most: '1' }, 'The requirement at place 1: "most" is too much: stability has no bound.'],
    [
      { kind: 'damping', least: '1', cut: 'cut 1' },
      'The requirement at place 1: "cut" is too much: the damping ratio of every pole has none.',
    ],
    [
      { kind: 'magnitude', input: 'r', output: 'y', most: '1', band: ['1'] },
      'The requirement at place 1: "band" is not two quantities: ["1", "10"].',
    ],
    [{ kind: 'damping', least: [] }, 'The requirement at place 1: "least" is not a quantity: text or a finite number.'],
  ])('%j is refused', (requirement, message) => {
    expect(refusal(requirement)).toBe(message);
  });

  test('more than 200 are refused', () => {
    const read = readDiagram(drawing(Array.from({ length: 201 }, () => ({ kind: 'stable' }))));
    expect(!read.ok && read.problems.map(({ code, message }) => [code, message])).toEqual([
      ['too-large', 'The diagram has 201 requirements, 200 at most are read.'],
    ]);
  });
});
