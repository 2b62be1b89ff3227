/**
 * Where the search for the roots of a polynomial starts: as many points on each of a few circles as the Newton polygon of
 * the coefficients' logarithms foretells roots of that magnitude. Coefficients of any length are handled by their logarithms.
 */

import { bitLength } from '../integer.ts';
import type { IntegerPolynomial } from '../integer-polynomial.ts';

/** (re + i·im) · 2^exponent. */
export interface ScaledPoint {
  readonly re: number;
  readonly im: number;
  readonly exponent: number;
}

/** A nonzero whole number as mantissa · 2^exponent, ½ ≤ |mantissa| ≤ 1, the mantissa right to 53 bits; zero as 0 · 2⁰. */
export function mantissaAndExponent(x: bigint): readonly [number, number] {
  const exponent = bitLength(x);
  // 63 bits keep the rounding to a double a single one.
  const lead = exponent > 63 ? Number(x >> BigInt(exponent - 63)) / 2 ** 63 : Number(x) / 2 ** exponent;
  return [lead, exponent];
}

/**
 * n starting points for the n roots of f, f(0) ≠ 0 (Bini 1996, Numer. Algorithms 13): for each edge of the upper convex hull
 * of the points (power, log₂ |coefficient|) as many points as powers it spans, on the circle whose radius is its slope.
 */
export function startingPoints(f: IntegerPolynomial): ScaledPoint[] {
  const n = f.length - 1;
  const logarithms = Array.from({ length: n + 1 }, (_, power) => {
    const [mantissa, exponent] = mantissaAndExponent(f[n - power]!);
    return mantissa === 0 ? Number.NEGATIVE_INFINITY : Math.log2(Math.abs(mantissa)) + exponent;
  });
  const hull = upperHull(logarithms);
  return hull.slice(1).flatMap((to, edge) => {
    const from = hull[edge]!;
    const count = to - from;
    const logRadius = (logarithms[from]! - logarithms[to]!) / count;
    const exponent = Math.ceil(logRadius);
    const radius = 2 ** (logRadius - exponent);
    return Array.from({ length: count }, (_, m) => {
      const angle = (2 * Math.PI * m) / count + (2 * Math.PI * from) / n + ANGLE;
      return { re: radius * Math.cos(angle), im: radius * Math.sin(angle), exponent };
    });
  });
}

/** Turns the starting points off the real axis, where they could not leave it (the value that Bini uses). */
const ANGLE = 0.7;

/** Indices of the vertices of the upper convex hull of the points (i, heights[i]), ascending (Andrew 1979). */
function upperHull(heights: readonly number[]): number[] {
  const hull: number[] = [];
  heights.forEach((height, i) => {
    if (height === Number.NEGATIVE_INFINITY) return;
    while (hull.length > 1) {
      const last = hull[hull.length - 1]!;
      const before = hull[hull.length - 2]!;
      const isBelow =
        (heights[last]! - heights[before]!) * (i - before) <= (height - heights[before]!) * (last - before);
      if (!isBelow) break;
      hull.pop();
    }
    hull.push(i);
  });
  return hull;
}
