/** From the worker's answer to what the plot shows: which curves, and the sentences about them. */

import type { StepMetrics } from '../../analysis/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { plainName } from '../../expression/index.ts';
import type { ChannelAnswer, Response } from '../../worker/index.ts';
import { formatNumber } from '../figures/index.ts';
import type { StepContent, StepCurve } from '../plots/index.ts';
import { STIMULUS_WORDS, type TimeDraft } from './time-draft.ts';

/** A curve that was kept for comparison. */
export interface KeptCurve extends StepCurve {
  readonly output: string;
}

/** The plot of an answer on demand; null where it has no curve at all. */
export function responseContent(
  model: StateSpace,
  channelAnswer: ChannelAnswer,
  outputs: readonly number[],
  answer: Response,
  draft: TimeDraft,
  kept: readonly KeptCurve[],
): StepContent | null {
  const { channel } = channelAnswer;
  const input = draft.kind === 'none' ? '' : (model.inputs[channel.input]?.name ?? '');
  const output = model.outputs[channel.output];
  const curves = curvesOf(model, outputs, answer);
  if (curves.length === 0) return null;
  return {
    input,
    output: output?.name ?? '',
    outputUnit: output?.unit,
    curves: [...curves, ...kept.map(({ label, time, values }) => ({ label, time, values }))],
    metrics: metricsOf(answer, channelAnswer, draft),
    words: {
      title: titleOf(draft, input, output?.name ?? ''),
      summary: draft.kind === 'step' && !draft.fromInitial ? null : endsText(curves[0]),
    },
  };
}

function curvesOf(
  model: StateSpace,
  outputs: readonly number[],
  { t, linear, actual, ...kinds }: Response,
): StepCurve[] {
  const name = (k: number) => (outputs.length > 1 ? `${plainName(model.outputs[outputs[k] ?? 0]?.name ?? '')} ` : '');
  const of = (curves: Response['linear'] | null, words: string) =>
    curves === null || 'reason' in curves
      ? []
      : curves.values.map((values, k) => ({ label: `${name(k)}${words}`.trim(), time: t, values }));
  if (actual === null) return of(linear, outputs.length > 1 ? '' : 'linear');
  return [...of(actual, actualWords(kinds)), ...of(linear, 'linear model')];
}

/** `true dead time, limits acting`. */
export function actualWords({ hasDeadTime, hasLimiter }: Pick<Response, 'hasDeadTime' | 'hasLimiter'>): string {
  if (!hasLimiter) return 'true dead time';
  return hasDeadTime ? 'true dead time, limits acting' : 'limits acting';
}

/** Figures of a step from rest: of the true response, or of the linear one scaled as the step is. */
function metricsOf({ figures, actual }: Response, { metrics }: ChannelAnswer, draft: TimeDraft): StepMetrics | null {
  if (figures !== null) return { ...metrics, ...figures, status: 'computed', route: 'floating' };
  if (actual !== null || draft.kind !== 'step' || draft.fromInitial || metrics.status !== 'computed') return null;
  const size = Number(draft.size);
  const scaled = (value: number | null) => (value === null ? null : value * size);
  return { ...metrics, finalValue: scaled(metrics.finalValue), peak: scaled(metrics.peak) };
}

function titleOf({ kind, fromInitial }: TimeDraft, input: string, output: string): string {
  const start = fromInitial && kind !== 'none' ? ' from the initial values' : '';
  if (kind === 'none') return `motion of ${plainName(output)} from the initial values`;
  return `${STIMULUS_WORDS[kind]} in ${plainName(input)}, response of ${plainName(output)}${start}`;
}

/** `largest 1.23 at 4.05 s · ends at 0.98`, for responses that have no final value to be measured by. */
function endsText(curve: StepCurve | undefined): string | null {
  if (curve === undefined) return null;
  let best = 0;
  for (let k = 0; k < curve.values.length; k++) {
    if (Math.abs(curve.values[k] ?? 0) > Math.abs(curve.values[best] ?? 0)) best = k;
  }
  const largest = formatNumber(curve.values[best] ?? 0, 3);
  const last = formatNumber(curve.values[curve.values.length - 1] ?? 0, 3);
  return `largest drawn ${largest} at ${formatNumber(curve.time[best] ?? 0, 3)} s · ends at ${last}`;
}
