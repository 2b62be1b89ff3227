/**
 * What is said under the system matrix of the entry, block or wire that is pointed at; the answer goes to the sheet as well. The
 * live region stays while what is pointed at changes, so that each change is spoken.
 */

import './trace.css';
import { useEffect } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import type { TraceAnswer } from '../../worker/index.ts';
import { useAnswer } from '../answers/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { PartWords } from './PartWords.tsx';
import { partTitle } from './part-title.ts';
import { TraceWords } from './TraceWords.tsx';
import { spokenPart, spokenTrace } from './trace-words.ts';

const pointing = (state: State) => state.pointing;
const NOTHING = { kind: 'entry', place: { row: 0, column: 0 } } as const;

export function TraceLine({ model }: { readonly model: StateSpace }) {
  const { entry, part, by } = useStore(pointing);
  const question = entry !== null ? ({ kind: 'entry', place: entry } as const) : partQuestion(part);
  const { answer } = useAnswer('trace', question ?? NOTHING, question !== null);
  const isOver = question === null;
  useEffect(() => {
    actions.showTrace(isOver ? null : answer);
  }, [isOver, answer]);
  useEscape();
  const shown = question !== null && answer?.kind === question.kind ? answer : null;
  return (
    <>
      <p className="visually-hidden" role="status">
        {shown !== null && spokenAnswer(shown, model)}
      </p>
      {shown?.kind === 'part' && <PartWords model={model} entries={shown.entries} part={shown.part} />}
      {shown?.kind === 'entry' && shown.trace !== null && (
        <TraceWords model={model} place={shown.place} trace={shown.trace} isKept={by === 'keep'} />
      )}
    </>
  );
}

function partQuestion(part: State['pointing']['part']) {
  return part === null ? null : ({ kind: 'part', part } as const);
}

function spokenAnswer(answer: TraceAnswer, model: StateSpace): string {
  if (answer.kind === 'part') return spokenPart(partTitle(answer.part), model, answer.entries);
  return answer.trace === null ? '' : spokenTrace(answer.trace);
}

/** Escape lets go of what is kept wherever the focus is. */
function useEscape(): void {
  useEffect(() => {
    const onKey = ({ key }: KeyboardEvent) => {
      if (key === 'Escape') actions.leaveEntry('escape');
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, []);
}
