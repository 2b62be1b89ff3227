/**
 * The results slice: the worker's newest answers. What was derived last stays on screen until a newer derivation arrives,
 * so that nothing flickers while the hand moves; `answered` says for which revision it holds.
 */

import type { SelfCheck, UncheckedDerivation } from '../../compile/index.ts';
import type { Problem } from '../../problem/index.ts';
import type {
  ChannelAnswer,
  CutsAnswer,
  FrequencyAnswer,
  PolesAnswer,
  QuantityValues,
  RevisionAnswer,
} from '../../worker/index.ts';

export interface ResultsSlice {
  readonly status: 'pending' | 'failed' | 'derived';
  /** Revision of the document that `derivation` or `problems` belong to; −1 before the first answer. */
  readonly answered: number;
  readonly derivation: UncheckedDerivation | null;
  /** Of `derivation`; null until it is there. */
  readonly selfCheck: SelfCheck | null;
  readonly problems: readonly Problem[];
  readonly values: QuantityValues;
  readonly poles: PolesAnswer | null;
  readonly channel: ChannelAnswer | null;
  readonly frequency: FrequencyAnswer | null;
  readonly cuts: CutsAnswer | null;
  /** Why there is no answer at all: the worker died twice on the same question. */
  readonly stopped: string | null;
}

export const NO_RESULTS: ResultsSlice = {
  status: 'pending',
  answered: -1,
  derivation: null,
  selfCheck: null,
  problems: [],
  values: { parameters: {}, blocks: {} },
  poles: null,
  channel: null,
  frequency: null,
  cuts: null,
  stopped: null,
};

/** The slice with an answer taken in; an answer for an older revision than the newest one is dropped. */
export function answered(slice: ResultsSlice, answer: RevisionAnswer): ResultsSlice {
  if (answer.revision < slice.answered) return slice;
  switch (answer.kind) {
    case 'model':
      return answer.outcome.ok
        ? {
            ...slice,
            status: 'derived',
            answered: answer.revision,
            derivation: answer.outcome.value,
            selfCheck: null,
            problems: [],
            values: answer.values,
            stopped: null,
          }
        : {
            ...NO_RESULTS,
            status: 'failed',
            answered: answer.revision,
            problems: answer.outcome.problems,
            values: answer.values,
          };
    case 'check':
      return { ...slice, selfCheck: answer.selfCheck };
    case 'poles':
      return { ...slice, poles: answer };
    case 'channel':
      return { ...slice, channel: answer };
    case 'frequency':
      return { ...slice, frequency: answer };
    case 'cuts':
      return { ...slice, cuts: answer };
    default:
      return answer satisfies never;
  }
}
