import { describe, expect, test } from 'vitest';
import { newModelMemory } from '../../../src/compile/index.ts';
import { emptyDiagram } from '../../../src/diagram/index.ts';
import { fail, problem } from '../../../src/problem/index.ts';
import { modelAnswer } from '../../../src/worker/model-answer.ts';
import { askOneByOne } from '../../../src/worker/one-by-one.ts';
import type { Question, RevisionAnswer } from '../../../src/worker/protocol.ts';

type Derive = Extract<Question, { kind: 'derive' }>;

const question = (revision: number, isLive = false): Derive => ({
  kind: 'derive',
  revision,
  diagram: emptyDiagram(),
  channel: { input: 0, output: 0 },
  isLive,
});

const matrices = (revision: number) => modelAnswer(question(revision), 'auto', newModelMemory());

const poles = (revision: number): RevisionAnswer => ({
  kind: 'poles',
  revision,
  poles: { route: 'floating', poles: [] },
  zeros: { route: 'not-computed', zeros: [], reason: '' },
  stability: { verdict: 'stable', proved: false, standsIn: false },
  hidden: null,
  warnings: [],
});

function asked() {
  const sent: number[] = [];
  const line = askOneByOne(({ revision }) => void sent.push(revision));
  return { sent, line };
}

describe('derivations are asked one by one', () => {
  test('while one is under way only the newest waits', () => {
    const { sent, line } = asked();
    for (const revision of [1, 2, 3, 4]) line.ask(question(revision));
    expect(sent).toEqual([1]);
    line.answered(matrices(1));
    expect(sent).toEqual([1, 4]);
  });

  test('an edit goes out once the matrices before are there', () => {
    const { sent, line } = asked();
    line.ask(question(1));
    line.answered(matrices(1));
    line.ask(question(2));
    expect(sent).toEqual([1, 2]);
  });

  test('a moving value waits for the poles of its last position', () => {
    const { sent, line } = asked();
    line.ask(question(1, true));
    line.ask(question(2, true));
    line.answered(matrices(1));
    expect(sent).toEqual([1]);
    line.answered(poles(1));
    expect(sent).toEqual([1, 2]);
  });

  test('a moving value waits for slow poles only so long', async () => {
    const { sent, line } = asked();
    line.ask(question(1, true));
    line.answered(matrices(1));
    line.ask(question(2, true));
    await new Promise(resolve => setTimeout(resolve, 200));
    expect(sent).toEqual([1, 2]);
  });

  test('a drawing without a model is answered at once; older answers count for nothing', () => {
    const { sent, line } = asked();
    line.ask(question(7));
    line.ask(question(8));
    line.answered(poles(6));
    expect(sent).toEqual([7]);
    line.answered({ ...matrices(7), outcome: fail(problem('bad-expression', 'no')) });
    expect(sent).toEqual([7, 8]);
  });

  test('a worker started again is asked the newest question', () => {
    const { sent, line } = asked();
    line.ask(question(1));
    line.ask(question(2));
    line.askAgain();
    expect(sent).toEqual([1, 2]);
  });
});
