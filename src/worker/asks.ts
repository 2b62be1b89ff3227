/**
 * The questions on demand, in the worker. They wait until the model of their revision is there and its first answers are
 * sent, then the newest comes first. One that is about another revision than the newest, or that the same asker has replaced,
 * is answered as dropped, and so is one that a newer drawing overtakes.
 */

import type { AskAnswer, AskQuestion } from './protocol.ts';
import { type Patience, type Subject, TOPIC_MODULES, type Topic, type TopicModule } from './topics/index.ts';

export interface Asks {
  /** Takes a question in; a waiting one of the same asker is dropped for it. */
  ask(question: AskQuestion): void;
  /** A newer drawing has come: what is about an older one is dropped, now and where it is under way. */
  overtake(revision: number): void;
  /** The model of a revision, null where there is none; answers whatever waits for it. */
  settle(revision: number, subject: Subject | null): void;
}

/** @param turn  resolves once the messages that wait have been seen. */
export function openAsks(send: (answer: AskAnswer) => void, turn: () => Promise<void>): Asks {
  let waiting: AskQuestion[] = [];
  let newest = -1;
  let settled: { readonly revision: number; readonly subject: Subject | null } | null = null;
  let isWorking = false;
  /** The asker's number of what is under way, null where its answer is no longer wanted. */
  let wanted: AskQuestion | null = null;

  const drop = (question: AskQuestion) => send({ kind: 'ask', id: question.id, outcome: null });
  const dropWhere = (isOut: (question: AskQuestion) => boolean) => {
    for (const question of waiting.filter(isOut)) drop(question);
    waiting = waiting.filter(question => !isOut(question));
  };

  async function work(): Promise<void> {
    if (isWorking) return;
    isWorking = true;
    while (waiting.length > 0 && settled !== null && settled.revision === newest) {
      const question = waiting.pop();
      if (question !== undefined) await answerOne(question, settled.subject);
      await turn();
    }
    isWorking = false;
  }

  async function answerOne(question: AskQuestion, subject: Subject | null): Promise<void> {
    if (subject === null) return drop(question);
    wanted = question;
    const patience: Patience = {
      turn: async () => {
        await turn();
        return wanted === question;
      },
    };
    const module = (await TOPIC_MODULES[question.topic]()) as TopicModule<Topic<unknown, unknown>>;
    const outcome = wanted === question ? await module.answer(subject, question.question, patience) : null;
    send({ kind: 'ask', id: question.id, outcome: wanted === question ? outcome : null });
    wanted = null;
  }

  return {
    ask(question) {
      if (question.revision < newest) return drop(question);
      if (wanted?.asker === question.asker) wanted = null;
      dropWhere(other => other.asker === question.asker);
      waiting.push(question);
      void work();
    },
    overtake(revision) {
      newest = revision;
      wanted = null;
      dropWhere(question => question.revision < revision);
    },
    settle(revision, subject) {
      settled = { revision, subject };
      void work();
    },
  };
}
