/** The step plot's content from a channel's answer: names and units of the model, the curve, its figures. */

import type { StateSpace } from '../../compile/index.ts';
import type { ChannelAnswer } from '../../worker/index.ts';
import type { StepContent } from '../plots/index.ts';

/** Null where the response could not be computed. */
export function stepContentOf(model: StateSpace, { channel, step, metrics }: ChannelAnswer): StepContent | null {
  if (step.status === 'not-computed') return null;
  const input = model.inputs[channel.input];
  const output = model.outputs[channel.output];
  return {
    input: input?.name ?? '',
    output: output?.name ?? '',
    outputUnit: output?.unit,
    curves: [{ label: 'linear', time: step.t, values: step.y[0] ?? [] }],
    metrics: metrics.status === 'computed' ? metrics : null,
  };
}
