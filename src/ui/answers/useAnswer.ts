/**
 * What the worker answers on demand about the drawing on screen. Asks when the model or the question changes; the last
 * answer stays while a newer one is on its way, so that nothing flickers.
 */

import { useEffect, useRef, useState } from 'react';
import type { Problem } from '../../problem/index.ts';
import type { TopicAnswer, TopicName, TopicQuestion } from '../../worker/index.ts';
import { type State, useStore } from '../store/index.ts';
import { derivationLine } from './derivation-line.ts';

export interface Answered<A> {
  /** The newest answer there is; null before the first and where it was refused. */
  readonly answer: A | null;
  /** Why there is no answer. */
  readonly problems: readonly Problem[];
  /** A newer one is on its way. */
  readonly isPending: boolean;
}

const revision = (state: State) => (state.results.status === 'derived' ? state.results.answered : -1);

/** How many have asked: a number for each component that does. */
let askers = 0;

/**
 * The answer to a question on a topic, kept up to date with the drawing.
 *
 * @param question  plain data, compared by its content.
 * @param isWanted  false asks nothing, and keeps what is known.
 */
export function useAnswer<T extends TopicName>(
  topic: T,
  question: TopicQuestion<T>,
  isWanted = true,
): Answered<TopicAnswer<T>> {
  const now = useStore(revision);
  const [asker] = useState(() => askers++);
  const key = JSON.stringify(question);
  const latest = useRef(question);
  latest.current = question;
  const [known, setKnown] = useState<Answered<TopicAnswer<T>>>({ answer: null, problems: [], isPending: isWanted });
  // biome-ignore lint/correctness/useExhaustiveDependencies: the question is compared by its text
  useEffect(() => {
    if (!isWanted || now < 0) return;
    let isCurrent = true;
    setKnown(before => (before.isPending ? before : { ...before, isPending: true }));
    derivationLine.ask(now, asker, topic, latest.current).then(outcome => {
      if (!isCurrent) return;
      // Dropped: a newer drawing asks anew; after a worker's death nothing more comes for this one.
      if (outcome === null) return setKnown(before => ({ ...before, isPending: false }));
      setKnown(
        outcome.ok
          ? { answer: outcome.value, problems: [], isPending: false }
          : { answer: null, problems: outcome.problems, isPending: false },
      );
    });
    return () => {
      isCurrent = false;
    };
  }, [topic, key, now, isWanted, asker]);
  return known;
}
