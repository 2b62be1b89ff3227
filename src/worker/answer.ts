/** The answers to the tab's questions, stage by stage, as pure functions of the question; they run without a worker too. */

import {
  hiddenModeWarnings,
  poles,
  stability,
  stepMetrics,
  stepResponse,
  transferFunction,
  zeros,
} from '../analysis/index.ts';
import { compile, type StateSpace } from '../compile/index.ts';
import { FORMATS } from '../deliver/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { fail, ok, problem } from '../problem/index.ts';
import type { Answer, Channel, ChannelAnswer, FileAnswer, ModelAnswer, PolesAnswer, Question } from './protocol.ts';
import { quantityValues } from './quantity-values.ts';

type DeriveQuestion = Extract<Question, { kind: 'derive' }>;
type FileQuestion = Extract<Question, { kind: 'file' }>;

/** Points of a curve on screen: more than the columns of the widest plot. */
const CURVE_POINTS = 801;

/** The model first, since the matrices are what is waited for; then what is asked of it. */
export function* deriveStages({ revision, diagram, channel }: DeriveQuestion): Generator<Answer> {
  const answer = modelAnswer(revision, diagram);
  yield answer;
  if (!answer.outcome.ok) return;
  const { model } = answer.outcome.value;
  const chosen = channelAnswer(revision, model, channel);
  if (chosen !== null) yield chosen;
  yield polesAnswer(revision, model);
}

function modelAnswer(revision: number, diagram: Diagram): ModelAnswer {
  const start = performance.now();
  const outcome = compile(diagram);
  return { kind: 'model', revision, outcome, values: quantityValues(diagram), elapsed: performance.now() - start };
}

function polesAnswer(revision: number, model: StateSpace): PolesAnswer {
  return {
    kind: 'poles',
    revision,
    poles: poles(model),
    zeros: zeros(model),
    stability: stability(model),
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

/** A file in one of the formats; a drawing without a model has none of the model's. */
export function fileAnswer({ id, diagram, format, notation }: FileQuestion): FileAnswer {
  const found = FORMATS.find(candidate => candidate.id === format);
  if (found === undefined) {
    return { kind: 'file', id, outcome: fail(problem('bad-option', `There is no format ${format}.`)) };
  }
  if (found.scope === 'drawing') return { kind: 'file', id, outcome: ok(found.write(diagram)) };
  const derived = compile(diagram);
  const outcome = derived.ok ? ok(found.write({ derivation: derived.value, notation })) : derived;
  return { kind: 'file', id, outcome };
}
