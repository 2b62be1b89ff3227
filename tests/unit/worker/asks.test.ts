import { describe, expect, test } from 'vitest';
import { compile } from '../../../src/compile/index.ts';
import { emptyDiagram } from '../../../src/diagram/index.ts';
import { openAsks } from '../../../src/worker/asks.ts';
import type { AskAnswer, AskQuestion } from '../../../src/worker/protocol.ts';
import type { Subject } from '../../../src/worker/topics/index.ts';

const question = (id: number, revision: number, asker = id): AskQuestion => ({
  kind: 'ask',
  id,
  revision,
  asker,
  topic: 'transfer-matrix',
  question: null,
});

function subject(): Subject {
  const diagram = emptyDiagram();
  const derived = compile(diagram);
  if (!derived.ok) throw new Error('an empty sheet is a diagram');
  return { diagram, derivation: derived.value };
}

/** Asks with a record of what was answered, in order, and a way to wait until there is nothing left to do. */
function opened() {
  const sent: AskAnswer[] = [];
  const asks = openAsks(
    answer => void sent.push(answer),
    () => new Promise(resolve => setTimeout(resolve, 0)),
  );
  const answered = async (count: number) => {
    while (sent.length < count) await new Promise(resolve => setTimeout(resolve, 1));
    return sent.map(({ id, outcome }) => ({ id, isDropped: outcome === null }));
  };
  return { asks, answered };
}

describe('questions on demand', () => {
  test('they wait for the model of their revision, and the newest is answered first', async () => {
    const { asks, answered } = opened();
    asks.overtake(3);
    asks.ask(question(1, 3));
    asks.ask(question(2, 3));
    asks.settle(3, subject());
    expect(await answered(2)).toEqual([
      { id: 2, isDropped: false },
      { id: 1, isDropped: false },
    ]);
  });

  test('one about an older drawing is dropped at once', async () => {
    const { asks, answered } = opened();
    asks.overtake(3);
    asks.ask(question(1, 2));
    expect(await answered(1)).toEqual([{ id: 1, isDropped: true }]);
  });

  test('a waiting one is dropped when the drawing changes', async () => {
    const { asks, answered } = opened();
    asks.overtake(3);
    asks.ask(question(1, 3));
    asks.overtake(4);
    expect(await answered(1)).toEqual([{ id: 1, isDropped: true }]);
  });

  test('the same asker waits for its newest question alone', async () => {
    const { asks, answered } = opened();
    asks.overtake(3);
    asks.ask(question(1, 3, 7));
    asks.ask(question(2, 3, 7));
    asks.settle(3, subject());
    expect(await answered(2)).toEqual([
      { id: 1, isDropped: true },
      { id: 2, isDropped: false },
    ]);
  });

  test('where there is no model they are dropped', async () => {
    const { asks, answered } = opened();
    asks.overtake(3);
    asks.ask(question(1, 3));
    asks.settle(3, null);
    expect(await answered(1)).toEqual([{ id: 1, isDropped: true }]);
  });
});
