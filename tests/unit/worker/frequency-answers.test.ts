/** The worker's answers over frequency: plain data for the channel and for every cut, refusals among them. */

import { expect, test } from 'vitest';
import { compile } from '../../../src/compile/index.ts';
import { type Diagram, readDiagram } from '../../../src/diagram/index.ts';
import { cutsAnswer, frequencyAnswer } from '../../../src/worker/frequency-answers.ts';

function loopWith(plant: object, cuts: readonly object[] = []): Diagram {
  const read = readDiagram(
    JSON.stringify({
      format: 'poleward-diagram',
      version: 1,
      title: '',
      parameters: [],
      blocks: [
        { id: 'r', kind: 'input' },
        { id: 'e', kind: 'summer', signs: '+-' },
        { id: 'k', kind: 'gain', gain: '2' },
        { id: 'plant', ...plant },
        { id: 'y', kind: 'output' },
      ],
      wires: [
        { from: ['r', 0], to: ['e', 0] },
        { from: ['e', 0], to: ['k', 0] },
        { from: ['k', 0], to: ['plant', 0] },
        { from: ['plant', 0], to: ['e', 1] },
        { from: ['plant', 0], to: ['y', 0] },
      ],
      cuts,
    }),
  );
  if (!read.ok) throw new Error(read.problems[0]?.message);
  return read.value;
}

test('cuts are answered in order with their names, in plain data', () => {
  const diagram = loopWith({ kind: 'integrator' }, [{ to: ['e', 1] }, { to: ['y', 0], name: 'measurement' }]);
  const answer = structuredClone(cutsAnswer(7, diagram));
  expect(answer).toMatchObject({ kind: 'cuts', revision: 7, cuts: [{ name: 'cut 1' }, { name: 'measurement' }] });
  const [loop, open] = answer.cuts.map(({ outcome }) => (outcome.ok ? outcome.value : null));
  expect(loop?.margins.phaseMargin).toEqual({ omega: 2, phaseMargin: 90 });
  expect(loop?.curve.omega.includes(2)).toBe(true);
  expect(loop?.curve.phase.every(phase => phase === -90)).toBe(true);
  expect(open?.margins.phaseMargin).toBeNull();
});

test('a cut whose loop transfer needs the derivative of its signal says so', () => {
  const diagram = loopWith({ kind: 'differentiator' }, [{ to: ['plant', 0] }]);
  const [cut] = cutsAnswer(1, diagram).cuts;
  expect(cut?.outcome).toMatchObject({ ok: false });
});

test('a channel that is not there has no answer', () => {
  const diagram = loopWith({ kind: 'integrator' });
  const derived = compile(diagram);
  if (!derived.ok) throw new Error('no model');
  const { model } = derived.value;
  expect(frequencyAnswer(1, diagram, model, { input: 1, output: 0 })).toBeNull();
  // 2 / (s + 2): −3 dB at 2 rad/s
  expect(frequencyAnswer(1, diagram, model, { input: 0, output: 0 })?.response.bandwidth).toBe(2);
});
