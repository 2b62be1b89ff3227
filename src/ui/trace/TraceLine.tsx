/** What is said under the system matrix of the entry, block or wire that is pointed at; the answer goes to the sheet as well. */

import './trace.css';
import { useEffect } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import { useAnswer } from '../answers/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { PartWords } from './PartWords.tsx';
import { TraceWords } from './TraceWords.tsx';

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
  if (question === null || answer === null || answer.kind !== question.kind) return null;
  if (answer.kind === 'part') return <PartWords model={model} entries={answer.entries} part={answer.part} />;
  if (answer.trace === null) return null;
  return <TraceWords model={model} place={answer.place} trace={answer.trace} isKept={by === 'keep'} />;
}

function partQuestion(part: State['pointing']['part']) {
  return part === null ? null : ({ kind: 'part', part } as const);
}
