/**
 * The tab's end of the line to the worker. One derivation is under way at a time: while it runs, the next question is held
 * back and replaced by newer ones, so that the newest is answered first and none is asked in vain. A worker that dies is
 * started again once for the same question, then said to be dead.
 */

import type { Diagram } from '../diagram/index.ts';
import { askOneByOne } from './one-by-one.ts';
import type { Answer, Channel, FileAnswer, Notation, Question } from './protocol.ts';

export interface AnalysisLine {
  /** @param isLive  the value is still moving: doubles will do, and every stage is answered before the next question. */
  derive(revision: number, diagram: Diagram, channel: Channel, isLive?: boolean): void;
  chooseChannel(revision: number, channel: Channel): void;
  file(diagram: Diagram, format: string, notation: Notation): Promise<FileAnswer>;
  close(): void;
}

interface Listener {
  readonly answer: (answer: Exclude<Answer, FileAnswer>) => void;
  readonly dead: (message: string) => void;
}

/** @param start  makes a worker; called again when one has died. */
export function openLine(start: () => Worker, listener: Listener): AnalysisLine {
  const files = new Map<number, { question: Question; settle: (answer: FileAnswer) => void }>();
  const derivations = askOneByOne(ask);
  let nextFile = 0;
  let deaths = 0;
  let worker = connect();

  function connect(): Worker {
    const fresh = start();
    fresh.onmessage = ({ data }: MessageEvent<Answer>) => {
      deaths = 0;
      if (data.kind !== 'file') {
        listener.answer(data);
        return derivations.answered(data);
      }
      files.get(data.id)?.settle(data);
      files.delete(data.id);
    };
    fresh.onerror = event => {
      event.preventDefault?.();
      fresh.terminate();
      deaths += 1;
      if (deaths > 1) {
        derivations.forget();
        return listener.dead('The derivation stopped unexpectedly. Undo the last edit to go on.');
      }
      worker = connect();
      derivations.askAgain();
      for (const { question } of files.values()) worker.postMessage(question);
    };
    return fresh;
  }

  function ask(question: Question): void {
    if (deaths > 1) {
      deaths = 0;
      worker = connect();
    }
    worker.postMessage(question);
  }

  return {
    derive: (revision, diagram, channel, isLive = false) =>
      derivations.ask({ kind: 'derive', revision, diagram, channel, isLive }),
    chooseChannel: (revision, channel) => ask({ kind: 'channel', revision, channel }),
    file(diagram, format, notation) {
      const id = nextFile++;
      const question: Question = { kind: 'file', id, diagram, format, notation };
      return new Promise(settle => {
        files.set(id, { question, settle });
        ask(question);
      });
    },
    close: () => worker.terminate(),
  };
}
