/**
 * Responses of a channel at equally spaced times: step, impulse, ramp, and the motion from the model's initial state. They
 * are the state-space model's: dead time counts as its Padé approximation and limiters as unity.
 */

import type { StateSpace } from '../compile/index.ts';
import { type ChannelMotion, channelMotion } from './channel-motion.ts';
import { channelSystem, observedSystem } from './channel-system.ts';
import { type Excitation, excitedSystem } from './excitation.ts';
import {
  advance,
  type FreeSystem,
  finePropagator,
  initialMotion,
  outputOf,
  stateAfter,
  stepPropagator,
} from './free-response.ts';
import { type Horizon, horizonOf, horizonOfPoles } from './horizon.ts';
import { poles } from './poles.ts';

export interface ResponseRequest {
  /** Position of the input. */
  readonly input: number;
  /** Positions of the outputs, at least one. */
  readonly outputs: readonly number[];
  /** s, finite and positive; chosen by `horizonOf` where absent, the longest among the outputs. */
  readonly horizon?: number;
  /** Number of times, 0 and the horizon included; at least 2. */
  readonly points: number;
  /** Whether the drawing has dead time, which the answer then approximates. */
  readonly hasDeadTime?: boolean;
}

export interface TimeResponse {
  readonly status: 'computed';
  /** s, ascending from 0 to the horizon. */
  readonly t: Float64Array;
  /** One array for each output, in the order asked for. */
  readonly y: readonly Float64Array[];
  readonly horizon: Horizon;
  /** Whether dead time is in it as a Padé approximation. */
  readonly approximatesDeadTime: boolean;
}

export type StepResponse =
  | TimeResponse
  /** Poles did not converge, so no horizon could be chosen; `reason` is ready for the screen. */
  | { readonly status: 'not-computed'; readonly reason: string };

/** The responses of the outputs to a unit step on the input from rest. */
export function stepResponse(model: StateSpace, request: ResponseRequest): StepResponse {
  return timeResponse(model, 'step', request);
}

/**
 * The responses to another excitation of the input from rest. An impulse leaves out what direct feedthrough lets through at
 * t = 0.
 */
export function timeResponse(model: StateSpace, excitation: Excitation, request: ResponseRequest): StepResponse {
  const { input, outputs, points } = request;
  const motions = outputs.map(output => channelMotion(model, output, input)).filter(motion => motion !== null);
  if (motions.length < outputs.length) return NOT_CONVERGED;
  const horizon = request.horizon === undefined ? longestHorizon(motions) : asked(request.horizon);
  const grid = { interval: horizon.duration / (points - 1), points };
  return {
    status: 'computed',
    t: times(horizon, points),
    y: sampledOutputs(model, excitation, request, motions, grid),
    horizon,
    approximatesDeadTime: request.hasDeadTime === true,
  };
}

/**
 * One output's response to a unit step on one input from rest at the given times (s, not negative), each by itself; null
 * where poles did not converge. For read-outs; a whole curve is cheaper by stepResponse.
 */
export function stepValuesAt(
  model: StateSpace,
  { input, output }: { readonly input: number; readonly output: number },
  at: readonly number[],
): Float64Array | null {
  const motion = channelMotion(model, output, input);
  if (motion === null) return null;
  const latest = Math.max(0, ...at);
  const motionOf = finePropagator(excitedSystem(motion.system, 'step'), latest > 0 ? latest : 1);
  return Float64Array.from(at, t => outputOf(motionOf.C, 0, stateAfter(motionOf, motionOf.start, t)));
}

/** The motion of the outputs from the model's initial state, all inputs at rest; `input` of the request is not read. */
export function initialStateResponse(model: StateSpace, request: Omit<ResponseRequest, 'input'>): StepResponse {
  const { outputs, points } = request;
  const found = poles(model);
  if (found.route === 'not-converged') return NOT_CONVERGED;
  const horizon = request.horizon === undefined ? horizonOfPoles(found.poles) : asked(request.horizon);
  const { states, A, C } = observedSystem(model.numeric, outputs);
  const start = Float64Array.from(states, i => model.initialState[i] ?? 0);
  return {
    status: 'computed',
    t: times(horizon, points),
    y: samples({ M: A, C, start }, { interval: horizon.duration / (points - 1), points }),
    horizon,
    approximatesDeadTime: request.hasDeadTime === true,
  };
}

const NOT_CONVERGED = {
  status: 'not-computed',
  reason: 'The poles of this model could not be computed, so there is no time response.',
} as const;

interface Grid {
  /** s. */
  readonly interval: number;
  readonly points: number;
}

function asked(duration: number): Horizon {
  return { duration, reason: 'asked' };
}

function longestHorizon(motions: readonly ChannelMotion[]): Horizon {
  return motions.map(horizonOf).reduce((longest, next) => (next.duration > longest.duration ? next : longest));
}

function times({ duration }: Horizon, points: number): Float64Array {
  const t = new Float64Array(points);
  for (let k = 0; k < points; k++) t[k] = duration * (k / (points - 1));
  return t;
}

/** Outputs that share the model's states are followed together, those realised by themselves each alone. */
function sampledOutputs(
  model: StateSpace,
  excitation: Excitation,
  { input, outputs }: ResponseRequest,
  motions: readonly ChannelMotion[],
  grid: Grid,
): readonly Float64Array[] {
  const shared = outputs.filter((_, i) => motions[i]?.isRealised === false);
  const system = channelSystem(model.numeric, input, shared);
  const together = shared.length === 0 ? [] : samples(excitedSystem(system, excitation), grid);
  let next = 0;
  return motions.map(motion => {
    const alone = motion.isRealised ? samples(excitedSystem(motion.system, excitation), grid)[0] : together[next++];
    return alone ?? new Float64Array(grid.points);
  });
}

/** The outputs at 0, interval, 2 interval, … */
function samples(system: FreeSystem, { interval, points }: Grid): Float64Array[] {
  const motionOf = stepPropagator(system, interval);
  const motion = initialMotion(motionOf);
  const y = Array.from({ length: system.C.rows }, () => new Float64Array(points));
  for (let k = 0; k < points; k++) {
    if (k > 0) advance(motionOf, motion, 0);
    for (let output = 0; output < y.length; output++) y[output]![k] = outputOf(motionOf.C, output, motion.z);
  }
  return y;
}
