/** One point of a tolerance plan, judged: every requirement there, and the curves of a channel for the envelope. */

import { compile } from '../../compile/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { frequencyResponse } from '../frequency-response.ts';
import { type Assessment, assess } from '../requirements/index.ts';
import { stepResponse } from '../time-response.ts';
import { diagramAt, type TolerancePoint, type ToleratedParameter } from './tolerance-plan.ts';

/** A channel, by positions, and where its curves are taken. */
export interface EnvelopeRequest {
  readonly input: number;
  readonly output: number;
  /** s; the step response is taken at equally spaced times from 0 to it. */
  readonly horizon: number;
  readonly points: number;
  /** rad/s, ascending. */
  readonly omega: Float64Array;
}

/** A requirement at one point, without what is the same at all of them. */
export type PointAssessment = Pick<Assessment, 'status' | 'value' | 'slack' | 'reason'>;

export interface JudgedPoint {
  /** In the order of the drawing's requirements. */
  readonly assessments: readonly PointAssessment[];
  /** Null where no envelope is asked for or the model has none. */
  readonly step: Float64Array | null;
  /** Magnitude in dB at `omega`, of the state-space model. */
  readonly magnitude: Float64Array | null;
}

/** Judges the drawing with its parameters at a point. Derived in doubles: a point is one of hundreds, and proves nothing by itself. */
export function judgePoint(
  diagram: Diagram,
  parameters: readonly ToleratedParameter[],
  point: TolerancePoint,
  envelope: EnvelopeRequest | null,
): JudgedPoint {
  const moved = diagramAt(diagram, parameters, point);
  const derived = compile(moved, { field: 'double' });
  if (!derived.ok) {
    const reason = derived.problems[0]?.message ?? '';
    const missed = { status: 'missed', value: null, slack: null, reason } as const;
    return { assessments: (diagram.requirements ?? []).map(() => missed), step: null, magnitude: null };
  }
  const { model } = derived.value;
  const assessments = assess(moved, model).map(({ status, value, slack, reason }) => ({
    status,
    value,
    slack,
    reason,
  }));
  if (envelope === null) return { assessments, step: null, magnitude: null };
  const { input, output, horizon, points, omega } = envelope;
  const step = stepResponse(model, { input, outputs: [output], horizon, points });
  const { re, im } = frequencyResponse(model, { input, output }, omega);
  return {
    assessments,
    step: step.status === 'computed' ? (step.y[0] ?? null) : null,
    magnitude: omega.map((_, k) => 20 * Math.log10(Math.hypot(re[k] ?? Number.NaN, im[k] ?? Number.NaN))),
  };
}
