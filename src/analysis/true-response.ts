/**
 * The response of one output to a sinusoid on one input as the drawing has it: of the state-space model, and where the drawing has
 * dead time from its raw equations, e^(−sT) true. With what bends it, for choosing frequencies.
 */

import { directResponse, type StateSpace } from '../compile/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { exactModel } from './exact-model.ts';
import { channelResponse, type Response } from './frequency-response.ts';
import { poles, type Root, rootsOf } from './poles.ts';
import { type ReducedFraction, reducedFraction } from './transfer-functions.ts';

export interface TrueResponse {
  /** G(jω), ω in rad/s; null at a pole on the imaginary axis. */
  readonly valueAt: Response;
  /** `direct`: the raw equations with true dead time. */
  readonly route: 'certified' | 'direct' | 'floating';
  /** Poles and zeros that bend it, those of the approximated dead time among them. */
  readonly features: readonly Root[];
  /** Seconds; those of the whole drawing. */
  readonly deadTimes: readonly number[];
  /** The model's transfer function, null for large models. */
  readonly fraction: ReducedFraction | null;
}

/** The response of a channel, by positions, of a diagram and the model that `compile` made of it. */
export function trueResponse(
  diagram: Diagram,
  model: StateSpace,
  channel: { readonly input: number; readonly output: number },
): TrueResponse {
  const direct = directResponse(diagram);
  const deadTimes = direct.ok ? direct.value.deadTimes : [];
  const exact = exactModel(model, 'ordinary');
  const fraction = exact === null ? null : reducedFraction(exact, channel.output, channel.input);
  const features =
    fraction === null
      ? poles(model).poles
      : [...(rootsOf(fraction.numerator) ?? []), ...(rootsOf(fraction.denominator) ?? [])];
  const inModel = channelResponse(model, channel);
  if (!direct.ok || deadTimes.length === 0) return { ...inModel, features, deadTimes, fraction };
  const valueAt: Response = omega => {
    if (omega === 0) return inModel.valueAt(0);
    const value = direct.value.at({ re: 0, im: omega }, channel.input)?.[channel.output];
    return value === undefined ? null : [value.re, value.im];
  };
  return { valueAt, route: 'direct', features, deadTimes, fraction };
}
