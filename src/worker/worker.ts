/** The worker: one switch over pure functions, the newest derivation first, older ones dropped between their stages. */

import type { StateSpace } from '../compile/index.ts';
import { channelAnswer, deriveStages, fileAnswer } from './answer.ts';
import type { Answer, Question } from './protocol.ts';

/** What is left to do for the newest derivation; a stage a turn, so that a newer question is seen in between. */
let pending: Generator<Answer> | null = null;

/** The model derived last, for questions about another channel of it. */
let latest: { readonly revision: number; readonly model: StateSpace } | null = null;

self.onmessage = ({ data }: MessageEvent<Question>) => {
  switch (data.kind) {
    case 'derive':
      pending = deriveStages(data);
      return takeTurn();
    case 'channel':
      return send(latest === null ? null : channelAnswer(latest.revision, latest.model, data.channel));
    case 'file':
      return send(fileAnswer(data));
    default:
      return data satisfies never;
  }
};

/** A message to itself comes behind those already waiting, without the delay that timers have. */
const turns = new MessageChannel();
turns.port1.onmessage = () => {
  const stage = pending?.next();
  if (stage === undefined || stage.done === true) {
    pending = null;
    return;
  }
  const answer = stage.value;
  if (answer.kind === 'model') {
    latest = answer.outcome.ok ? { revision: answer.revision, model: answer.outcome.value.model } : null;
  }
  send(answer);
  takeTurn();
};

function takeTurn(): void {
  turns.port2.postMessage(null);
}

function send(answer: Answer | null): void {
  if (answer !== null) self.postMessage(answer);
}
