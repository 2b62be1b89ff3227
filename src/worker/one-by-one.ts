/**
 * Keeps one derivation under way. A question that comes meanwhile waits and takes the place of one that waited before. An
 * edit goes out as soon as the matrices of the one before are there; while a value moves, once its curves and poles are
 * there too, so that they move along, but no later than PATIENCE after the matrices.
 */

import type { Question, RevisionAnswer } from './protocol.ts';

type Derive = Extract<Question, { kind: 'derive' }>;

/** Milliseconds that a moving value waits for the curves of its last position once the matrices are there. */
const PATIENCE = 120;

export interface Derivations {
  ask(question: Derive): void;
  /** Takes note of an answer. */
  answered(answer: RevisionAnswer): void;
  /** Asks the newest question of a worker just started. */
  askAgain(): void;
  /** Nothing is under way any more, and nothing waits. */
  forget(): void;
}

/** @param send  hands a question to the worker. */
export function askOneByOne(send: (question: Derive) => void): Derivations {
  let underWay: Derive | null = null;
  let waiting: Derive | null = null;
  let hasMatrices = false;
  let timer: ReturnType<typeof setTimeout> | null = null;

  function sendNow(question: Derive | null): void {
    if (timer !== null) clearTimeout(timer);
    timer = null;
    underWay = question;
    waiting = null;
    hasMatrices = false;
    if (question !== null) send(question);
  }

  function afterMatrices(): void {
    hasMatrices = true;
    if (waiting !== null && !waiting.isLive) return sendNow(waiting);
    timer = setTimeout(() => sendNow(waiting), PATIENCE);
  }

  return {
    ask(question) {
      if (underWay === null || (hasMatrices && !question.isLive)) sendNow(question);
      else waiting = question;
    },
    answered(answer) {
      if (underWay === null || answer.revision !== underWay.revision) return;
      if (answer.kind === 'model' && answer.outcome.ok) afterMatrices();
      else if (answer.kind === 'model' || answer.kind === 'poles') sendNow(waiting);
    },
    askAgain: () => sendNow(waiting ?? underWay),
    forget: () => sendNow(null),
  };
}
