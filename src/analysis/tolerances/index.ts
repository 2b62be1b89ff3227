/**
 * The whole tolerance of the parameters at once: a plan of points, each judged by itself so that workers can share them, and the worst
 * cases of all. Points refute; they never prove.
 */

export { type EnvelopeRequest, type JudgedPoint, judgePoint, type PointAssessment } from './judge-point.ts';
export {
  DEFAULT_SAMPLES,
  diagramAt,
  MOST_SAMPLES,
  type SampleChoice,
  type TolerancePlan,
  type TolerancePoint,
  type ToleratedParameter,
  tolerancePlan,
  valuesAt,
} from './tolerance-plan.ts';
export { type Envelope, envelopeOf, type WorstCase, worstCases } from './worst-cases.ts';
