/**
 * The tab's end of the line to the worker. One derivation is under way at a time: while it runs, the next question is held
 * back and replaced by newer ones, so that the newest is answered first and none is asked in vain. A worker that dies is
 * started again once for the same question, then said to be dead.
 */

import type { Diagram } from '../diagram/index.ts';
import type { Result } from '../problem/index.ts';
import { changeSince } from './diagram-change.ts';
import { askOneByOne } from './one-by-one.ts';
import type {
  Answer,
  AskAnswer,
  Channel,
  FileAnswer,
  Notation,
  PostedQuestion,
  Question,
  RevisionAnswer,
} from './protocol.ts';
import type { TopicAnswer, TopicName, TopicQuestion } from './topics/index.ts';

export interface AnalysisLine {
  /** @param isLive  the value is still moving: doubles will do, and every stage is answered before the next question. */
  derive(revision: number, diagram: Diagram, channel: Channel, isLive?: boolean): void;
  chooseChannel(revision: number, channel: Channel): void;
  /**
   * Asks on demand about the drawing of a revision that is derived or being derived. Null where the answer was dropped: a
   * newer drawing or a newer question of the same asker came, there is no model, or the worker died on it.
   */
  ask<T extends TopicName>(
    revision: number,
    asker: number,
    topic: T,
    question: TopicQuestion<T>,
  ): Promise<Result<TopicAnswer<T>> | null>;
  /** @param minimal  whether the file is of the minimal model. */
  file(diagram: Diagram, format: string, notation: Notation, minimal: boolean): Promise<FileAnswer>;
  close(): void;
}

interface Listener {
  readonly answer: (answer: RevisionAnswer) => void;
  readonly dead: (message: string) => void;
}

/** @param start  makes a worker; called again when one has died. */
export function openLine(start: () => Worker, listener: Listener): AnalysisLine {
  const files = new Map<number, { question: Question; settle: (answer: FileAnswer) => void }>();
  const derivations = askOneByOne(ask);
  const asks = new Map<number, (answer: AskAnswer | null) => void>();
  let nextId = 0;
  let deaths = 0;
  /** The drawing that the worker has. */
  let posted: Diagram | null = null;
  let worker = connect();

  function connect(): Worker {
    const fresh = start();
    posted = null;
    fresh.onmessage = ({ data }: MessageEvent<Answer>) => {
      deaths = 0;
      switch (data.kind) {
        case 'file':
          files.get(data.id)?.settle(data);
          return void files.delete(data.id);
        case 'ask':
          asks.get(data.id)?.(data);
          return void asks.delete(data.id);
        case 'judge':
          return; // asked of the pool's workers, never of this one
        default:
          listener.answer(data);
          return derivations.answered(data);
      }
    };
    fresh.onerror = event => {
      event.preventDefault?.();
      fresh.terminate();
      deaths += 1;
      // What was asked on demand may be what it died of: it is dropped, the derivation asked again.
      for (const settle of asks.values()) settle(null);
      asks.clear();
      if (deaths > 1) {
        derivations.forget();
        return listener.dead('The derivation stopped unexpectedly. Undo the last edit to go on.');
      }
      worker = connect();
      derivations.askAgain();
      for (const { question } of files.values()) post(question);
    };
    return fresh;
  }

  function ask(question: Question): void {
    if (deaths > 1) {
      deaths = 0;
      worker = connect();
    }
    post(question);
  }

  function post(question: Question): void {
    worker.postMessage(asPosted(question));
  }

  function asPosted(question: Question): PostedQuestion {
    if (question.kind !== 'derive') return question;
    const { diagram, ...rest } = question;
    const change = changeSince(posted, diagram);
    posted = diagram;
    return { ...rest, change };
  }

  return {
    derive: (revision, diagram, channel, isLive = false) =>
      derivations.ask({ kind: 'derive', revision, diagram, channel, isLive }),
    chooseChannel: (revision, channel) => ask({ kind: 'channel', revision, channel }),
    ask<T extends TopicName>(revision: number, asker: number, topic: T, question: TopicQuestion<T>) {
      const id = nextId++;
      return new Promise<Result<TopicAnswer<T>> | null>(settle => {
        // The topic's own file made the answer: its type is the table's.
        asks.set(id, answer => settle((answer?.outcome ?? null) as Result<TopicAnswer<T>> | null));
        ask({ kind: 'ask', id, revision, asker, topic, question });
      });
    },
    file(diagram, format, notation, minimal) {
      const id = nextId++;
      const question: Question = { kind: 'file', id, diagram, format, notation, minimal };
      return new Promise(settle => {
        files.set(id, { question, settle });
        ask(question);
      });
    },
    close: () => worker.terminate(),
  };
}
