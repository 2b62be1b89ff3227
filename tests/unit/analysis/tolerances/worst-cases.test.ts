import { describe, expect, test } from 'vitest';
import {
  envelopeOf,
  type JudgedPoint,
  type PointAssessment,
  worstCases,
} from '../../../../src/analysis/tolerances/index.ts';

const figure = (slack: number): PointAssessment => ({
  status: slack >= 0 ? 'met' : 'missed',
  value: 10 - slack,
  slack,
  reason: '',
});
const UNLIMITED: PointAssessment = { status: 'met', value: null, slack: null, reason: 'No gain puts it on the edge.' };
const NONE: PointAssessment = { status: 'missed', value: null, slack: null, reason: 'It does not settle.' };

const judged = (...assessments: readonly PointAssessment[]): readonly JudgedPoint[] =>
  assessments.map(assessment => ({ assessments: [assessment], step: null, magnitude: null }));

describe('the worst case of a requirement', () => {
  test('is the least slack, the first of equals, with the number of points that miss it', () => {
    expect(worstCases(1, judged(figure(3), figure(-1), figure(2), figure(-1)))).toEqual([
      { point: 1, assessment: figure(-1), missed: 2 },
    ]);
  });

  test('is a figure rather than none that is without limit', () => {
    expect(worstCases(1, judged(UNLIMITED, figure(3)))[0]?.point).toBe(1);
  });

  test('is one without a figure rather than any figure', () => {
    expect(worstCases(1, judged(figure(-100), NONE))[0]).toMatchObject({ point: 1, missed: 2 });
  });

  test('is not known before a point is judged', () => {
    expect(worstCases(2, [])).toEqual([null, null]);
  });
});

describe('the envelope of curves', () => {
  test('runs along the lowest and the highest, past what is no number', () => {
    const envelope = envelopeOf([
      Float64Array.of(1, Number.NaN, 3),
      null,
      Float64Array.of(2, 5, Number.NaN),
      Float64Array.of(0, 6, 4),
    ]);
    expect(envelope).toEqual({ low: Float64Array.of(0, 5, 3), high: Float64Array.of(2, 6, 4) });
  });

  test('of no curve there is none', () => {
    expect(envelopeOf([null])).toBeNull();
  });
});
