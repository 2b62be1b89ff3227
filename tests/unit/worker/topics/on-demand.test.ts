import { describe, expect, test } from 'vitest';
import { compile } from '../../../../src/compile/index.ts';
import type { Block, Diagram } from '../../../../src/diagram/index.ts';
import { answer as structureAnswer } from '../../../../src/worker/topics/structure.ts';
import { answer as traceAnswer } from '../../../../src/worker/topics/trace.ts';
import { answer as transferAnswer } from '../../../../src/worker/topics/transfer-matrix.ts';
import { problemsOf, valueOf } from '../../results.ts';

function subject(integrators: number) {
  const blocks = Array.from({ length: integrators }, (_, i): Block => ({ id: `x${i}`, kind: 'integrator' }));
  const chain = ['u', ...blocks.map(({ id }) => id), 'y'];
  const diagram: Diagram = {
    format: 'poleward-diagram',
    version: 1,
    title: '',
    parameters: [],
    blocks: [{ id: 'u', kind: 'input' }, ...blocks, { id: 'y', kind: 'output' }],
    wires: chain.slice(1).map((to, i) => ({ from: [chain[i] ?? '', 0], to: [to, 0] })),
  };
  return { diagram, derivation: valueOf(compile(diagram)) };
}

describe('the structure on demand', () => {
  test('has the minimal model only where it is asked for', () => {
    const { derivation, diagram } = subject(2);
    const plain = valueOf(structureAnswer({ derivation, diagram }, { withMinimal: false }));
    expect([plain.report.minimal, plain.minimal]).toEqual([2, null]);
    expect(plain.formats.map(({ id }) => id)).toContain('csv');
    expect(valueOf(structureAnswer({ derivation, diagram }, { withMinimal: true })).minimal?.model.states).toHaveLength(
      2,
    );
  });

  test('is refused beyond the states that exact answers are given for', () => {
    expect(problemsOf(structureAnswer(subject(33), { withMinimal: false }))).toEqual([
      'not-supported: The model has 33 states. Its structure is decided exactly for up to 32.',
    ]);
  });
});

test('a channel names the states that take part, where they can be decided', () => {
  expect(valueOf(transferAnswer(subject(2))).states).toEqual([[['x0', 'x1']]]);
  expect(valueOf(transferAnswer(subject(33))).states).toBeNull();
});

describe('a trace on demand', () => {
  test('is of the entry that is asked for, and none where the model has no such entry', () => {
    const trace = (row: number, column: number) =>
      valueOf(traceAnswer(subject(2), { kind: 'entry', place: { row, column } }));
    expect(trace(1, 0)).toMatchObject({ kind: 'entry', place: { row: 1, column: 0 }, trace: { outcome: 'traced' } });
    expect(trace(3, 0)).toMatchObject({ trace: null });
    expect(trace(0, 3)).toMatchObject({ trace: null });
  });

  test('of a block lists its entries', () => {
    expect(valueOf(traceAnswer(subject(2), { kind: 'part', part: { block: 'x0' } }))).toEqual({
      kind: 'part',
      part: { block: 'x0' },
      entries: [
        { row: 0, column: 2 },
        { row: 1, column: 0 },
      ],
    });
  });
});
