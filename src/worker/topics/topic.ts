/**
 * What a topic is: a question about the model on screen that is asked on demand, by whoever shows its answer. A topic is one
 * file beside this one with a pure `answer`, and one line in each table of topics.ts; it is loaded in the worker when it is first asked.
 */

import type { UncheckedDerivation } from '../../compile/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import type { Result } from '../../problem/index.ts';

/** The drawing and what was derived from it, both of one revision. */
export interface Subject {
  readonly diagram: Diagram;
  readonly derivation: UncheckedDerivation;
}

/** How a long answer gives way: it waits at `turn` now and then, and stops where it comes back false, since nobody waits for it any more. */
export interface Patience {
  readonly turn: () => Promise<boolean>;
}

/** The pair of types that one topic stands for; both are plain data. */
export interface Topic<Question, Answer> {
  readonly question: Question;
  readonly answer: Answer;
}

/** What a topic's file exports. */
export interface TopicModule<T extends Topic<unknown, unknown>> {
  /** Answers, or says in a problem why there is no answer. */
  answer(
    subject: Subject,
    question: T['question'],
    patience: Patience,
  ): Result<T['answer']> | Promise<Result<T['answer']>>;
}
