/**
 * Roots of a polynomial in doubles, as starting points for the certified refinement: nothing here is a promise. Each root
 * has a scale of its own, a power of two, so that neither degree nor magnitude overflows.
 */

import type { IntegerPolynomial } from '../integer-polynomial.ts';
import { mantissaAndExponent, type ScaledPoint } from './root-starts.ts';

/** A root in doubles, and what is known about its error from the last step. */
export interface ApproximateRoot extends ScaledPoint {
  /** Estimated distance to a root, relative to 2^exponent. */
  readonly error: number;
  /** |f′| there, of f in the variable w = s / 2^exponent scaled so that its largest coefficient is about 1. */
  readonly slope: number;
}

/** Rounds over all roots after which doubles give up and the refinement takes over with what there is. */
const MOST_ROUNDS = 60;

/** A Newton correction below this share of the root's modulus leaves an error far below it (the iteration is of third order). */
const SMALL_STEP = 2 ** -26;

/** Unit roundoff of doubles. */
const ROUNDOFF = 2 ** -53;

/** The working state: root i is (re[i] + i·im[i]) · 2^exponent[i] with modulus at most about 1 before the power. */
interface Points {
  readonly re: Float64Array;
  readonly im: Float64Array;
  readonly exponent: Int32Array;
}

/**
 * The n roots of f, in the order of the starting points: simultaneous Newton steps with the other roots divided out (Ehrlich
 * 1967, CACM 10; Aberth 1973, Math. Comp. 27), each stopped where rounding hides its value. O(n²) for each round.
 */
export function approximateRoots(f: IntegerPolynomial, starts: readonly ScaledPoint[]): ApproximateRoot[] {
  const points: Points = {
    re: Float64Array.from(starts, start => start.re),
    im: Float64Array.from(starts, start => start.im),
    exponent: Int32Array.from(starts, start => start.exponent),
  };
  const scaled = scaledCoefficients(f);
  const results = new Array<ApproximateRoot | undefined>(starts.length);
  let moving = starts.map((_, i) => i);
  for (let round = 0; round < MOST_ROUNDS && moving.length > 0; round++) {
    moving = moving.filter(i => {
      const result = advance(i, points, scaled);
      results[i] = result;
      return !result.isDone;
    });
  }
  return results.map(result => result!);
}

/** Coefficients of f in w = s / 2^exponent, descending, the largest about 1; kept for each exponent that is met. */
function scaledCoefficients(f: IntegerPolynomial): (exponent: number) => Float64Array {
  const n = f.length - 1;
  const parts = f.map(mantissaAndExponent);
  const known = new Map<number, Float64Array>();
  return exponent => {
    const kept = known.get(exponent);
    if (kept !== undefined) return kept;
    const powers = parts.map(([mantissa, power], j) => (mantissa === 0 ? -Infinity : power + exponent * (n - j)));
    const top = Math.max(...powers);
    // What is 2¹⁰⁷⁴ below the largest coefficient underflows to zero, far below rounding.
    const coefficients = Float64Array.from(parts, ([mantissa], j) =>
      mantissa === 0 ? 0 : mantissa * 2 ** (powers[j]! - top),
    );
    known.set(exponent, coefficients);
    return coefficients;
  };
}

/** One step of root i, in place; what is known about it afterwards, and whether doubles lead any further. */
function advance(
  i: number,
  points: Points,
  scaled: (exponent: number) => Float64Array,
): ApproximateRoot & { readonly isDone: boolean } {
  normalise(i, points);
  const x = points.re[i]!;
  const y = points.im[i]!;
  const exponent = points.exponent[i]!;
  const coefficients = scaled(exponent);
  const n = coefficients.length - 1;
  const modulus = Math.hypot(x, y);
  // Horner for value, slope and the sum of magnitudes that bounds the rounding.
  let [pr, pi, dr, di, sum] = [coefficients[0]!, 0, 0, 0, Math.abs(coefficients[0]!)];
  for (let j = 1; j <= n; j++) {
    const nextDr = dr * x - di * y + pr;
    di = dr * y + di * x + pi;
    dr = nextDr;
    const nextPr = pr * x - pi * y + coefficients[j]!;
    pi = pr * y + pi * x;
    pr = nextPr;
    sum = sum * modulus + Math.abs(coefficients[j]!);
  }
  const value = Math.hypot(pr, pi);
  const slope = Math.hypot(dr, di);
  const noise = 4 * n * ROUNDOFF * sum;
  const [sr, si] = repulsion(i, points);
  // step = f / (f′ − f S)
  const er = dr - (pr * sr - pi * si);
  const ei = di - (pr * si + pi * sr);
  const square = er * er + ei * ei;
  const stepRe = square === 0 ? modulus / 16 : (pr * er + pi * ei) / square;
  const stepIm = square === 0 ? modulus / 16 : (pi * er - pr * ei) / square;
  if (Number.isFinite(stepRe) && Number.isFinite(stepIm)) {
    points.re[i] = x - stepRe;
    points.im[i] = y - stepIm;
  }
  // Not the step: between two points that repel each other far from any root it is small as well.
  const newton = value / slope;
  const isSettled = newton <= SMALL_STEP * modulus;
  const error = (isSettled ? newton * SMALL_STEP : newton) + noise / slope + ROUNDOFF;
  return { re: points.re[i]!, im: points.im[i]!, exponent, error, slope, isDone: isSettled || value <= noise };
}

/** Moves root i to the exponent at which its modulus is in (½, 1]; a root at zero is left alone. */
function normalise(i: number, points: Points): void {
  const modulus = Math.hypot(points.re[i]!, points.im[i]!);
  if ((modulus > 0.5 && modulus <= 1) || modulus === 0) return;
  const shift = Math.ceil(Math.log2(modulus));
  points.re[i] = points.re[i]! * 2 ** -shift;
  points.im[i] = points.im[i]! * 2 ** -shift;
  points.exponent[i] = points.exponent[i]! + shift;
}

/** Powers of two beyond which one of two roots is nothing beside the other. */
const FAR = 60;

const POWERS = Float64Array.from({ length: 2 * FAR + 1 }, (_, k) => 2 ** (k - FAR));

/** S = Σ 1 / (zᵢ − zⱼ) over the other roots, in units of 2^−exponent[i]. */
function repulsion(i: number, { re, im, exponent }: Points): readonly [number, number] {
  const x = re[i]!;
  const y = im[i]!;
  const own = exponent[i]!;
  let sr = 0;
  let si = 0;
  for (let j = 0; j < re.length; j++) {
    if (j === i) continue;
    const shift = exponent[j]! - own;
    if (shift > FAR) continue;
    const factor = shift < -FAR ? 0 : POWERS[shift + FAR]!;
    const dx = x - re[j]! * factor;
    const dy = y - im[j]! * factor;
    const square = dx * dx + dy * dy;
    if (square === 0) continue;
    sr += dx / square;
    si -= dy / square;
  }
  return [sr, si];
}
