/** What many judged points say together: for each requirement its worst case, for each curve its envelope. */

import type { JudgedPoint, PointAssessment } from './judge-point.ts';

/** A requirement over all points. */
export interface WorstCase {
  /** Position of the worst point in the plan. */
  readonly point: number;
  readonly assessment: PointAssessment;
  /** How many of the points miss it, or could not be checked. */
  readonly missed: number;
}

/** Between which values a curve runs, sample by sample. */
export interface Envelope {
  readonly low: Float64Array;
  readonly high: Float64Array;
}

/** The worst point of each of `count` requirements; the first where several are as bad, null before any point is judged. */
export function worstCases(count: number, judged: readonly JudgedPoint[]): readonly (WorstCase | null)[] {
  return Array.from({ length: count }, (_, k) => {
    let worst: WorstCase | null = null;
    let missed = 0;
    judged.forEach(({ assessments }, point) => {
      const assessment = assessments[k];
      if (assessment === undefined) return;
      if (assessment.status !== 'met') missed += 1;
      if (worst === null || badness(assessment) > badness(worst.assessment)) worst = { point, assessment, missed };
    });
    return worst === null ? null : { ...(worst as WorstCase), missed };
  });
}

/** A figure that is missing for a bad reason is worse than any figure; one without limit is better than any. */
function badness({ status, slack }: PointAssessment): number {
  if (slack !== null) return -slack;
  return status === 'met' ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
}

/** The envelope of the curves that are there; null where none is. A sample that is no number widens nothing. */
export function envelopeOf(curves: readonly (Float64Array | null)[]): Envelope | null {
  const known = curves.filter(curve => curve !== null);
  const [first] = known;
  if (first === undefined) return null;
  const low = Float64Array.from(first);
  const high = Float64Array.from(first);
  for (const curve of known) {
    curve.forEach((value, k) => {
      if (!(value >= low[k]!)) low[k] = Number.isNaN(value) ? low[k]! : value;
      if (!(value <= high[k]!)) high[k] = Number.isNaN(value) ? high[k]! : value;
    });
  }
  return { low, high };
}
