/**
 * The worker: one switch over pure functions. The newest derivation is answered first and in stages, a turn of the event loop
 * each, so that a newer question is seen in between and the rest of the older one is dropped. Analyses and files are loaded
 * when they are first needed, after the first matrices. While a value moves, a drawing that takes long is derived in doubles.
 */

import { newModelMemory, type StateSpace, type UncheckedDerivation } from '../compile/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { openAsks } from './asks.ts';
import { withChange } from './diagram-change.ts';
import { modelAnswer } from './model-answer.ts';
import type { Answer, Channel, PostedQuestion, Question } from './protocol.ts';

/** Milliseconds beyond which an exact derivation is too slow to follow a moving value: half a frame. */
const LIVE_LIMIT = 8;

/** What the last derivation left for the next. */
const memory = newModelMemory();

/** Milliseconds that the last exact derivation took. */
let exactElapsed = 0;
/** The drawing posted last. */
let posted: Diagram | null = null;
/** The newest question for a derivation, and its model once it is derived. */
let newest: Extract<Question, { kind: 'derive' }> | null = null;
/** The channel chosen since that question. */
let chosen: Channel | null = null;
let latest: { readonly revision: number; readonly diagram: Diagram; readonly derivation: UncheckedDerivation } | null =
  null;

const asks = openAsks(send, turn);

self.onmessage = ({ data }: MessageEvent<PostedQuestion>) => {
  switch (data.kind) {
    case 'derive': {
      const { change, ...question } = data;
      posted = withChange(posted, change);
      newest = { ...question, diagram: posted };
      chosen = null;
      asks.overtake(data.revision);
      return void derive(newest);
    }
    case 'channel':
      return void channel(data);
    case 'ask':
      return asks.ask(data);
    case 'judge':
      return void import('./judge-answer.ts').then(({ judgeAnswer }) => send(judgeAnswer(data)));
    case 'file':
      return void import('./file-answer.ts').then(({ fileAnswer }) => send(fileAnswer(data)));
    default:
      return data satisfies never;
  }
};

async function derive(question: Extract<Question, { kind: 'derive' }>): Promise<void> {
  await turn();
  if (newest !== question) return;
  const field = question.isLive && exactElapsed > LIVE_LIMIT ? 'double' : 'auto';
  const answer = modelAnswer(question, field, memory);
  if (field === 'auto') exactElapsed = answer.elapsed;
  latest = answer.outcome.ok ? { ...question, derivation: answer.outcome.value } : null;
  send(answer);
  if (latest === null) return asks.settle(question.revision, null);
  const { derivation } = latest;
  const { model } = derivation;
  if (!question.isLive) await check(question, model);
  const { channelAnswer, polesAnswer } = await import('./analysis-answers.ts');
  await turn();
  if (newest !== question) return;
  send(channelAnswer(question.revision, model, chosen ?? question.channel));
  await turn();
  if (newest !== question) return;
  send(polesAnswer(question.revision, model));
  if (question.isLive) await check(question, model);
  await turn();
  if (newest === question) await frequencies(question, model);
  if (newest === question) asks.settle(question.revision, { diagram: question.diagram, derivation });
}

/** Waits its turn, and for its part of the program the first time. */
async function check(question: Extract<Question, { kind: 'derive' }>, model: StateSpace): Promise<void> {
  const { checkAnswer } = await import('./check-answer.ts');
  await turn();
  if (newest === question) send(checkAnswer(question.revision, question.diagram, model));
}

/** The answers over frequency, the cuts first since the verdict line shows one. */
async function frequencies(question: Extract<Question, { kind: 'derive' }>, model: StateSpace): Promise<void> {
  const { revision, diagram } = question;
  const { cutsAnswer, frequencyAnswer } = await import('./frequency-answers.ts');
  if (newest !== question) return;
  send(cutsAnswer(revision, diagram));
  await turn();
  if (newest === question) send(frequencyAnswer(revision, diagram, model, chosen ?? question.channel));
}

async function channel(question: Extract<Question, { kind: 'channel' }>): Promise<void> {
  const { channelAnswer } = await import('./analysis-answers.ts');
  chosen = question.channel;
  if (latest === null) return;
  send(channelAnswer(latest.revision, latest.derivation.model, question.channel));
  const { frequencyAnswer } = await import('./frequency-answers.ts');
  if (chosen === question.channel) {
    send(frequencyAnswer(latest.revision, latest.diagram, latest.derivation.model, question.channel));
  }
}

/** Resolves behind the messages already waiting, without the delay that timers have. */
function turn(): Promise<void> {
  return new Promise(resolve => {
    const { port1, port2 } = new MessageChannel();
    port1.onmessage = () => {
      port1.close();
      resolve();
    };
    port2.postMessage(null);
  });
}

function send(answer: Answer | null): void {
  if (answer !== null) self.postMessage(answer);
}
