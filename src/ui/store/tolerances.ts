/** The tolerances slice: the last judgement over the parameters' tolerances, and which drawing it was of. */

import type { Envelope, TolerancePlan, WorstCase } from '../../analysis/index.ts';
import type { Diagram } from '../../diagram/index.ts';

export interface TolerancesSlice {
  /** What was judged; it is out of date when the drawing's model or requirements are others. */
  readonly diagram: Diagram;
  readonly plan: TolerancePlan;
  readonly status: 'running' | 'finished' | 'stopped' | 'failed';
  /** Points judged so far. */
  readonly done: number;
  /** In the order of the requirements, once finished. */
  readonly worst: readonly (WorstCase | null)[];
  /** Names of the channel that the envelopes are of. */
  readonly channel: { readonly input: string; readonly output: string } | null;
  /** Over `time`, s. */
  readonly step: (Envelope & { readonly time: Float64Array }) | null;
  /** dB over `omega`, rad/s. */
  readonly magnitude: (Envelope & { readonly omega: Float64Array }) | null;
}
