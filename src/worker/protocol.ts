/**
 * The messages between the tab and the worker: plain data, each with the revision of the document it is about. A newer
 * `derive` makes every older question void; an answer for an older revision is dropped by whoever receives it.
 */

import type {
  ChannelFrequency,
  EnvelopeRequest,
  FrequencyCurve,
  HiddenMode,
  JudgedPoint,
  LoopTransfer,
  Margins,
  PoleSet,
  Stability,
  StepMetrics,
  StepResponse,
  TolerancePoint,
  ToleratedParameter,
  TransferFunction,
  ZeroSet,
} from '../analysis/index.ts';
import type { SelfCheck, UncheckedDerivation } from '../compile/index.ts';
import type { Notation } from '../deliver/index.ts';
import type { Diagram, PortReference } from '../diagram/index.ts';
import type { Result, Warning } from '../problem/index.ts';
import type { DiagramChange } from './diagram-change.ts';
import type { TopicName } from './topics/index.ts';

/** Position of an input and an output in the model's lists. */
export interface Channel {
  readonly input: number;
  readonly output: number;
}

export type { Notation } from '../deliver/index.ts';

export type Question =
  | {
      readonly kind: 'derive';
      readonly revision: number;
      readonly diagram: Diagram;
      readonly channel: Channel;
      /** A value of it is still moving. */
      readonly isLive: boolean;
    }
  | { readonly kind: 'channel'; readonly revision: number; readonly channel: Channel }
  | {
      readonly kind: 'file';
      readonly id: number;
      readonly diagram: Diagram;
      readonly format: string;
      readonly notation: Notation;
      /** Whether the file is of the minimal model. */
      readonly minimal: boolean;
    }
  | AskQuestion
  | JudgeQuestion;

/** A question as it crosses to the worker: a drawing to derive as what is new in it since the one posted before. */
export type PostedQuestion =
  | Exclude<Question, { kind: 'derive' }>
  | (Omit<Extract<Question, { kind: 'derive' }>, 'diagram'> & { readonly change: DiagramChange });

/** A question on demand about the drawing of a revision; its topic says what `question` holds. */
export interface AskQuestion {
  readonly kind: 'ask';
  readonly id: number;
  readonly revision: number;
  /** Who asks: a newer question of the same asker takes the older one's place. */
  readonly asker: number;
  readonly topic: TopicName;
  readonly question: unknown;
}

/** Points of a tolerance plan, for a worker of the pool: it is about this diagram and no revision. */
export interface JudgeQuestion {
  readonly kind: 'judge';
  readonly id: number;
  readonly diagram: Diagram;
  readonly parameters: readonly ToleratedParameter[];
  readonly points: readonly TolerancePoint[];
  readonly envelope: EnvelopeRequest | null;
}

/** Values of quantities for the screen, by parameter name and by block id (of the top sheet, `outer.inner.id` inside groups). */
export interface QuantityValues {
  readonly parameters: Readonly<Record<string, number>>;
  readonly blocks: Readonly<Record<string, number>>;
}

export interface ModelAnswer {
  readonly kind: 'model';
  readonly revision: number;
  readonly outcome: Result<UncheckedDerivation>;
  readonly values: QuantityValues;
  /** Milliseconds the derivation took in the worker. */
  readonly elapsed: number;
}

/** While a value moves it comes last, and only where no newer question waits. */
export interface CheckAnswer {
  readonly kind: 'check';
  readonly revision: number;
  readonly selfCheck: SelfCheck;
}

export interface PolesAnswer {
  readonly kind: 'poles';
  readonly revision: number;
  readonly poles: PoleSet;
  readonly zeros: ZeroSet;
  readonly stability: Stability;
  /** Poles that no transfer function shows; null where the model is too large to tell. */
  readonly hidden: readonly HiddenMode[] | null;
  /** The same as warnings. */
  readonly warnings: readonly Warning[];
}

export interface ChannelAnswer {
  readonly kind: 'channel';
  readonly revision: number;
  readonly channel: Channel;
  readonly transferFunction: TransferFunction;
  readonly step: StepResponse;
  readonly metrics: StepMetrics;
}

export interface FrequencyAnswer {
  readonly kind: 'frequency';
  readonly revision: number;
  readonly channel: Channel;
  readonly response: ChannelFrequency;
}

/** What the loop does at one cut. */
export interface CutAnswer {
  readonly to: PortReference;
  /** `cut 1`, or as the drawing names it. */
  readonly name: string;
  /** What the loop transfer is refused for where there is none. */
  readonly outcome: Result<CutLoop>;
}

export interface CutLoop extends Pick<LoopTransfer, 'route' | 'closedLoop'> {
  readonly curve: FrequencyCurve;
  readonly margins: Margins;
}

export interface CutsAnswer {
  readonly kind: 'cuts';
  readonly revision: number;
  /** In the drawing's order. */
  readonly cuts: readonly CutAnswer[];
}

export interface FileAnswer {
  readonly kind: 'file';
  readonly id: number;
  readonly outcome: Result<string | Uint8Array<ArrayBuffer>>;
}

export interface AskAnswer {
  readonly kind: 'ask';
  readonly id: number;
  /** Null where it was dropped, since a newer question or drawing came, or since there is no model. */
  readonly outcome: Result<unknown> | null;
}

export interface JudgeAnswer {
  readonly kind: 'judge';
  readonly id: number;
  /** In the order of the points. */
  readonly judged: readonly JudgedPoint[];
}

/** What an answer is that belongs to a revision and is not awaited by who asked. */
export type RevisionAnswer = Exclude<Answer, FileAnswer | AskAnswer | JudgeAnswer>;

export type Answer =
  | ModelAnswer
  | CheckAnswer
  | PolesAnswer
  | ChannelAnswer
  | FrequencyAnswer
  | CutsAnswer
  | FileAnswer
  | AskAnswer
  | JudgeAnswer;
