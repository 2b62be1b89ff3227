/** What is asked of a model: one channel's transfer function and step response, then poles, zeros and stability. */

import {
  hiddenModes,
  hiddenModeWarnings,
  poles,
  stability,
  stepMetrics,
  stepResponse,
  transferFunction,
  zeros,
} from '../analysis/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { Channel, ChannelAnswer, PolesAnswer } from './protocol.ts';

/** Points of a curve on screen: more than the columns of the widest plot. */
const CURVE_POINTS = 801;

export function polesAnswer(revision: number, model: StateSpace): PolesAnswer {
  return {
    kind: 'poles',
    revision,
    poles: poles(model),
    zeros: zeros(model),
    stability: stability(model),
    hidden: hiddenModes(model),
    warnings: hiddenModeWarnings(model),
  };
}

/** Null where the model has no such input or output. */
export function channelAnswer(revision: number, model: StateSpace, channel: Channel): ChannelAnswer | null {
  const { input, output } = channel;
  if (input >= model.inputs.length || output >= model.outputs.length) return null;
  return {
    kind: 'channel',
    revision,
    channel,
    transferFunction: transferFunction(model, output, input),
    step: stepResponse(model, { input, outputs: [output], points: CURVE_POINTS }),
    metrics: stepMetrics(model, { input, output }),
  };
}
