/**
 * What a pole says about the motion it stands for, by the definitions of IEC 60050-351 and the textbooks: the factor
 * s² + 2 ζ ω₀ s + ω₀² of a pair, the factor 1 + τ s of a single real pole.
 */

interface Place {
  readonly re: number;
  readonly im: number;
}

/** ω₀ = |p|, rad/s: the undamped natural (characteristic angular) frequency; 0 for a pole at the origin. */
export function naturalFrequency({ re, im }: Place): number {
  return Math.hypot(re, im);
}

/**
 * ζ = −Re p / |p|, between −1 and 1; ±1 for a real pole, negative where the motion grows, null for a pole at the origin,
 * where it has no meaning.
 */
export function dampingRatio({ re, im }: Place): number | null {
  const size = Math.hypot(re, im);
  if (size === 0) return null;
  return re === 0 ? 0 : -re / size;
}

/** τ = −1 / Re p, s: the time in which the motion decays to 1/e; null for a pole on the axis or to its right. */
export function timeConstant({ re }: Place): number | null {
  return re < 0 ? -1 / re : null;
}
