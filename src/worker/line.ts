/**
 * The tab's end of the line to the worker. Only the newest derivation is waited for: while one runs, the next question is
 * held back and replaced by newer ones. A worker that dies is started again once for the same question, then said to be dead.
 */

import type { Diagram } from '../diagram/index.ts';
import type { Answer, Channel, FileAnswer, Notation, Question } from './protocol.ts';

export interface AnalysisLine {
  derive(revision: number, diagram: Diagram, channel: Channel): void;
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
  let nextFile = 0;
  let latest: Question | null = null;
  let deaths = 0;
  let worker = connect();

  function connect(): Worker {
    const fresh = start();
    fresh.onmessage = ({ data }: MessageEvent<Answer>) => {
      deaths = 0;
      if (data.kind !== 'file') return listener.answer(data);
      files.get(data.id)?.settle(data);
      files.delete(data.id);
    };
    fresh.onerror = event => {
      event.preventDefault?.();
      fresh.terminate();
      deaths += 1;
      if (deaths > 1) return listener.dead('The derivation stopped unexpectedly. Undo the last edit to go on.');
      worker = connect();
      if (latest) worker.postMessage(latest);
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
    derive(revision, diagram, channel) {
      latest = { kind: 'derive', revision, diagram, channel };
      ask(latest);
    },
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
