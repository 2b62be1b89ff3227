/** What the Time tab is asked for, as the hand writes it, and the question that it makes. */

import type { ResponseQuestion, Stimulus } from '../../worker/index.ts';

export type StimulusKind = Stimulus['kind'];

export interface RecordedSignal {
  readonly name: string;
  readonly time: readonly number[];
  readonly values: readonly number[];
}

export interface TimeDraft {
  readonly kind: StimulusKind;
  readonly size: string;
  /** rad/s. */
  readonly omega: string;
  /** s. */
  readonly width: string;
  readonly recorded: RecordedSignal | null;
  /** s; blank: chosen from the poles. */
  readonly horizon: string;
  readonly fromInitial: boolean;
  /** Names of outputs shown beside the chosen one. */
  readonly others: readonly string[];
}

export const FIRST_DRAFT: TimeDraft = {
  kind: 'step',
  size: '1',
  omega: '1',
  width: '1',
  recorded: null,
  horizon: '',
  fromInitial: false,
  others: [],
};

export const STIMULUS_WORDS: Readonly<Record<StimulusKind, string>> = {
  step: 'step',
  impulse: 'impulse',
  ramp: 'ramp',
  sine: 'sine',
  pulse: 'pulse',
  recorded: 'recorded signal',
  none: 'nothing',
};

/** Whether it is what the worker answers at every edit without being asked. */
export function isPlain({ kind, size, horizon, fromInitial, others }: TimeDraft): boolean {
  return kind === 'step' && size.trim() === '1' && horizon.trim() === '' && !fromInitial && others.length === 0;
}

/** The stimulus, or the sentence that says which field is wrong. */
export function stimulusOf(draft: TimeDraft): Stimulus | string {
  const size = numberIn(draft.size);
  switch (draft.kind) {
    case 'none':
      return { kind: 'none' };
    case 'step':
    case 'impulse':
    case 'ramp':
      return size === null ? 'Size: write a number.' : { kind: draft.kind, size };
    case 'sine': {
      const omega = numberIn(draft.omega);
      if (size === null) return 'Size: write a number.';
      return omega === null || omega <= 0 ? 'Frequency: write a number above zero.' : { kind: 'sine', size, omega };
    }
    case 'pulse': {
      const width = numberIn(draft.width);
      if (size === null) return 'Size: write a number.';
      return width === null || width <= 0 ? 'Width: write a number above zero.' : { kind: 'pulse', size, width };
    }
    case 'recorded':
      if (draft.recorded === null) return 'Choose a file with two columns, time and value.';
      return { kind: 'recorded', time: draft.recorded.time, values: draft.recorded.values };
    default:
      return draft.kind satisfies never;
  }
}

/** The horizon in s, null where it is left to the poles, or what is wrong with it. */
export function horizonOf({ horizon }: TimeDraft): number | null | string {
  if (horizon.trim() === '') return null;
  const seconds = numberIn(horizon);
  return seconds === null || seconds <= 0 ? 'Until: write a number of seconds above zero, or nothing.' : seconds;
}

/** The question, or the sentence that says which field is wrong. */
export function questionOf(draft: TimeDraft, input: number, outputs: readonly number[]): ResponseQuestion | string {
  const stimulus = stimulusOf(draft);
  if (typeof stimulus === 'string') return stimulus;
  const horizon = horizonOf(draft);
  if (typeof horizon === 'string') return horizon;
  const isFree = stimulus.kind === 'none';
  return { input: isFree ? null : input, outputs, stimulus, horizon, fromInitial: draft.fromInitial || isFree };
}

function numberIn(text: string): number | null {
  const value = text.trim() === '' ? Number.NaN : Number(text.trim().replace('−', '-'));
  return Number.isFinite(value) ? value : null;
}
