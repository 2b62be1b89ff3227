/**
 * The response of outputs to any input signal, from rest or from the initial values: of the linear model, and where the drawing has dead
 * times or limiters, with those as they are.
 */

import {
  type Clipping,
  clippings,
  type Horizon,
  type SimulatedFigures,
  type Simulation,
  type Stimulus,
  sampled,
  simulate,
  simulatedFigures,
  stepMetrics,
  stepResponse,
  timeResponse,
} from '../../analysis/index.ts';
import { type OpenedModel, openedModel, type StateSpace } from '../../compile/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export interface ResponseQuestion {
  /** Position of the driven input; null: the motion from the initial values alone. */
  readonly input: number | null;
  /** Positions of the outputs, at least one; the first is the one that figures are about. */
  readonly outputs: readonly number[];
  readonly stimulus: Stimulus;
  /** s; null: chosen from the poles. */
  readonly horizon: number | null;
  readonly fromInitial: boolean;
}

/** A curve for each output, or why there is none. */
export type Curves = { readonly values: readonly Float64Array[] } | { readonly reason: string };

export interface Response {
  /** s, ascending from 0. */
  readonly t: Float64Array;
  readonly horizon: Horizon;
  /** The linear model's: dead time approximated, limiters as unity. */
  readonly linear: Curves;
  /** With dead times and limiters as they are; null where the drawing has none of them, and the linear answer is the true one. */
  readonly actual: Curves | null;
  readonly hasDeadTime: boolean;
  readonly hasLimiter: boolean;
  readonly clippings: readonly Clipping[];
  /** Of the actual response to a step from rest, where the linear model has a final value to compare with. */
  readonly figures: (SimulatedFigures & { readonly finalValue: number }) | null;
}

export type ResponseTopic = Topic<ResponseQuestion, Response>;

const POINTS = 801;

export function answer({ diagram, derivation: { model } }: Subject, question: ResponseQuestion): Result<Response> {
  const horizon = horizonFor(model, question);
  const t = Float64Array.from({ length: POINTS }, (_, k) => (horizon.duration * k) / (POINTS - 1));
  const linear = linearCurves(model, question, horizon.duration, t);
  const opened = openedModel(diagram);
  const base = { t, horizon, linear, clippings: [], figures: null };
  if (!opened.ok) {
    // What differentiates a limiter's output has no motion to be simulated; the linear answer stands, and that is said.
    const kinds = { hasDeadTime: holds(diagram.blocks, 'delay'), hasLimiter: holds(diagram.blocks, 'limiter') };
    const reason = opened.problems[0]?.message ?? '';
    return ok({ ...base, ...kinds, actual: kinds.hasDeadTime || kinds.hasLimiter ? { reason } : null });
  }
  const { delays, limiters } = opened.value;
  const kinds = { hasDeadTime: delays.length > 0, hasLimiter: limiters.length > 0 };
  if (!kinds.hasDeadTime && !kinds.hasLimiter) return ok({ ...base, ...kinds, actual: null });
  const simulation = simulate({ ...question, opened: opened.value, horizon: horizon.duration, clips: true });
  if (simulation.status === 'not-computed') return ok({ ...base, ...kinds, actual: { reason: simulation.reason } });
  return ok({
    ...base,
    ...kinds,
    actual: { values: sampled(simulation, t) },
    clippings: clippings(opened.value, simulation.pieces),
    figures: figuresOf(model, question, simulation),
  });
}

type Blocks = Subject['diagram']['blocks'];

/** Recursion is as deep as groups are: at most 32. */
function holds(blocks: Blocks, kind: 'delay' | 'limiter'): boolean {
  return blocks.some(block => block.kind === kind || (block.kind === 'group' && holds(block.sheet.blocks, kind)));
}

/** Periods of a sine and widths of a pulse that are shown. */
const PERIODS = 8;
const WIDTHS = 2;

function horizonFor(model: StateSpace, { input, outputs, stimulus, horizon }: ResponseQuestion): Horizon {
  if (horizon !== null) return { duration: horizon, reason: 'asked' };
  const asked = stepResponse(model, {
    input: input ?? 0,
    outputs: model.inputs.length === 0 ? [] : outputs,
    points: 2,
  });
  const own: Horizon =
    asked.status === 'computed' && model.inputs.length > 0 ? asked.horizon : { duration: 10, reason: 'drift' };
  const needed = neededBy(stimulus);
  return needed > own.duration ? { duration: needed, reason: own.reason } : own;
}

function neededBy(stimulus: Stimulus): number {
  switch (stimulus.kind) {
    case 'sine':
      return (PERIODS * 2 * Math.PI) / stimulus.omega;
    case 'pulse':
      return WIDTHS * stimulus.width;
    case 'recorded':
      return stimulus.time.at(-1) ?? 0;
    default:
      return 0;
  }
}

function linearCurves(model: StateSpace, question: ResponseQuestion, horizon: number, t: Float64Array): Curves {
  const { input, outputs, stimulus, fromInitial } = question;
  const isPlain = stimulus.kind === 'step' || stimulus.kind === 'impulse' || stimulus.kind === 'ramp';
  if (input !== null && isPlain && !fromInitial) {
    const found = timeResponse(model, stimulus.kind, { input, outputs, horizon, points: POINTS });
    if (found.status === 'not-computed') return { reason: found.reason };
    return { values: found.y.map(values => values.map(value => stimulus.size * value)) };
  }
  const simulation = simulate({ ...question, opened: closedModel(model), horizon, clips: false });
  return simulation.status === 'computed' ? { values: sampled(simulation, t) } : { reason: simulation.reason };
}

/** The linear model as one without anything taken out. */
function closedModel({ numeric, states, inputs, outputs, initialState }: StateSpace): OpenedModel {
  return { matrices: numeric, states, inputs, outputs, initialState, delays: [], limiters: [] };
}

function figuresOf(
  model: StateSpace,
  { input, outputs, stimulus, fromInitial }: ResponseQuestion,
  { pieces }: Extract<Simulation, { status: 'computed' }>,
): Response['figures'] {
  const output = outputs[0];
  if (stimulus.kind !== 'step' || fromInitial || input === null || output === undefined) return null;
  const { finalValue } = stepMetrics(model, { input, output });
  if (finalValue === null || finalValue === 0) return null;
  const final = finalValue * stimulus.size;
  return { ...simulatedFigures(pieces, 0, final), finalValue: final };
}
